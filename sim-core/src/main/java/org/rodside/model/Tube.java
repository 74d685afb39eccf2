package org.rodside.model;

/**
 * The tube of a cylinder as a column part.
 *
 * @param length from cap pin to gland face; in m
 * @param outside outside diameter; in m
 */
public record Tube(double length, double outside) {}
