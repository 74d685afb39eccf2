package org.rodside.hydraulics;

import org.rodside.model.Cylinder;
import org.rodside.model.Friction;
import org.rodside.model.Sides;

/**
 * Pressures that a force asks for, and how far they are from the line reliefs.
 *
 * <p>Every force taken here is the total of the twins in N, positive = push. The side that carries it (cap for a push,
 * rod for a pull) is the <em>loaded</em> side; the other one stands at its back pressure. A force of exactly 0 counts as
 * a push. NaN in gives NaN out.
 *
 * <p>Immutable, safe for any number of threads; only the methods that return {@link Sides} allocate.
 */
public final class CylinderPressure {

    private final CylinderArea area;
    private final Friction friction;
    private final Sides back;
    private final Sides relief;
    private final double workingCap;

    private CylinderPressure(Cylinder cylinder, boolean ideal) {
        area = CylinderArea.of(cylinder);
        friction = ideal ? Friction.NONE : cylinder.friction();
        back = ideal ? new Sides(0, 0) : cylinder.back();
        relief = cylinder.relief();
        workingCap = cylinder.working().cap();
    }

    /**
     * Pressures of a cylinder.
     *
     * @param cylinder the cylinder as drawn
     * @param ideal true for no friction and no back pressure
     * @throws IllegalArgumentException if bore, rod, count or friction make no sense
     */
    public static CylinderPressure of(Cylinder cylinder, boolean ideal) {
        return new CylinderPressure(cylinder, ideal);
    }

    /** Pressure on the cap side for a static force, theory (H3); in Pa. */
    public double cap(double force) {
        return force < 0 ? back.cap() : (force / area.count() + back.rod() * area.rod()) / area.cap();
    }

    /** Pressure on the rod side for a static force, theory (H3); in Pa. */
    public double rod(double force) {
        return force >= 0 ? back.rod() : (-force / area.count() + back.cap() * area.cap()) / area.rod();
    }

    /** Both pressures for a static force, theory (H3); in Pa. */
    public Sides of(double force) {
        return new Sides(cap(force), rod(force));
    }

    /**
     * Pressure on the cap side when the cylinder moves in the direction of its force and so overcomes its friction too,
     * theory (H4); in Pa.
     */
    public double drivingCap(double force) {
        return cap(beforeFriction(force));
    }

    /** As {@link #drivingCap}, on the rod side; in Pa. */
    public double drivingRod(double force) {
        return rod(beforeFriction(force));
    }

    /** As {@link #drivingCap}, both sides; in Pa. */
    public Sides driving(double force) {
        return of(beforeFriction(force));
    }

    /**
     * Ideal force at the pressures, from which friction leaves the given force, theory (H4): per cylinder (|F| +
     * constant)/(1 − share), with the sign of F; in N, all twins.
     */
    public double beforeFriction(double force) {
        double size = (Math.abs(force) + area.count() * friction.constant()) / (1 - friction.share());
        return force < 0 ? -size : size;
    }

    /**
     * Relief pressure of the loaded side over the static pressure on it, theory (H7): 1 when the relief just opens, below
     * 1 when the cylinder cannot hold the force, infinite when nothing stands on that side.
     */
    public double reliefMargin(double force) {
        return force < 0 ? relief.rod() / rod(force) : relief.cap() / cap(force);
    }

    /**
     * Rod-side pressure when the rod port is blocked while the pump works on the cap side, theory (H9): (w_cap·A_cap −
     * F/count)/A_rod, no friction, for that would lower it.
     *
     * @param force force the cylinder still exerts outside; in N, all twins, positive = push; 0 gives the highest
     *     figure that the pump alone can make, a pulling load goes beyond it
     * @return in Pa; below 0 means that the pump cannot push this load, so nothing is intensified
     */
    public double intensifiedRod(double force) {
        return (workingCap * area.cap() - force / area.count()) / area.rod();
    }

    /** Relief pressure of the rod side over {@link #intensifiedRod} at this force: below 1 the rod-side relief opens. */
    public double intensifiedMargin(double force) {
        return relief.rod() / intensifiedRod(force);
    }
}
