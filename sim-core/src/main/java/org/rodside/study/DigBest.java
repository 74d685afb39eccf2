package org.rodside.study;

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
        for (int i = 0; i < run.curl.length; i++) {
            double force = run.curl[i];
            assembled += force == force ? 1 : 0;
            if (force > curl && force < UNLIMITED) {
                curl = force;
                curlPose = first + i;
            }
            double other = run.crowd[i];
            if (other > crowd && other < UNLIMITED) {
                crowd = other;
                crowdPose = first + i;
            }
        }
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
