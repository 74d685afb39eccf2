package org.rodside.study;

/**
 * A curve of the tip that may bound what it reaches, as a polyline.
 *
 * @param x abscissas; in m, not to be modified
 * @param y ordinates; in m, not to be modified
 * @param poses fraction of stroke of each cylinder at every point; not to be modified
 */
record LimitCurve(double[] x, double[] y, double[][] poses) {

    int points() {
        return x.length;
    }
}
