package org.rodside.model;

import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * A working pass as a user writes it: where the tip goes and what it meets.
 *
 * @param rate samples a second; in 1/s
 * @param soil the ground, where the pass cuts it
 * @param start where the tip starts; in m, machine axes
 * @param startAngle direction from hook to tip at the start, from +x anticlockwise; in rad
 * @param moves the moves in order
 * @param hold fraction of stroke by name of the cylinders that neither hoist, crowd nor curl; those not named stand at half
 */
public record DutyPass(
        double rate, Optional<Soil> soil, Point start, double startAngle, List<Move> moves, Map<String, Double> hold) {

    public DutyPass {
        moves = List.copyOf(moves);
        hold = Ordered.copyOf(hold);
    }

    /**
     * The ground.
     *
     * @param density in place; in kg/m³
     * @param cohesion in Pa
     * @param friction angle of internal friction; in rad
     * @param wallFriction angle of friction between ground and blade; in rad
     * @param adhesion between ground and blade; in Pa
     * @param surcharge pressure on the surface; in Pa
     * @param fillFactor heaped volume over the bucket's capacity; no unit
     */
    public record Soil(
            double density,
            double cohesion,
            double friction,
            double wallFriction,
            double adhesion,
            double surcharge,
            double fillFactor) {}

    /**
     * One move of the tip along a straight line, from rest to rest.
     *
     * @param to where it ends; in m, machine axes
     * @param angle direction from hook to tip at its end; in rad
     * @param seconds how long it takes; in s
     * @param cut depth of cut; in m, 0 where it does not cut
     * @param empty whether the bucket lets its load out on the way
     */
    public record Move(Point to, double angle, double seconds, double cut, boolean empty) {}
}
