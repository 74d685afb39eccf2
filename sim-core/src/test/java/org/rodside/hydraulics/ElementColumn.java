package org.rodside.hydraulics;

import org.ejml.data.DMatrixRMaj;
import org.ejml.dense.row.factory.LinearSolverFactory_DDRM;
import org.ejml.interfaces.linsol.LinearSolverDense;

/**
 * A pinned–pinned column of straight beam elements (cubic shape, consistent geometric stiffness), written for the tests
 * and sharing nothing with the code under test. Unknowns are transverse displacement and slope at each node; the two end
 * displacements are taken out.
 */
final class ElementColumn {

    private static final int MAX_ITERATIONS = 500;

    /** The ratio of energies has about five digits of rounding to lose in as many elements. */
    private static final double CONVERGED = 1e-9;

    private final int nodes;
    private final double[] lengths;
    private final double[] stiffness;
    private final DMatrixRMaj elastic;
    private final DMatrixRMaj geometric;

    /** Parts one after another, each with its length in m and bending stiffness in N·m², cut into equal elements. */
    ElementColumn(double[] partLength, double[] partStiffness, int elementsPerPart) {
        int elements = partLength.length * elementsPerPart;
        nodes = elements + 1;
        lengths = new double[elements];
        stiffness = new double[elements];
        elastic = new DMatrixRMaj(2 * nodes, 2 * nodes);
        geometric = new DMatrixRMaj(2 * nodes, 2 * nodes);
        for (int e = 0; e < elements; e++) {
            lengths[e] = partLength[e / elementsPerPart] / elementsPerPart;
            stiffness[e] = partStiffness[e / elementsPerPart];
            add(elastic, e, bending(lengths[e]), stiffness[e] / Math.pow(lengths[e], 3));
            add(geometric, e, stringing(lengths[e]), 1 / (30 * lengths[e]));
        }
        pin(0);
        pin(2 * nodes - 2);
    }

    /** Takes one displacement out: its row and column hold only a 1 that no load reaches. */
    private void pin(int unknown) {
        for (int i = 0; i < 2 * nodes; i++) {
            elastic.set(unknown, i, i == unknown ? 1 : 0);
            elastic.set(i, unknown, i == unknown ? 1 : 0);
            geometric.set(unknown, i, 0);
            geometric.set(i, unknown, 0);
        }
    }

    private static double[][] bending(double h) {
        return new double[][] {
            {12, 6 * h, -12, 6 * h},
            {6 * h, 4 * h * h, -6 * h, 2 * h * h},
            {-12, -6 * h, 12, -6 * h},
            {6 * h, 2 * h * h, -6 * h, 4 * h * h}
        };
    }

    private static double[][] stringing(double h) {
        return new double[][] {
            {36, 3 * h, -36, 3 * h},
            {3 * h, 4 * h * h, -3 * h, -h * h},
            {-36, -3 * h, 36, -3 * h},
            {3 * h, -h * h, -3 * h, 4 * h * h}
        };
    }

    private static void add(DMatrixRMaj sum, int element, double[][] part, double scale) {
        for (int i = 0; i < 4; i++) {
            for (int j = 0; j < 4; j++) {
                sum.add(2 * element + i, 2 * element + j, scale * part[i][j]);
            }
        }
    }

    /** Smallest load with (K − P·G)x = 0, by inverse iteration; in N. */
    double buckling() {
        LinearSolverDense<DMatrixRMaj> solver = factored(elastic);
        DMatrixRMaj x = new DMatrixRMaj(2 * nodes, 1);
        for (int i = 0; i < nodes; i++) {
            x.set(2 * i, 0, i * (nodes - 1.0 - i) + 0.3 * i);
        }
        DMatrixRMaj right = new DMatrixRMaj(2 * nodes, 1);
        double load = 0;
        for (int k = 0; k < MAX_ITERATIONS; k++) {
            multiply(geometric, x, right);
            solver.solve(right, x);
            double size = Math.sqrt(dot(x, x));
            for (int i = 0; i < 2 * nodes; i++) {
                x.set(i, 0, x.get(i, 0) / size);
            }
            double next = quadratic(elastic, x) / quadratic(geometric, x);
            if (Math.abs(next - load) <= CONVERGED * next) {
                return next;
            }
            load = next;
        }
        throw new AssertionError("inverse iteration did not settle");
    }

    /**
     * Bending moments at the nodes under axial load P, uniform transverse load on each part, load off the pin centres and
     * a kink in the unloaded shape, all bowing one way: M = P·(v + kink + offset) + moment of the transverse load.
     *
     * @param axial compression; in N
     * @param partLoad transverse load of each part; in N/m
     * @param offset of the load from both pin centres; in m
     * @param kink unloaded deflection at the joint of two parts; in m
     * @return in N·m, positive where the transverse load sags it
     */
    double[] moments(double axial, double[] partLoad, double offset, double kink) {
        int perPart = lengths.length / partLoad.length;
        DMatrixRMaj load = new DMatrixRMaj(2 * nodes, 1);
        DMatrixRMaj shape = new DMatrixRMaj(2 * nodes, 1);
        for (int e = 0; e < lengths.length; e++) {
            double w = partLoad[e / perPart];
            double h = lengths[e];
            load.add(2 * e, 0, w * h / 2);
            load.add(2 * e + 1, 0, w * h * h / 12);
            load.add(2 * e + 2, 0, w * h / 2);
            load.add(2 * e + 3, 0, -w * h * h / 12);
        }
        addKink(load, axial, kink, perPart, shape);
        load.set(0, 0, 0);
        load.set(2 * nodes - 2, 0, 0);
        load.add(1, 0, axial * offset);
        load.add(2 * nodes - 1, 0, -axial * offset);
        DMatrixRMaj system = elastic.copy();
        for (int i = 0; i < system.getNumElements(); i++) {
            system.set(i, system.get(i) - axial * geometric.get(i));
        }
        DMatrixRMaj v = new DMatrixRMaj(2 * nodes, 1);
        factored(system).solve(load, v);
        return moments(axial, partLoad, offset, shape, v);
    }

    /** A straight-sided unloaded shape: the axial load sees only its corner, a force P·(1/L₁ + 1/L₂)·kink there. */
    private void addKink(DMatrixRMaj load, double axial, double kink, int corner, DMatrixRMaj shape) {
        double total = 0;
        double toCorner = 0;
        for (int e = 0; e < lengths.length; e++) {
            total += lengths[e];
            toCorner += e < corner ? lengths[e] : 0;
        }
        double x = 0;
        for (int i = 0; i < nodes; i++) {
            shape.set(2 * i, 0, x <= toCorner ? kink * x / toCorner : kink * (total - x) / (total - toCorner));
            x += i < lengths.length ? lengths[i] : 0;
        }
        if (corner < lengths.length) {
            load.add(2 * corner, 0, axial * kink * (1 / toCorner + 1 / (total - toCorner)));
        }
    }

    private double[] moments(double axial, double[] partLoad, double offset, DMatrixRMaj shape, DMatrixRMaj v) {
        int perPart = lengths.length / partLoad.length;
        double total = 0;
        double turning = 0;
        for (int e = 0; e < lengths.length; e++) {
            turning += partLoad[e / perPart] * lengths[e] * (total + lengths[e] / 2);
            total += lengths[e];
        }
        double weight = 0;
        for (int e = 0; e < lengths.length; e++) {
            weight += partLoad[e / perPart] * lengths[e];
        }
        double shear = weight - turning / total;
        double moment = 0;
        double[] result = new double[nodes];
        for (int i = 0; i < nodes; i++) {
            result[i] = axial * (v.get(2 * i, 0) + shape.get(2 * i, 0) + offset) + moment;
            if (i < lengths.length) {
                double w = partLoad[i / perPart];
                moment += shear * lengths[i] - w * lengths[i] * lengths[i] / 2;
                shear -= w * lengths[i];
            }
        }
        return result;
    }

    private static LinearSolverDense<DMatrixRMaj> factored(DMatrixRMaj matrix) {
        LinearSolverDense<DMatrixRMaj> solver = LinearSolverFactory_DDRM.lu(matrix.getNumRows());
        if (!solver.setA(matrix.copy())) {
            throw new AssertionError("singular column");
        }
        return solver;
    }

    private static void multiply(DMatrixRMaj matrix, DMatrixRMaj x, DMatrixRMaj product) {
        for (int i = 0; i < x.getNumRows(); i++) {
            double sum = 0;
            for (int j = 0; j < x.getNumRows(); j++) {
                sum += matrix.get(i, j) * x.get(j, 0);
            }
            product.set(i, 0, sum);
        }
    }

    private static double quadratic(DMatrixRMaj matrix, DMatrixRMaj x) {
        DMatrixRMaj product = new DMatrixRMaj(x.getNumRows(), 1);
        multiply(matrix, x, product);
        return dot(x, product);
    }

    private static double dot(DMatrixRMaj a, DMatrixRMaj b) {
        double sum = 0;
        for (int i = 0; i < a.getNumRows(); i++) {
            sum += a.get(i, 0) * b.get(i, 0);
        }
        return sum;
    }
}
