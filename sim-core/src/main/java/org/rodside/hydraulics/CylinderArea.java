package org.rodside.hydraulics;

import org.rodside.model.Cylinder;

/**
 * Areas of one cylinder, and what follows from areas alone: ideal force from two pressures, flow from a speed.
 *
 * <p>Immutable, safe for any number of threads, allocates nothing after it is built.
 */
public final class CylinderArea {

    private final int count;
    private final double harderShare;
    private final double cap;
    private final double rod;

    private CylinderArea(Cylinder cylinder) {
        count = cylinder.count();
        harderShare = cylinder.harderShare();
        cap = circle(cylinder.bore());
        rod = cap - circle(cylinder.rod());
    }

    /**
     * Areas of a cylinder, theory (H1).
     *
     * @throws IllegalArgumentException if the rod is not positive or not smaller than the bore
     */
    public static CylinderArea of(Cylinder cylinder) {
        return new CylinderArea(Require.cylinder(cylinder));
    }

    /** Area of a circle, π/4·d²; in m², the diameter in m. */
    static double circle(double diameter) {
        return Math.PI / 4 * diameter * diameter;
    }

    /** Piston area on the cap side, each cylinder; in m². */
    public double cap() {
        return cap;
    }

    /** Piston area left round the rod, each cylinder; in m². */
    public double rod() {
        return rod;
    }

    /** Cylinders side by side. */
    public int count() {
        return count;
    }

    /**
     * Ideal force of each cylinder, p_cap·A_cap − p_rod·A_rod, theory (H2).
     *
     * @param capPressure in Pa
     * @param rodPressure in Pa
     * @return in N, positive = push
     */
    public double forceEach(double capPressure, double rodPressure) {
        return capPressure * cap - rodPressure * rod;
    }

    /** Ideal force of all the twins together; in N, positive = push. Pressures in Pa. */
    public double force(double capPressure, double rodPressure) {
        return count * forceEach(capPressure, rodPressure);
    }

    /**
     * Force in the harder-worked of the twins: what its rod, eyes and column must carry. Pressures never use it, for
     * the twins see one pressure.
     *
     * @param force total of the twins; in N, positive = push
     * @return in N, same sign
     */
    public double harderForce(double force) {
        return harderShare * force;
    }

    /**
     * Oil that flows into the cap sides of all the twins, count·A_cap·v, theory (H8).
     *
     * @param speed stroke speed; in m/s, positive = extending
     * @return in m³/s, negative = out of the cap side
     */
    public double capFlow(double speed) {
        return count * cap * speed;
    }

    /**
     * Oil that flows into the rod sides of all the twins, −count·A_rod·v, theory (H8).
     *
     * @param speed stroke speed; in m/s, positive = extending
     * @return in m³/s, negative = out of the rod side, as when extending
     */
    public double rodFlow(double speed) {
        return -count * rod * speed;
    }

    /**
     * Oil that must be supplied to the side being filled, with the sign of the speed: count·A_cap·v when extending,
     * count·A_rod·v when retracting, theory (H8).
     *
     * @param speed stroke speed; in m/s, positive = extending
     * @return in m³/s, positive = into the cap side, negative = its size goes into the rod side
     */
    public double supply(double speed) {
        return speed >= 0 ? capFlow(speed) : -rodFlow(speed);
    }
}
