package org.rodside.study;

/**
 * A largest tool force.
 *
 * @param force force on the ground; in N, NaN where the pose does not assemble, infinite where nothing limits it
 * @param limit name of the limit that governs
 * @param at fraction of stroke of each cylinder; not to be modified
 */
public record DigForce(double force, String limit, double[] at) {}
