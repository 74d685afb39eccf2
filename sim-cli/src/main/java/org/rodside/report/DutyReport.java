package org.rodside.report;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.rodside.chart.Palette;
import org.rodside.chart.Plot;
import org.rodside.chart.Series;
import org.rodside.study.Front;
import org.rodside.study.FrontSolver;
import org.rodside.study.HistoryAccumulator;
import org.rodside.study.HistoryQuestion;
import org.rodside.table.Table;
import org.rodside.units.Quantity;
import org.rodside.units.UnitSystem;

/** A made duty told as JSON, text, a table and pictures. */
public final class DutyReport {

    private final Front front;
    private final Table duty;
    private final HistoryAccumulator met;
    private final UnitSystem units;
    private final Shown shown;

    public DutyReport(Front front, Table duty, HistoryAccumulator met, UnitSystem units) {
        this.front = front;
        this.duty = duty;
        this.met = met;
        this.units = units;
        shown = new Shown(units);
    }

    private HistoryReport history() {
        return new HistoryReport(met, new HistoryQuestion(false, false, Double.POSITIVE_INFINITY), units);
    }

    /** The summary as a JSON tree. */
    public Map<String, Object> json() {
        Map<String, Object> map = new LinkedHashMap<>(history().json());
        map.put("follows", met.excesses().isEmpty());
        return map;
    }

    /** The summary as text. */
    public String text() {
        return (met.excesses().isEmpty()
                        ? "Every cylinder can give the force, and the pump the flow where one was named.\n"
                        : "The pass asks for more than there is; see the lines 'Exceeded' below.\n")
                + history().text();
    }

    /** Writes {@code duty.csv} and the pictures of path and forces. */
    public void files(Path folder) {
        TableFile.write(folder.resolve("duty.csv"), duty, units);
        PictureFile.write(folder.resolve("path.png"), path());
        PictureFile.write(folder.resolve("tip-force.png"), tipForce());
    }

    /** The section of the report page. */
    public void section(PageWriter page) {
        page.section(
                "A pass",
                "From waypoints to duty, load history and cycles; the rows are in duty.csv, history.csv, cycles.csv.");
        page.figure(path(), "Path of the tip.", PageWriter.DRAWING);
        page.figure(tipForce(), "Force of the ground on the tip.", PageWriter.DRAWING);
        history().tables(page);
    }

    private Plot path() {
        FrontSolver solver = new FrontSolver(front);
        double[] x = new double[duty.rows()];
        double[] y = new double[duty.rows()];
        double[] at = new double[front.mechanism().cylinders()];
        for (int row = 0; row < duty.rows(); row++) {
            for (int c = 0; c < at.length; c++) {
                at[c] = duty.at(row, 1 + c);
            }
            solver.place(at);
            x[row] = units.of(front.tip().x(solver.pose()), Quantity.LENGTH);
            y[row] = units.of(front.tip().y(solver.pose()), Quantity.LENGTH);
        }
        LinkagePicture picture = new LinkagePicture(PoseDrawing.of(solver.pose()), units);
        List<Series> series = new ArrayList<>(picture.series());
        series.add(Series.line("path of the tip", Palette.category(1), x, y));
        return new Plot(
                "Path of the tip",
                LinkagePicture.across(units),
                LinkagePicture.up(units),
                series,
                true,
                picture.marks());
    }

    private Plot tipForce() {
        double[] time = duty.column(0);
        int first = 1 + front.mechanism().cylinders();
        String unit = units.unit(Quantity.FORCE).symbol();
        return new Plot(
                "Force of the ground on the tip",
                "time, s",
                "force, " + unit,
                List.of(
                        Series.line(
                                "forward", Palette.category(0), time, shown.all(duty.column(first), Quantity.FORCE)),
                        Series.line(
                                "up", Palette.category(1), time, shown.all(duty.column(first + 1), Quantity.FORCE))),
                false,
                List.of());
    }
}
