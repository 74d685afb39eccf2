package org.rodside.study;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.rodside.hydraulics.CylinderLimits;
import org.rodside.model.Machine;
import org.rodside.statics.ForceBuffer;
import org.rodside.statics.GroundBuffer;

/**
 * Limits met by a line (theory S6): every force is affine in one load factor t ≥ 0, so the largest t is the first place
 * where the line meets a limit. Order of the limits: each cylinder's push and pull in file order, then tipping over the
 * front and the rear line, then slip. A limit broken at t = 0 already gives t = 0; of several the first in this order is
 * named. Owns its last answer; one per thread.
 */
public final class LimitSolver {

    /** Index of no limit. */
    public static final int NONE = -1;

    private final List<String> names = new ArrayList<>();
    private final double[] push;
    private final double[] pull;
    private final boolean stability;
    private final double front;
    private final double rear;
    private final double grip;
    private final double[] meeting;

    /** Index of the limit of slip, on which two lines end, one for each direction. */
    private final int slip;

    private double largest;
    private int governing;

    /**
     * @param front the front
     * @param driving cylinder within its driving limits; -1 where every cylinder holds
     * @param ideal true to leave friction, back pressure, tipping and slip out
     */
    public LimitSolver(Front front, int driving, boolean ideal) {
        int cylinders = front.mechanism().cylinders();
        push = new double[cylinders];
        pull = new double[cylinders];
        for (int c = 0; c < cylinders; c++) {
            CylinderLimits limits = front.limits(c, ideal);
            push[c] = c == driving ? limits.drivingPush() : limits.holdingPush();
            pull[c] = c == driving ? limits.drivingPull() : limits.holdingPull();
            String name = front.mechanism().cylinderName(c) + (c == driving ? ".working" : ".relief");
            names.add(name + ".cap");
            names.add(name + ".rod");
        }
        names.addAll(List.of("tipping.front", "tipping.rear", "slip"));
        slip = names.size() - 1;
        Machine machine = front.machine().orElse(null);
        stability = machine != null && !ideal;
        this.front = stability ? machine.tippingFront() : Double.NaN;
        rear = stability ? machine.tippingRear() : Double.NaN;
        grip = stability && machine.grip().isPresent() ? machine.grip().getAsDouble() : Double.NaN;
        meeting = new double[2 * cylinders + 4];
        Arrays.fill(meeting, Double.POSITIVE_INFINITY);
    }

    /** True where tipping and slip count, so that the ground must be summed. */
    public boolean stability() {
        return stability;
    }

    /** Names of all limits by index, with {@code none} at the end. */
    public List<String> names() {
        List<String> all = new ArrayList<>(names);
        all.add("none");
        return all;
    }

    /** Name of a limit by index; {@code none} for {@link #NONE}. */
    public String name(int limit) {
        return limit == NONE ? "none" : names.get(limit);
    }

    /**
     * The largest load factor.
     *
     * @param fixed forces at t = 0; not modified
     * @param unit forces of one more t; not modified
     * @param fixedGround ground at t = 0 with the machine's weight; not modified, unused without {@link #stability()}
     * @param unitGround ground of one more t; likewise
     * @return the largest t; infinite where no limit is met, NaN where the forces are NaN
     */
    public double largest(ForceBuffer fixed, ForceBuffer unit, GroundBuffer fixedGround, GroundBuffer unitGround) {
        largestOnCylinders(fixed, unit);
        if (stability) {
            int next = 2 * push.length;
            meet(next, -fixedGround.momentAbout(front), -unitGround.momentAbout(front), 0);
            meet(next + 1, fixedGround.momentAbout(rear), unitGround.momentAbout(rear), 0);
            if (!Double.isNaN(grip)) {
                double fixedGrip = grip * fixedGround.normal();
                double unitGrip = grip * unitGround.normal();
                meet(next + 2, fixedGround.horizontal() - fixedGrip, unitGround.horizontal() - unitGrip, 0);
                meet(next + 3, -fixedGround.horizontal() - fixedGrip, -unitGround.horizontal() - unitGrip, 0);
            }
        }
        return largest;
    }

    /** As {@link #largest}, cylinders alone: tipping and slip left out. */
    public double largestOnCylinders(ForceBuffer fixed, ForceBuffer unit) {
        largest = Double.POSITIVE_INFINITY;
        governing = NONE;
        for (int c = 0; c < push.length; c++) {
            meet(2 * c, fixed.cylinder(c), unit.cylinder(c), push[c]);
            meet(2 * c + 1, -fixed.cylinder(c), -unit.cylinder(c), pull[c]);
        }
        return largest;
    }

    /** The limit that governs the last answer; {@link #NONE} where none does. */
    public int governing() {
        return governing;
    }

    /** Whether one line meets its limit within a share of the last answer, which is not infinite. */
    boolean meets(int line, double share) {
        return meeting[line] <= largest * (1 + share);
    }

    /** Number of lines against which the last answer was held; slip counts twice, once for each direction. */
    int lines() {
        return meeting.length;
    }

    /**
     * Load factor at which one line meets its limit, smooth in the pose as long as it stays finite.
     *
     * @param line 0 to {@link #lines()} - 1
     * @return the factor, below zero where the limit is broken without any load and load breaks it further; infinite where load
     *     only takes away from it, broken or not
     */
    double meeting(int line) {
        return meeting[line];
    }

    private void meet(int line, double fixed, double unit, double most) {
        if (Double.isNaN(fixed) || Double.isNaN(unit)) {
            largest = Double.NaN;
            return;
        }
        double room = most - fixed;
        meeting[line] = unit > 0 ? room / unit : Double.POSITIVE_INFINITY;
        double t = room < 0 ? 0 : meeting[line];
        if (t < largest) {
            largest = t;
            governing = Math.min(line, slip);
        }
    }
}
