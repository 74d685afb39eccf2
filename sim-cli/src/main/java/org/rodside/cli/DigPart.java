package org.rodside.cli;

import java.util.Optional;
import org.rodside.report.DigReport;
import org.rodside.study.DigForce;
import org.rodside.study.DigSummary;
import org.rodside.study.DigSweep;
import org.rodside.study.Digging;
import org.rodside.study.Edge;
import org.rodside.study.Front;
import org.rodside.table.Table;

/** Digging forces as part of {@code study}. */
final class DigPart implements StudyPart {

    @Override
    public String name() {
        return "dig";
    }

    @Override
    public Told tell(Desk desk) {
        Front front = desk.front();
        front.tool();
        int threads = desk.common().threads();
        DigSweep sweep = new DigSweep(front, Edge.TIP, false, DigSweep.steps(front, DigCommand.USUAL_STEPS));
        Digging digging = new Digging(front, Edge.TIP);
        DigForce curl = digging.ratedCurl();
        Optional<DigForce> crowd = digging.ratedCrowd();
        DigSummary summary = sweep.summary(threads, done -> {});
        DigReport report = new DigReport(front, desk.common().units());
        desk.folder().ifPresent(folder -> {
            Table coarse = DigSweep.coarse(front, Edge.TIP, false, DigReport.PICTURE_POSES, threads);
            report.csv(folder, sweep.columns(), rows -> sweep.rows(rows, threads, done -> {}));
            report.pictures(folder, coarse);
            report.section(desk.page(), curl, crowd, summary, coarse);
        });
        return new Told(report.json(curl, crowd, summary), report.text(curl, crowd, summary));
    }
}
