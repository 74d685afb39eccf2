package org.rodside.statics;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import java.nio.file.Path;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.rodside.io.LinkageReader;
import org.rodside.kinematics.DensePoseSolver;
import org.rodside.kinematics.Mechanism;
import org.rodside.kinematics.MotionBuffer;
import org.rodside.kinematics.PoseBuffer;
import org.rodside.kinematics.PoseSolver;
import org.rodside.model.Linkage;

/** Linkages without closed-form steps: a cylinder on a coupler, a link on three cylinders, a pin that joins cylinders only. */
class OddLinkagesTest {

    /** Pin distances kept to this; in m. */
    private static final double LENGTH = 1e-9;

    /** Stroke by which rates and virtual work are differenced; in m. Error of a central difference: its square. */
    private static final double STEP = 1e-5;

    /** Central differences of some metres by {@link #STEP}, against the analytic rate; no unit. */
    private static final double DIFFERENCE = 1e-7;

    private static final int POSES = 50;

    private Mechanism mechanism;
    private PoseSolver solver;

    @ParameterizedTest
    @ValueSource(strings = {"coupler-driven", "floating-link", "cylinders-share-a-pin"})
    void keepLengthsRatesAndVirtualWork(String name) {
        mechanism = Mechanism.of(LinkageReader.read(Path.of("src/test/resources/odd", name + ".json"), List.of()));
        assertFalse(mechanism.staged());
        solver = mechanism.newSolver();
        SplittableRandom random = new SplittableRandom(11);
        for (int i = 0; i < POSES; i++) {
            double[] strokes = new double[mechanism.cylinders()];
            for (int c = 0; c < strokes.length; c++) {
                strokes[c] = random.nextDouble() * mechanism.stroke(c);
            }
            PoseBuffer pose = pose(strokes);
            lengths(pose, strokes);
            for (int c = 0; c < strokes.length; c++) {
                rates(strokes, c);
            }
            work(strokes, pose);
        }
    }

    private PoseBuffer pose(double[] strokes) {
        PoseBuffer pose = new PoseBuffer(mechanism);
        assertEquals(PoseSolver.ASSEMBLED, solver.solve(strokes, pose));
        return pose;
    }

    private PoseBuffer moved(double[] strokes, int cylinder, double by) {
        double[] other = strokes.clone();
        other[cylinder] += by;
        return pose(other);
    }

    private void lengths(PoseBuffer pose, double[] strokes) {
        for (int body = 0; body < mechanism.bodies(); body++) {
            for (int a : mechanism.pinsOf(body)) {
                for (int b : mechanism.pinsOf(body)) {
                    double drawn = Math.hypot(
                            mechanism.drawnX(a) - mechanism.drawnX(b), mechanism.drawnY(a) - mechanism.drawnY(b));
                    double now = Math.hypot(pose.pinX(a) - pose.pinX(b), pose.pinY(a) - pose.pinY(b));
                    assertEquals(drawn, now, LENGTH);
                }
            }
        }
        for (int c = 0; c < strokes.length; c++) {
            double span = Math.hypot(
                    pose.pinX(mechanism.rodPin(c)) - pose.pinX(mechanism.capPin(c)),
                    pose.pinY(mechanism.rodPin(c)) - pose.pinY(mechanism.capPin(c)));
            assertEquals(mechanism.retracted(c) + strokes[c], span, LENGTH);
        }
    }

    private void rates(double[] strokes, int cylinder) {
        double[] unit = new double[strokes.length];
        unit[cylinder] = 1;
        PoseBuffer pose = pose(strokes);
        MotionBuffer motion = new MotionBuffer(mechanism);
        new DensePoseSolver(mechanism).rates(pose, unit, motion);
        PoseBuffer more = moved(strokes, cylinder, STEP);
        PoseBuffer less = moved(strokes, cylinder, -STEP);
        for (int pin = 0; pin < mechanism.pins(); pin++) {
            double scale = 1 + Math.abs(motion.pinVx(pin)) + Math.abs(motion.pinVy(pin));
            assertEquals((more.pinX(pin) - less.pinX(pin)) / (2 * STEP), motion.pinVx(pin), DIFFERENCE * scale * 10);
            assertEquals((more.pinY(pin) - less.pinY(pin)) / (2 * STEP), motion.pinVy(pin), DIFFERENCE * scale * 10);
        }
        accelerations(strokes, cylinder, unit, pose);
    }

    private void accelerations(double[] strokes, int cylinder, double[] unit, PoseBuffer pose) {
        MotionBuffer here = new MotionBuffer(mechanism);
        MotionBuffer next = new MotionBuffer(mechanism);
        MotionBuffer last = new MotionBuffer(mechanism);
        solver.rates(pose, unit, here);
        solver.accelerations(pose, new double[strokes.length], here);
        solver.rates(moved(strokes, cylinder, STEP), unit, next);
        solver.rates(moved(strokes, cylinder, -STEP), unit, last);
        for (int pin = 0; pin < mechanism.pins(); pin++) {
            double scale = 1 + Math.abs(here.pinAx(pin)) + Math.abs(here.pinAy(pin));
            assertEquals((next.pinVx(pin) - last.pinVx(pin)) / (2 * STEP), here.pinAx(pin), 1e-5 * scale);
            assertEquals((next.pinVy(pin) - last.pinVy(pin)) / (2 * STEP), here.pinAy(pin), 1e-5 * scale);
        }
    }

    /** F·ds of every cylinder against the fall of every weight. */
    private void work(double[] strokes, PoseBuffer pose) {
        LoadBuffer loads = new LoadBuffer(mechanism);
        Masses masses = new Masses(mechanism);
        masses.addWeights(pose, loads);
        ForceBuffer forces = new ForceBuffer(mechanism);
        new DenseForceSolver(mechanism).solve(pose, loads, forces);
        for (int c = 0; c < strokes.length; c++) {
            double rise =
                    (energy(masses, moved(strokes, c, STEP)) - energy(masses, moved(strokes, c, -STEP))) / (2 * STEP);
            assertEquals(rise, forces.cylinder(c), 1e-6 * (1e4 + Math.abs(rise)), "cylinder " + c);
        }
    }

    private double energy(Masses masses, PoseBuffer pose) {
        double sum = 0;
        for (int body = 1; body < mechanism.bodies(); body++) {
            sum += masses.mass(body) * pose.y(body, masses.cgX(body), masses.cgY(body));
        }
        for (int pin = 0; pin < mechanism.pins(); pin++) {
            sum += masses.eyeMass(pin) * pose.pinY(pin);
        }
        return sum * Linkage.GRAVITY;
    }
}
