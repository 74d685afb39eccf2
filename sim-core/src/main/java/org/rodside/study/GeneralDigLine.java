package org.rodside.study;

import java.util.Arrays;
import org.rodside.kinematics.PoseSolver;

/** Any linkage, pose by pose with the general solvers. Owns its scratch; one per thread. */
final class GeneralDigLine implements DigLine {

    private final SweepGrid grid;
    private final FrontSolver solver;
    private final DigSolver curl;
    private final DigSolver crowd;
    private final Place tip;
    private final double[] fractions;

    GeneralDigLine(SweepGrid grid, Front front, Edge edge, boolean ideal) {
        this.grid = grid;
        tip = front.tip();
        Place place = edge.of(front);
        solver = new FrontSolver(front);
        curl = new DigSolver(solver, place, front.curl(), ideal);
        crowd = front.crowd() < 0 ? null : new DigSolver(solver, place, front.crowd(), ideal);
        fractions = new double[front.mechanism().cylinders()];
    }

    @Override
    public void forces(int[] outer, DigRun out) {
        run(outer, out);
    }

    @Override
    public void run(int[] outer, DigRun out) {
        Arrays.fill(out.crowd, Double.NaN);
        Arrays.fill(out.crowdLimit, LimitSolver.NONE);
        for (int i = 0; i < grid.steps(); i++) {
            grid.fractions(outer, i, fractions);
            boolean stands = solver.place(fractions) == PoseSolver.ASSEMBLED;
            out.tipX[i] = tip.x(solver.pose());
            out.tipY[i] = tip.y(solver.pose());
            out.curl[i] = stands ? curl.force() : Double.NaN;
            out.curlLimit[i] = stands ? curl.governing() : LimitSolver.NONE;
            if (crowd != null) {
                out.crowd[i] = stands ? crowd.force() : Double.NaN;
                out.crowdLimit[i] = stands ? crowd.governing() : LimitSolver.NONE;
            }
        }
    }
}
