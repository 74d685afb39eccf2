package org.rodside.hydraulics;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.rodside.model.Cylinder;
import org.rodside.model.Friction;
import org.rodside.model.Sides;

/** Force to pressure and back, limits and friction, each found two ways. */
class CylinderTest {

    /** A handful of operations on doubles. */
    private static final double ROUNDING = 1e-12;

    private static final long SEED = 20_240_611;

    private final Cylinder pair = Cylinders.pair();
    private final CylinderArea area = CylinderArea.of(pair);
    private final CylinderPressure pressure = CylinderPressure.of(pair, false);
    private final CylinderLimits limits = CylinderLimits.of(pair, false);

    @Test
    void pressuresGiveTheForceBack() {
        SplittableRandom random = new SplittableRandom(SEED);
        for (int i = 0; i < 1000; i++) {
            double force = random.nextDouble(-2e6, 2e6);
            Sides sides = pressure.of(force);
            assertEquals(
                    force, area.force(sides.cap(), sides.rod()), ROUNDING * 2e6, "seed " + SEED + " force " + force);
            assertEquals(
                    force < 0 ? 3e5 : 5e5, force < 0 ? sides.cap() : sides.rod(), "back pressure on the other side");
        }
    }

    /** Friction by hand from the pressures: what leaves the cylinder is the ideal force less constant and share. */
    @Test
    void drivingPressuresLeaveTheForceAfterFriction() {
        SplittableRandom random = new SplittableRandom(SEED);
        for (int i = 0; i < 1000; i++) {
            double force = random.nextDouble(-2e6, 2e6);
            double ideal = area.forceEach(pressure.drivingCap(force), pressure.drivingRod(force));
            double left = Math.abs(ideal) - (1600 + 0.02 * Math.abs(ideal));
            assertEquals(Math.abs(force), 2 * left, ROUNDING * 2e6, "seed " + SEED + " force " + force);
            assertEquals(Math.signum(force), Math.signum(ideal), "seed " + SEED + " force " + force);
        }
    }

    /** At its driving limit a cylinder stands at working pressure on the loaded side. */
    @Test
    void drivingLimitsMeetWorkingPressure() {
        assertEquals(250e5, pressure.driving(limits.drivingPush()).cap(), ROUNDING * 250e5);
        assertEquals(230e5, pressure.driving(-limits.drivingPull()).rod(), ROUNDING * 230e5);
    }

    @Test
    void holdingLimitsMeetReliefPressureWithoutBackPressure() {
        CylinderPressure noBack = CylinderPressure.of(pair, true);
        assertEquals(1, noBack.reliefMargin(limits.holdingPush()), ROUNDING);
        assertEquals(1, noBack.reliefMargin(-limits.holdingPull()), ROUNDING);
        assertEquals(2, noBack.reliefMargin(limits.holdingPush() / 2), ROUNDING);
        assertEquals(Double.POSITIVE_INFINITY, noBack.reliefMargin(0));
    }

    /** Bore 125, rod 90 mm by hand: 2·((250e5·0.01227185 − 5e5·0.00591023)·0.98 − 1600) N. */
    @Test
    void drivingLimitsByHand() {
        double capArea = 0.012271846;
        double rodArea = 0.005910121;
        double handArea = 1e-7; // digits of the areas below
        assertEquals(2 * ((250e5 * capArea - 5e5 * rodArea) * 0.98 - 1600), limits.drivingPush(), handArea * 600e3);
        assertEquals(2 * ((230e5 * rodArea - 3e5 * capArea) * 0.98 - 1600), limits.drivingPull(), handArea * 600e3);
    }

    @Test
    void idealLeavesOutFrictionAndBackPressure() {
        CylinderLimits ideal = CylinderLimits.of(pair, true);
        assertEquals(area.force(250e5, 0), ideal.drivingPush(), ROUNDING * ideal.drivingPush());
        assertEquals(-area.force(0, 230e5), ideal.drivingPull(), ROUNDING * ideal.drivingPull());
    }

    /** Back pressure larger than the pump's reach: the ideal pull is negative, and friction must not make it better. */
    @Test
    void aLimitThatCannotMoveStaysNegative() {
        Sides back = new Sides(200e5, 0);
        double friction = 1000;
        CylinderLimits stuck =
                CylinderLimits.of(Cylinders.with(0.125, 0.090, 1, back, new Friction(friction, 0.02)), false);
        double ideal = 250e5 * area.rod() - 200e5 * area.cap();
        assertTrue(ideal < 0, "the case is negative");
        assertEquals(ideal - friction + 0.02 * ideal, stuck.drivingPull(), ROUNDING * 1e5);
    }

    /** The blocked rod side by force balance: with it the cylinder gives exactly the outside force. */
    @Test
    void intensifiedRodSideBalances() {
        for (double force : new double[] {-200e3, 0, 150e3}) {
            assertEquals(force, area.force(250e5, pressure.intensifiedRod(force)), ROUNDING * 1e6);
        }
        assertEquals(300e5 / pressure.intensifiedRod(0), pressure.intensifiedMargin(0), ROUNDING);
        assertTrue(pressure.intensifiedRod(0) > 250e5, "higher than the pump's own pressure");
    }

    /** Oil in less oil out is the volume the rod takes: in the extending cylinder that is rod area times speed. */
    @Test
    void flows() {
        double rodVolume = 2 * CylinderArea.circle(0.090) * 0.3;
        assertEquals(rodVolume, area.capFlow(0.3) + area.rodFlow(0.3), ROUNDING);
        assertEquals(area.capFlow(0.3), area.supply(0.3));
        assertEquals(-area.rodFlow(-0.3), area.supply(-0.3));
        assertTrue(area.supply(-0.3) < 0 && area.rodFlow(-0.3) > 0, "retracting fills the rod side");
        assertEquals(0, area.supply(0));
    }

    @Test
    void harderTwinCarriesItsShare() {
        assertEquals(-50e3, area.harderForce(-100e3));
    }

    @Test
    void notANumberStaysOne() {
        assertTrue(Double.isNaN(pressure.cap(Double.NaN)) && Double.isNaN(pressure.rod(Double.NaN)));
        assertTrue(Double.isNaN(pressure.reliefMargin(Double.NaN)));
    }

    @Test
    void nonsenseIsRefusedWithNameAndValue() {
        Cylinder wide = Cylinders.plain(0.05, 0.06);
        String message = assertThrows(IllegalArgumentException.class, () -> CylinderArea.of(wide))
                .getMessage();
        assertTrue(message.contains("test.bore") && message.contains("0.05"), message);
        Cylinder share = Cylinders.with(0.1, 0.05, 1, new Sides(0, 0), new Friction(0, 1));
        assertThrows(IllegalArgumentException.class, () -> CylinderLimits.of(share, false));
    }
}
