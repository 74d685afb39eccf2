package org.rodside.study;

import java.util.ArrayList;
import java.util.List;
import org.rodside.kinematics.PoseSolver;

/**
 * Strokes of two cylinders that bring a place of the front to a point, every pair of them (theory L1): the images of the cells of a
 * grid over the two strokes are tried one by one, those that may hold the point start a Newton search. Owns its scratch; one
 * per thread.
 */
final class HookInverse {

    /** Cells an axis: so fine that the image of a cell is close to a parallelogram. */
    private static final int CELLS = 32;

    /** A cell is tried when the point lies within its corners' box, widened by this share of the box. */
    private static final double MARGIN = 0.6;

    private static final int ROUNDS = 30;

    /** The point is reached within; in m. */
    private static final double REACHED = 1e-10;

    /** Strokes may miss their ends by this share for rounding; they are then put on the end; no unit. */
    private static final double END = 1e-9;

    /** Two solutions closer than this are one; share of a stroke. */
    private static final double SAME = 1e-6;

    private final FrontSolver solver;
    private final Place place;
    private final int first;
    private final int second;
    private final double[] fractions;
    private final double[][] cornerX = new double[CELLS + 1][CELLS + 1];
    private final double[][] cornerY = new double[CELLS + 1][CELLS + 1];
    private final double[] byFirst = new double[2];
    private final double[] bySecond = new double[2];

    /**
     * @param fractions fraction of stroke of the other cylinders; not modified
     */
    HookInverse(FrontSolver solver, Place place, int first, int second, double[] fractions) {
        this.solver = solver;
        this.place = place;
        this.first = first;
        this.second = second;
        this.fractions = fractions.clone();
        for (int i = 0; i <= CELLS; i++) {
            for (int j = 0; j <= CELLS; j++) {
                boolean stands = put(i / (double) CELLS, j / (double) CELLS);
                cornerX[i][j] = stands ? place.x(solver.pose()) : Double.NaN;
                cornerY[i][j] = stands ? place.y(solver.pose()) : Double.NaN;
            }
        }
    }

    private boolean put(double one, double two) {
        fractions[first] = one;
        fractions[second] = two;
        return solver.place(fractions) == PoseSolver.ASSEMBLED;
    }

    /** Smallest and largest x and y of the corners: {x0, x1, y0, y1}; in m. */
    double[] extent() {
        double[] box = {
            Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY
        };
        for (int i = 0; i <= CELLS; i++) {
            for (int j = 0; j <= CELLS; j++) {
                if (!Double.isNaN(cornerX[i][j])) {
                    box[0] = Math.min(box[0], cornerX[i][j]);
                    box[1] = Math.max(box[1], cornerX[i][j]);
                    box[2] = Math.min(box[2], cornerY[i][j]);
                    box[3] = Math.max(box[3], cornerY[i][j]);
                }
            }
        }
        return box;
    }

    /** Fractions of every pose that brings the place to a point (m), machine axes. */
    List<double[]> solve(double x, double y) {
        return solve(x, y, Integer.MAX_VALUE);
    }

    /** Whether some pose brings the place to a point (m), machine axes. */
    boolean reaches(double x, double y) {
        return !solve(x, y, 1).isEmpty();
    }

    private List<double[]> solve(double x, double y, int enough) {
        List<double[]> found = new ArrayList<>();
        for (int i = 0; i < CELLS; i++) {
            for (int j = 0; j < CELLS && found.size() < enough; j++) {
                if (mayHold(cornerX, x, i, j) && mayHold(cornerY, y, i, j)) {
                    search(x, y, (i + 0.5) / CELLS, (j + 0.5) / CELLS, found);
                }
            }
        }
        return found;
    }

    private static boolean mayHold(double[][] corner, double wanted, int i, int j) {
        double a = corner[i][j];
        double b = corner[i + 1][j];
        double c = corner[i][j + 1];
        double d = corner[i + 1][j + 1];
        double low = Math.min(Math.min(a, b), Math.min(c, d));
        double high = Math.max(Math.max(a, b), Math.max(c, d));
        double margin = MARGIN * (high - low);
        return wanted >= low - margin && wanted <= high + margin;
    }

    private void search(double x, double y, double one, double two, List<double[]> found) {
        double s = one;
        double t = two;
        for (int round = 0; round < ROUNDS; round++) {
            if (!put(s, t)) {
                return;
            }
            double missX = x - place.x(solver.pose());
            double missY = y - place.y(solver.pose());
            if (Math.hypot(missX, missY) < REACHED) {
                keep(s, t, found);
                return;
            }
            solver.travel(place, first, byFirst);
            solver.travel(place, second, bySecond);
            double det = byFirst[0] * bySecond[1] - byFirst[1] * bySecond[0];
            double ds = (missX * bySecond[1] - missY * bySecond[0]) / det;
            double dt = (byFirst[0] * missY - byFirst[1] * missX) / det;
            s += limited(ds / solver.front().mechanism().stroke(first));
            t += limited(dt / solver.front().mechanism().stroke(second));
            if (!(Math.abs(s - 0.5) <= 0.75 && Math.abs(t - 0.5) <= 0.75)) {
                return;
            }
        }
    }

    private static double limited(double step) {
        return Math.max(-0.1, Math.min(0.1, step));
    }

    private void keep(double s, double t, List<double[]> found) {
        if (Math.abs(s - 0.5) > 0.5 + END || Math.abs(t - 0.5) > 0.5 + END) {
            return;
        }
        for (double[] other : found) {
            if (Math.abs(other[first] - s) < SAME && Math.abs(other[second] - t) < SAME) {
                return;
            }
        }
        double[] at = fractions.clone();
        at[first] = Math.max(0, Math.min(1, s));
        at[second] = Math.max(0, Math.min(1, t));
        found.add(at);
    }
}
