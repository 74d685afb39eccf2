package org.rodside.study;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;

/**
 * Boundary of what the tip reaches (theory R2, R3): limit curves are cut where they cross; a piece with reachable ground on one
 * side only bounds; such pieces, turned so that the reachable side is on the left, are joined into rings. Good to a fraction of a
 * millimetre where every pose of the stroke box assembles; a bound made by poses that do not assemble inside the box is
 * not traced ({@link StrokeTrim} takes most of them away).
 */
public final class Outline {

    /** Distance from a curve at which the ground beside it is tried; in m. */
    private static final double BESIDE = 3e-4;

    /** Pieces shorter than this are not tried but bridged; in m. */
    private static final double SHORT = 6e-4;

    /** Ends closer than this join; in m. */
    private static final double JOIN = 9e-4;

    /** Ends closer than this meet exactly; of pieces that do, the one with more points is the surer; in m. */
    private static final double EXACT = 2e-5;

    /** Rings that enclose less than this are rounding; in m². */
    private static final double SMALL = 1e-5;

    private final ReachTest reach;
    private final List<LimitCurve> curves;
    private final List<Piece> bounds = new ArrayList<>();

    private record Piece(double[] x, double[] y) {

        double startGap(double atX, double atY) {
            return Math.hypot(x[0] - atX, y[0] - atY);
        }

        /** Whether the piece goes well away from its start, so that an end near it closes a ring. */
        boolean turnsBack() {
            int middle = x.length / 2;
            return startGap(x[middle], y[middle]) > 10 * JOIN;
        }
    }

    private Outline(Front front) {
        FrontSolver solver = new FrontSolver(front);
        reach = new ReachTest(solver, front.tip());
        curves = new LimitCurves(solver, front.tip()).trace();
    }

    /**
     * Traces the outline of the tip.
     *
     * @return the outer ring anticlockwise, then holes clockwise; each closed, as {x, y}; in m
     */
    public static List<double[][]> of(Front front) {
        return new Outline(front).rings();
    }

    private List<double[][]> rings() {
        Map<Integer, List<CurveCrossings.Cut>> cuts = CurveCrossings.find(curves);
        for (int c = 0; c < curves.size(); c++) {
            pieces(curves.get(c), cuts.getOrDefault(c, List.of()));
        }
        List<double[][]> rings = new ArrayList<>();
        while (!bounds.isEmpty()) {
            double[][] ring = ring();
            if (ring != null) {
                rings.add(ring);
            }
        }
        return sorted(rings);
    }

    private static List<double[][]> sorted(List<double[][]> rings) {
        double[][] outer =
                rings.stream().max(Comparator.comparingDouble(Outline::area)).orElse(null);
        List<double[][]> sorted = new ArrayList<>();
        if (outer == null || !(area(outer) > 0)) {
            return sorted;
        }
        sorted.add(outer);
        rings.stream().filter(ring -> area(ring) < -SMALL).forEach(sorted::add);
        return sorted;
    }

    /** Area enclosed, anticlockwise positive; in m². */
    static double area(double[][] ring) {
        double twice = 0;
        for (int i = 0; i + 1 < ring[0].length; i++) {
            twice += ring[0][i] * ring[1][i + 1] - ring[0][i + 1] * ring[1][i];
        }
        return twice / 2;
    }

    /** Cuts a curve and keeps the pieces that bound. */
    private void pieces(LimitCurve curve, List<CurveCrossings.Cut> cuts) {
        List<CurveCrossings.Cut> sorted = new ArrayList<>(cuts);
        sorted.sort(Comparator.comparingDouble(CurveCrossings.Cut::at));
        sorted.add(new CurveCrossings.Cut(
                curve.points() - 1, curve.x()[curve.points() - 1], curve.y()[curve.points() - 1]));
        CurveCrossings.Cut from = new CurveCrossings.Cut(0, curve.x()[0], curve.y()[0]);
        for (CurveCrossings.Cut to : sorted) {
            piece(curve, from, to);
            from = to;
        }
    }

    private void piece(LimitCurve curve, CurveCrossings.Cut from, CurveCrossings.Cut to) {
        List<double[]> points = new ArrayList<>(List.of(new double[] {from.x(), from.y()}));
        for (int i = (int) Math.floor(from.at()) + 1; i < to.at(); i++) {
            points.add(new double[] {curve.x()[i], curve.y()[i]});
        }
        points.add(new double[] {to.x(), to.y()});
        double length = 0;
        for (int i = 1; i < points.size(); i++) {
            length += gap(points.get(i - 1), points.get(i));
        }
        if (length < SHORT) {
            return;
        }
        double[] near = curve.poses()[(int) Math.round(0.5 * (from.at() + to.at()))];
        int side = boundingSide(points, length, near);
        if (side != 0) {
            bounds.add(directed(points, side > 0));
        }
    }

    private static double gap(double[] a, double[] b) {
        return Math.hypot(a[0] - b[0], a[1] - b[1]);
    }

    /** +1 where only the left side is reachable, -1 where only the right, 0 where both or neither. */
    private int boundingSide(List<double[]> points, double length, double[] near) {
        double half = length / 2;
        int i = 1;
        while (i < points.size() - 1 && half > gap(points.get(i - 1), points.get(i))) {
            half -= gap(points.get(i - 1), points.get(i));
            i++;
        }
        double[] a = points.get(i - 1);
        double[] b = points.get(i);
        double span = gap(a, b);
        double share = Math.min(1, half / span);
        double x = a[0] + share * (b[0] - a[0]);
        double y = a[1] + share * (b[1] - a[1]);
        double beside = Math.min(BESIDE, length / 4);
        double nx = -(b[1] - a[1]) / span * beside;
        double ny = (b[0] - a[0]) / span * beside;
        boolean left = reach.reaches(x + nx, y + ny, near);
        boolean right = reach.reaches(x - nx, y - ny, near);
        return left == right ? 0 : left ? 1 : -1;
    }

    private static Piece directed(List<double[]> points, boolean forward) {
        int n = points.size();
        double[] x = new double[n];
        double[] y = new double[n];
        for (int i = 0; i < n; i++) {
            double[] point = points.get(forward ? i : n - 1 - i);
            x[i] = point[0];
            y[i] = point[1];
        }
        return new Piece(x, y);
    }

    /**
     * Joins pieces from the first one left until the chain meets itself; what led up to there waits for another ring. A piece
     * that leads nowhere is dropped: near a touching of two curves some are cut too finely to be told apart. Null where nothing
     * closes.
     */
    private double[][] ring() {
        List<Piece> chain = new ArrayList<>(List.of(bounds.remove(0)));
        while (!chain.isEmpty()) {
            Piece last = chain.get(chain.size() - 1);
            int home = startsNearEnd(last.turnsBack() ? chain : chain.subList(0, chain.size() - 1), last);
            if (home >= 0) {
                bounds.addAll(chain.subList(0, home));
                return closed(chain.subList(home, chain.size()));
            }
            int next = startsNearEnd(bounds, last);
            if (next < 0) {
                chain.remove(chain.size() - 1);
            } else {
                chain.add(bounds.remove(next));
            }
        }
        return null;
    }

    /** Index of the piece that starts nearest the end of another, within {@link #JOIN}; -1 where none does. */
    private static int startsNearEnd(List<Piece> pieces, Piece piece) {
        double endX = piece.x()[piece.x().length - 1];
        double endY = piece.y()[piece.y().length - 1];
        int nearest = -1;
        double least = JOIN;
        for (int i = 0; i < pieces.size(); i++) {
            double gap = Math.max(EXACT, pieces.get(i).startGap(endX, endY));
            boolean longer = nearest >= 0
                    && gap == least
                    && pieces.get(i).x().length > pieces.get(nearest).x().length;
            if (gap < least || longer) {
                least = gap;
                nearest = i;
            }
        }
        return nearest;
    }

    private static double[][] closed(List<Piece> chain) {
        List<double[]> points = new ArrayList<>();
        for (Piece piece : chain) {
            for (int i = 0; i < piece.x().length; i++) {
                double[] point = {piece.x()[i], piece.y()[i]};
                if (points.isEmpty() || gap(points.get(points.size() - 1), point) > 1e-9) {
                    points.add(point);
                }
            }
        }
        double[] start = points.get(0);
        if (gap(points.get(points.size() - 1), start) > 1e-9) {
            points.add(start);
        } else {
            points.set(points.size() - 1, start);
        }
        return new double[][] {
            points.stream().mapToDouble(p -> p[0]).toArray(),
            points.stream().mapToDouble(p -> p[1]).toArray()
        };
    }

    /**
     * Deepest level at which the reach is at least a given width, found from the outline; in m above the ground, NaN where no level is
     * that wide.
     */
    static double deepestLevel(List<double[][]> rings, double width) {
        if (rings.isEmpty()) {
            return Double.NaN;
        }
        double low = Double.POSITIVE_INFINITY;
        double high = Double.NEGATIVE_INFINITY;
        for (double y : rings.get(0)[1]) {
            low = Math.min(low, y);
            high = Math.max(high, y);
        }
        int levels = 4000;
        for (int i = 1; i < levels; i++) {
            double y = low + (high - low) * i / levels;
            if (widest(rings, y) >= width) {
                double narrow = low + (high - low) * (i - 1) / levels;
                for (int round = 0; round < 60; round++) {
                    double middle = 0.5 * (narrow + y);
                    if (widest(rings, middle) >= width) {
                        y = middle;
                    } else {
                        narrow = middle;
                    }
                }
                return y;
            }
        }
        return Double.NaN;
    }

    private static double widest(List<double[][]> rings, double y) {
        List<Double> crossings = new ArrayList<>();
        for (double[][] ring : rings) {
            for (int i = 0; i + 1 < ring[0].length; i++) {
                double a = ring[1][i] - y;
                double b = ring[1][i + 1] - y;
                if (a < 0 != b < 0) {
                    crossings.add(ring[0][i] + (ring[0][i + 1] - ring[0][i]) * a / (a - b));
                }
            }
        }
        crossings.sort(null);
        double widest = 0;
        for (int i = 0; i + 1 < crossings.size(); i += 2) {
            widest = Math.max(widest, crossings.get(i + 1) - crossings.get(i));
        }
        return widest;
    }
}
