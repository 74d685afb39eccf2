package org.rodside.study;

import java.util.OptionalDouble;

/**
 * What a cylinder must live with.
 *
 * @param pressure pressure that the worst loads may ask for; in Pa, empty for each cylinder's own working pressure
 * @param factor least buckling factor; no unit
 * @param speed speed at which flows are told; in m/s
 * @param eccentricity offset of the load at both pins for the loaded column; in m, empty to leave it out
 */
public record SizeQuestion(OptionalDouble pressure, double factor, double speed, OptionalDouble eccentricity) {

    /** Least buckling factor where nothing else is said: common practice, no source. */
    public static final double USUAL_FACTOR = 3.5;

    /** Speed for flows where nothing else is said: common practice, no source; in m/s. */
    public static final double USUAL_SPEED = 0.3;
}
