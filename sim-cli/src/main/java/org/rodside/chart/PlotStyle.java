package org.rodside.chart;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import org.knowm.xchart.XYChart;
import org.knowm.xchart.XYChartBuilder;
import org.knowm.xchart.style.AxesChartStyler;
import org.knowm.xchart.style.Styler.LegendPosition;
import org.knowm.xchart.style.XYStyler;

/** The look of a PNG picture: white ground, thin grid, plain letters that grow with the picture. */
final class PlotStyle {

    /** Width of a picture at which letters have their nominal size; in pixels. */
    private static final double NOMINAL_WIDTH = 1200;

    private PlotStyle() {}

    static Font labelFont(int width) {
        return font(Font.PLAIN, 17, width);
    }

    static double scale(int width) {
        return Math.max(0.6, width / NOMINAL_WIDTH);
    }

    private static Font font(int style, double size, int width) {
        return new Font(Font.SANS_SERIF, style, (int) Math.round(size * scale(width)));
    }

    /** An empty chart in the house style. */
    static XYChart chart(Plot plot, int width, int height) {
        XYChart chart = new XYChartBuilder()
                .width(width)
                .height(height)
                .title(plot.title())
                .xAxisTitle(plot.x())
                .yAxisTitle(plot.y())
                .build();
        XYStyler style = chart.getStyler();
        Color ink = new Color(Palette.INK);
        style.setChartBackgroundColor(Color.WHITE);
        style.setPlotBackgroundColor(Color.WHITE);
        style.setPlotBorderVisible(false);
        style.setPlotContentSize(1.0);
        style.setChartPadding((int) Math.round(14 * scale(width)));
        style.setChartFontColor(ink);
        style.setChartTitleVisible(!plot.title().isEmpty());
        style.setChartTitleBoxVisible(false);
        style.setChartTitleFont(font(Font.BOLD, 22, width));
        style.setAntiAlias(true);
        legend(style, plot, width);
        axes(style, plot, width);
        style.setAnnotationTextFont(labelFont(width));
        style.setAnnotationTextFontColor(ink);
        return chart;
    }

    private static void legend(XYStyler style, Plot plot, int width) {
        style.setLegendVisible(plot.series().stream().anyMatch(s -> !s.name().isEmpty()));
        style.setLegendPosition(LegendPosition.OutsideE);
        style.setLegendBorderColor(Color.WHITE);
        style.setLegendBackgroundColor(Color.WHITE);
        style.setLegendFont(font(Font.PLAIN, 16, width));
        style.setLegendPadding((int) Math.round(8 * scale(width)));
        style.setLegendSeriesLineLength((int) Math.round(26 * scale(width)));
    }

    private static void axes(XYStyler style, Plot plot, int width) {
        style.setXAxisTitleVisible(!plot.x().isEmpty());
        style.setYAxisTitleVisible(!plot.y().isEmpty());
        style.setAxisTitleFont(font(Font.PLAIN, 17, width));
        style.setAxisTickLabelsFont(font(Font.PLAIN, 16, width));
        style.setAxisTickLabelsColor(new Color(Palette.INK));
        style.setAxisTickMarksColor(new Color(Palette.GREY));
        style.setAxisTickMarksStroke(new BasicStroke(1f));
        style.setPlotGridLinesColor(new Color(Palette.GRID));
        style.setPlotGridLinesStroke(new BasicStroke(1f));
        style.setPlotTicksMarksVisible(false);
        style.setXAxisTickMarkSpacingHint((int) Math.round(110 * scale(width)));
        style.setYAxisTickMarkSpacingHint((int) Math.round(64 * scale(width)));
        style.setYAxisLabelAlignment(AxesChartStyler.TextAlignment.Right);
        style.setXAxisTickLabelsFormattingFunction(PlotStyle::tick);
        style.setYAxisTickLabelsFormattingFunction(PlotStyle::tick);
    }

    /** A tick of an axis whose step is not known here: as many decimals as the value needs, up to six. */
    static String tick(double value) {
        for (int decimals = 0; decimals < 6; decimals++) {
            double scaled = value * Math.pow(10, decimals);
            if (Math.abs(scaled - Math.rint(scaled)) < 1e-6 * Math.max(1, Math.abs(scaled))) {
                return Ticks.text(value, decimals);
            }
        }
        return Ticks.text(value, 6);
    }
}
