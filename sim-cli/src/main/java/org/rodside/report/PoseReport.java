package org.rodside.report;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.rodside.chart.Plot;
import org.rodside.kinematics.Mechanism;
import org.rodside.kinematics.PoseBuffer;
import org.rodside.model.Cylinder;
import org.rodside.model.Link;
import org.rodside.model.Linkage;
import org.rodside.model.Point;
import org.rodside.study.PoseAnswer;
import org.rodside.units.Quantity;
import org.rodside.units.UnitSystem;

/** One pose told as JSON, as a page of text and as a picture. */
public final class PoseReport {

    private final PoseAnswer answer;
    private final UnitSystem units;
    private final Shown shown;
    private final Mechanism mechanism;
    private final PoseBuffer pose;
    private final Linkage linkage;

    public PoseReport(PoseAnswer answer, UnitSystem units) {
        this.answer = answer;
        this.units = units;
        shown = new Shown(units);
        pose = answer.pose();
        mechanism = pose.mechanism();
        linkage = mechanism.linkage();
    }

    /** The answer as a JSON tree. */
    public Map<String, Object> json() {
        Map<String, Object> map = new LinkedHashMap<>();
        map.put("pose", strokes());
        map.put("pins", pins());
        map.put("points", points());
        map.put("links", links());
        map.put("cylinders", cylinders());
        map.put("bearings", bearings());
        map.put("ground", answer.ground().map(this::ground).orElse(null));
        if (!answer.polygon().isEmpty()) {
            map.put("polygon", polygon());
        }
        return map;
    }

    private Map<String, Object> strokes() {
        Map<String, Object> map = new LinkedHashMap<>();
        for (int c = 0; c < mechanism.cylinders(); c++) {
            map.put(
                    mechanism.cylinderName(c),
                    fields().put("fraction", answer.fractions()[c])
                            .put("stroke", Quantity.LENGTH, answer.fractions()[c] * mechanism.stroke(c))
                            .put("length", Quantity.LENGTH, pose.length(c))
                            .map());
        }
        return map;
    }

    private Map<String, Object> pins() {
        Map<String, Object> map = new LinkedHashMap<>();
        for (int pin = 0; pin < mechanism.pins(); pin++) {
            map.put(mechanism.pinName(pin), place(pose.pinX(pin), pose.pinY(pin)));
        }
        return map;
    }

    private Map<String, Object> points() {
        Map<String, Object> map = new LinkedHashMap<>();
        for (int body = 1; body < mechanism.bodies(); body++) {
            Link link = linkage.links().get(body - 1);
            for (Map.Entry<String, Point> point : link.points().entrySet()) {
                Point at = point.getValue();
                map.put(
                        link.name() + "." + point.getKey(),
                        place(pose.x(body, at.x(), at.y()), pose.y(body, at.x(), at.y())));
            }
        }
        return map;
    }

    private Map<String, Object> place(double x, double y) {
        return fields().put("x", Quantity.LENGTH, x)
                .put("y", Quantity.LENGTH, y)
                .map();
    }

    private Map<String, Object> links() {
        Map<String, Object> map = new LinkedHashMap<>();
        for (int body = 1; body < mechanism.bodies(); body++) {
            map.put(
                    mechanism.bodyName(body),
                    fields().put("turn", Quantity.ANGLE, pose.turn(body)).map());
        }
        return map;
    }

    private Map<String, Object> cylinders() {
        Map<String, Object> map = new LinkedHashMap<>();
        for (int c = 0; c < mechanism.cylinders(); c++) {
            double force = answer.forces().cylinder(c);
            double each = force * linkage.cylinders().get(c).harderShare();
            map.put(
                    mechanism.cylinderName(c),
                    fields().put("force", Quantity.FORCE, force)
                            .put("each", Quantity.FORCE, each)
                            .put(
                                    "cap",
                                    Quantity.PRESSURE,
                                    answer.pressures().get(c).cap())
                            .put(
                                    "rod",
                                    Quantity.PRESSURE,
                                    answer.pressures().get(c).rod())
                            .map());
        }
        return map;
    }

    private Map<String, Object> bearings() {
        Map<String, Map<String, Object>> map = new LinkedHashMap<>();
        for (int b = 0; b < mechanism.bearings(); b++) {
            double x = answer.forces().bearingX(b);
            double y = answer.forces().bearingY(b);
            map.computeIfAbsent(mechanism.pinName(mechanism.bearingPin(b)), pin -> new LinkedHashMap<>())
                    .put(
                            mechanism.bodyName(mechanism.bearingBody(b)),
                            fields().put("x", Quantity.FORCE, x)
                                    .put("y", Quantity.FORCE, y)
                                    .put("total", Quantity.FORCE, Math.hypot(x, y))
                                    .map());
        }
        return new LinkedHashMap<>(map);
    }

    private Map<String, Object> ground(PoseAnswer.Ground ground) {
        return fields().put("normal", Quantity.FORCE, ground.normal())
                .put("horizontal", Quantity.FORCE, ground.horizontal())
                .put("resultant_x", Quantity.LENGTH, ground.resultantX())
                .map();
    }

    private List<Object> polygon() {
        List<Object> list = new ArrayList<>();
        for (PoseAnswer.Direction side : answer.polygon()) {
            list.add(fields().put("direction", Quantity.ANGLE, side.direction())
                    .put("force", Quantity.FORCE, side.force())
                    .put("limit", side.limit())
                    .map());
        }
        return list;
    }

    private Fields fields() {
        return new Fields(units);
    }

    /** The answer as text for a terminal. */
    public String text() {
        StringBuilder text = new StringBuilder();
        text.append(linkage.name()).append("\n\nCylinders (+ push, - pull; each = the harder-worked twin)\n");
        text.append(cylinderTable());
        text.append("\nBearings: force of the pin on the link, machine axes\n").append(bearingTable());
        text.append("\nTool points\n").append(placeTable(points()));
        answer.ground()
                .ifPresent(ground -> text.append("\nGround on machine: ")
                        .append(shown.text(ground.normal(), Quantity.FORCE))
                        .append(" up, ")
                        .append(shown.text(ground.horizontal(), Quantity.FORCE))
                        .append(" forward, through x = ")
                        .append(shown.text(ground.resultantX(), Quantity.LENGTH))
                        .append('\n'));
        if (!answer.polygon().isEmpty()) {
            text.append("\nLargest force on the ground with every cylinder holding\n")
                    .append(polygonTable());
        }
        return text.append('\n').append(Cautions.text()).toString();
    }

    private String cylinderTable() {
        List<List<String>> rows = new ArrayList<>();
        for (int c = 0; c < mechanism.cylinders(); c++) {
            Cylinder cylinder = linkage.cylinders().get(c);
            double force = answer.forces().cylinder(c);
            rows.add(List.of(
                    cylinder.name(),
                    TextTable.number(answer.fractions()[c]),
                    shown.cell(pose.length(c), Quantity.LENGTH),
                    shown.cell(force, Quantity.FORCE),
                    shown.cell(force * cylinder.harderShare(), Quantity.FORCE),
                    shown.cell(answer.pressures().get(c).cap(), Quantity.PRESSURE),
                    shown.cell(answer.pressures().get(c).rod(), Quantity.PRESSURE)));
        }
        return TextTable.of(
                List.of(
                        "cylinder",
                        "fraction",
                        shown.heading("length", Quantity.LENGTH),
                        shown.heading("force", Quantity.FORCE),
                        shown.heading("each", Quantity.FORCE),
                        shown.heading("cap side", Quantity.PRESSURE),
                        shown.heading("rod side", Quantity.PRESSURE)),
                rows);
    }

    private String bearingTable() {
        List<List<String>> rows = new ArrayList<>();
        for (int b = 0; b < mechanism.bearings(); b++) {
            double x = answer.forces().bearingX(b);
            double y = answer.forces().bearingY(b);
            rows.add(List.of(
                    mechanism.pinName(mechanism.bearingPin(b)),
                    mechanism.bodyName(mechanism.bearingBody(b)),
                    shown.cell(Math.hypot(x, y), Quantity.FORCE),
                    shown.cell(x, Quantity.FORCE),
                    shown.cell(y, Quantity.FORCE)));
        }
        return TextTable.of(
                List.of(
                        "pin",
                        "link",
                        shown.heading("total", Quantity.FORCE),
                        shown.heading("x", Quantity.FORCE),
                        shown.heading("y", Quantity.FORCE)),
                rows);
    }

    private String placeTable(Map<String, Object> places) {
        List<List<String>> rows = new ArrayList<>();
        places.forEach((name, at) -> {
            List<String> row = new ArrayList<>(List.of(name));
            ((Map<?, ?>) at).values().forEach(value -> row.add(TextTable.number((Double) value)));
            rows.add(row);
        });
        return TextTable.of(
                List.of("point", shown.heading("x", Quantity.LENGTH), shown.heading("y", Quantity.LENGTH)), rows);
    }

    private String polygonTable() {
        List<List<String>> rows = new ArrayList<>();
        answer.polygon()
                .forEach(side -> rows.add(List.of(
                        shown.cell(side.direction(), Quantity.ANGLE),
                        shown.cell(side.force(), Quantity.FORCE),
                        side.limit())));
        return TextTable.of(
                List.of(shown.heading("direction", Quantity.ANGLE), shown.heading("force", Quantity.FORCE), "limit"),
                rows);
    }

    /** The pose as a picture. */
    public Plot plot() {
        return new LinkagePicture(PoseDrawing.of(pose), units).plot(linkage.name());
    }

    /** Writes the picture {@code pose.png}. */
    public void files(Path folder) {
        PictureFile.write(folder.resolve("pose.png"), plot());
    }
}
