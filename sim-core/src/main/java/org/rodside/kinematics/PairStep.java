package org.rodside.kinematics;

/**
 * Two links between two standing pins, joined by a third pin: the joint is the intersection of two circles (theory K2).
 * Loses half its digits near a dead centre, where the three pins line up; there velocities grow without bound.
 *
 * @param first link from the first standing pin to the joint; it owns the joint
 * @param second link from the second standing pin to the joint
 * @param firstPin standing pin of the first link
 * @param secondPin standing pin of the second link
 * @param joint pin that joins the two
 * @param firstX drawn joint minus drawn first pin, x; in m
 * @param firstY drawn joint minus drawn first pin, y; in m
 * @param secondX drawn joint minus drawn second pin, x; in m
 * @param secondY drawn joint minus drawn second pin, y; in m
 * @param side +1 where the joint lies to the left of the line from first to second pin, -1 to the right
 */
public record PairStep(
        int first,
        int second,
        int firstPin,
        int secondPin,
        int joint,
        double firstX,
        double firstY,
        double secondX,
        double secondY,
        int side)
        implements Step {

    @Override
    public boolean place(PoseBuffer pose) {
        double dx = pose.pinX(secondPin) - pose.pinX(firstPin);
        double dy = pose.pinY(secondPin) - pose.pinY(firstPin);
        double first2 = firstX * firstX + firstY * firstY;
        double second2 = secondX * secondX + secondY * secondY;
        double d2 = dx * dx + dy * dy;
        double along = 0.5 * (d2 + first2 - second2) / d2;
        double across2 = first2 / d2 - along * along;
        if (!(across2 >= 0)) {
            return false;
        }
        double across = side * Math.sqrt(across2);
        double wx = along * dx - across * dy;
        double wy = along * dy + across * dx;
        pose.place(first, (firstX * wx + firstY * wy) / first2, (firstX * wy - firstY * wx) / first2, firstPin);
        double vx = wx - dx;
        double vy = wy - dy;
        pose.place(second, (secondX * vx + secondY * vy) / second2, (secondX * vy - secondY * vx) / second2, secondPin);
        return true;
    }

    @Override
    public void rates(PoseBuffer pose, double[] rates, MotionBuffer motion) {
        double vx = motion.pinVx(secondPin) - motion.pinVx(firstPin);
        double vy = motion.pinVy(secondPin) - motion.pinVy(firstPin);
        motion.setRate(pose, first, turnOfFirst(pose, vx, vy), firstPin);
        motion.setRate(pose, second, turnOfSecond(pose, vx, vy), secondPin);
    }

    @Override
    public void accelerations(PoseBuffer pose, double[] accelerations, MotionBuffer motion) {
        double omega1 = motion.omega(first);
        double omega2 = motion.omega(second);
        double square1 = omega1 * omega1;
        double square2 = omega2 * omega2;
        double ax = motion.pinAx(secondPin) - motion.pinAx(firstPin) + square1 * r1x(pose) - square2 * r2x(pose);
        double ay = motion.pinAy(secondPin) - motion.pinAy(firstPin) + square1 * r1y(pose) - square2 * r2y(pose);
        motion.setAcceleration(pose, first, turnOfFirst(pose, ax, ay), firstPin);
        motion.setAcceleration(pose, second, turnOfSecond(pose, ax, ay), secondPin);
    }

    /** Solves turn1 × r1 - turn2 × r2 = (x, y) for turn1. */
    private double turnOfFirst(PoseBuffer pose, double x, double y) {
        return (x * r2x(pose) + y * r2y(pose)) / cross(pose);
    }

    /** Solves turn1 × r1 - turn2 × r2 = (x, y) for turn2. */
    private double turnOfSecond(PoseBuffer pose, double x, double y) {
        return (x * r1x(pose) + y * r1y(pose)) / cross(pose);
    }

    private double cross(PoseBuffer pose) {
        return r1x(pose) * r2y(pose) - r1y(pose) * r2x(pose);
    }

    private double r1x(PoseBuffer pose) {
        return pose.pinX(joint) - pose.pinX(firstPin);
    }

    private double r1y(PoseBuffer pose) {
        return pose.pinY(joint) - pose.pinY(firstPin);
    }

    private double r2x(PoseBuffer pose) {
        return pose.pinX(joint) - pose.pinX(secondPin);
    }

    private double r2y(PoseBuffer pose) {
        return pose.pinY(joint) - pose.pinY(secondPin);
    }
}
