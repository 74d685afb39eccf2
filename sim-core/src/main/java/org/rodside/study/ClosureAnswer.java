package org.rodside.study;

import java.util.List;
import java.util.Optional;

/**
 * How a linkage closes over its stroke box.
 *
 * @param freedoms degrees of freedom, one for each cylinder
 * @param closedForm whether every loop closes in closed form; otherwise the dense way is used
 * @param poses grid poses tried
 * @param assembled grid poses that assemble
 * @param firstFailure fraction of stroke of each cylinder at the first grid pose that does not assemble
 * @param failingLink link that cannot be placed there
 * @param corners smallest transmission angle and lever arm of every cylinder
 */
public record ClosureAnswer(
        int freedoms,
        boolean closedForm,
        long poses,
        long assembled,
        Optional<double[]> firstFailure,
        String failingLink,
        List<Corner> corners) {

    /**
     * The weakest place of one cylinder's stage.
     *
     * @param cylinder index of the cylinder
     * @param smallestFailing smallest fraction of its stroke in a grid pose that does not assemble; NaN where all do
     * @param largestFailing largest such fraction
     * @param angle smallest transmission angle, between the two members at a corner, 0 to π/2; in rad, NaN without closed form
     * @param angleAt fraction of stroke of each cylinder there
     * @param arm smallest lever arm: stroke for each radian of the link it turns; in m
     * @param armAt fraction of stroke of each cylinder there
     */
    public record Corner(
            int cylinder,
            double smallestFailing,
            double largestFailing,
            double angle,
            double[] angleAt,
            double arm,
            double[] armAt) {}
}
