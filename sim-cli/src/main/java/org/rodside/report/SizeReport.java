package org.rodside.report;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.rodside.model.Cylinder;
import org.rodside.study.Front;
import org.rodside.study.SizeQuestion;
import org.rodside.study.SizeRow;
import org.rodside.table.Column;
import org.rodside.table.Table;
import org.rodside.units.Quantity;
import org.rodside.units.UnitSystem;

/** Cylinder sizes told as JSON, text, a table and a section of the report page. */
public final class SizeReport {

    private static final List<String> NO_YES = List.of("no", "yes");

    private final Front front;
    private final SizeQuestion question;
    private final List<SizeRow> rows;
    private final UnitSystem units;
    private final Shown shown;

    public SizeReport(Front front, SizeQuestion question, List<SizeRow> rows, UnitSystem units) {
        this.front = front;
        this.question = question;
        this.rows = List.copyOf(rows);
        this.units = units;
        shown = new Shown(units);
    }

    /** All rows as a table. */
    public Table table() {
        List<String> names = Shown.cylinders(front.linkage());
        Table table = new Table(List.of(
                Column.words("cylinder", names),
                Column.of("bore", Quantity.LENGTH),
                Column.of("rod", Quantity.LENGTH),
                Column.of("count", Quantity.NONE, 0),
                Column.of("push", Quantity.PRESSURE),
                Column.of("pull", Quantity.PRESSURE),
                Column.factor("buckling_factor"),
                Column.factor("loaded_factor"),
                Column.of("mass", Quantity.MASS),
                Column.of("push", Quantity.FLOW),
                Column.of("pull", Quantity.FLOW),
                Column.words("present", NO_YES),
                Column.words("carries", NO_YES)));
        rows.forEach(row -> table.row(values(row)));
        return table;
    }

    private static double[] values(SizeRow row) {
        return new double[] {
            row.index(),
            row.cylinder().bore(),
            row.cylinder().rod(),
            row.cylinder().count(),
            row.pushPressure(),
            row.pullPressure(),
            finite(row.bucklingFactor()),
            row.loadedFactor(),
            row.mass(),
            row.pushFlow(),
            row.pullFlow(),
            row.present() ? 1 : 0,
            row.carries() ? 1 : 0
        };
    }

    private static double finite(double factor) {
        return Double.isInfinite(factor) ? Double.NaN : factor;
    }

    /** The answer as a JSON tree: for each cylinder its present size and the sizes that carry. */
    public Map<String, Object> json() {
        Map<String, Object> map = new LinkedHashMap<>();
        for (Cylinder cylinder : front.linkage().cylinders()) {
            List<Object> sizes = new ArrayList<>();
            Map<String, Object> present = new LinkedHashMap<>();
            for (SizeRow row : rows) {
                if (row.cylinder().name().equals(cylinder.name())) {
                    if (row.present()) {
                        present = rowJson(row);
                    } else {
                        sizes.add(rowJson(row));
                    }
                }
            }
            Map<String, Object> one = new LinkedHashMap<>();
            one.put("present", present);
            one.put("sizes", sizes);
            map.put(cylinder.name(), one);
        }
        Map<String, Object> all = new LinkedHashMap<>();
        all.put("factor", question.factor());
        all.put("cylinders", map);
        all.put("cautions", Cautions.estimates());
        return all;
    }

    private Map<String, Object> rowJson(SizeRow row) {
        return new Fields(units)
                .put("bore", Quantity.LENGTH, row.cylinder().bore())
                .put("rod", Quantity.LENGTH, row.cylinder().rod())
                .put("count", row.cylinder().count())
                .put("push", Quantity.PRESSURE, row.pushPressure())
                .put("pull", Quantity.PRESSURE, row.pullPressure())
                .put("buckling_factor", row.bucklingFactor())
                .put("loaded_factor", row.loadedFactor())
                .put("mass", Quantity.MASS, row.mass())
                .put("push", Quantity.FLOW, row.pushFlow())
                .put("pull", Quantity.FLOW, row.pullFlow())
                .put("carries", row.carries())
                .map();
    }

    /** The answer as text: the present size and, for each bore that carries, the thinnest rod. */
    public String text() {
        return "Cylinder sizes for the worst loads (buckling factor at least " + TextTable.number(question.factor())
                + ", pressure at most " + pressureAsked() + "; flows at "
                + shown.text(question.speed(), Quantity.SPEED) + ")\n" + TextTable.of(headings(), shownRows())
                + "Loads are those of the machine as drawn: a larger cylinder also makes larger tool forces.\n";
    }

    private String pressureAsked() {
        return question.pressure().isEmpty()
                ? "each cylinder's working pressure"
                : shown.text(question.pressure().getAsDouble(), Quantity.PRESSURE);
    }

    private List<String> headings() {
        return List.of(
                "cylinder",
                "size",
                shown.heading("bore", Quantity.LENGTH),
                shown.heading("rod", Quantity.LENGTH),
                shown.heading("push", Quantity.PRESSURE),
                shown.heading("pull", Quantity.PRESSURE),
                "buckling factor",
                "loaded factor",
                shown.heading("mass", Quantity.MASS),
                shown.heading("push", Quantity.FLOW),
                shown.heading("pull", Quantity.FLOW),
                "carries");
    }

    private List<List<String>> shownRows() {
        List<List<String>> shown = new ArrayList<>();
        SizeRow before = null;
        for (SizeRow row : rows) {
            boolean sameBore = before != null
                    && !before.present()
                    && before.index() == row.index()
                    && before.cylinder().bore() == row.cylinder().bore();
            if (!sameBore) {
                shown.add(cells(row));
            }
            before = row;
        }
        return shown;
    }

    private List<String> cells(SizeRow row) {
        return List.of(
                row.cylinder().name()
                        + (row.cylinder().count() > 1 ? " ×" + row.cylinder().count() : ""),
                row.present() ? "present" : "",
                shown.cell(row.cylinder().bore(), Quantity.LENGTH),
                shown.cell(row.cylinder().rod(), Quantity.LENGTH),
                shown.cell(row.pushPressure(), Quantity.PRESSURE),
                shown.cell(row.pullPressure(), Quantity.PRESSURE),
                TextTable.number(row.bucklingFactor()),
                TextTable.number(row.loadedFactor()),
                shown.cell(row.mass(), Quantity.MASS),
                shown.cell(row.pushFlow(), Quantity.FLOW),
                shown.cell(row.pullFlow(), Quantity.FLOW),
                row.carries() ? "yes" : "no");
    }

    /** Writes {@code size.csv}. */
    public void files(Path folder) {
        TableFile.write(folder.resolve("size.csv"), table(), units);
    }

    /** The section of the report page. */
    public void section(PageWriter page) {
        page.section(
                "Cylinder sizes",
                "What each cylinder would need for the worst loads, and the standard sizes that carry them.");
        page.table("Present size, then the thinnest rod for each bore that carries", headings(), shownRows());
        page.note("Loads are those of the machine as drawn: a larger cylinder also makes larger tool forces.");
    }
}
