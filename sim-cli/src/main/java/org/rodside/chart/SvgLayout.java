package org.rodside.chart;

/**
 * Where the parts of an SVG picture go; in pixels, y down.
 *
 * @param left left edge of the plotting area
 * @param top top edge of the plotting area
 * @param width width of the plotting area
 * @param height height of the plotting area
 * @param view what of the data it shows
 */
record SvgLayout(double left, double top, double width, double height, View view) {

    double px(double x) {
        return left + (x - view.left()) / (view.right() - view.left()) * width;
    }

    double py(double y) {
        return top + (view.top() - y) / (view.top() - view.bottom()) * height;
    }

    double[] pxs(double[] x) {
        double[] p = new double[x.length];
        for (int i = 0; i < x.length; i++) {
            p[i] = px(x[i]);
        }
        return p;
    }

    double[] pys(double[] y) {
        double[] p = new double[y.length];
        for (int i = 0; i < y.length; i++) {
            p[i] = py(y[i]);
        }
        return p;
    }
}
