package org.rodside.fatigue;

/** Takes counted cycles one after the other. */
@FunctionalInterface
public interface CycleSink {

    /**
     * Takes one cycle.
     *
     * @param range largest less smallest value; unit of the signal; positive
     * @param mean half of the sum of largest and smallest value; unit of the signal
     * @param count 1 for a cycle, 0.5 for a half cycle; no unit
     */
    void cycle(double range, double mean, double count);
}
