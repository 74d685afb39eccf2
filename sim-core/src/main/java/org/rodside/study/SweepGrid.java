package org.rodside.study;

import java.util.ArrayList;
import java.util.List;
import org.rodside.kinematics.CylinderStep;
import org.rodside.kinematics.Mechanism;
import org.rodside.kinematics.Step;

/**
 * Grid over the stroke box: the same number of equal steps from retracted to extended on every cylinder. Lines run along
 * the cylinder that is assembled last (the one nearest the tool); the one assembled first changes slowest. Immutable.
 */
final class SweepGrid {

    private final int steps;
    private final int[] order;

    SweepGrid(Mechanism mechanism, int steps) {
        this.steps = steps;
        List<Integer> list = new ArrayList<>();
        for (Step step : mechanism.steps()) {
            if (step instanceof CylinderStep c) {
                list.add(c.cylinder());
            }
        }
        for (int c = 0; c < mechanism.cylinders(); c++) {
            if (!list.contains(c)) {
                list.add(c);
            }
        }
        order = list.stream().mapToInt(Integer::intValue).toArray();
    }

    int steps() {
        return steps;
    }

    /** Number of cylinders. */
    int axes() {
        return order.length;
    }

    /** The cylinder of an axis, slowest first. */
    int cylinder(int axis) {
        return order[axis];
    }

    /** Number of lines. */
    long lines() {
        long lines = 1;
        for (int axis = 1; axis < order.length; axis++) {
            lines = Math.multiplyExact(lines, steps);
        }
        return lines;
    }

    /** Grid indices of a line; overwritten. */
    void outer(long line, int[] out) {
        long rest = line;
        for (int axis = order.length - 2; axis >= 0; axis--) {
            out[axis] = (int) (rest % steps);
            rest /= steps;
        }
    }

    /** Fraction of stroke at a grid index; no unit. */
    double fraction(int index) {
        return steps == 1 ? 0.5 : index / (double) (steps - 1);
    }

    /** Fractions of a pose on a line, by cylinder; overwritten. */
    void fractions(int[] outer, int last, double[] out) {
        for (int axis = 0; axis < order.length - 1; axis++) {
            out[order[axis]] = fraction(outer[axis]);
        }
        out[order[order.length - 1]] = fraction(last);
    }
}
