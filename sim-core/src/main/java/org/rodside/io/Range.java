package org.rodside.io;

/**
 * The numbers a value may take, in the unit it is read in and judged in.
 *
 * @param low lower end
 * @param lowOpen whether the lower end itself is refused
 * @param high upper end
 * @param highOpen whether the upper end itself is refused
 * @param words the rule as said in an error, after "must be"
 */
record Range(double low, boolean lowOpen, double high, boolean highOpen, String words) {

    private static final double NO_END = Double.POSITIVE_INFINITY;

    static final Range ANY = new Range(-NO_END, false, NO_END, false, "a number");
    static final Range ABOVE_ZERO = new Range(0, true, NO_END, false, "above 0");
    static final Range ZERO_OR_MORE = new Range(0, false, NO_END, false, "0 or more");
    static final Range SHARE_BELOW_ONE = new Range(0, false, 1, true, "from 0 to below 1");

    boolean holds(double value) {
        return (lowOpen ? value > low : value >= low) && (highOpen ? value < high : value <= high);
    }
}
