package org.rodside.hydraulics;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.rodside.model.Cylinder;
import org.rodside.model.Tube;

/** The two-part column against books, against a column of finite elements, and against its own equation. */
class ColumnTest {

    /** Asked of the root. */
    private static final double ROOT = 1e-12;

    /** 24 cubic elements a part: error of the order (kh)⁴/720 with kh below π/24, held springs less. */
    private static final double ELEMENTS = 2e-6;

    private static final int PER_PART = 24;
    private static final long SEED = 31_415;

    /** Rod 70 mm × 1.40 m with tube 150/125 × 1.50 m, bore 125. */
    private final Cylinder example = Cylinders.column(0.125, 0.070, new Tube(1.50, 0.150));

    private static double equation(double p, double ei1, double l1, double ei2, double l2) {
        double k1 = Math.sqrt(p / ei1);
        double k2 = Math.sqrt(p / ei2);
        return k2 * Math.sin(k1 * l1) * Math.cos(k2 * l2) + k1 * Math.cos(k1 * l1) * Math.sin(k2 * l2);
    }

    /** 475 916 N (computed, by an independent root search on the same equation). */
    @Test
    void computedExample() {
        assertEquals(475_916, Column.of(example).elastic(2.90), 0.5);
    }

    /** The root changes the sign of the equation, and no smaller load does: a fine walk from zero finds the same one. */
    @Test
    void smallestRootOfTheEquation() {
        SplittableRandom random = new SplittableRandom(SEED);
        for (int i = 0; i < 2000; i++) {
            double l1 = Math.pow(10, random.nextDouble(-2, 1));
            double l2 = Math.pow(10, random.nextDouble(-2, 1));
            double ei1 = Math.pow(10, random.nextDouble(3, 8));
            double ei2 = ei1 * Math.pow(10, random.nextDouble(-3, 3));
            double p = Column.elasticLoad(ei1, l1, ei2, l2);
            String where = "seed " + SEED + " case " + i + ": " + ei1 + " " + l1 + " " + ei2 + " " + l2 + " P " + p;
            assertTrue(equation(p * (1 - ROOT), ei1, l1, ei2, l2) > 0, where);
            assertTrue(equation(p * (1 + ROOT), ei1, l1, ei2, l2) < 0, where);
            for (int n = 1; n < 100; n++) {
                double share = n / 100.0;
                assertTrue(equation(p * share * share, ei1, l1, ei2, l2) > 0, where + " at share " + share);
            }
            assertEquals(p, Column.elasticLoad(ei2, l2, ei1, l1), ROOT * p, where + " turned round");
        }
    }

    @Test
    void uniformColumnIsEulers() {
        double stiffness = 3e6;
        double euler = Math.PI * Math.PI * stiffness / (2.5 * 2.5);
        assertEquals(euler, Column.elasticLoad(stiffness, 0.9, stiffness, 1.6), ROOT * euler);
        assertEquals(euler, Column.elasticLoad(stiffness, 2.5, 1, 0), ROOT * euler);
    }

    /** A rigid tube: P → root of tan(kL₂)/k = −L₁, here with L₁ = L₂ and kL₂ = 2.028757838110434 (tan x = −x). */
    @Test
    void rigidTube() {
        double root = 2.028757838110434;
        double rigid = root * root * 2e6;
        assertEquals(rigid, Column.elasticLoad(1e20, 1, 2e6, 1), 1e-11 * rigid);
        assertEquals(rigid, Column.elasticLoad(2e6, 1, 1e20, 1), 1e-11 * rigid);
    }

    @Test
    void agreesWithFiniteElements() {
        SplittableRandom random = new SplittableRandom(SEED);
        for (int i = 0; i < 25; i++) {
            double l1 = random.nextDouble(0.3, 3);
            double l2 = random.nextDouble(0.3, 3);
            double ei1 = random.nextDouble(1e5, 1e7);
            double ei2 = random.nextDouble(1e5, 1e7);
            double elements = new ElementColumn(new double[] {l1, l2}, new double[] {ei1, ei2}, PER_PART).buckling();
            double ours = Column.elasticLoad(ei1, l1, ei2, l2);
            assertEquals(elements, ours, ELEMENTS * ours, "seed " + SEED + " case " + i);
        }
    }

    /**
     * Two-part pinned column, Roark's Formulas for Stress and Strain, table 15.1 (memory): P over π²·EI₁/l², the stiffer
     * part of length a; 1 % as the table is read.
     */
    @ParameterizedTest
    @CsvSource({"1.5, 1.010, 1.065, 1.180, 1.357, 1.479", "2.0, 1.014, 1.098, 1.297, 1.633, 1.940"})
    void roarkTable(double ratio, double sixth, double third, double half, double twoThirds, double fiveSixths) {
        double[] printed = {sixth, third, half, twoThirds, fiveSixths};
        double[] share = {1 / 6.0, 1 / 3.0, 1 / 2.0, 2 / 3.0, 5 / 6.0};
        for (int i = 0; i < share.length; i++) {
            double ours = Column.elasticLoad(1, 1 - share[i], ratio, share[i]) / (Math.PI * Math.PI);
            assertEquals(printed[i], ours, 0.01 * printed[i], "a/l " + share[i]);
        }
    }

    /**
     * Timoshenko and Gere, Theory of Elastic Stability, symmetric stepped column (memory): P = m·EI₂/l², middle part of
     * length a with I₂, ends with I₁. It has three parts, so it tests the finite elements that test ours.
     */
    @ParameterizedTest
    @CsvSource({"0.1, 1.47, 2.40, 4.50, 8.59", "0.4, 5.09, 6.68, 8.51, 9.67", "0.8, 8.55, 9.18, 9.63, 9.84"})
    void timoshenkoTableByElements(double ratio, double m2, double m4, double m6, double m8) {
        double[] printed = {m2, m4, m6, m8};
        double lastDigit = 0.006;
        for (int i = 0; i < printed.length; i++) {
            double a = 0.2 * (i + 1);
            double[] parts = {(1 - a) / 2, a, (1 - a) / 2};
            double m = new ElementColumn(parts, new double[] {ratio, 1, ratio}, PER_PART).buckling();
            assertEquals(printed[i], m, lastDigit, "a/l " + a);
        }
    }

    /** Shigley, Mechanical Engineering Design, Ex. 4-16 (memory): 22 kN, factor 4, 1.5 m, E 207 GPa: 37.48 mm. */
    @Test
    void shigleyRod() {
        double printed = 0.03748;
        double halfLastDigit = 0.5e-5 / printed;
        double stiffness = 207e9 * Column.inertia(printed);
        double load = Column.elasticLoad(stiffness, 0.5, stiffness, 1.0);
        assertEquals(4 * 22e3, load, 4 * halfLastDigit * load);
    }

    /** Both forms meet at half the yield with one slope: value and slope from either side. */
    @Test
    void parabolaMeetsEuler() {
        double area = 0.005;
        double yield = 350e6;
        double squash = area * yield;
        double meet = squash / 2;
        assertEquals(meet, Column.parabola(meet, area, yield));
        assertEquals(0.999 * meet, Column.parabola(0.999 * meet, area, yield));
        double step = 1e-6 * meet;
        double slope = (Column.parabola(meet + step, area, yield) - meet) / step;
        assertEquals(1, slope, 1e-5);
        assertEquals(squash, Column.parabola(1e9 * squash, area, yield), 1e-8 * squash);
        assertEquals(squash * (1 - 1 / 8.0), Column.parabola(2 * squash, area, yield), ROOT * squash);
    }

    /** In the example the rod's half yield is 350 MPa · 38.48 cm² / 2 = 673 kN: above the elastic load, so no parabola. */
    @Test
    void factorIsCriticalOverHarderPush() {
        Column column = Column.of(example);
        assertEquals(column.elastic(2.90), column.critical(2.90));
        assertEquals(475_916 / 100e3, column.factor(2.90, 100e3), 1e-5);
        assertTrue(column.critical(1.85) < column.elastic(1.85), "short: the rod yields first");
        assertEquals(Double.POSITIVE_INFINITY, column.factor(2.90, -1));
        assertEquals(Double.POSITIVE_INFINITY, column.factor(2.90, 0));
    }

    @Test
    void noExposedRodLeavesTheTube() {
        Column column = Column.of(example);
        double tube = Math.PI * Math.PI * Column.tubeStiffness(example);
        assertEquals(tube / (1.5 * 1.5), column.elastic(1.5), ROOT * tube);
        assertEquals(tube / (1.2 * 1.2), column.elastic(1.2), ROOT * tube);
        double grain = 1e-9;
        assertEquals(column.elastic(1.5), column.elastic(1.5 + grain), 1e-7 * tube);
        assertTrue(Double.isNaN(column.elastic(0)) && Double.isNaN(column.elastic(Double.NaN)));
    }

    @Test
    void aTubeNoWiderThanItsBoreIsRefused() {
        Cylinder thin = Cylinders.column(0.125, 0.070, new Tube(1.5, 0.125));
        String message = assertThrows(IllegalArgumentException.class, () -> Column.of(thin))
                .getMessage();
        assertTrue(message.contains("test.tube.outside") && message.contains("0.125"), message);
    }
}
