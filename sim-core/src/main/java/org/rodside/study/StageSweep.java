package org.rodside.study;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.rodside.kinematics.StageChain;

/** The stages of a front tabulated for a sweep: shared by all threads, immutable. */
final class StageSweep {

    private final Front front;
    private final SweepGrid grid;
    private final List<StageTable> tables = new ArrayList<>();
    private final int[] cylinder;

    private StageSweep(Front front, StageChain chain, SweepGrid grid, Place edge) {
        this.front = front;
        this.grid = grid;
        cylinder = chain.stages().stream().mapToInt(StageChain.Stage::cylinder).toArray();
        chain.stages().forEach(stage -> tables.add(new StageTable(front, stage, grid, edge)));
    }

    /** Tables where the front is one chain of stages from frame to tool in the order of the grid; else empty. */
    static Optional<StageSweep> of(Front front, SweepGrid grid, Place edge) {
        Optional<StageChain> chain = StageChain.of(front.mechanism(), edge.body());
        return chain.filter(c -> inOrder(c, grid)).map(c -> new StageSweep(front, c, grid, edge));
    }

    private static boolean inOrder(StageChain chain, SweepGrid grid) {
        for (int axis = 0; axis < grid.axes(); axis++) {
            if (chain.stages().size() != grid.axes() || chain.stages().get(axis).cylinder() != grid.cylinder(axis)) {
                return false;
            }
        }
        return true;
    }

    Front front() {
        return front;
    }

    SweepGrid grid() {
        return grid;
    }

    /** Number of stages. */
    int size() {
        return cylinder.length;
    }

    StageTable table(int stage) {
        return tables.get(stage);
    }

    StageTable last() {
        return tables.get(tables.size() - 1);
    }

    /** The cylinder of a stage. */
    int cylinder(int stage) {
        return cylinder[stage];
    }

    /** The stage of a cylinder. */
    int stageOf(int wanted) {
        for (int stage = 0; stage < cylinder.length; stage++) {
            if (cylinder[stage] == wanted) {
                return stage;
            }
        }
        throw new IllegalArgumentException("no stage of cylinder " + wanted);
    }
}
