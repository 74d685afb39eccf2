package org.rodside.study;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.SplittableRandom;

/**
 * Largest value of a function of the stroke fractions over the whole stroke box: a grid finds the hills, each of the highest
 * is climbed along its ridges, cells that could hide a higher peak are looked into, and a pattern search finds the last
 * digits. The function may have kinks (it often is the least of several
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

    /** Grid values that differ by less than this share are the same height: rounding; no unit. */
    private static final double SAME = 1e-9;

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
        this((usualGrid(fixed) - 1) * refinement + 1, fixed);
    }

    private BoxMaximum(int gridPoints, double[] fixed) {
        List<Integer> moving = new ArrayList<>();
        for (int c = 0; c < fixed.length; c++) {
            if (Double.isNaN(fixed[c])) {
                moving.add(c);
            }
        }
        free = moving.stream().mapToInt(Integer::intValue).toArray();
        start = fixed.clone();
        grid = free.length == 0 ? 1 : gridPoints;
    }

    private static int usualGrid(double[] fixed) {
        int free = (int) Arrays.stream(fixed).filter(Double::isNaN).count();
        return free == 0 ? 1 : GRID[Math.min(free, GRID.length) - 1];
    }

    /** A search whose first grid has a given number of points an axis. */
    static BoxMaximum withGrid(double[] fixed, int gridPoints) {
        return new BoxMaximum(gridPoints, fixed);
    }

    /** A search over all strokes of a front. */
    public static BoxMaximum overAll(int cylinders) {
        double[] all = new double[cylinders];
        Arrays.fill(all, Double.NaN);
        return new BoxMaximum(all);
    }

    /** Finds the largest value. */
    public Optimum find(Objective objective) {
        return findFrom(gridValues(objective), objective);
    }

    /**
     * Finds the largest value of a function whose values on the grid are known.
     *
     * @param values value at every {@link #point}; not modified
     * @param objective the same function
     */
    public Optimum findFrom(double[] values, Objective objective) {
        Optimum best = new Optimum(Double.NaN, start);
        RidgeClimber ridge = new RidgeClimber(objective, free);
        for (int cell : hills(values)) {
            if (!best.exists() || values[cell] + 2 * drop(values, cell) > best.value()) {
                Optimum top = new Optimum(values[cell], point(cell));
                top = free.length == 0 ? top : ridge.climb(top);
                best = !best.exists() || top.value() > best.value() ? top : best;
            }
        }
        if (free.length == 0 || !best.exists()) {
            return best;
        }
        return climb(objective, ridge.top(new CellSearch(objective, free).open(best, values, grid)));
    }

    /** Climbs from a given pose only. */
    public Optimum climbFrom(Objective objective, double[] fractions) {
        Optimum from = new Optimum(objective.at(fractions), fractions.clone());
        if (free.length == 0 || !from.exists()) {
            return from;
        }
        return climb(objective, new RidgeClimber(objective, free).top(from));
    }

    /** Number of grid points. */
    public int cells() {
        int cells = 1;
        for (int i = 0; i < free.length; i++) {
            cells *= grid;
        }
        return cells;
    }

    /** Number of grid points that differ in all but the last free stroke: a fair piece of work. */
    public int cellsInASlice() {
        return cells() / grid;
    }

    /** Fractions of a grid point. */
    public double[] point(int cell) {
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

    /**
     * Grid points not lower than any neighbour whose top could still be the highest, the highest first. Between a grid hill
     * and its neighbours a smooth function rises above the hill by less than it falls to the lowest of them; twice that is
     * allowed for kinks.
     */
    private List<Integer> hills(double[] values) {
        List<Integer> hills = new ArrayList<>();
        double highest = Double.NEGATIVE_INFINITY;
        for (int cell = 0; cell < values.length; cell++) {
            if (!Double.isNaN(values[cell]) && drop(values, cell) >= 0) {
                hills.add(cell);
                highest = Math.max(highest, values[cell]);
            }
        }
        double bar = highest;
        hills.removeIf(cell -> values[cell] + 2 * drop(values, cell) < bar);
        hills.sort(Comparator.comparingDouble((Integer cell) -> -values[cell]));
        return different(hills, values);
    }

    /** The first hills, at most two of the very same height: more of them are one plateau. */
    private static List<Integer> different(List<Integer> hills, double[] values) {
        List<Integer> few = new ArrayList<>();
        for (int cell : hills) {
            int last = few.size() - 2;
            double size = Math.abs(values[cell]);
            if (last < 0 || !(Math.abs(values[few.get(last)] - values[cell]) <= SAME * size)) {
                few.add(cell);
            }
            if (few.size() == CLIMBS) {
                break;
            }
        }
        return few;
    }

    /** How far the lowest neighbour along an axis lies below a grid point; negative where one lies above. */
    private double drop(double[] values, int cell) {
        int stride = 1;
        int rest = cell;
        double drop = 0;
        for (int i = 0; i < free.length; i++) {
            int place = rest % grid;
            rest /= grid;
            double before = place > 0 ? values[cell - stride] : Double.NaN;
            double after = place < grid - 1 ? values[cell + stride] : Double.NaN;
            if (before > values[cell] || after > values[cell]) {
                return -1;
            }
            drop = before < values[cell] ? Math.max(drop, values[cell] - before) : drop;
            drop = after < values[cell] ? Math.max(drop, values[cell] - after) : drop;
            stride *= grid;
        }
        return drop;
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
