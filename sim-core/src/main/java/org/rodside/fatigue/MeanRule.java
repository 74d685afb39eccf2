package org.rodside.fatigue;

/**
 * What is done about the mean of a cycle before it is put into a test program (theory.md F5).
 *
 * @param strength 0: ranges and means are kept. Above 0: Goodman's line with this ultimate strength in the unit of the
 *     signal; a cycle about a pulling (positive) mean becomes range/(1 − mean/strength) about zero, a pushing mean is
 *     left out without credit
 */
public record MeanRule(double strength) {

    public static final MeanRule KEPT = new MeanRule(0);

    public MeanRule {
        if (!(strength >= 0) || Double.isInfinite(strength)) {
            throw new IllegalArgumentException("strength " + strength + " is not a number from 0 up");
        }
    }

    /** Range to be run; unit of the signal; infinite where the mean reaches the strength. */
    public double range(double range, double mean) {
        if (strength == 0 || mean <= 0) {
            return range;
        }
        return mean < strength ? range / (1 - mean / strength) : Double.POSITIVE_INFINITY;
    }

    /** Mean to be run; unit of the signal. */
    public double mean(double mean) {
        return strength == 0 ? mean : 0;
    }
}
