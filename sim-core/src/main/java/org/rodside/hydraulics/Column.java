package org.rodside.hydraulics;

import org.rodside.model.Cylinder;

/**
 * A cylinder as a pinned–pinned column of two uniform parts, tube and exposed rod.
 *
 * <p><b>What:</b> the smallest P &gt; 0 with tan(k₁L₁)/k₁ + tan(k₂L₂)/k₂ = 0, k = √(P/EI), theory (C1); when that exceeds
 * half the yield of the rod, the parabola of (C3). <b>Accuracy:</b> 1e-12 relative. <b>Edges:</b> a pin-to-pin length at
 * or below the tube length leaves no exposed rod, and the answer is the uniform tube at that length (C2); lengths that are
 * not positive, and NaN, give NaN. <b>Threads:</b> immutable, allocates nothing after it is built.
 */
public final class Column {

    /** Young's modulus of steel; in Pa. */
    public static final double YOUNG = 206e9;

    /**
     * Newton stops after a step this small against the root, no unit: the step converges quadratically, so what is left
     * is its square, near rounding.
     */
    private static final double LAST_STEP = 1e-8;

    /** More steps than halving the bracket alone needs to reach rounding. */
    private static final int MAX_STEPS = 80;

    private final double tubeLength;
    private final double tubeCompliance;
    private final double rodCompliance;
    private final double rodArea;
    private final double yield;
    private final double harderShare;

    private Column(Cylinder cylinder) {
        tubeLength = Require.positive(
                cylinder.name() + ".tube.length", cylinder.tube().length());
        tubeCompliance = compliance(tubeStiffness(cylinder));
        rodCompliance = compliance(rodStiffness(cylinder));
        rodArea = CylinderArea.circle(cylinder.rod());
        yield = Require.positive(cylinder.name() + ".yield", cylinder.yield());
        harderShare = cylinder.harderShare();
    }

    /**
     * The column of one cylinder.
     *
     * @throws IllegalArgumentException if the tube is not wider than the bore, or another size makes no sense
     */
    public static Column of(Cylinder cylinder) {
        return new Column(Require.cylinder(cylinder));
    }

    /** Bending stiffness E·I of the tube; in N·m². */
    static double tubeStiffness(Cylinder cylinder) {
        double outside = cylinder.tube().outside();
        if (!(outside > cylinder.bore())) {
            throw new IllegalArgumentException(cylinder.name() + ".tube.outside must be larger than the bore, "
                    + cylinder.bore() + " m, was " + outside + " m");
        }
        return YOUNG * (inertia(outside) - inertia(cylinder.bore()));
    }

    /** Bending stiffness E·I of the rod; in N·m². */
    static double rodStiffness(Cylinder cylinder) {
        return YOUNG * inertia(cylinder.rod());
    }

    /** Second moment of area of a full circle, π/64·d⁴; in m⁴. */
    static double inertia(double diameter) {
        return Math.PI / 64 * Math.pow(diameter, 4);
    }

    /** k over √P; in 1/(m·√N). */
    private static double compliance(double stiffness) {
        return 1 / Math.sqrt(stiffness);
    }

    /**
     * Elastic (Euler) load of this column, theory (C1), (C2).
     *
     * @param length pin to pin; in m
     * @return in N, each cylinder
     */
    public double elastic(double length) {
        return firstRoot(tubeCompliance, tubeLength, rodCompliance, length);
    }

    /**
     * Load at which the column fails: elastic, or the parabola where the rod yields first, theory (C3).
     *
     * @param length pin to pin; in m
     * @return in N, each cylinder
     */
    public double critical(double length) {
        return parabola(elastic(length), rodArea, yield);
    }

    /**
     * Critical load over the push in the harder-worked of the twins.
     *
     * @param length pin to pin; in m
     * @param force total of the twins; in N, positive = push
     * @return no unit; infinite when the cylinder does not push
     */
    public double factor(double length, double force) {
        double push = harderShare * force;
        return push <= 0 ? Double.POSITIVE_INFINITY : critical(length) / push;
    }

    /** Theory (C3). Elastic load and result in N, area in m², yield stress in Pa. */
    static double parabola(double elastic, double area, double yield) {
        double squash = area * yield;
        return elastic > squash / 2 ? squash * (1 - squash / (4 * elastic)) : elastic;
    }

    /**
     * Elastic load of a pinned–pinned column in two uniform parts, theory (C1).
     *
     * @param stiffnessA bending stiffness E·I of one part; in N·m²
     * @param lengthA length of that part; in m
     * @param stiffnessB bending stiffness E·I of the other; in N·m²
     * @param lengthB length of the other; in m; 0 or less: there is no other part and the first is cut to the sum
     * @return in N; NaN when a length makes no sense
     */
    public static double elasticLoad(double stiffnessA, double lengthA, double stiffnessB, double lengthB) {
        Require.positive("stiffnessA", stiffnessA);
        Require.positive("stiffnessB", stiffnessB);
        return firstRoot(compliance(stiffnessA), lengthA, compliance(stiffnessB), lengthA + lengthB);
    }

    /** Theory (C2) where no second part is left, else (C1); arguments as k over √P and m. */
    private static double firstRoot(double tube, double tubeLength, double rod, double length) {
        double rodLength = length - tubeLength;
        if (!(length > 0)) {
            return Double.NaN;
        }
        if (!(rodLength > 0)) {
            return square(Math.PI / (tube * length));
        }
        return tube <= rod ? rootFrom(tube, tubeLength, rod, rodLength) : rootFrom(rod, rodLength, tube, tubeLength);
    }

    /**
     * The root in s = √P, starting at the end of the stiffer part 1. With a = c₁L₁s and b = c₂L₂s the column's shape leaves
     * part 1 with phase atan2(c₂ sin a, c₁ cos a) as part 2 counts it; with b on top the phase must be π. That sum rises
     * with s, so the root in the bracket is the only one and Newton's step, halved back when it leaves the bracket, finds
     * it. (C1) says why the bracket holds and why the stiffer part comes first.
     */
    private static double rootFrom(double c1, double length1, double c2, double length2) {
        double u = c1 * length1;
        double w = c2 * length2;
        double length = length1 + length2;
        double low = Math.max(Math.PI / 2 / Math.max(u, w), Math.PI / (c2 * length));
        double high = Math.min(Math.PI / Math.max(u, w), Math.PI / (c1 * length));
        double s = (low + high) / 2;
        for (int step = 0; step < MAX_STEPS; step++) {
            double sin = Math.sin(u * s);
            double cos = Math.cos(u * s);
            double excess = Math.atan2(c2 * sin, c1 * cos) + w * s - Math.PI;
            double slope = c1 * c2 * u / (square(c1 * cos) + square(c2 * sin)) + w;
            low = excess < 0 ? s : low;
            high = excess < 0 ? high : s;
            double next = s - excess / slope;
            boolean inside = next >= low && next <= high;
            double moved = (inside ? next : (low + high) / 2) - s;
            s += moved;
            if (Math.abs(moved) <= LAST_STEP * s) {
                break;
            }
        }
        return square(s);
    }

    private static double square(double x) {
        return x * x;
    }
}
