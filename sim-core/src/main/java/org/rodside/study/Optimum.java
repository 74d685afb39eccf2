package org.rodside.study;

/**
 * The best value found and where.
 *
 * @param value the value, in the unit of what was asked; NaN where no pose has one
 * @param at fraction of stroke of each cylinder; not to be modified
 */
public record Optimum(double value, double[] at) {

    /** True where some pose has a value. */
    public boolean exists() {
        return !Double.isNaN(value);
    }
}
