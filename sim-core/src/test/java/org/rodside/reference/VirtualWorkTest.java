package org.rodside.reference;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.SplittableRandom;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.rodside.io.LinkageReader;
import org.rodside.kinematics.Mechanism;
import org.rodside.kinematics.PoseBuffer;
import org.rodside.kinematics.PoseSolver;
import org.rodside.model.Cylinder;
import org.rodside.model.Link;
import org.rodside.model.Linkage;
import org.rodside.statics.ForceBuffer;
import org.rodside.statics.ForceSolver;
import org.rodside.statics.LoadBuffer;
import org.rodside.statics.Masses;

/**
 * Cylinder forces a second way: virtual work. A cylinder's push is what the energy of all loads gains for each metre of its
 * stroke, by differences of solved poses; no lever arm, no velocity and no force balance goes into it.
 */
class VirtualWorkTest {

    /** Step of the differences as a share of the stroke: their error is of the fourth order in it. */
    private static final double STEP = 1e-4;

    /** Three points must agree with five to this share, else a dead centre is too near to take differences. */
    private static final double SETTLED = 1e-5;

    /** The two ways agree to this share of the largest load or cylinder force; the differences set it. */
    private static final double FORCE_REL = 1e-8;

    /** So many of the random poses are compared at least; the loosest file assembles at a sixth of its strokes. */
    private static final int ENOUGH = 5;

    /** Seeded random poses of every file beside the drawn one. */
    private static final int POSES = 40;

    /** Largest force in either axis put on every link; in N. */
    private static final double LOAD = 5e4;

    private Linkage linkage;
    private Mechanism mechanism;
    private PoseSolver solver;
    private PoseBuffer pose;
    private double[] forceX;
    private double[] forceY;

    static Stream<Path> files() throws IOException {
        try (Stream<Path> books = Files.list(Example.FOLDER);
                Stream<Path> ours = Files.list(Path.of("../linkages"))) {
            return Stream.concat(books, ours)
                    .filter(path -> path.toString().endsWith(".json")
                            && !path.toString().endsWith("-pass.json"))
                    .sorted()
                    .toList()
                    .stream();
        }
    }

    @ParameterizedTest
    @MethodSource("files")
    void agrees(Path file) {
        linkage = LinkageReader.read(file, List.of());
        mechanism = Mechanism.of(linkage);
        solver = mechanism.newSolver();
        pose = new PoseBuffer(mechanism);
        SplittableRandom random = new SplittableRandom(11);
        double[] strokes = new double[mechanism.cylinders()];
        for (int c = 0; c < strokes.length; c++) {
            strokes[c] = mechanism.drawnLength(c) - mechanism.retracted(c);
        }
        assertTrue(compare(strokes, random, file + " drawn"), "the drawn pose assembles");
        int compared = 0;
        for (int i = 0; i < POSES; i++) {
            for (int c = 0; c < strokes.length; c++) {
                strokes[c] = random.nextDouble() * mechanism.stroke(c);
            }
            compared += compare(strokes, random, file + " seed 11 pose " + i) ? 1 : 0;
        }
        assertTrue(compared >= ENOUGH, file + ": only " + compared + " poses assembled");
    }

    /** Compares at one pose; false where it, or a pose beside it, does not assemble. */
    private boolean compare(double[] strokes, SplittableRandom random, String where) {
        forceX = random.doubles(mechanism.bodies(), -LOAD, LOAD).toArray();
        forceY = random.doubles(mechanism.bodies(), -LOAD, LOAD).toArray();
        if (solver.solve(strokes, pose) != PoseSolver.ASSEMBLED) {
            return false;
        }
        ForceBuffer forces = new ForceBuffer(mechanism);
        ForceSolver.of(mechanism).solve(pose, loads(), forces);
        double[] pushes = new double[strokes.length];
        double scale = LOAD;
        for (int c = 0; c < strokes.length; c++) {
            pushes[c] = slope(strokes, c);
            scale = Double.isFinite(pushes[c]) ? Math.max(scale, Math.abs(pushes[c])) : scale;
        }
        boolean all = true;
        for (int c = 0; c < strokes.length; c++) {
            all &= Double.isFinite(pushes[c]);
            if (Double.isFinite(pushes[c])) {
                assertEquals(pushes[c], forces.cylinder(c), FORCE_REL * scale, where + " " + mechanism.cylinderName(c));
            }
        }
        return all;
    }

    private LoadBuffer loads() {
        LoadBuffer loads = new LoadBuffer(mechanism);
        new Masses(mechanism).addWeights(pose, loads);
        for (int body = 1; body < mechanism.bodies(); body++) {
            int pin = mechanism.pinsOf(body)[mechanism.pinsOf(body).length - 1];
            loads.add(body, pose.pinX(pin), pose.pinY(pin), forceX[body], forceY[body]);
        }
        return loads;
    }

    /** Five-point difference of the energy over one stroke; in N, NaN where no pose is or the differences are unsettled. */
    private double slope(double[] strokes, int cylinder) {
        double h = STEP * mechanism.stroke(cylinder);
        double near = energy(strokes, cylinder, h) - energy(strokes, cylinder, -h);
        double far = energy(strokes, cylinder, 2 * h) - energy(strokes, cylinder, -2 * h);
        double slope = (8 * near - far) / (12 * h);
        return Math.abs(slope - near / (2 * h)) < SETTLED * (LOAD + Math.abs(slope)) ? slope : Double.NaN;
    }

    /** Energy of all dead loads with one stroke changed; in J, NaN where the pose does not assemble. */
    private double energy(double[] strokes, int cylinder, double change) {
        double[] moved = strokes.clone();
        moved[cylinder] += change;
        if (solver.solve(moved, pose) != PoseSolver.ASSEMBLED) {
            return Double.NaN;
        }
        double energy = 0;
        for (int body = 1; body < mechanism.bodies(); body++) {
            Link link = linkage.links().get(body - 1);
            double height = pose.y(body, link.cg().x(), link.cg().y());
            energy += link.mass() * Linkage.GRAVITY * height;
            int pin = mechanism.pin(link.pins().get(link.pins().size() - 1));
            energy -= forceX[body] * pose.pinX(pin) + forceY[body] * pose.pinY(pin);
        }
        for (Cylinder c : linkage.cylinders()) {
            double half = 0.5 * c.count() * c.mass() * Linkage.GRAVITY;
            energy += half * (pose.pinY(mechanism.pin(c.capPin())) + pose.pinY(mechanism.pin(c.rodPin())));
        }
        return energy;
    }
}
