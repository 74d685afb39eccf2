package org.rodside.report;

import java.util.ArrayList;
import java.util.List;
import org.rodside.report.DrawnPose.Cloud;

/** Outlines of bodies for pictures. */
final class Outline {

    /** Corners of a rounded end. */
    private static final int CORNERS = 16;

    private Outline() {}

    /** The band around all places: the convex hull of a disc around each; all lengths in one unit. */
    static Cloud around(Cloud places, double radius) {
        List<double[]> points = new ArrayList<>();
        for (int i = 0; i < places.x().length; i++) {
            for (int k = 0; k < CORNERS; k++) {
                double angle = 2 * Math.PI * k / CORNERS;
                points.add(
                        new double[] {places.x()[i] + radius * Math.cos(angle), places.y()[i] + radius * Math.sin(angle)
                        });
            }
        }
        return hull(points);
    }

    /** A straight bar between two shares of the way from one place to another. */
    static Cloud bar(Cloud ends, double from, double to, double thickness) {
        double dx = ends.x()[1] - ends.x()[0];
        double dy = ends.y()[1] - ends.y()[0];
        double length = Math.hypot(dx, dy);
        double nx = -dy / length * thickness / 2;
        double ny = dx / length * thickness / 2;
        double x0 = ends.x()[0] + from * dx;
        double y0 = ends.y()[0] + from * dy;
        double x1 = ends.x()[0] + to * dx;
        double y1 = ends.y()[0] + to * dy;
        return new Cloud(
                new double[] {x0 + nx, x1 + nx, x1 - nx, x0 - nx}, new double[] {y0 + ny, y1 + ny, y1 - ny, y0 - ny});
    }

    /** Convex hull, anticlockwise, by Andrew's monotone chain (1979). */
    static Cloud hull(List<double[]> points) {
        List<double[]> sorted = new ArrayList<>(points);
        sorted.sort((a, b) -> a[0] != b[0] ? Double.compare(a[0], b[0]) : Double.compare(a[1], b[1]));
        List<double[]> chain = new ArrayList<>();
        for (int pass = 0; pass < 2; pass++) {
            int start = chain.size();
            for (int i = 0; i < sorted.size(); i++) {
                double[] next = sorted.get(pass == 0 ? i : sorted.size() - 1 - i);
                while (chain.size() >= start + 2
                        && turn(chain.get(chain.size() - 2), chain.get(chain.size() - 1), next) <= 0) {
                    chain.remove(chain.size() - 1);
                }
                chain.add(next);
            }
            chain.remove(chain.size() - 1);
        }
        return new Cloud(
                chain.stream().mapToDouble(p -> p[0]).toArray(),
                chain.stream().mapToDouble(p -> p[1]).toArray());
    }

    private static double turn(double[] a, double[] b, double[] c) {
        return (b[0] - a[0]) * (c[1] - a[1]) - (b[1] - a[1]) * (c[0] - a[0]);
    }
}
