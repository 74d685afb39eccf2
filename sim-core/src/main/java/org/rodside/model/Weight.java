package org.rodside.model;

/**
 * A lump of the machine.
 *
 * @param mass mass; in kg
 * @param cg centre of gravity; in m, machine axes
 */
public record Weight(double mass, Point cg) {}
