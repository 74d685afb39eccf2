package org.rodside.report;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;
import org.rodside.table.Column;
import org.rodside.table.Table;
import org.rodside.units.UnitSystem;

/** Aligned plain tables for the terminal: numbers to the right, words to the left, two spaces between columns. */
public final class TextTable {

    /** Digits that matter to an engineer who reads a summary; whole numbers are never cut. */
    private static final int SIGNIFICANT = 4;

    /** What stands where there is no number. */
    private static final String NONE = "-";

    private static final Pattern NUMBER = Pattern.compile("[-+]?[0-9.]+(E[-+]?[0-9]+)?|-|");

    private TextTable() {}

    /** A table with its headings in the units asked for. */
    public static String of(Table table, UnitSystem units) {
        return of(headings(table, units), rows(table, units, table.rows()));
    }

    /** A table of words. A column in which every cell is a number, a dash or empty stands to the right. */
    public static String of(List<String> headings, List<List<String>> rows) {
        int columns = headings.size();
        int[] widths = new int[columns];
        boolean[] right = new boolean[columns];
        for (int c = 0; c < columns; c++) {
            widths[c] = length(headings.get(c));
            right[c] = !rows.isEmpty();
            for (List<String> row : rows) {
                widths[c] = Math.max(widths[c], length(row.get(c)));
                right[c] &= NUMBER.matcher(row.get(c)).matches();
            }
        }
        StringBuilder text = new StringBuilder();
        line(text, headings, widths, right);
        List<String> rule = new ArrayList<>();
        for (int width : widths) {
            rule.add("-".repeat(width));
        }
        line(text, rule, widths, right);
        rows.forEach(row -> line(text, row, widths, right));
        return text.toString();
    }

    /** A number with four significant digits, whole numbers in full; a dash where it is not finite. */
    public static String number(double value) {
        if (!Double.isFinite(value)) {
            return NONE;
        }
        BigDecimal exact = BigDecimal.valueOf(value);
        if (value == 0) {
            return "0";
        }
        if (Math.abs(value) >= Math.pow(10, SIGNIFICANT - 1)) {
            return exact.setScale(0, RoundingMode.HALF_UP).toPlainString();
        }
        BigDecimal round = exact.round(new MathContext(SIGNIFICANT, RoundingMode.HALF_UP));
        return Math.abs(value) < 1e-5 ? round.toString() : round.toPlainString();
    }

    static List<String> headings(Table table, UnitSystem units) {
        return table.columns().stream().map(column -> column.heading(units)).toList();
    }

    static List<List<String>> rows(Table table, UnitSystem units, int most) {
        List<List<String>> rows = new ArrayList<>();
        for (int r = 0; r < Math.min(most, table.rows()); r++) {
            List<String> row = new ArrayList<>();
            for (int c = 0; c < table.columns().size(); c++) {
                Column column = table.columns().get(c);
                row.add(
                        column.labels().isEmpty()
                                ? number(units.of(table.at(r, c), column.quantity()))
                                : table.word(r, c));
            }
            rows.add(row);
        }
        return rows;
    }

    private static int length(String text) {
        return text.codePointCount(0, text.length());
    }

    private static void line(StringBuilder text, List<String> cells, int[] widths, boolean[] right) {
        int start = text.length();
        for (int c = 0; c < widths.length; c++) {
            String gap = " ".repeat(widths[c] - length(cells.get(c)));
            text.append(c == 0 ? "" : "  ").append(right[c] ? gap + cells.get(c) : cells.get(c) + gap);
        }
        int end = text.length();
        while (end > start && text.charAt(end - 1) == ' ') {
            end--;
        }
        text.setLength(end);
        text.append('\n');
    }
}
