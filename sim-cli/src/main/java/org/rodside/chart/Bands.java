package org.rodside.chart;

import java.util.ArrayList;
import java.util.List;

/** Clouds of points coloured by a number or by a word: one series a band, with a legend that can be read. */
public final class Bands {

    /** Largest number of bands: the shades of the palette. */
    public static final int MOST = Palette.shades();

    private Bands() {}

    /**
     * A cloud coloured by a number in up to nine bands between round values. The largest values are drawn last, so
     * where points lie on top of each other the largest is seen. Values that are not finite are left out.
     *
     * @param x abscissas, not modified
     * @param y ordinates, not modified
     * @param value the number shown, in the unit named; not modified
     * @param unit unit for the legend, may be empty
     */
    public static List<Series> byValue(double[] x, double[] y, double[] value, String unit) {
        double low = Double.POSITIVE_INFINITY;
        double high = Double.NEGATIVE_INFINITY;
        for (double v : value) {
            low = Double.isFinite(v) ? Math.min(low, v) : low;
            high = Double.isFinite(v) ? Math.max(high, v) : high;
        }
        if (low > high) {
            return List.of();
        }
        double[] edges = edges(low, high);
        Ticks ticks = Ticks.of(edges[0], edges[edges.length - 1], edges.length);
        List<Series> bands = new ArrayList<>();
        for (int b = 0; b + 1 < edges.length; b++) {
            double from = edges[b];
            double to = edges[b + 1];
            boolean last = b + 2 == edges.length;
            boolean[] in = new boolean[value.length];
            for (int i = 0; i < value.length; i++) {
                in[i] = value[i] >= from && (value[i] < to || last && value[i] <= to);
            }
            String name = ticks.text(from) + "\u2013" + ticks.text(to) + (unit.isEmpty() ? "" : " " + unit);
            int colour = Palette.shade(b, edges.length - 1);
            add(bands, Series.points(name, Series.Symbol.DOT, colour, x, y), in);
        }
        return bands;
    }

    /**
     * A cloud coloured by a word, with a symbol of its own for each as well.
     *
     * @param x abscissas, not modified
     * @param y ordinates, not modified
     * @param word index into the words for every point; below 0 or above the last: point left out
     * @param words the words, in the order of the legend
     */
    public static List<Series> byWord(double[] x, double[] y, int[] word, List<String> words) {
        Series.Symbol[] symbols = Series.Symbol.values();
        List<Series> kinds = new ArrayList<>();
        for (int w = 0; w < words.size(); w++) {
            boolean[] in = new boolean[word.length];
            for (int i = 0; i < word.length; i++) {
                in[i] = word[i] == w;
            }
            Series all = Series.points(words.get(w), symbols[w % symbols.length], Palette.category(w), x, y);
            add(kinds, all, in);
        }
        return kinds;
    }

    /** Round band edges that enclose the range, at most one more than there are bands. */
    private static double[] edges(double low, double high) {
        double top = high > low ? high : low + Math.max(1e-9, Math.abs(low) * 1e-3);
        for (int most = MOST; ; most--) {
            double step = Ticks.of(low, top, most).step();
            long first = (long) Math.floor(low / step + 1e-9);
            long last = (long) Math.ceil(top / step - 1e-9);
            if (last - first <= MOST) {
                double[] edges = new double[(int) (last - first + 1)];
                for (int i = 0; i < edges.length; i++) {
                    edges[i] = (first + i) * step;
                }
                return edges;
            }
        }
    }

    private static void add(List<Series> list, Series all, boolean[] in) {
        int count = 0;
        for (boolean b : in) {
            count += b ? 1 : 0;
        }
        if (count == 0) {
            return;
        }
        double[] x = new double[count];
        double[] y = new double[count];
        int n = 0;
        for (int i = 0; i < in.length; i++) {
            if (in[i]) {
                x[n] = all.x()[i];
                y[n++] = all.y()[i];
            }
        }
        list.add(new Series(all.name(), all.style(), all.symbol(), all.colour(), x, y));
    }
}
