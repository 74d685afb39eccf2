package org.rodside.model;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What works the ground, and which cylinder does which duty. Places are names of a point of the tool link or of one of
 * its pins.
 *
 * @param link name of the tool link
 * @param tip outermost cutting point
 * @param lip cutting edge without teeth
 * @param heel back end of the cutting line
 * @param fill where the payload sits; the tip where the file names none
 * @param hook where a lifted load hangs
 * @param width cutting width; in m
 * @param capacity bucket capacity; in m³
 * @param hoist name of the cylinder that hoists
 * @param crowd name of the cylinder that crowds
 * @param curl name of the cylinder that curls
 */
public record Tool(
        String link,
        String tip,
        Optional<String> lip,
        Optional<String> heel,
        String fill,
        String hook,
        OptionalDouble width,
        OptionalDouble capacity,
        Optional<String> hoist,
        Optional<String> crowd,
        String curl) {}
