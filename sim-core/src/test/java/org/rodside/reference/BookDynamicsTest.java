package org.rodside.reference;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.rodside.units.Unit.INCH;
import static org.rodside.units.Unit.POUND_FORCE;

import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.rodside.kinematics.DensePoseSolver;
import org.rodside.kinematics.Mechanism;
import org.rodside.kinematics.MotionBuffer;
import org.rodside.kinematics.PoseBuffer;
import org.rodside.kinematics.PoseSolver;
import org.rodside.kinematics.StagedPoseSolver;
import org.rodside.reference.Example.Forces;
import org.rodside.statics.DenseForceSolver;
import org.rodside.statics.ForceBuffer;
import org.rodside.statics.ForceSolver;
import org.rodside.statics.LoadBuffer;
import org.rodside.statics.Masses;
import org.rodside.statics.StagedForceSolver;
import org.rodside.study.Front;
import org.rodside.study.Place;
import org.rodside.study.PoseAnswer;
import org.rodside.study.PoseQuestion;
import org.rodside.study.PoseStudy;

/**
 * Inverse dynamics of a closed loop against Norton, Design of Machinery, example 11-3 (dimensions seen, the rest from
 * memory): crank at 60°, 25 rad/s, -40 rad/s², no gravity, 80 lb at 330° on the coupler, +120 lb·in on the rocker. A
 * cylinder on a crank pin of its own stands in for the book's torque: the torque is the cylinder's moment about O2, and
 * the book's force of the ground on the crank is the sum of O2 and cylinder. Masses of the file are the book's blobs
 * (lb·s²/in) times standard gravity, so inertia forces come out in the book's pounds.
 */
class BookDynamicsTest {

    /** Half of the last of two printed decimals; in degrees, rad/s, rad/s², lb and lb·in. */
    private static final double TWO_DECIMALS = 0.005;

    /** Half of the last digit of α₃ = 120.9 rad/s². */
    private static final double ONE_DECIMAL = 0.05;

    /** Time between poses whose differences are taken: cuts off less than a rounded digit; in s. */
    private static final double INSTANT = 3e-5;

    private static final double OMEGA = 25;
    private static final double ALPHA = -40;
    private static final double TOOL = POUND_FORCE.toSi(80);
    private static final double TOOL_X = TOOL * Math.cos(Math.toRadians(330));
    private static final double TOOL_Y = TOOL * Math.sin(Math.toRadians(330));
    private static final double TORQUE = POUND_FORCE.toSi(1) * INCH.toSi(120);

    private final Example example = new Example("norton-11-3");
    private final Mechanism mechanism = example.mechanism;
    private final MotionBuffer motion = new MotionBuffer(mechanism);
    private final PoseBuffer pose = new PoseBuffer(mechanism);

    private PoseSolver poses(boolean dense) {
        return dense ? new DensePoseSolver(mechanism) : new StagedPoseSolver(mechanism);
    }

    private ForceSolver forces(boolean dense) {
        return dense ? new DenseForceSolver(mechanism) : new StagedForceSolver(mechanism);
    }

    /**
     * Drives the stroke so that the crank turns as the book says: its motion is linear in the stroke's.
     *
     * @return rate and acceleration of the stroke; in m/s and m/s²
     */
    private double[] move(PoseSolver solver) {
        int crank = mechanism.body("crank");
        assertEquals(PoseSolver.ASSEMBLED, solver.solve(example.strokes(example.drawn()), pose));
        solver.rates(pose, new double[] {1}, motion);
        double rate = OMEGA / motion.omega(crank);
        solver.rates(pose, new double[] {rate}, motion);
        solver.accelerations(pose, new double[] {0}, motion);
        double without = motion.alpha(crank);
        solver.accelerations(pose, new double[] {1}, motion);
        double each = motion.alpha(crank) - without;
        double acceleration = (ALPHA - without) / each;
        solver.accelerations(pose, new double[] {acceleration}, motion);
        assertEquals(OMEGA, motion.omega(crank), 1e-9);
        assertEquals(ALPHA, motion.alpha(crank), 1e-9);
        return new double[] {rate, acceleration};
    }

    @ParameterizedTest
    @ValueSource(booleans = {false, true})
    void motion(boolean dense) {
        move(poses(dense));
        int coupler = mechanism.body("coupler");
        int rocker = mechanism.body("rocker");
        assertEquals(60, example.direction(pose, "O2", "A"), TWO_DECIMALS);
        assertEquals(20.92, example.direction(pose, "A", "B"), TWO_DECIMALS);
        assertEquals(104.41, example.direction(pose, "O4", "B"), TWO_DECIMALS);
        assertEquals(-5.87, motion.omega(coupler), TWO_DECIMALS);
        assertEquals(7.93, motion.omega(rocker), TWO_DECIMALS);
        assertEquals(120.9, motion.alpha(coupler), ONE_DECIMAL);
        assertEquals(276.29, motion.alpha(rocker), TWO_DECIMALS);
    }

    /** The same motion by differences of poses along the stroke's path: the stroke's own acceleration is right too. */
    @ParameterizedTest
    @ValueSource(booleans = {false, true})
    void motionByDifferences(boolean dense) {
        PoseSolver solver = poses(dense);
        double[] drive = move(solver);
        double[] before = turns(solver, drive, -INSTANT);
        double[] now = turns(solver, drive, 0);
        double[] after = turns(solver, drive, INSTANT);
        double[] omega = {OMEGA, -5.87, 7.93};
        double[] alpha = {ALPHA, 120.9, 276.29};
        for (int i = 0; i < omega.length; i++) {
            assertEquals(omega[i], (after[i] - before[i]) / (2 * INSTANT), TWO_DECIMALS);
            assertEquals(alpha[i], (after[i] - 2 * now[i] + before[i]) / (INSTANT * INSTANT), TWO_DECIMALS);
        }
    }

    /** Turns of crank, coupler and rocker at a time from the book's pose; in rad and s. */
    private double[] turns(PoseSolver solver, double[] drive, double time) {
        double[] strokes = example.strokes(example.drawn());
        strokes[0] += drive[0] * time + drive[1] * time * time / 2;
        PoseBuffer there = new PoseBuffer(mechanism);
        assertEquals(PoseSolver.ASSEMBLED, solver.solve(strokes, there));
        return Stream.of("crank", "coupler", "rocker")
                .mapToDouble(link -> there.turn(mechanism.body(link)))
                .toArray();
    }

    @ParameterizedTest
    @ValueSource(booleans = {false, true})
    void forcesAndTorque(boolean dense) {
        move(poses(dense));
        LoadBuffer loads = new LoadBuffer(mechanism);
        new Masses(mechanism).addInertia(pose, motion, loads);
        Place tool = example.front.tip();
        loads.add(tool.body(), tool.x(pose), tool.y(pose), TOOL_X, TOOL_Y);
        loads.addMoment(mechanism.body("rocker"), TORQUE);
        ForceBuffer out = new ForceBuffer(mechanism);
        forces(dense).solve(pose, loads, out);
        compare(new Forces(mechanism, pose, out), 0);
    }

    /**
     * The torque as a weight on an arm, answered as a static pose, and inertia added: forces are linear in the loads. The
     * weight of 12 lb goes into O4 as well.
     */
    @Test
    void torqueAsAWeight() {
        move(poses(false));
        LoadBuffer loads = new LoadBuffer(mechanism);
        new Masses(mechanism).addInertia(pose, motion, loads);
        ForceBuffer out = new ForceBuffer(mechanism);
        forces(false).solve(pose, loads, out);
        Example weighted = new Example("norton-11-3-torque");
        Front front = weighted.front;
        PoseAnswer still = PoseStudy.answer(front, new PoseQuestion(weighted.drawn(), TOOL_X, TOOL_Y, 0, -1, 0));
        out.add(1, still.forces());
        compare(new Forces(mechanism, pose, out), 12);
    }

    private void compare(Forces forces, double weightOnRocker) {
        double crankX = forces.x("O2", "crank") + forces.x("Q", "crank");
        double crankY = forces.y("O2", "crank") + forces.y("Q", "crank");
        pounds(-117.65, crankX, "F12 x");
        pounds(-107.84, crankY, "F12 y");
        pounds(118.13, forces.x("A", "crank"), "F32 x");
        pounds(100.34, forces.y("A", "crank"), "F32 y");
        pounds(-1.34, forces.x("B", "coupler"), "F43 x");
        pounds(87.43, forces.y("B", "coupler"), "F43 y");
        pounds(-20.23, forces.x("O4", "rocker"), "F14 x");
        pounds(77.71 + weightOnRocker, forces.y("O4", "rocker"), "F14 y");
        int pin = mechanism.pin("Q");
        double torque = pose.pinX(pin) * forces.y("Q", "crank") - pose.pinY(pin) * forces.x("Q", "crank");
        assertEquals(243.23, INCH.fromSi(POUND_FORCE.fromSi(torque)), TWO_DECIMALS, "T12");
    }

    private static void pounds(double printed, double force, String what) {
        assertEquals(printed, POUND_FORCE.fromSi(force), TWO_DECIMALS, what);
    }
}
