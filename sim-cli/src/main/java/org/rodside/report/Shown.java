package org.rodside.report;

import java.util.ArrayList;
import java.util.List;
import org.rodside.model.Cylinder;
import org.rodside.model.Linkage;
import org.rodside.units.Quantity;
import org.rodside.units.UnitSystem;

/** Numbers given in SI as people read them: converted, with few digits, with their unit. Immutable. */
final class Shown {

    private final UnitSystem units;

    Shown(UnitSystem units) {
        this.units = units;
    }

    /** Symbol of the unit of a quantity, e.g. {@code L/min}. */
    String unit(Quantity quantity) {
        return units.unit(quantity).symbol().replace('_', '/');
    }

    /** A table heading with its unit, e.g. {@code force, kN}. */
    String heading(String name, Quantity quantity) {
        return name + ", " + unit(quantity);
    }

    /** A number without its unit, for a cell under such a heading. */
    String cell(double si, Quantity quantity) {
        return TextTable.number(units.of(si, quantity));
    }

    /** A number with its unit. */
    String text(double si, Quantity quantity) {
        return cell(si, quantity) + " " + unit(quantity);
    }

    /** Numbers as they are drawn; a new array. */
    double[] all(double[] si, Quantity quantity) {
        double[] values = new double[si.length];
        for (int i = 0; i < values.length; i++) {
            values[i] = units.of(si[i], quantity);
        }
        return values;
    }

    /** Names of the cylinders of a linkage, in file order. */
    static List<String> cylinders(Linkage linkage) {
        return linkage.cylinders().stream().map(Cylinder::name).toList();
    }

    /** A pose in words, e.g. {@code boom 0.4, stick 0.5}. */
    static String pose(List<String> cylinders, double[] at) {
        List<String> parts = new ArrayList<>();
        for (int c = 0; c < at.length; c++) {
            parts.add(cylinders.get(c) + " " + TextTable.number(at[c]));
        }
        return String.join(", ", parts);
    }
}
