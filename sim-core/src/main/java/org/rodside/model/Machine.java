package org.rodside.model;

import java.util.OptionalDouble;

/**
 * What the front stands on. All abscissas from the swing axis.
 *
 * @param swinging what swings with the front, the front itself left out
 * @param fixed undercarriage
 * @param tippingFront x of the front tipping line; in m
 * @param tippingRear x of the rear tipping line; in m
 * @param tippingSide distance of the side tipping line when the front stands across; in m
 * @param grip friction number between undercarriage and ground; no unit; empty where slip is not judged
 */
public record Machine(
        Weight swinging,
        Weight fixed,
        double tippingFront,
        double tippingRear,
        OptionalDouble tippingSide,
        OptionalDouble grip) {}
