package org.rodside.hydraulics;

import org.rodside.model.Cylinder;
import org.rodside.model.Friction;
import org.rodside.model.Sides;

/**
 * What a cylinder can push and pull, driven by the pump or held by its blocked line: totals of the twins in N, given as
 * sizes, so a pull limit of 100 kN is +100 000.
 *
 * <p>A driving limit below zero is kept: it says that pump pressure does not even overcome back pressure and friction, so
 * the cylinder cannot move in that direction without help from the load. Nothing is clamped.
 *
 * <p>Immutable, safe for any number of threads, allocates nothing after it is built.
 */
public final class CylinderLimits {

    private final double drivingPush;
    private final double drivingPull;
    private final double holdingPush;
    private final double holdingPull;

    private CylinderLimits(Cylinder cylinder, boolean ideal) {
        CylinderArea area = CylinderArea.of(cylinder);
        int count = cylinder.count();
        Sides working = cylinder.working();
        Sides back = ideal ? new Sides(0, 0) : cylinder.back();
        Friction friction = ideal ? Friction.NONE : cylinder.friction();
        drivingPush = count * lessFriction(area.forceEach(working.cap(), back.rod()), friction);
        drivingPull = count * lessFriction(-area.forceEach(back.cap(), working.rod()), friction);
        holdingPush = count * cylinder.relief().cap() * area.cap();
        holdingPull = count * cylinder.relief().rod() * area.rod();
    }

    /**
     * Limits of a cylinder.
     *
     * @param cylinder the cylinder as drawn
     * @param ideal true for no friction and no back pressure, the condition of rated digging forces
     * @throws IllegalArgumentException if bore, rod, count or friction make no sense
     */
    public static CylinderLimits of(Cylinder cylinder, boolean ideal) {
        return new CylinderLimits(cylinder, ideal);
    }

    /** Theory (H4): friction takes away from the ideal force, whichever way that acts; in N, each cylinder. */
    private static double lessFriction(double idealForce, Friction friction) {
        return idealForce - (friction.constant() + friction.share() * Math.abs(idealForce));
    }

    /** Largest push while the pump drives it, theory (H5); in N, all twins. */
    public double drivingPush() {
        return drivingPush;
    }

    /** Largest pull while the pump drives it, theory (H5); in N, all twins, a size. */
    public double drivingPull() {
        return drivingPull;
    }

    /** Push at which the cap line's relief opens while the cylinder is blocked, theory (H6); in N, all twins. */
    public double holdingPush() {
        return holdingPush;
    }

    /** Pull at which the rod line's relief opens while the cylinder is blocked, theory (H6); in N, all twins, a size. */
    public double holdingPull() {
        return holdingPull;
    }
}
