package org.rodside.hydraulics;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.rodside.units.Unit.GALLON_PER_MINUTE;
import static org.rodside.units.Unit.INCH;
import static org.rodside.units.Unit.INCH_PER_SECOND;
import static org.rodside.units.Unit.POUND_FORCE;
import static org.rodside.units.Unit.PSI;
import static org.rodside.units.Unit.SQUARE_CENTIMETRE;
import static org.rodside.units.Unit.SQUARE_INCH;

import java.util.List;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.rodside.model.Cylinder;
import org.rodside.model.Friction;
import org.rodside.model.Sides;

/** Cylinder forces, pressures and flows against figures printed elsewhere; the source stands at each test. */
class CylinderReferenceTest {

    /** Half a unit in the last of three printed digits, as a share of the smallest three-digit number. */
    private static final double THREE_DIGITS = 0.005;

    /** Books round intermediate areas to three digits too. */
    private static final double BOOK = 0.003;

    private static final double NO_LOAD = 0;

    private static void near(double printed, double ours, double share) {
        assertEquals(printed, ours, share * Math.abs(printed));
    }

    private static double diameter(double area) {
        return Math.sqrt(4 * area / Math.PI);
    }

    /** Esposito, Fluid Power with Applications, Ex. 6-1 (inputs seen): bore 2 in, rod 1 in, 20 gpm, 1000 lb. */
    @Test
    void espositoPressuresAndSpeeds() {
        Cylinder cylinder = Cylinders.plain(INCH.toSi(2), INCH.toSi(1));
        CylinderPressure pressure = CylinderPressure.of(cylinder, false);
        CylinderArea area = CylinderArea.of(cylinder);
        double load = POUND_FORCE.toSi(1000);
        double pump = GALLON_PER_MINUTE.toSi(20);
        double feet = 12;
        near(318, PSI.fromSi(pressure.cap(load)), BOOK);
        near(425, PSI.fromSi(pressure.rod(-load)), BOOK);
        near(2.04, INCH_PER_SECOND.fromSi(pump / area.supply(1)) / feet, BOOK);
        near(2.72, INCH_PER_SECOND.fromSi(pump / -area.supply(-1)) / feet, BOOK);
    }

    /** Esposito, Ex. 9-1 (inputs seen), regenerative: 1000 psi, piston 25 in², rod 7 in², 20 gpm. */
    @Test
    void espositoRegenerative() {
        Cylinder cylinder = Cylinders.plain(diameter(SQUARE_INCH.toSi(25)), diameter(SQUARE_INCH.toSi(7)));
        CylinderArea area = CylinderArea.of(cylinder);
        double pump = GALLON_PER_MINUTE.toSi(20);
        double pressure = PSI.toSi(1000);
        double bothSidesJoined = area.capFlow(1) + area.rodFlow(1);
        near(11.0, INCH_PER_SECOND.fromSi(pump / bothSidesJoined), BOOK);
        near(7000, POUND_FORCE.fromSi(area.force(pressure, pressure)), BOOK);
        near(4.28, INCH_PER_SECOND.fromSi(pump / area.rodFlow(-1)), BOOK);
        near(-18_000, POUND_FORCE.fromSi(area.force(0, pressure)), BOOK);
    }

    /** OpenStax College Physics, problem 11.48 (seen): 13.8 kN on a 25.0 mm bore makes 28.1 MPa. */
    @Test
    void openStaxPressure() {
        CylinderPressure pressure = CylinderPressure.of(Cylinders.plain(0.025, 0.012), false);
        near(28.1e6, pressure.cap(13.8e3), THREE_DIGITS / 2.81);
    }

    /** Areas from ISO 3320 sizes (computed by hand to the digits shown). */
    @ParameterizedTest
    @CsvSource({
        "80, 56, 50.265, 25.635",
        "100, 70, 78.540, 40.055",
        "125, 90, 122.718, 59.101",
        "140, 100, 153.938, 75.398"
    })
    void areas(double bore, double rod, double capSquareCentimetres, double rodSquareCentimetres) {
        double lastDigit = 0.0005;
        CylinderArea area = CylinderArea.of(Cylinders.plain(bore / 1000, rod / 1000));
        assertEquals(capSquareCentimetres, SQUARE_CENTIMETRE.fromSi(area.cap()), lastDigit);
        assertEquals(rodSquareCentimetres, SQUARE_CENTIMETRE.fromSi(area.rod()), lastDigit);
        assertTrue(PreferredSizes.BORES.contains(bore / 1000), "a preferred bore");
        assertTrue(PreferredSizes.RODS.contains(rod / 1000), "a preferred rod");
    }

    /** 250 bar on bore 100, rod 70 mm (computed): push 196.350 kN, pull 100.138 kN, rod side intensified to 490.2 bar. */
    @Test
    void pushPullAndIntensified() {
        Cylinder cylinder = Cylinders.plain(0.100, 0.070);
        CylinderLimits limits = CylinderLimits.of(cylinder, false);
        assertEquals(196_350, limits.drivingPush(), 0.5);
        assertEquals(100_138, limits.drivingPull(), 0.5);
        CylinderPressure pressure = CylinderPressure.of(cylinder, false);
        assertEquals(490.2e5, pressure.intensifiedRod(NO_LOAD), 0.05e5);
        assertEquals(280 / 490.2, pressure.intensifiedMargin(NO_LOAD), 1e-4);
    }

    /** A 3 in bore at 172 bar extends with about 79 kN, 18 000 lbf: common practice, no source. */
    @Test
    void threeInchBore() {
        double push =
                CylinderArea.of(Cylinders.plain(INCH.toSi(3), INCH.toSi(1.5))).force(172e5, 0);
        double about = 0.5 / 18; // half a unit in the last digit told
        near(79e3, push, about);
        near(18_000, POUND_FORCE.fromSi(push), about);
    }

    /** 17 bar is about 250 psi: common practice, no source. */
    @Test
    void seventeenBar() {
        near(250, PSI.fromSi(17e5), 0.02);
    }

    /**
     * A tight industrial cylinder of 3 in bore needs 300 to 500 lbf to overcome its seals, 2 to 3 % of its full force at
     * 172 bar: common practice, no source. A friction share in that span must cost a force in that span.
     */
    @ParameterizedTest
    @CsvSource({"0.02", "0.025"})
    void sealFriction(double share) {
        double bore = INCH.toSi(3);
        Cylinder tight = Cylinders.with(bore, bore / 2, 1, new Sides(0, 0), new Friction(0, share));
        double shareOfPressure = 172.0 / 250;
        double lost = CylinderLimits.of(tight, true).drivingPush()
                - CylinderLimits.of(tight, false).drivingPush();
        double pounds = POUND_FORCE.fromSi(lost * shareOfPressure);
        assertTrue(pounds > 300 && pounds < 500, "friction " + pounds + " lbf");
    }

    /**
     * Seals of an industrial cylinder leak next to nothing, so a blocked cylinder holds up to its relief whatever its
     * friction and back pressure: common practice, no source.
     */
    @Test
    void blockedCylinderHolds() {
        CylinderLimits limits = CylinderLimits.of(Cylinders.pair(), false);
        CylinderArea area = CylinderArea.of(Cylinders.pair());
        assertEquals(2 * 280e5 * area.cap(), limits.holdingPush());
        assertEquals(2 * 300e5 * area.rod(), limits.holdingPull());
        assertTrue(limits.holdingPush() > limits.drivingPush(), "holds more than it drives");
    }

    /** ISO 3320 (memory), in mm, second-choice bores in brackets as the standard prints them. */
    @Test
    void preferredSizes() {
        String bores =
                "25 32 40 50 63 80 (90) 100 (110) 125 (140) 160 (180) 200 (220) 250 (280) 320 (360) 400 (450) 500";
        String rods =
                "12 14 16 18 20 22 25 28 32 36 40 45 50 56 63 70 80 90 100 110 125 140 160 180 200 220 250 280 320 360";
        assertEquals(bores, spelt(PreferredSizes.BORES));
        assertEquals(rods, spelt(PreferredSizes.RODS).replaceAll("[()]", ""));
    }

    private static String spelt(List<Double> sizes) {
        return sizes.stream()
                .map(d -> PreferredSizes.SECOND_CHOICE_BORES.contains(d) ? "(" + mm(d) + ")" : mm(d))
                .collect(Collectors.joining(" "));
    }

    private static String mm(double metres) {
        return Long.toString(Math.round(metres * 1000));
    }
}
