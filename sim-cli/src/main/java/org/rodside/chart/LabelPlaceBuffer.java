package org.rodside.chart;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Finds places for short texts beside their points, so that no text covers another and, where there is room, none
 * covers the drawing. Lengths in pixels, y down. Remembers what it has placed; not thread-safe.
 */
final class LabelPlaceBuffer {

    /** A text box by its corners; in pixels. */
    record Box(double left, double top, double right, double bottom) {

        boolean meets(Box other) {
            return left < other.right && other.left < right && top < other.bottom && other.top < bottom;
        }

        /**
         * Where a leader from a point ends: the nearest place on the box.
         *
         * @return {x, y}, or nothing where the text stands so near that it needs no leader
         */
        Optional<double[]> leaderEnd(double x, double y) {
            double nearX = Math.max(left, Math.min(right, x));
            double nearY = Math.max(top, Math.min(bottom, y));
            return Math.hypot(nearX - x, nearY - y) > NEAR
                    ? Optional.of(new double[] {nearX, nearY})
                    : Optional.empty();
        }

        double middleX() {
            return 0.5 * (left + right);
        }

        double middleY() {
            return 0.5 * (top + bottom);
        }
    }

    /** Directions tried, best first: above, right above, right, right below, below, left below, left, left above. */
    private static final double[][] SIDES = {
        {0, -1}, {0.8, -0.8}, {1, 0}, {0.8, 0.8}, {0, 1}, {-0.8, 0.8}, {-1, 0}, {-0.8, -0.8}
    };

    private static final double[] DISTANCES = {7, 14, 24, 38, 56};

    /** A text no further from its point than this needs no leader; in pixels. */
    private static final double NEAR = 12;

    /** Cost of covering another text or leaving the area: more than all drawing points can add up to. */
    private static final double FORBIDDEN = 1e6;

    private final Box area;
    private final List<double[]> drawing;
    private final List<Box> placed = new ArrayList<>();

    /**
     * An empty area.
     *
     * @param drawing points {x, y} that should rather stay visible
     */
    LabelPlaceBuffer(Box area, List<double[]> drawing) {
        this.area = area;
        this.drawing = drawing;
    }

    /** Keeps a place for a text that is already there. */
    void taken(Box box) {
        placed.add(box);
    }

    /** The best box of this size near a point; kept for the texts that follow. */
    Box place(double x, double y, double width, double height) {
        Box best = null;
        double lowest = Double.POSITIVE_INFINITY;
        for (double distance : DISTANCES) {
            for (double[] side : SIDES) {
                double cx = x + side[0] * (distance + 0.5 * width);
                double cy = y + side[1] * (distance + 0.5 * height);
                Box box = new Box(cx - 0.5 * width, cy - 0.5 * height, cx + 0.5 * width, cy + 0.5 * height);
                double cost = cost(box) + distance;
                if (cost < lowest) {
                    lowest = cost;
                    best = box;
                }
            }
        }
        placed.add(best);
        return best;
    }

    private double cost(Box box) {
        double cost = 0;
        if (box.left < area.left || box.right > area.right || box.top < area.top || box.bottom > area.bottom) {
            cost += FORBIDDEN;
        }
        for (Box other : placed) {
            cost += box.meets(other) ? FORBIDDEN : 0;
        }
        for (double[] point : drawing) {
            boolean covered = point[0] > box.left - 2
                    && point[0] < box.right + 2
                    && point[1] > box.top - 2
                    && point[1] < box.bottom + 2;
            cost += covered ? 10 : 0;
        }
        return cost;
    }
}
