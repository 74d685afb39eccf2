package org.rodside.chart;

/**
 * One thing drawn in a plot. A point with a coordinate that is not finite breaks a line and is left out of a cloud.
 *
 * @param name name in the legend; empty keeps it out of the legend
 * @param style line, shape or cloud of points
 * @param symbol symbol of the points of a cloud; not used by other styles
 * @param colour 0xRRGGBB
 * @param x abscissas; in the unit of the axis; not modified, not copied
 * @param y ordinates, as many; in the unit of the axis; not modified, not copied
 */
public record Series(String name, Style style, Symbol symbol, int colour, double[] x, double[] y) {

    /** How a series is drawn. */
    public enum Style {
        /** A firm line through the points in order. */
        LINE,
        /** A light line, for construction and outlines. */
        THIN,
        /** A broken line, for limits. */
        DASHED,
        /** A closed shape: outline in the colour, inside in a light tint of it. */
        FILL,
        /** Symbols, no line. */
        POINTS,
        /** Larger open rings, white inside: pins. */
        RINGS
    }

    /** Symbols that can be told apart without colour. */
    public enum Symbol {
        DOT,
        SQUARE,
        DIAMOND,
        TRIANGLE,
        CROSS
    }

    public Series {
        if (x.length != y.length) {
            throw new IllegalArgumentException(name + ": " + x.length + " abscissas for " + y.length + " ordinates");
        }
    }

    public static Series line(String name, int colour, double[] x, double[] y) {
        return new Series(name, Style.LINE, Symbol.DOT, colour, x, y);
    }

    public static Series thin(String name, int colour, double[] x, double[] y) {
        return new Series(name, Style.THIN, Symbol.DOT, colour, x, y);
    }

    public static Series dashed(String name, int colour, double[] x, double[] y) {
        return new Series(name, Style.DASHED, Symbol.DOT, colour, x, y);
    }

    public static Series fill(String name, int colour, double[] x, double[] y) {
        return new Series(name, Style.FILL, Symbol.DOT, colour, x, y);
    }

    public static Series points(String name, Symbol symbol, int colour, double[] x, double[] y) {
        return new Series(name, Style.POINTS, symbol, colour, x, y);
    }

    public static Series rings(String name, int colour, double[] x, double[] y) {
        return new Series(name, Style.RINGS, Symbol.DOT, colour, x, y);
    }

    boolean pointsOnly() {
        return style == Style.POINTS || style == Style.RINGS;
    }
}
