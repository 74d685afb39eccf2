package org.rodside.study;

/**
 * Digging forces along one line of a sweep: all strokes but the last of the order fixed, the last one running over the
 * grid. Filled by a {@link DigLine}. Mutable and not thread-safe.
 */
final class DigRun {

    final double[] tipX;
    final double[] tipY;
    final double[] curl;
    final double[] crowd;
    final int[] curlLimit;
    final int[] crowdLimit;

    DigRun(int steps) {
        tipX = new double[steps];
        tipY = new double[steps];
        curl = new double[steps];
        crowd = new double[steps];
        curlLimit = new int[steps];
        crowdLimit = new int[steps];
    }
}
