package org.rodside.fatigue;

import java.util.Arrays;

/**
 * Rainflow counting of a signal as it comes (ASTM E1049-85, 5.4.4; theory.md F1, F2).
 *
 * <p>A range is counted as a cycle as soon as it lies within both of its neighbours; its two points are then taken out
 * of the signal. What is never enclosed, the residue, stays: ranges that first grow and then shrink. The standard's
 * single pass counts each of them as a half cycle ({@link #halves}); the standard's repeating history, begun at its
 * largest magnitude, closes all of them ({@link #repeated}).
 *
 * <p>What merges: closed cycles do not depend on what was before or comes after, so those of two recordings add. The
 * residues do not: of two recordings that follow each other they are joined and counted on ({@link #combine}), which
 * gives the count of the one long recording. Separate recordings keep their half cycles, and all counts add.
 *
 * <p>Accuracy: ranges are differences of the values given, without further rounding. Memory: the residue only, which
 * is short unless the signal swings up or dies away for ever; {@code limit} guards that. Not thread-safe.
 */
public final class RainflowAccumulator {

    private final double gate;
    private final int limit;
    private final CycleSink closed;
    private double[] points = new double[32];
    private int size;
    private boolean started;
    private double low;
    private double high;
    private boolean lowFirst;

    /**
     * Counts from nothing.
     *
     * @param gate swings smaller than this are passed over; unit of the signal; 0 for none
     * @param limit most points of residue that are kept; at least 4
     * @param closed is given every closed cycle at once, with count 1
     */
    public RainflowAccumulator(double gate, int limit, CycleSink closed) {
        if (!(gate >= 0) || limit < 4) {
            throw new IllegalArgumentException("gate " + gate + " below 0, or limit " + limit + " below 4");
        }
        this.gate = gate;
        this.limit = limit;
        this.closed = closed;
    }

    /**
     * Takes the next value of the signal; not NaN.
     *
     * @throws IllegalStateException when the residue outgrows its limit
     */
    public void accept(double value) {
        if (size == 0) {
            begin(value);
            return;
        }
        double top = points[size - 1];
        double step = value - top;
        if (step == 0) {
            return;
        }
        if (step > 0 == top > points[size - 2]) {
            points[size - 1] = value;
            close();
        } else if (Math.abs(step) >= gate) {
            push(value);
            close();
        }
    }

    /** Waits for the first swing as large as the gate. */
    private void begin(double value) {
        if (!started) {
            started = true;
            low = value;
            high = value;
        } else if (value > high) {
            high = value;
            lowFirst = true;
        } else if (value < low) {
            low = value;
            lowFirst = false;
        }
        if (high > low && high - low >= gate) {
            push(lowFirst ? low : high);
            push(lowFirst ? high : low);
        }
    }

    private void push(double value) {
        if (size == limit) {
            throw new IllegalStateException("more than " + limit + " swings within one another");
        }
        if (size == points.length) {
            points = Arrays.copyOf(points, size * 2);
        }
        points[size++] = value;
    }

    /** Counts and takes out the last but one range while it lies within both neighbours. */
    private void close() {
        while (size >= 4) {
            double a = points[size - 4];
            double b = points[size - 3];
            double c = points[size - 2];
            double d = points[size - 1];
            double range = Math.abs(c - b);
            if (range > Math.abs(b - a) || range > Math.abs(d - c)) {
                return;
            }
            points[size - 3] = d;
            size -= 2;
            closed.cycle(range, 0.5 * b + 0.5 * c, 1);
        }
    }

    /** The turning points that are left, in their order; at most two of them where no swing reached the gate. */
    public double[] residue() {
        if (size > 0 || !started) {
            return Arrays.copyOf(points, size);
        }
        if (low == high) {
            return new double[] {low};
        }
        return lowFirst ? new double[] {low, high} : new double[] {high, low};
    }

    /**
     * Appends a later recording: its residue is counted on behind this one. Its closed cycles went to its own sink and
     * are the caller's to add.
     *
     * @param next counted by itself, with the same gate; not modified
     */
    public void combine(RainflowAccumulator next) {
        for (double point : next.residue()) {
            accept(point);
        }
    }

    /** Single pass: gives each range of the residue to a sink as a half cycle. Nothing is modified. */
    public void halves(CycleSink sink) {
        for (int i = 1; i < size; i++) {
            sink.cycle(Math.abs(points[i] - points[i - 1]), 0.5 * points[i] + 0.5 * points[i - 1], 0.5);
        }
    }

    /**
     * Repeating history: gives a sink the cycles that the residue closes when the recording is repeated without end,
     * cut at its largest magnitude. They are full cycles; the largest comes as two halves. Nothing is modified.
     */
    public void repeated(CycleSink sink) {
        int first = 0;
        for (int i = 1; i < size; i++) {
            if (Math.abs(points[i]) > Math.abs(points[first])) {
                first = i;
            }
        }
        RainflowAccumulator block = new RainflowAccumulator(gate, Math.max(4, size + 1), sink);
        for (int i = first; i < first + size; i++) {
            block.accept(points[i % size]);
        }
        if (size > 0) {
            block.accept(points[first]);
        }
        block.halves(sink);
    }
}
