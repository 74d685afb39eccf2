package org.rodside.chart;

import java.util.ArrayList;
import java.util.List;

/**
 * Writes a plot as one self-contained {@code svg} element for a page: sharp at any size, a few kilobytes, no script and no
 * outside file. Text stays text.
 */
public final class Svg {

    private static final double TEXT = 13;
    private static final double LEGEND_ROW = 20;
    private static final String BROKEN = "stroke-dasharray=\"7 4\"";

    private final Plot plot;
    private final SvgLayout layout;
    private final SvgText svg = new SvgText();
    private final int width;
    private final int height;

    private Svg(Plot plot, int width, int height) {
        this.plot = plot;
        this.width = width;
        this.height = height;
        this.layout = layout(plot, width, height);
    }

    /** The plot as an {@code svg} element, well-formed XML; size in CSS pixels. */
    public static String of(Plot plot, int width, int height) {
        return new Svg(plot, width, height).write();
    }

    /** Text made safe inside elements and attributes of an XML or HTML page. */
    public static String escape(String raw) {
        return SvgText.escape(raw);
    }

    private static List<Series> named(Plot plot) {
        return plot.series().stream().filter(s -> !s.name().isEmpty()).toList();
    }

    private static SvgLayout layout(Plot plot, int width, int height) {
        View view = View.around(plot);
        double legend = named(plot).stream()
                .mapToDouble(s -> 50 + SvgText.width(s.name(), TEXT))
                .max()
                .orElse(12);
        double left = plot.y().isEmpty() ? 62 : 80;
        double top = plot.title().isEmpty() ? 12 : 38;
        double w = Math.max(60, width - left - legend);
        double h = Math.max(60, height - top - (plot.x().isEmpty() ? 30 : 52));
        return new SvgLayout(left, top, w, h, plot.equalAspect() ? view.equalised(w, h) : view);
    }

    private String write() {
        svg.open(width, height, plot.title());
        if (!plot.title().isEmpty()) {
            svg.text(layout.left(), 22, plot.title(), "start", 16, "font-weight=\"600\"");
        }
        axes();
        for (Series series : plot.series()) {
            draw(series);
        }
        marks();
        legend();
        return svg.close();
    }

    private void axes() {
        double right = layout.left() + layout.width();
        double bottom = layout.top() + layout.height();
        View view = layout.view();
        Ticks across = Ticks.of(view.left(), view.right(), Math.max(2, (int) (layout.width() / 85)));
        Ticks up = Ticks.of(view.bottom(), view.top(), Math.max(2, (int) (layout.height() / 48)));
        SvgText.Path grid = new SvgText.Path();
        for (double x : across.values()) {
            grid.move(layout.px(x), layout.top()).line(layout.px(x), bottom);
            svg.text(layout.px(x), bottom + 18, across.text(x), "middle", TEXT, "");
        }
        for (double y : up.values()) {
            grid.move(layout.left(), layout.py(y)).line(right, layout.py(y));
            svg.text(layout.left() - 8, layout.py(y) + 4.5, up.text(y), "end", TEXT, "");
        }
        svg.stroke(grid, Palette.GRID, 1, "");
        SvgText.Path frame = new SvgText.Path();
        frame.move(layout.left(), layout.top()).line(layout.left(), bottom).line(right, bottom);
        svg.stroke(frame, Palette.GREY, 1, "");
        svg.text(layout.left() + 0.5 * layout.width(), bottom + 40, plot.x(), "middle", TEXT, "");
        double middle = layout.top() + 0.5 * layout.height();
        svg.text(18, middle, plot.y(), "middle", TEXT, "transform=\"rotate(-90 18 " + SvgText.number(middle) + ")\"");
    }

    private void draw(Series series) {
        double[][] kept = Thinning.of(series, layout.view(), (int) layout.width(), (int) layout.height());
        double[] px = layout.pxs(kept[0]);
        double[] py = layout.pys(kept[1]);
        if (series.style() == Series.Style.RINGS) {
            SvgSymbols.rings(svg, series.colour(), px, py);
            return;
        }
        if (series.style() == Series.Style.POINTS) {
            SvgSymbols.cloud(svg, series, px, py);
            return;
        }
        SvgText.Path path = new SvgText.Path();
        for (double[][] part : Strokes.parts(px, py)) {
            path.polyline(part[0], part[1]);
            if (series.style() == Series.Style.FILL) {
                path.end();
            }
        }
        SvgSymbols.line(svg, series, path);
    }

    private void marks() {
        double right = layout.left() + layout.width();
        double bottom = layout.top() + layout.height();
        LabelPlaceBuffer.Box area = new LabelPlaceBuffer.Box(layout.left(), layout.top(), right, bottom);
        LabelPlaceBuffer places = new LabelPlaceBuffer(area, drawn());
        for (Mark mark : plot.marks()) {
            if (mark instanceof Mark.Level level) {
                level(level, places);
            } else if (mark instanceof Mark.Upright upright) {
                upright(upright, places);
            }
        }
        for (Mark mark : plot.marks()) {
            if (mark instanceof Mark.Label label) {
                label(label, places);
            }
        }
    }

    private void level(Mark.Level level, LabelPlaceBuffer places) {
        double right = layout.left() + layout.width();
        double y = layout.py(level.y());
        double wide = SvgText.width(level.text(), TEXT);
        places.taken(new LabelPlaceBuffer.Box(right - wide - 8, y - 20, right, y));
        svg.stroke(new SvgText.Path().move(layout.left(), y).line(right, y), Palette.GREY, 1.2, BROKEN);
        svg.haloed(right - 6, y - 6, level.text(), "end", TEXT);
    }

    private void upright(Mark.Upright upright, LabelPlaceBuffer places) {
        double x = layout.px(upright.x());
        double top = layout.top();
        double wide = SvgText.width(upright.text(), TEXT);
        places.taken(new LabelPlaceBuffer.Box(x, top, x + wide + 8, top + 20));
        svg.stroke(new SvgText.Path().move(x, top).line(x, top + layout.height()), Palette.GREY, 1.2, BROKEN);
        svg.haloed(x + 6, top + 14, upright.text(), "start", TEXT);
    }

    private void label(Mark.Label label, LabelPlaceBuffer places) {
        double x = layout.px(label.x());
        double y = layout.py(label.y());
        LabelPlaceBuffer.Box box = places.place(x, y, SvgText.width(label.text(), TEXT) + 4, TEXT + 4);
        box.leaderEnd(x, y).ifPresent(end -> {
            SvgText.Path leader = new SvgText.Path().move(x, y).line(end[0], end[1]);
            svg.stroke(leader, Palette.GREY, 1, "");
        });
        svg.haloed(box.middleX(), box.middleY() + 0.35 * TEXT, label.text(), "middle", TEXT);
    }

    private List<double[]> drawn() {
        List<double[]> points = new ArrayList<>();
        for (Series series : plot.series()) {
            double[][] kept = Thinning.of(series, layout.view(), (int) layout.width(), (int) layout.height());
            for (double[][] part : Strokes.parts(layout.pxs(kept[0]), layout.pys(kept[1]))) {
                Strokes.walk(part[0], part[1], series.pointsOnly() ? Double.MAX_VALUE : 8, points);
            }
        }
        return points;
    }

    private void legend() {
        double x = layout.left() + layout.width() + 14;
        double y = layout.top() + 12;
        for (Series series : named(plot)) {
            SvgSymbols.sample(svg, series, x, y);
            svg.text(x + 26, y + 4.5, series.name(), "start", TEXT, "");
            y += LEGEND_ROW;
        }
    }
}
