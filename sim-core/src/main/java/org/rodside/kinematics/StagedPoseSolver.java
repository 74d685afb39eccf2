package org.rodside.kinematics;

/** Closed form, one step after the other (theory K1, K2, K3). Holds no state of its own. */
public final class StagedPoseSolver implements PoseSolver {

    private final Step[] steps;

    /**
     * @throws IllegalArgumentException where the mechanism does not fall into steps
     */
    public StagedPoseSolver(Mechanism mechanism) {
        if (!mechanism.staged()) {
            throw new IllegalArgumentException("the mechanism does not fall into closed-form steps");
        }
        steps = mechanism.steps().toArray(new Step[0]);
    }

    @Override
    public int solve(double[] strokes, PoseBuffer pose) {
        pose.begin(strokes);
        for (Step step : steps) {
            if (!step.place(pose)) {
                pose.clear();
                return step instanceof CylinderStep c ? c.body() : ((PairStep) step).first();
            }
        }
        return ASSEMBLED;
    }

    @Override
    public void rates(PoseBuffer pose, double[] rates, MotionBuffer motion) {
        motion.setRate(pose, 0, 0, 0, 0);
        for (Step step : steps) {
            step.rates(pose, rates, motion);
        }
    }

    @Override
    public void accelerations(PoseBuffer pose, double[] accelerations, MotionBuffer motion) {
        motion.setAcceleration(pose, 0, 0, 0, 0);
        for (Step step : steps) {
            step.accelerations(pose, accelerations, motion);
        }
    }
}
