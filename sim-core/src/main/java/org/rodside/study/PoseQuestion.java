package org.rodside.study;

/**
 * What acts on a front at one pose.
 *
 * @param fractions fraction of stroke of each cylinder, 0 retracted to 1 extended; not modified
 * @param forceX force of the ground on the tip, x; in N
 * @param forceY force of the ground on the tip, y; in N
 * @param payload payload at the fill point; in kg
 * @param driving cylinder whose friction its pressure must overcome; -1 for none
 * @param directions number of directions of the force polygon; 0 for none
 */
public record PoseQuestion(
        double[] fractions, double forceX, double forceY, double payload, int driving, int directions) {}
