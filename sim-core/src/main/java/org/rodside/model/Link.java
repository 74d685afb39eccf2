package org.rodside.model;

import java.util.List;
import java.util.Map;

/**
 * One rigid link as drawn.
 *
 * @param name name in the linkage file
 * @param pins names of the pins on the link, in file order
 * @param mass mass; in kg, zero where the file gives none
 * @param cg centre of gravity in the drawn pose; in m, machine axes
 * @param gyration radius of gyration about the centre of gravity; in m
 * @param points named points on the link in the drawn pose, in file order; in m, machine axes
 */
public record Link(String name, List<String> pins, double mass, Point cg, double gyration, Map<String, Point> points) {

    public Link {
        pins = List.copyOf(pins);
        points = Ordered.copyOf(points);
    }
}
