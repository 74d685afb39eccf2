package org.rodside.study;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.SplittableRandom;
import java.util.stream.IntStream;

/**
 * Largest value of a function of the stroke fractions over the whole stroke box (theory W1): a grid finds the hills; the highest of
 * them, the corners of the box and some grid points drawn at random are climbed along their ridges; the strokes are scanned one by one
 * through the best place, for peaks too narrow for the grid. The function may have
 * kinks (it often is the least of several limits) and may have no value (NaN) at some poses. The same call always gives the
 * same bits.
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

        /** Number of smooth pieces of which the value is the least; 1 where the value itself is smooth. */
        default int pieces() {
            return 1;
        }

        /**
         * The pieces at the pose asked for last; not asked of a function that is one piece.
         *
         * @param out one value a piece, overwritten; infinite or NaN where a piece does not count
         */
        default void tellPieces(double[] out) {}
    }

    /** Grid points an axis for 1, 2, 3, 4, … free cylinders. */
    private static final int[] GRID = {257, 49, 21, 11, 7, 5};

    /** Hills that are climbed. */
    private static final int CLIMBS = 8;

    /** Grid points climbed besides, drawn at random: a plateau shows no hills. */
    private static final int RANDOM_STARTS = 8;

    /** Steps of the scan along each stroke: near a dead centre a peak may be this narrow, but only along one stroke. */
    private static final int SCAN = 64;

    /** Grid values that differ by less than this share are the same height: rounding; no unit. */
    private static final double SAME = 1e-9;

    private static final int SEED = 20260101;

    private final int[] free;
    private final double[] start;
    private final int grid;

    /**
     * @param fixed fraction of each cylinder that does not move, NaN for one that is free; not modified
     */
    public BoxMaximum(double[] fixed) {
        this(fixed, GRID[Math.max(1, Math.min(freeAxes(fixed).length, GRID.length)) - 1]);
    }

    private BoxMaximum(double[] fixed, int gridPoints) {
        free = freeAxes(fixed);
        start = fixed.clone();
        grid = free.length == 0 ? 1 : gridPoints;
    }

    private static int[] freeAxes(double[] fixed) {
        return IntStream.range(0, fixed.length)
                .filter(c -> Double.isNaN(fixed[c]))
                .toArray();
    }

    /** A search whose first grid has a given number of points an axis. */
    static BoxMaximum withGrid(double[] fixed, int gridPoints) {
        return new BoxMaximum(fixed, gridPoints);
    }

    /** A search over all strokes of a front. */
    public static BoxMaximum overAll(int cylinders) {
        return new BoxMaximum(allFree(cylinders));
    }

    /** As {@link #overAll(int)} with a first grid that many times finer than usual. */
    static BoxMaximum overAll(int cylinders, int refinement) {
        return withGrid(allFree(cylinders), (overAll(cylinders).grid - 1) * refinement + 1);
    }

    private static double[] allFree(int cylinders) {
        double[] all = new double[cylinders];
        Arrays.fill(all, Double.NaN);
        return all;
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
        if (free.length == 0) {
            return new Optimum(values[0], start);
        }
        RidgeClimber ridge = new RidgeClimber(objective, free);
        for (int cell : hills(values)) {
            if (!best.exists() || values[cell] + 2 * drop(values, cell) > best.value()) {
                best = climbFrom(cell, values, ridge, best);
            }
        }
        if (!best.exists()) {
            return best;
        }
        best = climbFromCorners(values, ridge, best);
        best = climbAtRandom(values, ridge, best);
        for (int axis : free) {
            best = scan(objective, ridge, best, axis);
        }
        return ridge.top(best);
    }

    /** Climbs from a given pose only. */
    public Optimum climbFrom(Objective objective, double[] fractions) {
        Optimum from = new Optimum(objective.at(fractions), fractions.clone());
        if (free.length == 0 || !from.exists()) {
            return from;
        }
        return new RidgeClimber(objective, free).top(from);
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

    private static Optimum higher(Optimum best, Optimum other) {
        return !best.exists() || other.value() > best.value() ? other : best;
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
            drop = Math.max(drop, fall(values[cell], before, place == 0));
            drop = Math.max(drop, fall(values[cell], after, place == grid - 1));
            stride *= grid;
        }
        return drop;
    }

    /** How far a neighbour lies lower; without end where it has no value, for much may rise towards it. */
    private static double fall(double value, double neighbour, boolean outside) {
        return outside ? 0 : Double.isNaN(neighbour) ? Double.POSITIVE_INFINITY : value - neighbour;
    }

    private Optimum climbFromCorners(double[] values, RidgeClimber ridge, Optimum from) {
        Optimum best = from;
        for (int corner = 0; corner < 1 << free.length; corner++) {
            int cell = 0;
            int far = grid - 1;
            for (int a = 0; a < free.length; a++) {
                cell += (corner >> a & 1) * far;
                far *= grid;
            }
            best = climbFrom(cell, values, ridge, best);
        }
        return best;
    }

    private Optimum climbAtRandom(double[] values, RidgeClimber ridge, Optimum from) {
        SplittableRandom random = new SplittableRandom(SEED);
        Optimum best = from;
        for (int i = 0; i < RANDOM_STARTS; i++) {
            best = climbFrom(random.nextInt(values.length), values, ridge, best);
        }
        return best;
    }

    private Optimum climbFrom(int cell, double[] values, RidgeClimber ridge, Optimum best) {
        return Double.isNaN(values[cell])
                ? best
                : higher(best, ridge.climb(new Optimum(values[cell], point(cell)), best.value()));
    }

    /** Climbs from every top on the line along one stroke through a place. */
    private static Optimum scan(Objective objective, RidgeClimber ridge, Optimum from, int axis) {
        double[] at = from.at().clone();
        double[] line = new double[SCAN + 3];
        line[0] = Double.NaN;
        line[SCAN + 2] = Double.NaN;
        for (int i = 0; i <= SCAN; i++) {
            at[axis] = i / (double) SCAN;
            line[1 + i] = objective.at(at);
        }
        Optimum best = from;
        for (int i = 0; i <= SCAN; i++) {
            double value = line[1 + i];
            boolean here = Math.abs(i / (double) SCAN - from.at()[axis]) < 1.5 / SCAN;
            if (!Double.isNaN(value) && !here && !(line[i] > value) && !(line[i + 2] > value)) {
                at[axis] = i / (double) SCAN;
                best = higher(best, ridge.climb(new Optimum(value, at.clone()), best.value()));
            }
        }
        return best;
    }
}
