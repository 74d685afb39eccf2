package org.rodside.study;

import java.util.Arrays;
import org.rodside.hydraulics.CylinderLimits;
import org.rodside.model.Linkage;
import org.rodside.model.Machine;

/**
 * Digging forces of a front that is one chain of stages (theory S8): cylinder forces by virtual work from tabulated
 * stages, all sums along a line linear in the last stage's tables. {@link #forces} keeps branches out of its loops and
 * works on flat arrays, so that the compiler can use vector instructions: the reciprocal of the largest force is the largest of
 * load over room. {@link #run} meets the limits one by one as {@link LimitSolver} does, to name them. Owns its scratch;
 * allocates nothing per pose; one per thread.
 */
final class StageDigLine implements DigLine {

    /** Stands for no load at all where a reciprocal is taken; far below any load over room in 1/N. */
    private static final double NO_LOAD = 1e-300;

    private final StageSweep sweep;
    private final LineBuffer line;
    private final DutyLine curl;
    private final DutyLine crowd;
    private final boolean ideal;
    private final int steps;
    private final boolean stability;
    private final double front;
    private final double rear;
    private final double grip;
    private final double[] push;
    private final double[] pull;
    private final double[] drivingPush;
    private final double[] drivingPull;
    private final double[] fixed;
    private final double[] unit1;
    private final double[] unit2;
    private final double[] room1;
    private final double[] room2;
    private final double[] load1;
    private final double[] load2;

    StageDigLine(StageSweep sweep, boolean ideal) {
        this.sweep = sweep;
        this.ideal = ideal;
        Front made = sweep.front();
        line = new LineBuffer(sweep, !ideal);
        curl = new DutyLine(sweep, made.curl());
        crowd = made.crowd() < 0 ? null : new DutyLine(sweep, made.crowd());
        steps = sweep.grid().steps();
        Machine machine = made.machine().orElse(null);
        stability = machine != null && !ideal;
        front = stability ? machine.tippingFront() : 0;
        rear = stability ? machine.tippingRear() : 0;
        grip = stability && machine.grip().isPresent() ? machine.grip().getAsDouble() : Double.NaN;
        int n = sweep.size();
        push = new double[n];
        pull = new double[n];
        drivingPush = new double[n];
        drivingPull = new double[n];
        capacities(made);
        fixed = new double[steps];
        unit1 = new double[steps];
        unit2 = new double[steps];
        room1 = new double[steps];
        room2 = new double[steps];
        load1 = new double[steps];
        load2 = new double[steps];
    }

    private void capacities(Front made) {
        for (int k = 0; k < push.length; k++) {
            CylinderLimits limits = made.limits(sweep.cylinder(k), ideal);
            push[k] = limits.holdingPush();
            pull[k] = limits.holdingPull();
            drivingPush[k] = limits.drivingPush();
            drivingPull[k] = limits.drivingPull();
        }
    }

    private void begin(int[] outer) {
        line.begin(outer);
        curl.begin(line, outer);
        if (crowd != null) {
            crowd.begin(line, outer);
        }
    }

    @Override
    public void forces(int[] outer, DigRun out) {
        begin(outer);
        DutyLine second = crowd == null ? curl : crowd;
        ground(curl, room1, load1);
        ground(second, room2, load2);
        for (int k = 0; k < sweep.size(); k++) {
            weights(k);
            unit(k, curl, unit1);
            unit(k, second, unit2);
            boolean drives1 = k == curl.stage();
            boolean drives2 = k == second.stage();
            if (drives1 == drives2) {
                double most = drives1 ? drivingPush[k] : push[k];
                meetBoth(most, drives1 ? drivingPull[k] : pull[k]);
            } else {
                meet(drives1 ? drivingPush[k] : push[k], drives1 ? drivingPull[k] : pull[k], unit1, room1, load1);
                meet(drives2 ? drivingPush[k] : push[k], drives2 ? drivingPull[k] : pull[k], unit2, room2, load2);
            }
        }
        largest(room1, load1, out.curl);
        if (crowd == null) {
            Arrays.fill(out.crowd, Double.NaN);
        } else {
            largest(room2, load2, out.crowd);
        }
    }

    /** Weight forces of a stage's cylinder along the line; in N. */
    private void weights(int k) {
        StageTable table = sweep.last();
        double down = ideal ? 0 : Linkage.GRAVITY;
        double byX = k < sweep.size() - 1 ? down * line.turn[k] * line.cos() : down * line.sin();
        double byY = k < sweep.size() - 1 ? -down * line.turn[k] * line.sin() : down * line.cos();
        combine(
                line.weight[k],
                byX,
                byY,
                k < sweep.size() - 1 ? table.momentX : table.carryX,
                k < sweep.size() - 1 ? table.momentY : table.carryY,
                fixed);
    }

    private static void combine(double start, double byX, double byY, double[] x, double[] y, double[] out) {
        for (int i = 0; i < out.length; i++) {
            out[i] = start + byX * x[i] + byY * y[i];
        }
    }

    /** Forces of a stage's cylinder for one newton of the tool along the line; no unit. */
    private void unit(int k, DutyLine duty, double[] out) {
        StageTable table = sweep.last();
        double[] ux = duty.ux;
        double[] uy = duty.uy;
        if (k == sweep.size() - 1) {
            double[] jx = table.edgeTravelX;
            double[] jy = table.edgeTravelY;
            for (int i = 0; i < out.length; i++) {
                out[i] = ux[i] * jx[i] + uy[i] * jy[i];
            }
        } else {
            double vx = line.travelX[k];
            double vy = line.travelY[k];
            double turn = line.turn[k];
            double[] arm = duty.arm;
            for (int i = 0; i < out.length; i++) {
                out[i] = ux[i] * vx + uy[i] * vy + turn * arm[i];
            }
        }
    }

    /**
     * Tipping and slip: load over room in 1/N, and room as a number above zero where neither is broken. Each pair of
     * opposite limits shares one division.
     */
    private void ground(DutyLine duty, double[] room, double[] load) {
        if (!stability) {
            Arrays.fill(room, 1);
            Arrays.fill(load, NO_LOAD);
            return;
        }
        double c = line.cos();
        double s = line.sin();
        double[] sx = sweep.last().momentX;
        double[] sy = sweep.last().momentY;
        double down = Linkage.GRAVITY;
        double byX = -down * c;
        double byY = down * s;
        double atFront = line.momentWithoutLast + front * line.totalWeight;
        double atRear = -line.momentWithoutLast - rear * line.totalWeight;
        double offX = c * line.x() + s * line.y();
        double offY = c * line.y() - s * line.x();
        double slip = Double.isNaN(grip) ? 0 : 1 / (grip * line.totalWeight);
        double hold = Double.isNaN(grip) ? 0 : grip;
        for (int i = 0; i < room.length; i++) {
            double ux = duty.ux[i];
            double uy = duty.uy[i];
            double up = s * ux + c * uy;
            double forward = c * ux - s * uy;
            double moment = duty.arm[i] + offX * uy - offY * ux;
            double places = byX * sx[i] + byY * sy[i];
            double roomFront = atFront + places;
            double roomRear = atRear - places;
            double product = roomFront * roomRear;
            double toFront = moment - front * up;
            double toRear = rear * up - moment;
            double tip = Math.max(toFront * roomRear, toRear * roomFront) / product;
            load[i] = Math.max(Math.max(tip, slip * (Math.abs(forward) - hold * up)), NO_LOAD);
            room[i] = product;
        }
    }

    private void meetBoth(double most, double least) {
        double[] a = fixed;
        double half = 0.5 * (least - most);
        double sum = 0.5 * (most + least);
        for (int i = 0; i < a.length; i++) {
            double product = (most - a[i]) * (least + a[i]);
            double inverse = 1 / product;
            double q1 = inverse * (unit1[i] * (half + a[i]) + Math.abs(unit1[i]) * sum);
            double q2 = inverse * (unit2[i] * (half + a[i]) + Math.abs(unit2[i]) * sum);
            load1[i] = Math.max(load1[i], q1);
            load2[i] = Math.max(load2[i], q2);
            room1[i] = Math.min(room1[i], product);
            room2[i] = Math.min(room2[i], product);
        }
    }

    private void meet(double most, double least, double[] unit, double[] room, double[] load) {
        double[] a = fixed;
        double half = 0.5 * (least - most);
        double sum = 0.5 * (most + least);
        for (int i = 0; i < a.length; i++) {
            double product = (most - a[i]) * (least + a[i]);
            double q = (unit[i] * (half + a[i]) + Math.abs(unit[i]) * sum) / product;
            load[i] = Math.max(load[i], q);
            room[i] = Math.min(room[i], product);
        }
    }

    /** Largest force: zero where a limit is broken without any, huge ({@link DigBest#UNLIMITED}) where nothing limits it. */
    private static void largest(double[] room, double[] load, double[] out) {
        for (int i = 0; i < out.length; i++) {
            double stands = Math.min(1, Math.max(0, room[i] * 1e300));
            out[i] = stands / load[i];
        }
    }

    @Override
    public void run(int[] outer, DigRun out) {
        begin(outer);
        StageTable table = sweep.last();
        double c = line.cos();
        double s = line.sin();
        for (int i = 0; i < steps; i++) {
            out.tipX[i] = line.x() + c * table.tipX[i] - s * table.tipY[i];
            out.tipY[i] = line.y() + s * table.tipX[i] + c * table.tipY[i];
        }
        named(curl, out.curl, out.curlLimit);
        if (crowd == null) {
            Arrays.fill(out.crowd, Double.NaN);
            Arrays.fill(out.crowdLimit, LimitSolver.NONE);
        } else {
            named(crowd, out.crowd, out.crowdLimit);
        }
    }

    /** Largest force and the limit met first, cylinders in file order, as {@link LimitSolver} orders them. */
    private void named(DutyLine duty, double[] force, int[] limit) {
        Arrays.fill(force, Double.POSITIVE_INFINITY);
        Arrays.fill(limit, LimitSolver.NONE);
        for (int cylinder = 0; cylinder < sweep.size(); cylinder++) {
            int k = sweep.stageOf(cylinder);
            weights(k);
            unit(k, duty, unit1);
            boolean drives = k == duty.stage();
            double most = drives ? drivingPush[k] : push[k];
            double least = drives ? drivingPull[k] : pull[k];
            for (int i = 0; i < steps; i++) {
                meetOne(2 * cylinder, most - fixed[i], unit1[i], i, force, limit);
                meetOne(2 * cylinder + 1, least + fixed[i], -unit1[i], i, force, limit);
            }
        }
        if (stability) {
            namedGround(duty, force, limit);
        }
    }

    private void namedGround(DutyLine duty, double[] force, int[] limit) {
        double c = line.cos();
        double s = line.sin();
        double offX = c * line.x() + s * line.y();
        double offY = c * line.y() - s * line.x();
        StageTable table = sweep.last();
        int first = 2 * sweep.size();
        for (int i = 0; i < steps; i++) {
            double up = s * duty.ux[i] + c * duty.uy[i];
            double forward = c * duty.ux[i] - s * duty.uy[i];
            double moment = duty.arm[i] + offX * duty.uy[i] - offY * duty.ux[i];
            double weight = line.momentWithoutLast - Linkage.GRAVITY * (c * table.momentX[i] - s * table.momentY[i]);
            meetOne(first, weight + front * line.totalWeight, moment - front * up, i, force, limit);
            meetOne(first + 1, -weight - rear * line.totalWeight, rear * up - moment, i, force, limit);
            if (!Double.isNaN(grip)) {
                double room = grip * line.totalWeight;
                meetOne(first + 2, room, Math.abs(forward) - grip * up, i, force, limit);
            }
        }
    }

    private static void meetOne(int index, double room, double unit, int i, double[] force, int[] limit) {
        double t = room < 0 ? 0 : unit > 0 ? room / unit : Double.POSITIVE_INFINITY;
        if (Double.isNaN(room) || Double.isNaN(unit)) {
            force[i] = Double.NaN;
        } else if (t < force[i]) {
            force[i] = t;
            limit[i] = index;
        }
    }
}
