package org.rodside.study;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** Where polylines cross each other and themselves, found through a grid of squares. */
final class CurveCrossings {

    /** Side of a square; in m. */
    private static final double SQUARE = 0.05;

    /** An end this near lies on a curve: ten times the flatness of the polylines; in m. */
    private static final double TOUCH = 1e-4;

    private final List<LimitCurve> curves;
    private final Map<Long, List<int[]>> squares = new HashMap<>();
    private final Map<Integer, List<Cut>> cuts = new HashMap<>();

    /**
     * A place where a curve is cut.
     *
     * @param at index of the point before plus the share of the way to the next
     * @param x abscissa; in m
     * @param y ordinate; in m
     */
    record Cut(double at, double x, double y) {}

    private CurveCrossings(List<LimitCurve> curves) {
        this.curves = curves;
    }

    /** Cuts by index of the curve. */
    static Map<Integer, List<Cut>> find(List<LimitCurve> curves) {
        CurveCrossings crossings = new CurveCrossings(curves);
        for (int c = 0; c < curves.size(); c++) {
            for (int i = 0; i + 1 < curves.get(c).points(); i++) {
                crossings.add(c, i);
            }
        }
        for (int c = 0; c < curves.size(); c++) {
            crossings.touch(c, 0);
            crossings.touch(c, curves.get(c).points() - 1);
        }
        return crossings.cuts;
    }

    /** Cuts other curves where the end of one lies on them, as those of the deeper faces do on those of their rims. */
    private void touch(int curve, int end) {
        double x = curves.get(curve).x()[end];
        double y = curves.get(curve).y()[end];
        for (int i = -1; i <= 1; i++) {
            for (int j = -1; j <= 1; j++) {
                long square = ((long) (square(x) + i) << 32) + square(y) + j;
                for (int[] other : squares.getOrDefault(square, List.of())) {
                    if (other[0] != curve) {
                        touch(x, y, other[0], other[1]);
                    }
                }
            }
        }
    }

    private void touch(double x, double y, int other, int j) {
        LimitCurve b = curves.get(other);
        double bx = b.x()[j + 1] - b.x()[j];
        double by = b.y()[j + 1] - b.y()[j];
        double share = ((x - b.x()[j]) * bx + (y - b.y()[j]) * by) / (bx * bx + by * by);
        double t = Math.max(0, Math.min(1, share));
        if (Math.hypot(b.x()[j] + t * bx - x, b.y()[j] + t * by - y) < TOUCH) {
            cuts.computeIfAbsent(other, c -> new ArrayList<>()).add(new Cut(j + t, x, y));
        }
    }

    /** Crosses one segment with those that stand already, then puts it among them. */
    private void add(int curve, int segment) {
        LimitCurve here = curves.get(curve);
        List<Long> touched = touched(here, segment);
        List<int[]> tried = new ArrayList<>();
        for (long square : touched) {
            List<int[]> others = squares.computeIfAbsent(square, s -> new ArrayList<>());
            for (int[] other : others) {
                boolean neighbour = other[0] == curve && Math.abs(other[1] - segment) <= 1;
                if (!neighbour && !contains(tried, other)) {
                    tried.add(other);
                    cross(curve, segment, other[0], other[1]);
                }
            }
            others.add(new int[] {curve, segment});
        }
    }

    private static boolean contains(List<int[]> list, int[] item) {
        for (int[] other : list) {
            if (other[0] == item[0] && other[1] == item[1]) {
                return true;
            }
        }
        return false;
    }

    private static List<Long> touched(LimitCurve curve, int i) {
        int x0 = square(Math.min(curve.x()[i], curve.x()[i + 1]));
        int x1 = square(Math.max(curve.x()[i], curve.x()[i + 1]));
        int y0 = square(Math.min(curve.y()[i], curve.y()[i + 1]));
        int y1 = square(Math.max(curve.y()[i], curve.y()[i + 1]));
        List<Long> list = new ArrayList<>();
        for (int x = x0; x <= x1; x++) {
            for (int y = y0; y <= y1; y++) {
                list.add(((long) x << 32) + y);
            }
        }
        return list;
    }

    private static int square(double v) {
        return (int) Math.floor(v / SQUARE);
    }

    private void cross(int curve, int i, int other, int j) {
        LimitCurve a = curves.get(curve);
        LimitCurve b = curves.get(other);
        double ax = a.x()[i + 1] - a.x()[i];
        double ay = a.y()[i + 1] - a.y()[i];
        double bx = b.x()[j + 1] - b.x()[j];
        double by = b.y()[j + 1] - b.y()[j];
        double det = ax * by - ay * bx;
        double dx = b.x()[j] - a.x()[i];
        double dy = b.y()[j] - a.y()[i];
        double s = (dx * by - dy * bx) / det;
        double t = (dx * ay - dy * ax) / det;
        if (s >= 0 && s <= 1 && t >= 0 && t <= 1) {
            double x = a.x()[i] + s * ax;
            double y = a.y()[i] + s * ay;
            cuts.computeIfAbsent(curve, c -> new ArrayList<>()).add(new Cut(i + s, x, y));
            cuts.computeIfAbsent(other, c -> new ArrayList<>()).add(new Cut(j + t, x, y));
        }
    }
}
