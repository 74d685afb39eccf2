package org.rodside.io;

import java.util.List;
import java.util.Optional;
import org.rodside.units.Unit;

/**
 * The units a file is written in, and the sizes beyond which a number must be a slip of the pen or of the unit.
 *
 * @param length of coordinates and diameters
 * @param mass of links and machine
 * @param pressure of circuits, and of the yield stress
 * @param force of the constant part of friction
 */
record FileUnits(Unit length, Unit mass, Unit pressure, Unit force) {

    static final List<Unit> LENGTHS = List.of(Unit.MILLIMETRE, Unit.CENTIMETRE, Unit.METRE, Unit.INCH, Unit.FOOT);
    static final List<Unit> MASSES = List.of(Unit.KILOGRAM, Unit.TONNE, Unit.POUND);
    static final List<Unit> PRESSURES = List.of(Unit.BAR, Unit.MEGAPASCAL, Unit.KILOPASCAL, Unit.PSI);
    static final List<Unit> FORCES = List.of(Unit.KILONEWTON, Unit.NEWTON, Unit.POUND_FORCE);

    /** No front is a kilometre long; in m. */
    private static final double LARGEST_LENGTH = 1e3;

    /** No bore, rod or stroke is thinner than a micrometre; in m. */
    private static final double SMALLEST_LENGTH = 1e-6;

    /** A hundred thousand tonnes; in kg. */
    private static final double LARGEST_MASS = 1e8;

    /** A hundred thousand bar, above any steel's yield stress; in Pa. */
    private static final double LARGEST_PRESSURE = 1e10;

    /** A million kilonewton; in N. */
    private static final double LARGEST_FORCE = 1e9;

    /** A million cubic metres; in m³. */
    private static final double LARGEST_VOLUME = 1e6;

    Amount length(String what, Range range) {
        return new Amount(what, length, range, SMALLEST_LENGTH, LARGEST_LENGTH);
    }

    Amount mass(String what) {
        return new Amount(what, mass, Range.ZERO_OR_MORE, 0, LARGEST_MASS);
    }

    Amount pressure(String what, Range range) {
        return new Amount(what, pressure, range, 0, LARGEST_PRESSURE);
    }

    Amount force(String what) {
        return new Amount(what, force, Range.ZERO_OR_MORE, 0, LARGEST_FORCE);
    }

    /** Bucket capacity: cubic yards where lengths are in inches or feet, otherwise cubic metres. */
    Amount volume(String what) {
        boolean yards = length == Unit.INCH || length == Unit.FOOT;
        return new Amount(what, yards ? Unit.CUBIC_YARD : Unit.CUBIC_METRE, Range.ABOVE_ZERO, 0, LARGEST_VOLUME);
    }

    /** Reads the member {@code units} of a file; where a unit is at fault, its first choice stands in. */
    static FileUnits read(FieldReader file) {
        FieldReader units = file.object("units", "give the units of length, mass and pressure")
                .only("length", "mass", "pressure", "force");
        return new FileUnits(
                unit(units, "length", LENGTHS, false),
                unit(units, "mass", MASSES, false),
                unit(units, "pressure", PRESSURES, false),
                unit(units, "force", FORCES, true));
    }

    private static Unit unit(FieldReader units, String key, List<Unit> choices, boolean optional) {
        String remedy = "give one of "
                + String.join(", ", choices.stream().map(Unit::symbol).toList());
        if (optional && !units.has(key)) {
            return choices.get(0);
        }
        Optional<String> symbol = units.text(key, remedy);
        for (Unit choice : choices) {
            if (symbol.isPresent() && symbol.get().equals(choice.symbol())) {
                return choice;
            }
        }
        symbol.ifPresent(found -> units.fault(
                key, "is not a unit of " + key + " here, found \"" + JsonTree.shorten(found) + "\"; " + remedy));
        return choices.get(0);
    }
}
