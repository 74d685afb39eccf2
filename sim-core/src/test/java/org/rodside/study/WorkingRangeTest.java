package org.rodside.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.rodside.io.LinkageReader;
import org.rodside.kinematics.PoseSolver;

class WorkingRangeTest {

    /** Dimensions are promised to 0.1 mm; in m. */
    private static final double DIMENSION = 1e-4;

    /** The outline is promised to 1 mm; in m. */
    private static final double OUTLINE = 1e-3;

    private static final int POSES = 20_000;

    private static Front front(String file, String... overrides) {
        return Front.of(LinkageReader.read(Path.of("../linkages", file), List.of(overrides)));
    }

    @ParameterizedTest
    @ValueSource(
            strings = {"sallow-22.json", "fenbrook-backhoe.json", "tarn-ridge-two-piece.json", "cullen-bank-shovel.json"
            })
    void outlineHoldsEveryPoseAndTouchesItsExtremes(String file) {
        Front front = front(file);
        RangeAnswer range = WorkingRange.of(front, 2);
        assertTrue(!range.outline().isEmpty(), "closed");
        double[][] ring = range.outline().get(0);
        assertTrue(Outline.area(ring) > 0, "anticlockwise");
        assertEquals(ring[0][0], ring[0][ring[0].length - 1]);
        FrontSolver solver = new FrontSolver(front);
        SplittableRandom random = new SplittableRandom(3);
        for (int i = 0; i < POSES; i++) {
            double[] at = random.doubles(front.mechanism().cylinders()).toArray();
            at[i % at.length] = i % 3 == 0 ? 0 : i % 3 == 1 ? 1 : at[i % at.length];
            solver.place(at);
            double x = front.tip().x(solver.pose());
            double y = front.tip().y(solver.pose());
            assertTrue(inside(ring, x, y) || gap(ring, x, y) < OUTLINE, file + " " + Arrays.toString(at));
        }
        assertEquals(
                range.dimensions().get("reach"), Arrays.stream(ring[0]).max().orElseThrow(), DIMENSION);
        assertEquals(
                -range.dimensions().get("depth"), Arrays.stream(ring[1]).min().orElseThrow(), DIMENSION);
        assertEquals(
                range.dimensions().get("cutting_height"),
                Arrays.stream(ring[1]).max().orElseThrow(),
                DIMENSION);
    }

    /** A stroke too long for the linkage: the outline still closes and holds every pose that assembles. */
    @ParameterizedTest
    @CsvSource({
        "cylinders.stick.stroke=2540, cylinders.stick.mass=1",
        "cylinders.stick.retracted=2300, cylinders.stick.stroke=1700",
        "cylinders.stick.retracted=1984, cylinders.stick.stroke=1983",
        "cylinders.bucket.retracted=1250, cylinders.bucket.stroke=1200",
        "cylinders.boom.retracted=1500, cylinders.boom.stroke=1499"
    })
    void strokesThatPartlyDoNotAssemble(String one, String two) {
        Front front = front("sallow-22.json", one, two);
        RangeAnswer range = WorkingRange.of(front, 2);
        double[][] ring = range.outline().get(0);
        assertTrue(range.dimensions().get("level_depth") > 6, "there is a level floor");
        assertEquals(1, range.notes().size(), "one stroke is trimmed, and told");
        FrontSolver solver = new FrontSolver(front);
        SplittableRandom random = new SplittableRandom(4);
        double[] most = {Double.NEGATIVE_INFINITY, Double.NEGATIVE_INFINITY, Double.NEGATIVE_INFINITY};
        int failed = 0;
        for (int i = 0; i < POSES; i++) {
            if (solver.place(random.doubles(3).toArray()) != PoseSolver.ASSEMBLED) {
                failed++;
                continue;
            }
            double x = front.tip().x(solver.pose());
            double y = front.tip().y(solver.pose());
            assertTrue(inside(ring, x, y) || gap(ring, x, y) < OUTLINE, x + " " + y);
            most[0] = Math.max(most[0], x);
            most[1] = Math.max(most[1], y);
            most[2] = Math.max(most[2], -y);
        }
        assertTrue(failed > POSES / 100, failed + " poses do not assemble");
        assertTrue(range.dimensions().get("reach") >= most[0]);
        assertTrue(range.dimensions().get("cutting_height") >= most[1]);
        assertTrue(range.dimensions().get("depth") >= most[2]);
        range.at().forEach((name, at) -> assertEquals(PoseSolver.ASSEMBLED, solver.place(at), name));
    }

    /** Every point just inside the line is reachable and every point just outside is not, by an inverse search. */
    @ParameterizedTest
    @ValueSource(strings = {"sallow-22.json", "fenbrook-backhoe.json", "cullen-bank-shovel.json"})
    void theLineSeparates(String file) {
        Front front = front(file);
        double[][] ring = WorkingRange.of(front, 2).outline().get(0);
        ReachTest reach = new ReachTest(new FrontSolver(front), front.tip());
        double[] middle = new double[front.mechanism().cylinders()];
        Arrays.fill(middle, 0.5);
        int tried = 0;
        for (int i = 0; i + 1 < ring[0].length; i += 7) {
            double dx = ring[0][i + 1] - ring[0][i];
            double dy = ring[1][i + 1] - ring[1][i];
            double length = Math.hypot(dx, dy);
            double x = 0.5 * (ring[0][i] + ring[0][i + 1]);
            double y = 0.5 * (ring[1][i] + ring[1][i + 1]);
            double outX = x + dy / length * OUTLINE;
            double outY = y - dx / length * OUTLINE;
            if (length > 0.002 && gap(ring, outX, outY) > 0.9 * OUTLINE && !inside(ring, outX, outY)) {
                tried++;
                assertTrue(!reach.reaches(outX, outY, middle), file + " outside at " + x + ", " + y);
            }
        }
        assertTrue(tried > 50, "only " + tried);
    }

    /** Second way to constrained dimensions: a dense sweep of poses that nearly meet the condition never beats them. */
    @ParameterizedTest
    @ValueSource(strings = {"sallow-22.json", "fenbrook-backhoe.json"})
    void noPoseBeatsADimension(String file) {
        Front front = front(file);
        RangeAnswer range = WorkingRange.of(front, 2);
        FrontSolver solver = new FrontSolver(front);
        SplittableRandom random = new SplittableRandom(9);
        Place tip = front.tip();
        Place heel = front.heel();
        double slack = 2e-3;
        for (int i = 0; i < 400_000; i++) {
            solver.place(random.doubles(front.mechanism().cylinders()).toArray());
            double x = tip.x(solver.pose());
            double y = tip.y(solver.pose());
            assertTrue(x <= range.dimensions().get("reach") + 1e-9);
            if (Math.abs(y) < slack) {
                assertTrue(x <= range.dimensions().get("ground_reach") + 2 * slack);
            }
            double across = x - front.hook().x(solver.pose());
            if (Math.abs(across) < slack && y < front.hook().y(solver.pose())) {
                assertTrue(y <= range.dimensions().get("dump_height") + 3 * slack);
            }
            if (Math.abs(heel.x(solver.pose()) - x) < slack && heel.y(solver.pose()) > y) {
                assertTrue(-y <= range.dimensions().get("wall_depth") + 3 * slack);
            }
        }
        range.at()
                .forEach((name, at) ->
                        meetsItsCondition(front, name, at, range.dimensions().get(name)));
    }

    private static void meetsItsCondition(Front front, String name, double[] at, double value) {
        FrontSolver solver = new FrontSolver(front);
        solver.place(at);
        double x = front.tip().x(solver.pose());
        double y = front.tip().y(solver.pose());
        switch (name) {
            case "ground_reach" -> assertEquals(0, y, 1e-7, name);
            case "dump_height", "dump_height_min" -> {
                assertEquals(front.hook().x(solver.pose()), x, 1e-7, name);
                assertEquals(value, y, 1e-7, name);
            }
            case "wall_depth" -> assertEquals(front.heel().x(solver.pose()), x, 1e-7, name);
            default -> assertTrue(Double.isFinite(value), name);
        }
    }

    /** Lengths follow from the pins alone: names and masses change no bit of them. */
    @Test
    void dimensionsComeFromThePinsAlone() {
        Front front = front("sallow-22.json");
        Front same = Front.of(LinkageReader.read(
                Path.of("../linkages/sallow-22.json"),
                List.of("units.length=\"mm\"", "name=\"Other\"", "cylinders.boom.mass=10")));
        RangeAnswer one = WorkingRange.of(front, 2);
        RangeAnswer two = WorkingRange.of(same, 1);
        one.dimensions()
                .forEach((name, value) -> assertEquals(value, two.dimensions().get(name), 0.0, name));
    }

    private static boolean inside(double[][] ring, double x, double y) {
        boolean in = false;
        for (int i = 0; i + 1 < ring[0].length; i++) {
            if (ring[1][i] > y != ring[1][i + 1] > y) {
                double at =
                        ring[0][i] + (y - ring[1][i]) / (ring[1][i + 1] - ring[1][i]) * (ring[0][i + 1] - ring[0][i]);
                in ^= x < at;
            }
        }
        return in;
    }

    private static double gap(double[][] ring, double x, double y) {
        double least = Double.POSITIVE_INFINITY;
        for (int i = 0; i + 1 < ring[0].length; i++) {
            double dx = ring[0][i + 1] - ring[0][i];
            double dy = ring[1][i + 1] - ring[1][i];
            double share = ((x - ring[0][i]) * dx + (y - ring[1][i]) * dy) / (dx * dx + dy * dy);
            double t = Math.max(0, Math.min(1, share));
            least = Math.min(least, Math.hypot(ring[0][i] + t * dx - x, ring[1][i] + t * dy - y));
        }
        return least;
    }
}
