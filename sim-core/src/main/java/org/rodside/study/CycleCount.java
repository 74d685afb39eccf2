package org.rodside.study;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.rodside.fatigue.BlockSpectrum;
import org.rodside.fatigue.CycleTable;
import org.rodside.fatigue.RangeMeanMatrix;
import org.rodside.table.Column;
import org.rodside.table.Table;
import org.rodside.units.Quantity;

/**
 * Cycles counted in recordings.
 *
 * @param channels in the order asked for
 * @param options that were asked for
 * @param recordings number of files
 * @param rows of all recordings
 * @param seconds recorded time, last less first time of each recording, added up; s; NaN without times
 * @param factor that every count is multiplied by to reach the hours asked for; 1 where none were
 */
public record CycleCount(
        List<Channel> channels, CycleOptions options, int recordings, long rows, double seconds, double factor) {

    public CycleCount {
        channels = List.copyOf(channels);
    }

    /**
     * One channel; all counts are for the hours asked for.
     *
     * @param name heading of its column, with the unit
     * @param cycles number of cycles, halves counting half
     * @param maxRange largest range; unit of the channel
     * @param equivalent equivalent range for each slope; unit of the channel
     * @param damage Palmgren–Miner sum; NaN without a curve
     * @param table counts by range and mean
     * @param matrix range–mean matrix, where asked for
     * @param blocks eight-level spectrum, where asked for
     * @param kept for each slope, and last the curve where there is one: damage of the spectrum as a share of the full
     */
    public record Channel(
            String name,
            double cycles,
            double maxRange,
            List<Double> equivalent,
            double damage,
            CycleTable table,
            Optional<RangeMeanMatrix> matrix,
            Optional<BlockSpectrum> blocks,
            List<Double> kept) {

        public Channel {
            equivalent = List.copyOf(equivalent);
            kept = List.copyOf(kept);
        }

        /** Width of the bins of the table; unit of the channel; 0 where ranges and means are exact. */
        public double binWidth() {
            return table.width();
        }

        /** Whether there is an eight-level spectrum. */
        public boolean hasBlocks() {
            return blocks.isPresent();
        }

        /** Cycles that the spectrum leaves out as too small. */
        public double leftOut() {
            return blocks.orElseThrow().leftOut();
        }

        /** The spectrum, largest level first: {@code share,range,mean,count}; ranges in the unit of the channel. */
        public Table levels() {
            Table levels = new Table(Stream.of("share", "range", "mean", "count")
                    .map(name -> Column.of(name, Quantity.NONE))
                    .toList());
            for (BlockSpectrum.Level l : blocks.orElseThrow().levels()) {
                levels.row(new double[] {l.share(), l.range(), l.mean(), l.count()});
            }
            return levels;
        }
    }
}
