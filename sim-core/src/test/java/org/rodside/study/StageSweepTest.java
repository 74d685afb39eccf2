package org.rodside.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.SplittableRandom;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.rodside.io.LinkageReader;

/** The sweep by stages against the general solvers, pose by pose. */
class StageSweepTest {

    /** Two ways to one force agree to this share; both lose a few digits where a limit is nearly met without load. */
    private static final double FORCE_REL = 1e-9;

    /** Places agree to this; in m. */
    private static final double LENGTH = 1e-9;

    private static final int LINES = 300;

    @ParameterizedTest
    @CsvSource({
        "sallow-22.json, TIP, false, note=plain",
        "sallow-22.json, LIP, true, note=plain",
        "fenbrook-backhoe.json, TIP, false, note=plain",
        "fenbrook-backhoe.json, TIP, true, note=plain",
        "tarn-ridge-two-piece.json, TIP, false, note=plain",
        "sallow-22.json, TIP, false, cylinders.bucket.friction.constant=3000",
        "sallow-22.json, TIP, false, machine.swinging.mass=20",
        "sallow-22.json, TIP, false, machine.grip=0.05",
        "sallow-22.json, TIP, true, cylinders.boom.relief.rod=0",
        "sallow-22.json, TIP, true, cylinders.bucket.working=0",
    })
    void agreesWithTheGeneralSolvers(String file, Edge edge, boolean ideal, String override) {
        Front front = Front.of(LinkageReader.read(Path.of("../linkages", file), List.of(override)));
        SweepGrid grid = new SweepGrid(front.mechanism(), 13);
        Optional<StageSweep> sweep = StageSweep.of(front, grid, edge.of(front));
        assertTrue(sweep.isPresent(), "one chain of stages");
        DigLine stages = new StageDigLine(sweep.get(), ideal);
        DigLine general = new GeneralDigLine(grid, front, edge, ideal);
        DigRun fast = new DigRun(13);
        DigRun named = new DigRun(13);
        DigRun slow = new DigRun(13);
        SplittableRandom random = new SplittableRandom(7);
        int[] outer = new int[grid.axes() - 1];
        for (int n = 0; n < LINES; n++) {
            for (int axis = 0; axis < outer.length; axis++) {
                outer[axis] = random.nextInt(13);
            }
            stages.forces(outer, fast);
            stages.run(outer, named);
            general.run(outer, slow);
            compare(slow, fast, named, file + " line " + java.util.Arrays.toString(outer));
        }
    }

    private static void compare(DigRun slow, DigRun fast, DigRun named, String where) {
        for (int i = 0; i < slow.curl.length; i++) {
            assertEquals(slow.tipX[i], named.tipX[i], LENGTH, where);
            assertEquals(slow.tipY[i], named.tipY[i], LENGTH, where);
            assertEquals(slow.curl[i], named.curl[i], FORCE_REL * slow.curl[i], where);
            assertEquals(slow.crowd[i], named.crowd[i], FORCE_REL * slow.crowd[i], where);
            assertEquals(slow.curlLimit[i], named.curlLimit[i], where);
            assertEquals(slow.crowdLimit[i], named.crowdLimit[i], where);
            assertEquals(slow.curl[i], fast.curl[i], FORCE_REL * slow.curl[i], where);
            assertEquals(slow.crowd[i], fast.crowd[i], FORCE_REL * slow.crowd[i], where);
        }
    }
}
