package org.rodside.statics;

import org.ejml.data.DMatrixRMaj;
import org.ejml.dense.row.factory.LinearSolverFactory_DDRM;
import org.ejml.interfaces.linsol.LinearSolverDense;
import org.rodside.kinematics.Mechanism;
import org.rodside.kinematics.PoseBuffer;

/**
 * One dense equilibrium system of all links and pins (theory S1): unknown are two components for every (pin, link) pair and
 * one force for every cylinder; three equations for every link and two for every pin. Works for any planar linkage and is
 * the second, independent way for those that fall into steps. Owns its scratch; one per thread.
 */
public final class DenseForceSolver implements ForceSolver {

    /** LU quality below which the system is singular: a dead centre; no unit, scale-free. */
    private static final double SINGULAR = 1e-15;

    private final Mechanism mechanism;
    private final LinearSolverDense<DMatrixRMaj> lu;
    private final DMatrixRMaj matrix;
    private final DMatrixRMaj side;
    private final DMatrixRMaj solution;
    private final int size;

    public DenseForceSolver(Mechanism mechanism) {
        this.mechanism = mechanism;
        size = 2 * mechanism.bearings() + mechanism.cylinders();
        lu = LinearSolverFactory_DDRM.lu(size);
        matrix = new DMatrixRMaj(size, size);
        side = new DMatrixRMaj(size, 1);
        solution = new DMatrixRMaj(size, 1);
    }

    @Override
    public void solve(PoseBuffer pose, LoadBuffer loads, ForceBuffer out) {
        matrix.zero();
        int pinRow = 3 * (mechanism.bodies() - 1);
        bearingColumns(pose, pinRow);
        cylinderColumns(pose, pinRow);
        knownSide(loads, pinRow);
        if (!lu.setA(matrix) || !(lu.quality() > SINGULAR)) {
            out.clear();
            return;
        }
        lu.solve(side, solution);
        for (int bearing = 0; bearing < mechanism.bearings(); bearing++) {
            out.bearingX[bearing] = solution.data[2 * bearing];
            out.bearingY[bearing] = solution.data[2 * bearing + 1];
        }
        System.arraycopy(solution.data, 2 * mechanism.bearings(), out.cylinder, 0, out.cylinder.length);
    }

    private void bearingColumns(PoseBuffer pose, int pinRow) {
        for (int bearing = 0; bearing < mechanism.bearings(); bearing++) {
            int pin = mechanism.bearingPin(bearing);
            int body = mechanism.bearingBody(bearing);
            int column = 2 * bearing;
            if (body > 0) {
                int row = 3 * (body - 1);
                matrix.set(row, column, 1);
                matrix.set(row + 1, column + 1, 1);
                matrix.set(row + 2, column, -pose.pinY(pin));
                matrix.set(row + 2, column + 1, pose.pinX(pin));
            }
            matrix.set(pinRow + 2 * pin, column, -1);
            matrix.set(pinRow + 2 * pin + 1, column + 1, -1);
        }
    }

    private void cylinderColumns(PoseBuffer pose, int pinRow) {
        for (int c = 0; c < mechanism.cylinders(); c++) {
            int column = 2 * mechanism.bearings() + c;
            int rod = pinRow + 2 * mechanism.rodPin(c);
            int cap = pinRow + 2 * mechanism.capPin(c);
            matrix.set(rod, column, pose.unitX(c));
            matrix.set(rod + 1, column, pose.unitY(c));
            matrix.set(cap, column, -pose.unitX(c));
            matrix.set(cap + 1, column, -pose.unitY(c));
        }
    }

    private void knownSide(LoadBuffer loads, int pinRow) {
        for (int body = 1; body < mechanism.bodies(); body++) {
            int row = 3 * (body - 1);
            side.data[row] = -loads.forceX[body];
            side.data[row + 1] = -loads.forceY[body];
            side.data[row + 2] = -loads.moment[body];
        }
        for (int pin = 0; pin < mechanism.pins(); pin++) {
            side.data[pinRow + 2 * pin] = -loads.pinX[pin];
            side.data[pinRow + 2 * pin + 1] = -loads.pinY[pin];
        }
    }
}
