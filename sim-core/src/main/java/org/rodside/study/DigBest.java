package org.rodside.study;

import java.util.Arrays;

/** Largest forces met in a part of a sweep; the first of equals. Parts are added in order. Not thread-safe. */
final class DigBest {

    /** A force of this size or more means that nothing limits it; in N. */
    static final double UNLIMITED = 1e200;

    long assembled;
    double curl = Double.NEGATIVE_INFINITY;
    long curlPose = -1;
    double crowd = Double.NEGATIVE_INFINITY;
    long crowdPose = -1;

    /** Takes in one line, whose first pose has the given number. */
    void add(DigRun run, long first) {
        double mostCurl = most(run.curl);
        double mostCrowd = most(run.crowd);
        assembled += Double.isNaN(mostCurl) ? assembled(run.curl) : run.curl.length;
        if (!(mostCurl <= curl)) {
            for (int i = 0; i < run.curl.length; i++) {
                if (run.curl[i] > curl && run.curl[i] < UNLIMITED) {
                    curl = run.curl[i];
                    curlPose = first + i;
                }
            }
        }
        if (!(mostCrowd <= crowd)) {
            for (int i = 0; i < run.crowd.length; i++) {
                if (run.crowd[i] > crowd && run.crowd[i] < UNLIMITED) {
                    crowd = run.crowd[i];
                    crowdPose = first + i;
                }
            }
        }
    }

    /** The largest of all, NaN where one is: few lines hold a new best, and this loop has no branches. */
    private static double most(double[] forces) {
        double most = Double.NEGATIVE_INFINITY;
        for (int i = 0; i < forces.length; i++) {
            most = Math.max(most, forces[i]);
        }
        return most;
    }

    private static long assembled(double[] forces) {
        return Arrays.stream(forces).filter(force -> !Double.isNaN(force)).count();
    }

    /** Takes in a later part. */
    void add(DigBest later) {
        assembled += later.assembled;
        if (later.curl > curl) {
            curl = later.curl;
            curlPose = later.curlPose;
        }
        if (later.crowd > crowd) {
            crowd = later.crowd;
            crowdPose = later.crowdPose;
        }
    }
}
