package org.rodside.cli;

import org.rodside.report.CheckReport;
import org.rodside.study.Closure;

/** How the linkage closes, as part of {@code study}. */
final class CheckPart implements StudyPart {

    @Override
    public String name() {
        return "check";
    }

    @Override
    public Told tell(Desk desk) {
        CheckReport report = new CheckReport(
                desk.front(),
                Closure.of(desk.front(), Closure.usualSteps(desk.front())),
                desk.common().units());
        report.section(desk.page());
        return new Told(report.json(), report.brief());
    }
}
