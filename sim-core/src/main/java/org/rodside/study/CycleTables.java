package org.rodside.study;

import java.util.List;
import org.rodside.fatigue.BlockSpectrum;
import org.rodside.fatigue.CycleTable;
import org.rodside.fatigue.RangeMeanMatrix;
import org.rodside.table.Column;
import org.rodside.table.RowSink;
import org.rodside.units.Quantity;

/** A count of cycles as tables for files. Ranges and means are in the unit of their channel. */
public final class CycleTables {

    private final CycleCount count;
    private final Column channel;

    public CycleTables(CycleCount count) {
        this.count = count;
        this.channel = Column.words(
                "channel",
                count.channels().stream().map(CycleCount.Channel::name).toList());
    }

    /** Columns of {@code cycles.csv}. */
    public List<Column> cycleColumns() {
        return List.of(channel, plain("range"), plain("mean"), plain("count"));
    }

    /** Rows of {@code cycles.csv}: largest range first. */
    public void cycles(RowSink sink) {
        for (int i = 0; i < count.channels().size(); i++) {
            for (CycleTable.Row row : count.channels().get(i).table().rows()) {
                sink.row(new double[] {i, row.range(), row.mean(), row.count()});
            }
        }
    }

    /** Columns of {@code matrix.csv}. */
    public List<Column> matrixColumns() {
        return List.of(
                channel, plain("range_from"), plain("range_to"), plain("mean_from"), plain("mean_to"), plain("count"));
    }

    /** Rows of {@code matrix.csv}: every class that is not empty. */
    public void matrix(RowSink sink) {
        for (int i = 0; i < count.channels().size(); i++) {
            RangeMeanMatrix m = count.channels().get(i).matrix().orElseThrow();
            for (int r = 0; r < m.counts().length; r++) {
                for (int k = 0; k < m.counts().length; k++) {
                    if (m.counts()[r][k] > 0) {
                        sink.row(new double[] {
                            i, m.rangeFrom(r), m.rangeFrom(r + 1), m.meanFrom(k), m.meanFrom(k + 1), m.counts()[r][k]
                        });
                    }
                }
            }
        }
    }

    /** Columns of {@code blocks.csv}. */
    public List<Column> blockColumns() {
        return List.of(channel, plain("share"), plain("range"), plain("mean"), plain("count"));
    }

    /** Rows of {@code blocks.csv}: eight levels a channel, the largest first. */
    public void blocks(RowSink sink) {
        for (int i = 0; i < count.channels().size(); i++) {
            for (BlockSpectrum.Level l :
                    count.channels().get(i).blocks().orElseThrow().levels()) {
                sink.row(new double[] {i, l.share(), l.range(), l.mean(), l.count()});
            }
        }
    }

    private static Column plain(String name) {
        return Column.of(name, Quantity.NONE);
    }
}
