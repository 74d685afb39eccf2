package org.rodside.io;

import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.rodside.model.InputException;

/**
 * The heading of a CSV file.
 *
 * @param names of the columns, each once
 * @param separator the one of comma, semicolon and tab that the heading has most of
 * @param lines that the heading fills
 */
record CsvHeading(List<String> names, byte separator, int lines) {

    private static final int TOLD = 30;
    private static final String NO_HEADING = ": the first line is empty; a heading of column names is wanted";

    static CsvHeading read(LineReader lines, CellRanges cells, String file) {
        if (!lines.more()) {
            throw new InputException(file + NO_HEADING);
        }
        byte separator;
        do {
            separator = separator(lines.bytes(), lines.start(), lines.whole());
        } while (!cells.split(lines.bytes(), lines.start(), lines.whole(), separator) && extended(lines, file));
        byte[] b = lines.bytes();
        List<String> names = new ArrayList<>();
        for (int i = 0; i < cells.count(); i++) {
            names.add(decoded(cells.text(b, i), file, i));
        }
        lines.start(cells.next());
        List<String> faults = faults(names, file);
        if (!faults.isEmpty()) {
            throw new InputException(faults);
        }
        return new CsvHeading(List.copyOf(names), separator, 1 + cells.breaks());
    }

    private static boolean extended(LineReader lines, String file) {
        if (!lines.extend()) {
            throw new InputException(file + ": a quote in the heading is opened and never closed");
        }
        return true;
    }

    private static byte separator(byte[] b, int start, int end) {
        int commas = 0;
        int semicolons = 0;
        int tabs = 0;
        boolean quoted = false;
        for (int i = start; i < end && (quoted || b[i] != '\n'); i++) {
            quoted ^= b[i] == '"';
            commas += !quoted && b[i] == ',' ? 1 : 0;
            semicolons += !quoted && b[i] == ';' ? 1 : 0;
            tabs += !quoted && b[i] == '\t' ? 1 : 0;
        }
        if (semicolons > commas && semicolons >= tabs) {
            return ';';
        }
        return (byte) (tabs > commas ? '\t' : ',');
    }

    private static String decoded(byte[] text, String file, int column) {
        try {
            return StandardCharsets.UTF_8
                    .newDecoder()
                    .decode(ByteBuffer.wrap(text, 0, text.length - 1))
                    .toString();
        } catch (CharacterCodingException e) {
            throw new InputException(
                    file + ": heading of column " + (column + 1) + " is not UTF-8 text; save the file as UTF-8");
        }
    }

    private static List<String> faults(List<String> names, String file) {
        if (names.size() == 1 && names.get(0).isEmpty()) {
            return List.of(file + NO_HEADING);
        }
        List<String> faults = new ArrayList<>();
        Set<String> seen = new HashSet<>();
        for (int i = 0; i < names.size() && faults.size() < CsvReader.MOST_FAULTS; i++) {
            String name = names.get(i);
            if (name.isEmpty()) {
                faults.add(file + ": column " + (i + 1) + " has no name in the heading");
            } else if (!seen.add(name)) {
                faults.add(file + ": column " + name + " stands in the heading twice");
            }
        }
        return faults;
    }

    /** The names for a message, the first of them where they are many. */
    String told() {
        return String.join(", ", names.subList(0, Math.min(TOLD, names.size())))
                + (names.size() > TOLD ? " and " + (names.size() - TOLD) + " more" : "");
    }
}
