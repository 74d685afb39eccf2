package org.rodside.study;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;

/**
 * Finds the last digits of a top: tries steps along regular and random directions, shorter and shorter. Never leaves the
 * stroke box; the same call gives the same bits.
 */
final class PatternSearch {

    /** First and last stride of the search for the last digits; share of a stroke. */
    private static final double FIRST_STRIDE = 1e-3;

    private static final double LAST_STRIDE = 1e-7;

    /** Random directions tried, beside the regular ones, before a stride is shortened: they follow slanting ridges. */
    private static final int RANDOM_DIRECTIONS = 24;

    private static final int SEED = 20260101;

    private final BoxMaximum.Objective objective;
    private final int[] free;

    /**
     * @param objective what is to be made largest
     * @param free axes along which it may move; not modified
     */
    PatternSearch(BoxMaximum.Objective objective, int[] free) {
        this.objective = objective;
        this.free = free;
    }

    /** The top near a place that is almost there; never lower. */
    Optimum lastDigits(Optimum from) {
        double[] here = from.at().clone();
        double[] trial = here.clone();
        double value = from.value();
        List<double[]> regular = regularDirections();
        SplittableRandom random = new SplittableRandom(SEED);
        double stride = FIRST_STRIDE;
        while (stride > LAST_STRIDE) {
            double better = value;
            for (int i = 0; i < regular.size() + RANDOM_DIRECTIONS && !(better > value); i++) {
                double[] direction = i < regular.size() ? regular.get(i) : randomDirection(random);
                step(here, direction, stride, trial);
                better = objective.at(trial);
            }
            if (better > value) {
                value = better;
                System.arraycopy(trial, 0, here, 0, here.length);
                stride = Math.min(0.25, 2 * stride);
            } else {
                stride /= 4;
            }
        }
        return new Optimum(value, here);
    }

    private void step(double[] here, double[] direction, double stride, double[] out) {
        for (int i = 0; i < free.length; i++) {
            int axis = free[i];
            out[axis] = Math.max(0, Math.min(1, here[axis] + stride * direction[i]));
        }
    }

    private List<double[]> regularDirections() {
        List<double[]> directions = new ArrayList<>();
        int count = (int) Math.pow(3, Math.min(free.length, 3));
        for (int code = 0; code < count; code++) {
            double[] direction = new double[free.length];
            int rest = code;
            for (int i = 0; i < Math.min(free.length, 3); i++) {
                direction[i] = rest % 3 - 1;
                rest /= 3;
            }
            directions.add(direction);
        }
        for (int i = 3; i < free.length; i++) {
            for (int sign = -1; sign <= 1; sign += 2) {
                double[] direction = new double[free.length];
                direction[i] = sign;
                directions.add(direction);
            }
        }
        return directions;
    }

    private double[] randomDirection(SplittableRandom random) {
        double[] direction = new double[free.length];
        for (int i = 0; i < direction.length; i++) {
            direction[i] = random.nextDouble(-1, 1);
        }
        return direction;
    }
}
