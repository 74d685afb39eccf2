package org.rodside.study;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.apache.commons.math3.analysis.solvers.BrentSolver;

/**
 * On a face where two strokes move: the curves along which both carry a place along one line. Found on a grid of squares whose sides are
 * searched for the change of sign, joined square by square. Owns its scratch; used once.
 */
final class FaceCurve {

    private static final int SQUARES = 40;

    /** Finds where a sine vanishes, to this share of the side of a square. */
    private static final double ROOT = 1e-14;

    private static final int EVALUATIONS = 200;

    private final BrentSolver roots = new BrentSolver(ROOT, ROOT, 0);
    private final FrontSolver solver;
    private final Place place;
    private final double[] at;
    private final int[] pair;
    private final double[] one = new double[2];
    private final double[] two = new double[2];
    private final double[][] value = new double[SQUARES + 1][SQUARES + 1];

    /** By side of a square: where the curve crosses it, and the sides it goes on to. */
    private final Map<Integer, double[]> crossing = new HashMap<>();

    private final Map<Integer, List<Integer>> next = new HashMap<>();

    FaceCurve(FrontSolver solver, Place place, double[] corner, int first, int second) {
        this.solver = solver;
        this.place = place;
        at = corner.clone();
        pair = new int[] {first, second};
    }

    void trace(LimitCurves.Taker taker) {
        for (int i = 0; i <= SQUARES; i++) {
            for (int j = 0; j <= SQUARES; j++) {
                value[i][j] = sine(i / (double) SQUARES, j / (double) SQUARES);
            }
        }
        for (int i = 0; i < SQUARES; i++) {
            for (int j = 0; j < SQUARES; j++) {
                square(i, j);
            }
        }
        for (int side : new ArrayList<>(next.keySet())) {
            if (next.get(side).size() == 1) {
                walk(side, taker);
            }
        }
        for (int side : new ArrayList<>(next.keySet())) {
            if (!next.get(side).isEmpty()) {
                walk(side, taker);
            }
        }
    }

    private double sine(double s, double t) {
        at[pair[0]] = s;
        at[pair[1]] = t;
        return LimitCurves.sine(solver, place, at, pair, one, two);
    }

    private void square(int i, int j) {
        List<Integer> sides = new ArrayList<>();
        side(sides, i, j, i + 1, j, 2 * (i * (SQUARES + 1) + j));
        side(sides, i + 1, j, i + 1, j + 1, 2 * ((i + 1) * (SQUARES + 1) + j) + 1);
        side(sides, i, j + 1, i + 1, j + 1, 2 * (i * (SQUARES + 1) + j + 1));
        side(sides, i, j, i, j + 1, 2 * (i * (SQUARES + 1) + j) + 1);
        for (int k = 0; k + 1 < sides.size(); k += 2) {
            join(sides.get(k), sides.get(k + 1));
            join(sides.get(k + 1), sides.get(k));
        }
    }

    private void join(int from, int to) {
        next.computeIfAbsent(from, side -> new ArrayList<>()).add(to);
    }

    private void side(List<Integer> sides, int i, int j, int k, int l, int id) {
        double a = value[i][j];
        double b = value[k][l];
        if (a * b < 0 || a == 0 && b != 0) {
            sides.add(id);
            crossing.computeIfAbsent(
                    id,
                    side -> between(
                            new double[] {i / (double) SQUARES, j / (double) SQUARES},
                            new double[] {k / (double) SQUARES, l / (double) SQUARES}));
        }
    }

    /** Where the sine changes sign between two places of the face. */
    private double[] between(double[] from, double[] to) {
        double share = roots.solve(
                EVALUATIONS,
                t -> {
                    double here = t == 1
                            ? sine(to[0], to[1])
                            : sine(from[0] + t * (to[0] - from[0]), from[1] + t * (to[1] - from[1]));
                    // a pose between that does not assemble ends the search on either side of it
                    return Double.isNaN(here) ? 0 : here;
                },
                0,
                1);
        return new double[] {from[0] + share * (to[0] - from[0]), from[1] + share * (to[1] - from[1])};
    }

    private void walk(int start, LimitCurves.Taker taker) {
        List<double[]> poses = new ArrayList<>(List.of(pose(crossing.get(start))));
        int side = start;
        while (!next.get(side).isEmpty()) {
            int to = next.get(side).remove(0);
            next.get(to).remove((Integer) side);
            poses.add(pose(crossing.get(to)));
            side = to;
        }
        taker.add(poses, this::middle);
    }

    private double[] pose(double[] place) {
        double[] pose = at.clone();
        pose[pair[0]] = place[0];
        pose[pair[1]] = place[1];
        return pose;
    }

    /** The pose of the curve across the middle of two others. */
    private double[] middle(double[] from, double[] to) {
        double ds = to[pair[0]] - from[pair[0]];
        double dt = to[pair[1]] - from[pair[1]];
        double s = 0.5 * (from[pair[0]] + to[pair[0]]);
        double t = 0.5 * (from[pair[1]] + to[pair[1]]);
        double[] left = {inside(s - dt), inside(t + ds)};
        double[] right = {inside(s + dt), inside(t - ds)};
        double atLeft = sine(left[0], left[1]);
        double atRight = sine(right[0], right[1]);
        if (!(atLeft * atRight < 0)) {
            return Math.abs(sine(s, t)) < 1e-12 ? pose(new double[] {s, t}) : null;
        }
        return pose(between(left, right));
    }

    private static double inside(double fraction) {
        return Math.max(0, Math.min(1, fraction));
    }
}
