package org.rodside.study;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.SplittableRandom;
import org.rodside.kinematics.PoseSolver;

/**
 * Traces every curve of a place of the front that may bound what it reaches (theory R2): the edges of the stroke box, where one
 * stroke moves; on faces where two or more move, the poses at which all of them carry the place along one line. Deeper faces are
 * traced along the stroke that is assembled first, on which that condition does not depend in a chain of stages. Owns its scratch;
 * not thread-safe.
 */
final class LimitCurves {

    /** Largest distance of a curve from its polyline; in m. Far below the millimetre that is promised. */
    private static final double FLAT = 1e-5;

    /** Poses tried to learn which cylinders move the place, and the travel that counts as none; no unit. */
    private static final int SAMPLES = 20;

    private static final double STILL = 1e-9;

    private static final int EDGE_PARTS = 24;
    private static final int DEEPEST_SPLIT = 12;

    private final FrontSolver solver;
    private final Place place;
    private final SweepGrid order;
    private final int cylinders;
    private final List<LimitCurve> curves = new ArrayList<>();

    LimitCurves(FrontSolver solver, Place place) {
        this.solver = solver;
        this.place = place;
        cylinders = solver.front().mechanism().cylinders();
        order = new SweepGrid(solver.front().mechanism(), 2);
    }

    List<LimitCurve> trace() {
        int movers = movers();
        for (int mask = 1; mask < 1 << cylinders; mask++) {
            if ((mask & ~movers) != 0) {
                continue;
            }
            int[] free = axes(mask);
            for (int ends = 0; ends < 1 << (Integer.bitCount(movers) - free.length); ends++) {
                double[] at = corner(mask, movers, ends);
                if (free.length == 1) {
                    edge(at, free[0]);
                } else if (free.length == 2) {
                    new FaceCurve(solver, place, at, free[0], free[1]).trace(this::add);
                } else {
                    new DeepCurve(solver, place, at, free).trace(this::add);
                }
            }
        }
        return curves;
    }

    /** Cylinders of a mask in the order of assembly. */
    private int[] axes(int mask) {
        List<Integer> list = new ArrayList<>();
        for (int axis = 0; axis < cylinders; axis++) {
            if ((mask >> order.cylinder(axis) & 1) == 1) {
                list.add(order.cylinder(axis));
            }
        }
        return list.stream().mapToInt(Integer::intValue).toArray();
    }

    /** Cylinders that move the place at all, as bits; the others would only repeat every curve. */
    private int movers() {
        int movers = 0;
        double[] travel = new double[2];
        SplittableRandom random = new SplittableRandom(1);
        for (int sample = 0; sample < SAMPLES; sample++) {
            if (solver.place(random.doubles(cylinders).toArray()) == PoseSolver.ASSEMBLED) {
                for (int c = 0; c < cylinders; c++) {
                    solver.travel(place, c, travel);
                    movers |= Math.hypot(travel[0], travel[1]) > STILL ? 1 << c : 0;
                }
            }
        }
        return movers;
    }

    private double[] corner(int mask, int movers, int ends) {
        double[] at = new double[cylinders];
        Arrays.fill(at, 0.5);
        int bit = 0;
        for (int c = 0; c < cylinders; c++) {
            if ((mask >> c & 1) == 0 && (movers >> c & 1) == 1) {
                at[c] = ends >> bit++ & 1;
            }
        }
        return at;
    }

    private void edge(double[] corner, int axis) {
        List<double[]> poses = new ArrayList<>();
        for (int i = 0; i <= EDGE_PARTS; i++) {
            double[] at = corner.clone();
            at[axis] = i / (double) EDGE_PARTS;
            poses.add(at);
        }
        add(poses, (one, two) -> {
            double[] middle = one.clone();
            middle[axis] = 0.5 * (one[axis] + two[axis]);
            return middle;
        });
    }

    /** Finds the pose on a curve half way between two others; null where it cannot. */
    @FunctionalInterface
    interface Between {
        double[] pose(double[] one, double[] two);
    }

    /** Takes a curve given by some of its poses. */
    @FunctionalInterface
    interface Taker {
        void add(List<double[]> poses, Between between);
    }

    private void add(List<double[]> poses, Between between) {
        List<double[]> fine = new ArrayList<>();
        List<double[]> points = new ArrayList<>();
        for (double[] pose : poses) {
            double[] point = point(pose);
            if (point == null) {
                flush(fine, points);
                continue;
            }
            if (!fine.isEmpty()) {
                refine(fine, points, pose, point, between, DEEPEST_SPLIT);
            }
            fine.add(pose);
            points.add(point);
        }
        flush(fine, points);
    }

    private void flush(List<double[]> poses, List<double[]> points) {
        if (points.size() > 1) {
            curves.add(new LimitCurve(
                    points.stream().mapToDouble(p -> p[0]).toArray(),
                    points.stream().mapToDouble(p -> p[1]).toArray(),
                    poses.toArray(new double[0][])));
        }
        poses.clear();
        points.clear();
    }

    /** Puts points between the last one and the next where the curve bends. */
    private void refine(
            List<double[]> poses, List<double[]> points, double[] pose, double[] point, Between between, int depth) {
        double[] last = points.get(points.size() - 1);
        double[] middle = between.pose(poses.get(poses.size() - 1), pose);
        double[] at = middle == null ? null : point(middle);
        if (at == null || depth == 0 || distance(at, last, point) < FLAT) {
            return;
        }
        refine(poses, points, middle, at, between, depth - 1);
        poses.add(middle);
        points.add(at);
        refine(poses, points, pose, point, between, depth - 1);
    }

    private static double distance(double[] p, double[] a, double[] b) {
        double dx = b[0] - a[0];
        double dy = b[1] - a[1];
        double length = Math.hypot(dx, dy);
        return length == 0
                ? Math.hypot(p[0] - a[0], p[1] - a[1])
                : Math.abs(dx * (p[1] - a[1]) - dy * (p[0] - a[0])) / length;
    }

    private double[] point(double[] pose) {
        return solver.place(pose) == PoseSolver.ASSEMBLED
                ? new double[] {place.x(solver.pose()), place.y(solver.pose())}
                : null;
    }

    /**
     * Sine of the angle between the travels of a place by two cylinders; NaN where the pose does not assemble.
     *
     * @param one travel by the first cylinder; overwritten
     * @param two travel by the second; overwritten
     */
    static double sine(FrontSolver solver, Place place, double[] pose, int[] pair, double[] one, double[] two) {
        if (solver.place(pose) != PoseSolver.ASSEMBLED) {
            Arrays.fill(one, Double.NaN);
            return Double.NaN;
        }
        solver.travel(place, pair[0], one);
        solver.travel(place, pair[1], two);
        return (one[0] * two[1] - one[1] * two[0]) / (Math.hypot(one[0], one[1]) * Math.hypot(two[0], two[1]));
    }
}
