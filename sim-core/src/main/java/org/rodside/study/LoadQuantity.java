package org.rodside.study;

import java.util.Arrays;
import java.util.function.DoubleSupplier;

/**
 * One quantity of one load case that is to be worst (theory W1). Under a tool force it is the least of smooth pieces, one for
 * each limit that may stop the tool, wherever a larger tool force would make it larger. One per thread.
 */
final class LoadQuantity implements BoxMaximum.Objective {

    /** A tool force larger by this share, and by one newton, tells whether the quantity rises with it; no unit. */
    private static final double MORE = 1e-3;

    private final CaseSolver solver;
    private final DoubleSupplier reading;

    /**
     * @param solver the case
     * @param reading reads the quantity off the pose the solver stands at; larger is worse
     */
    LoadQuantity(CaseSolver solver, DoubleSupplier reading) {
        this.solver = solver;
        this.reading = reading;
    }

    /** Push of a cylinder; in N. */
    static LoadQuantity push(CaseSolver solver, int cylinder) {
        return new LoadQuantity(solver, () -> solver.cylinder(cylinder));
    }

    /** Pull of a cylinder; in N. */
    static LoadQuantity pull(CaseSolver solver, int cylinder) {
        return new LoadQuantity(solver, () -> -solver.cylinder(cylinder));
    }

    /** One over the buckling factor of a cylinder, below zero for a pull; no unit. */
    static LoadQuantity columnWork(CaseSolver solver, int cylinder) {
        return new LoadQuantity(solver, () -> solver.columnWork(cylinder));
    }

    /** Size of a bearing force; in N. */
    static LoadQuantity bearing(CaseSolver solver, int bearing) {
        return new LoadQuantity(solver, () -> {
            double x = solver.bearingX(bearing);
            double y = solver.bearingY(bearing);
            return Math.sqrt(x * x + y * y);
        });
    }

    /** The quantity; NaN where the pose has none or it is not finite. */
    @Override
    public double at(double[] fractions) {
        return solver.solve(fractions) ? value() : Double.NaN;
    }

    /** The quantity at the pose the solver stands at; NaN where it is not finite. */
    double value() {
        double value = reading.getAsDouble();
        return Math.abs(value) < Double.POSITIVE_INFINITY ? value : Double.NaN;
    }

    @Override
    public int pieces() {
        return solver.lines() == 0 ? 1 : 2 + solver.lines();
    }

    @Override
    public void tellPieces(double[] out) {
        Arrays.fill(out, Double.POSITIVE_INFINITY);
        out[0] = value();
        if (solver.lines() == 0) {
            return;
        }
        double tool = solver.tool();
        if (!(valueAt(tool * (1 + MORE) + 1) > out[0])) {
            tellFalling(tool, out);
        } else if (tool > 0) {
            tellRising(out);
        }
        solver.use(tool);
    }

    /** A larger tool force makes it worse: it is the least of what it would be at every limit. */
    private void tellRising(double[] out) {
        out[0] = Double.POSITIVE_INFINITY;
        for (int line = 0; line < solver.lines(); line++) {
            out[2 + line] = valueAt(solver.meeting(line));
        }
    }

    /** A larger tool force makes it better: it is what the first limit leaves, but never more than without any tool force. */
    private void tellFalling(double tool, double[] out) {
        double first = Double.POSITIVE_INFINITY;
        for (int line = 0; line < solver.lines(); line++) {
            first = Math.min(first, solver.meeting(line));
        }
        if (tool > 0 || first < 0) {
            out[0] = valueAt(0);
            out[1] = valueAt(first);
        }
    }

    private double valueAt(double tool) {
        solver.use(tool);
        return value();
    }
}
