package org.rodside.study;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.SplittableRandom;

/**
 * Largest value of a function of the stroke fractions over the whole stroke box: a grid finds the hills, a pattern search
 * climbs each of the highest to its continuous top. The function may have kinks (it often is the least of several
 * limits) and may have no value (NaN) at some poses. The same call always gives the same bits.
 */
public final class BoxMaximum {

    /** What is to be made largest. */
    @FunctionalInterface
    public interface Objective {

        /**
         * @param fractions fraction of stroke of each cylinder; not modified
         * @return the value; NaN where there is none
         */
        double at(double[] fractions);
    }

    /** Grid points an axis for 1, 2, 3, 4, … free cylinders. */
    private static final int[] GRID = {257, 49, 21, 11, 7, 5};

    /** Hills that are climbed. */
    private static final int CLIMBS = 16;

    /** The search ends when its stride falls below this share of a stroke; no unit. */
    private static final double LAST_STRIDE = 1e-9;

    /** Random directions tried, beside the regular ones, before a stride is halved: they follow slanting ridges. */
    private static final int RANDOM_DIRECTIONS = 24;

    private final int[] free;
    private final double[] start;
    private final int grid;

    /**
     * @param fixed fraction of each cylinder that does not move, NaN for one that is free; not modified
     */
    public BoxMaximum(double[] fixed) {
        this(fixed, 1);
    }

    /**
     * @param fixed fraction of each cylinder that does not move, NaN for one that is free; not modified
     * @param refinement how many times finer than usual the first grid is
     */
    public BoxMaximum(double[] fixed, int refinement) {
        List<Integer> moving = new ArrayList<>();
        for (int c = 0; c < fixed.length; c++) {
            if (Double.isNaN(fixed[c])) {
                moving.add(c);
            }
        }
        free = moving.stream().mapToInt(Integer::intValue).toArray();
        start = fixed.clone();
        grid = free.length == 0 ? 1 : (GRID[Math.min(free.length, GRID.length) - 1] - 1) * refinement + 1;
    }

    /** A search over all strokes of a front. */
    public static BoxMaximum overAll(int cylinders) {
        double[] all = new double[cylinders];
        Arrays.fill(all, Double.NaN);
        return new BoxMaximum(all);
    }

    /** Finds the largest value. */
    public Optimum find(Objective objective) {
        double[] values = gridValues(objective);
        Optimum best = new Optimum(Double.NaN, start);
        for (int cell : hills(values)) {
            Optimum top = climb(objective, new Optimum(values[cell], point(cell)));
            if (!best.exists() || top.value() > best.value()) {
                best = top;
            }
        }
        return best;
    }

    /** Climbs from a given pose only. */
    public Optimum climbFrom(Objective objective, double[] fractions) {
        return climb(objective, new Optimum(objective.at(fractions), fractions.clone()));
    }

    private int cells() {
        int cells = 1;
        for (int i = 0; i < free.length; i++) {
            cells *= grid;
        }
        return cells;
    }

    private double[] point(int cell) {
        double[] point = start.clone();
        int rest = cell;
        for (int axis : free) {
            point[axis] = (rest % grid) / (double) (grid - 1);
            rest /= grid;
        }
        return point;
    }

    private double[] gridValues(Objective objective) {
        double[] values = new double[cells()];
        for (int cell = 0; cell < values.length; cell++) {
            values[cell] = objective.at(point(cell));
        }
        return values;
    }

    /** Grid points not lower than any neighbour, the highest first. */
    private List<Integer> hills(double[] values) {
        List<Integer> hills = new ArrayList<>();
        for (int cell = 0; cell < values.length; cell++) {
            if (!Double.isNaN(values[cell]) && !hasHigherNeighbour(values, cell)) {
                hills.add(cell);
            }
        }
        hills.sort(Comparator.comparingDouble((Integer cell) -> -values[cell]));
        return hills.subList(0, Math.min(CLIMBS, hills.size()));
    }

    private boolean hasHigherNeighbour(double[] values, int cell) {
        int stride = 1;
        int rest = cell;
        for (int i = 0; i < free.length; i++) {
            int place = rest % grid;
            rest /= grid;
            if (place > 0 && values[cell - stride] > values[cell]
                    || place < grid - 1 && values[cell + stride] > values[cell]) {
                return true;
            }
            stride *= grid;
        }
        return false;
    }

    private Optimum climb(Objective objective, Optimum from) {
        double[] here = from.at().clone();
        double[] trial = here.clone();
        double value = from.value();
        if (free.length == 0 || Double.isNaN(value)) {
            return from;
        }
        List<double[]> regular = regularDirections();
        SplittableRandom random = new SplittableRandom(20260101);
        double stride = 0.5 / Math.max(1, grid - 1);
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
