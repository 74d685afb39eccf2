package org.rodside.statics;

import java.util.Arrays;
import org.rodside.kinematics.Mechanism;

/**
 * Known forces on a linkage at one pose: a force and a moment about the origin of the machine axes on every body, and a
 * force on every pin (the pin as a massless node between links and cylinder eyes). N and N·m, anticlockwise positive.
 * Mutable and not thread-safe.
 */
public final class LoadBuffer {

    final double[] forceX;
    final double[] forceY;
    final double[] moment;
    final double[] pinX;
    final double[] pinY;

    public LoadBuffer(Mechanism mechanism) {
        forceX = new double[mechanism.bodies()];
        forceY = new double[mechanism.bodies()];
        moment = new double[mechanism.bodies()];
        pinX = new double[mechanism.pins()];
        pinY = new double[mechanism.pins()];
    }

    /** No load. */
    public void clear() {
        Arrays.fill(forceX, 0);
        Arrays.fill(forceY, 0);
        Arrays.fill(moment, 0);
        Arrays.fill(pinX, 0);
        Arrays.fill(pinY, 0);
    }

    /** Adds a force on a body at a place; m and N, machine axes. */
    public void add(int body, double x, double y, double fx, double fy) {
        forceX[body] += fx;
        forceY[body] += fy;
        moment[body] += x * fy - y * fx;
    }

    /** Adds a pure moment on a body; in N·m. */
    public void addMoment(int body, double couple) {
        moment[body] += couple;
    }

    /** Adds a force on a pin; in N, machine axes. */
    public void addPin(int pin, double fx, double fy) {
        pinX[pin] += fx;
        pinY[pin] += fy;
    }

    /** Adds a multiple of other loads. */
    public void add(double factor, LoadBuffer other) {
        for (int i = 0; i < forceX.length; i++) {
            forceX[i] += factor * other.forceX[i];
            forceY[i] += factor * other.forceY[i];
            moment[i] += factor * other.moment[i];
        }
        for (int i = 0; i < pinX.length; i++) {
            pinX[i] += factor * other.pinX[i];
            pinY[i] += factor * other.pinY[i];
        }
    }
}
