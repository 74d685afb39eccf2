package org.rodside.statics;

import org.rodside.kinematics.Mechanism;
import org.rodside.kinematics.PoseBuffer;

/** Pose and loads to forces. Two ways do the same; a solver owns its scratch, one per thread. */
public interface ForceSolver {

    /**
     * Cylinder and bearing forces that balance the loads.
     *
     * @param pose an assembled pose; not modified
     * @param loads all known forces; not modified
     * @param out overwritten; NaN or infinite where the linkage stands at a dead centre and cannot carry the loads
     */
    void solve(PoseBuffer pose, LoadBuffer loads, ForceBuffer out);

    /** The quickest solver that fits the mechanism. */
    static ForceSolver of(Mechanism mechanism) {
        return mechanism.staged() ? new StagedForceSolver(mechanism) : new DenseForceSolver(mechanism);
    }
}
