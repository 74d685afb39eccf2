package org.rodside.io;

import java.math.BigDecimal;
import java.math.MathContext;
import org.rodside.units.Unit;

/** Numbers as errors show them. */
final class Shown {

    /** Enough to tell 0.1 mm at 100 m, few enough to hide the noise of a change of unit. */
    private static final MathContext DIGITS = new MathContext(7);

    private Shown() {}

    /** A number rounded to seven figures, without exponent where that is short. */
    static String number(double value) {
        if (!Double.isFinite(value)) {
            return String.valueOf(value);
        }
        BigDecimal rounded = new BigDecimal(value).round(DIGITS).stripTrailingZeros();
        boolean readable = Math.abs(rounded.precision() - rounded.scale()) <= 12;
        return readable ? rounded.toPlainString() : rounded.toString();
    }

    /** A value given in SI, in a unit and with its symbol. */
    static String in(Unit unit, double si) {
        return number(unit.fromSi(si)) + " " + unit.symbol();
    }
}
