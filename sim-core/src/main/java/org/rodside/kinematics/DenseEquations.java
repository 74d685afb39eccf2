package org.rodside.kinematics;

import java.util.Arrays;
import org.ejml.data.DMatrixRMaj;
import org.ejml.dense.row.decomposition.lu.LUDecompositionAlt_DDRM;
import org.ejml.dense.row.linsol.lu.LinearSolverLu_DDRM;

/**
 * A square system of linear equations with its own memory, solved by LU with partial pivoting. An LU of a singular matrix
 * does not fail by itself: the smallest pivot against the largest tells. Mutable and not thread-safe.
 */
public final class DenseEquations {

    /** Smallest over largest pivot below which the matrix counts as singular; no unit. Some 1000 times double rounding. */
    private static final double SINGULAR = 1e-13;

    private final int size;
    private final DMatrixRMaj matrix;
    private final LUDecompositionAlt_DDRM decomposition = new LUDecompositionAlt_DDRM();
    private final LinearSolverLu_DDRM solver = new LinearSolverLu_DDRM(decomposition);
    private final DMatrixRMaj side = new DMatrixRMaj();
    private final DMatrixRMaj solution = new DMatrixRMaj();

    public DenseEquations(int size) {
        this.size = size;
        matrix = new DMatrixRMaj(size, size);
    }

    /** Coefficients, row by row, to be filled. */
    public double[] matrix() {
        return matrix.data;
    }

    /** All coefficients zero. */
    public void clear() {
        Arrays.fill(matrix.data, 0);
    }

    /** Factors the coefficients; false where the matrix is singular or not finite. */
    public boolean factor() {
        if (!solver.setA(matrix)) {
            return false;
        }
        double[] lu = decomposition.getLU().data;
        double least = Double.POSITIVE_INFINITY;
        double most = 0;
        for (int i = 0; i < size; i++) {
            double pivot = Math.abs(lu[i * size + i]);
            least = Math.min(least, pivot);
            most = Math.max(most, pivot);
        }
        return least > SINGULAR * most && most < Double.POSITIVE_INFINITY;
    }

    /**
     * Solves with the last factors.
     *
     * @param known right-hand side; not modified
     * @param unknown overwritten; another array than {@code known}
     */
    public void solve(double[] known, double[] unknown) {
        side.setData(known);
        side.reshape(size, 1);
        solution.setData(unknown);
        solution.reshape(size, 1);
        solver.solve(side, solution);
    }
}
