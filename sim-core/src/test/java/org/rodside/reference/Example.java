package org.rodside.reference;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.file.Path;
import java.util.List;
import java.util.function.ToDoubleFunction;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.rodside.io.LinkageReader;
import org.rodside.kinematics.Mechanism;
import org.rodside.kinematics.PoseBuffer;
import org.rodside.kinematics.PoseSolver;
import org.rodside.statics.ForceBuffer;
import org.rodside.study.Front;
import org.rodside.study.PoseAnswer;
import org.rodside.study.PoseQuestion;
import org.rodside.study.PoseStudy;

/** A linkage drawn from a book: set to the book's pose by search, never by formula, and read as the book reads it. */
final class Example {

    static final Path FOLDER = Path.of("src/test/resources/linkages");

    /** Search for a stroke ends here; fraction of stroke, so some 1e-13 m. */
    private static final double FRACTION = 1e-13;

    /** Steps in which a stroke is searched for the book's pose. */
    private static final int STEPS = 200;

    final Front front;
    final Mechanism mechanism;
    private final PoseSolver solver;

    Example(String name) {
        front = Front.of(LinkageReader.read(FOLDER.resolve(name + ".json"), List.of()));
        mechanism = front.mechanism();
        solver = mechanism.newSolver();
    }

    /** Fractions of stroke of the drawn pose. */
    double[] drawn() {
        double[] fractions = new double[mechanism.cylinders()];
        for (int c = 0; c < fractions.length; c++) {
            fractions[c] = (mechanism.drawnLength(c) - mechanism.retracted(c)) / mechanism.stroke(c);
        }
        return fractions;
    }

    /** Strokes of some fractions; in m. */
    double[] strokes(double[] fractions) {
        double[] strokes = fractions.clone();
        for (int c = 0; c < strokes.length; c++) {
            strokes[c] *= mechanism.stroke(c);
        }
        return strokes;
    }

    /** The pose of some fractions, which must assemble. */
    PoseBuffer pose(double[] fractions) {
        PoseBuffer pose = new PoseBuffer(mechanism);
        assertEquals(PoseSolver.ASSEMBLED, solver.solve(strokes(fractions), pose), "assembles");
        return pose;
    }

    /** Moves one cylinder until a reading is zero. */
    void seek(double[] fractions, String cylinder, ToDoubleFunction<PoseBuffer> reading) {
        int c = mechanism.cylinder(cylinder);
        UnivariateFunction miss = fraction -> {
            fractions[c] = fraction;
            PoseBuffer pose = new PoseBuffer(mechanism);
            boolean assembled = solver.solve(strokes(fractions), pose) == PoseSolver.ASSEMBLED;
            return assembled ? reading.applyAsDouble(pose) : Double.NaN;
        };
        for (int i = 0; i < STEPS; i++) {
            double low = (double) i / STEPS;
            double high = (i + 1.0) / STEPS;
            double jump = Math.abs(miss.value(high) - miss.value(low));
            if (miss.value(low) * miss.value(high) <= 0 && jump < 1) {
                fractions[c] = new BrentSolver(0, FRACTION).solve(100, miss, low, high);
                return;
            }
        }
        throw new AssertionError("no stroke of " + cylinder + " takes the linkage to the book's pose");
    }

    /** Moves one cylinder until the line between two pins points in a direction; in degrees from +x. */
    void turn(double[] fractions, String cylinder, String from, String to, double direction) {
        seek(fractions, cylinder, pose -> {
            double miss = direction(pose, from, to) - direction;
            return Math.toRadians(Math.IEEEremainder(miss, 360));
        });
    }

    /** Direction from one pin to another; in degrees from +x, anticlockwise. */
    double direction(PoseBuffer pose, String from, String to) {
        int a = mechanism.pin(from);
        int b = mechanism.pin(to);
        return Math.toDegrees(Math.atan2(pose.pinY(b) - pose.pinY(a), pose.pinX(b) - pose.pinX(a)));
    }

    /** Forces at the drawn pose under weights and a payload; in kg. */
    Forces carrying(double payload) {
        PoseQuestion question = new PoseQuestion(drawn(), 0, 0, payload, -1, 0);
        PoseAnswer answer = PoseStudy.answer(front, question);
        return new Forces(mechanism, answer.pose(), answer.forces());
    }

    /** Forces at a pose, read by name. */
    record Forces(Mechanism mechanism, PoseBuffer pose, ForceBuffer forces) {

        /** Total force of a cylinder; in N, + push. */
        double cylinder(String name) {
            return forces.cylinder(mechanism.cylinder(name));
        }

        /** Force of a pin on a link, x; in N. */
        double x(String pin, String link) {
            return forces.bearingX(bearing(pin, link));
        }

        /** Force of a pin on a link, y; in N. */
        double y(String pin, String link) {
            return forces.bearingY(bearing(pin, link));
        }

        /** Force along a two-pin link: + tension; in N. The part across it must be nothing. */
        double tension(String link, String from, String to) {
            double dx = pose.pinX(mechanism.pin(to)) - pose.pinX(mechanism.pin(from));
            double dy = pose.pinY(mechanism.pin(to)) - pose.pinY(mechanism.pin(from));
            double along = (dx * x(to, link) + dy * y(to, link)) / Math.hypot(dx, dy);
            double across = (dx * y(to, link) - dy * x(to, link)) / Math.hypot(dx, dy);
            assertEquals(0, across, 1e-9 * Math.abs(along), link + " carries force along its line only");
            return along;
        }

        private int bearing(String pin, String link) {
            for (int b = 0; b < mechanism.bearings(); b++) {
                if (mechanism.bearingPin(b) == mechanism.pin(pin) && mechanism.bearingBody(b) == mechanism.body(link)) {
                    return b;
                }
            }
            throw new AssertionError("no bearing " + pin + " " + link);
        }
    }
}
