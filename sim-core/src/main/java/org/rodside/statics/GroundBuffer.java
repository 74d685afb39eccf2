package org.rodside.statics;

import org.rodside.kinematics.PoseBuffer;
import org.rodside.model.Linkage;
import org.rodside.model.Weight;

/**
 * Sum of everything that acts on the whole machine but the ground under it, and the ground reaction that balances it
 * (theory S4). Level ground at y = 0; N and m, machine axes. Mutable and not thread-safe.
 */
public final class GroundBuffer {

    private double sumX;
    private double sumY;
    private double moment;

    /**
     * Sums all loads on the front; overwrites what stood here.
     *
     * @param pose the pose; not modified
     * @param loads all known forces on the front at the pose; not modified
     */
    public void sum(PoseBuffer pose, LoadBuffer loads) {
        sumX = 0;
        sumY = 0;
        moment = 0;
        for (int body = 0; body < loads.forceX.length; body++) {
            sumX += loads.forceX[body];
            sumY += loads.forceY[body];
            moment += loads.moment[body];
        }
        for (int pin = 0; pin < loads.pinX.length; pin++) {
            sumX += loads.pinX[pin];
            sumY += loads.pinY[pin];
            moment += pose.pinX(pin) * loads.pinY[pin] - pose.pinY(pin) * loads.pinX[pin];
        }
    }

    /** Adds a weight of the machine. */
    public void addWeight(Weight weight) {
        addWeight(weight.mass(), weight.cg().x());
    }

    /** Adds a mass (kg) that hangs at x (m). */
    public void addWeight(double mass, double x) {
        sumY -= mass * Linkage.GRAVITY;
        moment -= x * mass * Linkage.GRAVITY;
    }

    /** Ground on machine, upwards; in N. */
    public double normal() {
        return -sumY;
    }

    /** Ground on machine, forwards; in N. */
    public double horizontal() {
        return -sumX;
    }

    /** Where the vertical ground reaction passes; in m from the swing axis, NaN or infinite where there is none. */
    public double resultantX() {
        return moment / sumY;
    }

    /**
     * Moment of everything but the ground about a tipping line at x; in N·m. Anticlockwise positive: the machine stands on a
     * front line while this is above zero, on a rear line while it is below.
     */
    public double momentAbout(double x) {
        return moment - x * sumY;
    }
}
