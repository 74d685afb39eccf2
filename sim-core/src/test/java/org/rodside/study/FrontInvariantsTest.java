package org.rodside.study;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.rodside.io.LinkageReader;
import org.rodside.kinematics.DensePoseSolver;
import org.rodside.kinematics.Mechanism;
import org.rodside.kinematics.PoseBuffer;
import org.rodside.kinematics.PoseSolver;
import org.rodside.kinematics.StagedPoseSolver;
import org.rodside.statics.DenseForceSolver;
import org.rodside.statics.ForceBuffer;
import org.rodside.statics.LoadBuffer;
import org.rodside.statics.Masses;
import org.rodside.statics.StagedForceSolver;
import org.rodside.table.Table;

/** What must not change an answer, or must change it in a known way; both solvers on the example fronts. */
class FrontInvariantsTest {

    private static final Path FOLDER = Path.of("../linkages");
    private static final String DEMO = "sallow-22.json";

    /** Places by two ways agree to this; in m. */
    private static final double LENGTH = 1e-9;

    /** Forces by two ways agree to this share of the largest one; no unit. */
    private static final double FORCE_REL = 1e-9;

    private static final int POSES = 3000;
    private static final int MOVED_POSES = 60;
    private static final long SEED = 29;

    @TempDir
    Path folder;

    @ParameterizedTest
    @ValueSource(strings = {DEMO, "fenbrook-backhoe.json", "tarn-ridge-two-piece.json", "cullen-bank-shovel.json"})
    void bothSolversAgree(String file) {
        Mechanism mechanism = Mechanism.of(LinkageReader.read(FOLDER.resolve(file), List.of()));
        PoseSolver staged = new StagedPoseSolver(mechanism);
        PoseSolver dense = new DensePoseSolver(mechanism);
        PoseBuffer one = new PoseBuffer(mechanism);
        PoseBuffer two = new PoseBuffer(mechanism);
        SplittableRandom random = new SplittableRandom(SEED);
        int compared = 0;
        for (int i = 0; i < POSES; i++) {
            double[] strokes = random.doubles(mechanism.cylinders()).toArray();
            for (int c = 0; c < strokes.length; c++) {
                strokes[c] *= mechanism.stroke(c);
            }
            if (staged.solve(strokes, one) == PoseSolver.ASSEMBLED
                    && dense.solve(strokes, two) == PoseSolver.ASSEMBLED) {
                compared++;
                String where = file + " seed " + SEED + " pose " + i;
                for (int pin = 0; pin < mechanism.pins(); pin++) {
                    assertEquals(two.pinX(pin), one.pinX(pin), LENGTH, where);
                    assertEquals(two.pinY(pin), one.pinY(pin), LENGTH, where);
                }
                forces(mechanism, one, where);
            }
        }
        assertTrue(compared > POSES / 2, file + ": only " + compared + " poses compared");
    }

    private static void forces(Mechanism mechanism, PoseBuffer pose, String where) {
        LoadBuffer loads = new LoadBuffer(mechanism);
        new Masses(mechanism).addWeights(pose, loads);
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
        }
        for (int b = 0; b < mechanism.bearings(); b++) {
            assertEquals(system.bearingX(b), moments.bearingX(b), FORCE_REL * scale, where);
            assertEquals(system.bearingY(b), moments.bearingY(b), FORCE_REL * scale, where);
        }
    }

    @ParameterizedTest
    @CsvSource({"1, 370", "-1, 0", "-1, 250"})
    void diggingForcesStayWhenTheMachineIsMovedOrMirrored(int sign, double shift) throws IOException {
        Digging plain = new Digging(front(FOLDER.resolve(DEMO)), Edge.TIP);
        Digging moved = new Digging(front(moved(sign, shift)), Edge.TIP);
        SplittableRandom random = new SplittableRandom(SEED);
        for (int i = 0; i < MOVED_POSES; i++) {
            double[] at = random.doubles(3).toArray();
            String where = "seed " + SEED + " pose " + i;
            same(plain.curlAt(at, false), moved.curlAt(at, false), sign, where);
            same(
                    plain.crowdAt(at, false).orElseThrow(),
                    moved.crowdAt(at, false).orElseThrow(),
                    sign,
                    where);
        }
    }

    private static void same(DigForce plain, DigForce moved, int sign, String where) {
        assertEquals(plain.force(), moved.force(), FORCE_REL * (1e3 + plain.force()), where);
        String limit = plain.limit();
        if (sign < 0 && limit.startsWith("tipping.")) {
            limit = limit.endsWith("front") ? "tipping.rear" : "tipping.front";
        }
        assertEquals(limit, moved.limit(), where);
    }

    @Test
    void doubleLoadsGiveDoubleForces() {
        Front front = front(FOLDER.resolve(DEMO));
        FrontSolver solver = new FrontSolver(front);
        assertEquals(PoseSolver.ASSEMBLED, solver.place(new double[] {0.4, 0.5, 0.3}));
        ForceBuffer once = new ForceBuffer(front.mechanism());
        ForceBuffer twice = new ForceBuffer(front.mechanism());
        solver.loadWeights(front.masses());
        solver.loadAt(front.tip(), -3e4, 5e4);
        solver.solve(once);
        solver.loadWeights(front.masses());
        LoadBuffer loads = solver.loads();
        front.masses().addWeights(solver.pose(), loads);
        solver.loadAt(front.tip(), -6e4, 1e5);
        solver.solve(twice);
        for (int c = 0; c < front.mechanism().cylinders(); c++) {
            double force = once.cylinder(c);
            assertEquals(2 * force, twice.cylinder(c), FORCE_REL * Math.abs(force));
        }
    }

    @Test
    void aLimitBrokenWithoutToolForceIsNamed() {
        Front front = Front.of(LinkageReader.read(
                FOLDER.resolve(DEMO), List.of("cylinders.boom.working=1", "cylinders.boom.relief=2")));
        DigForce force = new Digging(front, Edge.TIP).curlAt(new double[] {0.4, 0.3, 0.3}, false);
        assertEquals(0, force.force());
        assertEquals("boom.relief.cap", force.limit());
    }

    @Test
    void threadsGiveTheSameRows() {
        Front front = front(FOLDER.resolve(DEMO));
        Table one = rows(front, 1);
        Table three = rows(front, 3);
        assertEquals(21 * 21 * 21, one.rows());
        assertEquals(one.rows(), three.rows());
        for (int column = 0; column < one.columns().size(); column++) {
            assertArrayEquals(one.column(column), three.column(column));
        }
    }

    private static Table rows(Front front, int threads) {
        DigSweep sweep = new DigSweep(front, Edge.TIP, false, 21);
        Table table = new Table(sweep.columns());
        sweep.rows(table, threads, done -> {});
        return table;
    }

    private static Front front(Path file) {
        return Front.of(LinkageReader.read(file, List.of()));
    }

    /** The demo front with every x replaced by sign·x + shift; shift in mm. */
    private Path moved(int sign, double shift) throws IOException {
        ObjectMapper json = new ObjectMapper();
        ObjectNode tree = (ObjectNode) json.readTree(FOLDER.resolve(DEMO).toFile());
        tree.get("pins").forEach(point -> move(point, sign, shift));
        for (JsonNode link : tree.get("links")) {
            move(link.path("cg"), sign, shift);
            link.path("points").forEach(point -> move(point, sign, shift));
        }
        ObjectNode machine = (ObjectNode) tree.get("machine");
        move(machine.at("/swinging/cg"), sign, shift);
        move(machine.at("/fixed/cg"), sign, shift);
        ObjectNode tipping = (ObjectNode) machine.get("tipping");
        double front = sign * tipping.get("front").asDouble() + shift;
        double rear = sign * tipping.get("rear").asDouble() + shift;
        tipping.put("front", Math.max(front, rear));
        tipping.put("rear", Math.min(front, rear));
        Path file = folder.resolve("moved.json");
        json.writeValue(file.toFile(), tree);
        return file;
    }

    private static void move(JsonNode point, int sign, double shift) {
        if (point instanceof ArrayNode place) {
            place.set(
                    0,
                    new com.fasterxml.jackson.databind.node.DoubleNode(
                            sign * place.get(0).asDouble() + shift));
        }
    }
}
