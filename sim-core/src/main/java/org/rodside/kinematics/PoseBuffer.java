package org.rodside.kinematics;

import java.util.Arrays;

/**
 * One pose: where every body, pin and cylinder stands. Filled by a {@link PoseSolver}. Machine axes, m. Mutable and not
 * thread-safe; one per thread.
 */
public final class PoseBuffer {

    private final Mechanism mechanism;
    private final double[] cos;
    private final double[] sin;
    private final double[] x;
    private final double[] y;
    private final double[] pinX;
    private final double[] pinY;
    private final double[] length;

    public PoseBuffer(Mechanism mechanism) {
        this.mechanism = mechanism;
        cos = new double[mechanism.bodies()];
        sin = new double[mechanism.bodies()];
        x = new double[mechanism.bodies()];
        y = new double[mechanism.bodies()];
        pinX = new double[mechanism.pins()];
        pinY = new double[mechanism.pins()];
        length = new double[mechanism.cylinders()];
    }

    /** Puts the frame and its pins where they were drawn and sets the cylinder lengths; in m. */
    void begin(double[] strokes) {
        cos[0] = 1;
        for (int pin : mechanism.ownedPins(0)) {
            pinX[pin] = mechanism.drawnX(pin);
            pinY[pin] = mechanism.drawnY(pin);
        }
        for (int c = 0; c < length.length; c++) {
            length[c] = mechanism.retracted(c) + strokes[c];
        }
    }

    /** Turns a body about one of its pins, which stands already, and places the pins the body owns. */
    void place(int body, double cosine, double sine, int pivot) {
        double px = mechanism.drawnX(pivot);
        double py = mechanism.drawnY(pivot);
        place(body, cosine, sine, pinX[pivot] - cosine * px + sine * py, pinY[pivot] - sine * px - cosine * py);
    }

    void place(int body, double cosine, double sine, double originX, double originY) {
        cos[body] = cosine;
        sin[body] = sine;
        x[body] = originX;
        y[body] = originY;
        for (int pin : mechanism.ownedPins(body)) {
            pinX[pin] = x(body, mechanism.drawnX(pin), mechanism.drawnY(pin));
            pinY[pin] = y(body, mechanism.drawnX(pin), mechanism.drawnY(pin));
        }
    }

    void placePin(int pin, double atX, double atY) {
        pinX[pin] = atX;
        pinY[pin] = atY;
    }

    /** Makes every moving number NaN: no pose. */
    void clear() {
        Arrays.fill(cos, Double.NaN);
        Arrays.fill(sin, Double.NaN);
        Arrays.fill(x, Double.NaN);
        Arrays.fill(y, Double.NaN);
        Arrays.fill(pinX, Double.NaN);
        Arrays.fill(pinY, Double.NaN);
        cos[0] = 1;
        sin[0] = 0;
        x[0] = 0;
        y[0] = 0;
    }

    /** The mechanism this pose is of. */
    public Mechanism mechanism() {
        return mechanism;
    }

    /** Where the point drawn at (drawnX, drawnY) on a body stands now, x; in m. */
    public double x(int body, double drawnX, double drawnY) {
        return x[body] + cos[body] * drawnX - sin[body] * drawnY;
    }

    /** Where the point drawn at (drawnX, drawnY) on a body stands now, y; in m. */
    public double y(int body, double drawnX, double drawnY) {
        return y[body] + sin[body] * drawnX + cos[body] * drawnY;
    }

    /** Image of the drawing's origin on a body, x; in m. */
    public double originX(int body) {
        return x[body];
    }

    /** Image of the drawing's origin on a body, y; in m. */
    public double originY(int body) {
        return y[body];
    }

    public double pinX(int pin) {
        return pinX[pin];
    }

    public double pinY(int pin) {
        return pinY[pin];
    }

    /** Pin-to-pin length of a cylinder; in m. */
    public double length(int cylinder) {
        return length[cylinder];
    }

    /** Unit vector of a cylinder from cap pin to rod pin, x; no unit. */
    public double unitX(int cylinder) {
        return (pinX[mechanism.rodPin(cylinder)] - pinX[mechanism.capPin(cylinder)]) / length[cylinder];
    }

    /** Unit vector of a cylinder from cap pin to rod pin, y; no unit. */
    public double unitY(int cylinder) {
        return (pinY[mechanism.rodPin(cylinder)] - pinY[mechanism.capPin(cylinder)]) / length[cylinder];
    }

    /** Cosine of a body's turn from the drawn pose; no unit. */
    public double cos(int body) {
        return cos[body];
    }

    /** Sine of a body's turn from the drawn pose; no unit. */
    public double sin(int body) {
        return sin[body];
    }

    /** Turn of a body from the drawn pose, anticlockwise; in rad, -π to π. */
    public double turn(int body) {
        return Math.atan2(sin[body], cos[body]);
    }
}
