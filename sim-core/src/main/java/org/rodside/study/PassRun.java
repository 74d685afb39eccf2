package org.rodside.study;

import java.util.ArrayList;
import java.util.List;
import org.rodside.table.Column;
import org.rodside.table.RowSink;
import org.rodside.table.Table;
import org.rodside.units.Quantity;
import org.rodside.units.UnitSystem;

/**
 * A duty taken through history and cycle count in one go, rows handed on as they come.
 *
 * @param met what the history met
 * @param cycles cycles of every force of the history
 */
public record PassRun(HistoryAccumulator met, CycleCount cycles) {

    /** Slopes that equivalent ranges are told for; no unit. */
    private static final List<Double> SLOPES = List.of(3.0, 5.0);

    /** Columns of the history of a front. */
    public static List<Column> columns(Front front) {
        return new HistorySolver(front, question()).columns();
    }

    private static HistoryQuestion question() {
        return new HistoryQuestion(false, false, Double.POSITIVE_INFINITY);
    }

    /**
     * Runs a duty.
     *
     * @param duty a duty as {@link DutyMaker} makes it
     * @param units units that ranges are told in
     * @param sink takes the rows of the history; SI
     */
    public static PassRun of(Front front, Table duty, UnitSystem units, RowSink sink) {
        Counter counter = new Counter(columns(front), units);
        HistoryAccumulator met = new History(front, question())
                .run(
                        DutyMaker.source(front, duty),
                        row -> {
                            sink.row(row);
                            counter.row(row);
                        },
                        time -> {});
        return new PassRun(met, counter.cycles.finish());
    }

    /** The cylinder forces alone. */
    public CycleCount cylinders() {
        List<CycleCount.Channel> channels = cycles.channels().stream()
                .filter(channel -> channel.name().contains(".force_"))
                .toList();
        return new CycleCount(
                channels, cycles.options(), cycles.recordings(), cycles.rows(), cycles.seconds(), cycles.factor());
    }

    /** Counts the columns that are forces. */
    private static final class Counter {

        private final List<Integer> chosen = new ArrayList<>();
        private final CycleCountAccumulator cycles;
        private final double[] values;
        private final UnitSystem units;

        Counter(List<Column> columns, UnitSystem units) {
            this.units = units;
            List<String> names = new ArrayList<>();
            for (int i = 0; i < columns.size(); i++) {
                Column column = columns.get(i);
                if (column.quantity() == Quantity.FORCE) {
                    chosen.add(i);
                    names.add(column.heading(units));
                }
            }
            values = new double[names.size()];
            cycles = new CycleCountAccumulator(names, new CycleOptions(SLOPES, 0, false, false, 0, 0, null, 0, null));
            cycles.begin(() -> "duty");
        }

        void row(double[] row) {
            for (int i = 0; i < values.length; i++) {
                values[i] = units.of(row[chosen.get(i)], Quantity.FORCE);
            }
            cycles.row(values, row[0]);
        }
    }
}
