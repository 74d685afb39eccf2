package org.rodside.io;

import java.util.Collection;
import java.util.Locale;
import java.util.Optional;

/** Finds the right name that a misspelt one was most likely meant to be. */
public final class Nearest {

    private Nearest() {}

    /**
     * The known name that takes the fewest single-letter changes (insert, drop, replace, swap of neighbours; case does
     * not count), the first of equals; empty where every one takes more than a third of the letters and one.
     *
     * @param found what was written
     * @param known what would be right, in order of preference
     */
    public static Optional<String> to(String found, Collection<String> known) {
        int allowed = 1 + found.length() / 3;
        String best = null;
        int fewest = allowed + 1;
        for (String name : known) {
            int changes = changes(found.toLowerCase(Locale.ROOT), name.toLowerCase(Locale.ROOT));
            if (changes < fewest) {
                fewest = changes;
                best = name;
            }
        }
        return Optional.ofNullable(best);
    }

    /** The end of an error sentence: {@code "; did you mean boom?"}, or the known names where none is near. */
    public static String hint(String found, Collection<String> known) {
        if (known.isEmpty()) {
            return "";
        }
        return to(found, known)
                .map(name -> "; did you mean " + name + "?")
                .orElse("; right would be one of " + String.join(", ", known));
    }

    /** Fewest changes from one word to another, rows of the usual table kept three at a time. */
    private static int changes(String from, String to) {
        int[] before = new int[to.length() + 1];
        int[] above = new int[to.length() + 1];
        int[] row = new int[to.length() + 1];
        for (int j = 0; j <= to.length(); j++) {
            above[j] = j;
        }
        for (int i = 1; i <= from.length(); i++) {
            row[0] = i;
            for (int j = 1; j <= to.length(); j++) {
                int replace = from.charAt(i - 1) == to.charAt(j - 1) ? 0 : 1;
                row[j] = Math.min(above[j - 1] + replace, 1 + Math.min(above[j], row[j - 1]));
                if (swapped(from, i, to, j)) {
                    row[j] = Math.min(row[j], before[j - 2] + 1);
                }
            }
            int[] spare = before;
            before = above;
            above = row;
            row = spare;
        }
        return above[to.length()];
    }

    private static boolean swapped(String from, int i, String to, int j) {
        return i > 1 && j > 1 && from.charAt(i - 1) == to.charAt(j - 2) && from.charAt(i - 2) == to.charAt(j - 1);
    }
}
