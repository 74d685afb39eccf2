package org.rodside.fatigue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/**
 * Rainflow by the letter of ASTM E1049-85, 5.4.4 and 5.4.5, steps 1 to 6, on whole lists: another way than the one under
 * test, which encloses ranges from both sides and keeps the residue apart.
 */
final class PlainRainflow {

    private PlainRainflow() {}

    /** Counts by "range mean". */
    static Map<String, Double> single(double[] signal) {
        Map<String, Double> counts = new TreeMap<>();
        List<Double> read = new ArrayList<>();
        for (double point : turning(signal)) {
            read.add(point);
            while (read.size() >= 3) {
                int n = read.size();
                double x = Math.abs(read.get(n - 1) - read.get(n - 2));
                double y = Math.abs(read.get(n - 2) - read.get(n - 3));
                if (x < y) {
                    break;
                }
                if (n == 3) { // Y holds the starting point: half a cycle, and the start moves on.
                    count(counts, read.get(0), read.get(1), 0.5);
                    read.remove(0);
                } else {
                    count(counts, read.get(n - 3), read.get(n - 2), 1);
                    read.remove(n - 2);
                    read.remove(n - 3);
                }
            }
        }
        for (int i = 1; i < read.size(); i++) {
            count(counts, read.get(i - 1), read.get(i), 0.5);
        }
        return counts;
    }

    /** Rearranged to begin and end at the largest magnitude; then every range is a full cycle. */
    static Map<String, Double> repeated(double[] signal) {
        int first = 0;
        for (int i = 1; i < signal.length; i++) {
            first = Math.abs(signal[i]) > Math.abs(signal[first]) ? i : first;
        }
        double[] turned = new double[signal.length + 1];
        for (int i = 0; i <= signal.length; i++) {
            turned[i] = signal[(first + i) % signal.length];
        }
        Map<String, Double> counts = new TreeMap<>();
        List<Double> read = new ArrayList<>();
        for (double point : turning(turned)) {
            read.add(point);
            for (int n = read.size(); n >= 3; n = read.size()) {
                double y = Math.abs(read.get(n - 2) - read.get(n - 3));
                if (Math.abs(read.get(n - 1) - read.get(n - 2)) < y) {
                    break;
                }
                count(counts, read.get(n - 3), read.get(n - 2), 1);
                read.remove(n - 2);
                read.remove(n - 3);
            }
        }
        return counts;
    }

    private static void count(Map<String, Double> counts, double a, double b, double n) {
        counts.merge(key(Math.abs(a - b), 0.5 * a + 0.5 * b), n, Double::sum);
    }

    static String key(double range, double mean) {
        return range + " " + (mean + 0.0);
    }

    private static List<Double> turning(double[] signal) {
        List<Double> points = new ArrayList<>();
        for (double value : signal) {
            int n = points.size();
            if (n > 0 && points.get(n - 1) == value) {
                continue;
            }
            if (n > 1 && points.get(n - 1) > points.get(n - 2) == value > points.get(n - 1)) {
                points.remove(n - 1);
            }
            points.add(value);
        }
        return points;
    }
}
