package org.rodside.io;

import java.util.ArrayList;
import java.util.List;
import org.rodside.model.InputException;

/** Gathers every fault of one source, so that a user sees all of them at once. Not safe for several threads. */
final class FaultAccumulator {

    private final String source;
    private final List<String> lines = new ArrayList<>();
    private final List<String> overridden = new ArrayList<>();

    /**
     * @param source what to call the source in every line, as a rule the path as the user gave it
     */
    FaultAccumulator(String source) {
        this.source = source;
    }

    /** Adds a fault at a path inside the source; an empty path means the whole source. */
    void add(String path, String words) {
        String place = path.isEmpty() ? source : source + ": " + path;
        lines.add(oneLine(place + ": " + words + (isOverridden(path) ? " (set by an override)" : "")));
    }

    /** Notes that the value at a path did not come from the file, so that a fault there says so. */
    void noteOverride(String path) {
        overridden.add(path);
    }

    int count() {
        return lines.size();
    }

    /** The faults so far, in the order found. */
    List<String> lines() {
        return List.copyOf(lines);
    }

    /** @throws InputException with all faults, when there is one */
    void throwIfAny() {
        if (!lines.isEmpty()) {
            throw new InputException(lines);
        }
    }

    private boolean isOverridden(String path) {
        return overridden.stream().anyMatch(set -> path.equals(set) || path.startsWith(set + "."));
    }

    /** Line breaks and other control characters of a user's key or text may not break the line it is reported on. */
    private static String oneLine(String text) {
        StringBuilder line = new StringBuilder(text.length());
        for (char c : text.toCharArray()) {
            if (Character.isISOControl(c)) {
                line.append(
                        c == '\n' ? "\\n" : c == '\t' ? "\\t" : "\\u00" + (c < 16 ? "0" : "") + Integer.toHexString(c));
            } else {
                line.append(c);
            }
        }
        return line.toString();
    }
}
