package org.rodside.fatigue;

import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleUnaryOperator;

/**
 * Eight constant ranges that stand for a whole count on a test bench (theory.md F5): shares of the largest range 1,
 * 0.95, 0.85, 0.725, 0.575, 0.425, 0.275, 0.125 (common practice, no source). A cycle goes to the level whose share is
 * nearest; below 0.05 of the largest, as far under the last level as its class reaches above it, it is left out.
 *
 * @param levels from the largest down
 * @param leftOut cycles that are too small for the last level; no unit
 * @param full all cycles with the means treated, for comparing
 */
public record BlockSpectrum(List<Level> levels, double leftOut, CycleTable full) {

    private static final double[] SHARES = {1, 0.95, 0.85, 0.725, 0.575, 0.425, 0.275, 0.125};
    private static final double SMALLEST = 0.05;

    /**
     * One level.
     *
     * @param share of the largest range; no unit
     * @param range unit of the signal
     * @param mean average over the cycles of the level; unit of the signal; 0 for an empty level
     * @param count cycles; no unit
     */
    public record Level(double share, double range, double mean, double count) {}

    /**
     * Gathers counts into levels.
     *
     * @throws IllegalArgumentException where a mean reaches the strength of the rule
     */
    public static BlockSpectrum of(CycleTable table, MeanRule rule) {
        CycleTable full = treated(table, rule);
        double largest = full.maxRange();
        double[] counts = new double[SHARES.length];
        double[] means = new double[SHARES.length];
        double leftOut = 0;
        for (CycleTable.Row r : full.rows()) {
            int level = level(r.range() / largest);
            if (level < 0) {
                leftOut += r.count();
            } else {
                counts[level] += r.count();
                means[level] += r.count() * r.mean();
            }
        }
        List<Level> levels = new ArrayList<>();
        for (int i = 0; i < SHARES.length; i++) {
            double mean = counts[i] > 0 ? means[i] / counts[i] : 0;
            levels.add(new Level(SHARES[i], SHARES[i] * largest, mean, counts[i]));
        }
        return new BlockSpectrum(List.copyOf(levels), leftOut, full);
    }

    private static CycleTable treated(CycleTable table, MeanRule rule) {
        List<CycleTable.Row> rows = new ArrayList<>();
        for (CycleTable.Row r : table.rows()) {
            double range = rule.range(r.range(), r.mean());
            if (Double.isInfinite(range)) {
                throw new IllegalArgumentException(
                        "a mean of " + r.mean() + " reaches the strength of " + rule.strength());
            }
            rows.add(new CycleTable.Row(range, rule.mean(r.mean()), r.count()));
        }
        return CycleTable.sorted(rows, table.width());
    }

    private static int level(double share) {
        if (!(share >= SMALLEST)) {
            return -1;
        }
        int level = SHARES.length - 1;
        while (level > 0 && share >= 0.5 * (SHARES[level] + SHARES[level - 1])) {
            level--;
        }
        return level;
    }

    /**
     * Damage of the levels as a share of that of the full count; NaN where the full count does none.
     *
     * @param damage of one cycle of a range, e.g. range^m or {@link SnCurve#damage}
     */
    public double kept(DoubleUnaryOperator damage) {
        double part = 0;
        for (Level level : levels) {
            part += level.count * damage.applyAsDouble(level.range);
        }
        double whole = 0;
        for (CycleTable.Row row : full.rows()) {
            whole += row.count() * damage.applyAsDouble(row.range());
        }
        return part / whole;
    }
}
