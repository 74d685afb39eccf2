package org.rodside.hydraulics;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.rodside.model.Cylinder;
import org.rodside.model.Tube;

/** The loaded column against closed forms of uniform columns and against finite elements. */
class LoadedColumnTest {

    private static final double LEVEL = 0;
    private static final double UPRIGHT = Math.PI / 2;

    /** Closed form against closed form. */
    private static final double CLOSED = 1e-10;

    /** 24 elements a part, peak found by a parabola through three nodes. */
    private static final double ELEMENTS = 2e-5;

    private static final int PER_PART = 24;
    private static final long SEED = 27_182;
    private static final double GRAVITY = 9.80665;

    private static final double ROD = 0.030;
    private static final double LENGTH = 2.0;
    private static final double ROD_AREA = Math.PI / 4 * ROD * ROD;
    private static final double ROD_INERTIA = Math.PI / 64 * Math.pow(ROD, 4);
    private static final double ROD_MODULUS = Math.PI / 32 * Math.pow(ROD, 3);
    private static final double STIFFNESS = 206e9 * ROD_INERTIA;
    private static final double WEIGHT = GRAVITY * 7850 * ROD_AREA;

    /**
     * A cylinder that is a uniform column: the tube is as stiff and, full of oil, as heavy as the rod. With squares of
     * diameters in terms of the rod's, X outside and Y bore: X² − Y² = 1 and X − Y + ηY = 1, η oil over steel.
     */
    private static Cylinder uniform() {
        double lighter = 1 - 870.0 / 7850;
        double y = 2 * lighter / (1 - lighter * lighter);
        double x = 1 + lighter * y;
        return Cylinders.column(ROD * Math.sqrt(y), ROD, new Tube(0.7, ROD * Math.sqrt(x)));
    }

    /** Secant formula, σ = P/A·(1 + e·c/r²·sec(L/2·√(P/EI))), any book on strength of materials. */
    @Test
    void secantFormula() {
        double e = 0.004;
        LoadedColumn column = LoadedColumn.of(uniform(), e, 0);
        for (double share : new double[] {0.001, 0.1, 0.5, 0.9, 0.99}) {
            double load = share * Math.PI * Math.PI * STIFFNESS / (LENGTH * LENGTH);
            double secant = 1 / Math.cos(LENGTH / 2 * Math.sqrt(load / STIFFNESS));
            double expected = load / ROD_AREA + load * e / ROD_MODULUS * secant;
            assertEquals(expected, column.rodStress(load, LENGTH, UPRIGHT), CLOSED * expected / (1 - share));
        }
    }

    /** Own weight alone, w·L²/8 in the middle, which lies in the rod. */
    @Test
    void ownWeightAlone() {
        LoadedColumn column = LoadedColumn.of(uniform(), 0, 0);
        double expected = WEIGHT * LENGTH * LENGTH / 8 / ROD_MODULUS;
        assertEquals(expected, column.rodStress(0, LENGTH, LEVEL), CLOSED * expected);
        double steep = Math.toRadians(-60);
        assertEquals(expected / 2, column.rodStress(0, LENGTH, steep), CLOSED * expected);
    }

    /** A small push adds P times the sag of the middle, 5·w·L⁴/(384·EI). */
    @Test
    void smallPushTimesSag() {
        LoadedColumn column = LoadedColumn.of(uniform(), 0, 0);
        double push = 1;
        double added = column.rodStress(push, LENGTH, LEVEL) - column.rodStress(0, LENGTH, LEVEL) - push / ROD_AREA;
        double sag = 5 * WEIGHT * Math.pow(LENGTH, 4) / (384 * STIFFNESS);
        double secondOrder = 2 * push / (Math.PI * Math.PI * STIFFNESS / (LENGTH * LENGTH));
        assertEquals(sag, added * ROD_MODULUS / push, secondOrder * sag);
    }

    /** Uniform load and compression, M = w·L²/8·2(sec u − 1)/u², u = L/2·√(P/EI): Timoshenko and Gere (memory). */
    @Test
    void weightAndPush() {
        LoadedColumn column = LoadedColumn.of(uniform(), 0, 0);
        for (double share : new double[] {0.02, 0.4, 0.95}) {
            double load = share * Math.PI * Math.PI * STIFFNESS / (LENGTH * LENGTH);
            double u = LENGTH / 2 * Math.sqrt(load / STIFFNESS);
            double moment = WEIGHT * LENGTH * LENGTH / 8 * 2 * (1 / Math.cos(u) - 1) / (u * u);
            double expected = load / ROD_AREA + moment / ROD_MODULUS;
            assertEquals(expected, column.rodStress(load, LENGTH, LEVEL), CLOSED * expected / (1 - share));
        }
    }

    @Test
    void agreesWithFiniteElements() {
        SplittableRandom random = new SplittableRandom(SEED);
        for (int i = 0; i < 25; i++) {
            double rod = random.nextDouble(0.05, 0.12);
            double bore = rod * random.nextDouble(1.2, 1.8);
            double outside = bore * random.nextDouble(1.1, 1.3);
            double l1 = random.nextDouble(0.8, 2.5);
            double l2 = random.nextDouble(0.4, 2.5);
            double e = random.nextDouble(0, 0.02);
            double kink = random.nextDouble(0, 0.02);
            double tilt = random.nextDouble(-1.5, 1.5);
            Cylinder cylinder = Cylinders.column(bore, rod, new Tube(l1, outside));
            double load = random.nextDouble(0, 0.95) * Column.of(cylinder).elastic(l1 + l2);
            double[] parts = {l1, l2};
            double i1 = Math.PI / 64 * (Math.pow(outside, 4) - Math.pow(bore, 4));
            double i2 = Math.PI / 64 * Math.pow(rod, 4);
            double steel = Math.PI / 4 * 7850 * GRAVITY * Math.cos(tilt);
            double oil = Math.PI / 4 * 870 * GRAVITY * Math.cos(tilt);
            double[] weight = {steel * (outside * outside - bore * bore) + oil * bore * bore, steel * rod * rod};
            ElementColumn elements = new ElementColumn(parts, new double[] {206e9 * i1, 206e9 * i2}, PER_PART);
            double[] moments = elements.moments(load, weight, e, kink);
            LoadedColumn ours = LoadedColumn.of(cylinder, e, kink);
            String where = "seed " + SEED + " case " + i + " load " + load;
            double rodStress = load / (Math.PI / 4 * rod * rod) + peak(moments, PER_PART, 2 * PER_PART) * rod / 2 / i2;
            assertEquals(rodStress, ours.rodStress(load, l1 + l2, tilt), ELEMENTS * rodStress, where);
            double tube = peak(moments, 0, PER_PART) * outside / 2 / i1;
            assertEquals(tube, ours.tubeBending(load, l1 + l2, tilt), ELEMENTS * tube, where);
        }
    }

    /** Largest of the nodes first to last, and of the parabola through the largest and its neighbours in the part. */
    private static double peak(double[] moments, int first, int last) {
        int top = first;
        for (int i = first; i <= last; i++) {
            top = moments[i] > moments[top] ? i : top;
        }
        int middle = Math.min(Math.max(top, first + 1), last - 1);
        double slope = (moments[middle + 1] - moments[middle - 1]) / 2;
        double curve = moments[middle + 1] - 2 * moments[middle] + moments[middle - 1];
        boolean peaked = curve < 0 && Math.abs(slope) < -curve;
        return peaked ? moments[middle] - slope * slope / (2 * curve) : moments[top];
    }

    /** At its capacity the rod stands at the stress, and only a smaller push keeps below. */
    @Test
    void capacityReachesTheStress() {
        Cylinder cylinder = Cylinders.column(0.125, 0.070, new Tube(1.50, 0.150));
        double stress = 350e6;
        double worse = Double.POSITIVE_INFINITY;
        for (double e : new double[] {0, 0.001, 0.005, 0.02}) {
            LoadedColumn column = LoadedColumn.of(cylinder, e, 0.002);
            double load = column.capacity(2.90, LEVEL, stress);
            assertEquals(stress, column.rodStress(load, 2.90, LEVEL), 1e-7 * stress);
            assertTrue(load < worse && load < Column.of(cylinder).elastic(2.90), "e " + e + " load " + load);
            assertTrue(column.rodStress(0.999 * load, 2.90, LEVEL) < stress, "e " + e);
            worse = load;
        }
    }

    /** Nothing to bow it: the elastic load when slender, stress times area when short. */
    @Test
    void perfectColumn() {
        LoadedColumn upright = LoadedColumn.of(uniform(), 0, 0);
        double euler = Math.PI * Math.PI * STIFFNESS / (LENGTH * LENGTH);
        assertEquals(euler, upright.capacity(LENGTH, UPRIGHT, 350e6), 1e-9 * euler);
        assertEquals(1e6 * ROD_AREA, upright.capacity(LENGTH, UPRIGHT, 1e6), 1e-9 * euler);
    }

    @Test
    void edges() {
        LoadedColumn column = LoadedColumn.of(uniform(), 0.001, 0);
        double bare = column.rodStress(0, LENGTH, LEVEL);
        assertEquals(0, column.capacity(LENGTH, LEVEL, 0.99 * bare));
        assertTrue(column.capacity(LENGTH, LEVEL, 1.01 * bare) > 0);
        assertTrue(Double.isNaN(column.capacity(0.7, LEVEL, 350e6)), "no exposed rod");
        assertTrue(Double.isNaN(column.rodStress(-1, LENGTH, LEVEL)), "a pull is no column");
        assertEquals(Double.POSITIVE_INFINITY, column.rodStress(1e9, LENGTH, LEVEL));
        assertThrows(IllegalArgumentException.class, () -> LoadedColumn.of(uniform(), -0.001, 0));
    }

    /** Series and closed form of the end turns meet where one takes over from the other. */
    @Test
    void seriesMeetsClosedForm() {
        double below = 0.1 * 0.1 * (1 - 1e-9);
        double above = 0.1 * 0.1 * (1 + 1e-9);
        BeamPart series = new BeamPart(1, 1, 1, below);
        BeamPart closed = new BeamPart(1, 1, 1, above);
        double meet = 1e-11;
        assertEquals(series.turnPerNearMoment(), closed.turnPerNearMoment(), meet);
        assertEquals(series.turnPerFarMoment(), closed.turnPerFarMoment(), meet);
        assertEquals(series.turnByWeight(), closed.turnByWeight(), meet);
    }
}
