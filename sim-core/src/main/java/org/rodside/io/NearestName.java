package org.rodside.io;

import java.util.Collection;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** Finds the right name that a misspelt one most likely meant. */
public final class NearestName {

    /** A name may differ from the right one by half of its letters, and always by two; further off is no likeness. */
    private static final int ALWAYS_ALLOWED = 2;

    /** Longer lists are cut, so that an error stays one readable line. */
    private static final int NAMES_SHOWN = 16;

    private NearestName() {}

    /** The nearest of the right names by edit distance (capitals and the kind of dash do not count), if any is near. */
    public static Optional<String> of(String wrong, Collection<String> right) {
        String plainWrong = plain(wrong);
        int allowed = Math.max(ALWAYS_ALLOWED, plainWrong.length() / 2);
        String best = null;
        int fewest = allowed + 1;
        for (String name : right) {
            // Two edits that replace a whole short name are no likeness.
            int edits = distance(plainWrong, plain(name));
            if (edits < fewest && edits < Math.max(plainWrong.length(), name.length())) {
                fewest = edits;
                best = name;
            }
        }
        return Optional.ofNullable(best);
    }

    /** Words for an error: the nearest right name, or the whole list where none is near. */
    public static String advice(String wrong, Collection<String> right) {
        return of(wrong, right)
                .map(name -> "the nearest right one is " + name)
                .orElseGet(() -> "known are " + shown(right));
    }

    private static String shown(Collection<String> names) {
        if (names.isEmpty()) {
            return "none";
        }
        List<String> first = names.stream().limit(NAMES_SHOWN).toList();
        return String.join(", ", first) + (names.size() > NAMES_SHOWN ? ", …" : "");
    }

    private static String plain(String name) {
        return name.toLowerCase(Locale.ROOT).replace('_', '-').replace(' ', '-');
    }

    /** Fewest insertions, deletions, changes and swaps of neighbours that turn one text into the other. */
    static int distance(String a, String b) {
        int[] beforeLast = new int[b.length() + 1];
        int[] last = new int[b.length() + 1];
        int[] row = new int[b.length() + 1];
        for (int j = 0; j <= b.length(); j++) {
            last[j] = j;
        }
        for (int i = 1; i <= a.length(); i++) {
            row[0] = i;
            for (int j = 1; j <= b.length(); j++) {
                int change = a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1;
                row[j] = Math.min(Math.min(last[j], row[j - 1]) + 1, last[j - 1] + change);
                if (i > 1 && j > 1 && a.charAt(i - 1) == b.charAt(j - 2) && a.charAt(i - 2) == b.charAt(j - 1)) {
                    row[j] = Math.min(row[j], beforeLast[j - 2] + 1);
                }
            }
            int[] spare = beforeLast;
            beforeLast = last;
            last = row;
            row = spare;
        }
        return last[b.length()];
    }
}
