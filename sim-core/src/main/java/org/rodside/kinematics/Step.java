package org.rodside.kinematics;

/**
 * One step of assembly: places one or two links against bodies that stand already. Which of the two mirror images is
 * right was settled by the drawing.
 */
public sealed interface Step permits CylinderStep, PairStep {

    /**
     * Places the links of this step and the pins they own.
     *
     * @param pose bodies of earlier steps and cylinder lengths set; this step's bodies and pins overwritten
     * @return false where the loop does not close; the pose is then left as it was
     */
    boolean place(PoseBuffer pose);

    /**
     * Angular velocity and velocity of the links of this step.
     *
     * @param pose the pose; not modified
     * @param rates rate of each cylinder's length; in m/s, not modified
     * @param motion earlier bodies set; this step's overwritten
     */
    void rates(PoseBuffer pose, double[] rates, MotionBuffer motion);

    /**
     * Angular acceleration and acceleration of the links of this step.
     *
     * @param pose the pose; not modified
     * @param accelerations second time derivative of each cylinder's length; in m/s², not modified
     * @param motion velocities of all bodies and accelerations of earlier bodies set; this step's overwritten
     */
    void accelerations(PoseBuffer pose, double[] accelerations, MotionBuffer motion);
}
