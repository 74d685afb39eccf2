package org.rodside.report;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.rodside.model.Cylinder;
import org.rodside.study.Closure;
import org.rodside.study.ClosureAnswer;
import org.rodside.study.Front;
import org.rodside.units.Quantity;
import org.rodside.units.UnitSystem;

/** How a linkage closes, told as JSON and text. */
public final class CheckReport {

    private final Front front;
    private final ClosureAnswer answer;
    private final UnitSystem units;
    private final Shown shown;
    private final List<String> cylinders;

    public CheckReport(Front front, ClosureAnswer answer, UnitSystem units) {
        this.front = front;
        this.answer = answer;
        this.units = units;
        shown = new Shown(units);
        cylinders = Shown.cylinders(front.linkage());
    }

    /** The answer as a JSON tree. */
    public Map<String, Object> json() {
        Map<String, Object> map = new LinkedHashMap<>();
        map.put("name", front.linkage().name());
        map.put("freedoms", answer.freedoms());
        map.put("closed_form", answer.closedForm());
        map.put("poses", answer.poses());
        map.put("assembled", answer.assembled());
        map.put(
                "first_failure",
                answer.firstFailure().map(at -> Fields.pose(cylinders, at)).orElse(null));
        map.put("failing_link", answer.firstFailure().isPresent() ? answer.failingLink() : null);
        Map<String, Object> corners = new LinkedHashMap<>();
        for (ClosureAnswer.Corner corner : answer.corners()) {
            corners.put(cylinders.get(corner.cylinder()), cornerJson(corner));
        }
        map.put("cylinders", corners);
        return map;
    }

    private Map<String, Object> cornerJson(ClosureAnswer.Corner corner) {
        Cylinder cylinder = front.linkage().cylinders().get(corner.cylinder());
        return new Fields(units)
                .put("stroke", Quantity.LENGTH, cylinder.stroke())
                .put("fails_from", corner.smallestFailing())
                .put("fails_to", corner.largestFailing())
                .put("transmission_angle", Quantity.ANGLE, corner.angle())
                .put("angle_at", Fields.pose(cylinders, corner.angleAt()))
                .put("lever_arm", Quantity.LENGTH, corner.arm())
                .put("arm_at", Fields.pose(cylinders, corner.armAt()))
                .map();
    }

    /** The answer in a line or two. */
    public String brief() {
        StringBuilder text = new StringBuilder()
                .append(answer.assembled())
                .append(" of ")
                .append(answer.poses())
                .append(" poses over the whole stroke box assemble.\n");
        warnings().forEach(line -> text.append(line).append('\n'));
        return text.toString();
    }

    /** The section of the report page. */
    public void section(PageWriter page) {
        page.section("Closure", answer.assembled() + " of " + answer.poses() + " poses over the stroke box assemble.");
        page.table("", headings(), rows());
        warnings().forEach(page::note);
    }

    /** The answer as text. */
    public String text() {
        StringBuilder text = new StringBuilder(front.linkage().name()).append("\n\n");
        text.append(answer.freedoms())
                .append(" degrees of freedom for as many cylinders; loops are closed ")
                .append(
                        answer.closedForm()
                                ? "in closed form.\n"
                                : "by the dense way, for they have no closed form.\n");
        text.append(answer.assembled())
                .append(" of ")
                .append(answer.poses())
                .append(" poses over the whole stroke box assemble.\n");
        answer.firstFailure()
                .ifPresent(at -> text.append("First pose that does not: ")
                        .append(Shown.pose(cylinders, at))
                        .append("; link '")
                        .append(answer.failingLink())
                        .append("' cannot be placed there.\n"));
        text.append('\n').append(TextTable.of(headings(), rows()));
        warnings().forEach(line -> text.append(line).append('\n'));
        return text.toString();
    }

    private List<String> headings() {
        return List.of(
                "cylinder",
                shown.heading("stroke", Quantity.LENGTH),
                "fails from",
                "to",
                "smallest transmission angle, deg",
                shown.heading("smallest lever arm", Quantity.LENGTH),
                "arm at");
    }

    private List<List<String>> rows() {
        List<List<String>> rows = new ArrayList<>();
        for (ClosureAnswer.Corner corner : answer.corners()) {
            Cylinder cylinder = front.linkage().cylinders().get(corner.cylinder());
            rows.add(List.of(
                    cylinder.name(),
                    shown.cell(cylinder.stroke(), Quantity.LENGTH),
                    TextTable.number(corner.smallestFailing()),
                    TextTable.number(corner.largestFailing()),
                    shown.cell(corner.angle(), Quantity.ANGLE),
                    shown.cell(corner.arm(), Quantity.LENGTH),
                    Shown.pose(cylinders, corner.armAt())));
        }
        return rows;
    }

    private List<String> warnings() {
        List<String> lines = new ArrayList<>();
        for (ClosureAnswer.Corner corner : answer.corners()) {
            if (corner.angle() < Closure.SMALL_ANGLE) {
                lines.add(
                        "Close to a dead centre: cylinder " + cylinders.get(corner.cylinder()) + ", transmission angle "
                                + shown.cell(corner.angle(), Quantity.ANGLE) + " deg at "
                                + Shown.pose(cylinders, corner.angleAt()));
            }
        }
        return lines;
    }
}
