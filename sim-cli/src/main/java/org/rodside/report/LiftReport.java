package org.rodside.report;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;
import org.rodside.chart.Bands;
import org.rodside.chart.Mark;
import org.rodside.chart.Plot;
import org.rodside.chart.Series;
import org.rodside.study.Front;
import org.rodside.study.FrontSolver;
import org.rodside.study.LiftPoint;
import org.rodside.study.LiftQuestion;
import org.rodside.study.LimitSolver;
import org.rodside.table.Column;
import org.rodside.table.Table;
import org.rodside.units.Quantity;
import org.rodside.units.UnitSystem;

/** Lift capacity told as JSON, text, a table, a picture and a section of the report page. */
public final class LiftReport {

    private static final List<String> LIMITS = List.of("hydraulic", "tipping");

    private final Front front;
    private final LiftQuestion question;
    private final List<LiftPoint> points;
    private final UnitSystem units;
    private final Shown shown;
    private final List<String> cylinders;

    public LiftReport(Front front, LiftQuestion question, List<LiftPoint> points, UnitSystem units) {
        this.front = front;
        this.question = question;
        this.points = List.copyOf(points);
        this.units = units;
        shown = new Shown(units);
        cylinders = Shown.cylinders(front.linkage());
    }

    /** All points as a table. */
    public Table table() {
        List<String> names = new LimitSolver(front, front.hoist(), false).names();
        List<Column> columns = new ArrayList<>(List.of(
                Column.of("radius", Quantity.LENGTH),
                Column.of("height", Quantity.LENGTH),
                Column.of("rated", Quantity.MASS),
                Column.words("limit", LIMITS),
                Column.of("hydraulic", Quantity.MASS),
                Column.words("hydraulic_limit", names),
                Column.of("tipping", Quantity.MASS)));
        cylinders.forEach(name -> columns.add(Column.of(name + ".fraction", Quantity.NONE)));
        Table table = new Table(columns);
        for (LiftPoint point : points) {
            double[] row = new double[columns.size()];
            row[0] = point.radius();
            row[1] = point.height();
            row[2] = point.rated();
            row[3] = LIMITS.indexOf(point.limit());
            row[4] = point.hydraulic();
            row[5] = names.indexOf(point.hydraulicLimit());
            row[6] = point.tipping();
            System.arraycopy(point.at(), 0, row, 7, point.at().length);
            table.row(row);
        }
        return table;
    }

    /** The chart as a JSON tree. */
    public Map<String, Object> json() {
        Fields fields = new Fields(units)
                .put("grid", Quantity.LENGTH, question.step())
                .put("over", question.overSide() ? "side" : "front")
                .put("bare", question.bare());
        LiftPoint largest = largest();
        fields.put("largest", largest == null ? null : pointJson(largest));
        fields.put("points", points.stream().map(this::pointJson).toList());
        fields.put("cautions", Cautions.estimates());
        return fields.map();
    }

    private Map<String, Object> pointJson(LiftPoint point) {
        Map<String, Object> map = new LinkedHashMap<>(new Fields(units)
                .put("radius", Quantity.LENGTH, point.radius())
                .put("height", Quantity.LENGTH, point.height())
                .put("rated", Quantity.MASS, point.rated())
                .put("limit", point.limit())
                .put("hydraulic", Quantity.MASS, point.hydraulic())
                .put("hydraulic_limit", point.hydraulicLimit())
                .put("tipping", Quantity.MASS, point.tipping())
                .put("at", Fields.pose(cylinders, point.at()))
                .map());
        return map;
    }

    private LiftPoint largest() {
        LiftPoint largest = null;
        for (LiftPoint point : points) {
            largest = largest == null || point.rated() > largest.rated() ? point : largest;
        }
        return largest;
    }

    /** The chart as text: radius across, height down, h where hydraulics and t where tipping sets the load. */
    public String text() {
        String length = units.unit(Quantity.LENGTH).symbol();
        return "Rated lift at the hook over the " + (question.overSide() ? "side" : "front")
                + (question.bare() ? ", tool link removed" : "") + "; "
                + units.unit(Quantity.MASS).symbol()
                + ", h = set by hydraulics, t = by tipping\n" + TextTable.of(headings(), rows())
                + "Radius across from the swing axis, height of the hook above ground down; both in " + length
                + ".\nThe smaller of 87 % of the hydraulic and 75 % of the tipping load (ISO 10567), at rest on firm,"
                + " level ground; the weight of slings and hooks counts as load.\n";
    }

    private List<String> headings() {
        List<String> headings = new ArrayList<>(List.of("height"));
        radii().forEach(radius -> headings.add(shown.cell(radius, Quantity.LENGTH)));
        return headings;
    }

    private List<Double> radii() {
        TreeSet<Double> radii = new TreeSet<>();
        points.forEach(point -> radii.add(point.radius()));
        return List.copyOf(radii);
    }

    private List<List<String>> rows() {
        TreeSet<Double> heights = new TreeSet<>();
        points.forEach(point -> heights.add(point.height()));
        List<List<String>> rows = new ArrayList<>();
        for (double height : heights.descendingSet()) {
            List<String> row = new ArrayList<>(List.of(shown.cell(height, Quantity.LENGTH)));
            for (double radius : radii()) {
                row.add(cell(radius, height));
            }
            rows.add(row);
        }
        return rows;
    }

    private String cell(double radius, double height) {
        for (LiftPoint point : points) {
            if (point.radius() == radius && point.height() == height) {
                return shown(point);
            }
        }
        return "";
    }

    private String shown(LiftPoint point) {
        return TextTable.number(Math.floor(units.of(point.rated(), Quantity.MASS)))
                + (point.limit().equals("tipping") ? " t" : " h");
    }

    /** Writes {@code lift.csv} and the picture. */
    public void files(Path folder) {
        TableFile.write(folder.resolve("lift.csv"), table(), units);
        PictureFile.write(folder.resolve("lift.png"), plot());
    }

    private Plot plot() {
        double[] x = new double[points.size()];
        double[] y = new double[points.size()];
        int[] word = new int[points.size()];
        List<Mark> marks = new ArrayList<>();
        for (int i = 0; i < x.length; i++) {
            LiftPoint point = points.get(i);
            x[i] = units.of(point.radius(), Quantity.LENGTH);
            y[i] = units.of(point.height(), Quantity.LENGTH);
            word[i] = LIMITS.indexOf(point.limit());
            marks.add(new Mark.Label(x[i], y[i], TextTable.number(Math.floor(units.of(point.rated(), Quantity.MASS)))));
        }
        List<Series> series = new ArrayList<>();
        LiftPoint largest = largest();
        if (largest != null) {
            FrontSolver solver = new FrontSolver(front);
            solver.place(largest.at());
            series.addAll(new LinkagePicture(PoseDrawing.of(solver.pose()), units).series());
        }
        series.addAll(Bands.byWord(x, y, word, List.of("set by hydraulics", "set by tipping")));
        return new Plot(
                "Rated lift at the hook over the " + (question.overSide() ? "side" : "front") + ", "
                        + units.unit(Quantity.MASS).symbol(),
                LinkagePicture.across(units),
                LinkagePicture.up(units),
                series,
                true,
                marks);
    }

    /** The section of the report page. */
    public void section(PageWriter page) {
        page.section(
                "Lift",
                "Rated lift at the hook over the " + (question.overSide() ? "side" : "front")
                        + ": the smaller of 87 % of the hydraulic and 75 % of the tipping load (ISO 10567).");
        page.figure(plot(), "Rated lift in " + units.unit(Quantity.MASS).symbol() + ".", PageWriter.DRAWING);
        page.table("h = set by hydraulics, t = set by tipping; height down, radius across", headings(), rows());
        page.note("Not a rated-load chart. Slings and hooks count as load.");
    }
}
