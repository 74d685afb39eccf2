package org.rodside.study;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.DoubleConsumer;
import java.util.function.IntFunction;
import org.rodside.model.InputException;
import org.rodside.table.Column;
import org.rodside.table.RowSink;
import org.rodside.table.Table;
import org.rodside.units.Quantity;

/**
 * Digging forces over the whole stroke box on a grid. Lines of the grid run along the cylinder nearest the tool. A pose
 * that does not assemble keeps its row, with empty cells. The same rows for any number of threads.
 */
public final class DigSweep {

    /** Most poses of a sweep: beyond that a slip of the finger is likelier than a wish; some minutes of computing. */
    public static final long MOST_POSES = 20_000_000_000L;

    /** Most grid points on one stroke; no unit. */
    public static final int MOST_STEPS = 100_000;

    /** Poses in a piece of work without rows; enough to forget the cost of handing it out. */
    private static final int POSES_A_PIECE = 1 << 17;

    /** Poses in a piece of work whose rows wait for their turn. */
    private static final int ROWS_A_PIECE = 1 << 13;

    private final Front front;
    private final Edge edge;
    private final boolean ideal;
    private final SweepGrid grid;
    private final int cylinders;
    private final Optional<StageSweep> stages;

    /**
     * @param front the front
     * @param edge where forces are taken
     * @param ideal true for no weights, friction, back pressure, tipping and slip
     * @param steps grid points on each stroke
     */
    public DigSweep(Front front, Edge edge, boolean ideal, int steps) {
        this.front = front;
        this.edge = edge;
        this.ideal = ideal;
        grid = new SweepGrid(front.mechanism(), steps);
        cylinders = front.mechanism().cylinders();
        stages = StageSweep.of(front, grid, edge.of(front));
    }

    /**
     * Checks a number of steps.
     *
     * @return the same number
     * @throws InputException where it is below 2 or makes more than {@link #MOST_POSES} poses
     */
    public static int steps(Front front, int steps) {
        int cylinders = front.mechanism().cylinders();
        if (steps < 2 || Math.pow(steps, cylinders) > MOST_POSES) {
            int most = (int) Math.min(MOST_STEPS, Math.floor(Math.pow(MOST_POSES, 1.0 / cylinders) + 1e-9));
            throw new InputException("--steps: a whole number from 2 to " + most + " is wanted for " + cylinders
                    + " cylinders, found " + steps);
        }
        return steps;
    }

    /** A sweep with at most a given number of poses, as a table; for pictures. */
    public static Table coarse(Front front, Edge edge, boolean ideal, int mostPoses, int threads) {
        int cylinders = front.mechanism().cylinders();
        int steps = Math.max(2, (int) Math.floor(Math.pow(mostPoses, 1.0 / cylinders) + 1e-9));
        DigSweep sweep = new DigSweep(front, edge, ideal, Math.min(steps, MOST_STEPS));
        Table table = new Table(sweep.columns());
        sweep.rows(table, threads, done -> {});
        return table;
    }

    /** Number of poses. */
    public long poses() {
        return grid.lines() * grid.steps();
    }

    /** Columns of the rows, in order. */
    public List<Column> columns() {
        List<Column> columns = new ArrayList<>();
        for (int c = 0; c < cylinders; c++) {
            columns.add(Column.of(front.mechanism().cylinderName(c) + ".fraction", Quantity.NONE));
        }
        columns.add(Column.of("tip_x", Quantity.LENGTH));
        columns.add(Column.of("tip_y", Quantity.LENGTH));
        columns.add(Column.of("curl", Quantity.FORCE));
        columns.add(Column.words("curl_limit", new LimitSolver(front, front.curl(), ideal).names()));
        columns.add(Column.of("crowd", Quantity.FORCE));
        columns.add(Column.words("crowd_limit", new LimitSolver(front, front.crowd(), ideal).names()));
        return columns;
    }

    /** One row a pose, in order. */
    public void rows(RowSink sink, int threads, DoubleConsumer progress) {
        int linesAPiece = Math.max(1, ROWS_A_PIECE / grid.steps());
        new Chunks(threads, progress).<double[][]>inOrder(pieces(linesAPiece), () -> rowWorker(linesAPiece), rows -> {
            for (double[] row : rows) {
                sink.row(row);
            }
        });
    }

    /** The largest forces met, without rows. */
    public DigSummary summary(int threads, DoubleConsumer progress) {
        int linesAPiece = Math.max(1, POSES_A_PIECE / grid.steps());
        DigBest best = new DigBest();
        new Chunks(threads, progress).<DigBest>inOrder(pieces(linesAPiece), () -> bestWorker(linesAPiece), best::add);
        return new DigSummary(
                poses(), ideal, best.assembled, at(best.curlPose, front.curl()), at(best.crowdPose, front.crowd()));
    }

    private int pieces(int linesAPiece) {
        return Math.toIntExact((grid.lines() + linesAPiece - 1) / linesAPiece);
    }

    private DigLine line() {
        return stages.isPresent()
                ? new StageDigLine(stages.get(), ideal)
                : new GeneralDigLine(grid, front, edge, ideal);
    }

    private IntFunction<DigBest> bestWorker(int linesAPiece) {
        DigLine line = line();
        DigRun run = new DigRun(grid.steps());
        int[] outer = new int[grid.axes() - 1];
        return piece -> {
            DigBest best = new DigBest();
            long last = Math.min(grid.lines(), (piece + 1L) * linesAPiece);
            for (long n = (long) piece * linesAPiece; n < last; n++) {
                grid.outer(n, outer);
                line.forces(outer, run);
                best.add(run, n * grid.steps());
            }
            return best;
        };
    }

    private IntFunction<double[][]> rowWorker(int linesAPiece) {
        DigLine line = line();
        DigRun run = new DigRun(grid.steps());
        int[] outer = new int[grid.axes() - 1];
        return piece -> {
            long first = (long) piece * linesAPiece;
            long last = Math.min(grid.lines(), first + linesAPiece);
            double[][] rows = new double[(int) (last - first) * grid.steps()][];
            for (long n = first; n < last; n++) {
                grid.outer(n, outer);
                line.run(outer, run);
                for (int i = 0; i < grid.steps(); i++) {
                    rows[(int) (n - first) * grid.steps() + i] = row(outer, i, run);
                }
            }
            return rows;
        };
    }

    private double[] row(int[] outer, int i, DigRun run) {
        double[] row = new double[cylinders + 6];
        grid.fractions(outer, i, row);
        row[cylinders] = run.tipX[i];
        row[cylinders + 1] = run.tipY[i];
        row[cylinders + 2] = run.curl[i];
        row[cylinders + 3] = word(run.curl[i], run.curlLimit[i]);
        row[cylinders + 4] = run.crowd[i];
        row[cylinders + 5] = word(run.crowd[i], run.crowdLimit[i]);
        return row;
    }

    private double word(double force, int limit) {
        int none = 2 * cylinders + 3;
        return Double.isNaN(force) ? Double.NaN : limit == LimitSolver.NONE ? none : limit;
    }

    /** The pose with the given number, told in full by the general solver. */
    private Optional<DigForce> at(long pose, int duty) {
        if (pose < 0 || duty < 0) {
            return Optional.empty();
        }
        int[] outer = new int[grid.axes() - 1];
        double[] fractions = new double[cylinders];
        grid.outer(pose / grid.steps(), outer);
        grid.fractions(outer, (int) (pose % grid.steps()), fractions);
        Digging digging = new Digging(front, edge);
        return duty == front.curl() ? Optional.of(digging.curlAt(fractions, ideal)) : digging.crowdAt(fractions, ideal);
    }
}
