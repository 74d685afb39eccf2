package org.rodside.study;

import org.rodside.kinematics.Mechanism;
import org.rodside.model.Linkage;
import org.rodside.model.Machine;
import org.rodside.statics.Masses;

/**
 * What stays the same along one line of a sweep by stages (theory S8): where the carrier of the last stage stands, and for
 * every cylinder and for the ground the coefficients that turn the last stage's table into forces. The carrier's axes are
 * those of its drawn pose. Mutable and not thread-safe.
 */
final class LineBuffer {

    private final StageSweep sweep;
    private final boolean weights;
    private final int last;
    private final double fixedMass;
    private final double fixedMoment;

    /** Cosine, sine and place (m) of each stage's carrier in machine axes. */
    private final double[] cos;

    private final double[] sin;
    private final double[] x;
    private final double[] y;

    /** Travel of the last carrier's origin for each stroke of each stage, in its own axes; no unit. */
    final double[] travelX;

    final double[] travelY;

    /** Turn of the last carrier for each stroke of each stage; in rad/m. */
    final double[] turn;

    /** Weight force of each stage's cylinder without the last stage's part; in N. */
    final double[] weight;

    /** Vertical weight of everything; in N. */
    double totalWeight;

    /** Moment of all weights about the swing axis at the ground without the last stage's places; in N·m. */
    double momentWithoutLast;

    LineBuffer(StageSweep sweep, boolean weights) {
        this.sweep = sweep;
        this.weights = weights;
        int n = sweep.size();
        last = n - 1;
        cos = new double[n];
        sin = new double[n];
        x = new double[n];
        y = new double[n];
        travelX = new double[n];
        travelY = new double[n];
        turn = new double[n];
        weight = new double[n];
        double mass = 0;
        double moment = 0;
        Mechanism mechanism = sweep.front().mechanism();
        Masses masses = sweep.front().masses();
        for (int pin : mechanism.ownedPins(0)) {
            mass += masses.eyeMass(pin);
            moment += masses.eyeMass(pin) * mechanism.drawnX(pin);
        }
        Machine machine = sweep.front().machine().orElse(null);
        if (machine != null) {
            mass += machine.swinging().mass() + machine.fixed().mass();
            moment += machine.swinging().mass() * machine.swinging().cg().x()
                    + machine.fixed().mass() * machine.fixed().cg().x();
        }
        fixedMass = mass;
        fixedMoment = moment;
    }

    double cos() {
        return cos[last];
    }

    double sin() {
        return sin[last];
    }

    /** Place of the last carrier's origin in machine axes, x; in m. */
    double x() {
        return x[last];
    }

    double y() {
        return y[last];
    }

    /** Takes up a line. */
    void begin(int[] outer) {
        cos[0] = 1;
        for (int k = 0; k < last; k++) {
            StageTable table = sweep.table(k);
            int i = outer[k];
            cos[k + 1] = cos[k] * table.cos[i] - sin[k] * table.sin[i];
            sin[k + 1] = sin[k] * table.cos[i] + cos[k] * table.sin[i];
            x[k + 1] = x[k] + cos[k] * table.x[i] - sin[k] * table.y[i];
            y[k + 1] = y[k] + sin[k] * table.x[i] + cos[k] * table.y[i];
        }
        for (int k = 0; k < last; k++) {
            stage(k, outer);
        }
        weight[last] = 0;
        ground(outer);
    }

    private void stage(int k, int[] outer) {
        StageTable table = sweep.table(k);
        int i = outer[k];
        turn[k] = table.turn[i];
        double vx = cos[k] * table.travelX[i] - sin[k] * table.travelY[i];
        double vy = sin[k] * table.travelX[i] + cos[k] * table.travelY[i];
        double originX = vx - turn[k] * (y[last] - y[k + 1]);
        double originY = vy + turn[k] * (x[last] - x[k + 1]);
        if (k == last - 1) {
            // From this stage alone, to the last bit: a duty keeps it from whichever line a thread meets first.
            travelX[k] = table.cos[i] * table.travelX[i] + table.sin[i] * table.travelY[i];
            travelY[k] = table.cos[i] * table.travelY[i] - table.sin[i] * table.travelX[i];
        } else {
            travelX[k] = cos[last] * originX + sin[last] * originY;
            travelY[k] = cos[last] * originY - sin[last] * originX;
        }
        double carried = sin[k] * table.carryX[i] + cos[k] * table.carryY[i];
        for (int j = k + 1; j <= last; j++) {
            double mass = sweep.table(j).mass();
            double moment = j < last ? momentX(j, outer[j]) : 0;
            carried += mass * vy + turn[k] * (moment + mass * (x[j] - x[k + 1]));
        }
        weight[k] = weights ? Linkage.GRAVITY * carried : 0;
    }

    /** Sum of mass × place of a stage from its carrier's origin, machine x; in kg·m. */
    private double momentX(int stage, int i) {
        StageTable table = sweep.table(stage);
        return cos[stage] * table.momentX[i] - sin[stage] * table.momentY[i];
    }

    private void ground(int[] outer) {
        double mass = fixedMass;
        double moment = fixedMoment;
        for (int j = 0; j <= last; j++) {
            double stageMass = sweep.table(j).mass();
            mass += stageMass;
            moment += stageMass * x[j] + (j < last ? momentX(j, outer[j]) : 0);
        }
        totalWeight = Linkage.GRAVITY * mass;
        momentWithoutLast = -Linkage.GRAVITY * moment;
    }
}
