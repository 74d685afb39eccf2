package org.rodside.statics;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.rodside.kinematics.DensePoseSolver;
import org.rodside.kinematics.Mechanism;
import org.rodside.kinematics.MotionBuffer;
import org.rodside.kinematics.PoseBuffer;
import org.rodside.kinematics.PoseSolver;
import org.rodside.kinematics.RandomLinkage;
import org.rodside.kinematics.StagedPoseSolver;

/** Closed form against Newton on all equations, moment sums against one dense system, on linkages nobody tuned. */
class TwoWaysTest {

    /** The two ways agree to this; in m for lengths of some metres. */
    private static final double LENGTH = 1e-9;

    /** The two ways agree to this share of the largest force at the pose; no unit. */
    private static final double FORCE_REL = 1e-9;

    private static final int LINKAGES = 300;
    private static final int POSES = 10;

    private double worstForce;
    private int compared;

    @Test
    void agreeOnThousandsOfPosesOfRandomLinkages() {
        for (long seed = 1; seed <= LINKAGES; seed++) {
            Mechanism mechanism = Mechanism.of(RandomLinkage.of(seed, 1 + (int) (seed % 5)));
            assertTrue(mechanism.staged(), "seed " + seed);
            compare(mechanism, seed);
        }
        assertTrue(compared > LINKAGES * POSES / 2, "only " + compared + " poses assembled");
    }

    private void compare(Mechanism mechanism, long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        PoseSolver staged = new StagedPoseSolver(mechanism);
        PoseSolver dense = new DensePoseSolver(mechanism);
        PoseBuffer one = new PoseBuffer(mechanism);
        PoseBuffer two = new PoseBuffer(mechanism);
        for (int i = 0; i < POSES; i++) {
            double[] strokes = random.doubles(mechanism.cylinders()).toArray();
            for (int c = 0; c < strokes.length; c++) {
                strokes[c] *= mechanism.stroke(c);
            }
            boolean assembled = staged.solve(strokes, one) == PoseSolver.ASSEMBLED;
            if (assembled && dense.solve(strokes, two) == PoseSolver.ASSEMBLED) {
                compared++;
                compare(mechanism, seed, random, staged, dense, one, two);
            }
        }
    }

    private void compare(
            Mechanism mechanism,
            long seed,
            SplittableRandom random,
            PoseSolver staged,
            PoseSolver dense,
            PoseBuffer one,
            PoseBuffer two) {
        String where = "seed " + seed;
        for (int pin = 0; pin < mechanism.pins(); pin++) {
            assertEquals(one.pinX(pin), two.pinX(pin), LENGTH, where);
            assertEquals(one.pinY(pin), two.pinY(pin), LENGTH, where);
        }
        double[] rates = random.doubles(mechanism.cylinders(), -0.5, 0.5).toArray();
        double[] accelerations = random.doubles(mechanism.cylinders(), -1, 1).toArray();
        MotionBuffer motion1 = new MotionBuffer(mechanism);
        MotionBuffer motion2 = new MotionBuffer(mechanism);
        staged.rates(one, rates, motion1);
        staged.accelerations(one, accelerations, motion1);
        dense.rates(one, rates, motion2);
        dense.accelerations(one, accelerations, motion2);
        for (int body = 0; body < mechanism.bodies(); body++) {
            double scale = 1 + Math.abs(motion1.alpha(body)) + motion1.omega(body) * motion1.omega(body);
            assertEquals(motion1.omega(body), motion2.omega(body), 1e-9 * scale, where);
            assertEquals(motion1.alpha(body), motion2.alpha(body), 1e-8 * scale, where);
        }
        LoadBuffer loads = new LoadBuffer(mechanism);
        Masses masses = new Masses(mechanism);
        masses.addWeights(one, loads);
        masses.addInertia(one, motion1, loads);
        loads.add(1 + random.nextInt(mechanism.bodies() - 1), random.nextDouble(), random.nextDouble(), 4e4, -7e4);
        compareForces(mechanism, where, one, loads);
    }

    private void compareForces(Mechanism mechanism, String where, PoseBuffer pose, LoadBuffer loads) {
        ForceBuffer moments = new ForceBuffer(mechanism);
        ForceBuffer system = new ForceBuffer(mechanism);
        new StagedForceSolver(mechanism).solve(pose, loads, moments);
        new DenseForceSolver(mechanism).solve(pose, loads, system);
        double scale = 0;
        for (int c = 0; c < mechanism.cylinders(); c++) {
            scale = Math.max(scale, Math.abs(system.cylinder(c)));
        }
        for (int c = 0; c < mechanism.cylinders(); c++) {
            assertEquals(system.cylinder(c), moments.cylinder(c), FORCE_REL * scale, where);
            worstForce = Math.max(worstForce, Math.abs(system.cylinder(c) - moments.cylinder(c)) / scale);
        }
        for (int b = 0; b < mechanism.bearings(); b++) {
            assertEquals(system.bearingX(b), moments.bearingX(b), FORCE_REL * scale, where);
            assertEquals(system.bearingY(b), moments.bearingY(b), FORCE_REL * scale, where);
        }
    }
}
