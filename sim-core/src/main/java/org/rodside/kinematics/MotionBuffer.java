package org.rodside.kinematics;

/**
 * Velocities and accelerations of one pose, filled by a {@link PoseSolver}. Machine axes; m/s, rad/s, m/s², rad/s²,
 * anticlockwise positive. Mutable and not thread-safe; one per thread.
 */
public final class MotionBuffer {

    private final Mechanism mechanism;
    private final double[] omega;
    private final double[] vx;
    private final double[] vy;
    private final double[] alpha;
    private final double[] ax;
    private final double[] ay;
    private final double[] pinVx;
    private final double[] pinVy;
    private final double[] pinAx;
    private final double[] pinAy;

    public MotionBuffer(Mechanism mechanism) {
        this.mechanism = mechanism;
        int bodies = mechanism.bodies();
        int pins = mechanism.pins();
        omega = new double[bodies];
        vx = new double[bodies];
        vy = new double[bodies];
        alpha = new double[bodies];
        ax = new double[bodies];
        ay = new double[bodies];
        pinVx = new double[pins];
        pinVy = new double[pins];
        pinAx = new double[pins];
        pinAy = new double[pins];
    }

    /** Sets a body's angular velocity about one of its pins, whose velocity is set already. */
    void setRate(PoseBuffer pose, int body, double turnRate, int pivot) {
        double originVx = pinVx[pivot] + turnRate * (pose.pinY(pivot) - pose.originY(body));
        double originVy = pinVy[pivot] - turnRate * (pose.pinX(pivot) - pose.originX(body));
        setRate(pose, body, turnRate, originVx, originVy);
    }

    void setRate(PoseBuffer pose, int body, double turnRate, double originVx, double originVy) {
        omega[body] = turnRate;
        vx[body] = originVx;
        vy[body] = originVy;
        for (int pin : mechanism.ownedPins(body)) {
            pinVx[pin] = vx(pose, body, pose.pinX(pin), pose.pinY(pin));
            pinVy[pin] = vy(pose, body, pose.pinX(pin), pose.pinY(pin));
        }
    }

    /** Sets a body's angular acceleration about one of its pins, whose acceleration is set already. */
    void setAcceleration(PoseBuffer pose, int body, double turnAcceleration, int pivot) {
        double square = omega[body] * omega[body];
        double rx = pose.pinX(pivot) - pose.originX(body);
        double ry = pose.pinY(pivot) - pose.originY(body);
        double originAx = pinAx[pivot] + turnAcceleration * ry + square * rx;
        double originAy = pinAy[pivot] - turnAcceleration * rx + square * ry;
        setAcceleration(pose, body, turnAcceleration, originAx, originAy);
    }

    void setAcceleration(PoseBuffer pose, int body, double turnAcceleration, double originAx, double originAy) {
        alpha[body] = turnAcceleration;
        ax[body] = originAx;
        ay[body] = originAy;
        for (int pin : mechanism.ownedPins(body)) {
            pinAx[pin] = ax(pose, body, pose.pinX(pin), pose.pinY(pin));
            pinAy[pin] = ay(pose, body, pose.pinX(pin), pose.pinY(pin));
        }
    }

    void setPinRate(int pin, double rateX, double rateY) {
        pinVx[pin] = rateX;
        pinVy[pin] = rateY;
    }

    void setPinAcceleration(int pin, double accelerationX, double accelerationY) {
        pinAx[pin] = accelerationX;
        pinAy[pin] = accelerationY;
    }

    /** Angular velocity of a body; in rad/s. */
    public double omega(int body) {
        return omega[body];
    }

    /** Angular acceleration of a body; in rad/s². */
    public double alpha(int body) {
        return alpha[body];
    }

    /** Velocity of the point of a body that stands at (x, y), x part; in m/s. */
    public double vx(PoseBuffer pose, int body, double x, double y) {
        return vx[body] - omega[body] * (y - pose.originY(body));
    }

    /** Velocity of the point of a body that stands at (x, y), y part; in m/s. */
    public double vy(PoseBuffer pose, int body, double x, double y) {
        return vy[body] + omega[body] * (x - pose.originX(body));
    }

    /** Acceleration of the point of a body that stands at (x, y), x part; in m/s². */
    public double ax(PoseBuffer pose, int body, double x, double y) {
        double rx = x - pose.originX(body);
        double ry = y - pose.originY(body);
        return ax[body] - alpha[body] * ry - omega[body] * omega[body] * rx;
    }

    /** Acceleration of the point of a body that stands at (x, y), y part; in m/s². */
    public double ay(PoseBuffer pose, int body, double x, double y) {
        double rx = x - pose.originX(body);
        double ry = y - pose.originY(body);
        return ay[body] + alpha[body] * rx - omega[body] * omega[body] * ry;
    }

    public double pinVx(int pin) {
        return pinVx[pin];
    }

    public double pinVy(int pin) {
        return pinVy[pin];
    }

    public double pinAx(int pin) {
        return pinAx[pin];
    }

    public double pinAy(int pin) {
        return pinAy[pin];
    }
}
