package org.rodside.chart;

import java.awt.BasicStroke;
import java.awt.Color;
import java.util.Arrays;
import java.util.List;
import org.knowm.xchart.XYChart;
import org.knowm.xchart.XYSeries;
import org.knowm.xchart.XYSeries.XYSeriesRenderStyle;
import org.knowm.xchart.style.markers.Marker;
import org.knowm.xchart.style.markers.SeriesMarkers;

/** Puts the series and reference lines of a plot into an XChart chart. */
final class PlotSeries {

    private static final String LEVEL = "\u0000level ";
    private static final String UPRIGHT = "\u0000upright ";

    /** Share of its colour that the inside of a shape keeps. */
    private static final double TINT = 0.22;

    private PlotSeries() {}

    /** Adds everything drawn, the first at the bottom; parts of one series after a gap stay out of the legend. */
    static void add(XYChart chart, Plot plot, View view, int width, int height) {
        int count = 0;
        for (Series series : plot.series()) {
            double[][] kept = Thinning.of(series, view, width, height);
            boolean shown = !series.name().isEmpty();
            for (double[][] part : Strokes.parts(kept[0], kept[1])) {
                String key = "\u0000" + count++;
                double[][] drawn = series.style() == Series.Style.FILL ? closed(part) : part;
                XYSeries added = chart.addSeries(key, drawn[0], drawn[1]);
                added.setLabel(series.name()).setShowInLegend(shown);
                dress(added, series, PlotStyle.scale(width));
                shown = false;
            }
        }
        references(chart, plot.marks(), view);
    }

    private static double[][] closed(double[][] part) {
        int n = part[0].length;
        double[][] ring = {Arrays.copyOf(part[0], n + 1), Arrays.copyOf(part[1], n + 1)};
        ring[0][n] = part[0][0];
        ring[1][n] = part[1][0];
        return ring;
    }

    private static void dress(XYSeries added, Series series, double scale) {
        Color colour = new Color(series.colour());
        added.setMarker(SeriesMarkers.NONE).setMarkerColor(colour).setLineColor(colour);
        switch (series.style()) {
            case LINE -> added.setLineStyle(stroke(2.4 * scale));
            case THIN -> added.setLineStyle(stroke(1.2 * scale));
            case DASHED -> added.setLineStyle(broken(2 * scale, scale));
            case FILL -> {
                added.setXYSeriesRenderStyle(XYSeriesRenderStyle.PolygonArea);
                added.setLineStyle(stroke(1.6 * scale));
                added.setFillColor(new Color(Palette.tint(series.colour(), TINT)));
            }
            case POINTS -> {
                added.setXYSeriesRenderStyle(XYSeriesRenderStyle.Scatter);
                added.setMarker(marker(series.symbol()));
            }
            case RINGS -> {
                added.setXYSeriesRenderStyle(XYSeriesRenderStyle.Scatter);
                added.setMarker(new RingMarker(scale));
            }
        }
    }

    private static BasicStroke stroke(double width) {
        return new BasicStroke((float) width, BasicStroke.CAP_ROUND, BasicStroke.JOIN_ROUND);
    }

    private static BasicStroke broken(double width, double scale) {
        float[] dashes = {(float) (8 * scale), (float) (5 * scale)};
        return new BasicStroke((float) width, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 10, dashes, 0);
    }

    private static Marker marker(Series.Symbol symbol) {
        return switch (symbol) {
            case DOT -> SeriesMarkers.CIRCLE;
            case SQUARE -> SeriesMarkers.SQUARE;
            case DIAMOND -> SeriesMarkers.DIAMOND;
            case TRIANGLE -> SeriesMarkers.TRIANGLE_UP;
            case CROSS -> SeriesMarkers.CROSS;
        };
    }

    private static void references(XYChart chart, List<Mark> marks, View view) {
        for (int i = 0; i < marks.size(); i++) {
            String key = marks.get(i) instanceof Mark.Level ? LEVEL : UPRIGHT;
            if (!(marks.get(i) instanceof Mark.Label)) {
                double x = marks.get(i) instanceof Mark.Upright upright ? upright.x() : view.left();
                double y = marks.get(i) instanceof Mark.Level level ? level.y() : view.bottom();
                XYSeries added = chart.addSeries(key + i, new double[] {x, x}, new double[] {y, y});
                added.setMarker(SeriesMarkers.NONE).setLineColor(new Color(Palette.GREY));
                added.setLineStyle(broken(1.4, 1));
                added.setShowInLegend(false);
            }
        }
    }

    /** A thin line from a point to the text that explains it. */
    static void leader(XYChart chart, double[] x, double[] y) {
        XYSeries added =
                chart.addSeries("\u0000leader " + chart.getSeriesCollection().size(), x, y);
        added.setMarker(SeriesMarkers.NONE)
                .setLineColor(new Color(Palette.GREY))
                .setLineStyle(stroke(1));
        added.setShowInLegend(false);
    }

    /** Makes the reference lines as long as the window. */
    static void spanReferences(XYChart chart, View view) {
        double[] across = {view.left(), view.right()};
        double[] up = {view.bottom(), view.top()};
        for (XYSeries series : List.copyOf(chart.getSeriesCollection())) {
            String key = series.getName();
            if (key.startsWith(LEVEL)) {
                double y = series.getYData()[0];
                chart.updateXYSeries(key, across, new double[] {y, y}, null);
            } else if (key.startsWith(UPRIGHT)) {
                double x = series.getXData()[0];
                chart.updateXYSeries(key, new double[] {x, x}, up, null);
            }
        }
    }
}
