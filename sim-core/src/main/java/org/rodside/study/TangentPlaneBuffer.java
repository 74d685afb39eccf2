package org.rodside.study;

import java.util.ArrayList;
import java.util.List;
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
 * Tangent planes of a function's pieces, and the highest point under all of them within a small box about a centre, cut to
 * the stroke box: a linear programme (theory W1). Not thread-safe.
 */
final class TangentPlaneBuffer {

    private static final int MOST_PIVOTS = 200;

    /** A plane flatter than the steepest by this factor counts as level: the programme's own tolerance; no unit. */
    private static final double LEVEL = 1e-6;

    private final int n;
    private final double[] centre;
    private final double[] low;
    private final double[] extent;
    private final List<double[]> planes = new ArrayList<>();
    private double base;
    private double rise;

    /**
     * @param n number of axes
     */
    TangentPlaneBuffer(int n) {
        this.n = n;
        centre = new double[n];
        low = new double[n];
        extent = new double[n];
    }

    /**
     * Forgets all planes.
     *
     * @param at place on each axis about which boxes lie; not modified
     * @param value the function there: the highest point sought is not lower
     */
    void begin(double[] at, double value) {
        System.arraycopy(at, 0, centre, 0, n);
        base = value;
        planes.clear();
    }

    /**
     * Adds a plane; one that is not finite is left out.
     *
     * @param at a place; not modified
     * @param value height of the plane there
     * @param slope its slope along each axis; not modified
     */
    void add(double[] at, double value, double[] slope) {
        double[] plane = new double[n + 1];
        double height = value - base;
        for (int a = 0; a < n; a++) {
            plane[a] = slope[a];
            height += slope[a] * (centre[a] - at[a]);
        }
        plane[n] = height;
        boolean finite = true;
        for (double part : plane) {
            finite &= Math.abs(part) < Double.POSITIVE_INFINITY;
        }
        if (finite) {
            planes.add(plane);
        }
    }

    /** How far the highest point found last lies above the function at the centre, were all pieces plane. */
    double rise() {
        return rise;
    }

    /** How far the function could lie above its value at the centre anywhere in the stroke box, were no piece to bend upwards. */
    double most() {
        double most = Double.POSITIVE_INFINITY;
        for (double[] plane : planes) {
            double height = plane[n];
            for (int a = 0; a < n; a++) {
                height += Math.max(plane[a] * (1 - centre[a]), -plane[a] * centre[a]);
            }
            most = Math.min(most, height);
        }
        return most;
    }

    /**
     * The highest point.
     *
     * @param width half-width of the box on each axis; share of a stroke, not modified
     * @param out its place on each axis; overwritten
     * @return false where there is none
     */
    boolean highest(double[] width, double[] out) {
        for (int a = 0; a < n; a++) {
            low[a] = clamp(centre[a] - width[a]);
            extent[a] = clamp(centre[a] + width[a]) - low[a];
        }
        List<double[]> binding = binding();
        if (binding.isEmpty()) {
            return false;
        }
        double[] share = binding.size() == 1 ? corner(binding.get(0)) : programme(binding);
        if (share == null) {
            return false;
        }
        rise = Double.POSITIVE_INFINITY;
        for (int a = 0; a < n; a++) {
            out[a] = clamp(low[a] + extent[a] * share[a]);
        }
        for (double[] plane : binding) {
            rise = Math.min(rise, heightAtLow(plane) + reach(plane, share));
        }
        return true;
    }

    /** Planes that are the lowest somewhere in the box. */
    private List<double[]> binding() {
        double lowestTop = Double.POSITIVE_INFINITY;
        for (double[] plane : planes) {
            lowestTop = Math.min(lowestTop, heightAtLow(plane) + reach(plane, corner(plane)));
        }
        List<double[]> binding = new ArrayList<>();
        for (double[] plane : planes) {
            double bottom = heightAtLow(plane);
            for (int a = 0; a < n; a++) {
                bottom += Math.min(0, plane[a] * extent[a]);
            }
            if (bottom <= lowestTop) {
                binding.add(plane);
            }
        }
        return binding;
    }

    private double heightAtLow(double[] plane) {
        double height = plane[n];
        for (int a = 0; a < n; a++) {
            height += plane[a] * (low[a] - centre[a]);
        }
        return height;
    }

    private double reach(double[] plane, double[] share) {
        double reach = 0;
        for (int a = 0; a < n; a++) {
            reach += plane[a] * extent[a] * share[a];
        }
        return reach;
    }

    /** The highest corner of one plane over the box, each axis as a share of the box. */
    private double[] corner(double[] plane) {
        double[] share = new double[n];
        for (int a = 0; a < n; a++) {
            share[a] = plane[a] > 0 ? 1 : plane[a] < 0 ? 0 : 0.5;
        }
        return share;
    }

    /**
     * As shares of the box; heights over the spread of the plane that is lowest at the centre, and steeper rows over their own, so
     * that the programme's tolerances fit; null where it fails.
     */
    private double[] programme(List<double[]> binding) {
        double size = scale(binding);
        if (!(size > 0)) {
            return null;
        }
        List<LinearConstraint> constraints = new ArrayList<>();
        for (double[] plane : binding) {
            double[] row = new double[n + 1];
            double own = Math.max(size, spread(plane));
            for (int a = 0; a < n; a++) {
                row[a] = -plane[a] * extent[a] / own;
            }
            row[n] = size / own;
            constraints.add(new LinearConstraint(row, Relationship.LEQ, heightAtLow(plane) / own));
        }
        for (int a = 0; a < n; a++) {
            double[] row = new double[n + 1];
            row[a] = 1;
            constraints.add(new LinearConstraint(row, Relationship.LEQ, 1));
        }
        return solve(constraints);
    }

    private double scale(List<double[]> binding) {
        double[] lowest = binding.get(0);
        double steepest = 0;
        for (double[] plane : binding) {
            lowest = plane[n] < lowest[n] ? plane : lowest;
            steepest = Math.max(steepest, spread(plane));
        }
        return Math.max(spread(lowest), LEVEL * steepest);
    }

    /** Difference between a plane's highest and lowest corner over the box. */
    private double spread(double[] plane) {
        double spread = 0;
        for (int a = 0; a < n; a++) {
            spread += Math.abs(plane[a]) * extent[a];
        }
        return spread;
    }

    private double[] solve(List<LinearConstraint> constraints) {
        double[] goal = new double[n + 1];
        goal[n] = 1;
        try {
            return new SimplexSolver()
                    .optimize(
                            new MaxIter(MOST_PIVOTS),
                            new LinearObjectiveFunction(goal, 0),
                            new LinearConstraintSet(constraints),
                            GoalType.MAXIMIZE,
                            new NonNegativeConstraint(true))
                    .getPoint();
        } catch (MathIllegalStateException e) {
            return null;
        }
    }

    private static double clamp(double fraction) {
        return Math.max(0, Math.min(1, fraction));
    }
}
