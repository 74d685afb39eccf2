package org.rodside.model;

/**
 * A pin, where it sits in the drawn pose.
 *
 * @param name name in the linkage file
 * @param at place in the drawn pose; in m, machine axes
 */
public record Pin(String name, Point at) {}
