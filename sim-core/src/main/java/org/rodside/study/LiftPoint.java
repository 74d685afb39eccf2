package org.rodside.study;

/**
 * Lift capacity at one place of the hook.
 *
 * @param radius from the swing axis; in m
 * @param height of the hook above the ground; in m
 * @param rated the smaller of 87 % of the hydraulic and 75 % of the tipping load; in kg
 * @param limit {@code hydraulic} or {@code tipping}, whichever sets the rated load
 * @param hydraulic payload at which the hoist meets its driving limit or another cylinder its holding limit; in kg
 * @param hydraulicLimit name of that limit
 * @param tipping payload at which the machine balances on the tipping line; in kg, NaN where no payload tips it
 * @param at fraction of stroke of each cylinder; not to be modified
 */
public record LiftPoint(
        double radius,
        double height,
        double rated,
        String limit,
        double hydraulic,
        String hydraulicLimit,
        double tipping,
        double[] at) {}
