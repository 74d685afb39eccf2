package org.rodside.study;

import java.util.Arrays;
import org.rodside.kinematics.Mechanism;
import org.rodside.kinematics.MotionBuffer;
import org.rodside.kinematics.PoseBuffer;
import org.rodside.kinematics.PoseSolver;
import org.rodside.model.Machine;
import org.rodside.statics.ForceBuffer;
import org.rodside.statics.ForceSolver;
import org.rodside.statics.GroundBuffer;
import org.rodside.statics.LoadBuffer;
import org.rodside.statics.Masses;

/**
 * One front at one pose: places it, loads it, finds the forces. Owns its scratch, allocates nothing per pose; one per
 * thread.
 */
public final class FrontSolver {

    private final Front front;
    private final PoseSolver poses;
    private final ForceSolver forces;
    private final PoseBuffer pose;
    private final MotionBuffer motion;
    private final LoadBuffer loads;
    private final double[] strokes;
    private final double[] rates;

    public FrontSolver(Front front) {
        this.front = front;
        Mechanism mechanism = front.mechanism();
        poses = mechanism.newSolver();
        forces = ForceSolver.of(mechanism);
        pose = new PoseBuffer(mechanism);
        motion = new MotionBuffer(mechanism);
        loads = new LoadBuffer(mechanism);
        strokes = new double[mechanism.cylinders()];
        rates = new double[mechanism.cylinders()];
    }

    public Front front() {
        return front;
    }

    /** The pose last placed. */
    public PoseBuffer pose() {
        return pose;
    }

    /**
     * Places the front.
     *
     * @param fractions fraction of stroke of each cylinder, 0 retracted, 1 extended; not modified, not checked
     * @return {@link PoseSolver#ASSEMBLED} or the first body that cannot be placed
     */
    public int place(double[] fractions) {
        for (int c = 0; c < strokes.length; c++) {
            strokes[c] = fractions[c] * front.mechanism().stroke(c);
        }
        return poses.solve(strokes, pose);
    }

    /**
     * Velocity of a place while one cylinder extends at 1 m/s and the others are locked; no unit (m/s for each m/s).
     *
     * @param place the place
     * @param cylinder the cylinder that extends
     * @param out x and y part; overwritten
     */
    public void travel(Place place, int cylinder, double[] out) {
        travel(cylinder);
        double x = place.x(pose);
        double y = place.y(pose);
        out[0] = motion.vx(pose, place.body(), x, y);
        out[1] = motion.vy(pose, place.body(), x, y);
    }

    /** Velocities of everything while one cylinder extends at 1 m/s and the others are locked: {@link #motion}. */
    public void travel(int cylinder) {
        Arrays.fill(rates, 0);
        rates[cylinder] = 1;
        poses.rates(pose, rates, motion);
    }

    /** Velocities left by the last travel. */
    public MotionBuffer motion() {
        return motion;
    }

    /** Loads to fill for {@link #solve}; starts with {@link LoadBuffer#clear()}. */
    public LoadBuffer loads() {
        return loads;
    }

    /** Clears the loads and adds the weights of some masses. */
    public void loadWeights(Masses masses) {
        loads.clear();
        masses.addWeights(pose, loads);
    }

    /** Adds a force on the tool at a place; in N, machine axes. */
    public void loadAt(Place place, double fx, double fy) {
        loads.add(place.body(), place.x(pose), place.y(pose), fx, fy);
    }

    /** Finds the forces that balance the loads; out overwritten. */
    public void solve(ForceBuffer out) {
        forces.solve(pose, loads, out);
    }

    /** Sums what the loads, and where asked the machine's weight, ask of the ground; out overwritten. */
    public void ground(boolean withMachine, GroundBuffer out) {
        out.sum(pose, loads);
        if (withMachine) {
            Machine machine = front.machineOrFault();
            out.addWeight(machine.swinging());
            out.addWeight(machine.fixed());
        }
    }
}
