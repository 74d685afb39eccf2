package org.rodside.io;

import com.fasterxml.jackson.core.io.NumberInput;
import java.nio.charset.StandardCharsets;

/**
 * Reads a decimal number out of bytes: sign, digits, a decimal mark, digits, an exponent, and nothing else (no words
 * for NaN or infinity, no hexadecimal, no thousands mark). The result is the nearest double: up to 2^53 in the digits
 * and 22 in the power of ten one multiplication or division by an exact power is exact; the rest goes to the general
 * way. Holds the place it stopped at; not thread-safe.
 */
final class NumberReader {

    /** More digits than this may overflow a long. */
    private static final int DIGITS = 18;

    /** Integers up to 2^53 are doubles. */
    private static final long EXACT = 1L << 53;

    private static final int EXACT_POWER = 22;
    private static final int EXPONENT_LIMIT = 100_000;
    private static final double[] POWER = new double[EXACT_POWER + 1];

    static {
        POWER[0] = 1;
        for (int i = 1; i <= EXACT_POWER; i++) {
            POWER[i] = POWER[i - 1] * 10;
        }
    }

    private int mark = '.';
    private int end;

    /** The byte that stands before the decimals: a point, a comma, or 0 while not known (then neither is taken). */
    void mark(int decimalMark) {
        mark = decimalMark;
    }

    int mark() {
        return mark;
    }

    /** Index of the first byte behind the number read last. */
    int end() {
        return end;
    }

    /**
     * The number that starts at an index.
     *
     * @param b not modified; a byte that belongs to no number must follow the number somewhere
     * @return NaN where no number starts there; infinite where it is too large for a double
     */
    double at(byte[] b, int start) {
        int p = start;
        int c = b[p];
        boolean minus = c == '-';
        if (minus || c == '+') {
            c = b[++p];
        }
        int first = p;
        long digits = 0;
        while (c >= '0' && c <= '9') {
            digits = digits * 10 + (c - '0');
            c = b[++p];
        }
        int count = p - first;
        int scale = 0;
        if (c == mark) {
            int point = ++p;
            c = b[p];
            while (c >= '0' && c <= '9') {
                digits = digits * 10 + (c - '0');
                c = b[++p];
            }
            scale = p - point;
            count += scale;
        }
        end = p;
        if (count == 0) {
            return Double.NaN;
        }
        if ((c | 0x20) == 'e') {
            return withExponent(b, start, count <= DIGITS ? digits : Long.MAX_VALUE, scale);
        }
        if (count > DIGITS || digits > EXACT || scale > EXACT_POWER) {
            return general(b, start);
        }
        double value = scale == 0 ? digits : digits / POWER[scale];
        return minus ? -value : value;
    }

    private double withExponent(byte[] b, int start, long digits, int scale) {
        int p = end + 1;
        boolean down = b[p] == '-';
        if (down || b[p] == '+') {
            p++;
        }
        int first = p;
        int power = 0;
        while (b[p] >= '0' && b[p] <= '9') {
            power = Math.min(power * 10 + b[p] - '0', EXPONENT_LIMIT);
            p++;
        }
        if (p == first) {
            return Double.NaN;
        }
        end = p;
        int ten = (down ? -power : power) - scale;
        if (digits > EXACT || Math.abs(ten) > EXACT_POWER) {
            return general(b, start);
        }
        double value = ten < 0 ? digits / POWER[-ten] : digits * POWER[ten];
        return b[start] == '-' ? -value : value;
    }

    private double general(byte[] b, int start) {
        String text = new String(b, start, end - start, StandardCharsets.ISO_8859_1);
        return NumberInput.parseDouble(mark == ',' ? text.replace(',', '.') : text, true);
    }
}
