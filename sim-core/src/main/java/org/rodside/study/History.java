package org.rodside.study;

import java.util.List;
import java.util.function.DoubleConsumer;
import org.rodside.kinematics.Mechanism;
import org.rodside.kinematics.PoseSolver;
import org.rodside.model.InputException;
import org.rodside.table.Column;
import org.rodside.table.RowSink;
import org.rodside.table.RowSource;

/**
 * Load history of a duty, row by row in constant memory (theory D1 to D4): speeds and accelerations from a cubic spline through the
 * strokes, not-a-knot at the ends, then forces by Newton and Euler. Used once; not thread-safe.
 */
public final class History {

    private final Front front;
    private final HistorySolver solver;
    private final int cylinders;
    private final StrokeSplineSolver spline;
    private final double[][] rows;
    private final double[] rates;
    private final double[] accelerations;
    private final double[] out;
    private final HistoryAccumulator summary;

    public History(Front front, HistoryQuestion question) {
        this(front, question, StrokeSplineSolver.BLOCK);
    }

    History(Front front, HistoryQuestion question, int block) {
        this.front = front;
        Mechanism mechanism = front.mechanism();
        solver = new HistorySolver(front, question);
        cylinders = mechanism.cylinders();
        spline = new StrokeSplineSolver(cylinders, block);
        rows = new double[block + StrokeSplineSolver.OVERLAP][4 + 3 * cylinders];
        rates = new double[cylinders];
        accelerations = new double[cylinders];
        out = new double[solver.columns().size()];
        summary = new HistoryAccumulator(front, question);
    }

    /** Columns of the rows, in order. */
    public List<Column> columns() {
        return solver.columns();
    }

    /**
     * Reads a duty to its end and hands out one row for each of its rows.
     *
     * @param source rows of a duty in SI: time, stroke of each cylinder, tip force x and y, payload, cap and rod side pressure of
     *     each cylinder
     * @param sink takes the rows
     * @param watch told the time (s) reached now and then
     * @return what the history met
     * @throws InputException where a row cannot be used, with its place
     */
    public HistoryAccumulator run(RowSource source, RowSink sink, DoubleConsumer watch) {
        while (source.next(rows[spline.count()])) {
            double[] row = rows[spline.count()];
            spline.add(row[0], row, 1);
            if (spline.isFull()) {
                hand(spline.solve(), source, sink);
                watch.accept(row[0]);
            }
        }
        if (spline.count() > 0) {
            hand(spline.solveLast(), source, sink);
        }
        return summary;
    }

    /** Hands out the first rows in hand and forgets them. */
    private void hand(int count, RowSource source, RowSink sink) {
        for (int i = 0; i < count; i++) {
            for (int c = 0; c < cylinders; c++) {
                rates[c] = spline.rate(c, i);
                accelerations[c] = spline.acceleration(c, i);
            }
            int status = solver.solve(rows[i], rates, accelerations, out);
            if (status != PoseSolver.ASSEMBLED) {
                throw new InputException(
                        source.name() + ": at time_s " + rows[i][0] + " the linkage does not assemble; link '"
                                + front.mechanism().bodyName(status) + "' cannot be placed");
            }
            int unbalanced = solver.unbalanced(out);
            if (unbalanced >= 0) {
                throw new InputException(source.name() + ": at time_s " + rows[i][0]
                        + " the linkage stands at a dead centre; no force of cylinder '"
                        + front.mechanism().cylinderName(unbalanced) + "' can be told");
            }
            summary.accept(out);
            sink.row(out);
        }
        int left = spline.count() - count;
        for (int i = 0; i < left; i++) {
            double[] spare = rows[i];
            rows[i] = rows[count + i];
            rows[count + i] = spare;
        }
        spline.drop(count);
    }
}
