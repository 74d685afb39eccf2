package org.rodside.soil;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Wedge factors and blade forces against tables, a fine walk over β, and the equilibrium of the wedge itself. */
class WedgeTest {

    private static final long SEED = 1964;
    private static final double GRAVITY = 9.80665;

    /** Closed forms and 2 × 2 solves, worst near the limits of the angles drawn. */
    private static final double ROUNDING = 1e-9;

    private static WedgeFactors degrees(double friction, double wallFriction, double rake) {
        return WedgeFactors.of(Math.toRadians(friction), Math.toRadians(wallFriction), Math.toRadians(rake));
    }

    /** Vertical blade on level ground: 2·Nγ = Coulomb's K_p, Das, Principles of Foundation Engineering (memory). */
    @ParameterizedTest
    @CsvSource({
        "20, 0, 2.040", "20, 10, 2.636", "20, 20, 3.525",
        "30, 0, 3.000", "30, 10, 4.143", "30, 20, 6.105",
        "40, 0, 4.600", "40, 10, 6.946", "40, 20, 11.772"
    })
    void coulombTable(double friction, double wallFriction, double printed) {
        double lastDigit = 0.0012; // the table's 4.600 is 4.5989 by Rankine's own formula
        assertEquals(printed, 2 * degrees(friction, wallFriction, 90).weight(), lastDigit);
    }

    /** Rankine's smooth vertical wall, φ 30°: β = 45° − φ/2, Nγ = K_p/2, Nc = 2·√K_p, Nq = K_p (any book on soils). */
    @Test
    void rankine() {
        WedgeFactors factors = degrees(30, 0, 90);
        assertEquals(Math.toRadians(30), factors.failureAngle(), ROUNDING);
        assertEquals(1.5, factors.weight(), ROUNDING);
        assertEquals(2 * Math.sqrt(3), factors.cohesion(), ROUNDING);
        assertEquals(3, factors.surcharge(), ROUNDING);
    }

    /** Computed by an independent search over β. */
    @ParameterizedTest
    @CsvSource({"30, 20, 60, 29.484, 1.5555, 2.7084", "35, 23, 45, 31.067, 1.6918, 2.2092"})
    void computedFactors(double friction, double wall, double rake, double plane, double weight, double cohesion) {
        WedgeFactors factors = degrees(friction, wall, rake);
        assertEquals(plane, Math.toDegrees(factors.failureAngle()), 6e-4);
        assertEquals(weight, factors.weight(), 6e-5);
        assertEquals(cohesion, factors.cohesion(), 6e-5);
    }

    /** 17 kN/m³, 10 kPa, depth 0.20 m, width 1.0 m at (35, 23, 45): 5.5688 kN (computed). */
    @Test
    void computedForce() {
        Ground ground = new Ground(17e3 / GRAVITY, 10e3, Math.toRadians(35), Math.toRadians(23), 0, 0);
        assertEquals(
                5568.8,
                Blade.of(ground, 1.0).resistance(Math.toRadians(45), 0.20).force(),
                0.06);
    }

    /** No failure angle on a walk in steps of a 20 000th of the range has a smaller Nγ, and the best of them is near. */
    @Test
    void smallestByWalking() {
        SplittableRandom random = new SplittableRandom(SEED);
        int steps = 20_000;
        for (int i = 0; i < 300; i++) {
            double[] angles = angles(random);
            WedgeFactors factors = WedgeFactors.of(angles[0], angles[1], angles[2]);
            double range = Math.PI - angles[0] - angles[1] - angles[2];
            double best = Double.POSITIVE_INFINITY;
            for (int n = 1; n < steps; n++) {
                best = Math.min(
                        best,
                        WedgeFactors.at(range * n / steps, angles[0], angles[1], angles[2])
                                .weight());
            }
            String where = "seed " + SEED + " case " + i + " angles " + angles[0] + " " + angles[1] + " " + angles[2];
            assertTrue(factors.weight() <= best * (1 + ROUNDING), where);
            assertEquals(best, factors.weight(), 1e-5 * best, where);
            assertTrue(factors.failureAngle() > 0 && factors.failureAngle() < range, where);
        }
    }

    /** φ, δ, α at random, at least 6° away from having no wedge. */
    private static double[] angles(SplittableRandom random) {
        double friction = random.nextDouble(0.05, 0.9);
        double wall = random.nextDouble(0, friction);
        double rake = random.nextDouble(0.1, Math.PI - friction - wall - 0.1);
        return new double[] {friction, wall, rake};
    }

    /**
     * Equilibrium of the wedge, written from the drawing and not from the factors: weight, surcharge, cohesion on the
     * failure plane, adhesion on the blade, the reaction at φ to the failure plane, and the blade's force at δ to its
     * normal. Two equations for the two unknown forces; then the whole force on the blade is the opposite of the blade's.
     */
    @Test
    void wedgeIsInEquilibrium() {
        SplittableRandom random = new SplittableRandom(SEED);
        for (int i = 0; i < 300; i++) {
            double[] a = angles(random);
            double depth = random.nextDouble(0.05, 0.6);
            double width = random.nextDouble(0.5, 2);
            Ground ground = new Ground(
                    1800, random.nextDouble(3e4), a[0], a[1], random.nextDouble(1e4), random.nextDouble(2e4));
            Blade.Resistance ours = Blade.of(ground, width).resistance(a[2], depth);
            double beta = WedgeFactors.of(a[0], a[1], a[2]).failureAngle();
            double top = depth * (1 / Math.tan(a[2]) + 1 / Math.tan(beta));
            double weight = (1800 * GRAVITY * depth / 2 + ground.surcharge()) * top * width;
            double shear = ground.cohesion() * depth / Math.sin(beta) * width;
            double stick = ground.adhesion() * depth / Math.sin(a[2]) * width;
            double knownX = -shear * Math.cos(beta) + stick * Math.cos(a[2]);
            double knownY = -shear * Math.sin(beta) - stick * Math.sin(a[2]) - weight;
            double px = Math.sin(a[2] + a[1]);
            double py = Math.cos(a[2] + a[1]);
            double rx = -Math.sin(beta + a[0]);
            double ry = Math.cos(beta + a[0]);
            double force = (-knownX * ry + knownY * rx) / (px * ry - py * rx);
            String where = "seed " + SEED + " case " + i;
            assertEquals(force, ours.force(), ROUNDING * force, where);
            assertEquals(-(force * px + stick * Math.cos(a[2])), ours.along(), ROUNDING * force, where);
            assertEquals(-(force * py - stick * Math.sin(a[2])), ours.up(), ROUNDING * force, where);
        }
    }

    @ParameterizedTest
    @CsvSource({
        "30, 20, 0, RAKE_OUT_OF_RANGE",
        "30, 20, 180, RAKE_OUT_OF_RANGE",
        "30, 20, -10, RAKE_OUT_OF_RANGE",
        "30, 20, NaN, RAKE_OUT_OF_RANGE",
        "0, 0, 60, NO_FRICTION",
        "NaN, 0, 60, NO_FRICTION",
        "90, 0, 60, NO_FRICTION",
        "30, -1, 60, NO_FRICTION",
        "30, 20, 130.001, NO_FAILURE_PLANE",
        "30, 20, 129.999, FOUND",
        "30, 20, 0.001, FOUND"
    })
    void edges(double friction, double wallFriction, double rake, WedgeStatus status) {
        WedgeFactors factors = degrees(friction, wallFriction, rake);
        assertEquals(status, factors.status());
        boolean found = status == WedgeStatus.FOUND;
        assertEquals(found, factors.weight() > 0);
        Ground ground = new Ground(1800, 0, Math.toRadians(friction), Math.toRadians(wallFriction), 0, 0);
        Blade.Resistance resistance = Blade.of(ground, 1).resistance(Math.toRadians(rake), 0.2);
        assertEquals(status, resistance.status());
        assertEquals(!found, Double.isNaN(resistance.force()) && Double.isNaN(resistance.along()));
    }

    @Test
    void noDepthNoForce() {
        Ground ground = new Ground(1800, 1e4, 0.5, 0.3, 2e3, 0);
        Blade.Resistance none = Blade.of(ground, 1.2).resistance(1, 0);
        assertEquals(0, none.force());
        assertEquals(0, none.along(), 0);
        assertThrows(IllegalArgumentException.class, () -> Blade.of(ground, 1.2).resistance(1, -0.1));
        assertThrows(IllegalArgumentException.class, () -> Blade.of(ground, -1));
    }
}
