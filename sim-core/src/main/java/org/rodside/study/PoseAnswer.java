package org.rodside.study;

import java.util.List;
import java.util.Optional;
import org.rodside.kinematics.PoseBuffer;
import org.rodside.model.Sides;
import org.rodside.statics.ForceBuffer;

/**
 * Everything about one pose. The buffers are this answer's own and not to be modified.
 *
 * @param front the front
 * @param fractions fraction of stroke of each cylinder; no unit
 * @param pose where everything stands; in m
 * @param forces cylinder and bearing forces; in N
 * @param pressures pressures of each cylinder; in Pa
 * @param ground what the ground does, where the linkage has a machine
 * @param polygon largest force on the ground in each direction asked for
 */
public record PoseAnswer(
        Front front,
        double[] fractions,
        PoseBuffer pose,
        ForceBuffer forces,
        List<Sides> pressures,
        Optional<Ground> ground,
        List<Direction> polygon) {

    /**
     * Ground on machine, level ground.
     *
     * @param normal upward force; in N
     * @param horizontal forward force; in N
     * @param resultantX where the upward force passes; in m from the swing axis
     */
    public record Ground(double normal, double horizontal, double resultantX) {}

    /**
     * Largest force on the ground in one direction with every cylinder holding.
     *
     * @param direction direction of the force on the ground, from +x anticlockwise; in rad
     * @param force largest force; in N
     * @param limit name of the limit that governs
     */
    public record Direction(double direction, double force, String limit) {}
}
