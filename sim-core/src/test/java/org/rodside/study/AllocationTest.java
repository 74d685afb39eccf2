package org.rodside.study;

import static org.junit.jupiter.api.Assertions.assertTrue;

import com.sun.management.ThreadMXBean;
import java.lang.management.ManagementFactory;
import java.nio.file.Path;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.rodside.io.LinkageReader;

/** The ways that run for every pose make no garbage: measured by the memory a thread has asked for, not by time. */
class AllocationTest {

    /** Rounds before counting, so that nothing is loaded or compiled for the first time while counting. */
    private static final int WARM = 5_000;

    private static final int COUNTED = 20_000;

    /** What the counting itself and the virtual machine may ask for in all; in bytes. Far below one byte a pose. */
    private static final long SLACK = 8_192;

    private static final Front DEMO = Front.of(LinkageReader.read(Path.of("../linkages/sallow-22.json"), List.of()));

    private static void makesNoGarbage(Runnable round) {
        ThreadMXBean memory = (ThreadMXBean) ManagementFactory.getThreadMXBean();
        long thread = Thread.currentThread().getId();
        for (int i = 0; i < WARM; i++) {
            round.run();
        }
        long before = memory.getThreadAllocatedBytes(thread);
        for (int i = 0; i < COUNTED; i++) {
            round.run();
        }
        long asked = memory.getThreadAllocatedBytes(thread) - before;
        assertTrue(asked < SLACK, asked + " bytes in " + COUNTED + " rounds");
    }

    @Test
    void diggingForceAtAPose() {
        FrontSolver solver = new FrontSolver(DEMO);
        DigSolver dig = new DigSolver(solver, DEMO.tip(), DEMO.curl(), false);
        double[][] poses = new double[64][];
        SplittableRandom random = new SplittableRandom(1);
        for (int i = 0; i < poses.length; i++) {
            poses[i] = random.doubles(3).toArray();
        }
        int[] next = {0};
        double[] sum = {0};
        makesNoGarbage(() -> sum[0] += dig.force(poses[next[0]++ & 63]));
        assertTrue(sum[0] > 0);
    }

    @Test
    void worstLoadsAtAPose() {
        CaseSolver solver = new CaseSolver(DEMO, LoadCase.carry(1000));
        double[] at = {0.4, 0.5, 0.6};
        makesNoGarbage(() -> solver.solve(at));
    }

    @Test
    void lineOfASweep() {
        SweepGrid grid = new SweepGrid(DEMO.mechanism(), 11);
        StageDigLine line =
                new StageDigLine(StageSweep.of(DEMO, grid, DEMO.tip()).orElseThrow(), false);
        DigRun run = new DigRun(11);
        int[] outer = new int[2];
        int[] next = {0};
        makesNoGarbage(() -> {
            grid.outer(next[0]++ % grid.lines(), outer);
            line.forces(outer, run);
        });
        assertTrue(run.curl[5] > 0);
    }

    @Test
    void rowOfAHistory() {
        HistorySolver solver = new HistorySolver(DEMO, new HistoryQuestion(false, false, Double.POSITIVE_INFINITY));
        double[] row = new double[13];
        row[1] = 0.5;
        row[2] = 0.6;
        row[3] = 0.4;
        row[6] = 500;
        double[] rates = {0.1, -0.2, 0.3};
        double[] out = new double[solver.columns().size()];
        makesNoGarbage(() -> solver.solve(row, rates, rates, out));
    }
}
