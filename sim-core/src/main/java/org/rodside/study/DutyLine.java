package org.rodside.study;

/**
 * Direction of the tool force along a line of a sweep for one duty, in the axes of the last stage's carrier: unit vector,
 * and its moment about the carrier's origin. Kept from one line to the next where it cannot change. Mutable and not
 * thread-safe.
 */
final class DutyLine {

    private final StageSweep sweep;
    private final int stage;
    private final double[][] keptX;
    private final double[][] keptY;
    private final double[][] keptArm;

    /** Direction of the force on the ground; no unit. Moment arm about the carrier's origin; in m. */
    double[] ux;

    double[] uy;
    double[] arm;

    DutyLine(StageSweep sweep, int cylinder) {
        this.sweep = sweep;
        stage = sweep.stageOf(cylinder);
        int kept = stage == sweep.size() - 1
                ? 1
                : stage == sweep.size() - 2 ? sweep.grid().steps() : 0;
        keptX = new double[kept][];
        keptY = new double[kept][];
        keptArm = new double[kept][];
        ux = new double[sweep.grid().steps()];
        uy = new double[sweep.grid().steps()];
        arm = new double[sweep.grid().steps()];
    }

    /** The stage of the duty's cylinder. */
    int stage() {
        return stage;
    }

    /** Takes up a line. */
    void begin(LineBuffer line, int[] outer) {
        if (keptX.length == 0) {
            fill(line);
            return;
        }
        int slot = keptX.length == 1 ? 0 : outer[stage];
        if (keptX[slot] == null) {
            ux = new double[sweep.grid().steps()];
            uy = new double[sweep.grid().steps()];
            arm = new double[sweep.grid().steps()];
            fill(line);
            keptX[slot] = ux;
            keptY[slot] = uy;
            keptArm[slot] = arm;
        }
        ux = keptX[slot];
        uy = keptY[slot];
        arm = keptArm[slot];
    }

    private void fill(LineBuffer line) {
        StageTable table = sweep.last();
        for (int i = 0; i < ux.length; i++) {
            double px = table.edgeX[i];
            double py = table.edgeY[i];
            double vx = stage == sweep.size() - 1 ? table.edgeTravelX[i] : line.travelX[stage] - line.turn[stage] * py;
            double vy = stage == sweep.size() - 1 ? table.edgeTravelY[i] : line.travelY[stage] + line.turn[stage] * px;
            double speed = Math.sqrt(vx * vx + vy * vy);
            ux[i] = vx / speed;
            uy[i] = vy / speed;
            arm[i] = px * uy[i] - py * ux[i];
        }
    }
}
