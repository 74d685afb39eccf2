package org.rodside.study;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Supplier;
import org.rodside.fatigue.BlockSpectrum;
import org.rodside.fatigue.CycleAccumulator;
import org.rodside.fatigue.CycleTable;
import org.rodside.fatigue.RainflowAccumulator;
import org.rodside.fatigue.RangeMeanMatrix;
import org.rodside.model.InputException;

/**
 * Counts the cycles of many channels row by row, over one recording or several, in bounded memory: together the
 * channels keep at most about {@value #ROWS} table rows and {@value #NESTED} open swings. Not thread-safe.
 */
public final class CycleCountAccumulator {

    private static final int ROWS = 1_000_000;
    private static final int MOST_ROWS = 200_000;
    private static final int LEAST_ROWS = 1000;
    private static final int NESTED = 4_000_000;
    private static final int LEAST_NESTED = 10_000;
    private static final double SECONDS_PER_HOUR = 3600;

    private final List<String> names;
    private final CycleOptions options;
    private final CycleAccumulator[] sums;
    private final RainflowAccumulator[] flows;
    private Supplier<String> where = () -> "";
    private int recordings;
    private long rows;
    private double seconds;
    private double first = Double.NaN;
    private double last = Double.NaN;

    /** Starts with no recording; {@link #begin} comes next. */
    public CycleCountAccumulator(List<String> channels, CycleOptions options) {
        this.names = List.copyOf(channels);
        this.options = options;
        int count = Math.max(1, names.size());
        int limit = Math.max(LEAST_ROWS, Math.min(MOST_ROWS, ROWS / count));
        double[] slopes =
                options.slopes().stream().mapToDouble(Double::doubleValue).toArray();
        sums = new CycleAccumulator[names.size()];
        flows = new RainflowAccumulator[names.size()];
        for (int i = 0; i < sums.length; i++) {
            sums[i] = new CycleAccumulator(slopes, options.curve(), limit);
            flows[i] = fresh(i);
        }
    }

    private RainflowAccumulator fresh(int channel) {
        int nested = Math.max(LEAST_NESTED, NESTED / Math.max(1, names.size()));
        return new RainflowAccumulator(options.gate(), nested, sums[channel]);
    }

    /**
     * Begins a recording; the one before is over.
     *
     * @param where says where the present row stands, for faults
     */
    public void begin(Supplier<String> where) {
        endRecording();
        if (recordings > 0 && options.separate()) {
            for (int i = 0; i < flows.length; i++) {
                finish(i);
                flows[i] = fresh(i);
            }
        }
        this.where = where;
        recordings++;
    }

    private void endRecording() {
        if (recordings > 0) {
            seconds += last - first;
        }
        first = Double.NaN;
        last = Double.NaN;
    }

    /**
     * Takes a row.
     *
     * @param values one a channel, unit of the channel; more are not looked at; not modified
     * @param time s; NaN where the recording has none
     * @throws InputException where time does not go forward, or a channel has too many swings within one another
     */
    public void row(double[] values, double time) {
        rows++;
        if (time <= last) {
            throw new InputException(
                    where.get() + ", column time_s: " + time + " s follows " + last + " s; time must go forward");
        }
        last = time;
        if (Double.isNaN(first)) {
            first = time;
        }
        for (int i = 0; i < flows.length; i++) {
            try {
                flows[i].accept(values[i]);
            } catch (IllegalStateException e) {
                throw new InputException(where.get() + ", column " + names.get(i) + ": " + e.getMessage()
                        + "; give a --gate to pass over the small ones");
            }
        }
    }

    private void finish(int channel) {
        if (options.repeat()) {
            flows[channel].repeated(sums[channel]);
        } else {
            flows[channel].halves(sums[channel]);
        }
    }

    /**
     * Ends the last recording and tells the count. Called once.
     *
     * @throws InputException where hours are asked for and no time was recorded, or numbers are too large for the
     *     slopes, or a mean reaches the strength of Goodman's line
     */
    public CycleCount finish() {
        endRecording();
        double factor = factor();
        List<CycleCount.Channel> channels = new ArrayList<>();
        for (int i = 0; i < sums.length; i++) {
            finish(i);
            channels.add(channel(i, factor));
        }
        return new CycleCount(channels, options, recordings, rows, seconds, factor);
    }

    private double factor() {
        if (options.hours() == 0) {
            return 1;
        }
        if (!(seconds > 0)) {
            throw new InputException("--hours: no recorded time is known; every recording needs a column time_s"
                    + " and two rows at least");
        }
        return options.hours() * SECONDS_PER_HOUR / seconds;
    }

    private CycleCount.Channel channel(int i, double factor) {
        CycleAccumulator sum = sums[i];
        List<Double> equivalent = new ArrayList<>();
        for (int s = 0; s < options.slopes().size(); s++) {
            double range = sum.equivalent(s, factor, options.reference());
            if (!Double.isFinite(range)) {
                throw new InputException("column " + names.get(i) + ": ranges up to " + sum.maxRange()
                        + " are too large for slope " + options.slopes().get(s));
            }
            equivalent.add(range);
        }
        CycleTable table = sum.table().times(factor);
        Optional<RangeMeanMatrix> matrix =
                options.bins() > 0 ? Optional.of(RangeMeanMatrix.of(table, options.bins())) : Optional.empty();
        Optional<BlockSpectrum> blocks = options.blocks() != null ? Optional.of(blocks(i, table)) : Optional.empty();
        return new CycleCount.Channel(
                names.get(i),
                sum.cycles() * factor,
                sum.maxRange(),
                equivalent,
                sum.damage() * factor,
                table,
                matrix,
                blocks,
                blocks.map(this::kept).orElse(List.of()));
    }

    private BlockSpectrum blocks(int i, CycleTable table) {
        try {
            return BlockSpectrum.of(table, options.blocks());
        } catch (IllegalArgumentException e) {
            throw new InputException("column " + names.get(i) + ": " + e.getMessage());
        }
    }

    private List<Double> kept(BlockSpectrum blocks) {
        List<Double> kept = new ArrayList<>();
        for (double slope : options.slopes()) {
            kept.add(blocks.kept(range -> Math.pow(range, slope)));
        }
        if (options.curve() != null) {
            kept.add(blocks.kept(options.curve()::damage));
        }
        return kept;
    }
}
