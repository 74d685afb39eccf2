package org.rodside.report;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.rodside.chart.Mark;
import org.rodside.chart.Palette;
import org.rodside.chart.Plot;
import org.rodside.chart.Series;
import org.rodside.study.Front;
import org.rodside.study.FrontSolver;
import org.rodside.study.RangeAnswer;
import org.rodside.table.Column;
import org.rodside.table.Table;
import org.rodside.units.Quantity;
import org.rodside.units.UnitSystem;

/** Working range told as JSON, text, outline files, a picture and a section of the report page. */
public final class EnvelopeReport {

    private static final Map<String, String> MEANINGS = meanings();

    private final Front front;
    private final RangeAnswer answer;
    private final UnitSystem units;
    private final Shown shown;
    private final List<String> cylinders;

    public EnvelopeReport(Front front, RangeAnswer answer, UnitSystem units) {
        this.front = front;
        this.answer = answer;
        this.units = units;
        shown = new Shown(units);
        cylinders = Shown.cylinders(front.linkage());
    }

    private static Map<String, String> meanings() {
        Map<String, String> words = new LinkedHashMap<>();
        words.put("reach", "furthest the tip gets from the swing axis");
        words.put("ground_reach", "furthest the tip gets on the ground");
        words.put("depth", "deepest the tip gets");
        words.put("cutting_height", "highest the tip gets");
        words.put("dump_height", "highest tip straight below the hook pin");
        words.put("dump_height_min", "lowest of these with the hoist extended");
        words.put("level_depth", "deepest level floor 2.44 m (96 in) long");
        words.put("wall_depth", "deepest tip with an upright cutting line");
        words.put("swing_radius", "smallest radius with all above ground");
        words.put("hook_height", "highest the hook pin gets");
        words.put("hook_reach", "furthest the hook pin gets");
        return words;
    }

    /** The answer as a JSON tree. */
    public Map<String, Object> json() {
        Fields range = new Fields(units);
        answer.dimensions().forEach((name, value) -> range.put(name, Quantity.LENGTH, value));
        Map<String, Object> at = new LinkedHashMap<>();
        answer.at().forEach((name, pose) -> at.put(name, Fields.pose(cylinders, pose)));
        Map<String, Object> map = new LinkedHashMap<>();
        map.put("range", range.map());
        map.put("at", at);
        map.put("holes", Math.max(0, answer.outline().size() - 1));
        map.put("notes", answer.notes());
        return map;
    }

    /** The answer as text. */
    public String text() {
        return "Working range\n" + TextTable.of(headings(), rows()) + notes();
    }

    private String notes() {
        StringBuilder notes = new StringBuilder();
        answer.notes().forEach(note -> notes.append("Note: ").append(note).append('\n'));
        return notes + closing();
    }

    private String closing() {
        if (answer.outline().isEmpty()) {
            return "The outline could not be closed, so that the level depth is missing; the other dimensions stand."
                    + " 'check' tells whether poses do not assemble or stand near a dead centre.\n";
        }
        int holes = answer.outline().size() - 1;
        return holes == 0 ? "" : "The reach of the tip has " + holes + (holes == 1 ? " hole" : " holes") + " in it.\n";
    }

    private List<String> headings() {
        return List.of("dimension", units.unit(Quantity.LENGTH).symbol(), "meaning");
    }

    private List<List<String>> rows() {
        List<List<String>> rows = new ArrayList<>();
        answer.dimensions()
                .forEach((name, value) -> rows.add(
                        List.of(name.replace('_', ' '), shown.cell(value, Quantity.LENGTH), MEANINGS.get(name))));
        return rows;
    }

    /** Writes {@code outline.csv}, a file for each hole, and the picture. */
    public void files(Path folder) {
        for (int i = 0; i < answer.outline().size(); i++) {
            double[][] ring = answer.outline().get(i);
            Table table = new Table(List.of(Column.of("x", Quantity.LENGTH), Column.of("y", Quantity.LENGTH)));
            for (int k = 0; k < ring[0].length; k++) {
                table.row(new double[] {ring[0][k], ring[1][k]});
            }
            String name = i == 0 ? "outline.csv" : "outline-hole-" + i + ".csv";
            TableFile.write(folder.resolve(name), table, units);
        }
        PictureFile.write(folder.resolve("envelope.png"), plot());
    }

    private Plot plot() {
        List<Series> series = new ArrayList<>();
        double[] drawn = front.drawnFractions();
        FrontSolver solver = new FrontSolver(front);
        solver.place(drawn);
        LinkagePicture picture = new LinkagePicture(PoseDrawing.of(solver.pose()), units);
        series.addAll(picture.series());
        for (double[][] ring : answer.outline()) {
            series.add(Series.line(
                    "", Palette.category(1), shown.all(ring[0], Quantity.LENGTH), shown.all(ring[1], Quantity.LENGTH)));
        }
        return new Plot(
                front.linkage().name() + ": working range of the tip",
                LinkagePicture.across(units),
                LinkagePicture.up(units),
                series,
                true,
                marks(solver));
    }

    private List<Mark> marks(FrontSolver solver) {
        List<Mark> marks = new ArrayList<>();
        for (String name : List.of("reach", "ground_reach", "depth", "cutting_height", "dump_height", "wall_depth")) {
            double[] at = answer.at().get(name);
            if (at != null) {
                solver.place(at);
                double x = units.of(front.tip().x(solver.pose()), Quantity.LENGTH);
                double y = units.of(front.tip().y(solver.pose()), Quantity.LENGTH);
                double value = units.of(answer.dimensions().get(name), Quantity.LENGTH);
                marks.add(new Mark.Label(x, y, name.replace('_', ' ') + " " + TextTable.number(Math.round(value))));
            }
        }
        return marks;
    }

    /** The section of the report page. */
    public void section(PageWriter page) {
        page.section(
                "Working range",
                "The line bounds all that the tip can reach; dimensions are exact, not read off a grid. " + notes());
        page.figure(plot(), "Outline of the tip, with the front as drawn.", PageWriter.DRAWING);
        page.table("", headings(), rows());
    }
}
