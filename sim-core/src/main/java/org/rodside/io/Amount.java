package org.rodside.io;

import java.util.Optional;
import org.rodside.units.Unit;

/**
 * What a number in a file stands for.
 *
 * @param what name of the thing with its article, for errors
 * @param unit unit the file gives it in
 * @param range values allowed; in that unit
 * @param smallest what is above 0 may not be nearer to 0 than this; in SI, 0 where there is no such limit
 * @param largest what is further from 0 than this is a slip; in SI
 */
record Amount(String what, Unit unit, Range range, double smallest, double largest) {

    /** A number without a unit. */
    static Amount plain(String what, Range range) {
        return new Amount(what, Unit.ONE, range, 0, Double.MAX_VALUE);
    }

    /** What the user should write, for the end of an error. */
    String remedy() {
        return "give " + what + (unit == Unit.ONE ? " as a plain number" : " in " + unit.symbol());
    }

    /** What is wrong with a value in file units; empty when nothing is. */
    Optional<String> fault(double value) {
        if (!Double.isFinite(value)) {
            return Optional.of("must be a finite number");
        } else if (!range.holds(value)) {
            return Optional.of("must be " + range.words());
        } else if (Math.abs(unit.toSi(value)) > largest) {
            return Optional.of("is too large to be meant (over " + Shown.number(unit.fromSi(largest)) + ")");
        } else if (range.equals(Range.ABOVE_ZERO) && unit.toSi(value) < smallest) {
            return Optional.of("is too small to be meant (below " + Shown.number(unit.fromSi(smallest)) + ")");
        }
        return Optional.empty();
    }
}
