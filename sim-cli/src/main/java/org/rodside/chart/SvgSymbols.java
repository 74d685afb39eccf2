package org.rodside.chart;

/** Lines, fills and symbols of an SVG picture. */
final class SvgSymbols {

    private static final double RADIUS = 3.2;
    private static final double RING = 4;

    /** Share of its colour that the inside of a shape keeps. */
    private static final double TINT = 0.22;

    private SvgSymbols() {}

    static void line(SvgText svg, Series series, SvgText.Path path) {
        switch (series.style()) {
            case THIN -> svg.stroke(path, series.colour(), 1, "");
            case DASHED -> svg.stroke(path, series.colour(), 1.6, "stroke-dasharray=\"6 4\"");
            case FILL -> svg.fill(path, Palette.tint(series.colour(), TINT), series.colour());
            default -> svg.stroke(path, series.colour(), 2, "");
        }
    }

    static void rings(SvgText svg, int colour, double[] px, double[] py) {
        for (int i = 0; i < px.length; i++) {
            svg.circle(px[i], py[i], RING, colour);
        }
    }

    static void cloud(SvgText svg, Series series, double[] px, double[] py) {
        SvgText.Path path = new SvgText.Path();
        for (int i = 0; i < px.length; i++) {
            symbol(path, series.symbol(), px[i], py[i]);
        }
        switch (series.symbol()) {
            case DOT -> svg.stroke(path, series.colour(), 2 * RADIUS, "stroke-linecap=\"round\"");
            case CROSS -> svg.stroke(path, series.colour(), 1.8, "");
            default -> svg.fill(path, series.colour(), series.colour());
        }
    }

    private static void symbol(SvgText.Path path, Series.Symbol symbol, double x, double y) {
        double r = RADIUS;
        switch (symbol) {
            case DOT -> path.move(x, y).line(x + 0.01, y);
            case SQUARE ->
                path.polyline(new double[] {x - r, x + r, x + r, x - r}, new double[] {y - r, y - r, y + r, y + r})
                        .end();
            case DIAMOND ->
                path.polyline(new double[] {x, x + r + 1, x, x - r - 1}, new double[] {y - r - 1, y, y + r + 1, y})
                        .end();
            case TRIANGLE ->
                path.polyline(new double[] {x, x + r + 1, x - r - 1}, new double[] {y - r - 1, y + r, y + r})
                        .end();
            case CROSS ->
                path.move(x - r, y - r).line(x + r, y + r).move(x - r, y + r).line(x + r, y - r);
        }
    }

    /** The sample in front of a legend entry. */
    static void sample(SvgText svg, Series series, double x, double y) {
        if (series.pointsOnly()) {
            double[] px = {x + 10};
            double[] py = {y};
            if (series.style() == Series.Style.RINGS) {
                rings(svg, series.colour(), px, py);
            } else {
                cloud(svg, series, px, py);
            }
            return;
        }
        SvgText.Path path = new SvgText.Path();
        if (series.style() == Series.Style.FILL) {
            path.polyline(new double[] {x, x + 20, x + 20, x}, new double[] {y - 6, y - 6, y + 6, y + 6})
                    .end();
        } else {
            path.move(x, y).line(x + 20, y);
        }
        line(svg, series, path);
    }
}
