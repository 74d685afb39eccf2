package org.rodside.soil;

/**
 * Failure plane and factors of the wedge of ground that a blade pushes up, theory (G2), (G3).
 *
 * <p><b>What:</b> the failure angle β that makes Nγ smallest under α + β + δ + φ &lt; 180°, in closed form, and the four
 * factors at it. <b>Edges:</b> where there is no wedge the status says why and every number is NaN. Close to a rake angle of
 * 0 the factors grow beyond bounds, as 1/α; close to α + δ + φ = 180° as 1/(180° − α − δ − φ)².
 *
 * @param status found, or why not
 * @param failureAngle β, between the failure plane and the surface; in rad
 * @param weight Nγ; no unit
 * @param cohesion Nc; no unit
 * @param surcharge Nq; no unit
 * @param adhesion Na; no unit, below 0 for some angles
 */
public record WedgeFactors(
        WedgeStatus status, double failureAngle, double weight, double cohesion, double surcharge, double adhesion) {

    /**
     * The wedge in front of a blade.
     *
     * @param friction φ, angle of internal friction of the ground; in rad
     * @param wallFriction δ, angle of friction between ground and blade; in rad
     * @param rake α, from the direction of travel up to the blade face behind the cutting edge; in rad
     */
    public static WedgeFactors of(double friction, double wallFriction, double rake) {
        WedgeStatus status = status(friction, wallFriction, rake);
        if (status != WedgeStatus.FOUND) {
            return new WedgeFactors(status, Double.NaN, Double.NaN, Double.NaN, Double.NaN, Double.NaN);
        }
        return at(failureAngle(friction, wallFriction, rake), friction, wallFriction, rake);
    }

    private static WedgeStatus status(double friction, double wallFriction, double rake) {
        if (!(rake > 0 && rake < Math.PI)) {
            return WedgeStatus.RAKE_OUT_OF_RANGE;
        }
        boolean rough = friction > 0 && friction < Math.PI / 2 && wallFriction >= 0 && wallFriction < Math.PI / 2;
        if (!rough) {
            return WedgeStatus.NO_FRICTION;
        }
        return rake + wallFriction + friction < Math.PI ? WedgeStatus.FOUND : WedgeStatus.NO_FAILURE_PLANE;
    }

    /** Theory (G3); angles and result in rad. */
    private static double failureAngle(double friction, double wallFriction, double rake) {
        double sum = rake + wallFriction + friction;
        double best = Math.sqrt(Math.sin(wallFriction + friction)
                / Math.sin(rake)
                * Math.sin(rake + wallFriction)
                / Math.sin(friction));
        return Math.atan2(Math.sin(sum), best - Math.cos(sum));
    }

    /** Theory (G2) at a failure angle of one's own choice; angles in rad, not checked. */
    static WedgeFactors at(double failureAngle, double friction, double wallFriction, double rake) {
        double cotRake = 1 / Math.tan(rake);
        double cotPlane = 1 / Math.tan(failureAngle);
        double cotPush = 1 / Math.tan(failureAngle + friction);
        double lean = rake + wallFriction;
        double d = Math.cos(lean) + Math.sin(lean) * cotPush;
        double surcharge = (cotRake + cotPlane) / d;
        double cohesion = (1 + cotPlane * cotPush) / d;
        double adhesion = (1 - cotRake * cotPush) / d;
        return new WedgeFactors(WedgeStatus.FOUND, failureAngle, surcharge / 2, cohesion, surcharge, adhesion);
    }
}
