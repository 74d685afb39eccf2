package org.rodside.cli;

import org.rodside.report.LoadsReport;
import org.rodside.study.LoadsAnswer;

/** Worst loads as part of {@code study}. */
final class LoadsPart implements StudyPart {

    @Override
    public String name() {
        return "loads";
    }

    @Override
    public Told tell(Desk desk) {
        LoadsAnswer answer = desk.loads().get();
        LoadsReport report = new LoadsReport(desk.front(), answer, desk.common().units());
        desk.folder().ifPresent(folder -> {
            report.files(folder);
            report.section(desk.page());
        });
        return new Told(report.json(), report.text());
    }
}
