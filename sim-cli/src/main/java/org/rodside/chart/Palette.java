package org.rodside.chart;

/**
 * The house colours. The eight of {@link #category} were chosen by search so that every pair stays apart for full, red-blind
 * and green-blind sight and each stands out on white; the nine of {@link #shade} go from light to dark without a turn.
 */
public final class Palette {

    /** Text and axes. */
    public static final int INK = 0x2A2D33;

    /** Secondary lines. */
    public static final int GREY = 0x7A808A;

    /** Grid. */
    public static final int GRID = 0xE3E5E8;

    public static final int WHITE = 0xFFFFFF;

    private static final int[] CATEGORIES = {
        0x2153AB, 0xEE6748, 0x1B967F, 0x704027, 0x7A4B86, 0x4A7209, 0x3E3E47, 0x5189CD
    };

    private static final int[] SHADES = {
        0xE3C567, 0xC3B85F, 0x9CAA63, 0x759A6F, 0x54887B, 0x3F7482, 0x385D80, 0x364472, 0x33295A
    };

    private Palette() {}

    /** Number of colours before {@link #category} starts again. */
    public static int categories() {
        return CATEGORIES.length;
    }

    /** Number of shades from light (small) to dark (large). */
    public static int shades() {
        return SHADES.length;
    }

    /** Colour of the n-th of several kinds, 0xRRGGBB. */
    public static int category(int n) {
        return CATEGORIES[n % CATEGORIES.length];
    }

    /** Colour of the n-th of several steps, 0xRRGGBB, spread over the whole range from light to dark. */
    public static int shade(int n, int steps) {
        return SHADES[steps <= 1 ? SHADES.length / 2 : Math.round((float) n * (SHADES.length - 1) / (steps - 1))];
    }

    /** A colour mixed with white; share of the colour from 0 (white) to 1. */
    public static int tint(int colour, double share) {
        int mixed = 0;
        for (int shift = 16; shift >= 0; shift -= 8) {
            long part = Math.round(255 + share * ((colour >> shift & 0xFF) - 255));
            mixed = mixed << 8 | (int) part;
        }
        return mixed;
    }
}
