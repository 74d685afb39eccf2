package org.rodside.statics;

import org.rodside.kinematics.CylinderStep;
import org.rodside.kinematics.Mechanism;
import org.rodside.kinematics.PairStep;
import org.rodside.kinematics.PoseBuffer;
import org.rodside.kinematics.Step;

/**
 * Forces step by step, against the order of assembly, from moment sums about the pins (theory S2, S3). Every pin passes
 * what it gathers to the body that owns it. At a dead centre the lever arm is zero and the forces come out infinite or NaN.
 */
public final class StagedForceSolver implements ForceSolver {

    private final Mechanism mechanism;
    private final Step[] steps;
    private final int[][] bearingOf;
    private final double[] pinX;
    private final double[] pinY;
    private double sumX;
    private double sumY;
    private double sumMoment;

    public StagedForceSolver(Mechanism mechanism) {
        this.mechanism = mechanism;
        steps = mechanism.steps().toArray(new Step[0]);
        pinX = new double[mechanism.pins()];
        pinY = new double[mechanism.pins()];
        bearingOf = new int[mechanism.pins()][mechanism.bodies()];
        for (int bearing = 0; bearing < mechanism.bearings(); bearing++) {
            bearingOf[mechanism.bearingPin(bearing)][mechanism.bearingBody(bearing)] = bearing;
        }
    }

    @Override
    public void solve(PoseBuffer pose, LoadBuffer loads, ForceBuffer out) {
        System.arraycopy(loads.pinX, 0, pinX, 0, pinX.length);
        System.arraycopy(loads.pinY, 0, pinY, 0, pinY.length);
        for (int i = steps.length - 1; i >= 0; i--) {
            if (steps[i] instanceof CylinderStep step) {
                cylinder(step, pose, loads, out);
            } else {
                pair((PairStep) steps[i], pose, loads, out);
            }
        }
        for (int pin : mechanism.ownedPins(0)) {
            out.bearingX[bearingOf[pin][0]] = pinX[pin];
            out.bearingY[bearingOf[pin][0]] = pinY[pin];
        }
    }

    /** Sums loads of a body and of the pins it owns, but for one pin; sets the bearings of those pins. */
    private void gather(int body, int except, PoseBuffer pose, LoadBuffer loads, ForceBuffer out) {
        sumX = loads.forceX[body];
        sumY = loads.forceY[body];
        sumMoment = loads.moment[body];
        for (int pin : mechanism.ownedPins(body)) {
            if (pin != except) {
                out.bearingX[bearingOf[pin][body]] = pinX[pin];
                out.bearingY[bearingOf[pin][body]] = pinY[pin];
                addAt(pose, pin, pinX[pin], pinY[pin]);
            }
        }
    }

    private void addAt(PoseBuffer pose, int pin, double fx, double fy) {
        sumX += fx;
        sumY += fy;
        sumMoment += pose.pinX(pin) * fy - pose.pinY(pin) * fx;
    }

    private double momentAbout(PoseBuffer pose, int pin) {
        return sumMoment - pose.pinX(pin) * sumY + pose.pinY(pin) * sumX;
    }

    /** The standing pin carries what is left of a body; its node gets the opposite. */
    private void carry(int body, int pin, ForceBuffer out) {
        out.bearingX[bearingOf[pin][body]] = -sumX;
        out.bearingY[bearingOf[pin][body]] = -sumY;
        pinX[pin] += sumX;
        pinY[pin] += sumY;
    }

    private void cylinder(CylinderStep step, PoseBuffer pose, LoadBuffer loads, ForceBuffer out) {
        int eye = step.eye();
        gather(step.body(), eye, pose, loads, out);
        addAt(pose, eye, pinX[eye], pinY[eye]);
        double ux = step.unitX(pose);
        double uy = step.unitY(pose);
        double arm = (pose.pinX(eye) - pose.pinX(step.pivot())) * uy - (pose.pinY(eye) - pose.pinY(step.pivot())) * ux;
        double push = -momentAbout(pose, step.pivot()) / arm;
        out.cylinder[step.cylinder()] = push;
        addAt(pose, eye, push * ux, push * uy);
        out.bearingX[bearingOf[eye][step.body()]] = pinX[eye] + push * ux;
        out.bearingY[bearingOf[eye][step.body()]] = pinY[eye] + push * uy;
        pinX[step.anchor()] -= push * ux;
        pinY[step.anchor()] -= push * uy;
        carry(step.body(), step.pivot(), out);
    }

    private void pair(PairStep step, PoseBuffer pose, LoadBuffer loads, ForceBuffer out) {
        int joint = step.joint();
        gather(step.first(), joint, pose, loads, out);
        double moment1 = momentAbout(pose, step.firstPin());
        double sum1X = sumX;
        double sum1Y = sumY;
        double sum1Moment = sumMoment;
        gather(step.second(), joint, pose, loads, out);
        addAt(pose, joint, pinX[joint], pinY[joint]);
        double moment2 = momentAbout(pose, step.secondPin());
        double r1x = pose.pinX(joint) - pose.pinX(step.firstPin());
        double r1y = pose.pinY(joint) - pose.pinY(step.firstPin());
        double r2x = pose.pinX(joint) - pose.pinX(step.secondPin());
        double r2y = pose.pinY(joint) - pose.pinY(step.secondPin());
        double cross = r1x * r2y - r1y * r2x;
        double fx = -(moment1 * r2x + moment2 * r1x) / cross;
        double fy = -(moment1 * r2y + moment2 * r1y) / cross;
        out.bearingX[bearingOf[joint][step.second()]] = pinX[joint] - fx;
        out.bearingY[bearingOf[joint][step.second()]] = pinY[joint] - fy;
        addAt(pose, joint, -fx, -fy);
        carry(step.second(), step.secondPin(), out);
        sumX = sum1X;
        sumY = sum1Y;
        sumMoment = sum1Moment;
        addAt(pose, joint, fx, fy);
        out.bearingX[bearingOf[joint][step.first()]] = fx;
        out.bearingY[bearingOf[joint][step.first()]] = fy;
        carry(step.first(), step.firstPin(), out);
    }
}
