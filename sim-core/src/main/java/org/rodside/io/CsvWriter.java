package org.rodside.io;

import java.io.Closeable;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.function.Consumer;
import java.util.zip.GZIPOutputStream;
import org.rodside.model.InputException;
import org.rodside.table.Column;
import org.rodside.table.RowSink;
import org.rodside.units.Unit;
import org.rodside.units.UnitSystem;

/**
 * Writes rows as CSV (RFC 4180, one heading, decimal point, LF), numbers in the units asked for with the fixed decimals
 * of their column. NaN becomes an empty cell. To a path the file appears whole or not at all, packed where its name
 * ends in {@code .gz}; to a stream the bytes go as they come, and the stream stays the caller's to close. No memory is
 * taken per row. Faults of the disk are told as {@link InputException}. Not thread-safe.
 */
public final class CsvWriter implements RowSink, Closeable {

    private final DigitBuffer cells = new DigitBuffer();
    private final Path path;
    private final OutputStream out;
    private final WholeFile file;
    private final double[] times;
    private final double[] over;
    private final int[] decimals;
    private final byte[][][] words;
    private boolean broken;

    /** Writes to a stream, heading at once; closing flushes it and leaves it open. */
    public CsvWriter(OutputStream out, List<Column> columns, UnitSystem units) {
        this(out, null, Path.of("output"), columns, units);
    }

    /** Writes to a file that takes its place on {@link #close}; {@link #abort} leaves no trace. */
    public CsvWriter(Path path, List<Column> columns, UnitSystem units) {
        this(opened(path), path, columns, units);
    }

    private CsvWriter(WholeFile file, Path path, List<Column> columns, UnitSystem units) {
        this(packed(file, path), file, path, columns, units);
    }

    private CsvWriter(OutputStream out, WholeFile file, Path path, List<Column> columns, UnitSystem units) {
        this.out = out;
        this.file = file;
        this.path = path;
        int width = columns.size();
        times = new double[width];
        over = new double[width];
        decimals = new int[width];
        words = new byte[width][][];
        for (int i = 0; i < width; i++) {
            Column column = columns.get(i);
            Unit unit = units.unit(column.quantity());
            // The factor that is a whole number keeps round values round: mm by ×1000, kN by ÷1000.
            times[i] = unit.inSi() < 1 ? 1 / unit.inSi() : 1;
            over[i] = unit.inSi() < 1 ? 1 : unit.inSi();
            decimals[i] = column.decimals();
            words[i] = encoded(column.labels());
            put(cell(column.heading(units)), i + 1 < width);
        }
    }

    /**
     * Writes a whole table: the file takes its place when the rows are through, and is not there when they fail.
     *
     * @param rows is handed the sink and gives it every row
     */
    public static void write(Path path, List<Column> columns, UnitSystem units, Consumer<RowSink> rows) {
        CsvWriter writer = new CsvWriter(path, columns, units);
        boolean through = false;
        try {
            rows.accept(writer);
            writer.close();
            through = true;
        } finally {
            if (!through) {
                writer.abort();
            }
        }
    }

    @Override
    public void row(double[] values) {
        int width = times.length;
        if (values.length != width) {
            broken = true;
            throw new IllegalArgumentException("row has " + values.length + " values for " + width + " columns");
        }
        for (int i = 0; i < width; i++) {
            double value = values[i];
            boolean last = i + 1 == width;
            if (words[i] != null) {
                put(word(i, value), !last);
                continue;
            }
            if (cells.isFull()) {
                flush();
            }
            cells.number(value * times[i] / over[i], decimals[i]);
            if (width == 1 && value != value) {
                cells.bytes(new byte[] {'"', '"'}, 0, 2);
            }
            cells.add(last ? (byte) '\n' : (byte) ',');
        }
    }

    /** Writes what is left; a file takes its place, a stream is flushed. After a fault a file is thrown away instead. */
    @Override
    public void close() {
        if (broken) {
            abort();
            return;
        }
        flush();
        try {
            if (file == null) {
                out.flush();
            } else {
                out.close();
            }
        } catch (IOException e) {
            throw fault(e);
        }
    }

    /** Deletes the unfinished file; a stream keeps what it got. Does nothing after {@link #close}. */
    public void abort() {
        broken = true;
        if (file != null) {
            file.abort();
        }
    }

    private byte[] word(int column, double value) {
        if (value != value) {
            return times.length == 1 ? new byte[] {'"', '"'} : new byte[0];
        }
        return words[column][(int) value];
    }

    private void put(byte[] text, boolean more) {
        for (int at = 0; at < text.length; ) {
            if (cells.isFull()) {
                flush();
            }
            int count = Math.min(text.length - at, DigitBuffer.CELL);
            cells.bytes(text, at, count);
            at += count;
        }
        if (cells.isFull()) {
            flush();
        }
        cells.add(more ? (byte) ',' : (byte) '\n');
    }

    private void flush() {
        try {
            cells.writeTo(out);
        } catch (IOException e) {
            throw fault(e);
        }
    }

    private InputException fault(IOException e) {
        abort();
        return WholeFile.refused(path, e);
    }

    private static WholeFile opened(Path path) {
        try {
            return new WholeFile(path);
        } catch (IOException e) {
            throw WholeFile.refused(path, e);
        }
    }

    private static OutputStream packed(WholeFile file, Path path) {
        try {
            boolean pack = path.getFileName().toString().endsWith(".gz");
            return pack ? new GZIPOutputStream(file, 1 << 16) : file;
        } catch (IOException e) {
            file.abort();
            throw WholeFile.refused(path, e);
        }
    }

    private static byte[][] encoded(List<String> labels) {
        return labels.isEmpty() ? null : labels.stream().map(CsvWriter::cell).toArray(byte[][]::new);
    }

    /** A word as a cell: in quotes where a separator, quote or line end is in it. */
    static byte[] cell(String word) {
        boolean plain = word.chars().noneMatch(c -> c == ',' || c == '"' || c == '\n' || c == '\r');
        String text = plain ? word : '"' + word.replace("\"", "\"\"") + '"';
        return text.getBytes(StandardCharsets.UTF_8);
    }
}
