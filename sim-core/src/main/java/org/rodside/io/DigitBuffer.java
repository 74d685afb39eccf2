package org.rodside.io;

import java.io.IOException;
import java.io.OutputStream;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.nio.charset.StandardCharsets;

/**
 * Bytes on their way to a file, with numbers in fixed decimals: the digits are those of the exact binary value rounded
 * half up in magnitude, as {@link BigDecimal} would round it. From 1e15 on, and for infinities, the text is that of
 * {@link Double#toString(double)}; NaN is no text at all; nothing is ever written as minus zero. Not thread-safe.
 */
final class DigitBuffer {

    /** Room that is free while {@link #isFull} says no; more than any number takes; bytes. */
    static final int CELL = 64;

    private static final int SIZE = 1 << 16;
    private static final int MOST_DECIMALS = 15;
    private static final double LIMIT = 1e15;
    private static final double[] POWER = new double[MOST_DECIMALS + 1];
    private static final byte[] TENS = new byte[100];
    private static final byte[] ONES = new byte[100];

    static {
        POWER[0] = 1;
        for (int i = 1; i <= MOST_DECIMALS; i++) {
            POWER[i] = POWER[i - 1] * 10;
        }
        for (int i = 0; i < 100; i++) {
            TENS[i] = (byte) ('0' + i / 10);
            ONES[i] = (byte) ('0' + i % 10);
        }
    }

    private final byte[] bytes = new byte[SIZE];
    private int used;

    /** Whether less than a cell and its separator has room. */
    boolean isFull() {
        return used > SIZE - CELL - 2;
    }

    void writeTo(OutputStream out) throws IOException {
        out.write(bytes, 0, used);
        used = 0;
    }

    void add(byte one) {
        bytes[used++] = one;
    }

    /** Adds at most {@link #CELL} bytes of a text. */
    void bytes(byte[] text, int from, int count) {
        System.arraycopy(text, from, bytes, used, count);
        used += count;
    }

    /**
     * Adds a number.
     *
     * @param value in the unit it is printed in
     * @param decimals digits behind the point, 0 to 15
     */
    void number(double value, int decimals) {
        double size = Math.abs(value);
        if (!(size < LIMIT)) {
            odd(value);
            return;
        }
        long whole = (long) size;
        double rest = size - whole; // exact
        double scaled = rest * POWER[decimals];
        long digits = (long) scaled;
        double over = scaled - digits; // exact
        if (Math.abs(over - 0.5) > scaled * 0x1p-52) {
            digits += over > 0.5 ? 1 : 0;
        } else {
            digits = careful(rest, decimals);
        }
        if (digits >= POWER[decimals]) {
            whole++;
            digits = 0;
        }
        if (value < 0 && (whole | digits) != 0) {
            bytes[used++] = '-';
        }
        whole(whole);
        if (decimals > 0) {
            bytes[used++] = '.';
            padded(digits, decimals);
        }
    }

    /** Near a tie the product's own rounding could decide wrongly. */
    private static long careful(double rest, int decimals) {
        return new BigDecimal(rest)
                .setScale(decimals, RoundingMode.HALF_UP)
                .unscaledValue()
                .longValueExact();
    }

    private void odd(double value) {
        if (value == value) {
            byte[] text = Double.toString(value).getBytes(StandardCharsets.US_ASCII);
            bytes(text, 0, text.length);
        }
    }

    private void whole(long number) {
        if (number < 10) {
            bytes[used++] = (byte) ('0' + number);
            return;
        }
        int count = 2;
        for (long power = 100; number >= power; power *= 10) {
            count++;
        }
        padded(number, count);
    }

    /** Writes a number with leading zeros to a count of digits. */
    private void padded(long number, int count) {
        int end = used + count;
        used = end;
        long high = number;
        int left = count;
        while (left > 9) {
            high = number / 100;
            end = pair(end, (int) (number - high * 100));
            number = high;
            left -= 2;
        }
        int low = (int) high;
        while (left >= 2) {
            int rest = low / 100;
            end = pair(end, low - rest * 100);
            low = rest;
            left -= 2;
        }
        if (left == 1) {
            bytes[end - 1] = (byte) ('0' + low);
        }
    }

    private int pair(int end, int two) {
        bytes[end - 1] = ONES[two];
        bytes[end - 2] = TENS[two];
        return end - 2;
    }
}
