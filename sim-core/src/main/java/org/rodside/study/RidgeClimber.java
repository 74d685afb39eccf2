package org.rodside.study;

import java.util.SplittableRandom;

/**
 * Climbs a function with kinks to its top inside the stroke box by gradient sampling (Burke, Lewis and Overton, SIAM J.
 * Optim. 15, 2005; recalled): gradients at a few places around the point, the shortest vector in their convex hull is the way
 * up, along a ridge where the function has one; when no step along it helps, the places move closer. Gradients are forward
 * differences. Owns its scratch; the same call always gives the same bits; not thread-safe.
 */
final class RidgeClimber {

    /** First and last distance of the sampled places; share of a stroke. */
    private static final double FIRST_RADIUS = 1e-2;

    private static final double LAST_RADIUS = 1e-8;

    /** Step of the forward differences as a share of the radius: well inside it, well above rounding. */
    private static final double DIFFERENCE = 1e-2;

    /** Steps taken at one radius at most; a ridge longer than that goes on at the next. */
    private static final int STEPS = 24;

    /** Rounds of the search for the shortest vector. */
    private static final int ROUNDS = 60;

    /** A step counts when it gains more than this share: less is rounding. */
    private static final double GAIN = 1e-13;

    private final BoxMaximum.Objective objective;
    private final int[] free;
    private final int samples;
    private final double[][] gradients;
    private final double[] here;
    private final double[] trial;
    private final double[] way;
    private double value;

    RidgeClimber(BoxMaximum.Objective objective, int[] free, int axes) {
        this.objective = objective;
        this.free = free;
        samples = 2 * free.length + 1;
        gradients = new double[samples][free.length];
        here = new double[axes];
        trial = new double[axes];
        way = new double[free.length];
    }

    Optimum climb(Optimum from) {
        System.arraycopy(from.at(), 0, here, 0, here.length);
        value = from.value();
        SplittableRandom random = new SplittableRandom(1);
        for (double radius = FIRST_RADIUS; radius > LAST_RADIUS; radius /= 10) {
            int taken = 0;
            while (taken < STEPS && step(radius, random)) {
                taken++;
            }
        }
        return new Optimum(value, here.clone());
    }

    private boolean step(double radius, SplittableRandom random) {
        int found = 0;
        for (int sample = 0; sample < samples; sample++) {
            for (int axis = 0; axis < here.length; axis++) {
                trial[axis] = here[axis];
            }
            for (int axis : free) {
                double off = sample == 0 ? 0 : radius * random.nextDouble(-1, 1);
                trial[axis] = inside(here[axis] + off);
            }
            found += gradient(radius * DIFFERENCE, gradients[found]) ? 1 : 0;
        }
        if (found == 0) {
            return false;
        }
        holdBounds(found);
        shortest(found);
        return walk(radius);
    }

    private static double inside(double fraction) {
        return Math.max(0, Math.min(1, fraction));
    }

    /** Gradient at the trial point, differenced towards the inside of the box; false where there is no value. */
    private boolean gradient(double by, double[] out) {
        double base = objective.at(trial);
        for (int i = 0; i < free.length; i++) {
            int axis = free[i];
            double kept = trial[axis];
            double step = kept + by > 1 ? -by : by;
            trial[axis] = kept + step;
            out[i] = (objective.at(trial) - base) / step;
            trial[axis] = kept;
            if (!(Math.abs(out[i]) < Double.POSITIVE_INFINITY)) {
                return false;
            }
        }
        return true;
    }

    /** Leaves out the directions in which every sampled gradient leads out of the box. */
    private void holdBounds(int found) {
        for (int i = 0; i < free.length; i++) {
            double at = here[free[i]];
            boolean out = at == 0 || at == 1;
            for (int s = 0; s < found && out; s++) {
                out = at == 0 ? gradients[s][i] <= 0 : gradients[s][i] >= 0;
            }
            for (int s = 0; s < found && out; s++) {
                gradients[s][i] = 0;
            }
        }
    }

    /** Shortest vector in the convex hull of the gradients, by walking towards the corner that shortens most. */
    private void shortest(int found) {
        System.arraycopy(gradients[0], 0, way, 0, way.length);
        for (int round = 0; round < ROUNDS; round++) {
            int corner = 0;
            double least = Double.POSITIVE_INFINITY;
            for (int s = 0; s < found; s++) {
                double along = dot(way, gradients[s]);
                if (along < least) {
                    least = along;
                    corner = s;
                }
            }
            double square = dot(way, way);
            double gap = 0;
            for (int i = 0; i < way.length; i++) {
                double d = gradients[corner][i] - way[i];
                gap += d * d;
            }
            double share = gap > 0 ? Math.min(1, (square - least) / gap) : 0;
            if (!(share > 1e-12)) {
                return;
            }
            for (int i = 0; i < way.length; i++) {
                way[i] += share * (gradients[corner][i] - way[i]);
            }
        }
    }

    private static double dot(double[] a, double[] b) {
        double sum = 0;
        for (int i = 0; i < a.length; i++) {
            sum += a[i] * b[i];
        }
        return sum;
    }

    /** Goes along the way as far as it rises; false where it does not. */
    private boolean walk(double radius) {
        double size = Math.sqrt(dot(way, way));
        if (!(size > 0)) {
            return false;
        }
        double reached = Double.NaN;
        double length = 0.1 * radius;
        double best = value + GAIN * Math.abs(value);
        for (double stride = length; stride <= 1; stride *= 2) {
            put(stride / size);
            double there = objective.at(trial);
            if (!(there > best)) {
                break;
            }
            best = there;
            reached = stride;
        }
        if (Double.isNaN(reached)) {
            return false;
        }
        put(reached / size);
        System.arraycopy(trial, 0, here, 0, here.length);
        value = best;
        return true;
    }

    private void put(double times) {
        System.arraycopy(here, 0, trial, 0, here.length);
        for (int i = 0; i < free.length; i++) {
            trial[free[i]] = inside(here[free[i]] + times * way[i]);
        }
    }
}
