package org.rodside.study;

import java.util.Arrays;

/**
 * Largest force along a line of a sweep under limits that come in opposite pairs, for one duty (theory S8). Its reciprocal is the
 * largest of load over room; that largest is kept as a fraction, load over product of rooms, so that one division a pose is
 * left for the end. The loops are short, without branches and over flat arrays: the compiler turns such loops into vector
 * instructions, and leaves longer ones alone. Mutable and not thread-safe.
 */
final class LimitLineBuffer {

    /** Stands for no load at all where a reciprocal is taken; far below any load over room in 1/N. */
    private static final double NO_LOAD = 1e-300;

    /**
     * The smallest room of a cylinder, or product of the rooms of tipping (the front line lies before the rear one, so both are
     * never below zero): not above zero where a limit is broken without any force. A cylinder without any push or pull
     * is not for this class.
     */
    private final double[] least;

    /** Product of the rooms of all pairs met so far; with six pairs of 10⁹ N it stays far from overflow. */
    private final double[] rooms;

    /** Largest load over room met so far times all rooms. */
    private final double[] load;

    private final double[] product;

    LimitLineBuffer(int steps) {
        product = new double[steps];
        least = new double[steps];
        rooms = new double[steps];
        load = new double[steps];
    }

    /** No limit met yet. */
    void begin() {
        Arrays.fill(least, Double.POSITIVE_INFINITY);
        Arrays.fill(rooms, 1);
        Arrays.fill(load, 0);
    }

    /**
     * One pair of limits met; arrays run along the line and are not modified.
     *
     * @param pair room of one limit times room of the opposite one, without any force
     * @param over the larger of the load of a unit force on either times the room of the other
     */
    void begin(double[] pair, double[] over) {
        for (int i = 0; i < load.length; i++) {
            least[i] = pair[i];
            rooms[i] = pair[i];
            load[i] = over[i];
        }
    }

    /**
     * Meets the push and the pull of a cylinder; arrays run along the line and are not modified.
     *
     * @param fixed its force without tool force; in N
     * @param unit what a unit tool force adds; no unit
     * @param push most push; in N, below zero where friction and back pressure leave none
     * @param pull most pull; in N, likewise
     */
    void meet(double[] fixed, double[] unit, double push, double pull) {
        double half = 0.5 * (pull - push);
        double sum = 0.5 * (push + pull);
        for (int i = 0; i < product.length; i++) {
            product[i] = (push - fixed[i]) * (pull + fixed[i]);
        }
        for (int i = 0; i < load.length; i++) {
            double over = unit[i] * (half + fixed[i]) + Math.abs(unit[i]) * sum;
            load[i] = Math.max(load[i] * product[i], over * rooms[i]);
        }
        for (int i = 0; i < load.length; i++) {
            rooms[i] *= product[i];
        }
        for (int i = 0; i < load.length; i++) {
            least[i] = Math.min(least[i], Math.min(push - fixed[i], pull + fixed[i]));
        }
    }

    /** Meets a limit whose room is the same along the line: load over room in 1/N, not modified. */
    void meet(double[] loadOverRoom) {
        for (int i = 0; i < load.length; i++) {
            load[i] = Math.max(load[i], loadOverRoom[i] * rooms[i]);
        }
    }

    /** Largest force: zero where a limit is broken without any, huge ({@link DigBest#UNLIMITED}) where nothing limits it. */
    void largest(double[] out) {
        for (int i = 0; i < out.length; i++) {
            double stands = Math.min(1, Math.max(0, least[i] * 1e300));
            double all = Math.abs(rooms[i]);
            out[i] = stands * all / Math.max(load[i], NO_LOAD * all);
        }
    }
}
