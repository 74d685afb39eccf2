package org.rodside.kinematics;

import java.util.Arrays;

/**
 * Newton on all pin and length equations, followed from the drawn pose (theory K4). Works for any planar linkage and is
 * the second, independent way for those that fall into closed-form steps. The lengths go from the drawn to the wanted ones
 * in steps small enough that no link turns far, so that the loop stays on the branch of the drawing; a pose beyond a dead
 * centre is not reached. Owns its scratch; one per thread. The same strokes always give the same bits.
 */
public final class DensePoseSolver implements PoseSolver {

    /** Newton stops when no equation misses by more; in m. Well below 1e-9 m, well above rounding of 10 m. */
    private static final double CLOSED = 1e-13;

    /** A pose counts as assembled when no equation misses by more; in m. */
    private static final double ASSEMBLED_WITHIN = 1e-10;

    private static final int NEWTON_ROUNDS = 12;

    /** No link may turn further in one step of the path; in rad. Smaller than any angle between two branches in use. */
    private static final double LARGEST_TURN = 0.2;

    /** The path is given up when its step falls below this share of the whole; no unit. */
    private static final double SMALLEST_STEP = 1e-5;

    private final Mechanism mechanism;
    private final ConstraintSystem system;
    private final DenseEquations equations;
    private final double[] side;
    private final double[] step;
    private final double[] here;
    private final double[] trial;
    private final double[] strokes;

    public DensePoseSolver(Mechanism mechanism) {
        this.mechanism = mechanism;
        system = new ConstraintSystem(mechanism);
        int n = system.size();
        equations = new DenseEquations(n);
        side = new double[n];
        step = new double[n];
        here = new double[n];
        trial = new double[n];
        strokes = new double[mechanism.cylinders()];
    }

    @Override
    public int solve(double[] wanted, PoseBuffer pose) {
        Arrays.fill(here, 0);
        system.drawn(here);
        double done = 0;
        double stride = 1;
        while (done < 1) {
            double next = Math.min(1, done + stride);
            if (advance(wanted, next, pose)) {
                System.arraycopy(trial, 0, here, 0, here.length);
                done = next;
                stride *= 2;
            } else {
                stride = (next - done) / 2;
                if (!(stride > SMALLEST_STEP)) {
                    pose.clear();
                    return 1;
                }
            }
        }
        return ASSEMBLED;
    }

    /** Newton at one place of the path from the drawn to the wanted lengths, starting from {@code here}. */
    private boolean advance(double[] wanted, double share, PoseBuffer pose) {
        for (int c = 0; c < strokes.length; c++) {
            double drawn = mechanism.drawnLength(c) - mechanism.retracted(c);
            strokes[c] = share == 1 ? wanted[c] : drawn + share * (wanted[c] - drawn);
        }
        System.arraycopy(here, 0, trial, 0, here.length);
        double miss = Double.POSITIVE_INFINITY;
        for (int round = 0; round < NEWTON_ROUNDS && miss > CLOSED; round++) {
            pose.begin(strokes);
            system.write(trial, pose);
            system.misses(pose, side);
            miss = largest(side);
            if (miss > CLOSED) {
                if (!factor(pose)) {
                    return false;
                }
                equations.solve(side, step);
                for (int i = 0; i < trial.length; i++) {
                    trial[i] -= step[i];
                }
            }
        }
        return miss <= ASSEMBLED_WITHIN && turnedLittle();
    }

    private boolean turnedLittle() {
        for (int body = 1; body < mechanism.bodies(); body++) {
            int at = 3 * (body - 1) + 2;
            if (!(Math.abs(trial[at] - here[at]) <= LARGEST_TURN)) {
                return false;
            }
        }
        return true;
    }

    private static double largest(double[] values) {
        double largest = 0;
        for (double value : values) {
            largest = Math.max(largest, Math.abs(value));
        }
        return largest;
    }

    /** Factors the Jacobian of a pose; false where it is singular. */
    private boolean factor(PoseBuffer pose) {
        system.jacobian(pose, equations.matrix());
        return equations.factor();
    }

    @Override
    public void rates(PoseBuffer pose, double[] rates, MotionBuffer motion) {
        motion.setRate(pose, 0, 0, 0, 0);
        system.rateSide(rates, side);
        solveOrNaN(pose);
        system.writeRates(pose, step, motion);
    }

    @Override
    public void accelerations(PoseBuffer pose, double[] accelerations, MotionBuffer motion) {
        motion.setAcceleration(pose, 0, 0, 0, 0);
        system.accelerationSide(pose, accelerations, motion, side);
        solveOrNaN(pose);
        system.writeAccelerations(pose, step, motion);
    }

    private void solveOrNaN(PoseBuffer pose) {
        if (factor(pose)) {
            equations.solve(side, step);
        } else {
            Arrays.fill(step, Double.NaN);
        }
    }
}
