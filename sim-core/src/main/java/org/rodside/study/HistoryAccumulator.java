package org.rodside.study;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.rodside.hydraulics.CylinderLimits;
import org.rodside.kinematics.Mechanism;

/**
 * What a history met: duration, peaks with their times, and where a cylinder or the pump cannot follow. Mutable and not
 * thread-safe.
 */
public final class HistoryAccumulator {

    /** A speed below this is standing still: the cylinder holds rather than drives; in m/s. */
    private static final double STILL = 1e-6;

    private final Front front;
    private final HistoryQuestion question;
    private final int cylinders;
    private final double[][] peak;
    private final double[][] peakTime;
    private final double[] bearing;
    private final double[] bearingTime;
    private final Map<String, Excess> excesses = new LinkedHashMap<>();
    private long rows;
    private double first;
    private double last;
    private double flow;
    private double flowTime;
    private double power = Double.NEGATIVE_INFINITY;
    private double powerTime;
    private double fit;

    /** Peaks kept for each cylinder, in this order. */
    public enum Peak {
        PUSH,
        PULL,
        SPEED,
        CAP,
        ROD,
        FLOW
    }

    /**
     * Something a cylinder or the pump could not give.
     *
     * @param cause name of the limit passed, as limits are named, or {@code pump}
     * @param rows rows in which it is passed
     * @param time of the worst; in s
     * @param worst worst demand over what is there; no unit, above 1
     */
    public record Excess(String cause, long rows, double time, double worst) {}

    HistoryAccumulator(Front front, HistoryQuestion question) {
        this.front = front;
        this.question = question;
        cylinders = front.mechanism().cylinders();
        peak = new double[cylinders][Peak.values().length];
        peakTime = new double[cylinders][Peak.values().length];
        bearing = new double[front.mechanism().bearings()];
        bearingTime = new double[bearing.length];
    }

    /** Takes one row of a history. */
    void accept(double[] row) {
        first = rows == 0 ? row[0] : first;
        last = row[0];
        rows++;
        double pumped = 0;
        double work = 0;
        for (int c = 0; c < cylinders; c++) {
            int at = 1 + 6 * c;
            double speed = row[at + 1];
            double force = row[at + 2];
            keep(c, row, at);
            pumped += Math.abs(row[at + 5]);
            work += force * speed;
            judge(c, speed, force);
        }
        totals(pumped, work);
        for (int b = 0; b < bearing.length; b++) {
            int at = 5 + 6 * cylinders + 2 * b;
            double size = Math.hypot(row[at], row[at + 1]);
            if (size > bearing[b]) {
                bearing[b] = size;
                bearingTime[b] = last;
            }
        }
        fit = question.measured() ? Math.max(fit, row[row.length - 1]) : fit;
    }

    private void keep(int c, double[] row, int at) {
        keep(c, Peak.PUSH, row[at + 2]);
        keep(c, Peak.PULL, -row[at + 2]);
        keep(c, Peak.SPEED, Math.abs(row[at + 1]));
        keep(c, Peak.CAP, row[at + 3]);
        keep(c, Peak.ROD, row[at + 4]);
        keep(c, Peak.FLOW, Math.abs(row[at + 5]));
    }

    private void totals(double pumped, double work) {
        if (pumped > flow) {
            flow = pumped;
            flowTime = last;
        }
        if (work > power) {
            power = work;
            powerTime = last;
        }
        if (pumped > question.pump()) {
            excess("pump", pumped / question.pump());
        }
    }

    private void keep(int c, Peak kind, double value) {
        if (value > peak[c][kind.ordinal()]) {
            peak[c][kind.ordinal()] = value;
            peakTime[c][kind.ordinal()] = last;
        }
    }

    /** A cylinder that moves with its force drives; one that stands or is pushed back holds. */
    private void judge(int c, double speed, double force) {
        CylinderLimits limits = front.limits(c, false);
        boolean drives = Math.abs(speed) > STILL && force * speed > 0;
        double most = force >= 0
                ? drives ? limits.drivingPush() : limits.holdingPush()
                : drives ? limits.drivingPull() : limits.holdingPull();
        if (Math.abs(force) > most) {
            String name = front.mechanism().cylinderName(c) + (drives ? ".working" : ".relief");
            excess(name + (force >= 0 ? ".cap" : ".rod"), Math.abs(force) / most);
        }
    }

    private void excess(String cause, double ratio) {
        Excess before = excesses.get(cause);
        if (before == null) {
            excesses.put(cause, new Excess(cause, 1, last, ratio));
        } else {
            boolean worse = ratio > before.worst();
            excesses.put(
                    cause,
                    new Excess(cause, before.rows() + 1, worse ? last : before.time(), worse ? ratio : before.worst()));
        }
    }

    public long rows() {
        return rows;
    }

    /** From the first row to the last; in s. */
    public double duration() {
        return last - first;
    }

    /** A peak of a cylinder, a size; N, m/s, Pa or m³/s. */
    public double peak(int cylinder, Peak kind) {
        return peak[cylinder][kind.ordinal()];
    }

    /** When a peak of a cylinder was met; in s. */
    public double peakTime(int cylinder, Peak kind) {
        return peakTime[cylinder][kind.ordinal()];
    }

    /** Largest force of a pin on a link; in N. */
    public double bearing(int bearing) {
        return this.bearing[bearing];
    }

    /** When it was met; in s. */
    public double bearingTime(int bearing) {
        return bearingTime[bearing];
    }

    /** Largest flow into all cylinders together; in m³/s. */
    public double flow() {
        return flow;
    }

    public double flowTime() {
        return flowTime;
    }

    /** Largest power given by all cylinders together; in W. */
    public double power() {
        return power;
    }

    public double powerTime() {
        return powerTime;
    }

    /** Largest residual of the fit of measured forces; in N. */
    public double fit() {
        return fit;
    }

    /** What could not be given, in the order met. */
    public List<Excess> excesses() {
        return new ArrayList<>(excesses.values());
    }

    /** The mechanism, for names. */
    public Mechanism mechanism() {
        return front.mechanism();
    }
}
