package org.rodside.study;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import org.apache.commons.math3.exception.MathIllegalStateException;
import org.apache.commons.math3.optim.MaxIter;
import org.apache.commons.math3.optim.linear.LinearConstraint;
import org.apache.commons.math3.optim.linear.LinearConstraintSet;
import org.apache.commons.math3.optim.linear.LinearObjectiveFunction;
import org.apache.commons.math3.optim.linear.NonNegativeConstraint;
import org.apache.commons.math3.optim.linear.Relationship;
import org.apache.commons.math3.optim.linear.SimplexSolver;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;

/**
 * Climbs along ridges (theory W1). Under a tool force every load is the least of several smooth pieces, one a limit; its
 * peaks sit on sharp ridges that slant through the stroke box, where a search along fixed directions stops. Here the slope
 * is taken at several places about the present one, so that every piece near it is met; the highest point under all those
 * tangent planes within a small box is a linear programme, and its answer is the next trial (cutting planes, Kelley 1960,
 * with a trust region; recalled). The box shrinks where the trial is no higher. Never leaves the stroke box, never ends
 * lower than it started; the same call gives the same bits. Not thread-safe.
 */
final class RidgeClimber {

    /** First and last half-width of the small box; share of a stroke. */
    private static final double FIRST = 0.02;

    private static final double LAST = 1e-7;

    /** Widest that the small box may grow; share of a stroke. */
    private static final double WIDEST = 0.1;

    /** Step of a slope over the half-width of the small box: seldom astride a kink, far above rounding; no unit. */
    private static final double SLOPE_STEP = 1e-3;

    /** Steps of one climb from a hill, and of one that is to reach the top. */
    private static final int FEW_STEPS = 24;

    private static final int MANY_STEPS = 80;

    /** Climbs to the top start anew while they gain more than this share: the small box has to grow again; no unit. */
    private static final double GAIN = 1e-7;

    private static final int MOST_RESTARTS = 12;

    /** Trials that were no higher and whose own planes are added before the box shrinks. */
    private static final int CUTS = 4;

    private static final int MOST_PIVOTS = 200;
    private static final int SEED = 20260102;

    private final BoxMaximum.Objective objective;
    private final int[] free;
    private final int n;
    private SplittableRandom random;
    private double[] here;
    private double value;
    private double width;
    private double base;

    /**
     * @param objective what is to be made largest
     * @param free axes along which it may move, at least one; not modified
     */
    RidgeClimber(BoxMaximum.Objective objective, int[] free) {
        this.objective = objective;
        this.free = free;
        n = free.length;
    }

    /** Climbs from a pose that has a value until nothing more is gained. */
    Optimum top(Optimum from) {
        Optimum best = from;
        for (int i = 0; i < MOST_RESTARTS; i++) {
            Optimum next = climb(best, MANY_STEPS);
            boolean still = next.value() > best.value() + GAIN * Math.abs(best.value());
            best = next;
            if (!still) {
                break;
            }
        }
        return best;
    }

    /** Climbs some way from a pose that has a value. */
    Optimum climb(Optimum from) {
        return climb(from, FEW_STEPS);
    }

    private Optimum climb(Optimum from, int steps) {
        here = from.at().clone();
        value = from.value();
        width = FIRST;
        random = new SplittableRandom(SEED);
        for (int i = 0; i < steps && width > LAST; i++) {
            step();
        }
        return new Optimum(value, here);
    }

    private void step() {
        double before = value;
        base = before;
        List<LinearConstraint> planes = new ArrayList<>();
        double[] centre = here;
        addPlane(centre, centre, before, planes);
        for (int i = 0; i < 2 * n; i++) {
            double[] near = centre.clone();
            for (int axis : free) {
                near[axis] = clamp(centre[axis] + width * random.nextDouble(-1, 1));
            }
            double reached = objective.at(near);
            addPlane(centre, near, reached, planes);
            take(near, reached);
        }
        boolean planned = false;
        for (int i = 0; i < CUTS && !planned; i++) {
            double[] trial = highest(centre, planes);
            double top = trial == null ? Double.NaN : objective.at(trial);
            planned = top > value;
            if (planned) {
                take(trial, top);
            } else if (trial == null || Double.isNaN(top)) {
                break;
            } else {
                addPlane(centre, trial, top, planes);
            }
        }
        width = planned ? Math.min(WIDEST, 2 * width) : value > before ? width * 0.7 : width / 3;
    }

    private void take(double[] at, double reached) {
        if (reached > value) {
            value = reached;
            here = at;
        }
    }

    private static double clamp(double fraction) {
        return Math.max(0, Math.min(1, fraction));
    }

    /** The plane t ≤ f + g·(x − near), x counted from the lower corner of the small box round the centre. */
    private void addPlane(double[] centre, double[] near, double f, List<LinearConstraint> planes) {
        double[] row = new double[n + 1];
        double right = f;
        double step = width * SLOPE_STEP;
        for (int a = 0; a < n; a++) {
            int axis = free[a];
            double[] beside = near.clone();
            beside[axis] = near[axis] + step > 1 ? near[axis] - step : near[axis] + step;
            double slope = (objective.at(beside) - f) / (beside[axis] - near[axis]);
            row[a] = -slope;
            right += slope * (low(centre, axis) - near[axis]);
        }
        row[n] = 1;
        if (Math.abs(right) < Double.POSITIVE_INFINITY) {
            planes.add(new LinearConstraint(row, Relationship.LEQ, right - base));
        }
    }

    private double low(double[] centre, int axis) {
        return clamp(centre[axis] - width);
    }

    /** Highest point under all planes within the small box; null where there is none. */
    private double[] highest(double[] centre, List<LinearConstraint> planes) {
        double[] goal = new double[n + 1];
        goal[n] = 1;
        List<LinearConstraint> all = new ArrayList<>(planes);
        for (int a = 0; a < n; a++) {
            double[] row = new double[n + 1];
            row[a] = 1;
            all.add(new LinearConstraint(row, Relationship.LEQ, clamp(centre[free[a]] + width) - low(centre, free[a])));
        }
        try {
            double[] found = new SimplexSolver()
                    .optimize(
                            new MaxIter(MOST_PIVOTS),
                            new LinearObjectiveFunction(goal, 0),
                            new LinearConstraintSet(all),
                            GoalType.MAXIMIZE,
                            new NonNegativeConstraint(true))
                    .getPoint();
            double[] trial = centre.clone();
            for (int a = 0; a < n; a++) {
                trial[free[a]] = clamp(low(centre, free[a]) + found[a]);
            }
            return trial;
        } catch (MathIllegalStateException e) {
            return null;
        }
    }
}
