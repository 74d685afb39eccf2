package org.rodside.report;

import java.util.List;
import java.util.OptionalDouble;

/**
 * A linkage in one pose, as it is to be drawn. Machine axes: x forward from the swing axis, y up from the ground; in m.
 *
 * @param frame pins on the frame
 * @param links moving links
 * @param cylinders cylinders
 * @param pins every pin
 * @param machine whether the ground is shown, and the tipping lines on it
 */
public record DrawnPose(Body frame, List<Body> links, List<Strut> cylinders, Cloud pins, Ground machine) {

    /**
     * Places; in m.
     *
     * @param x abscissas, not modified
     * @param y ordinates, as many
     */
    public record Cloud(double[] x, double[] y) {}

    /** A link: its name and every pin and point on it. */
    public record Body(String name, Cloud places) {}

    /**
     * A cylinder.
     *
     * @param name name
     * @param ends cap pin, then rod pin
     * @param tubeLength from cap pin to gland face; in m
     * @param outside outside diameter of the tube; in m
     * @param rod rod diameter; in m
     */
    public record Strut(String name, Cloud ends, double tubeLength, double outside, double rod) {}

    /**
     * What the machine stands on.
     *
     * @param shown whether there is ground to show, at y = 0
     * @param front x of the front tipping line; in m; empty where the file names no machine
     * @param rear x of the rear tipping line; in m
     */
    public record Ground(boolean shown, OptionalDouble front, OptionalDouble rear) {}

    public DrawnPose {
        links = List.copyOf(links);
        cylinders = List.copyOf(cylinders);
    }
}
