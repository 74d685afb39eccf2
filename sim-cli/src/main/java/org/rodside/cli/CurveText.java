package org.rodside.cli;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import org.rodside.fatigue.SnCurve;
import org.rodside.io.NearestName;
import org.rodside.model.InputException;

/**
 * An S–N line as typed: {@code 71} for that detail category of EN 1993-1-9, or
 * {@code m=3,range=71,cycles=2e6[,knee=5e6[,m2=5[,cutoff=1e8]]]}.
 */
final class CurveText {

    private static final List<String> KEYS = List.of("m", "range", "cycles", "knee", "m2", "cutoff");
    private static final String WANTED =
            "; wanted is a detail category, e.g. 71, or m=3,range=71,cycles=2e6[,knee=5e6[,m2=5[,cutoff=1e8]]]";

    private CurveText() {}

    static SnCurve read(String text) {
        try {
            return text.contains("=") ? general(text) : SnCurve.category(number(text));
        } catch (IllegalArgumentException e) {
            throw new InputException("--curve: " + e.getMessage() + WANTED);
        }
    }

    private static SnCurve general(String text) {
        Map<String, Double> given = parts(text);
        String missing = List.of("m", "range", "cycles").stream()
                .filter(key -> !given.containsKey(key))
                .collect(Collectors.joining(", "));
        if (!missing.isEmpty()) {
            throw new IllegalArgumentException(missing + " is missing");
        }
        if (given.containsKey("m2") && !given.containsKey("knee")
                || given.containsKey("cutoff") && !given.containsKey("m2")) {
            throw new IllegalArgumentException("m2 needs a knee, and cutoff needs m2");
        }
        double none = Double.POSITIVE_INFINITY;
        return new SnCurve(
                given.get("m"),
                given.get("range"),
                given.get("cycles"),
                given.getOrDefault("knee", none),
                given.getOrDefault("m2", none),
                given.getOrDefault("cutoff", none));
    }

    private static Map<String, Double> parts(String text) {
        Map<String, Double> given = new HashMap<>();
        for (String part : text.split(",", -1)) {
            String[] pair = part.split("=", 2);
            String key = pair[0].strip();
            if (pair.length < 2 || !KEYS.contains(key)) {
                throw new IllegalArgumentException(
                        "'" + part + "' is none of its parts; " + NearestName.advice(key, KEYS));
            }
            if (given.put(key, number(pair[1])) != null) {
                throw new IllegalArgumentException(key + " is given twice");
            }
        }
        return given;
    }

    private static double number(String text) {
        try {
            double value = Double.parseDouble(text.strip());
            if (Double.isFinite(value)) {
                return value;
            }
        } catch (NumberFormatException e) {
            // told below
        }
        throw new IllegalArgumentException("'" + text + "' is not a number");
    }
}
