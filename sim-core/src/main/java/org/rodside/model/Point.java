package org.rodside.model;

/**
 * A place in the drawing.
 *
 * @param x forward from the swing axis; in m, machine axes
 * @param y up from the ground; in m, machine axes
 */
public record Point(double x, double y) {}
