package org.rodside.model;

/**
 * One pressure for each side of a piston.
 *
 * @param cap pressure on the cap side; in Pa
 * @param rod pressure on the rod side; in Pa
 */
public record Sides(double cap, double rod) {}
