package org.rodside.study;

import java.util.List;
import org.rodside.hydraulics.Column;
import org.rodside.kinematics.PoseBuffer;
import org.rodside.kinematics.PoseSolver;
import org.rodside.model.Cylinder;
import org.rodside.model.Linkage;
import org.rodside.statics.ForceBuffer;

/** Forces of one load case at any pose. Owns its scratch; one per thread. */
final class CaseSolver {

    private final FrontSolver solver;
    private final LoadCase load;
    private final DigSolver dig;
    private final Place fill;
    private final Place tip;
    private final ForceBuffer forces;
    private final Column[] columns;
    private final double[] shares;
    private final double[] length;
    private final double[] critical;
    private double tool;

    CaseSolver(Front front, LoadCase load) {
        this.load = load;
        solver = new FrontSolver(front);
        forces = new ForceBuffer(front.mechanism());
        int duty = load.kind() == LoadCase.Kind.CURL
                ? front.curl()
                : load.kind() == LoadCase.Kind.CROWD ? front.crowd() : -1;
        dig = duty < 0 ? null : new DigSolver(solver, front.tip(), duty, false);
        List<Cylinder> cylinders = front.linkage().cylinders();
        columns = cylinders.stream().map(Column::of).toArray(Column[]::new);
        shares = cylinders.stream().mapToDouble(Cylinder::harderShare).toArray();
        length = new double[columns.length];
        critical = new double[columns.length];
        boolean tools = front.linkage().tool().isPresent();
        fill = tools ? front.fill() : null;
        tip = tools ? front.tip() : null;
    }

    /**
     * Finds the forces of the case at a pose.
     *
     * @param fractions fraction of stroke of each cylinder; not modified
     * @return false where the pose does not assemble or nothing limits the tool force
     */
    boolean solve(double[] fractions) {
        if (solver.place(fractions) != PoseSolver.ASSEMBLED) {
            return false;
        }
        if (dig != null) {
            tool = dig.force();
            return tool < DigBest.UNLIMITED;
        }
        solver.loadWeights(solver.front().masses());
        if (load.payload() != 0) {
            solver.loadAt(fill, 0, -load.payload() * Linkage.GRAVITY);
        }
        if (load.forceX() != 0 || load.forceY() != 0) {
            solver.loadAt(tip, load.forceX(), load.forceY());
        }
        solver.solve(forces);
        return true;
    }

    /** Total force of a cylinder at the pose solved last, + push; in N. */
    double cylinder(int cylinder) {
        return dig == null ? forces.cylinder(cylinder) : dig.cylinder(cylinder, tool);
    }

    /**
     * Push of the harder-worked twin over the critical load of its column at the pose solved last: one over the buckling
     * factor, below zero for a pull; no unit. The critical load is kept until the cylinder's length changes.
     */
    double columnWork(int cylinder) {
        double now = solver.pose().length(cylinder);
        if (now != length[cylinder]) {
            length[cylinder] = now;
            critical[cylinder] = columns[cylinder].critical(now);
        }
        return shares[cylinder] * cylinder(cylinder) / critical[cylinder];
    }

    /** Force of the pin on the link at the pose solved last, x in machine axes; in N. */
    double bearingX(int bearing) {
        return dig == null
                ? forces.bearingX(bearing)
                : dig.fixed().bearingX(bearing) + tool * dig.unit().bearingX(bearing);
    }

    /** Force of the pin on the link at the pose solved last, y in machine axes; in N. */
    double bearingY(int bearing) {
        return dig == null
                ? forces.bearingY(bearing)
                : dig.fixed().bearingY(bearing) + tool * dig.unit().bearingY(bearing);
    }

    /** The tool force; in N, 0 where the case has none of its own. */
    double tool() {
        return tool;
    }

    /** Takes another tool force at the pose solved last; in N. */
    void use(double force) {
        tool = force;
    }

    /** Number of lines along which the tool force may meet a limit; 0 where the case has no tool force of its own. */
    int lines() {
        return dig == null ? 0 : dig.limits().lines();
    }

    /** Tool force at which one line meets its limit, {@link LimitSolver#meeting}; in N. */
    double meeting(int line) {
        return dig.limits().meeting(line);
    }

    /** The pose solved last. */
    PoseBuffer pose() {
        return solver.pose();
    }
}
