package org.rodside.model;

/**
 * Friction of one cylinder while it drives.
 *
 * @param constant part that does not depend on pressure; in N, each cylinder
 * @param share part of the ideal force at the pressure, 0 to below 1; no unit
 */
public record Friction(double constant, double share) {

    /** No friction. */
    public static final Friction NONE = new Friction(0, 0);
}
