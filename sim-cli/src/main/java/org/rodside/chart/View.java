package org.rodside.chart;

/** The window on the data: what of both axes is seen. Equal aspect only ever widens it. */
record View(double left, double right, double bottom, double top) {

    /** Air around the data, as a share of its extent on each side. */
    private static final double MARGIN = 0.05;

    /** The window around everything a plot shows, with a little air. */
    static View around(Plot plot) {
        double[] box = {
            Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY
        };
        for (Series series : plot.series()) {
            for (int i = 0; i < series.x().length; i++) {
                if (Double.isFinite(series.x()[i]) && Double.isFinite(series.y()[i])) {
                    stretch(box, series.x()[i], series.y()[i]);
                }
            }
        }
        for (Mark mark : plot.marks()) {
            if (mark instanceof Mark.Level level) {
                stretch(box, Double.NaN, level.y());
            } else if (mark instanceof Mark.Upright upright) {
                stretch(box, upright.x(), Double.NaN);
            } else if (mark instanceof Mark.Label label) {
                stretch(box, label.x(), label.y());
            }
        }
        double[] across = roomy(box[0], box[1]);
        double[] up = roomy(box[2], box[3]);
        return new View(across[0], across[1], up[0], up[1]);
    }

    private static void stretch(double[] box, double x, double y) {
        box[0] = x < box[0] ? x : box[0];
        box[1] = x > box[1] ? x : box[1];
        box[2] = y < box[2] ? y : box[2];
        box[3] = y > box[3] ? y : box[3];
    }

    private static double[] roomy(double low, double high) {
        if (!(low <= high)) {
            return new double[] {0, 1};
        }
        double extent = high - low;
        double size = Math.max(Math.abs(low), Math.abs(high));
        // A range too small to be told apart from rounding is shown as a flat line in the middle.
        double air = extent > 1e-9 * size ? MARGIN * extent : size > 0 ? 0.1 * size : 1;
        return new double[] {low - air, high + air};
    }

    /** The smallest wider window in which one unit is equally long both ways on an area of this size; in pixels. */
    View equalised(double width, double height) {
        double unitsPerPixel = Math.max((right - left) / width, (top - bottom) / height);
        double halfWidth = 0.5 * unitsPerPixel * width;
        double halfHeight = 0.5 * unitsPerPixel * height;
        double x = 0.5 * (left + right);
        double y = 0.5 * (bottom + top);
        return new View(x - halfWidth, x + halfWidth, y - halfHeight, y + halfHeight);
    }
}
