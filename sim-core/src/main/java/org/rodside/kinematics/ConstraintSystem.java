package org.rodside.kinematics;

import java.util.Arrays;

/**
 * All pin and length equations of a linkage at once (theory K4). Unknowns: place and turn of every link (x, y, angle), then
 * x and y of every pin that joins cylinders only. Equations: a pin stands at one place on every body that shares it (two
 * for each body after the first), and every cylinder has its length. Owns its scratch; not thread-safe.
 */
final class ConstraintSystem {

    private final Mechanism mechanism;
    private final int size;
    private final int[] freeColumn;

    ConstraintSystem(Mechanism mechanism) {
        this.mechanism = mechanism;
        freeColumn = new int[mechanism.pins()];
        int column = 3 * (mechanism.bodies() - 1);
        for (int pin = 0; pin < freeColumn.length; pin++) {
            freeColumn[pin] = column;
            column += mechanism.owner(pin) < 0 ? 2 : 0;
        }
        size = column;
    }

    int size() {
        return size;
    }

    /** Unknowns of the drawn pose; overwritten. */
    void drawn(double[] unknowns) {
        for (int pin = 0; pin < freeColumn.length; pin++) {
            if (mechanism.owner(pin) < 0) {
                unknowns[freeColumn[pin]] = mechanism.drawnX(pin);
                unknowns[freeColumn[pin] + 1] = mechanism.drawnY(pin);
            }
        }
    }

    /** Writes unknowns into a pose whose frame and cylinder lengths stand already. */
    void write(double[] unknowns, PoseBuffer pose) {
        for (int body = 1; body < mechanism.bodies(); body++) {
            int at = 3 * (body - 1);
            double turn = unknowns[at + 2];
            pose.place(body, Math.cos(turn), Math.sin(turn), unknowns[at], unknowns[at + 1]);
        }
        for (int pin = 0; pin < freeColumn.length; pin++) {
            if (mechanism.owner(pin) < 0) {
                pose.placePin(pin, unknowns[freeColumn[pin]], unknowns[freeColumn[pin] + 1]);
            }
        }
    }

    /** What each equation misses at a pose; in m, overwritten. */
    void misses(PoseBuffer pose, double[] out) {
        int row = 0;
        for (int pin = 0; pin < mechanism.pins(); pin++) {
            for (int body : mechanism.bodiesAt(pin)) {
                if (body != mechanism.owner(pin)) {
                    out[row++] = pose.x(body, mechanism.drawnX(pin), mechanism.drawnY(pin)) - pose.pinX(pin);
                    out[row++] = pose.y(body, mechanism.drawnX(pin), mechanism.drawnY(pin)) - pose.pinY(pin);
                }
            }
        }
        for (int c = 0; c < mechanism.cylinders(); c++) {
            double dx = pose.pinX(mechanism.rodPin(c)) - pose.pinX(mechanism.capPin(c));
            double dy = pose.pinY(mechanism.rodPin(c)) - pose.pinY(mechanism.capPin(c));
            out[row++] = Math.sqrt(dx * dx + dy * dy) - pose.length(c);
        }
    }

    /** Derivative of the misses by the unknowns; overwritten. */
    void jacobian(PoseBuffer pose, double[] out) {
        Arrays.fill(out, 0);
        int row = 0;
        for (int pin = 0; pin < mechanism.pins(); pin++) {
            for (int body : mechanism.bodiesAt(pin)) {
                if (body != mechanism.owner(pin)) {
                    addPoint(pose, out, row, pin, body, 1, 0);
                    addPoint(pose, out, row, pin, mechanism.owner(pin), -1, 0);
                    addPoint(pose, out, row + 1, pin, body, 0, 1);
                    addPoint(pose, out, row + 1, pin, mechanism.owner(pin), 0, -1);
                    row += 2;
                }
            }
        }
        for (int c = 0; c < mechanism.cylinders(); c++) {
            int cap = mechanism.capPin(c);
            int rod = mechanism.rodPin(c);
            double dx = pose.pinX(rod) - pose.pinX(cap);
            double dy = pose.pinY(rod) - pose.pinY(cap);
            double length = Math.sqrt(dx * dx + dy * dy);
            addPoint(pose, out, row, rod, mechanism.owner(rod), dx / length, dy / length);
            addPoint(pose, out, row, cap, mechanism.owner(cap), -dx / length, -dy / length);
            row++;
        }
    }

    /** Adds (nx, ny)·d(point)/d(unknowns) to a row, where the point is a pin as carried by a body. */
    private void addPoint(PoseBuffer pose, double[] out, int row, int pin, int body, double nx, double ny) {
        int base = row * size;
        if (body < 0) {
            out[base + freeColumn[pin]] += nx;
            out[base + freeColumn[pin] + 1] += ny;
        } else if (body > 0) {
            int at = base + 3 * (body - 1);
            double rx = pose.x(body, mechanism.drawnX(pin), mechanism.drawnY(pin)) - pose.originX(body);
            double ry = pose.y(body, mechanism.drawnX(pin), mechanism.drawnY(pin)) - pose.originY(body);
            out[at] += nx;
            out[at + 1] += ny;
            out[at + 2] += nx * -ry + ny * rx;
        }
    }

    /** Right-hand side of the velocity equations; overwritten. */
    void rateSide(double[] rates, double[] out) {
        Arrays.fill(out, 0);
        int first = size - mechanism.cylinders();
        System.arraycopy(rates, 0, out, first, mechanism.cylinders());
    }

    /** Right-hand side of the acceleration equations, with the terms in squared velocity; overwritten. */
    void accelerationSide(PoseBuffer pose, double[] accelerations, MotionBuffer motion, double[] out) {
        int row = 0;
        for (int pin = 0; pin < mechanism.pins(); pin++) {
            for (int body : mechanism.bodiesAt(pin)) {
                int owner = mechanism.owner(pin);
                if (body != owner) {
                    out[row++] = squareX(pose, motion, pin, body) - squareX(pose, motion, pin, owner);
                    out[row++] = squareY(pose, motion, pin, body) - squareY(pose, motion, pin, owner);
                }
            }
        }
        for (int c = 0; c < mechanism.cylinders(); c++) {
            int cap = mechanism.capPin(c);
            int rod = mechanism.rodPin(c);
            double ux = pose.unitX(c);
            double uy = pose.unitY(c);
            double across = ux * (motion.pinVy(rod) - motion.pinVy(cap)) - uy * (motion.pinVx(rod) - motion.pinVx(cap));
            double bodySquares = ux
                            * (squareX(pose, motion, rod, mechanism.owner(rod))
                                    - squareX(pose, motion, cap, mechanism.owner(cap)))
                    + uy
                            * (squareY(pose, motion, rod, mechanism.owner(rod))
                                    - squareY(pose, motion, cap, mechanism.owner(cap)));
            out[row++] = accelerations[c] - across * across / pose.length(c) + bodySquares;
        }
    }

    private double squareX(PoseBuffer pose, MotionBuffer motion, int pin, int body) {
        return body < 0
                ? 0
                : motion.omega(body)
                        * motion.omega(body)
                        * (pose.x(body, mechanism.drawnX(pin), mechanism.drawnY(pin)) - pose.originX(body));
    }

    private double squareY(PoseBuffer pose, MotionBuffer motion, int pin, int body) {
        return body < 0
                ? 0
                : motion.omega(body)
                        * motion.omega(body)
                        * (pose.y(body, mechanism.drawnX(pin), mechanism.drawnY(pin)) - pose.originY(body));
    }

    void writeRates(PoseBuffer pose, double[] solution, MotionBuffer motion) {
        for (int body = 1; body < mechanism.bodies(); body++) {
            int at = 3 * (body - 1);
            motion.setRate(pose, body, solution[at + 2], solution[at], solution[at + 1]);
        }
        for (int pin = 0; pin < freeColumn.length; pin++) {
            if (mechanism.owner(pin) < 0) {
                motion.setPinRate(pin, solution[freeColumn[pin]], solution[freeColumn[pin] + 1]);
            }
        }
    }

    void writeAccelerations(PoseBuffer pose, double[] solution, MotionBuffer motion) {
        for (int body = 1; body < mechanism.bodies(); body++) {
            int at = 3 * (body - 1);
            motion.setAcceleration(pose, body, solution[at + 2], solution[at], solution[at + 1]);
        }
        for (int pin = 0; pin < freeColumn.length; pin++) {
            if (mechanism.owner(pin) < 0) {
                motion.setPinAcceleration(pin, solution[freeColumn[pin]], solution[freeColumn[pin] + 1]);
            }
        }
    }
}
