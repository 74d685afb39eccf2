package org.rodside.study;

import org.rodside.kinematics.PoseBuffer;

/**
 * A named place on a body.
 *
 * @param name name in the linkage file
 * @param body index of the body
 * @param x drawn place; in m
 * @param y drawn place; in m
 */
public record Place(String name, int body, double x, double y) {

    /** Where the place stands in a pose, x; in m, machine axes. */
    public double x(PoseBuffer pose) {
        return pose.x(body, x, y);
    }

    /** Where the place stands in a pose, y; in m, machine axes. */
    public double y(PoseBuffer pose) {
        return pose.y(body, x, y);
    }
}
