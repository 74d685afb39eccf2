package org.rodside.chart;

import java.util.Locale;

/** Round values along an axis: steps of 1, 2 or 5 times a power of ten. */
public final class Ticks {

    private final double step;
    private final int decimals;
    private final double[] values;

    private Ticks(double step, int decimals, double[] values) {
        this.step = step;
        this.decimals = decimals;
        this.values = values;
    }

    /**
     * Round values inside a range, ends included.
     *
     * @param low lower end
     * @param high upper end, above the lower
     * @param most most values wanted, at least 2
     */
    public static Ticks of(double low, double high, int most) {
        int power = (int) Math.floor(Math.log10((high - low) / Math.max(1, most)));
        for (int p = power; ; p++) {
            for (int digit : new int[] {1, 2, 5}) {
                double step = p < 0 ? digit / Math.pow(10, -p) : digit * Math.pow(10, p);
                // A trace of a step: an end that misses a round value by rounding only still shows it.
                long first = (long) Math.ceil(low / step - 1e-9);
                long last = (long) Math.floor(high / step + 1e-9);
                if (last - first < most) {
                    return new Ticks(step, Math.max(0, -p), spread(first, last, digit, p));
                }
            }
        }
    }

    private static double[] spread(long first, long last, int digit, int power) {
        double[] values = new double[(int) (last - first + 1)];
        for (int i = 0; i < values.length; i++) {
            double digits = (double) (first + i) * digit;
            values[i] = power < 0 ? digits / Math.pow(10, -power) : digits * Math.pow(10, power);
        }
        return values;
    }

    public double step() {
        return step;
    }

    public double[] values() {
        return values.clone();
    }

    /** A value of this axis as text. */
    public String text(double value) {
        return text(value, decimals);
    }

    /** A number with so many decimals, a true minus sign, and thin spaces between thousands from 10 000 on. */
    public static String text(double value, int decimals) {
        String plain = String.format(Locale.ROOT, "%." + decimals + "f", Math.abs(value));
        int point = plain.indexOf('.') < 0 ? plain.length() : plain.indexOf('.');
        StringBuilder text = new StringBuilder(plain);
        if (point > 4) {
            for (int i = point - 3; i > 0; i -= 3) {
                text.insert(i, '\u2009');
            }
        }
        boolean nought = plain.chars().allMatch(c -> c == '0' || c == '.');
        return value < 0 && !nought ? "\u2212" + text : text.toString();
    }
}
