package org.rodside.study;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.rodside.hydraulics.CylinderPressure;
import org.rodside.kinematics.PoseSolver;
import org.rodside.model.Cylinder;
import org.rodside.model.InputException;
import org.rodside.model.Linkage;
import org.rodside.model.Sides;
import org.rodside.statics.ForceBuffer;
import org.rodside.statics.GroundBuffer;

/** One pose in full: places, forces, pressures, ground, and the force polygon (theory S1 to S6). */
public final class PoseStudy {

    private final Front front;
    private final FrontSolver solver;

    private PoseStudy(Front front) {
        this.front = front;
        solver = new FrontSolver(front);
    }

    /**
     * Answers a question about one pose.
     *
     * @throws InputException where the pose does not assemble, or the linkage file lacks what the question needs
     */
    public static PoseAnswer answer(Front front, PoseQuestion question) {
        return new PoseStudy(front).answer(question);
    }

    /** The error of a pose that does not assemble. */
    static InputException cannotStand(Front front, double[] fractions, int body) {
        StringBuilder pose = new StringBuilder();
        for (int c = 0; c < fractions.length; c++) {
            pose.append(c == 0 ? "" : ",")
                    .append(front.mechanism().cylinderName(c))
                    .append('=')
                    .append(fractions[c]);
        }
        return new InputException("pose " + pose + ": the linkage does not assemble there, link '"
                + front.mechanism().bodyName(body) + "' cannot be placed; 'check' lists the strokes that do");
    }

    private PoseAnswer answer(PoseQuestion question) {
        int status = solver.place(question.fractions());
        if (status != PoseSolver.ASSEMBLED) {
            throw cannotStand(front, question.fractions(), status);
        }
        ForceBuffer forces = new ForceBuffer(front.mechanism());
        load(question);
        solver.solve(forces);
        Optional<PoseAnswer.Ground> ground = ground();
        return new PoseAnswer(
                front,
                question.fractions().clone(),
                solver.pose(),
                forces,
                pressures(forces, question.driving()),
                ground,
                polygon(question));
    }

    private void load(PoseQuestion question) {
        solver.loadWeights(front.masses());
        loadPayload(question);
        if (question.forceX() != 0 || question.forceY() != 0) {
            solver.loadAt(front.tip(), question.forceX(), question.forceY());
        }
    }

    private void loadPayload(PoseQuestion question) {
        if (question.payload() != 0) {
            solver.loadAt(front.fill(), 0, -question.payload() * Linkage.GRAVITY);
        }
    }

    private Optional<PoseAnswer.Ground> ground() {
        if (front.machine().isEmpty()) {
            return Optional.empty();
        }
        GroundBuffer sum = new GroundBuffer();
        solver.ground(true, sum);
        return Optional.of(new PoseAnswer.Ground(sum.normal(), sum.horizontal(), sum.resultantX()));
    }

    private List<Sides> pressures(ForceBuffer forces, int driving) {
        List<Sides> pressures = new ArrayList<>();
        List<Cylinder> cylinders = front.linkage().cylinders();
        for (int c = 0; c < cylinders.size(); c++) {
            CylinderPressure pressure = CylinderPressure.of(cylinders.get(c), false);
            double force = forces.cylinder(c);
            pressures.add(c == driving ? pressure.driving(force) : pressure.of(force));
        }
        return pressures;
    }

    private List<PoseAnswer.Direction> polygon(PoseQuestion question) {
        List<PoseAnswer.Direction> polygon = new ArrayList<>();
        if (question.directions() == 0) {
            return polygon;
        }
        LimitSolver limits = new LimitSolver(front, -1, false);
        ForceBuffer fixed = new ForceBuffer(front.mechanism());
        ForceBuffer unit = new ForceBuffer(front.mechanism());
        GroundBuffer fixedGround = new GroundBuffer();
        GroundBuffer unitGround = new GroundBuffer();
        solver.loadWeights(front.masses());
        loadPayload(question);
        solver.solve(fixed);
        if (limits.stability()) {
            solver.ground(true, fixedGround);
        }
        for (int i = 0; i < question.directions(); i++) {
            double angle = 2 * Math.PI * i / question.directions();
            solver.loads().clear();
            solver.loadAt(front.tip(), -Math.cos(angle), -Math.sin(angle));
            solver.solve(unit);
            if (limits.stability()) {
                solver.ground(false, unitGround);
            }
            double force = limits.largest(fixed, unit, fixedGround, unitGround);
            polygon.add(new PoseAnswer.Direction(angle, force, limits.name(limits.governing())));
        }
        return polygon;
    }
}
