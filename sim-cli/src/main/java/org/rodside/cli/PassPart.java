package org.rodside.cli;

import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;
import org.rodside.io.CsvWriter;
import org.rodside.model.DutyPass;
import org.rodside.model.InputException;
import org.rodside.report.CyclesReport;
import org.rodside.report.DutyReport;
import org.rodside.study.CycleTables;
import org.rodside.study.DutyMaker;
import org.rodside.study.Front;
import org.rodside.study.PassRun;
import org.rodside.table.Table;
import org.rodside.units.UnitSystem;

/** A pass taken from waypoints to duty, history and cycles, as part of {@code study}. */
final class PassPart implements StudyPart {

    @Override
    public String name() {
        return "pass";
    }

    /** The pass that goes with a linkage file where none is named: {@code <stem>-pass.json} beside it. */
    static Path usual(Path linkage) {
        return linkage.resolveSibling(CommonOptions.stem(linkage) + "-pass.json");
    }

    @Override
    public Told tell(Desk desk) {
        Front front = desk.front();
        UnitSystem units = desk.common().units();
        DutyPass pass = desk.pass()
                .orElseThrow(() -> new InputException(
                        desk.passFile() + ": there is no such file; name a pass with --pass PASS.json"));
        Table duty = DutyMaker.make(front, pass);
        PassRun run = run(desk, duty);
        DutyReport report = new DutyReport(front, duty, run.met(), units);
        desk.folder().ifPresent(folder -> {
            CycleTables tables = new CycleTables(run.cycles());
            CsvWriter.write(folder.resolve("cycles.csv"), tables.cycleColumns(), units, tables::cycles);
            report.files(folder);
            report.section(desk.page());
        });
        Map<String, Object> json = new LinkedHashMap<>();
        json.put("history", report.json());
        json.put("cycles", new CyclesReport(run.cycles()).json());
        return new Told(
                json,
                "A pass from " + desk.passFile().getFileName() + "\n" + report.text() + "\n"
                        + new CyclesReport(run.cylinders()).text());
    }

    private static PassRun run(Desk desk, Table duty) {
        Front front = desk.front();
        UnitSystem units = desk.common().units();
        PassRun[] made = new PassRun[1];
        desk.folder()
                .ifPresentOrElse(
                        folder -> CsvWriter.write(
                                folder.resolve("history.csv"),
                                PassRun.columns(front),
                                units,
                                sink -> made[0] = PassRun.of(front, duty, units, sink)),
                        () -> made[0] = PassRun.of(front, duty, units, row -> {}));
        return made[0];
    }
}
