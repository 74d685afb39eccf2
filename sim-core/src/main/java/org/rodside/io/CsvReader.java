package org.rodside.io;

import java.io.Closeable;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.rodside.model.InputException;

/**
 * Reads the numbers of a CSV file row by row in constant memory: comma, semicolon (then with decimal comma or point,
 * one of them throughout) or tab, as the heading shows; LF or CR LF; quoted cells; byte order mark; gzip; standard
 * input. Columns that are not asked for may hold anything.
 *
 * <p>Faults name the row (heading not counted), the line and the column. After the first faulty row no more rows are
 * handed out, but the file is read on so that up to {@value #MOST_FAULTS} faults are told at once; what was made from
 * the rows before is the caller's to throw away. Not thread-safe.
 */
public final class CsvReader implements Closeable {

    /** So many faults are told at once. */
    static final int MOST_FAULTS = 20;

    private static final int SHOWN = 40;

    private final String name;
    private final LineReader lines;
    private final CsvHeading heading;
    private final NumberReader number = new NumberReader();
    private final byte separator;
    private final int width;
    private final CellRanges cells;
    private final List<String> faults = new ArrayList<>();
    private final int[] place;
    private int places;
    private long row;
    private long line = 1;
    private long emptyLine;

    /**
     * Opens a file and reads its heading.
     *
     * @param file a path, or {@code -} for standard input
     * @throws InputException where there is no such file, it is empty, not UTF-8 in the heading, or a column stands
     *     in it twice
     */
    public static CsvReader open(String file) {
        return new CsvReader(LineReader.open(file), file.equals("-") ? "standard input" : file);
    }

    /**
     * Reads a stream.
     *
     * @param name what faults call it
     */
    public CsvReader(InputStream in, String name) {
        this(new LineReader(in, name), name);
    }

    private CsvReader(LineReader lines, String name) {
        this.name = name;
        this.lines = lines;
        this.cells = new CellRanges();
        try {
            this.heading = CsvHeading.read(lines, cells, name);
        } catch (InputException e) {
            lines.close();
            throw e;
        }
        this.separator = heading.separator();
        this.line = heading.lines();
        this.width = heading.names().size();
        this.place = new int[width];
        // With semicolons the first decimal mark of the file settles which one it is.
        number.mark(separator == ';' ? 0 : '.');
        choose(heading.names());
    }

    /** Column names in the order of the file. */
    public List<String> header() {
        return heading.names();
    }

    /**
     * Says which columns {@link #next} hands out, in this order; all of them when never called.
     *
     * @throws InputException where the file lacks one
     */
    public void choose(List<String> columns) {
        List<String> missing = new ArrayList<>();
        Arrays.fill(place, -1);
        for (int i = 0; i < columns.size(); i++) {
            int at = heading.names().indexOf(columns.get(i));
            if (at < 0) {
                missing.add(name + ": has no column " + columns.get(i) + "; it has " + heading.told());
            } else if (place[at] >= 0) {
                missing.add(name + ": column " + columns.get(i) + " is asked for twice");
            } else {
                place[at] = i;
            }
        }
        if (!missing.isEmpty()) {
            throw new InputException(missing);
        }
        places = columns.size();
    }

    /** Rows handed out so far, which is the number of the present row, the first being 1. */
    public long row() {
        return row;
    }

    /** Line of the file on which the present row ends, the heading being line 1. */
    public long line() {
        return line;
    }

    /** {@code file: row 12 (line 13)} for the present row, to start a fault of the caller's own with. */
    public String where() {
        return name + ": row " + row + " (line " + line + ")";
    }

    /**
     * Reads the next row.
     *
     * @param values overwritten with the chosen columns, as they stand in the file (no change of unit)
     * @return false at the end of the file; the array is then unchanged
     * @throws InputException with all faults, where a cell is missing or no finite number, or a row has too few or too
     *     many cells, or there is no row at all
     */
    public boolean next(double[] values) {
        if (values.length < places) {
            throw new IllegalArgumentException("array of " + values.length + " for " + places + " columns");
        }
        while (faults.size() < MOST_FAULTS && lines.more()) {
            line++;
            if (quick(values)) {
                row++;
                addEmpty();
            } else {
                careful(values);
            }
            if (emptyLine == 0 && faults.isEmpty()) {
                return true;
            }
        }
        if (!faults.isEmpty()) {
            throw new InputException(faults);
        }
        if (row == 0) {
            throw new InputException(name + ": there is no row below the heading");
        }
        return false;
    }

    /** Reads a row without quotes, blanks or faults; false, and nothing moved, where there is more to it. */
    private boolean quick(double[] values) {
        byte[] b = lines.bytes();
        int at = lines.start();
        int last = width - 1;
        for (int i = 0; i <= last; i++) {
            int to = place[i];
            if (to >= 0) {
                double value = number.at(b, at);
                if (!(Math.abs(value) <= Double.MAX_VALUE)) {
                    return false;
                }
                values[to] = value;
                at = number.end();
            } else {
                at = skip(b, at);
            }
            if (i < last && b[at++] != separator) {
                return false;
            }
        }
        if (b[at] == '\r') {
            at++;
        }
        if (b[at] != '\n') {
            return false;
        }
        lines.start(at + 1);
        return true;
    }

    /** End of a cell that is not wanted; a quoted one stops where the separator is missed. */
    private int skip(byte[] b, int from) {
        int at = from;
        while (b[at] != separator && b[at] != '\n' && b[at] != '"') {
            at++;
        }
        return at > from && b[at] == '\n' && b[at - 1] == '\r' ? at - 1 : at;
    }

    /** Reads any row, and notes its faults. */
    private void careful(double[] values) {
        row++;
        while (!cells.split(lines.bytes(), lines.start(), lines.whole(), separator)) {
            if (!lines.extend()) {
                faults.add(where() + ": a quote is opened and never closed");
                lines.start(lines.whole());
                return;
            }
        }
        byte[] b = lines.bytes();
        lines.start(cells.next());
        line += cells.breaks();
        if (cells.isBlank(b)) {
            row--;
            emptyLine = emptyLine == 0 ? line : emptyLine;
            return;
        }
        addEmpty();
        if (cells.count() != width) {
            String last = shown(cells.text(b, cells.count() - 1));
            faults.add(where() + ": " + cells.count() + " cells, where the heading has " + width
                    + "; the last of them is " + last);
            return;
        }
        for (int i = 0; i < width && faults.size() < MOST_FAULTS; i++) {
            if (place[i] >= 0) {
                values[place[i]] = cell(b, i);
            }
        }
    }

    /** Empty lines are let pass at the end of the file only. */
    private void addEmpty() {
        if (emptyLine > 0) {
            faults.add(name + ": line " + emptyLine + " is empty, and rows follow");
            emptyLine = 0;
        }
    }

    private double cell(byte[] b, int column) {
        byte[] text = cells.text(b, column);
        settleMark(text);
        double value = number.at(text, 0);
        String found = shown(text);
        if (value == value && number.end() == text.length - 1) {
            if (!Double.isInfinite(value)) {
                return value;
            }
            found += ", too large";
        }
        faults.add(where() + ", column " + heading.names().get(column) + ": expected a number, found " + found
                + markHint(text));
        return Double.NaN;
    }

    private void settleMark(byte[] text) {
        if (number.mark() == 0) {
            for (byte c : text) {
                if (c == '.' || c == ',') {
                    number.mark(c);
                    return;
                }
            }
        }
    }

    private String markHint(byte[] text) {
        int other = number.mark() == ',' ? '.' : ',';
        for (byte c : text) {
            if (c == other && number.mark() != 0) {
                return " (the decimal mark of this file is " + (other == '.' ? "the comma" : "the point")
                        + "; thousands marks are not read)";
            }
        }
        return "";
    }

    private static String shown(byte[] text) {
        String word = CellRanges.decoded(text, text.length - 1);
        if (word.isEmpty()) {
            return "nothing";
        }
        return '"' + (word.length() > SHOWN ? word.substring(0, SHOWN) + "…" : word) + '"';
    }

    @Override
    public void close() {
        lines.close();
    }
}
