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
        int newCurl = mostCurl <= curl ? -1 : firstAbove(run.curl, curl);
        if (newCurl >= 0) {
            curl = run.curl[newCurl];
            curlPose = first + newCurl;
        }
        int newCrowd = mostCrowd <= crowd ? -1 : firstAbove(run.crowd, crowd);
        if (newCrowd >= 0) {
            crowd = run.crowd[newCrowd];
            crowdPose = first + newCrowd;
        }
    }

    /** Place of the largest force above a best one, the first of equals; -1 where none is. */
    private static int firstAbove(double[] forces, double best) {
        int place = -1;
        double most = best;
        for (int i = 0; i < forces.length; i++) {
            if (forces[i] > most && forces[i] < UNLIMITED) {
                most = forces[i];
                place = i;
            }
        }
        return place;
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
