package org.rodside.report;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;
import org.rodside.chart.Mark;
import org.rodside.chart.Palette;
import org.rodside.chart.Plot;
import org.rodside.chart.Series;
import org.rodside.report.DrawnPose.Body;
import org.rodside.report.DrawnPose.Cloud;
import org.rodside.report.DrawnPose.Strut;
import org.rodside.units.Quantity;
import org.rodside.units.UnitSystem;

/**
 * Draws a linkage in one pose: links as rounded outlines around their pins and points, cylinders in their true
 * thickness, pins as rings, ground and tipping lines. To draw more on top, take {@link #series} and {@link #marks} and
 * make the plot yourself.
 */
public final class LinkagePicture {

    /** Half the thickness of a link drawn between its pins, as a share of the extent of the linkage. */
    private static final double LINK_RADIUS = 0.011;

    private final DrawnPose pose;
    private final UnitSystem units;

    /**
     * A picture to be.
     *
     * @param pose the linkage; in m
     * @param units units of the picture
     */
    public LinkagePicture(DrawnPose pose, UnitSystem units) {
        this.pose = pose;
        this.units = units;
    }

    /** The whole picture. */
    public Plot plot(String title) {
        return new Plot(title, across(units), up(units), series(), true, marks());
    }

    /** Label of the axis across, for plots over the place of something. */
    public static String across(UnitSystem units) {
        return "forward of the swing axis, " + units.unit(Quantity.LENGTH).symbol();
    }

    /** Label of the axis up, for plots over the place of something. */
    public static String up(UnitSystem units) {
        return "above the ground, " + units.unit(Quantity.LENGTH).symbol();
    }

    /** The drawn shapes, the frame at the bottom and the pins on top, none of them in the legend. */
    public List<Series> series() {
        List<Series> shapes = new ArrayList<>();
        double radius = LINK_RADIUS * extent();
        if (pose.machine().shown()) {
            shapes.add(ground(radius));
        }
        shapes.add(shape(Palette.GREY, Outline.around(pose.frame().places(), 1.4 * radius)));
        for (int i = 0; i < pose.links().size(); i++) {
            shapes.add(shape(
                    Palette.category(i), Outline.around(pose.links().get(i).places(), radius)));
        }
        for (Strut strut : pose.cylinders()) {
            Cloud ends = strut.ends();
            double length = Math.hypot(ends.x()[1] - ends.x()[0], ends.y()[1] - ends.y()[0]);
            double gland = Math.min(1, strut.tubeLength() / length);
            shapes.add(shape(Palette.GREY, Outline.bar(ends, gland, 1, strut.rod())));
            shapes.add(shape(Palette.INK, Outline.bar(ends, 0, gland, strut.outside())));
        }
        Cloud pins = scaled(pose.pins());
        shapes.add(Series.rings("", Palette.INK, pins.x(), pins.y()));
        return shapes;
    }

    /** Names of links and cylinders, and the tipping lines. */
    public List<Mark> marks() {
        List<Mark> marks = new ArrayList<>();
        OptionalDouble front = pose.machine().front();
        OptionalDouble rear = pose.machine().rear();
        front.ifPresent(x -> marks.add(label(x, 0, "front tipping line")));
        rear.ifPresent(x -> marks.add(label(x, 0, "rear tipping line")));
        for (Body link : pose.links()) {
            marks.add(label(mean(link.places().x()), mean(link.places().y()), link.name()));
        }
        for (Strut strut : pose.cylinders()) {
            marks.add(label(mean(strut.ends().x()), mean(strut.ends().y()), strut.name() + " cylinder"));
        }
        return marks;
    }

    private Series ground(double radius) {
        double left = Math.min(least(pose.pins().x()), pose.machine().rear().orElse(0)) - 6 * radius;
        double right = Math.max(most(pose.pins().x()), pose.machine().front().orElse(0)) + 6 * radius;
        List<Double> x = new ArrayList<>(List.of(left, right));
        List<Double> y = new ArrayList<>(List.of(0.0, 0.0));
        for (OptionalDouble line :
                List.of(pose.machine().front(), pose.machine().rear())) {
            if (line.isPresent()) {
                double at = line.getAsDouble();
                x.addAll(List.of(Double.NaN, at, at - radius, at + radius, at));
                y.addAll(List.of(Double.NaN, 0.0, -2 * radius, -2 * radius, 0.0));
            }
        }
        Cloud line = scaled(new Cloud(
                x.stream().mapToDouble(v -> v).toArray(),
                y.stream().mapToDouble(v -> v).toArray()));
        return Series.line("", Palette.GREY, line.x(), line.y());
    }

    private Series shape(int colour, Cloud outline) {
        Cloud drawn = scaled(outline);
        return Series.fill("", colour, drawn.x(), drawn.y());
    }

    private Mark label(double x, double y, String text) {
        return new Mark.Label(units.of(x, Quantity.LENGTH), units.of(y, Quantity.LENGTH), text);
    }

    private Cloud scaled(Cloud cloud) {
        double[] x = new double[cloud.x().length];
        double[] y = new double[x.length];
        for (int i = 0; i < x.length; i++) {
            x[i] = units.of(cloud.x()[i], Quantity.LENGTH);
            y[i] = units.of(cloud.y()[i], Quantity.LENGTH);
        }
        return new Cloud(x, y);
    }

    private double extent() {
        double wide = most(pose.pins().x()) - least(pose.pins().x());
        double tall = most(pose.pins().y()) - least(pose.pins().y());
        return Math.max(wide, tall);
    }

    private static double least(double[] values) {
        return Arrays.stream(values).min().orElse(0);
    }

    private static double most(double[] values) {
        return Arrays.stream(values).max().orElse(0);
    }

    private static double mean(double[] values) {
        return Arrays.stream(values).average().orElse(0);
    }
}
