package org.rodside.study;

/**
 * First and second derivatives of a cubic spline through samples that come in one after the other, at any spacing, in
 * constant memory (theory D1, D2). Not-a-knot at both ends of the recording; with three samples a parabola, with two a
 * straight line, with one everything at rest.
 *
 * <p>Elimination runs forwards over the whole recording and is exact. Substitution runs backwards from {@value #OVERLAP}
 * samples beyond those handed out: its factors are at most 1/2 whatever the spacing, so what is not known about the rest
 * of the recording reaches back with less than 2^-{@value #OVERLAP} of itself, below the rounding of a double.
 *
 * <p>Use: {@link #add} until {@link #isFull}, {@link #solve}, read, {@link #drop}, and so on; at the end
 * {@link #solveLast}. Allocates nothing after it is built. Not thread-safe.
 */
final class StrokeSplineSolver {

    /** Samples handed out at once by default. */
    static final int BLOCK = 4096;

    /** Samples looked ahead. */
    static final int OVERLAP = 80;

    private final int channels;
    private final double[] time;
    private final double[] factor;
    private final double[][] value;
    private final double[][] rest;
    private final double[][] second;
    private int count;
    private boolean begun;
    private boolean atStart = true;

    StrokeSplineSolver(int channels) {
        this(channels, BLOCK);
    }

    /**
     * @param block samples handed out at once
     */
    StrokeSplineSolver(int channels, int block) {
        this.channels = channels;
        int size = block + OVERLAP;
        time = new double[size];
        factor = new double[size];
        value = new double[channels][size];
        rest = new double[channels][size];
        second = new double[channels][size];
    }

    boolean isFull() {
        return count == time.length;
    }

    /** Samples in hand, solved or not. */
    int count() {
        return count;
    }

    /**
     * Takes the next sample.
     *
     * @param at time, after that of the sample before; in s
     * @param values one a channel, from index {@code first} on; not modified
     */
    void add(double at, double[] values, int first) {
        time[count] = at;
        for (int c = 0; c < channels; c++) {
            value[c][count] = values[first + c];
        }
        count++;
        if (count == 3 && !begun) {
            begin();
        } else if (begun) {
            eliminate(count - 2);
        }
    }

    private double step(int i) {
        return time[i + 1] - time[i];
    }

    private double slope(int channel, int i) {
        return (value[channel][i + 1] - value[channel][i]) / step(i);
    }

    private double bend(int channel, int i) {
        return 6 * (slope(channel, i) - slope(channel, i - 1));
    }

    /** Theory (D1) with the first sample's second derivative replaced by the not-a-knot condition. */
    private void begin() {
        begun = true;
        double h0 = step(0);
        double h1 = step(1);
        double diagonal = (h0 + h1) * (h0 + 2 * h1) / h1;
        factor[1] = (h1 - h0) / (h0 + 2 * h1);
        for (int c = 0; c < channels; c++) {
            rest[c][1] = bend(c, 1) / diagonal;
        }
    }

    /** Theory (D1): second[i] = rest[i] - factor[i]·second[i + 1]. */
    private void eliminate(int i) {
        double before = step(i - 1);
        double after = step(i);
        double pivot = 2 * (before + after) - before * factor[i - 1];
        factor[i] = after / pivot;
        for (int c = 0; c < channels; c++) {
            rest[c][i] = (bend(c, i) - before * rest[c][i - 1]) / pivot;
        }
    }

    /** Solves all samples but the last {@value #OVERLAP}; returns how many. Only when {@link #isFull}. */
    int solve() {
        int last = count - 1;
        for (int c = 0; c < channels; c++) {
            second[c][last] = 0;
            substitute(c, last - 1);
        }
        return count - OVERLAP;
    }

    /** Solves all samples in hand, the last being the end of the recording; returns how many. */
    int solveLast() {
        int last = count - 1;
        for (int c = 0; c < channels; c++) {
            if (count < 3) {
                second[c][0] = 0;
                second[c][Math.max(0, last)] = 0;
            } else if (count == 3 && atStart) {
                double curve = 2 * (slope(c, 1) - slope(c, 0)) / (time[2] - time[0]);
                second[c][0] = curve;
                second[c][1] = curve;
                second[c][2] = curve;
            } else {
                second[c][last] = lastSecond(c, last);
                substitute(c, last - 1);
            }
        }
        return count;
    }

    /** Theory (D2): not-a-knot at the last sample but one. */
    private double lastSecond(int c, int last) {
        double ratio = step(last - 1) / step(last - 2);
        double lean = 1 + ratio + ratio * factor[last - 2];
        return (lean * rest[c][last - 1] - ratio * rest[c][last - 2]) / (1 + lean * factor[last - 1]);
    }

    private void substitute(int c, int from) {
        double[] m = second[c];
        for (int i = from; i > 0; i--) {
            m[i] = rest[c][i] - factor[i] * m[i + 1];
        }
        if (atStart) {
            double ratio = step(0) / step(1);
            m[0] = (1 + ratio) * m[1] - ratio * m[2];
        } else {
            m[0] = rest[c][0] - factor[0] * m[1];
        }
    }

    /** Forgets the first samples; at least three must stay unless the recording has ended. */
    void drop(int samples) {
        int left = count - samples;
        System.arraycopy(time, samples, time, 0, left);
        System.arraycopy(factor, samples, factor, 0, left);
        for (int c = 0; c < channels; c++) {
            System.arraycopy(value[c], samples, value[c], 0, left);
            System.arraycopy(rest[c], samples, rest[c], 0, left);
        }
        count = left;
        atStart = false;
    }

    double time(int i) {
        return time[i];
    }

    double value(int channel, int i) {
        return value[channel][i];
    }

    /** First derivative at a solved sample; in the unit of the channel per s. */
    double rate(int channel, int i) {
        if (count == 1) {
            return 0;
        }
        double[] m = second[channel];
        return i + 1 < count
                ? slope(channel, i) - step(i) * (2 * m[i] + m[i + 1]) / 6
                : slope(channel, i - 1) + step(i - 1) * (m[i - 1] + 2 * m[i]) / 6;
    }

    /** Second derivative at a solved sample; in the unit of the channel per s². */
    double acceleration(int channel, int i) {
        return second[channel][i];
    }
}
