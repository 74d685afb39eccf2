package org.rodside.chart;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** Lines as the painters want them: cut at gaps, and as a row of points for labels to keep clear of. */
final class Strokes {

    private Strokes() {}

    /** The unbroken parts of a line; x and y of each. */
    static List<double[][]> parts(double[] x, double[] y) {
        List<double[][]> parts = new ArrayList<>();
        int start = 0;
        for (int i = 0; i <= x.length; i++) {
            if (i == x.length || !Double.isFinite(x[i]) || !Double.isFinite(y[i])) {
                if (i > start) {
                    parts.add(new double[][] {Arrays.copyOfRange(x, start, i), Arrays.copyOfRange(y, start, i)});
                }
                start = i + 1;
            }
        }
        return parts;
    }

    /**
     * Adds points along a line, no further apart than a step, and its corners.
     *
     * @param px abscissas; in pixels
     * @param py ordinates; in pixels
     * @param step largest distance; in pixels
     * @param into points {x, y}, added to
     */
    static void walk(double[] px, double[] py, double step, List<double[]> into) {
        for (int i = 0; i < px.length; i++) {
            into.add(new double[] {px[i], py[i]});
            if (i + 1 < px.length) {
                int between = (int) (Math.hypot(px[i + 1] - px[i], py[i + 1] - py[i]) / step);
                for (int k = 1; k <= between; k++) {
                    double t = (double) k / (between + 1);
                    into.add(new double[] {px[i] + t * (px[i + 1] - px[i]), py[i] + t * (py[i + 1] - py[i])});
                }
            }
        }
    }
}
