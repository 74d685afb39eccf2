package org.rodside.kinematics;

/**
 * Strokes to positions, velocities and accelerations. Two ways do the same: step by step in closed form, and Newton on all
 * pin equations at once. A solver may own scratch memory: one per thread.
 */
public interface PoseSolver {

    /** Status of a pose that assembles. */
    int ASSEMBLED = -1;

    /**
     * Places every link, on the branch of the drawing.
     *
     * @param strokes stroke of each cylinder from its retracted length; in m, not modified, not checked against the
     *     cylinder's own range
     * @param pose overwritten; NaN where the pose does not assemble
     * @return {@link #ASSEMBLED}, or the index of the first body that cannot be placed
     */
    int solve(double[] strokes, PoseBuffer pose);

    /**
     * Velocities at a pose.
     *
     * @param pose a pose of this solver; not modified
     * @param rates rate of each stroke; in m/s, not modified
     * @param motion velocities overwritten; infinite or NaN at a dead centre
     */
    void rates(PoseBuffer pose, double[] rates, MotionBuffer motion);

    /**
     * Accelerations at a pose.
     *
     * @param pose a pose of this solver; not modified
     * @param accelerations second derivative of each stroke; in m/s², not modified
     * @param motion velocities as {@link #rates} left them; accelerations overwritten
     */
    void accelerations(PoseBuffer pose, double[] accelerations, MotionBuffer motion);
}
