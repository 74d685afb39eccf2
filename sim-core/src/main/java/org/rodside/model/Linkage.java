package org.rodside.model;

import java.util.List;
import java.util.Optional;

/**
 * A whole front as drawn: frame, links, pins and cylinders in one drawn pose, machine axes (x forward from the swing
 * axis, y up from the ground), SI units. The reader has checked it; it holds no computation.
 *
 * @param name name of the machine or front
 * @param note free text of the file, empty where it has none
 * @param pins every pin once, in file order
 * @param framePins names of the pins on the frame
 * @param links moving links, in file order
 * @param cylinders cylinders, in file order
 * @param tool the tool and the duties, where the file has them
 * @param machine the machine under the front, where the file has it
 */
public record Linkage(
        String name,
        String note,
        List<Pin> pins,
        List<String> framePins,
        List<Link> links,
        List<Cylinder> cylinders,
        Optional<Tool> tool,
        Optional<Machine> machine) {

    /** The name of the frame among the links. */
    public static final String FRAME = "frame";

    /** Standard acceleration of free fall, 3rd CGPM (1901), ISO 80000-3; in m/s². */
    public static final double GRAVITY = 9.80665;

    public Linkage {
        pins = List.copyOf(pins);
        framePins = List.copyOf(framePins);
        links = List.copyOf(links);
        cylinders = List.copyOf(cylinders);
    }
}
