package org.rodside.statics;

import org.rodside.kinematics.DenseEquations;
import org.rodside.kinematics.Mechanism;
import org.rodside.kinematics.PoseBuffer;

/**
 * One dense equilibrium system of all links and pins (theory S1): unknown are two components for every (pin, link) pair and
 * one force for every cylinder; three equations for every link and two for every pin. Works for any planar linkage and is
 * the second, independent way for those that fall into steps. Owns its scratch; one per thread.
 */
public final class DenseForceSolver implements ForceSolver {

    private final Mechanism mechanism;
    private final DenseEquations equations;
    private final double[] side;
    private final double[] solution;
    private final int size;

    public DenseForceSolver(Mechanism mechanism) {
        this.mechanism = mechanism;
        size = 2 * mechanism.bearings() + mechanism.cylinders();
        equations = new DenseEquations(size);
        side = new double[size];
        solution = new double[size];
    }

    @Override
    public void solve(PoseBuffer pose, LoadBuffer loads, ForceBuffer out) {
        equations.clear();
        int pinRow = 3 * (mechanism.bodies() - 1);
        bearingColumns(pose, pinRow);
        cylinderColumns(pose, pinRow);
        knownSide(loads, pinRow);
        if (!equations.factor()) {
            out.clear();
            return;
        }
        equations.solve(side, solution);
        for (int bearing = 0; bearing < mechanism.bearings(); bearing++) {
            out.bearingX[bearing] = solution[2 * bearing];
            out.bearingY[bearing] = solution[2 * bearing + 1];
        }
        System.arraycopy(solution, 2 * mechanism.bearings(), out.cylinder, 0, out.cylinder.length);
    }

    private void bearingColumns(PoseBuffer pose, int pinRow) {
        for (int bearing = 0; bearing < mechanism.bearings(); bearing++) {
            int pin = mechanism.bearingPin(bearing);
            int body = mechanism.bearingBody(bearing);
            int column = 2 * bearing;
            if (body > 0) {
                int row = 3 * (body - 1);
                set(row, column, 1);
                set(row + 1, column + 1, 1);
                set(row + 2, column, -pose.pinY(pin));
                set(row + 2, column + 1, pose.pinX(pin));
            }
            set(pinRow + 2 * pin, column, -1);
            set(pinRow + 2 * pin + 1, column + 1, -1);
        }
    }

    private void cylinderColumns(PoseBuffer pose, int pinRow) {
        for (int c = 0; c < mechanism.cylinders(); c++) {
            int column = 2 * mechanism.bearings() + c;
            int rod = pinRow + 2 * mechanism.rodPin(c);
            int cap = pinRow + 2 * mechanism.capPin(c);
            set(rod, column, pose.unitX(c));
            set(rod + 1, column, pose.unitY(c));
            set(cap, column, -pose.unitX(c));
            set(cap + 1, column, -pose.unitY(c));
        }
    }

    private void knownSide(LoadBuffer loads, int pinRow) {
        for (int body = 1; body < mechanism.bodies(); body++) {
            int row = 3 * (body - 1);
            side[row] = -loads.forceX[body];
            side[row + 1] = -loads.forceY[body];
            side[row + 2] = -loads.moment[body];
        }
        for (int pin = 0; pin < mechanism.pins(); pin++) {
            side[pinRow + 2 * pin] = -loads.pinX[pin];
            side[pinRow + 2 * pin + 1] = -loads.pinY[pin];
        }
    }

    private void set(int row, int column, double value) {
        equations.matrix()[row * size + column] = value;
    }
}
