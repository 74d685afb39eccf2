package org.rodside.study;

import java.util.ArrayList;
import java.util.List;
import org.rodside.hydraulics.CylinderArea;
import org.rodside.hydraulics.CylinderPressure;
import org.rodside.kinematics.Mechanism;
import org.rodside.kinematics.MotionBuffer;
import org.rodside.kinematics.PoseBuffer;
import org.rodside.kinematics.PoseSolver;
import org.rodside.model.Cylinder;
import org.rodside.model.Linkage;
import org.rodside.statics.ForceBuffer;
import org.rodside.statics.ForceSolver;
import org.rodside.statics.LoadBuffer;
import org.rodside.table.Column;
import org.rodside.units.Quantity;

/**
 * One instant of a history: strokes with their rates and accelerations, and what acts on the tip, to every force (theory S5, D3,
 * D4). Owns its scratch, allocates nothing per row; one per thread.
 */
final class HistorySolver {

    private final Front front;
    private final Mechanism mechanism;
    private final HistoryQuestion question;
    private final PoseSolver poses;
    private final ForceSolver solver;
    private final PoseBuffer pose;
    private final MotionBuffer motion;
    private final LoadBuffer loads;
    private final ForceBuffer forces;
    private final ForceBuffer unitX;
    private final ForceBuffer unitY;
    private final Place tip;
    private final Place fill;
    private final List<CylinderArea> areas;
    private final List<CylinderPressure> pressures;
    private final double[] still;
    private final double[] given;
    private double tipForceX;
    private double tipForceY;
    private double fit;

    HistorySolver(Front front, HistoryQuestion question) {
        this.front = front;
        this.question = question;
        mechanism = front.mechanism();
        poses = mechanism.newSolver();
        solver = ForceSolver.of(mechanism);
        pose = new PoseBuffer(mechanism);
        motion = new MotionBuffer(mechanism);
        loads = new LoadBuffer(mechanism);
        forces = new ForceBuffer(mechanism);
        unitX = new ForceBuffer(mechanism);
        unitY = new ForceBuffer(mechanism);
        boolean tool = front.linkage().tool().isPresent();
        tip = tool ? front.tip() : null;
        fill = tool ? front.fill() : null;
        List<Cylinder> cylinders = front.linkage().cylinders();
        areas = cylinders.stream().map(CylinderArea::of).toList();
        pressures = cylinders.stream().map(c -> CylinderPressure.of(c, false)).toList();
        still = new double[cylinders.size()];
        given = new double[cylinders.size()];
    }

    /** Columns of a history, in order. */
    List<Column> columns() {
        List<Column> columns = new ArrayList<>();
        columns.add(Column.of("time", Quantity.TIME));
        for (int c = 0; c < mechanism.cylinders(); c++) {
            String name = mechanism.cylinderName(c);
            columns.add(Column.of(name + ".stroke", Quantity.LENGTH));
            columns.add(Column.of(name + ".speed", Quantity.SPEED));
            columns.add(Column.of(name + ".force", Quantity.FORCE));
            columns.add(Column.of(name + ".cap", Quantity.PRESSURE));
            columns.add(Column.of(name + ".rod", Quantity.PRESSURE));
            columns.add(Column.of(name + ".flow", Quantity.FLOW));
        }
        columns.add(Column.of("tip.x", Quantity.LENGTH));
        columns.add(Column.of("tip.y", Quantity.LENGTH));
        columns.add(Column.of("tip.x", Quantity.FORCE));
        columns.add(Column.of("tip.y", Quantity.FORCE));
        for (int b = 0; b < mechanism.bearings(); b++) {
            String name =
                    mechanism.pinName(mechanism.bearingPin(b)) + "." + mechanism.bodyName(mechanism.bearingBody(b));
            columns.add(Column.of(name + ".x", Quantity.FORCE));
            columns.add(Column.of(name + ".y", Quantity.FORCE));
        }
        if (question.measured()) {
            columns.add(Column.of("fit", Quantity.FORCE));
        }
        return columns;
    }

    /**
     * Solves one instant.
     *
     * @param row row of a duty: time, strokes, tip force, payload, pressures; not modified
     * @param rates rate of each stroke; in m/s, not modified
     * @param accelerations second derivative of each stroke; in m/s², not modified
     * @param out one value for each of {@link #columns}; overwritten
     * @return {@link PoseSolver#ASSEMBLED} or the first body that cannot be placed
     */
    int solve(double[] row, double[] rates, double[] accelerations, double[] out) {
        System.arraycopy(row, 1, given, 0, given.length);
        int status = poses.solve(given, pose);
        if (status == PoseSolver.ASSEMBLED) {
            motion(rates, accelerations);
            load(row[3 + given.length]);
            tipForce(row);
            write(row, rates, out);
        }
        return status;
    }

    private void motion(double[] rates, double[] accelerations) {
        poses.rates(pose, question.atRest() ? still : rates, motion);
        poses.accelerations(pose, question.atRest() ? still : accelerations, motion);
    }

    /** Weights, inertia and payload. */
    private void load(double payload) {
        loads.clear();
        front.masses().addWeights(pose, loads);
        if (!question.atRest()) {
            front.masses().addInertia(pose, motion, loads);
        }
        if (payload != 0) {
            addPayload(payload);
        }
    }

    private void addPayload(double payload) {
        double ax = 0;
        double ay = 0;
        double x = fill.x(pose);
        double y = fill.y(pose);
        if (!question.atRest()) {
            ax = motion.ax(pose, fill.body(), x, y);
            ay = motion.ay(pose, fill.body(), x, y);
        }
        loads.add(fill.body(), x, y, -payload * ax, -payload * (Linkage.GRAVITY + ay));
    }

    private void tipForce(double[] row) {
        int n = given.length;
        if (question.measured()) {
            solver.solve(pose, loads, forces);
            unit(1, 0, unitX);
            unit(0, 1, unitY);
            fitTip(row);
            forces.add(tipForceX, unitX);
            forces.add(tipForceY, unitY);
        } else {
            tipForceX = row[1 + n];
            tipForceY = row[2 + n];
            if (tip != null) {
                loads.add(tip.body(), tip.x(pose), tip.y(pose), tipForceX, tipForceY);
            }
            solver.solve(pose, loads, forces);
        }
    }

    private void unit(double x, double y, ForceBuffer out) {
        loads.clear();
        loads.add(tip.body(), tip.x(pose), tip.y(pose), x, y);
        solver.solve(pose, loads, out);
    }

    /** Force of a cylinder by its measured pressures; in N, all twins. */
    private double measured(double[] row, int c) {
        int at = 4 + given.length + 2 * c;
        return areas.get(c).force(row[at], row[at + 1]);
    }

    /** Tip force that explains the measured cylinder forces best, theory (D4). */
    private void fitTip(double[] row) {
        double xx = 0;
        double xy = 0;
        double xf = 0;
        for (int c = 0; c < given.length; c++) {
            double ux = unitX.cylinder(c);
            xx += ux * ux;
            xy += ux * unitY.cylinder(c);
            xf += ux * (measured(row, c) - forces.cylinder(c));
        }
        // The second column is made square to the first: the sums of both together would lose half of the digits.
        double yy = 0;
        double yf = 0;
        for (int c = 0; c < given.length; c++) {
            double square = unitY.cylinder(c) - xy / xx * unitX.cylinder(c);
            yy += square * square;
            yf += square * (measured(row, c) - forces.cylinder(c));
        }
        tipForceY = yf / yy;
        tipForceX = (xf - xy * tipForceY) / xx;
        double squares = 0;
        for (int c = 0; c < given.length; c++) {
            double residual = measured(row, c)
                    - forces.cylinder(c)
                    - tipForceX * unitX.cylinder(c)
                    - tipForceY * unitY.cylinder(c);
            squares += residual * residual;
        }
        fit = Math.sqrt(squares / given.length);
    }

    private void write(double[] row, double[] rates, double[] out) {
        int i = 0;
        out[i++] = row[0];
        for (int c = 0; c < given.length; c++) {
            double force = question.measured() ? measured(row, c) : forces.cylinder(c);
            out[i++] = given[c];
            out[i++] = rates[c];
            out[i++] = force;
            int at = 4 + given.length + 2 * c;
            out[i++] = question.measured() ? row[at] : pressures.get(c).cap(force);
            out[i++] = question.measured() ? row[at + 1] : pressures.get(c).rod(force);
            out[i++] = areas.get(c).supply(rates[c]);
        }
        out[i++] = tip == null ? Double.NaN : tip.x(pose);
        out[i++] = tip == null ? Double.NaN : tip.y(pose);
        out[i++] = tipForceX;
        out[i++] = tipForceY;
        for (int b = 0; b < mechanism.bearings(); b++) {
            int body = mechanism.bearingBody(b);
            double x = forces.bearingX(b);
            double y = forces.bearingY(b);
            out[i++] = pose.cos(body) * x + pose.sin(body) * y;
            out[i++] = pose.cos(body) * y - pose.sin(body) * x;
        }
        if (question.measured()) {
            out[i] = fit;
        }
    }

    /** First cylinder whose force is no finite number in a row written last; -1 where all are. */
    int unbalanced(double[] out) {
        for (int c = 0; c < given.length; c++) {
            if (!Double.isFinite(out[3 + 6 * c] + forces.cylinder(c))) {
                return c;
            }
        }
        return -1;
    }

    /** The pose, motion and masses of the instant solved last, for checks; not to be modified. */
    PoseBuffer pose() {
        return pose;
    }

    MotionBuffer motion() {
        return motion;
    }
}
