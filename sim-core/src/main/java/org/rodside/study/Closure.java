package org.rodside.study;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.rodside.kinematics.CylinderStep;
import org.rodside.kinematics.Mechanism;
import org.rodside.kinematics.PairStep;
import org.rodside.kinematics.PoseBuffer;
import org.rodside.kinematics.PoseSolver;
import org.rodside.kinematics.Step;

/**
 * Does the linkage assemble everywhere, and how close does it come to a dead centre? (theory K1, K2) A loop in closed form
 * ends at its dead centre, so that the box shows poses that do not assemble beyond it; the smallest angle tells how near one is.
 */
public final class Closure {

    /** A transmission angle below this is close to a dead centre: common practice, no source; in rad. */
    public static final double SMALL_ANGLE = Math.toRadians(5);

    private final Front front;
    private final Mechanism mechanism;
    private final FrontSolver solver;
    private final PoseBuffer pose;
    private final int[] driver;
    private final double[] low;
    private final double[] high;
    private long assembled;
    private double[] failure;
    private int failing;

    private Closure(Front front) {
        this.front = front;
        mechanism = front.mechanism();
        solver = new FrontSolver(front);
        pose = solver.pose();
        driver = drivers();
        low = new double[mechanism.cylinders()];
        high = new double[mechanism.cylinders()];
        Arrays.fill(low, Double.NaN);
        Arrays.fill(high, Double.NaN);
    }

    /** Grid points on each stroke that make some ten thousand poses. */
    public static int usualSteps(Front front) {
        int cylinders = front.mechanism().cylinders();
        return Math.max(2, Math.min(21, (int) Math.floor(Math.pow(1e4, 1.0 / cylinders) + 1e-9)));
    }

    /**
     * Tries the whole stroke box.
     *
     * @param steps grid points on each stroke, 2 or more
     */
    public static ClosureAnswer of(Front front, int steps) {
        return new Closure(front).answer(steps);
    }

    private ClosureAnswer answer(int steps) {
        long poses = 1;
        for (int c = 0; c < mechanism.cylinders(); c++) {
            poses *= steps;
        }
        double[] at = new double[mechanism.cylinders()];
        for (long n = 0; n < poses; n++) {
            long rest = n;
            for (int c = 0; c < at.length; c++) {
                at[c] = (rest % steps) / (steps - 1.0);
                rest /= steps;
            }
            take(at, solver.place(at));
        }
        List<ClosureAnswer.Corner> corners = new ArrayList<>();
        for (int c = 0; c < mechanism.cylinders(); c++) {
            corners.add(corner(c));
        }
        return new ClosureAnswer(
                mechanism.cylinders(),
                mechanism.staged(),
                poses,
                assembled,
                Optional.ofNullable(failure),
                failure == null ? "" : mechanism.bodyName(failing),
                corners);
    }

    private void take(double[] at, int status) {
        if (status == PoseSolver.ASSEMBLED) {
            assembled++;
            return;
        }
        if (failure == null) {
            failure = at.clone();
            failing = status;
        }
        for (int c = 0; c < at.length; c++) {
            low[c] = Double.isNaN(low[c]) ? at[c] : Math.min(low[c], at[c]);
            high[c] = Double.isNaN(high[c]) ? at[c] : Math.max(high[c], at[c]);
        }
    }

    /** The cylinder that moves each step's loop: its own, or the one assembled last among those its pins hang on. */
    private int[] drivers() {
        List<Step> steps = mechanism.steps();
        int[] byBody = new int[mechanism.bodies()];
        Arrays.fill(byBody, -1);
        int[] byStep = new int[steps.size()];
        for (int i = 0; i < byStep.length; i++) {
            if (steps.get(i) instanceof CylinderStep step) {
                byBody[step.body()] = i;
                byStep[i] = i;
            } else {
                PairStep step = (PairStep) steps.get(i);
                int last =
                        Math.max(byBody[mechanism.owner(step.firstPin())], byBody[mechanism.owner(step.secondPin())]);
                byBody[step.first()] = last;
                byBody[step.second()] = last;
                byStep[i] = last;
            }
        }
        int[] cylinders = new int[steps.size()];
        for (int i = 0; i < cylinders.length; i++) {
            cylinders[i] = byStep[i] >= 0 && steps.get(byStep[i]) instanceof CylinderStep step ? step.cylinder() : -1;
        }
        return cylinders;
    }

    private ClosureAnswer.Corner corner(int c) {
        Optimum angle = weakest(at -> -smallestAngle(c));
        Optimum arm = weakest(at -> -leverArm(c));
        return new ClosureAnswer.Corner(c, low[c], high[c], -angle.value(), angle.at(), -arm.value(), arm.at());
    }

    private Optimum weakest(BoxMaximum.Objective reading) {
        return BoxMaximum.overAll(mechanism.cylinders())
                .find(at -> solver.place(at) == PoseSolver.ASSEMBLED ? reading.at(at) : Double.NaN);
    }

    private double smallestAngle(int cylinder) {
        double least = Double.NaN;
        List<Step> steps = mechanism.steps();
        for (int i = 0; i < driver.length; i++) {
            if (driver[i] == cylinder) {
                double angle = steps.get(i) instanceof CylinderStep step
                        ? angle(step.eye(), step.anchor(), step.pivot())
                        : angle((PairStep) steps.get(i));
                least = Double.isNaN(least) ? angle : Math.min(least, angle);
            }
        }
        return least;
    }

    private double angle(PairStep step) {
        return angle(step.joint(), step.firstPin(), step.secondPin());
    }

    /** Angle at a pin between the lines to two others, folded to 0 to π/2; in rad. */
    private double angle(int corner, int one, int two) {
        double ax = pose.pinX(one) - pose.pinX(corner);
        double ay = pose.pinY(one) - pose.pinY(corner);
        double bx = pose.pinX(two) - pose.pinX(corner);
        double by = pose.pinY(two) - pose.pinY(corner);
        return Math.atan2(Math.abs(ax * by - ay * bx), Math.abs(ax * bx + ay * by));
    }

    private double leverArm(int cylinder) {
        for (Step step : mechanism.steps()) {
            if (step instanceof CylinderStep s && s.cylinder() == cylinder) {
                double rx = pose.pinX(s.eye()) - pose.pinX(s.pivot());
                double ry = pose.pinY(s.eye()) - pose.pinY(s.pivot());
                return Math.abs(rx * s.unitY(pose) - ry * s.unitX(pose));
            }
        }
        solver.travel(cylinder);
        double most = 0;
        for (int body = 1; body < mechanism.bodies(); body++) {
            most = Math.max(most, Math.abs(solver.motion().omega(body)));
        }
        return 1 / most;
    }
}
