package org.rodside.report;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import org.rodside.kinematics.Mechanism;
import org.rodside.study.HistoryAccumulator;
import org.rodside.study.HistoryAccumulator.Peak;
import org.rodside.study.HistoryQuestion;
import org.rodside.units.Quantity;
import org.rodside.units.UnitSystem;

/** What a load history met, told as JSON and text. */
public final class HistoryReport {

    private final HistoryAccumulator history;
    private final HistoryQuestion question;
    private final UnitSystem units;
    private final Shown shown;
    private final Mechanism mechanism;

    public HistoryReport(HistoryAccumulator history, HistoryQuestion question, UnitSystem units) {
        this.history = history;
        this.question = question;
        this.units = units;
        shown = new Shown(units);
        mechanism = history.mechanism();
    }

    private static Quantity quantity(Peak peak) {
        return switch (peak) {
            case PUSH, PULL -> Quantity.FORCE;
            case SPEED -> Quantity.SPEED;
            case CAP, ROD -> Quantity.PRESSURE;
            case FLOW -> Quantity.FLOW;
        };
    }

    private static String word(Peak peak) {
        return peak.name().toLowerCase(Locale.ROOT);
    }

    /** The summary as a JSON tree. */
    public Map<String, Object> json() {
        Fields fields = new Fields(units)
                .put("rows", history.rows())
                .put("duration", Quantity.TIME, history.duration())
                .put("flow", Quantity.FLOW, history.flow())
                .put("flow_at", Quantity.TIME, history.flowTime())
                .put("power", Quantity.POWER, history.power())
                .put("power_at", Quantity.TIME, history.powerTime());
        if (question.measured()) {
            fields.put("largest_fit", Quantity.FORCE, history.fit());
        }
        Map<String, Object> cylinders = new LinkedHashMap<>();
        for (int c = 0; c < mechanism.cylinders(); c++) {
            Fields one = new Fields(units);
            for (Peak peak : Peak.values()) {
                one.put(word(peak), quantity(peak), history.peak(c, peak))
                        .put(word(peak) + "_at", Quantity.TIME, history.peakTime(c, peak));
            }
            cylinders.put(mechanism.cylinderName(c), one.map());
        }
        fields.put("cylinders", cylinders);
        fields.put("bearings", bearings());
        fields.put("exceeded", exceeded());
        return fields.map();
    }

    private Map<String, Object> bearings() {
        Map<String, Map<String, Object>> map = new LinkedHashMap<>();
        for (int b = 0; b < mechanism.bearings(); b++) {
            map.computeIfAbsent(mechanism.pinName(mechanism.bearingPin(b)), pin -> new LinkedHashMap<>())
                    .put(
                            mechanism.bodyName(mechanism.bearingBody(b)),
                            new Fields(units)
                                    .put("total", Quantity.FORCE, history.bearing(b))
                                    .put("at", Quantity.TIME, history.bearingTime(b))
                                    .map());
        }
        return new LinkedHashMap<>(map);
    }

    private List<Object> exceeded() {
        List<Object> list = new ArrayList<>();
        for (HistoryAccumulator.Excess excess : history.excesses()) {
            list.add(new Fields(units)
                    .put("limit", excess.cause())
                    .put("rows", excess.rows())
                    .put("worst", excess.worst())
                    .put("at", Quantity.TIME, excess.time())
                    .map());
        }
        return list;
    }

    /** The summary as text. */
    public String text() {
        StringBuilder text = new StringBuilder()
                .append(history.rows())
                .append(" rows over ")
                .append(TextTable.number(history.duration()))
                .append(" s; ")
                .append(question.atRest() ? "inertia left out" : "inertia included")
                .append(
                        question.measured()
                                ? "; tip force fitted to the measured pressures, largest residual "
                                        + shown.text(history.fit(), Quantity.FORCE)
                                : "")
                .append("\n\nPeaks of the cylinders\n");
        text.append(TextTable.of(headings(), rows()))
                .append("\nPeak force at each pin\n")
                .append(pinTable());
        totals(text);
        return text.toString();
    }

    private void totals(StringBuilder text) {
        text.append("\nLargest flow into all cylinders ")
                .append(shown.text(history.flow(), Quantity.FLOW))
                .append(" at ")
                .append(TextTable.number(history.flowTime()))
                .append(" s; largest power given ")
                .append(shown.text(history.power(), Quantity.POWER))
                .append(" at ")
                .append(TextTable.number(history.powerTime()))
                .append(" s\n");
        history.excesses()
                .forEach(excess -> text.append("Exceeded: ")
                        .append(excess.cause())
                        .append(" in ")
                        .append(excess.rows())
                        .append(" rows, worst ")
                        .append(TextTable.number(100 * excess.worst()))
                        .append(" % of what is there at ")
                        .append(TextTable.number(excess.time()))
                        .append(" s\n"));
    }

    private List<String> headings() {
        List<String> headings = new ArrayList<>(List.of("cylinder"));
        for (Peak peak : Peak.values()) {
            headings.add(shown.heading(word(peak), quantity(peak)));
            headings.add("at s");
        }
        return headings;
    }

    private List<List<String>> rows() {
        List<List<String>> rows = new ArrayList<>();
        for (int c = 0; c < mechanism.cylinders(); c++) {
            List<String> row = new ArrayList<>(List.of(mechanism.cylinderName(c)));
            for (Peak peak : Peak.values()) {
                row.add(shown.cell(history.peak(c, peak), quantity(peak)));
                row.add(TextTable.number(history.peakTime(c, peak)));
            }
            rows.add(row);
        }
        return rows;
    }

    /** Peaks of the cylinders for the report page, and what could not be given. */
    void tables(PageWriter page) {
        page.table("Peaks of the cylinders", headings(), rows());
        history.excesses()
                .forEach(excess -> page.note("Exceeded: " + excess.cause() + " in " + excess.rows() + " rows, worst "
                        + TextTable.number(100 * excess.worst()) + " % of what is there"));
    }

    private String pinTable() {
        Map<Integer, Integer> worst = new LinkedHashMap<>();
        for (int b = 0; b < mechanism.bearings(); b++) {
            worst.merge(
                    mechanism.bearingPin(b), b, (one, two) -> history.bearing(two) > history.bearing(one) ? two : one);
        }
        List<List<String>> rows = new ArrayList<>();
        worst.values()
                .forEach(b -> rows.add(List.of(
                        mechanism.pinName(mechanism.bearingPin(b)),
                        mechanism.bodyName(mechanism.bearingBody(b)),
                        shown.cell(history.bearing(b), Quantity.FORCE),
                        TextTable.number(history.bearingTime(b)))));
        return TextTable.of(List.of("pin", "link", shown.heading("total", Quantity.FORCE), "at s"), rows);
    }
}
