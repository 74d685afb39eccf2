package org.rodside.cli;

import org.rodside.report.EnvelopeReport;
import org.rodside.study.WorkingRange;

/** Working range as part of {@code study}. */
final class EnvelopePart implements StudyPart {

    @Override
    public String name() {
        return "envelope";
    }

    @Override
    public Told tell(Desk desk) {
        EnvelopeReport report = new EnvelopeReport(
                desk.front(),
                WorkingRange.of(desk.front(), desk.common().threads()),
                desk.common().units());
        desk.folder().ifPresent(folder -> {
            report.files(folder);
            report.section(desk.page());
        });
        return new Told(report.json(), report.text());
    }
}
