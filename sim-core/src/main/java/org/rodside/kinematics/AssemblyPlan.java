package org.rodside.kinematics;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.rodside.model.InputException;

/**
 * Finds the order in which links can be placed in closed form: again and again the first link of the file that a cylinder
 * turns about a standing pin, else the first two links that close a loop between two standing pins. Links that neither
 * rule reaches are left to the dense way. Bodies that stand: the frame and every link placed so far.
 */
final class AssemblyPlan {

    /** Sine of the angle at a corner below which a drawing, rounded as drawings are, does not show the side; no unit. */
    private static final double DEAD_SINE = 1e-6;

    private final Mechanism mechanism;
    private final boolean[] placed;
    private final boolean[] used;
    private final int[] owners;
    private final List<Step> steps = new ArrayList<>();

    AssemblyPlan(Mechanism mechanism) {
        this.mechanism = mechanism;
        placed = new boolean[mechanism.bodies()];
        used = new boolean[mechanism.cylinders()];
        owners = new int[mechanism.pins()];
        Arrays.fill(owners, -1);
        take(0);
        while (addCylinderStep() || addPairStep()) {
            // each round places one or two links
        }
        for (int body = 1; body < placed.length; body++) {
            take(body);
        }
    }

    List<Step> steps() {
        return List.copyOf(steps);
    }

    int[] owners() {
        return owners;
    }

    private void take(int body) {
        placed[body] = true;
        for (int pin : mechanism.pinsOf(body)) {
            if (owners[pin] < 0) {
                owners[pin] = body;
            }
        }
    }

    private boolean stands(int pin) {
        return owners[pin] >= 0;
    }

    private boolean addCylinderStep() {
        for (int body = 1; body < placed.length; body++) {
            int pivot = placed[body] ? -1 : standingPin(body, -1);
            for (int c = 0; pivot >= 0 && c < used.length; c++) {
                boolean rodOn = mechanism.isOn(mechanism.rodPin(c), body);
                int eye = rodOn ? mechanism.rodPin(c) : mechanism.capPin(c);
                int anchor = rodOn ? mechanism.capPin(c) : mechanism.rodPin(c);
                if (!used[c] && mechanism.isOn(eye, body) && !stands(eye) && stands(anchor)) {
                    steps.add(cylinderStep(c, body, pivot, anchor, eye));
                    used[c] = true;
                    take(body);
                    return true;
                }
            }
        }
        return false;
    }

    /** First pin of a body that stands already, other than one; -1 where there is none. */
    private int standingPin(int body, int other) {
        for (int pin : mechanism.pinsOf(body)) {
            if (pin != other && stands(pin)) {
                return pin;
            }
        }
        return -1;
    }

    private CylinderStep cylinderStep(int cylinder, int body, int pivot, int anchor, int eye) {
        double ex = mechanism.drawnX(eye) - mechanism.drawnX(pivot);
        double ey = mechanism.drawnY(eye) - mechanism.drawnY(pivot);
        double dx = mechanism.drawnX(anchor) - mechanism.drawnX(pivot);
        double dy = mechanism.drawnY(anchor) - mechanism.drawnY(pivot);
        int side = side(
                dx,
                dy,
                ex,
                ey,
                "link '" + mechanism.bodyName(body) + "' and cylinder '" + mechanism.cylinderName(cylinder) + "'",
                pivot,
                anchor,
                eye);
        return new CylinderStep(
                cylinder, body, pivot, anchor, eye, ex, ey, side, eye == mechanism.rodPin(cylinder) ? 1 : -1);
    }

    private boolean addPairStep() {
        for (int first = 1; first < placed.length; first++) {
            for (int second = first + 1; second < placed.length; second++) {
                if (!placed[first] && !placed[second] && addPairStep(first, second)) {
                    return true;
                }
            }
        }
        return false;
    }

    private boolean addPairStep(int first, int second) {
        for (int joint : mechanism.pinsOf(first)) {
            int firstPin = standingPin(first, joint);
            int secondPin = standingPin(second, joint);
            if (!stands(joint)
                    && mechanism.isOn(joint, second)
                    && firstPin >= 0
                    && secondPin >= 0
                    && firstPin != secondPin) {
                steps.add(pairStep(first, second, firstPin, secondPin, joint));
                take(first);
                take(second);
                return true;
            }
        }
        return false;
    }

    private PairStep pairStep(int first, int second, int firstPin, int secondPin, int joint) {
        double x1 = mechanism.drawnX(joint) - mechanism.drawnX(firstPin);
        double y1 = mechanism.drawnY(joint) - mechanism.drawnY(firstPin);
        double dx = mechanism.drawnX(secondPin) - mechanism.drawnX(firstPin);
        double dy = mechanism.drawnY(secondPin) - mechanism.drawnY(firstPin);
        int side = side(
                dx,
                dy,
                x1,
                y1,
                "links '" + mechanism.bodyName(first) + "' and '" + mechanism.bodyName(second) + "'",
                firstPin,
                secondPin,
                joint);
        return new PairStep(first, second, firstPin, secondPin, joint, x1, y1, x1 - dx, y1 - dy, side);
    }

    private int side(double dx, double dy, double ex, double ey, String what, int from, int to, int corner) {
        double cross = dx * ey - dy * ex;
        if (!(Math.abs(cross) > DEAD_SINE * Math.hypot(dx, dy) * Math.hypot(ex, ey))) {
            throw new InputException(
                    "pins: the drawing shows " + what + " at a dead centre: pins '"
                            + mechanism.pinName(from) + "', '" + mechanism.pinName(to) + "' and '"
                            + mechanism.pinName(corner)
                            + "' lie on one line, so it does not tell which way the loop closes; draw the front in another pose");
        }
        return cross > 0 ? 1 : -1;
    }
}
