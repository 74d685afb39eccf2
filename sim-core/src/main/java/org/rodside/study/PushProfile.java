package org.rodside.study;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.rodside.hydraulics.Column;
import org.rodside.kinematics.PoseBuffer;

/**
 * The largest push of every cylinder at each of a row of its own strokes, in one load case: whatever bore and rod it had, its
 * smallest buckling factor starts from one of these poses. Immutable once made; each search uses a solver of its own.
 */
final class PushProfile {

    private final Front front;
    private final LoadCase load;
    private final BoxMaximum search;
    private final int slices;
    private final double[][] push;
    private final int[][] cell;

    /**
     * A smallest buckling factor and its pose.
     *
     * @param factor the factor; no unit, infinite where nothing pushes
     * @param push push of all twins; in N
     * @param length pin-to-pin length; in m
     * @param inclination angle of the axis above the horizontal; in rad, 0 to π/2
     */
    record Worst(double factor, double push, double length, double inclination) {}

    PushProfile(Front front, LoadCase load) {
        this.front = front;
        this.load = load;
        int cylinders = front.mechanism().cylinders();
        search = BoxMaximum.overAll(cylinders);
        slices = search.cells() / search.cellsInASlice();
        push = new double[cylinders][slices];
        cell = new int[cylinders][slices];
        Arrays.stream(cell).forEach(row -> Arrays.fill(row, -1));
        CaseSolver solver = new CaseSolver(front, load);
        for (int i = 0; i < search.cells(); i++) {
            double[] at = search.point(i);
            if (solver.solve(at)) {
                for (int c = 0; c < cylinders; c++) {
                    take(c, (int) Math.round(at[c] * (slices - 1)), solver.cylinder(c), i);
                }
            }
        }
    }

    private void take(int c, int slice, double force, int at) {
        if (force > push[c][slice] && force < Double.POSITIVE_INFINITY) {
            push[c][slice] = force;
            cell[c][slice] = at;
        }
    }

    /** Smallest buckling factor of a cylinder if it were this column. */
    Worst smallestFactor(int c, Column column) {
        CaseSolver solver = new CaseSolver(front, load);
        int best = -1;
        double least = Double.POSITIVE_INFINITY;
        for (int slice = 0; slice < slices; slice++) {
            double length = front.mechanism().retracted(c)
                    + slice / (slices - 1.0) * front.mechanism().stroke(c);
            double factor = cell[c][slice] < 0 ? Double.POSITIVE_INFINITY : column.factor(length, push[c][slice]);
            if (factor < least) {
                least = factor;
                best = slice;
            }
        }
        if (best < 0) {
            return new Worst(Double.POSITIVE_INFINITY, 0, Double.NaN, Double.NaN);
        }
        LoadQuantity work = new LoadQuantity(
                solver, () -> solver.cylinder(c) / column.critical(solver.pose().length(c)));
        Optimum top = search.climbFrom(work, search.point(cell[c][best]));
        return worst(c, solver, top.at(), column);
    }

    /** The largest push at every stroke of the grid that has one; its factor is not told. */
    List<Worst> pushes(int c) {
        CaseSolver solver = new CaseSolver(front, load);
        List<Worst> list = new ArrayList<>();
        for (int at : cell[c]) {
            if (at >= 0) {
                list.add(worst(c, solver, search.point(at), null));
            }
        }
        return list;
    }

    private static Worst worst(int c, CaseSolver solver, double[] at, Column column) {
        solver.solve(at);
        PoseBuffer pose = solver.pose();
        double inclination = Math.atan2(Math.abs(pose.unitY(c)), Math.abs(pose.unitX(c)));
        double force = solver.cylinder(c);
        double factor = column == null ? Double.NaN : column.factor(pose.length(c), force);
        return new Worst(factor, force, pose.length(c), inclination);
    }
}
