package org.rodside.chart;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

class PaletteTest {

    /** Least contrast of a graphic against its ground: WCAG 2.1, 1.4.11 asks 3:1 (from memory). No unit. */
    private static final double CONTRAST = 3.0;

    /** Least CIE 1976 colour difference between two kinds; about ten times what an eye can just tell. No unit. */
    private static final double APART = 20;

    /** Linear RGB as seen with full, red-blind and green-blind sight: Viénot, Brettel, Mollon 1999 (from memory). */
    private static final double[][][] SIGHTS = {
        {{1, 0, 0}, {0, 1, 0}, {0, 0, 1}},
        {{0.11238, 0.88762, 0}, {0.11238, 0.88762, 0}, {0.00401, -0.00401, 1}},
        {{0.29275, 0.70725, 0}, {0.29275, 0.70725, 0}, {-0.02234, 0.02234, 1}}
    };

    @Test
    void kindsStayApartForEverySight() {
        for (double[][] sight : SIGHTS) {
            for (int i = 0; i < Palette.categories(); i++) {
                for (int j = 0; j < i; j++) {
                    double apart = distance(lab(Palette.category(i), sight), lab(Palette.category(j), sight));
                    assertTrue(apart > APART, "kinds " + i + " and " + j + " are only " + apart + " apart");
                }
            }
        }
    }

    @Test
    void kindsStandOutOnWhite() {
        for (int i = 0; i < Palette.categories(); i++) {
            double contrast = 1.05 / (luminance(Palette.category(i)) + 0.05);
            assertTrue(contrast > CONTRAST, "kind " + i + " has contrast " + contrast);
        }
        assertTrue(1.05 / (luminance(Palette.INK) + 0.05) > 7, "text");
    }

    @Test
    void shadesGoFromLightToDarkInEvenSteps() {
        for (int i = 1; i < Palette.shades(); i++) {
            double step = lab(Palette.shade(i - 1, 9), SIGHTS[0])[0] - lab(Palette.shade(i, 9), SIGHTS[0])[0];
            assertTrue(step > 4 && step < 12, "step " + i + " is " + step);
        }
        assertEquals(Palette.shade(0, 9), Palette.shade(0, 2));
        assertEquals(Palette.shade(8, 9), Palette.shade(1, 2));
    }

    @Test
    void aTintIsTheColourMixedWithWhite() {
        assertEquals(0xFFFFFF, Palette.tint(0x2153AB, 0));
        assertEquals(0x2153AB, Palette.tint(0x2153AB, 1));
        assertEquals(0x808080, Palette.tint(0x000000, 0.5) & 0xFFFFFF);
    }

    private static double linear(int rgb, int shift) {
        double c = (rgb >> shift & 0xFF) / 255.0;
        return c <= 0.04045 ? c / 12.92 : Math.pow((c + 0.055) / 1.055, 2.4);
    }

    private static double luminance(int rgb) {
        return 0.2126 * linear(rgb, 16) + 0.7152 * linear(rgb, 8) + 0.0722 * linear(rgb, 0);
    }

    /** CIE L*a*b* (D65, sRGB primaries of IEC 61966-2-1, from memory). */
    private static double[] lab(int rgb, double[][] sight) {
        double[] seen = new double[3];
        for (int i = 0; i < 3; i++) {
            seen[i] = sight[i][0] * linear(rgb, 16) + sight[i][1] * linear(rgb, 8) + sight[i][2] * linear(rgb, 0);
        }
        double x = root((0.4124 * seen[0] + 0.3576 * seen[1] + 0.1805 * seen[2]) / 0.9505);
        double y = root(0.2126 * seen[0] + 0.7152 * seen[1] + 0.0722 * seen[2]);
        double z = root((0.0193 * seen[0] + 0.1192 * seen[1] + 0.9505 * seen[2]) / 1.089);
        return new double[] {116 * y - 16, 500 * (x - y), 200 * (y - z)};
    }

    private static double root(double t) {
        return t > 0.008856 ? Math.cbrt(t) : 7.787 * t + 16.0 / 116;
    }

    private static double distance(double[] a, double[] b) {
        return Math.sqrt(Math.pow(a[0] - b[0], 2) + Math.pow(a[1] - b[1], 2) + Math.pow(a[2] - b[2], 2));
    }
}
