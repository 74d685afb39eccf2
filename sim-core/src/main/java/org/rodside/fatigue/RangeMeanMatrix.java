package org.rodside.fatigue;

/**
 * Counts in equal classes of range and mean.
 *
 * @param counts counts[i][j] cycles of range class i and mean class j; not copied, not to be modified
 * @param rangeStep width of a range class, the first starting at 0; unit of the signal
 * @param meanLow where the first mean class starts; unit of the signal
 * @param meanStep width of a mean class; unit of the signal
 */
public record RangeMeanMatrix(double[][] counts, double rangeStep, double meanLow, double meanStep) {

    /**
     * Sorts cycles into classes: ranges from 0 to the largest, means from the smallest to the largest. A value on a
     * border goes to the upper class, the largest into the last.
     *
     * @param bins number of classes each way; at least 1
     */
    public static RangeMeanMatrix of(CycleTable table, int bins) {
        double low =
                table.rows().stream().mapToDouble(CycleTable.Row::mean).min().orElse(0);
        double high =
                table.rows().stream().mapToDouble(CycleTable.Row::mean).max().orElse(0);
        double rangeStep = table.maxRange() / bins;
        double meanStep = (high - low) / bins;
        double[][] counts = new double[bins][bins];
        for (CycleTable.Row row : table.rows()) {
            int i = place(row.range(), rangeStep, bins);
            int j = place(row.mean() - low, meanStep, bins);
            counts[i][j] += row.count();
        }
        return new RangeMeanMatrix(counts, rangeStep, low, meanStep);
    }

    /** Where a range class starts, and the one before ends; unit of the signal. */
    public double rangeFrom(int i) {
        return i * rangeStep;
    }

    /** Where a mean class starts, and the one before ends; unit of the signal. */
    public double meanFrom(int j) {
        return meanLow + j * meanStep;
    }

    private static int place(double value, double step, int bins) {
        return step > 0 ? (int) Math.min(bins - 1, Math.floor(value / step)) : 0;
    }
}
