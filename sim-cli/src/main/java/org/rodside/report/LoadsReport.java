package org.rodside.report;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import org.rodside.kinematics.Mechanism;
import org.rodside.study.Front;
import org.rodside.study.LoadCase;
import org.rodside.study.LoadsAnswer;
import org.rodside.table.Column;
import org.rodside.table.Table;
import org.rodside.units.Quantity;
import org.rodside.units.UnitSystem;

/** Worst loads told as JSON, text, tables and a section of the report page. */
public final class LoadsReport {

    private final Front front;
    private final Mechanism mechanism;
    private final LoadsAnswer answer;
    private final UnitSystem units;
    private final Shown shown;
    private final List<String> cylinders;
    private final List<String> cases;

    public LoadsReport(Front front, LoadsAnswer answer, UnitSystem units) {
        this.front = front;
        this.answer = answer;
        this.units = units;
        shown = new Shown(units);
        mechanism = front.mechanism();
        cylinders = Shown.cylinders(front.linkage());
        cases = answer.cases().stream().map(LoadCase::name).toList();
    }

    /** Worst loads of the cylinders, one row for each cylinder, case and sense. */
    public Table cylinderTable() {
        List<Column> columns = new ArrayList<>(List.of(
                Column.words("cylinder", cylinders),
                Column.words("sense", List.of("push", "pull", "buckle")),
                Column.words("case", cases),
                Column.of("total", Quantity.FORCE),
                Column.of("each", Quantity.FORCE),
                Column.of("cap", Quantity.PRESSURE),
                Column.of("rod", Quantity.PRESSURE),
                Column.factor("relief_margin"),
                Column.factor("buckling_factor")));
        addFractions(columns);
        Table table = new Table(columns);
        for (LoadsAnswer.OnCylinder load : answer.cylinders()) {
            table.row(row(load.at(), new double[] {
                load.cylinder(),
                load.sense().ordinal(),
                cases.indexOf(load.loadCase()),
                load.total(),
                load.each(),
                load.cap(),
                load.rod(),
                load.reliefMargin(),
                load.bucklingFactor()
            }));
        }
        return table;
    }

    /** Worst forces of every pin on every link, axes of the link as drawn. */
    public Table bearingTable() {
        List<String> pins = new ArrayList<>();
        List<String> links = new ArrayList<>();
        for (int pin = 0; pin < mechanism.pins(); pin++) {
            pins.add(mechanism.pinName(pin));
        }
        for (int body = 0; body < mechanism.bodies(); body++) {
            links.add(mechanism.bodyName(body));
        }
        List<Column> columns = new ArrayList<>(List.of(
                Column.words("pin", pins),
                Column.words("link", links),
                Column.words("case", cases),
                Column.of("total", Quantity.FORCE),
                Column.of("x", Quantity.FORCE),
                Column.of("y", Quantity.FORCE)));
        addFractions(columns);
        Table table = new Table(columns);
        for (LoadsAnswer.OnBearing load : answer.bearings()) {
            table.row(row(load.at(), new double[] {
                mechanism.bearingPin(load.bearing()),
                mechanism.bearingBody(load.bearing()),
                cases.indexOf(load.loadCase()),
                load.total(),
                load.x(),
                load.y()
            }));
        }
        return table;
    }

    private void addFractions(List<Column> columns) {
        cylinders.forEach(name -> columns.add(Column.of(name + ".fraction", Quantity.NONE)));
    }

    private static double[] row(double[] at, double[] values) {
        double[] row = Arrays.copyOf(values, values.length + at.length);
        System.arraycopy(at, 0, row, values.length, at.length);
        return row;
    }

    /** The answer as a JSON tree. */
    public Map<String, Object> json() {
        Map<String, Object> map = new LinkedHashMap<>();
        map.put("cylinders", cylinderJson());
        map.put("bearings", bearingJson());
        Map<String, Object> intensified = new LinkedHashMap<>();
        for (LoadsAnswer.Intensified rod : answer.intensified()) {
            intensified.put(
                    cylinders.get(rod.cylinder()),
                    new Fields(units)
                            .put("rod", Quantity.PRESSURE, rod.rod())
                            .put("relief", Quantity.PRESSURE, rod.relief())
                            .put("relief_margin", rod.relief() / rod.rod())
                            .map());
        }
        map.put("intensification", intensified);
        map.put("notes", answer.notes());
        map.put("cautions", Cautions.estimates());
        return map;
    }

    private Map<String, Object> cylinderJson() {
        Map<String, Map<String, Map<String, Object>>> map = new LinkedHashMap<>();
        for (LoadsAnswer.OnCylinder load : answer.cylinders()) {
            map.computeIfAbsent(cylinders.get(load.cylinder()), c -> new LinkedHashMap<>())
                    .computeIfAbsent(load.loadCase(), c -> new LinkedHashMap<>())
                    .put(
                            load.sense().name().toLowerCase(Locale.ROOT),
                            new Fields(units)
                                    .put("total", Quantity.FORCE, load.total())
                                    .put("each", Quantity.FORCE, load.each())
                                    .put("cap", Quantity.PRESSURE, load.cap())
                                    .put("rod", Quantity.PRESSURE, load.rod())
                                    .put("relief_margin", load.reliefMargin())
                                    .put("buckling_factor", load.bucklingFactor())
                                    .put("at", Fields.pose(cylinders, load.at()))
                                    .map());
        }
        return new LinkedHashMap<>(map);
    }

    private Map<String, Object> bearingJson() {
        Map<String, Map<String, Map<String, Object>>> map = new LinkedHashMap<>();
        for (LoadsAnswer.OnBearing load : answer.bearings()) {
            map.computeIfAbsent(mechanism.pinName(mechanism.bearingPin(load.bearing())), p -> new LinkedHashMap<>())
                    .computeIfAbsent(
                            mechanism.bodyName(mechanism.bearingBody(load.bearing())), l -> new LinkedHashMap<>())
                    .put(
                            load.loadCase(),
                            new Fields(units)
                                    .put("total", Quantity.FORCE, load.total())
                                    .put("x", Quantity.FORCE, load.x())
                                    .put("y", Quantity.FORCE, load.y())
                                    .put("at", Fields.pose(cylinders, load.at()))
                                    .map());
        }
        return new LinkedHashMap<>(map);
    }

    /** The answer as text: one line for each cylinder and sense, the worst bearing force at each pin. */
    public String text() {
        StringBuilder text = new StringBuilder(
                "Worst loads on cylinders over the stroke box (+ push, - pull; each = the" + " harder-worked twin)\n");
        text.append(TextTable.of(cylinderHeadings(), worstCylinders()));
        text.append(
                        "\nWorst bearing force at each pin, pin on link; angle from +x in the link as drawn, anticlockwise\n")
                .append(TextTable.of(bearingHeadings(), worstBearings()));
        text.append("\nRod side with its port blocked while the pump works on the cap side\n")
                .append(TextTable.of(intensifiedHeadings(), intensifiedRows()));
        answer.notes().forEach(note -> text.append("Note: ").append(note).append('\n'));
        return text.toString();
    }

    private List<String> cylinderHeadings() {
        return List.of(
                "cylinder",
                "worst",
                "case",
                shown.heading("total", Quantity.FORCE),
                shown.heading("each", Quantity.FORCE),
                shown.heading("cap side", Quantity.PRESSURE),
                shown.heading("rod side", Quantity.PRESSURE),
                "relief margin",
                "buckling factor");
    }

    /** The worst of all cases for each cylinder and sense. */
    private List<List<String>> worstCylinders() {
        List<List<String>> rows = new ArrayList<>();
        for (int c = 0; c < cylinders.size(); c++) {
            for (LoadsAnswer.Sense sense : LoadsAnswer.Sense.values()) {
                LoadsAnswer.OnCylinder worst = null;
                for (LoadsAnswer.OnCylinder load : answer.cylinders()) {
                    if (load.cylinder() == c && load.sense() == sense && (worst == null || worse(load, worst))) {
                        worst = load;
                    }
                }
                if (worst != null) {
                    rows.add(cylinderRow(worst));
                }
            }
        }
        return rows;
    }

    private static boolean worse(LoadsAnswer.OnCylinder load, LoadsAnswer.OnCylinder than) {
        return load.sense() == LoadsAnswer.Sense.BUCKLE
                ? load.bucklingFactor() < than.bucklingFactor()
                : Math.abs(load.total()) > Math.abs(than.total());
    }

    private List<String> cylinderRow(LoadsAnswer.OnCylinder load) {
        return List.of(
                cylinders.get(load.cylinder()),
                load.sense().name().toLowerCase(Locale.ROOT),
                load.loadCase(),
                shown.cell(load.total(), Quantity.FORCE),
                shown.cell(load.each(), Quantity.FORCE),
                shown.cell(load.cap(), Quantity.PRESSURE),
                shown.cell(load.rod(), Quantity.PRESSURE),
                TextTable.number(load.reliefMargin()),
                TextTable.number(load.bucklingFactor()));
    }

    private List<String> bearingHeadings() {
        return List.of(
                "pin",
                "link",
                "case",
                shown.heading("total", Quantity.FORCE),
                shown.heading("angle in link", Quantity.ANGLE));
    }

    private List<List<String>> worstBearings() {
        Map<Integer, LoadsAnswer.OnBearing> worst = new LinkedHashMap<>();
        for (LoadsAnswer.OnBearing load : answer.bearings()) {
            worst.merge(
                    mechanism.bearingPin(load.bearing()), load, (one, two) -> two.total() > one.total() ? two : one);
        }
        List<List<String>> rows = new ArrayList<>();
        worst.values()
                .forEach(load -> rows.add(List.of(
                        mechanism.pinName(mechanism.bearingPin(load.bearing())),
                        mechanism.bodyName(mechanism.bearingBody(load.bearing())),
                        load.loadCase(),
                        shown.cell(load.total(), Quantity.FORCE),
                        shown.cell(Math.atan2(load.y(), load.x()), Quantity.ANGLE))));
        return rows;
    }

    private List<String> intensifiedHeadings() {
        return List.of(
                "cylinder",
                shown.heading("rod side", Quantity.PRESSURE),
                shown.heading("relief", Quantity.PRESSURE),
                "relief margin");
    }

    private List<List<String>> intensifiedRows() {
        List<List<String>> rows = new ArrayList<>();
        answer.intensified()
                .forEach(rod -> rows.add(List.of(
                        cylinders.get(rod.cylinder()),
                        shown.cell(rod.rod(), Quantity.PRESSURE),
                        shown.cell(rod.relief(), Quantity.PRESSURE),
                        TextTable.number(rod.relief() / rod.rod()))));
        return rows;
    }

    /** Writes {@code loads.csv} and {@code bearings.csv}. */
    public void files(Path folder) {
        TableFile.write(folder.resolve("loads.csv"), cylinderTable(), units);
        TableFile.write(folder.resolve("bearings.csv"), bearingTable(), units);
    }

    /** The section of the report page. */
    public void section(PageWriter page) {
        page.section(
                "Worst loads",
                "The largest push and pull of each cylinder and the smallest buckling factor, each at its own pose; then the"
                        + " worst force at every pin.");
        page.table("Cylinders (+ push, - pull)", cylinderHeadings(), worstCylinders());
        page.table(
                "Pins: force of the pin on the link, angle from +x in the link as drawn",
                bearingHeadings(),
                worstBearings());
        page.table(
                "Rod side with its port blocked while the pump works on the cap side",
                intensifiedHeadings(),
                intensifiedRows());
        answer.notes().forEach(page::note);
    }
}
