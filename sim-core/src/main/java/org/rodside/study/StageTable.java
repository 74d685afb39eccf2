package org.rodside.study;

import java.util.Arrays;
import org.rodside.kinematics.Mechanism;
import org.rodside.kinematics.MotionBuffer;
import org.rodside.kinematics.PoseBuffer;
import org.rodside.kinematics.PoseSolver;
import org.rodside.kinematics.StageChain;
import org.rodside.statics.Masses;

/**
 * One stage solved once for every stroke of a grid (theory K3). Everything is told in the axes of the stage's carrier, as
 * drawn, so that it holds wherever the carrier stands: place and turn of the output link, their rates for one unit of
 * stroke rate, and the sums of mass, of mass × place and of mass × rate over the links of the stage. NaN where the stage
 * does not assemble. Immutable once made.
 */
final class StageTable {

    /** Cosine and sine of the output link's turn against the carrier; no unit. */
    final double[] cos;

    final double[] sin;

    /** Image of the drawing's origin on the output link; in m. */
    final double[] x;

    final double[] y;

    /** Turn of the output link for each stroke; in rad/m. */
    final double[] turn;

    /** Travel of the output link's origin for each stroke; no unit. */
    final double[] travelX;

    final double[] travelY;

    /** Sum of mass × place over the stage; in kg·m. */
    final double[] momentX;

    final double[] momentY;

    /** Sum of mass × travel for each stroke over the stage; in kg. */
    final double[] carryX;

    final double[] carryY;

    /** Place of the cutting edge if the output link is the tool; in m. */
    final double[] edgeX;

    final double[] edgeY;

    /** Place of the tip if the output link is the tool; in m. */
    final double[] tipX;

    final double[] tipY;

    /** Travel of the cutting edge for each stroke; no unit. */
    final double[] edgeTravelX;

    final double[] edgeTravelY;

    /** Mass of the stage; in kg. */
    private double mass;

    StageTable(Front front, StageChain.Stage stage, SweepGrid grid, Place edge) {
        int n = grid.steps();
        cos = new double[n];
        sin = new double[n];
        x = new double[n];
        y = new double[n];
        turn = new double[n];
        travelX = new double[n];
        travelY = new double[n];
        momentX = new double[n];
        momentY = new double[n];
        carryX = new double[n];
        carryY = new double[n];
        edgeX = new double[n];
        edgeY = new double[n];
        tipX = new double[n];
        tipY = new double[n];
        edgeTravelX = new double[n];
        edgeTravelY = new double[n];
        fill(front, stage, grid, edge);
    }

    double mass() {
        return mass;
    }

    private void fill(Front front, StageChain.Stage stage, SweepGrid grid, Place edge) {
        Mechanism mechanism = front.mechanism();
        PoseSolver solver = mechanism.newSolver();
        PoseBuffer pose = new PoseBuffer(mechanism);
        MotionBuffer motion = new MotionBuffer(mechanism);
        double[] strokes = new double[mechanism.cylinders()];
        double[] rates = new double[mechanism.cylinders()];
        rates[stage.cylinder()] = 1;
        for (int c = 0; c < strokes.length; c++) {
            strokes[c] = mechanism.drawnLength(c) - mechanism.retracted(c);
        }
        for (int i = 0; i < grid.steps(); i++) {
            strokes[stage.cylinder()] = grid.fraction(i) * mechanism.stroke(stage.cylinder());
            if (solver.solve(strokes, pose) == PoseSolver.ASSEMBLED) {
                solver.rates(pose, rates, motion);
                new Entry(front, stage, pose, motion).write(i, edge);
            } else {
                clear(i);
            }
        }
    }

    private void clear(int i) {
        double[][] all = {
            cos,
            sin,
            x,
            y,
            turn,
            travelX,
            travelY,
            momentX,
            momentY,
            carryX,
            carryY,
            edgeX,
            edgeY,
            tipX,
            tipY,
            edgeTravelX,
            edgeTravelY
        };
        Arrays.stream(all).forEach(column -> column[i] = Double.NaN);
    }

    /** One stroke of the table being written. */
    private final class Entry {

        private final Front front;
        private final StageChain.Stage stage;
        private final PoseBuffer pose;
        private final MotionBuffer motion;
        private double massSum;

        Entry(Front front, StageChain.Stage stage, PoseBuffer pose, MotionBuffer motion) {
            this.front = front;
            this.stage = stage;
            this.pose = pose;
            this.motion = motion;
        }

        void write(int i, Place edge) {
            int output = stage.output();
            double ox = pose.originX(output);
            double oy = pose.originY(output);
            double carrierCos = pose.cos(stage.carrier());
            double carrierSin = pose.sin(stage.carrier());
            cos[i] = carrierCos * pose.cos(output) + carrierSin * pose.sin(output);
            sin[i] = carrierCos * pose.sin(output) - carrierSin * pose.cos(output);
            x[i] = localX(ox, oy);
            y[i] = localY(ox, oy);
            turn[i] = motion.omega(output);
            travelX[i] = along(motion.vx(pose, output, ox, oy), motion.vy(pose, output, ox, oy));
            travelY[i] = across(motion.vx(pose, output, ox, oy), motion.vy(pose, output, ox, oy));
            sums(i);
            double ex = pose.x(output, edge.x(), edge.y());
            double ey = pose.y(output, edge.x(), edge.y());
            edgeX[i] = localX(ex, ey);
            edgeY[i] = localY(ex, ey);
            Place tip = front.tip();
            double tx = tip.x(pose);
            double ty = tip.y(pose);
            tipX[i] = localX(tx, ty);
            tipY[i] = localY(tx, ty);
            edgeTravelX[i] = along(motion.vx(pose, output, ex, ey), motion.vy(pose, output, ex, ey));
            edgeTravelY[i] = across(motion.vx(pose, output, ex, ey), motion.vy(pose, output, ex, ey));
        }

        private void sums(int i) {
            Masses masses = front.masses();
            for (int body : stage.members()) {
                double cgX = pose.x(body, masses.cgX(body), masses.cgY(body));
                double cgY = pose.y(body, masses.cgX(body), masses.cgY(body));
                add(i, masses.mass(body), cgX, cgY, motion.vx(pose, body, cgX, cgY), motion.vy(pose, body, cgX, cgY));
                for (int pin : front.mechanism().ownedPins(body)) {
                    add(i, masses.eyeMass(pin), pose.pinX(pin), pose.pinY(pin), motion.pinVx(pin), motion.pinVy(pin));
                }
            }
            mass = massSum;
        }

        private void add(int i, double m, double atX, double atY, double vx, double vy) {
            massSum += m;
            momentX[i] += m * localX(atX, atY);
            momentY[i] += m * localY(atX, atY);
            carryX[i] += m * along(vx, vy);
            carryY[i] += m * across(vx, vy);
        }

        private double localX(double atX, double atY) {
            return along(atX - pose.originX(stage.carrier()), atY - pose.originY(stage.carrier()));
        }

        private double localY(double atX, double atY) {
            return across(atX - pose.originX(stage.carrier()), atY - pose.originY(stage.carrier()));
        }

        private double along(double vx, double vy) {
            return pose.cos(stage.carrier()) * vx + pose.sin(stage.carrier()) * vy;
        }

        private double across(double vx, double vy) {
            return pose.cos(stage.carrier()) * vy - pose.sin(stage.carrier()) * vx;
        }
    }
}
