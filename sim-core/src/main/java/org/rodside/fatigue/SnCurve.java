package org.rodside.fatigue;

/**
 * Life under one constant range: straight lines in log-log, as EN 1993-1-9 draws them (theory.md F4). Down to the range
 * of the knee N = cycles·(reference/range)^slope; below it slope {@code lowSlope} down to the cut-off; below that no
 * damage. Where the knee is infinite the first line goes on for ever; where {@code lowSlope} is infinite the knee is
 * the limit under which nothing is damaged.
 *
 * @param slope m of the upper line; above 0; no unit
 * @param reference range that is borne {@code cycles} times; unit of the signal
 * @param cycles number of cycles at the reference range
 * @param knee number of cycles at which the slope changes; infinite for none
 * @param lowSlope m below the knee; infinite for a limit there
 * @param cutoff number of cycles beyond which ranges do no damage; infinite for none
 */
public record SnCurve(double slope, double reference, double cycles, double knee, double lowSlope, double cutoff) {

    private static final double EN_CYCLES = 2e6;
    private static final double EN_KNEE = 5e6;
    private static final double EN_CUTOFF = 1e8;

    public SnCurve {
        boolean positive = slope > 0 && reference > 0 && cycles > 0 && knee > 0 && lowSlope > 0 && cutoff > 0;
        boolean finite = Double.isFinite(slope) && Double.isFinite(reference) && Double.isFinite(cycles);
        if (!positive || !finite || cutoff < knee) {
            throw new IllegalArgumentException("slope, range and cycles must be above 0, cutoff not below knee");
        }
    }

    /**
     * Detail category of EN 1993-1-9 for direct stress: slope 3 to 5 million cycles, slope 5 to 100 million.
     *
     * @param category stress range borne 2 million times; MPa
     */
    public static SnCurve category(double category) {
        return new SnCurve(3, category, EN_CYCLES, EN_KNEE, 5, EN_CUTOFF);
    }

    /** Range at the knee; unit of the signal; 0 where there is none. */
    public double kneeRange() {
        return Double.isInfinite(knee) ? 0 : reference * Math.pow(cycles / knee, 1 / slope);
    }

    /** Range at the cut-off; unit of the signal; 0 where there is none. */
    public double cutoffRange() {
        if (Double.isInfinite(lowSlope)) {
            return kneeRange();
        }
        return Double.isInfinite(cutoff) ? 0 : kneeRange() * Math.pow(knee / cutoff, 1 / lowSlope);
    }

    /** Cycles borne at a range; infinite below the cut-off and at range 0. */
    public double life(double range) {
        return 1 / damage(range);
    }

    /** Share of life that one cycle of a range takes (Palmgren–Miner); no unit. */
    public double damage(double range) {
        double kneeRange = kneeRange();
        if (range >= kneeRange) {
            return Math.pow(range / reference, slope) / cycles;
        }
        return range < cutoffRange() ? 0 : Math.pow(range / kneeRange, lowSlope) / knee;
    }
}
