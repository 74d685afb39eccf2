package org.rodside.chart;

import java.awt.FontMetrics;
import java.awt.Graphics2D;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.io.OutputStream;
import java.util.ArrayList;
import java.util.List;
import org.knowm.xchart.AnnotationText;
import org.knowm.xchart.ChartEncoder;
import org.knowm.xchart.XYChart;

/** Paints a plot as a PNG picture on white. */
public final class PlotWriter {

    /** Largest remaining difference between the two scales of an equal-aspect plot, as a share: far below a pixel. */
    private static final double ASPECT_REL = 1e-4;

    /** Rounds of paint and widen; two are usual, tick labels that change width may ask for one more. */
    private static final int MOST_ROUNDS = 5;

    private final Plot plot;
    private final int width;
    private final int height;
    private final XYChart chart;
    private final BufferedImage scratch;
    private View view;

    private PlotWriter(Plot plot, int width, int height) {
        this.plot = plot;
        this.width = width;
        this.height = height;
        this.view = View.around(plot);
        this.chart = PlotStyle.chart(plot, width, height);
        this.scratch = new BufferedImage(width, height, BufferedImage.TYPE_INT_RGB);
    }

    /**
     * Writes the picture.
     *
     * @param to takes the PNG bytes; not closed
     * @param width width; in pixels
     * @param height height; in pixels
     */
    public static void png(Plot plot, OutputStream to, int width, int height) throws IOException {
        PlotWriter writer = new PlotWriter(plot, width, height);
        writer.prepare();
        to.write(ChartEncoder.getBytes(writer.chart, "png"));
    }

    private void prepare() {
        PlotSeries.add(chart, plot, view, width, height);
        window();
        paint();
        for (int round = 0; plot.equalAspect() && round < MOST_ROUNDS; round++) {
            double across = pixelsPerUnitAcross();
            double up = pixelsPerUnitUp();
            if (Math.abs(across / up - 1) < ASPECT_REL) {
                break;
            }
            view = view.equalised(across * (view.right() - view.left()), up * (view.top() - view.bottom()));
            window();
            paint();
        }
        labels();
    }

    private void window() {
        chart.getStyler().setXAxisMin(view.left()).setXAxisMax(view.right());
        chart.getStyler().setYAxisMin(view.bottom()).setYAxisMax(view.top());
        PlotSeries.spanReferences(chart, view);
    }

    private void paint() {
        Graphics2D graphics = scratch.createGraphics();
        chart.paint(graphics, width, height);
        graphics.dispose();
    }

    private double pixelsPerUnitAcross() {
        return (chart.getScreenXFromChart(view.right()) - chart.getScreenXFromChart(view.left()))
                / (view.right() - view.left());
    }

    private double pixelsPerUnitUp() {
        return (chart.getScreenYFromChart(view.bottom()) - chart.getScreenYFromChart(view.top()))
                / (view.top() - view.bottom());
    }

    private void labels() {
        FontMetrics metrics = scratch.createGraphics().getFontMetrics(PlotStyle.labelFont(width));
        LabelPlaceBuffer.Box area = new LabelPlaceBuffer.Box(
                chart.getScreenXFromChart(view.left()),
                chart.getScreenYFromChart(view.top()),
                chart.getScreenXFromChart(view.right()),
                chart.getScreenYFromChart(view.bottom()));
        LabelPlaceBuffer places = new LabelPlaceBuffer(area, drawn());
        double tall = metrics.getAscent() + metrics.getDescent();
        for (Mark mark : plot.marks()) {
            if (mark instanceof Mark.Level level && !level.text().isEmpty()) {
                double left = area.right() - metrics.stringWidth(level.text()) - 12;
                double y = chart.getScreenYFromChart(level.y()) - 4;
                taken(level.text(), places, new LabelPlaceBuffer.Box(left, y - tall, area.right() - 4, y));
            } else if (mark instanceof Mark.Upright upright && !upright.text().isEmpty()) {
                double x = chart.getScreenXFromChart(upright.x()) + 2;
                double right = x + metrics.stringWidth(upright.text()) + 8;
                taken(
                        upright.text(),
                        places,
                        new LabelPlaceBuffer.Box(x, area.top() + 2, right, area.top() + 2 + tall));
            }
        }
        for (Mark mark : plot.marks()) {
            if (mark instanceof Mark.Label label) {
                label(label, places, metrics.stringWidth(label.text()) + 4, tall);
            }
        }
    }

    private void label(Mark.Label label, LabelPlaceBuffer places, double wide, double tall) {
        double x = chart.getScreenXFromChart(label.x());
        double y = chart.getScreenYFromChart(label.y());
        LabelPlaceBuffer.Box box = places.place(x, y, wide, tall);
        box.leaderEnd(x, y).ifPresent(end -> leader(label, end));
        text(label.text(), box);
    }

    private void leader(Mark.Label label, double[] end) {
        double x = label.x() + (end[0] - chart.getScreenXFromChart(label.x())) / pixelsPerUnitAcross();
        double y = label.y() - (end[1] - chart.getScreenYFromChart(label.y())) / pixelsPerUnitUp();
        PlotSeries.leader(chart, new double[] {label.x(), x}, new double[] {label.y(), y});
    }

    private void taken(String words, LabelPlaceBuffer places, LabelPlaceBuffer.Box box) {
        places.taken(box);
        text(words, box);
    }

    private void text(String words, LabelPlaceBuffer.Box box) {
        chart.addAnnotation(new AnnotationText(words, box.middleX(), height - box.middleY(), true));
    }

    private List<double[]> drawn() {
        List<double[]> points = new ArrayList<>();
        for (Series series : plot.series()) {
            double[][] kept = Thinning.of(series, view, width, height);
            for (double[][] part : Strokes.parts(kept[0], kept[1])) {
                double[] px = new double[part[0].length];
                double[] py = new double[part[0].length];
                for (int i = 0; i < px.length; i++) {
                    px[i] = chart.getScreenXFromChart(part[0][i]);
                    py[i] = chart.getScreenYFromChart(part[1][i]);
                }
                Strokes.walk(px, py, series.pointsOnly() ? Double.MAX_VALUE : 8, points);
            }
        }
        return points;
    }
}
