package org.rodside.kinematics;

/**
 * A link pivoted on a standing pin and turned by a cylinder from another standing pin: pivot, anchor and eye make a
 * triangle with sides D (pivot to anchor), r (pivot to eye) and the cylinder length (theory K1). Near a dead centre, where
 * the three pins line up, the angle is the square root of a small difference and loses half its digits there; at the dead
 * centre itself the velocity does not exist and comes out infinite or NaN.
 *
 * @param cylinder driving cylinder
 * @param body link placed
 * @param pivot standing pin the link turns about
 * @param anchor standing pin at the other end of the cylinder
 * @param eye pin of the link at the near end of the cylinder
 * @param eyeX drawn eye minus drawn pivot, x; in m
 * @param eyeY drawn eye minus drawn pivot, y; in m
 * @param side +1 where the eye lies to the left of the line from pivot to anchor, -1 to the right
 * @param eyeIsRod +1 where the eye is at the rod end, -1 at the cap end
 */
public record CylinderStep(
        int cylinder, int body, int pivot, int anchor, int eye, double eyeX, double eyeY, int side, int eyeIsRod)
        implements Step {

    @Override
    public boolean place(PoseBuffer pose) {
        double px = pose.pinX(pivot);
        double py = pose.pinY(pivot);
        double dx = pose.pinX(anchor) - px;
        double dy = pose.pinY(anchor) - py;
        double reach2 = eyeX * eyeX + eyeY * eyeY;
        double length = pose.length(cylinder);
        double d2 = dx * dx + dy * dy;
        // foot of the eye on the line pivot-anchor, as a share of D
        double along = 0.5 * (d2 + reach2 - length * length) / d2;
        double across2 = reach2 / d2 - along * along;
        if (!(across2 >= 0)) {
            return false;
        }
        double across = side * Math.sqrt(across2);
        double wx = along * dx - across * dy;
        double wy = along * dy + across * dx;
        double cos = (eyeX * wx + eyeY * wy) / reach2;
        double sin = (eyeX * wy - eyeY * wx) / reach2;
        pose.place(body, cos, sin, pivot);
        return true;
    }

    @Override
    public void rates(PoseBuffer pose, double[] rates, MotionBuffer motion) {
        double ux = unitX(pose);
        double uy = unitY(pose);
        double rx = pose.pinX(eye) - pose.pinX(pivot);
        double ry = pose.pinY(eye) - pose.pinY(pivot);
        double closing =
                ux * (motion.pinVx(pivot) - motion.pinVx(anchor)) + uy * (motion.pinVy(pivot) - motion.pinVy(anchor));
        double turn = (rates[cylinder] - closing) / (rx * uy - ry * ux);
        motion.setRate(pose, body, turn, pivot);
    }

    @Override
    public void accelerations(PoseBuffer pose, double[] accelerations, MotionBuffer motion) {
        double ux = unitX(pose);
        double uy = unitY(pose);
        double rx = pose.pinX(eye) - pose.pinX(pivot);
        double ry = pose.pinY(eye) - pose.pinY(pivot);
        double across =
                ux * (motion.pinVy(eye) - motion.pinVy(anchor)) - uy * (motion.pinVx(eye) - motion.pinVx(anchor));
        double omega = motion.omega(body);
        double ax = motion.pinAx(pivot) - motion.pinAx(anchor) - omega * omega * rx;
        double ay = motion.pinAy(pivot) - motion.pinAy(anchor) - omega * omega * ry;
        double wanted = accelerations[cylinder] - across * across / pose.length(cylinder) - ux * ax - uy * ay;
        motion.setAcceleration(pose, body, wanted / (rx * uy - ry * ux), pivot);
    }

    /** Unit vector from anchor to eye, x; no unit. */
    public double unitX(PoseBuffer pose) {
        return (pose.pinX(eye) - pose.pinX(anchor)) / pose.length(cylinder);
    }

    /** Unit vector from anchor to eye, y; no unit. */
    public double unitY(PoseBuffer pose) {
        return (pose.pinY(eye) - pose.pinY(anchor)) / pose.length(cylinder);
    }
}
