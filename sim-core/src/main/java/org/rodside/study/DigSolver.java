package org.rodside.study;

import org.rodside.kinematics.PoseSolver;
import org.rodside.statics.ForceBuffer;
import org.rodside.statics.GroundBuffer;

/**
 * Largest tool force at a pose (theory S6): the tool pushes the ground along the direction in which the cutting edge moves
 * while the duty cylinder extends and the others hold. Owns its scratch; one per thread.
 */
public final class DigSolver {

    private final FrontSolver solver;
    private final Place edge;
    private final int duty;
    private final boolean ideal;
    private final LimitSolver limits;
    private final ForceBuffer fixed;
    private final ForceBuffer unit;
    private final GroundBuffer fixedGround = new GroundBuffer();
    private final GroundBuffer unitGround = new GroundBuffer();
    private final double[] travel = new double[2];
    private double speed;

    /**
     * @param solver places the front; shared with others of the same thread
     * @param edge where the tool works: tip or lip
     * @param duty cylinder that drives
     * @param ideal true for no weights, friction, back pressure, tipping and slip
     */
    public DigSolver(FrontSolver solver, Place edge, int duty, boolean ideal) {
        this.solver = solver;
        this.edge = edge;
        this.duty = duty;
        this.ideal = ideal;
        limits = new LimitSolver(solver.front(), duty, ideal);
        fixed = new ForceBuffer(solver.front().mechanism());
        unit = new ForceBuffer(solver.front().mechanism());
    }

    /**
     * Places the front and finds the largest force.
     *
     * @param fractions fraction of stroke of each cylinder; not modified
     * @return force on the ground; in N, NaN where the pose does not assemble, infinite where nothing limits it
     */
    public double force(double[] fractions) {
        return solver.place(fractions) == PoseSolver.ASSEMBLED ? force() : Double.NaN;
    }

    /** The largest force at the pose placed last; in N. */
    public double force() {
        if (!direct()) {
            return Double.NaN;
        }
        solver.loads().clear();
        if (!ideal) {
            solver.front().masses().addWeights(solver.pose(), solver.loads());
        }
        solver.solve(fixed);
        if (limits.stability()) {
            solver.ground(true, fixedGround);
        }
        loadUnit();
        if (limits.stability()) {
            solver.ground(false, unitGround);
        }
        return limits.largest(fixed, unit, fixedGround, unitGround);
    }

    /**
     * The force as a function of the pose that tells its pieces, one for each line that may meet a limit; for a solver without weights,
     * where no limit is broken that load relieves.
     */
    BoxMaximum.Objective asObjective() {
        return new BoxMaximum.Objective() {
            @Override
            public double at(double[] fractions) {
                double force = force(fractions);
                return Double.isInfinite(force) ? Double.NaN : force;
            }

            @Override
            public int pieces() {
                return limits.lines();
            }

            @Override
            public void tellPieces(double[] out) {
                for (int line = 0; line < out.length; line++) {
                    out[line] = Math.max(0, limits.meeting(line));
                }
            }
        };
    }

    /** The force at which the duty cylinder alone meets its driving push limit without any other load; in N. */
    public double alone(double[] fractions) {
        if (solver.place(fractions) != PoseSolver.ASSEMBLED || !direct()) {
            return Double.NaN;
        }
        return solver.front().limits(duty, ideal).drivingPush() / speed;
    }

    private boolean direct() {
        solver.travel(edge, duty, travel);
        speed = Math.hypot(travel[0], travel[1]);
        travel[0] /= speed;
        travel[1] /= speed;
        return speed > 0 && speed < Double.POSITIVE_INFINITY;
    }

    private void loadUnit() {
        solver.loads().clear();
        solver.loadAt(edge, -travel[0], -travel[1]);
        solver.solve(unit);
    }

    /** Index of the limit that governs the last answer. */
    public int governing() {
        return limits.governing();
    }

    public LimitSolver limits() {
        return limits;
    }

    /** Force of a cylinder when the tool pushes with {@code force} (N) at the last pose; in N, + push. */
    public double cylinder(int cylinder, double force) {
        return fixed.cylinder(cylinder) + force * unit.cylinder(cylinder);
    }

    /** Forces at no tool force and at one newton more, of the last pose; not to be modified. */
    public ForceBuffer fixed() {
        return fixed;
    }

    public ForceBuffer unit() {
        return unit;
    }
}
