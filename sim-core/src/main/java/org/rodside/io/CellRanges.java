package org.rodside.io;

import java.nio.charset.StandardCharsets;
import java.util.Arrays;

/**
 * Where the cells of one line of CSV start and end, by the full rules of RFC 4180: a cell that starts with a quote runs
 * to the closing one, separators and line ends in it and all. Not thread-safe.
 */
final class CellRanges {

    private int[] from = new int[32];
    private int[] to = new int[32];
    private int count;
    private int next;
    private int breaks;

    /**
     * Splits a line.
     *
     * @param b not modified
     * @param start index of its first byte
     * @param end index behind the last line end in the array
     * @return false where a quoted cell is not closed before {@code end}
     */
    boolean split(byte[] b, int start, int end, byte separator) {
        count = 0;
        breaks = 0;
        int at = start;
        while (true) {
            int first = at;
            if (b[at] == '"') {
                at = closing(b, at + 1, end);
                if (at < 0) {
                    return false;
                }
            }
            while (b[at] != separator && b[at] != '\n') {
                at++;
            }
            boolean last = b[at] == '\n';
            boolean carriage = last && at > first && b[at - 1] == '\r';
            add(first, carriage ? at - 1 : at);
            at++;
            if (last) {
                next = at;
                return true;
            }
        }
    }

    /** Index behind the closing quote; -1 where there is none. */
    private int closing(byte[] b, int from, int end) {
        int at = from;
        while (at < end) {
            if (b[at] == '"') {
                if (b[at + 1] != '"') {
                    return at + 1;
                }
                at++;
            } else if (b[at] == '\n') {
                breaks++;
            }
            at++;
        }
        return -1;
    }

    private void add(int first, int behind) {
        if (count == from.length) {
            from = Arrays.copyOf(from, count * 2);
            to = Arrays.copyOf(to, count * 2);
        }
        from[count] = first;
        to[count] = behind;
        count++;
    }

    int count() {
        return count;
    }

    /** Index of the line behind. */
    int next() {
        return next;
    }

    /** Line ends inside quotes. */
    int breaks() {
        return breaks;
    }

    /** Whether the line holds nothing at all, or blanks. */
    boolean isBlank(byte[] b) {
        return count == 1 && text(b, 0).length == 1 && b[from[0]] != '"';
    }

    /** A cell without its quotes and the blanks around it, and a line end behind it. */
    byte[] text(byte[] b, int cell) {
        int first = from[cell];
        int behind = to[cell];
        byte[] text = new byte[behind - first + 1];
        int length = 0;
        boolean quoted = behind - first >= 2 && b[first] == '"' && b[behind - 1] == '"';
        for (int i = quoted ? first + 1 : first; i < (quoted ? behind - 1 : behind); i++) {
            text[length++] = b[i];
            if (quoted && b[i] == '"') {
                i++;
            }
        }
        int lead = 0;
        while (lead < length && isBlank(text[lead])) {
            lead++;
        }
        while (length > lead && isBlank(text[length - 1])) {
            length--;
        }
        byte[] trimmed = Arrays.copyOfRange(text, lead, length + 1);
        trimmed[length - lead] = '\n';
        return trimmed;
    }

    private static boolean isBlank(byte c) {
        return c == ' ' || c == '\t';
    }

    /** The first bytes of a text for people to read. */
    static String decoded(byte[] text, int length) {
        return new String(text, 0, length, StandardCharsets.UTF_8);
    }
}
