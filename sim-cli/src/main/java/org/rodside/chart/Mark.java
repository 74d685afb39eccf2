package org.rodside.chart;

/** Something that explains a plot without being data; coordinates in the units of the axes. */
public sealed interface Mark {

    /** A broken line all the way across at one ordinate; the text stands at its end and may be empty. */
    record Level(double y, String text) implements Mark {}

    /** A broken line all the way up at one abscissa; the text stands at its end and may be empty. */
    record Upright(double x, String text) implements Mark {}

    /** A short text beside a point; it is put where it covers neither another text nor, if possible, the drawing. */
    record Label(double x, double y, String text) implements Mark {}
}
