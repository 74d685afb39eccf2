package org.rodside.study;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleConsumer;
import java.util.function.IntFunction;
import org.rodside.kinematics.PoseSolver;
import org.rodside.model.InputException;
import org.rodside.model.Linkage;
import org.rodside.model.Machine;
import org.rodside.statics.ForceBuffer;
import org.rodside.statics.GroundBuffer;
import org.rodside.statics.Masses;

/**
 * Lift capacity over a grid of radius and height (theory L1, L2; ISO 10567: rated = the smaller of 87 % of the hydraulic
 * and 75 % of the tipping load). Owns its scratch; one per thread.
 */
public final class LiftCapacity {

    /** Share of the hydraulic capacity that is rated, ISO 10567; no unit. */
    public static final double HYDRAULIC_SHARE = 0.87;

    /** Share of the tipping load that is rated, ISO 10567; no unit. */
    public static final double TIPPING_SHARE = 0.75;

    /** Most grid points of one chart. */
    private static final int MOST_POINTS = 100_000;

    private final Front front;
    private final LiftQuestion question;
    private final FrontSolver solver;
    private final HookInverse inverse;
    private final LimitSolver limits;
    private final Masses masses;
    private final Place hook;
    private final double line;
    private final ForceBuffer fixed;
    private final ForceBuffer unit;
    private final GroundBuffer ground = new GroundBuffer();

    private LiftCapacity(Front front, LiftQuestion question) {
        this.front = front;
        this.question = question;
        Machine machine = front.machineOrFault();
        int hoist = named(front.hoist(), "tool.hoist");
        int crowd = named(front.crowd(), "tool.crowd");
        solver = new FrontSolver(front);
        hook = front.hook();
        inverse = new HookInverse(solver, hook, hoist, crowd, question.fractions());
        limits = new LimitSolver(front, hoist, false);
        masses = question.bare() ? new Masses(front.mechanism(), front.toolBody()) : front.masses();
        OptionalDouble side = machine.tippingSide();
        if (question.overSide() && side.isEmpty()) {
            throw Front.needs("machine.tipping.side");
        }
        line = question.overSide() ? side.getAsDouble() : machine.tippingFront();
        fixed = new ForceBuffer(front.mechanism());
        unit = new ForceBuffer(front.mechanism());
    }

    private static int named(int cylinder, String path) {
        if (cylinder < 0) {
            throw Front.needs(path);
        }
        return cylinder;
    }

    /**
     * Capacity at every grid point the hook reaches, highest row first, nearest first in a row.
     *
     * @throws InputException where the linkage lacks what lifting needs, or the grid is too fine
     */
    public static List<LiftPoint> chart(Front front, LiftQuestion question, int threads, DoubleConsumer progress) {
        double[] extent = new LiftCapacity(front, question).inverse.extent();
        double step = question.step();
        long columns = (long) Math.floor(extent[1] / step);
        long top = (long) Math.floor(extent[3] / step);
        long bottom = (long) Math.ceil(extent[2] / step);
        if (!(step > 0) || columns * (top - bottom + 1.0) > MOST_POINTS) {
            throw new InputException("--grid: the step makes more than " + MOST_POINTS + " points; give a larger one");
        }
        List<LiftPoint> points = new ArrayList<>();
        int rows = (int) Math.max(0, top - bottom + 1);
        new Chunks(threads, progress)
                .<List<LiftPoint>>inOrder(rows, () -> row(front, question, top, columns), points::addAll);
        return points;
    }

    private static IntFunction<List<LiftPoint>> row(Front front, LiftQuestion question, long top, long columns) {
        LiftCapacity lift = new LiftCapacity(front, question);
        return row -> {
            List<LiftPoint> points = new ArrayList<>();
            for (int column = 1; column <= columns; column++) {
                lift.at(column * question.step(), (top - row) * question.step()).ifPresent(points::add);
            }
            return points;
        };
    }

    /** The stronger of the poses that bring the hook to a place; empty where none does. */
    private Optional<LiftPoint> at(double radius, double height) {
        LiftPoint best = null;
        for (double[] at : inverse.solve(radius, height)) {
            LiftPoint point = capacity(radius, height, at);
            best = best == null || point.rated() > best.rated() ? point : best;
        }
        return Optional.ofNullable(best);
    }

    private LiftPoint capacity(double radius, double height, double[] at) {
        if (solver.place(at) != PoseSolver.ASSEMBLED) {
            throw new IllegalStateException("a pose found by the search does not assemble");
        }
        solver.loadWeights(masses);
        solver.solve(fixed);
        double tipping = tipping();
        solver.loads().clear();
        solver.loadAt(hook, 0, -Linkage.GRAVITY);
        solver.solve(unit);
        double hydraulic = limits.largestOnCylinders(fixed, unit);
        String hydraulicLimit = limits.name(limits.governing());
        double byHydraulic = HYDRAULIC_SHARE * hydraulic;
        double byTipping = Double.isNaN(tipping) ? Double.POSITIVE_INFINITY : TIPPING_SHARE * tipping;
        return new LiftPoint(
                radius,
                height,
                Math.min(byHydraulic, byTipping),
                byTipping < byHydraulic ? "tipping" : "hydraulic",
                hydraulic,
                hydraulicLimit,
                tipping,
                at);
    }

    /** Payload that balances the machine on the line: 0 where it tips without, NaN where no payload tips it; in kg. */
    private double tipping() {
        Machine machine = front.machineOrFault();
        solver.ground(false, ground);
        ground.addWeight(machine.swinging());
        ground.addWeight(
                machine.fixed().mass(),
                question.overSide() ? 0 : machine.fixed().cg().x());
        double moment = ground.momentAbout(line);
        double arm = hook.x(solver.pose()) - line;
        return moment < 0 ? 0 : arm > 0 ? moment / (Linkage.GRAVITY * arm) : Double.NaN;
    }
}
