package org.rodside.study;

import java.util.Arrays;
import java.util.stream.Stream;
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
    private final double[] unit;
    private final double[] over;
    private final double[] places;
    private final double[] groundRoom;
    private final double[] up;
    private final double[] other;
    /** Some cylinder may not push or not pull at all: without weights its room is zero, which a product of rooms cannot tell apart. */
    private final boolean oneSided;

    private final LimitLineBuffer limits1;
    private final LimitLineBuffer limits2;

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
        oneSided = oneSided();
        fixed = new double[steps];
        unit = new double[steps];
        over = new double[steps];
        places = new double[steps];
        groundRoom = new double[steps];
        up = new double[steps];
        other = new double[steps];
        limits1 = new LimitLineBuffer(steps);
        limits2 = new LimitLineBuffer(steps);
    }

    private boolean oneSided() {
        return Stream.of(push, pull, drivingPush, drivingPull)
                .flatMapToDouble(Arrays::stream)
                .anyMatch(most -> most == 0);
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
        if (oneSided) {
            run(outer, out);
            return;
        }
        begin(outer);
        DutyLine second = crowd == null ? curl : crowd;
        if (stability) {
            groundRooms();
            ground(curl, limits1);
            ground(second, limits2);
        } else {
            limits1.begin();
            limits2.begin();
        }
        for (int k = 0; k < sweep.size(); k++) {
            weights(k);
            unit(k, curl, unit);
            limits1.meet(fixed, unit, push(k, curl), pull(k, curl));
            unit(k, second, unit);
            limits2.meet(fixed, unit, push(k, second), pull(k, second));
        }
        limits1.largest(out.curl);
        if (crowd == null) {
            Arrays.fill(out.crowd, Double.NaN);
        } else {
            limits2.largest(out.crowd);
        }
    }

    /** Most push of a stage's cylinder; in N. */
    private double push(int k, DutyLine duty) {
        return k == duty.stage() ? drivingPush[k] : push[k];
    }

    /** Most pull of a stage's cylinder; in N. */
    private double pull(int k, DutyLine duty) {
        return k == duty.stage() ? drivingPull[k] : pull[k];
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

    /** Rooms of tipping over the front and over the rear line, and their product: the same for both duties. */
    private void groundRooms() {
        double down = Linkage.GRAVITY;
        combine(0, -down * line.cos(), down * line.sin(), sweep.last().momentX, sweep.last().momentY, places);
        double atFront = atFront();
        double atRear = atRear();
        for (int i = 0; i < places.length; i++) {
            groundRoom[i] = (atFront + places[i]) * (atRear - places[i]);
        }
    }

    /** Room of tipping over the front line without the last stage's places; in N·m. */
    private double atFront() {
        return line.momentWithoutLast + front * line.totalWeight;
    }

    private double atRear() {
        return -line.momentWithoutLast - rear * line.totalWeight;
    }

    /** Meets tipping and slip. */
    private void ground(DutyLine duty, LimitLineBuffer limits) {
        double c = line.cos();
        double s = line.sin();
        double offX = c * line.x() + s * line.y();
        double offY = c * line.y() - s * line.x();
        combine(0, s, c, duty.ux, duty.uy, up);
        combine(0, -offY, offX, duty.ux, duty.uy, other);
        add(duty.arm, other);
        tipping();
        limits.begin(groundRoom, over);
        if (!Double.isNaN(grip)) {
            combine(0, c, -s, duty.ux, duty.uy, other);
            double perGrip = 1 / (grip * line.totalWeight);
            for (int i = 0; i < over.length; i++) {
                over[i] = perGrip * (Math.abs(other[i]) - grip * up[i]);
            }
            limits.meet(over);
        }
    }

    private static void add(double[] what, double[] to) {
        for (int i = 0; i < to.length; i++) {
            to[i] += what[i];
        }
    }

    private void tipping() {
        double atFront = atFront();
        double atRear = atRear();
        for (int i = 0; i < over.length; i++) {
            double toFront = other[i] - front * up[i];
            double toRear = rear * up[i] - other[i];
            over[i] = Math.max(toFront * (atRear - places[i]), toRear * (atFront + places[i]));
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
            unit(k, duty, unit);
            double most = push(k, duty);
            double least = pull(k, duty);
            for (int i = 0; i < steps; i++) {
                meetOne(2 * cylinder, most - fixed[i], unit[i], i, force, limit);
                meetOne(2 * cylinder + 1, least + fixed[i], -unit[i], i, force, limit);
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
