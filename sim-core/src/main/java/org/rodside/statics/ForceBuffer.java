package org.rodside.statics;

import java.util.Arrays;
import org.rodside.kinematics.Mechanism;

/**
 * Forces found at one pose: total force of every cylinder (+ push) and the force of the pin on the link for every
 * (pin, link) pair of {@link Mechanism#bearings()}. N, machine axes. Mutable and not thread-safe.
 */
public final class ForceBuffer {

    final double[] cylinder;
    final double[] bearingX;
    final double[] bearingY;

    public ForceBuffer(Mechanism mechanism) {
        cylinder = new double[mechanism.cylinders()];
        bearingX = new double[mechanism.bearings()];
        bearingY = new double[mechanism.bearings()];
    }

    void clear() {
        Arrays.fill(cylinder, Double.NaN);
        Arrays.fill(bearingX, Double.NaN);
        Arrays.fill(bearingY, Double.NaN);
    }

    /** Total force of a cylinder with its twins, + push, - pull; in N. */
    public double cylinder(int cylinder) {
        return this.cylinder[cylinder];
    }

    /** Force of the pin on the link, x; in N. */
    public double bearingX(int bearing) {
        return bearingX[bearing];
    }

    /** Force of the pin on the link, y; in N. */
    public double bearingY(int bearing) {
        return bearingY[bearing];
    }

    /** This plus a multiple of other forces at the same pose: forces are linear in the loads. */
    public void add(double factor, ForceBuffer other) {
        for (int i = 0; i < cylinder.length; i++) {
            cylinder[i] += factor * other.cylinder[i];
        }
        for (int i = 0; i < bearingX.length; i++) {
            bearingX[i] += factor * other.bearingX[i];
            bearingY[i] += factor * other.bearingY[i];
        }
    }
}
