package org.rodside.statics;

import java.util.List;
import org.rodside.kinematics.Mechanism;
import org.rodside.kinematics.MotionBuffer;
import org.rodside.kinematics.PoseBuffer;
import org.rodside.model.Cylinder;
import org.rodside.model.Link;
import org.rodside.model.Linkage;

/**
 * Masses of a linkage as loads: weights, and what motion adds (d'Alembert, theory S5). Link masses at their centres of
 * gravity with their radius of gyration; half of each cylinder on each of its pins. Immutable.
 */
public final class Masses {

    private final Mechanism mechanism;
    private final double[] mass;
    private final double[] cgX;
    private final double[] cgY;
    private final double[] inertia;
    private final double[] eyeMass;

    /** All masses of the linkage. */
    public Masses(Mechanism mechanism) {
        this(mechanism, -1);
    }

    /**
     * All masses but that of one link.
     *
     * @param without body whose mass is left out; -1 for none
     */
    public Masses(Mechanism mechanism, int without) {
        this.mechanism = mechanism;
        Linkage linkage = mechanism.linkage();
        int bodies = mechanism.bodies();
        mass = new double[bodies];
        cgX = new double[bodies];
        cgY = new double[bodies];
        inertia = new double[bodies];
        eyeMass = new double[mechanism.pins()];
        for (int body = 1; body < bodies; body++) {
            Link link = linkage.links().get(body - 1);
            mass[body] = body == without ? 0 : link.mass();
            cgX[body] = link.cg().x();
            cgY[body] = link.cg().y();
            inertia[body] = mass[body] * link.gyration() * link.gyration();
        }
        List<Cylinder> cylinders = linkage.cylinders();
        for (int c = 0; c < cylinders.size(); c++) {
            double half = 0.5 * cylinders.get(c).count() * cylinders.get(c).mass();
            eyeMass[mechanism.capPin(c)] += half;
            eyeMass[mechanism.rodPin(c)] += half;
        }
    }

    /** Mass of a body; in kg. */
    public double mass(int body) {
        return mass[body];
    }

    /** Mass of the cylinder halves on a pin; in kg. */
    public double eyeMass(int pin) {
        return eyeMass[pin];
    }

    /** Drawn centre of gravity of a body, x; in m. */
    public double cgX(int body) {
        return cgX[body];
    }

    /** Drawn centre of gravity of a body, y; in m. */
    public double cgY(int body) {
        return cgY[body];
    }

    /** Moment of inertia of a body about its centre of gravity; in kg·m². */
    public double inertia(int body) {
        return inertia[body];
    }

    /**
     * Adds all weights.
     *
     * @param pose the pose; not modified
     * @param loads added to
     */
    public void addWeights(PoseBuffer pose, LoadBuffer loads) {
        for (int body = 1; body < mass.length; body++) {
            double x = pose.x(body, cgX[body], cgY[body]);
            double y = pose.y(body, cgX[body], cgY[body]);
            loads.add(body, x, y, 0, -mass[body] * Linkage.GRAVITY);
        }
        for (int pin = 0; pin < eyeMass.length; pin++) {
            loads.addPin(pin, 0, -eyeMass[pin] * Linkage.GRAVITY);
        }
    }

    /**
     * Adds what motion asks of every mass, as forces against the accelerations.
     *
     * @param pose the pose; not modified
     * @param motion velocities and accelerations at the pose; not modified
     * @param loads added to
     */
    public void addInertia(PoseBuffer pose, MotionBuffer motion, LoadBuffer loads) {
        for (int body = 1; body < mass.length; body++) {
            double x = pose.x(body, cgX[body], cgY[body]);
            double y = pose.y(body, cgX[body], cgY[body]);
            double ax = motion.ax(pose, body, x, y);
            double ay = motion.ay(pose, body, x, y);
            loads.add(body, x, y, -mass[body] * ax, -mass[body] * ay);
            loads.addMoment(body, -inertia[body] * motion.alpha(body));
        }
        for (int pin = 0; pin < eyeMass.length; pin++) {
            loads.addPin(pin, -eyeMass[pin] * motion.pinAx(pin), -eyeMass[pin] * motion.pinAy(pin));
        }
    }
}
