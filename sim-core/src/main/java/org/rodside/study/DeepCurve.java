package org.rodside.study;

import java.util.ArrayList;
import java.util.List;
import org.rodside.kinematics.DenseEquations;

/**
 * On a face where three or more strokes move: the curves along which all of them carry a place along one line, followed along the
 * first of the strokes. For each value of it the others are solved for by Newton from every cell of a grid in which each sine may
 * change sign. Owns its scratch; used once.
 */
final class DeepCurve {

    /** Values of the first stroke. */
    private static final int STATIONS = 24;

    /**
     * Cells an axis for two and for three or more strokes to solve for; smaller towards the ends, for near a dead centre the place
     * moves by the root of the stroke.
     */
    private static final int[] CELLS = {20, 8};

    private static final int ROUNDS = 25;
    private static final double DIFFERENCE = 1e-6;

    /** The sines vanish within. */
    private static final double SOLVED = 1e-11;

    /** Two solutions closer than this are one, and solutions at two stations further apart than {@link #FAR} are two curves. */
    private static final double SAME = 1e-5;

    private static final double FAR = 0.15;

    private final FrontSolver solver;
    private final Place place;
    private final double[] corner;
    private final int[] free;
    private final int unknowns;
    private final DenseEquations equations;
    private final double[] one = new double[2];
    private final double[] two = new double[2];
    private final double[] side;
    private final double[] moved;
    private final double[] step;

    DeepCurve(FrontSolver solver, Place place, double[] corner, int[] free) {
        this.solver = solver;
        this.place = place;
        this.corner = corner;
        this.free = free;
        unknowns = free.length - 1;
        equations = new DenseEquations(unknowns);
        side = new double[unknowns];
        moved = new double[unknowns];
        step = new double[unknowns];
    }

    void trace(LimitCurves.Taker taker) {
        List<List<double[]>> open = new ArrayList<>();
        for (int station = 0; station <= STATIONS; station++) {
            List<double[]> solutions = solutions(station / (double) STATIONS);
            List<List<double[]>> going = new ArrayList<>();
            for (List<double[]> curve : open) {
                double[] onward = nearest(curve.get(curve.size() - 1), solutions);
                if (onward == null) {
                    finish(curve, taker);
                } else {
                    solutions.remove(onward);
                    curve.add(onward);
                    going.add(curve);
                }
            }
            solutions.forEach(start -> going.add(new ArrayList<>(List.of(start))));
            open = going;
        }
        open.forEach(curve -> finish(curve, taker));
    }

    private void finish(List<double[]> curve, LimitCurves.Taker taker) {
        if (curve.size() > 1) {
            taker.add(curve, (from, to) -> {
                double[] middle = from.clone();
                for (int axis : free) {
                    middle[axis] = 0.5 * (from[axis] + to[axis]);
                }
                return newton(middle) ? middle : null;
            });
        }
    }

    private double[] nearest(double[] to, List<double[]> solutions) {
        double[] best = null;
        double least = FAR;
        for (double[] solution : solutions) {
            double gap = 0;
            for (int k = 1; k < free.length; k++) {
                gap = Math.max(gap, Math.abs(solution[free[k]] - to[free[k]]));
            }
            if (gap < least) {
                least = gap;
                best = solution;
            }
        }
        return best;
    }

    private List<double[]> solutions(double first) {
        List<double[]> found = new ArrayList<>();
        int cells = CELLS[Math.min(unknowns, 3) - 2];
        int count = (int) Math.round(Math.pow(cells, unknowns));
        for (int cell = 0; cell < count; cell++) {
            double[] at = corner.clone();
            at[free[0]] = first;
            int rest = cell;
            for (int k = 1; k < free.length; k++) {
                at[free[k]] = 0.5 - 0.5 * Math.cos(Math.PI * (rest % cells + 0.5) / cells);
                rest /= cells;
            }
            if (mayHold(at, Math.PI / 2 / cells) && newton(at) && nearestIsFar(at, found)) {
                found.add(at);
            }
        }
        return found;
    }

    private boolean nearestIsFar(double[] at, List<double[]> found) {
        double[] near = nearest(at, found);
        if (near == null) {
            return true;
        }
        double gap = 0;
        for (int axis : free) {
            gap = Math.max(gap, Math.abs(near[axis] - at[axis]));
        }
        return gap > SAME;
    }

    /** Whether every sine is small enough at the middle of a cell to vanish in it or its neighbours; size: of the cell, no smaller. */
    private boolean mayHold(double[] at, double size) {
        sines(at, side);
        double[] here = side.clone();
        double[] range = new double[unknowns];
        double[] other = at.clone();
        for (int k = 1; k < free.length; k++) {
            other[free[k]] = at[free[k]] + size / 2;
            sines(other, moved);
            other[free[k]] = at[free[k]];
            for (int m = 0; m < unknowns; m++) {
                range[m] += Math.abs(moved[m] - here[m]);
            }
        }
        for (int m = 0; m < unknowns; m++) {
            if (!(Math.abs(here[m]) <= 3 * range[m])) {
                return false;
            }
        }
        return true;
    }

    /** Sines of the travels by the first stroke against each other; overwritten. */
    private void sines(double[] at, double[] out) {
        for (int k = 1; k < free.length; k++) {
            out[k - 1] = LimitCurves.sine(solver, place, at, new int[] {free[0], free[k]}, one, two);
        }
    }

    /** Solves for all but the first stroke, from where they stand; false where it fails or leaves the box. */
    private boolean newton(double[] at) {
        for (int round = 0; round < ROUNDS; round++) {
            sines(at, side);
            double miss = 0;
            for (double s : side) {
                miss = Math.max(miss, Math.abs(s));
            }
            if (miss < SOLVED) {
                return inBox(at, 0);
            }
            derivatives(at);
            if (!equations.factor()) {
                return false;
            }
            equations.solve(side, step);
            for (int k = 1; k < free.length; k++) {
                at[free[k]] -= Math.max(-0.1, Math.min(0.1, step[k - 1]));
            }
            if (!inBox(at, 0.1)) {
                return false;
            }
        }
        return false;
    }

    /** Derivatives of the sines by all but the first stroke, by differences. */
    private void derivatives(double[] at) {
        for (int k = 1; k < free.length; k++) {
            double kept = at[free[k]];
            at[free[k]] = kept + DIFFERENCE;
            sines(at, moved);
            at[free[k]] = kept;
            for (int m = 0; m < unknowns; m++) {
                equations.matrix()[m * unknowns + k - 1] = (moved[m] - side[m]) / DIFFERENCE;
            }
        }
    }

    private boolean inBox(double[] at, double margin) {
        for (int axis : free) {
            if (!(at[axis] >= -margin && at[axis] <= 1 + margin)) {
                return false;
            }
        }
        return true;
    }
}
