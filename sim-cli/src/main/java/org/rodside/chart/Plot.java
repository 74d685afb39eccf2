package org.rodside.chart;

import java.util.List;

/**
 * What a picture shows; how it is painted is up to {@link PlotWriter} (PNG) and {@link Svg}. Numbers are in the units
 * that the axis labels say.
 *
 * @param title heading above the picture; may be empty
 * @param x label of the axis across, with unit, e.g. {@code distance from the swing axis, mm}
 * @param y label of the axis up, with unit
 * @param series what is drawn, the first at the bottom
 * @param equalAspect whether one unit across is as long as one unit up, as any drawing of a linkage needs
 * @param marks reference lines and labelled points
 */
public record Plot(String title, String x, String y, List<Series> series, boolean equalAspect, List<Mark> marks) {

    public Plot {
        series = List.copyOf(series);
        marks = List.copyOf(marks);
    }

    /** The same plot without its heading, for a page that has its own caption. */
    public Plot untitled() {
        return new Plot("", x, y, series, equalAspect, marks);
    }
}
