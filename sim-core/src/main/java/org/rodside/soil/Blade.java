package org.rodside.soil;

/**
 * A plain blade of some width that cuts a kind of ground.
 *
 * <p>The blade travels level ground in direction x, y is up; its face rises from the cutting edge backwards for a rake below
 * 90°, forwards above. Immutable, safe for any number of threads.
 */
public final class Blade {

    /** Standard gravity; in m/s². */
    private static final double GRAVITY = 9.80665;

    private final Ground ground;
    private final double width;

    private Blade(Ground ground, double width) {
        this.ground = ground;
        this.width = notNegative("width", width);
        notNegative("density", ground.density());
        notNegative("cohesion", ground.cohesion());
        notNegative("adhesion", ground.adhesion());
        notNegative("surcharge", ground.surcharge());
    }

    /**
     * A blade in this ground.
     *
     * @param ground what it cuts; its angles are judged with each rake
     * @param width of the blade; in m
     * @throws IllegalArgumentException if a figure other than an angle is negative or not finite
     */
    public static Blade of(Ground ground, double width) {
        return new Blade(ground, width);
    }

    private static double notNegative(String name, double value) {
        if (!(value >= 0) || value == Double.POSITIVE_INFINITY) {
            throw new IllegalArgumentException(name + " must be 0 or more and finite, was " + value);
        }
        return value;
    }

    /**
     * Resistance of the ground at a rake angle and depth of cut, theory (G1), (G4).
     *
     * @param rake α, between direction of travel and blade face; in rad
     * @param depth of cut, from surface to cutting edge, 0 or more; in m
     * @return forces of the ground on the blade, NaN with a reason where there is no wedge
     * @throws IllegalArgumentException if the depth is negative or not finite
     */
    public Resistance resistance(double rake, double depth) {
        double d = notNegative("depth", depth);
        WedgeFactors factors = WedgeFactors.of(ground.friction(), ground.wallFriction(), rake);
        double perWidth = ground.density() * GRAVITY * d * d * factors.weight()
                + ground.cohesion() * d * factors.cohesion()
                + ground.surcharge() * d * factors.surcharge()
                + ground.adhesion() * d * factors.adhesion();
        double force = perWidth * width;
        double lean = rake + ground.wallFriction();
        double sticking = ground.adhesion() * d * width;
        double along = -(force * Math.sin(lean) + sticking / Math.tan(rake));
        double up = -(force * Math.cos(lean) - sticking);
        return factors.status() == WedgeStatus.FOUND
                ? new Resistance(factors.status(), force, along, up)
                : new Resistance(factors.status(), Double.NaN, Double.NaN, Double.NaN);
    }

    /**
     * Force of the ground on the blade.
     *
     * @param status found, or why not
     * @param force P of the earthmoving equation, at the angle δ to the normal of the blade, without adhesion along the
     *     blade; in N
     * @param along whole force on the blade in the direction of travel, adhesion included: negative, against the motion;
     *     in N
     * @param up whole force on the blade upwards, adhesion included: negative where the ground draws the blade in; in N
     */
    public record Resistance(WedgeStatus status, double force, double along, double up) {}
}
