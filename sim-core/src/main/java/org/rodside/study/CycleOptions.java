package org.rodside.study;

import java.util.List;
import org.rodside.fatigue.MeanRule;
import org.rodside.fatigue.SnCurve;

/**
 * What a count of cycles is to tell.
 *
 * @param slopes exponents m of the equivalent ranges; no unit
 * @param reference number of cycles of the equivalent ranges; 0 for the number counted
 * @param repeat whether the recording repeats without end (full cycles only), else a single pass with half cycles
 * @param separate whether each recording stands alone, else each goes on where the one before ended
 * @param gate swings smaller than this are passed over; unit of the channel; 0 for none
 * @param hours life that the counts are scaled to; h; 0 for the recorded time
 * @param curve S–N line for the damage sum; null for none
 * @param bins classes of the range–mean matrix each way; 0 for no matrix
 * @param blocks what is done about means in the eight-level spectrum; null for no spectrum
 */
public record CycleOptions(
        List<Double> slopes,
        double reference,
        boolean repeat,
        boolean separate,
        double gate,
        double hours,
        SnCurve curve,
        int bins,
        MeanRule blocks) {

    public CycleOptions {
        slopes = List.copyOf(slopes);
    }

    /** Whether a damage sum is asked for. */
    public boolean hasCurve() {
        return curve != null;
    }

    /** Whether the spectrum's means are taken to zero by Goodman's line. */
    public boolean goodman() {
        return blocks != null && blocks.strength() > 0;
    }
}
