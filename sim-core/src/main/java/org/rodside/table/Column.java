package org.rodside.table;

import java.util.List;
import org.rodside.units.Quantity;
import org.rodside.units.UnitSystem;

/**
 * One column of a table.
 *
 * @param name name without unit, e.g. {@code tip_x} or {@code boom.fraction}
 * @param quantity kind of number, which gives the unit; {@link Quantity#NONE} for fractions, factors and labels
 * @param decimals digits written behind the point; no unit
 * @param labels where not empty, the column holds words: each value is an index into this list, NaN an empty cell
 */
public record Column(String name, Quantity quantity, int decimals, List<String> labels) {

    public Column {
        labels = List.copyOf(labels);
    }

    /** A column of numbers. */
    public static Column of(String name, Quantity quantity, int decimals) {
        return new Column(name, quantity, decimals, List.of());
    }

    /** A column of numbers with the usual decimals of its quantity, {@link #decimals(Quantity)}. */
    public static Column of(String name, Quantity quantity) {
        return of(name, quantity, decimals(quantity));
    }

    /** A column of factors, margins and shares of limits: six decimals are plenty; no unit. */
    public static Column factor(String name) {
        return of(name, Quantity.NONE, 6);
    }

    /**
     * The decimals that a quantity is written with, in any of its units; the one place where they are chosen. Forces,
     * and the fractions of stroke from which poses are made again, are kept to nine so that a number read back is good
     * to 1e-9 of itself; lengths to a nanometre.
     */
    public static int decimals(Quantity quantity) {
        return switch (quantity) {
            case FORCE, MOMENT, NONE -> 9;
            case PRESSURE, ANGLE -> 7;
            case LENGTH, SPEED, FLOW, TIME, AREA, POWER, ENERGY, VOLUME -> 6;
            case MASS -> 4;
        };
    }

    /** A column of words out of a fixed list. */
    public static Column words(String name, List<String> labels) {
        return new Column(name, Quantity.NONE, 0, labels);
    }

    /** Heading in the units asked for, e.g. {@code tip_x_mm}. */
    public String heading(UnitSystem units) {
        return units.key(name, quantity);
    }
}
