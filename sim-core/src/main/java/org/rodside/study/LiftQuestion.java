package org.rodside.study;

/**
 * How a lift is asked.
 *
 * @param step grid step in radius and height; in m
 * @param fractions fraction of stroke of every cylinder; hoist and crowd are not used, the rest stand there; not modified
 * @param overSide whether the front stands across, over the side tipping line
 * @param bare whether the tool link's mass is left out
 */
public record LiftQuestion(double step, double[] fractions, boolean overSide, boolean bare) {

    /** Cylinders that neither hoist, crowd nor curl stand here where nothing else is said; no unit. */
    public static final double USUAL_OTHERS = 0.5;
}
