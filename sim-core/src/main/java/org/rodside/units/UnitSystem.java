package org.rodside.units;

import java.util.EnumMap;
import java.util.Map;

/** The two sets of units that output can be had in. */
public enum UnitSystem {
    SI(
            Unit.MILLIMETRE,
            Unit.SQUARE_CENTIMETRE,
            Unit.KILONEWTON,
            Unit.BAR,
            Unit.KILOGRAM,
            Unit.KILONEWTON_METRE,
            Unit.MILLIMETRE_PER_SECOND,
            Unit.LITRE_PER_MINUTE,
            Unit.KILOWATT,
            Unit.KILOJOULE,
            Unit.CUBIC_METRE),
    US(
            Unit.INCH,
            Unit.SQUARE_INCH,
            Unit.POUND_FORCE,
            Unit.PSI,
            Unit.POUND,
            Unit.POUND_FORCE_FOOT,
            Unit.INCH_PER_SECOND,
            Unit.GALLON_PER_MINUTE,
            Unit.HORSEPOWER,
            Unit.FOOT_POUND_FORCE,
            Unit.CUBIC_YARD);

    private final Map<Quantity, Unit> units = new EnumMap<>(Quantity.class);

    UnitSystem(Unit... inOrder) {
        Quantity[] kinds = {
            Quantity.LENGTH,
            Quantity.AREA,
            Quantity.FORCE,
            Quantity.PRESSURE,
            Quantity.MASS,
            Quantity.MOMENT,
            Quantity.SPEED,
            Quantity.FLOW,
            Quantity.POWER,
            Quantity.ENERGY,
            Quantity.VOLUME
        };
        for (int i = 0; i < kinds.length; i++) {
            units.put(kinds[i], inOrder[i]);
        }
        units.put(Quantity.ANGLE, Unit.DEGREE);
        units.put(Quantity.TIME, Unit.SECOND);
        units.put(Quantity.NONE, Unit.ONE);
    }

    /** The unit in which a quantity is printed. */
    public Unit unit(Quantity quantity) {
        return units.get(quantity);
    }

    /** The key or column for a value: the name, and the unit behind an underscore where there is one. */
    public String key(String name, Quantity quantity) {
        String symbol = unit(quantity).symbol();
        return symbol.isEmpty() ? name : name + "_" + symbol;
    }

    /** A value given in SI as it is printed. */
    public double of(double si, Quantity quantity) {
        return unit(quantity).fromSi(si);
    }
}
