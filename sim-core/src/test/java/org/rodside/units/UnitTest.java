package org.rodside.units;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashSet;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Every factor, in one direction, against a figure typed in from a standard, so that an inverted factor cannot pass.
 * Figures from memory of NIST Special Publication 811 (2008), appendix B, and ISO 80000-1, -3 and -4; those that are
 * exact by definition are typed in full, the others with the figures that the table prints.
 */
class UnitTest {

    /** Exact by definition: only the rounding of doubles may differ; relative. */
    private static final double EXACT = 1e-15;

    @ParameterizedTest
    @CsvSource({
        "METRE, 1",
        "MILLIMETRE, 0.001",
        "CENTIMETRE, 0.01",
        "INCH, 0.0254",
        "FOOT, 0.3048",
        "SQUARE_CENTIMETRE, 0.0001",
        "SQUARE_INCH, 0.00064516",
        "RADIAN, 1",
        "NEWTON, 1",
        "KILONEWTON, 1000",
        "POUND_FORCE, 4.4482216152605",
        "PASCAL, 1",
        "KILOPASCAL, 1000",
        "MEGAPASCAL, 1000000",
        "BAR, 100000",
        "KILOGRAM, 1",
        "TONNE, 1000",
        "POUND, 0.45359237",
        "KILONEWTON_METRE, 1000",
        "POUND_FORCE_FOOT, 1.3558179483314004",
        "MILLIMETRE_PER_SECOND, 0.001",
        "INCH_PER_SECOND, 0.0254",
        "KILOWATT, 1000",
        "HORSEPOWER, 745.69987158227022",
        "KILOJOULE, 1000",
        "FOOT_POUND_FORCE, 1.3558179483314004",
        "SECOND, 1",
        "CUBIC_METRE, 1",
        "CUBIC_YARD, 0.764554857984",
        "ONE, 1"
    })
    void exactFactors(Unit unit, double si) {
        assertEquals(si, unit.inSi(), si * EXACT);
        assertEquals(7 * si, unit.toSi(7), 7 * si * EXACT);
        assertEquals(7 / si, unit.fromSi(7), 7 / si * EXACT);
    }

    /** Factors that the table prints rounded, or that are a quotient of two exact ones; each with its printed figures. */
    @ParameterizedTest
    @CsvSource({
        // 1 degree = 1.745 329 E-02 rad
        "DEGREE, 1, 0.01745329, 0.000000005",
        // 1 psi = 6.894 757 E+03 Pa; with more figures 6894.757293
        "PSI, 1, 6894.757293, 0.0000005",
        // 60 L/min = 1 L/s = 0.001 m³/s
        "LITRE_PER_MINUTE, 60, 0.001, 1e-18",
        // 1 US gallon = 3.785 411 784 L exactly, so 60 gal/min = 3.785 411 784e-3 m³/s
        "GALLON_PER_MINUTE, 60, 0.003785411784, 1e-17"
    })
    void printedFactors(Unit unit, double value, double si, double tolerance) {
        assertEquals(si, unit.toSi(value), tolerance);
    }

    @Test
    void keysAndFilesUseDifferentSymbolsForDifferentUnits() {
        Set<String> symbols = new HashSet<>();
        for (Unit unit : Unit.values()) {
            assertTrue(symbols.add(unit.symbol()), () -> "two units are written " + unit.symbol());
        }
    }

    @Test
    void printedSystems() {
        // 1 m = 1000 mm = 39.37007874 in; 1 MPa = 10 bar = 145.0377377 psi (NIST SP 811, appendix B; from memory).
        assertEquals(1000, UnitSystem.SI.of(1, Quantity.LENGTH), 1e-12);
        assertEquals(39.37007874, UnitSystem.US.of(1, Quantity.LENGTH), 5e-9);
        assertEquals(10, UnitSystem.SI.of(1e6, Quantity.PRESSURE), 1e-14);
        assertEquals(145.0377377, UnitSystem.US.of(1e6, Quantity.PRESSURE), 5e-8);
        assertEquals("reach_mm", UnitSystem.SI.key("reach", Quantity.LENGTH));
        assertEquals("reach_in", UnitSystem.US.key("reach", Quantity.LENGTH));
        assertEquals("share", UnitSystem.US.key("share", Quantity.NONE));
        for (Quantity quantity : Quantity.values()) {
            assertNotNull(UnitSystem.SI.unit(quantity), quantity::name);
            assertNotNull(UnitSystem.US.unit(quantity), quantity::name);
        }
    }
}
