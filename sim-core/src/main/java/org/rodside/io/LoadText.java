package org.rodside.io;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.regex.Pattern;
import org.rodside.model.InputException;
import org.rodside.units.Unit;

/** Reads loads and counts as typed on the command line; an option not given is no load. */
public final class LoadText {

    /** A plain decimal number; {@code Double.parseDouble} alone would also take {@code NaN}, {@code 0x1p3}, {@code 1d}. */
    private static final Pattern NUMBER = Pattern.compile("[+-]?(\\d+\\.?\\d*|\\.\\d+)([eE][+-]?\\d+)?");

    /** Beyond this no number of an excavator lies, whatever its unit; no unit. */
    private static final double ABSURD = 1e9;

    private LoadText() {}

    /**
     * A force, {@code X,Y} in kN.
     *
     * @param option name of the option, for messages
     * @param text as typed
     * @return x and y part; in N
     */
    public static double[] force(String option, Optional<String> text) {
        if (text.isEmpty()) {
            return new double[2];
        }
        String[] parts = text.get().split(",", -1);
        if (parts.length != 2) {
            throw new InputException(option + ": two numbers X,Y in kN are wanted, found '" + text.get() + "'");
        }
        return new double[] {
            Unit.KILONEWTON.toSi(number(option, parts[0], "kN")), Unit.KILONEWTON.toSi(number(option, parts[1], "kN"))
        };
    }

    /** A mass in kg, not below zero; in kg. */
    public static double mass(String option, Optional<String> text) {
        double mass = text.isEmpty() ? 0 : number(option, text.get(), "kg");
        if (mass < 0) {
            throw new InputException(option + ": must not be below 0 kg, found " + text.get());
        }
        return mass;
    }

    /** A whole number from 1 to a largest one; 0 where the option is not given. */
    public static int count(String option, Optional<String> text, int most) {
        if (text.isEmpty()) {
            return 0;
        }
        String digits = text.get().strip();
        boolean whole = digits.matches("\\d{1,9}");
        if (!whole || Integer.parseInt(digits) < 1 || Integer.parseInt(digits) > most) {
            throw new InputException(
                    option + ": a whole number from 1 to " + most + " is wanted, found '" + text.get() + "'");
        }
        return Integer.parseInt(digits);
    }

    /** A number above zero, told in a unit; in SI, empty where the option is not given. */
    public static OptionalDouble above(String option, Optional<String> text, Unit unit) {
        if (text.isEmpty()) {
            return OptionalDouble.empty();
        }
        double value = number(option, text.get(), unit.symbol());
        if (!(value > 0)) {
            throw new InputException(option + ": must be above 0, found " + text.get());
        }
        return OptionalDouble.of(unit.toSi(value));
    }

    /** A number not below zero, told in a unit; in SI. */
    public static double notBelow(String option, String text, Unit unit) {
        double value = number(option, text, unit.symbol());
        if (!(value >= 0)) {
            throw new InputException(option + ": must not be below 0, found " + text);
        }
        return unit.toSi(value);
    }

    /** Whether a text is a plain decimal number, without white space around it. */
    static boolean isNumber(String text) {
        return NUMBER.matcher(text).matches();
    }

    /** A plain number. */
    public static double number(String option, String text, String unit) {
        String trimmed = text.strip();
        if (!isNumber(trimmed) || !(Math.abs(Double.parseDouble(trimmed)) <= ABSURD)) {
            throw new InputException(
                    option + ": a number" + (unit.isEmpty() ? "" : " in " + unit) + " is wanted, found '" + text + "'");
        }
        return Double.parseDouble(trimmed);
    }
}
