package org.rodside.fatigue;

import java.util.Arrays;

/**
 * Counts by range and mean in bounded memory: exact while no more than {@code limit} different pairs occur, then in
 * bins. A bin is one power of two wide, the narrowest for which the bins are no more than the limit; it holds ranges
 * and means from a whole multiple of the width up to the next, and stands for their middle. Not thread-safe.
 */
final class CycleMapBuffer {

    /** Bins start this much narrower than the largest range; doubled as often as it takes. */
    private static final int FINEST = 20;

    private static final double LOAD = 0.75;

    private final int limit;
    private double[] ranges;
    private double[] means;
    private double[] counts;
    private int used;
    private double width;

    CycleMapBuffer(int limit) {
        this.limit = limit;
        clear(64);
    }

    private void clear(int slots) {
        ranges = new double[slots];
        means = new double[slots];
        counts = new double[slots];
        used = 0;
    }

    /** Width of the bins; unit of the signal; 0 while exact. */
    double width() {
        return width;
    }

    int size() {
        return used;
    }

    void add(double range, double mean, double count) {
        if (width == 0) {
            put(range, mean + 0.0, count);
        } else {
            put(middle(range), middle(mean), count);
        }
        while (used > limit) {
            coarsen();
        }
    }

    private double middle(double value) {
        return (Math.floor(value / width) + 0.5) * width;
    }

    private void put(double range, double mean, double count) {
        int mask = ranges.length - 1;
        int slot = hash(range, mean) & mask;
        while (counts[slot] > 0 && (ranges[slot] != range || means[slot] != mean)) {
            slot = (slot + 1) & mask;
        }
        if (counts[slot] == 0) {
            ranges[slot] = range;
            means[slot] = mean;
            used++;
        }
        counts[slot] += count;
        if (used > LOAD * ranges.length) {
            refill(ranges.length * 2, false);
        }
    }

    private static int hash(double range, double mean) {
        long bits = Double.doubleToLongBits(range) * 0x9E3779B97F4A7C15L
                + Double.doubleToLongBits(mean) * 0xC2B2AE3D27D4EB4FL;
        bits ^= bits >>> 32;
        bits *= 0xD6E8FEB86659FD93L;
        return (int) (bits >>> 32);
    }

    private void coarsen() {
        if (width == 0) {
            double largest = Arrays.stream(ranges).max().orElse(1);
            width = Math.scalb(1.0, Math.getExponent(largest) - FINEST);
        } else {
            width *= 2;
        }
        refill(ranges.length, true);
    }

    private void refill(int slots, boolean bin) {
        double[] oldRanges = ranges;
        double[] oldMeans = means;
        double[] oldCounts = counts;
        clear(slots);
        for (int i = 0; i < oldCounts.length; i++) {
            if (oldCounts[i] > 0) {
                double range = bin ? middle(oldRanges[i]) : oldRanges[i];
                double mean = bin ? middle(oldMeans[i]) : oldMeans[i];
                put(range, mean, oldCounts[i]);
            }
        }
    }

    /** Gives every pair to a sink, in no order of meaning. */
    void each(CycleSink sink) {
        for (int i = 0; i < counts.length; i++) {
            if (counts[i] > 0) {
                sink.cycle(ranges[i], means[i], counts[i]);
            }
        }
    }
}
