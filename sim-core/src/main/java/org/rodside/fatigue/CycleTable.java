package org.rodside.fatigue;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * Counted cycles by range and mean, largest range first.
 *
 * @param rows equal pairs gathered
 * @param width 0 where ranges and means are exact; else the width of the bins that the rows are the middles of; unit
 *     of the signal
 */
public record CycleTable(List<Row> rows, double width) {

    /**
     * Cycles of one range and mean.
     *
     * @param range unit of the signal
     * @param mean unit of the signal
     * @param count no unit
     */
    public record Row(double range, double mean, double count) {}

    public CycleTable {
        rows = List.copyOf(rows);
    }

    static CycleTable of(CycleMapBuffer map) {
        List<Row> rows = new ArrayList<>(map.size());
        map.each((range, mean, count) -> rows.add(new Row(range, mean, count)));
        return sorted(rows, map.width());
    }

    /** Puts rows in order; the list is modified. */
    static CycleTable sorted(List<Row> rows, double width) {
        rows.sort(Comparator.comparingDouble(Row::range).reversed().thenComparingDouble(Row::mean));
        return new CycleTable(rows, width);
    }

    /** The same cycles with every count multiplied. */
    public CycleTable times(double factor) {
        return new CycleTable(
                rows.stream()
                        .map(r -> new Row(r.range, r.mean, r.count * factor))
                        .toList(),
                width);
    }

    /** Σ n·range^m over the rows; unit of the signal to the power m. */
    public double moment(double slope) {
        return rows.stream()
                .mapToDouble(r -> r.count * Math.pow(r.range, slope))
                .sum();
    }

    /** Number of cycles. */
    public double cycles() {
        return rows.stream().mapToDouble(Row::count).sum();
    }

    /** Largest range; unit of the signal; 0 without rows. */
    public double maxRange() {
        return rows.isEmpty() ? 0 : rows.get(0).range;
    }
}
