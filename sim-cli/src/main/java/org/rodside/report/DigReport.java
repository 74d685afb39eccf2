package org.rodside.report;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;
import org.rodside.chart.Bands;
import org.rodside.chart.Plot;
import org.rodside.io.CsvWriter;
import org.rodside.study.DigForce;
import org.rodside.study.DigSummary;
import org.rodside.study.Front;
import org.rodside.table.Column;
import org.rodside.table.RowSink;
import org.rodside.table.Table;
import org.rodside.units.Quantity;
import org.rodside.units.UnitSystem;

/** Digging forces told as JSON, text, pictures and a section of the report page. */
public final class DigReport {

    /** Poses in a picture: more only hide each other. */
    public static final int PICTURE_POSES = 15_000;

    private final Front front;
    private final UnitSystem units;
    private final Shown shown;
    private final List<String> cylinders;

    public DigReport(Front front, UnitSystem units) {
        this.front = front;
        this.units = units;
        shown = new Shown(units);
        cylinders = Shown.cylinders(front.linkage());
    }

    /** One pose as JSON; crowd is null where the linkage has no crowd cylinder. */
    public Map<String, Object> poseJson(DigForce curl, Optional<DigForce> crowd) {
        Map<String, Object> map = new LinkedHashMap<>();
        map.put("curl", force(curl).map());
        map.put("crowd", crowd.map(c -> force(c).map()).orElse(null));
        return map;
    }

    private Fields force(DigForce force) {
        return new Fields(units).put("force", Quantity.FORCE, force.force()).put("limit", force.limit());
    }

    private Map<String, Object> forceAt(DigForce force) {
        return force(force).put("at", Fields.pose(cylinders, force.at())).map();
    }

    /** Rated forces and what the sweep met, as JSON. */
    public Map<String, Object> json(DigForce curl, Optional<DigForce> crowd, DigSummary sweep) {
        Map<String, Object> rated = new LinkedHashMap<>();
        rated.put("curl", forceAt(curl));
        rated.put("crowd", crowd.map(this::forceAt).orElse(null));
        Map<String, Object> largest = new LinkedHashMap<>();
        largest.put("curl", sweep.curl().map(this::forceAt).orElse(null));
        largest.put("crowd", sweep.crowd().map(this::forceAt).orElse(null));
        Map<String, Object> map = new LinkedHashMap<>();
        map.put("rated", rated);
        map.put("largest", largest);
        map.put("poses", sweep.poses());
        map.put("assembled", sweep.assembled());
        return map;
    }

    /** One pose as text. */
    public String poseText(DigForce curl, Optional<DigForce> crowd) {
        List<List<String>> rows = new ArrayList<>();
        rows.add(row("curl", curl));
        crowd.ifPresent(c -> rows.add(row("crowd", c)));
        return front.linkage().name() + "\n\nLargest tool force on the ground at this pose\n"
                + TextTable.of(headings(), rows) + "\n" + Cautions.text();
    }

    private List<String> headings() {
        return List.of("duty", shown.heading("force", Quantity.FORCE), "limit that governs", "pose");
    }

    private List<String> row(String duty, DigForce force) {
        return List.of(
                duty, shown.cell(force.force(), Quantity.FORCE), force.limit(), Shown.pose(cylinders, force.at()));
    }

    /** Rated forces and what the sweep met, as text, without the cautions. */
    public String text(DigForce curl, Optional<DigForce> crowd, DigSummary sweep) {
        return "Rated digging forces (working pressure, weights and friction left out, other circuits held)\n"
                + TextTable.of(headings(), ratedRows(curl, crowd))
                + "\nLargest tool forces met in a sweep of " + sweep.poses()
                + " poses (weights, friction, tipping and slip " + (sweep.ideal() ? "left out" : "counted") + ")\n"
                + TextTable.of(headings(), sweepRows(sweep));
    }

    private List<List<String>> ratedRows(DigForce curl, Optional<DigForce> crowd) {
        List<List<String>> rows = new ArrayList<>();
        rows.add(row("curl", curl));
        crowd.ifPresent(c -> rows.add(row("crowd", c)));
        return rows;
    }

    private List<List<String>> sweepRows(DigSummary sweep) {
        List<List<String>> rows = new ArrayList<>();
        sweep.curl().ifPresent(c -> rows.add(row("curl", c)));
        sweep.crowd().ifPresent(c -> rows.add(row("crowd", c)));
        return rows;
    }

    /**
     * Writes {@code dig.csv} row by row while it is computed.
     *
     * @param columns columns of the rows
     * @param rows hands every row to the sink it is given
     */
    public void csv(Path folder, List<Column> columns, Consumer<RowSink> rows) {
        CsvWriter.write(folder.resolve("dig.csv"), columns, units, rows);
    }

    /** Writes the pictures of a (coarse) sweep. */
    public void pictures(Path folder, Table sweep) {
        PictureFile.write(folder.resolve("curl-force.png"), forces("curl", sweep));
        PictureFile.write(folder.resolve("curl-limit.png"), limits("curl", sweep));
        if (front.crowd() >= 0) {
            PictureFile.write(folder.resolve("crowd-force.png"), forces("crowd", sweep));
            PictureFile.write(folder.resolve("crowd-limit.png"), limits("crowd", sweep));
        }
    }

    private Plot forces(String duty, Table sweep) {
        String unit = units.unit(Quantity.FORCE).symbol();
        return new Plot(
                "Largest " + duty + " force by place of the tip",
                LinkagePicture.across(units),
                LinkagePicture.up(units),
                Bands.byValue(
                        lengths(sweep, "tip_x"),
                        lengths(sweep, "tip_y"),
                        shown.all(sweep.column(sweep.column(duty)), Quantity.FORCE),
                        unit),
                true,
                List.of());
    }

    private Plot limits(String duty, Table sweep) {
        int column = sweep.column(duty + "_limit");
        int[] word = new int[sweep.rows()];
        for (int i = 0; i < word.length; i++) {
            double index = sweep.at(i, column);
            word[i] = Double.isNaN(index) ? -1 : (int) index;
        }
        return new Plot(
                "What limits the " + duty + " force by place of the tip",
                LinkagePicture.across(units),
                LinkagePicture.up(units),
                Bands.byWord(
                        lengths(sweep, "tip_x"),
                        lengths(sweep, "tip_y"),
                        word,
                        sweep.columns().get(column).labels()),
                true,
                List.of());
    }

    private double[] lengths(Table sweep, String name) {
        return shown.all(sweep.column(sweep.column(name)), Quantity.LENGTH);
    }

    /** The section of the report page. */
    public void section(PageWriter page, DigForce curl, Optional<DigForce> crowd, DigSummary sweep, Table coarse) {
        page.section(
                "Digging forces",
                "Rated forces leave weights and friction out; the pictures count them, with tipping and slip.");
        page.table("Rated forces", headings(), ratedRows(curl, crowd));
        page.table("Largest forces met in " + sweep.poses() + " poses", headings(), sweepRows(sweep));
        page.figure(forces("curl", coarse), "Largest curl force by place of the tip.", PageWriter.DRAWING);
        page.figure(limits("curl", coarse), "What limits the curl force.", PageWriter.DRAWING);
        if (front.crowd() >= 0) {
            page.figure(forces("crowd", coarse), "Largest crowd force by place of the tip.", PageWriter.DRAWING);
            page.figure(limits("crowd", coarse), "What limits the crowd force.", PageWriter.DRAWING);
        }
    }
}
