package org.rodside.hydraulics;

import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.rodside.model.Cylinder;
import org.rodside.model.Linkage;

/**
 * A pushing cylinder as a column with its own weight, a load off the pin centres and a kink at the gland, limited by the
 * stress in the rod, theory (C4) to (C6).
 *
 * <p>The idea is that of ISO/TS 13725 as recalled (page not seen): true geometry in two parts, own weight, off-axis load,
 * a stress in the rod that must not be passed. The formulas, the oil in the tube, the kink as the measure of play in
 * piston and gland, and the worst case that all of them bow the column the same way are ours. It is not that standard's
 * calculation and must not be quoted as such.
 *
 * <p><b>Accuracy:</b> the stress to rounding (worse the closer the load is to the elastic one), the capacity to 1e-10.
 * <b>Edges:</b> a load at or above the elastic one gives an infinite stress; without exposed rod, and for NaN, the answers
 * are NaN. <b>Threads:</b> immutable. All loads and forces here are each cylinder's, in N, compression positive.
 */
public final class LoadedColumn {

    /** Density of steel; in kg/m³. */
    public static final double STEEL = 7850;

    /** Density of hydraulic oil, common practice, no source; in kg/m³. */
    public static final double OIL = 870;

    /** Of the load found; no unit. */
    private static final double RELATIVE = 1e-11;

    private static final int MAX_EVALUATIONS = 500;

    private final Column column;
    private final double tubeLength;
    private final double tubeStiffness;
    private final double rodStiffness;
    private final double tubeWeight;
    private final double rodWeight;
    private final double rodArea;
    private final double rodModulus;
    private final double tubeModulus;
    private final double eccentricity;
    private final double kink;

    private LoadedColumn(Cylinder cylinder, double eccentricity, double kink) {
        column = Column.of(cylinder);
        this.eccentricity = Require.notNegative("eccentricity", eccentricity);
        this.kink = Require.notNegative("kink", kink);
        tubeLength = cylinder.tube().length();
        double outside = cylinder.tube().outside();
        tubeStiffness = Column.tubeStiffness(cylinder);
        rodStiffness = Column.rodStiffness(cylinder);
        double boreArea = CylinderArea.circle(cylinder.bore());
        rodArea = CylinderArea.circle(cylinder.rod());
        double tubeSteel = CylinderArea.circle(outside) - boreArea;
        tubeWeight = Linkage.GRAVITY * (STEEL * tubeSteel + OIL * boreArea);
        rodWeight = Linkage.GRAVITY * STEEL * rodArea;
        rodModulus = modulus(rodStiffness, cylinder.rod());
        tubeModulus = modulus(tubeStiffness, outside);
    }

    private static double modulus(double stiffness, double diameter) {
        return stiffness / Column.YOUNG / (diameter / 2);
    }

    /**
     * The loaded column of one cylinder.
     *
     * @param cylinder the cylinder as drawn
     * @param eccentricity distance of the line of load from both pin centres, 0 or more; in m
     * @param kink distance of the gland of the unloaded cylinder from the line of its pins, from play in piston and gland
     *     or poor fit, 0 or more; in m
     * @throws IllegalArgumentException if a size makes no sense
     */
    public static LoadedColumn of(Cylinder cylinder, double eccentricity, double kink) {
        return new LoadedColumn(cylinder, eccentricity, kink);
    }

    /**
     * Largest compressive stress in the rod, P/A + M/W, theory (C5).
     *
     * @param load push, each cylinder, 0 or more; in N
     * @param length pin to pin; in m
     * @param inclination of the cylinder from level, either way; in rad
     * @return in Pa; infinite when the load reaches the elastic one
     */
    public double rodStress(double load, double length, double inclination) {
        double rodLength = length - tubeLength;
        if (!(rodLength > 0 && load >= 0)) {
            return Double.NaN;
        }
        if (load >= column.elastic(length)) {
            return Double.POSITIVE_INFINITY;
        }
        BeamPart rod = new BeamPart(rodLength, rodStiffness, across(rodWeight, inclination), load);
        double atGland = glandMoment(load, length, inclination);
        return load / rodArea + rod.largestMoment(load * eccentricity, atGland) / rodModulus;
    }

    /**
     * Largest bending stress in the tube wall, M/W, theory (C5). The push goes through the oil, not the wall, so there is no
     * P/A; the stresses by the pressure itself are not in it.
     *
     * @param load push, each cylinder, 0 or more; in N
     * @param length pin to pin; in m
     * @param inclination of the cylinder from level, either way; in rad
     * @return in Pa; infinite when the load reaches the elastic one
     */
    public double tubeBending(double load, double length, double inclination) {
        if (!(length - tubeLength > 0 && load >= 0)) {
            return Double.NaN;
        }
        if (load >= column.elastic(length)) {
            return Double.POSITIVE_INFINITY;
        }
        BeamPart tube = new BeamPart(tubeLength, tubeStiffness, across(tubeWeight, inclination), load);
        double atGland = glandMoment(load, length, inclination);
        return tube.largestMoment(load * eccentricity, atGland) / tubeModulus;
    }

    /**
     * Push at which the rod reaches a stress, theory (C6). For a factor on load take the yield stress here and divide the
     * answer; for a factor on stress divide the yield stress. The first is the stricter of the two where bending grows
     * faster than the load.
     *
     * @param length pin to pin; in m
     * @param inclination of the cylinder from level, either way; in rad
     * @param stress the stress in the rod that must not be passed; in Pa
     * @return in N, each cylinder; the elastic load when a column with nothing to bow it reaches that first; 0 when its own
     *     weight alone reaches the stress
     */
    public double capacity(double length, double inclination, double stress) {
        Require.positive("stress", stress);
        double bare = rodStress(0, length, inclination);
        if (Double.isNaN(bare) || bare >= stress) {
            return bare >= stress ? 0 : Double.NaN;
        }
        double elastic = column.elastic(length);
        double squash = rodArea * stress;
        double top = Math.min(squash, elastic * (1 - RELATIVE));
        if (rodStress(top, length, inclination) <= stress) {
            return Math.min(squash, elastic);
        }
        BrentSolver solver = new BrentSolver(RELATIVE, RELATIVE * top);
        return solver.solve(MAX_EVALUATIONS, p -> room(rodStress(p, length, inclination), stress), 0, top);
    }

    /** 1/2 without stress, 0 at the stress allowed, −1/2 at an infinite one: a function a root search can follow. */
    private static double room(double stress, double allowed) {
        return allowed / (stress + allowed) - 0.5;
    }

    /** Theory (C4): deflection at the gland from equal slopes there, then the moment; in N·m. */
    private double glandMoment(double load, double length, double inclination) {
        double l1 = tubeLength;
        double l2 = length - l1;
        double w1 = across(tubeWeight, inclination);
        double w2 = across(rodWeight, inclination);
        BeamPart tube = new BeamPart(l1, tubeStiffness, w1, load);
        BeamPart rod = new BeamPart(l2, rodStiffness, w2, load);
        double capReaction = (w1 * l1 * (length - l1 / 2) + w2 * l2 * l2 / 2) / length;
        double byWeight = capReaction * l1 - w1 * l1 * l1 / 2;
        double near = tube.turnPerNearMoment() + rod.turnPerNearMoment();
        double far = tube.turnPerFarMoment() + rod.turnPerFarMoment();
        double unbent = load * (eccentricity + kink) + byWeight;
        double turn = load * eccentricity * far + unbent * near + tube.turnByWeight() + rod.turnByWeight();
        double deflection = turn / (1 / l1 + 1 / l2 - load * near);
        return unbent + load * deflection;
    }

    private static double across(double weight, double inclination) {
        return weight * Math.abs(Math.cos(inclination));
    }
}
