package org.rodside.cli;

import java.util.List;
import java.util.Optional;
import org.rodside.io.PoseText;
import org.rodside.report.LiftReport;
import org.rodside.study.LiftCapacity;
import org.rodside.study.LiftPoint;
import org.rodside.study.LiftQuestion;

/** Lift capacity as part of {@code study}. */
final class LiftPart implements StudyPart {

    @Override
    public String name() {
        return "lift";
    }

    @Override
    public Told tell(Desk desk) {
        desk.front().tool();
        LiftQuestion question = new LiftQuestion(
                LiftCommand.usualStep(desk.common().units()),
                PoseText.others("--at", Optional.empty(), desk.front().linkage(), 1),
                false,
                false);
        List<LiftPoint> points =
                LiftCapacity.chart(desk.front(), question, desk.common().threads(), done -> {});
        LiftReport report =
                new LiftReport(desk.front(), question, points, desk.common().units());
        desk.folder().ifPresent(folder -> {
            report.files(folder);
            report.section(desk.page());
        });
        return new Told(report.json(), report.text());
    }
}
