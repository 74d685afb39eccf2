package org.rodside.report;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import org.rodside.study.CycleCount;
import org.rodside.study.CycleOptions;
import org.rodside.table.Table;
import org.rodside.units.UnitSystem;

/** A count of cycles as summary and JSON. */
public final class CyclesReport {

    private final CycleCount count;
    private final CycleOptions options;

    public CyclesReport(CycleCount count) {
        this.count = count;
        this.options = count.options();
    }

    /** Notes on what the figures hide: tables gathered in bins. */
    public List<String> notes() {
        List<String> notes = new ArrayList<>();
        for (CycleCount.Channel c : count.channels()) {
            if (c.binWidth() > 0) {
                notes.add(c.name() + ": too many different cycles for the table; it is gathered in bins "
                        + TextTable.number(c.binWidth())
                        + " wide. Equivalent ranges and damage are of every single cycle.");
            }
        }
        return notes;
    }

    /** By channel: cycles, largest range, equivalent ranges; damage and spectrum where asked for. */
    public Map<String, Object> json() {
        Map<String, Object> all = new LinkedHashMap<>();
        for (CycleCount.Channel c : count.channels()) {
            Map<String, Object> one = new LinkedHashMap<>();
            one.put("cycles", c.cycles());
            one.put("max_range", c.maxRange());
            one.put("equivalent", bySlope(c.equivalent()));
            one.put("counting", options.repeat() ? "repeating block" : "single pass");
            if (options.hours() > 0) {
                one.put("factor", count.factor());
            }
            if (options.hasCurve()) {
                one.put("damage", c.damage());
            }
            if (c.binWidth() > 0) {
                one.put("bin_width", c.binWidth());
            }
            if (c.hasBlocks()) {
                one.put("blocks", blocks(c));
            }
            all.put(c.name(), one);
        }
        return all;
    }

    private Map<String, Object> bySlope(List<Double> values) {
        Map<String, Object> map = new LinkedHashMap<>();
        for (int i = 0; i < options.slopes().size(); i++) {
            map.put(label(options.slopes().get(i)), values.get(i));
        }
        return map;
    }

    private Map<String, Object> blocks(CycleCount.Channel c) {
        List<Object> levels = new ArrayList<>();
        Table table = c.levels();
        for (int i = 0; i < table.rows(); i++) {
            Map<String, Object> one = new LinkedHashMap<>();
            for (int k = 0; k < table.columns().size(); k++) {
                one.put(table.columns().get(k).name(), table.at(i, k));
            }
            levels.add(one);
        }
        Map<String, Object> damage = bySlope(c.kept());
        if (options.hasCurve()) {
            damage.put("curve", c.kept().get(c.kept().size() - 1));
        }
        Map<String, Object> map = new LinkedHashMap<>();
        map.put("levels", levels);
        map.put("left_out", c.leftOut());
        map.put("damage_kept", damage);
        return map;
    }

    private static String label(double slope) {
        return "m" + (slope == Math.rint(slope) ? String.valueOf((long) slope) : String.valueOf(slope));
    }

    /** A table for people, with the words that say how it was counted. */
    public String text() {
        StringBuilder text = new StringBuilder();
        text.append("Rainflow cycles, ASTM E1049: ")
                .append(options.repeat() ? "repeating block, full cycles only" : "single pass, residue as half cycles")
                .append('\n');
        text.append(String.format(Locale.ROOT, "%,d rows", count.rows()));
        if (count.recordings() > 1) {
            String how = options.separate() ? " separate recordings" : " recordings one after the other";
            text.append(" of ").append(count.recordings()).append(how);
        }
        if (count.seconds() > 0) {
            text.append(", ").append(TextTable.number(count.seconds())).append(" s");
        }
        if (options.hours() > 0) {
            text.append("; counts for ")
                    .append(TextTable.number(options.hours()))
                    .append(" h, ×");
            text.append(TextTable.number(count.factor()));
        }
        text.append(options.gate() > 0 ? "; swings below " + TextTable.number(options.gate()) + " passed over" : "");
        text.append("\n\n").append(figures());
        count.channels().stream().filter(CycleCount.Channel::hasBlocks).forEach(c -> levels(text, c));
        return text.append(footnotes()).toString();
    }

    private String footnotes() {
        StringBuilder text = new StringBuilder();
        text.append("\nRanges in the unit of the channel. Equivalent range: constant range that does the same damage"
                        + " in ")
                .append(options.reference() > 0 ? TextTable.number(options.reference()) : "as many")
                .append(" cycles.\n");
        if (options.hasCurve()) {
            text.append("Damage 1 is the end of the S-N line's life. No partial factors are in it; the applicable\n")
                    .append("standard and a licensed engineer settle those.\n");
        }
        return text.toString();
    }

    private String figures() {
        List<String> head = new ArrayList<>(List.of("channel", "cycles", "largest range"));
        options.slopes().forEach(m -> head.add("equivalent " + label(m)));
        if (options.hasCurve()) {
            head.add("damage");
        }
        List<List<String>> rows = new ArrayList<>();
        for (CycleCount.Channel c : count.channels()) {
            List<String> row =
                    new ArrayList<>(List.of(c.name(), TextTable.number(c.cycles()), TextTable.number(c.maxRange())));
            c.equivalent().forEach(e -> row.add(TextTable.number(e)));
            if (options.hasCurve()) {
                row.add(TextTable.number(c.damage()));
            }
            rows.add(row);
        }
        return TextTable.of(head, rows);
    }

    private void levels(StringBuilder text, CycleCount.Channel c) {
        text.append('\n').append(c.name()).append(", eight levels, means ");
        text.append(options.goodman() ? "to zero by Goodman's line" : "kept").append(":\n");
        text.append(TextTable.of(c.levels(), UnitSystem.SI));
        text.append("left out as too small: ")
                .append(TextTable.number(c.leftOut()))
                .append(" cycles; damage kept:");
        for (int i = 0; i < c.kept().size(); i++) {
            String of = i < options.slopes().size() ? label(options.slopes().get(i)) : "curve";
            text.append(' ')
                    .append(of)
                    .append(' ')
                    .append(TextTable.number(c.kept().get(i)));
        }
        text.append('\n');
    }
}
