package org.rodside.study;

import java.util.Arrays;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;

/**
 * The curl stroke at which rated forces are taken (theory S7): where the curl cylinder alone gives the largest tool force.
 * Where a range of curl strokes gives the same largest force, as a level-crowd shovel has it, the one of them with the largest
 * rated curl force counts. Owns its scratch; not thread-safe.
 */
final class CurlStroke {

    /** Forces that differ by less than this share are the same, ten times what the search leaves; no unit. */
    private static final double SAME = 1e-10;

    /** Beside the best stroke by so much, a force that has one best stroke has fallen by far more than that; share of a stroke. */
    private static final double BESIDE = 1e-3;

    /** Ends of a range of best strokes are found to this; share of a stroke. */
    private static final double END = 1e-9;

    /** The search has the stroke to this; share of a stroke. */
    private static final double NEAR = 1e-4;

    /** As close as the rounding of a smooth force lets its best stroke be told. */
    private static final double RELATIVE = 1e-9;

    private static final double ABSOLUTE = 1e-10;
    private static final int EVALUATIONS = 200;

    private final int curl;
    private final int cylinders;
    private final DigSolver ideal;

    /**
     * @param ideal finds the curl force without weights, friction, back pressure, tipping and slip
     */
    CurlStroke(Front front, DigSolver ideal) {
        this.ideal = ideal;
        curl = front.curl();
        cylinders = front.mechanism().cylinders();
    }

    /** The fraction of the curl stroke; NaN where no pose gives a force. */
    double find() {
        Optimum best = BoxMaximum.overAll(cylinders).find(this::alone);
        if (!best.exists()) {
            return Double.NaN;
        }
        double stroke = best.at()[curl];
        double low = end(stroke, 0, best.value());
        double high = end(stroke, 1, best.value());
        return high - low <= BESIDE ? polished(best) : bestOf(low, high);
    }

    /** The last digits of the stroke: rated forces change with it in the first order. */
    private double polished(Optimum best) {
        double[] at = best.at().clone();
        double found = new BrentOptimizer(RELATIVE, ABSOLUTE)
                .optimize(
                        new MaxEval(EVALUATIONS),
                        GoalType.MAXIMIZE,
                        new SearchInterval(Math.max(0, at[curl] - NEAR), Math.min(1, at[curl] + NEAR), at[curl]),
                        new UnivariateObjectiveFunction(stroke -> {
                            at[curl] = stroke;
                            double force = alone(at);
                            return Double.isNaN(force) ? 0 : force;
                        }))
                .getPoint();
        at[curl] = found;
        return alone(at) >= best.value() ? found : best.at()[curl];
    }

    private double alone(double[] fractions) {
        double force = ideal.alone(fractions);
        return Double.isInfinite(force) ? Double.NaN : force;
    }

    /** How far towards an end of the stroke the largest force stays the same. */
    private double end(double stroke, double towards, double force) {
        double reached = stroke + Math.max(-BESIDE, Math.min(BESIDE, towards - stroke));
        if (!(largest(reached) >= force * (1 - SAME))) {
            return stroke;
        }
        double failed = towards;
        if (largest(towards) >= force * (1 - SAME)) {
            return towards;
        }
        while (Math.abs(failed - reached) > END) {
            double middle = (reached + failed) / 2;
            if (largest(middle) >= force * (1 - SAME)) {
                reached = middle;
            } else {
                failed = middle;
            }
        }
        return reached;
    }

    private double largest(double stroke) {
        return new BoxMaximum(curlAt(stroke)).find(this::alone).value();
    }

    private double[] curlAt(double stroke) {
        double[] fixed = new double[cylinders];
        Arrays.fill(fixed, Double.NaN);
        fixed[curl] = stroke;
        return fixed;
    }

    /** The stroke within a range that has the largest rated curl force. */
    private double bestOf(double low, double high) {
        BoxMaximum.Objective force = ideal.asObjective();
        double[] within = new double[cylinders];
        Optimum best = BoxMaximum.overAll(cylinders).find(new BoxMaximum.Objective() {
            @Override
            public double at(double[] fractions) {
                System.arraycopy(fractions, 0, within, 0, cylinders);
                within[curl] = low + fractions[curl] * (high - low);
                return force.at(within);
            }

            @Override
            public int pieces() {
                return force.pieces();
            }

            @Override
            public void tellPieces(double[] out) {
                force.tellPieces(out);
            }
        });
        return low + best.at()[curl] * (high - low);
    }
}
