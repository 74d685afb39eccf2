package org.rodside.fatigue;

/**
 * Cycles of one channel, added up: their number, the largest range, Σ n·range^m for the slopes asked for, the damage
 * sum, and the table of counts by range and mean. The sums are of every single cycle, with compensation for rounding;
 * only the table is gathered in bins when it grows too long. Not thread-safe.
 */
public final class CycleAccumulator implements CycleSink {

    private final double[] slopes;
    private final SnCurve curve;
    private final CycleMapBuffer map;
    private final double[] sums;
    private final double[] lost;
    private double cycles;
    private double maxRange;

    /**
     * Starts empty.
     *
     * @param slopes exponents m for which ranges are added up; not modified
     * @param curve for the damage sum; null for none
     * @param limit most rows of the table; at least 16
     */
    public CycleAccumulator(double[] slopes, SnCurve curve, int limit) {
        if (limit < 16) {
            throw new IllegalArgumentException("limit " + limit + " below 16");
        }
        this.slopes = slopes.clone();
        this.curve = curve;
        this.map = new CycleMapBuffer(limit);
        this.sums = new double[slopes.length + 1];
        this.lost = new double[slopes.length + 1];
    }

    @Override
    public void cycle(double range, double mean, double count) {
        cycles += count;
        maxRange = Math.max(maxRange, range);
        for (int i = 0; i < slopes.length; i++) {
            sum(i, count * power(range, slopes[i]));
        }
        if (curve != null) {
            sum(slopes.length, count * curve.damage(range));
        }
        map.add(range, mean, count);
    }

    /** Neumaier's compensated sum. */
    private void sum(int i, double term) {
        double next = sums[i] + term;
        lost[i] += Math.abs(sums[i]) >= Math.abs(term) ? sums[i] - next + term : term - next + sums[i];
        sums[i] = next;
    }

    private static double power(double range, double slope) {
        if (slope == 3) {
            return range * range * range;
        }
        if (slope == 5) {
            double square = range * range;
            return square * square * range;
        }
        return Math.pow(range, slope);
    }

    /**
     * Adds the cycles of another one with the same slopes and curve: right for closed cycles, and for the whole counts
     * of separate recordings.
     *
     * @param other not modified
     */
    public void combine(CycleAccumulator other) {
        cycles += other.cycles;
        maxRange = Math.max(maxRange, other.maxRange);
        for (int i = 0; i < sums.length; i++) {
            sum(i, other.sums[i]);
            lost[i] += other.lost[i];
        }
        other.map.each(map::add);
    }

    /** Number of cycles; halves count half; no unit. */
    public double cycles() {
        return cycles;
    }

    /** Largest range; unit of the signal; 0 without cycles. */
    public double maxRange() {
        return maxRange;
    }

    /**
     * Equivalent range (theory.md F3): (Σ n·range^m / N)^(1/m); unit of the signal; 0 without cycles.
     *
     * @param slope place of the slope m in the list given at the start
     * @param factor every count is multiplied by this first; no unit
     * @param reference N; 0 for the number of cycles counted, multiplied likewise
     */
    public double equivalent(int slope, double factor, double reference) {
        double number = reference > 0 ? reference : cycles * factor;
        double sum = sums[slope] + lost[slope];
        return sum == 0 ? 0 : Math.pow(sum * factor / number, 1 / slopes[slope]);
    }

    /** Damage sum by Palmgren–Miner (theory.md F4); NaN without a curve. */
    public double damage() {
        return curve == null ? Double.NaN : sums[slopes.length] + lost[slopes.length];
    }

    /** The table of counts, largest range first. */
    public CycleTable table() {
        return CycleTable.of(map);
    }
}
