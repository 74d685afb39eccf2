package org.rodside.study;

import java.util.Arrays;
import org.apache.commons.math3.analysis.solvers.BrentSolver;

/**
 * Largest value of a function over the poses that meet one equality (theory R1): the equality is solved for one stroke after
 * the other, every root of a scan along it, and the rest is searched as usual; trying each stroke in turn also reaches
 * tops at which that stroke stands at its end. Owns its scratch; not thread-safe.
 */
final class EqualitySearch {

    /** Intervals of the scan for roots along the stroke that is solved for. */
    private static final int SCAN = 16;

    /** Grid points an axis for the other strokes, for 1, 2, 3 and more of them. */
    private static final int[] GRID = {65, 17, 9, 7};

    /** Roots are found to this share of a stroke; no unit. */
    private static final double ROOT = 1e-13;

    private static final int EVALUATIONS = 200;

    private final BrentSolver solver = new BrentSolver(ROOT, ROOT);
    private final BoxMaximum.Objective miss;
    private final BoxMaximum.Objective value;
    private final double[] fixed;
    private final double[] at;
    private final double[] scan = new double[SCAN + 1];

    /** The root that gave the largest value last. */
    private double bestAt;

    /**
     * @param miss what the equality misses: zero where it is met; NaN where the pose does not count
     * @param value what is to be largest among the poses that meet it
     * @param fixed fraction of each cylinder that does not move, NaN for one that is free
     */
    EqualitySearch(BoxMaximum.Objective miss, BoxMaximum.Objective value, double[] fixed) {
        this.miss = miss;
        this.value = value;
        this.fixed = fixed.clone();
        at = new double[fixed.length];
    }

    /** The largest value and its pose; NaN where no pose meets the equality. */
    Optimum find() {
        Optimum best = new Optimum(Double.NaN, fixed);
        for (int axis = 0; axis < fixed.length; axis++) {
            if (Double.isNaN(fixed[axis])) {
                Optimum top = along(axis);
                best = top.exists() && (!best.exists() || top.value() > best.value()) ? top : best;
            }
        }
        return best;
    }

    private Optimum along(int axis) {
        double[] others = fixed.clone();
        others[axis] = 0;
        int free = (int) Arrays.stream(others).filter(Double::isNaN).count();
        int grid = free == 0 ? 1 : GRID[Math.min(free, GRID.length) - 1];
        Optimum top = BoxMaximum.withGrid(others, grid).find(fractions -> bestRoot(fractions, axis));
        if (!top.exists()) {
            return top;
        }
        bestRoot(top.at(), axis);
        double[] pose = top.at().clone();
        pose[axis] = bestAt;
        return new Optimum(top.value(), pose);
    }

    /** The largest value over all roots along an axis; NaN where there is none. */
    private double bestRoot(double[] fractions, int axis) {
        System.arraycopy(fractions, 0, at, 0, at.length);
        for (int i = 0; i <= SCAN; i++) {
            at[axis] = i / (double) SCAN;
            scan[i] = miss.at(at);
        }
        double best = Double.NaN;
        for (int i = 0; i < SCAN; i++) {
            if (scan[i] == 0 || scan[i] * scan[i + 1] < 0 || i == SCAN - 1 && scan[SCAN] == 0) {
                at[axis] = root(axis, i);
                double here = value.at(at);
                if (here > best || Double.isNaN(best) && !Double.isNaN(here)) {
                    best = here;
                    bestAt = at[axis];
                }
            }
        }
        return best;
    }

    private double root(int axis, int i) {
        if (scan[i] == 0) {
            return i / (double) SCAN;
        }
        if (scan[i + 1] == 0) {
            return (i + 1) / (double) SCAN;
        }
        return solver.solve(EVALUATIONS, fraction -> along(axis, fraction), i / (double) SCAN, (i + 1) / (double) SCAN);
    }

    private double along(int axis, double fraction) {
        at[axis] = fraction;
        double missed = miss.at(at);
        return Double.isNaN(missed) ? 1 : missed;
    }
}
