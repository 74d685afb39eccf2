package org.rodside.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Arrays;
import java.util.SplittableRandom;
import org.junit.jupiter.api.RepeatedTest;
import org.junit.jupiter.api.RepetitionInfo;
import org.junit.jupiter.api.Test;

/** The search for a largest value, on functions whose peak is known. */
class BoxMaximumTest {

    /** Peaks are known exactly; a start is given up that promises no more than 1e-8 of a value of about 100. */
    private static final double PEAK_ABS = 1e-5;

    /** The least of several planes and bowls that all meet at a random place: the sharpest ridges there are. */
    @RepeatedTest(20)
    void slantingRidges(RepetitionInfo repetition) {
        int seed = repetition.getCurrentRepetition();
        SplittableRandom random = new SplittableRandom(seed);
        double[] top = random.doubles(3, 0.1, 0.9).toArray();
        double[][] slope = new double[5][3];
        for (int a = 0; a < 3; a++) {
            for (int i = 0; i < 4; i++) {
                slope[i][a] = random.nextDouble(-20, 20);
                slope[4][a] -= slope[i][a];
            }
        }
        Optimum found = BoxMaximum.overAll(3).find(new LeastOf(slope, top));
        // the slopes add up to nothing, so no step can raise all of them: the value at the meeting place is the largest
        assertEquals(100, found.value(), PEAK_ABS, "seed " + seed);
    }

    /** The least of planes bent down a little, all of height 100 at one place. */
    private static final class LeastOf implements BoxMaximum.Objective {

        private final double[][] slope;
        private final double[] top;
        private final double[] piece;

        LeastOf(double[][] slope, double[] top) {
            this.slope = slope;
            this.top = top;
            piece = new double[slope.length];
        }

        @Override
        public double at(double[] at) {
            for (int i = 0; i < piece.length; i++) {
                piece[i] = 100;
                for (int a = 0; a < top.length; a++) {
                    double off = at[a] - top[a];
                    piece[i] += slope[i][a] * off - 3 * off * off;
                }
            }
            return Arrays.stream(piece).min().orElseThrow();
        }

        @Override
        public int pieces() {
            return piece.length;
        }

        @Override
        public void tellPieces(double[] out) {
            System.arraycopy(piece, 0, out, 0, piece.length);
        }
    }

    /** A ridge a third of a grid cell wide along one stroke, beside a broad hill that the grid sees as highest. */
    @Test
    void narrowAlongOneStrokeBesideABroadHill() {
        double cell = 1.0 / 20;
        double ridge = 15.5 * cell;
        Optimum found = BoxMaximum.overAll(3).find(at -> {
            double broad = 1 - square(at[0] - 0.2) - square(at[1] - 0.3);
            return broad - 0.01 * square(at[2] - 0.2) + 2 * Math.exp(-square((at[2] - ridge) / (cell / 6)));
        });
        // the slope of the broad hill moves the top by less than a thousandth of the ridge's width
        assertEquals(3 - 0.01 * square(ridge - 0.2), found.value(), PEAK_ABS);
        assertEquals(ridge, found.at()[2], 1e-3 * cell);
    }

    private static double square(double x) {
        return x * x;
    }

    /** One fixed axis stays where it is, one free axis has its peak at the border; no value on half of the box. */
    @Test
    void fixedAxisBorderAndHoles() {
        Optimum found = new BoxMaximum(new double[] {0.3, Double.NaN, Double.NaN})
                .find(at -> at[1] < 0.5 ? Double.NaN : at[0] + at[1] - Math.abs(at[2] - 1.0 / 3));
        assertEquals(1.3, found.value(), PEAK_ABS);
        assertEquals(0.3, found.at()[0], 0.0);
        assertTrue(!new BoxMaximum(new double[] {Double.NaN})
                .find(at -> Double.NaN)
                .exists());
    }
}
