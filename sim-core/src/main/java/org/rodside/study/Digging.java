package org.rodside.study;

import java.util.Arrays;
import java.util.Optional;
import org.rodside.kinematics.PoseSolver;
import org.rodside.model.InputException;

/** Digging forces: at one pose, and rated as SAE J1179 (at the lip: ISO 6015) has them (theory S6, S7). */
public final class Digging {

    /** Limits that meet on a ridge do so within this share of the force; no unit. */
    private static final double RIDGE = 1e-7;

    private final Front front;
    private final FrontSolver solver;
    private final Edge edge;

    /** Curl stroke of rated forces once it is known. */
    private double curlStroke = Double.NaN;

    public Digging(Front front, Edge edge) {
        this.front = front;
        this.edge = edge;
        solver = new FrontSolver(front);
    }

    /** The largest curl force at a pose; an error where the pose does not assemble. */
    public DigForce curlAt(double[] fractions, boolean ideal) {
        return at(fractions, front.curl(), ideal);
    }

    /** The largest crowd force at a pose; empty where the linkage has no crowd cylinder. */
    public Optional<DigForce> crowdAt(double[] fractions, boolean ideal) {
        return front.crowd() < 0 ? Optional.empty() : Optional.of(at(fractions, front.crowd(), ideal));
    }

    private DigForce at(double[] fractions, int duty, boolean ideal) {
        int status = solver.place(fractions);
        if (status != PoseSolver.ASSEMBLED) {
            throw PoseStudy.cannotStand(front, fractions, status);
        }
        DigSolver dig = new DigSolver(solver, edge.of(front), duty, ideal);
        double force = dig.force();
        return new DigForce(force, dig.limits().name(dig.governing()), fractions.clone());
    }

    /** Rated curl force; an error where no pose of the stroke box assembles. */
    public DigForce ratedCurl() {
        return rated(front.curl());
    }

    /** Rated crowd force; empty where the linkage has no crowd cylinder. */
    public Optional<DigForce> ratedCrowd() {
        return front.crowd() < 0 ? Optional.empty() : Optional.of(rated(front.crowd()));
    }

    private DigForce rated(int duty) {
        if (Double.isNaN(curlStroke)) {
            curlStroke = new CurlStroke(front, new DigSolver(solver, edge.of(front), front.curl(), true)).find();
        }
        double[] fixed = new double[front.mechanism().cylinders()];
        Arrays.fill(fixed, Double.NaN);
        fixed[front.curl()] = curlStroke;
        DigSolver dig = new DigSolver(solver, edge.of(front), duty, true);
        Optimum best = Double.isNaN(curlStroke)
                ? new Optimum(Double.NaN, fixed)
                : new BoxMaximum(fixed).find(dig.asObjective());
        if (!best.exists()) {
            throw new InputException("cylinders: no pose of the stroke box gives a digging force; see 'check'");
        }
        double force = dig.force(best.at());
        return new DigForce(force, dig.limits().name(nearestTheTool(dig.limits())), best.at());
    }

    /** Of the limits met at a rated pose that of the cylinder nearest the tool. */
    private int nearestTheTool(LimitSolver limits) {
        SweepGrid order = new SweepGrid(front.mechanism(), 2);
        for (int axis = order.axes() - 1; axis >= 0; axis--) {
            for (int line = 2 * order.cylinder(axis); line <= 2 * order.cylinder(axis) + 1; line++) {
                if (limits.meets(line, RIDGE)) {
                    return line;
                }
            }
        }
        return limits.governing();
    }
}
