package org.rodside.study;

import org.rodside.kinematics.DenseEquations;
import org.rodside.kinematics.PoseSolver;

/**
 * Strokes of three cylinders that bring the tip to a place with the tool at an angle (theory D5): Newton from the pose before, or from
 * every point of a grid at the start. Owns its scratch; not thread-safe.
 */
final class ToolInverse {

    /** Grid points an axis for the start. */
    private static final int GRID = 9;

    private static final int ROUNDS = 40;

    /** Reached within; in m and, for the angle, rad. */
    private static final double REACHED = 1e-11;

    /** Strokes may miss their ends by this share for rounding; no unit. */
    private static final double END = 1e-9;

    /** One radian weighs as much as this when the nearest pose is sought; in m. */
    private static final double RADIAN = 1;

    private final FrontSolver solver;
    private final Place tip;
    private final Place hook;
    private final int[] three;
    private final DenseEquations equations = new DenseEquations(3);
    private final double[] miss = new double[3];
    private final double[] step = new double[3];
    private final double[] travel = new double[2];

    ToolInverse(FrontSolver solver, int hoist, int crowd, int curl) {
        this.solver = solver;
        tip = solver.front().tip();
        hook = solver.front().hook();
        three = new int[] {hoist, crowd, curl};
    }

    /** Direction from hook to tip of the pose placed last; in rad. */
    double angle() {
        return Math.atan2(tip.y(solver.pose()) - hook.y(solver.pose()), tip.x(solver.pose()) - hook.x(solver.pose()));
    }

    /**
     * Goes on from a pose close by.
     *
     * @param fractions start; overwritten with the pose found, left anywhere where none is
     * @return false where no pose inside the strokes is found
     */
    boolean follow(double x, double y, double angle, double[] fractions) {
        for (int round = 0; round < ROUNDS; round++) {
            if (solver.place(fractions) != PoseSolver.ASSEMBLED) {
                return false;
            }
            misses(x, y, angle);
            if (Math.max(Math.max(Math.abs(miss[0]), Math.abs(miss[1])), Math.abs(miss[2])) < REACHED) {
                return settle(fractions);
            }
            if (!newton(fractions)) {
                return false;
            }
        }
        return false;
    }

    /** Finds a start pose anywhere in the strokes; false where there is none. */
    boolean search(double x, double y, double angle, double[] fractions) {
        double[] trial = fractions.clone();
        for (int i = 0; i < GRID * GRID * GRID; i++) {
            trial[three[0]] = i % GRID / (GRID - 1.0);
            trial[three[1]] = i / GRID % GRID / (GRID - 1.0);
            trial[three[2]] = i / GRID / GRID / (GRID - 1.0);
            if (follow(x, y, angle, trial)) {
                System.arraycopy(trial, 0, fractions, 0, trial.length);
                return true;
            }
        }
        return false;
    }

    /** Pose whose tip and tool angle come nearest. */
    double[] nearest(double x, double y, double angle, double[] fractions) {
        double[] fixed = fractions.clone();
        for (int c : three) {
            fixed[c] = Double.NaN;
        }
        return new BoxMaximum(fixed)
                .find(at -> {
                    if (solver.place(at) != PoseSolver.ASSEMBLED) {
                        return Double.NaN;
                    }
                    misses(x, y, angle);
                    return -Math.hypot(Math.hypot(miss[0], miss[1]), RADIAN * miss[2]);
                })
                .at();
    }

    private void misses(double x, double y, double angle) {
        miss[0] = x - tip.x(solver.pose());
        miss[1] = y - tip.y(solver.pose());
        miss[2] = Math.IEEEremainder(angle - angle(), 2 * Math.PI);
    }

    private boolean newton(double[] fractions) {
        for (int k = 0; k < 3; k++) {
            solver.travel(tip, three[k], travel);
            double stroke = solver.front().mechanism().stroke(three[k]);
            equations.matrix()[k] = travel[0] * stroke;
            equations.matrix()[3 + k] = travel[1] * stroke;
            equations.matrix()[6 + k] = solver.motion().omega(tip.body()) * stroke;
        }
        if (!equations.factor()) {
            return false;
        }
        equations.solve(miss, step);
        for (int k = 0; k < 3; k++) {
            double next = fractions[three[k]] + Math.max(-0.1, Math.min(0.1, step[k]));
            if (!(next >= -0.2 && next <= 1.2)) {
                return false;
            }
            fractions[three[k]] = next;
        }
        return true;
    }

    private boolean settle(double[] fractions) {
        for (int c : three) {
            if (fractions[c] < -END || fractions[c] > 1 + END) {
                return false;
            }
            fractions[c] = Math.max(0, Math.min(1, fractions[c]));
        }
        return true;
    }
}
