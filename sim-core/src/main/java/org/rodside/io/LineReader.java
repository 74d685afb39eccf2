package org.rodside.io;

import java.io.BufferedInputStream;
import java.io.Closeable;
import java.io.EOFException;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.zip.GZIPInputStream;
import java.util.zip.ZipException;
import org.rodside.model.InputException;

/**
 * The bytes of a text file, such that at least one whole line stands in memory. A missing last line end is added, a
 * byte order mark skipped, gzip unpacked wherever its two magic bytes lead. Not thread-safe.
 */
final class LineReader implements Closeable {

    /** No line of a sane table is longer; bytes. */
    static final int LINE_LIMIT = 1 << 20;

    private static final int CHUNK = 1 << 16;

    private final String name;
    private final InputStream in;
    private byte[] bytes = new byte[CHUNK];
    private int start;
    private int whole;
    private int filled;
    private boolean atEnd;

    LineReader(InputStream raw, String name) {
        this.name = name;
        try {
            this.in = unpacked(raw, name);
            while (filled < 3 && !atEnd) {
                fill();
            }
        } catch (IOException e) {
            throw fault(e);
        }
        if (filled >= 3 && bytes[0] == (byte) 0xEF && bytes[1] == (byte) 0xBB && bytes[2] == (byte) 0xBF) {
            start = 3;
        }
        if (filled == 0) {
            throw new InputException(name + ": the file is empty; a heading of column names and rows are wanted");
        }
    }

    /** Opens a file; {@code -} is standard input. */
    static LineReader open(String name) {
        if (name.equals("-")) {
            return new LineReader(System.in, "standard input");
        }
        Path path = Path.of(name);
        if (Files.isDirectory(path)) {
            throw new InputException(name + ": is a directory; a CSV file is wanted");
        }
        try {
            return new LineReader(Files.newInputStream(path), name);
        } catch (NoSuchFileException e) {
            throw new InputException(name + ": there is no such file");
        } catch (IOException e) {
            throw new InputException(name + ": cannot be read: " + e);
        }
    }

    private static InputStream unpacked(InputStream raw, String name) throws IOException {
        InputStream in = new BufferedInputStream(raw, CHUNK);
        in.mark(2);
        boolean packed = in.read() == 0x1f && in.read() == 0x8b;
        in.reset();
        if (name.endsWith(".gz") && !packed) {
            throw new InputException(name + ": ends in .gz but holds no gzip data");
        }
        return packed ? new GZIPInputStream(in, CHUNK) : in;
    }

    byte[] bytes() {
        return bytes;
    }

    /** Index where the present line starts. */
    int start() {
        return start;
    }

    /** Index behind the last line end in memory; equal to {@link #start} at the end of the file. */
    int whole() {
        return whole;
    }

    /** Goes on to a line that starts at an index. */
    void start(int next) {
        start = next;
    }

    /** Makes a whole line stand at {@link #start}; false at the end of the file. Indices may change. */
    boolean more() {
        while (start >= whole && !(atEnd && start == filled)) {
            extend();
        }
        return start < whole;
    }

    /** Takes in more bytes behind those from {@link #start} on; false when there are none. Indices change. */
    boolean extend() {
        if (atEnd) {
            return false;
        }
        if (filled - start > LINE_LIMIT) {
            throw new InputException(name + ": a line is longer than " + LINE_LIMIT
                    + " bytes; is this a text file of rows, and is every quote closed?");
        }
        System.arraycopy(bytes, start, bytes, 0, filled - start);
        filled -= start;
        whole = Math.max(0, whole - start);
        start = 0;
        if (bytes.length - filled < CHUNK / 2) {
            bytes = Arrays.copyOf(bytes, bytes.length * 2);
        }
        try {
            fill();
        } catch (IOException e) {
            throw fault(e);
        }
        return true;
    }

    /** Reads once, keeps a byte of room for the last line end, and finds the last line end. */
    private void fill() throws IOException {
        int before = filled;
        int got = in.read(bytes, filled, bytes.length - filled - 1);
        if (got < 0) {
            atEnd = true;
            if (filled > start && bytes[filled - 1] != '\n') {
                bytes[filled++] = '\n';
            }
        } else {
            filled += got;
        }
        for (int i = filled; i > before; i--) {
            if (bytes[i - 1] == '\n') {
                whole = i;
                return;
            }
        }
    }

    @Override
    public void close() {
        try {
            in.close();
        } catch (IOException e) {
            throw fault(e);
        }
    }

    private InputException fault(IOException e) {
        if (e instanceof EOFException || e instanceof ZipException) {
            return new InputException(name + ": the gzip data is cut short or damaged: " + e.getMessage());
        }
        return new InputException(name + ": cannot be read: " + e.getMessage());
    }
}
