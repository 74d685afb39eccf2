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
 * @param cylinders cycles of the cylinder forces
 * @param all cycles of every force of the history
 */
public record PassRun(HistoryAccumulator met, CycleCount cylinders, CycleCount all) {

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
        List<Column> columns = columns(front);
        Counter cylinders = new Counter(columns, units, true);
        Counter all = new Counter(columns, units, false);
        HistoryAccumulator met = new History(front, question())
                .run(
                        DutyMaker.source(front, duty),
                        row -> {
                            sink.row(row);
                            cylinders.row(row);
                            all.row(row);
                        },
                        time -> {});
        return new PassRun(met, cylinders.counter.finish(), all.counter.finish());
    }

    /** Counts some of the columns. */
    private static final class Counter {

        private final List<Integer> chosen = new ArrayList<>();
        private final CycleCountAccumulator counter;
        private final double[] values;
        private final UnitSystem units;

        Counter(List<Column> columns, UnitSystem units, boolean cylindersOnly) {
            this.units = units;
            List<String> names = new ArrayList<>();
            for (int i = 0; i < columns.size(); i++) {
                Column column = columns.get(i);
                boolean counts = cylindersOnly ? column.name().endsWith(".force") : column.quantity() == Quantity.FORCE;
                if (counts) {
                    chosen.add(i);
                    names.add(column.heading(units));
                }
            }
            values = new double[names.size()];
            counter = new CycleCountAccumulator(names, new CycleOptions(SLOPES, 0, false, false, 0, 0, null, 0, null));
            counter.begin(() -> "duty");
        }

        void row(double[] row) {
            for (int i = 0; i < values.length; i++) {
                values[i] = units.of(row[chosen.get(i)], Quantity.FORCE);
            }
            counter.row(values, row[0]);
        }
    }
}
