package org.rodside.chart;

import java.util.Arrays;
import java.util.BitSet;

/** Leaves out points that a picture cannot show, so that a long recording makes a small file and no other picture. */
final class Thinning {

    /** Side of a cell in which one point stands for all; in pixels; half of the smallest symbol. */
    private static final int CELL = 3;

    private Thinning() {}

    /**
     * What of a series is worth drawing on an area of so many pixels: lines that run to the right keep first, lowest,
     * highest and last point of every pixel column, clouds keep the last point of every cell of three pixels, other
     * lines stay as they are.
     *
     * @return x and y of the points kept, in order; a point with NaN marks a gap in a line
     */
    static double[][] of(Series series, View view, int width, int height) {
        if (series.pointsOnly()) {
            return cloud(series, view, (width + 2) / CELL, (height + 2) / CELL);
        }
        boolean longer = series.x().length > 4 * width;
        return longer && series.style() != Series.Style.FILL && runsRight(series.x())
                ? columns(series, view, width)
                : new double[][] {series.x(), series.y()};
    }

    private static boolean runsRight(double[] x) {
        for (int i = 1; i < x.length; i++) {
            if (!(x[i] >= x[i - 1])) {
                return false;
            }
        }
        return true;
    }

    private static double[][] columns(Series series, View view, int width) {
        double[] x = series.x();
        double[] y = series.y();
        BitSet kept = new BitSet(x.length);
        double scale = width / (view.right() - view.left());
        int start = 0;
        while (start < x.length) {
            double column = Math.floor((x[start] - view.left()) * scale);
            int lowest = start;
            int highest = start;
            int end = start;
            while (end < x.length && Math.floor((x[end] - view.left()) * scale) == column) {
                lowest = y[end] < y[lowest] ? end : lowest;
                highest = y[end] > y[highest] ? end : highest;
                if (!Double.isFinite(y[end])) {
                    kept.set(end);
                }
                end++;
            }
            kept.set(start);
            kept.set(lowest);
            kept.set(highest);
            kept.set(end - 1);
            start = end;
        }
        return pick(x, y, kept);
    }

    private static double[][] cloud(Series series, View view, int columns, int rows) {
        double[] x = series.x();
        double[] y = series.y();
        int[] last = new int[columns * rows];
        Arrays.fill(last, -1);
        for (int i = 0; i < x.length; i++) {
            double column = (x[i] - view.left()) / (view.right() - view.left()) * columns;
            double row = (y[i] - view.bottom()) / (view.top() - view.bottom()) * rows;
            if (column >= 0 && column < columns && row >= 0 && row < rows) {
                last[(int) row * columns + (int) column] = i;
            }
        }
        BitSet kept = new BitSet(x.length);
        Arrays.stream(last).filter(i -> i >= 0).forEach(kept::set);
        return pick(x, y, kept);
    }

    private static double[][] pick(double[] x, double[] y, BitSet kept) {
        return new double[][] {
            kept.stream().mapToDouble(i -> x[i]).toArray(),
            kept.stream().mapToDouble(i -> y[i]).toArray()
        };
    }
}
