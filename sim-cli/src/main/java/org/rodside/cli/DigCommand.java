package org.rodside.cli;

import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.rodside.io.LoadText;
import org.rodside.report.DigReport;
import org.rodside.study.DigForce;
import org.rodside.study.DigSummary;
import org.rodside.study.DigSweep;
import org.rodside.study.Digging;
import org.rodside.study.Edge;
import org.rodside.study.Front;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** The command {@code dig}. */
@Command(
        name = "dig",
        mixinStandardHelpOptions = true,
        description = "Digging forces: rated, over the whole stroke box, or at one pose.",
        footer = {
            "",
            "Examples:",
            "  rodside dig linkages/sallow-22.json --steps 41",
            "  rodside dig linkages/sallow-22.json --at boom=0.4,stick=0.5,bucket=0.3"
        })
final class DigCommand implements Callable<Integer> {

    static final int USUAL_STEPS = 25;

    @Mixin
    private LinkageFile file;

    @Mixin
    private PoseArgument pose;

    @Mixin
    private CommonOptions common;

    @Option(names = "--steps", paramLabel = "N", description = "Grid points on each stroke, 2 or more. Default: 25")
    private String steps;

    @Option(
            names = "--edge",
            paramLabel = "tip|lip",
            description = "Where the force acts: outermost cutting point or cutting edge. Default: tip")
    private Edge edge = Edge.TIP;

    @Option(
            names = "--ideal",
            description = "Leave weights, friction, back pressure, tipping and slip out, as rated forces do.")
    private boolean ideal;

    @Override
    public Integer call() {
        Front front = Front.of(file.read(common));
        front.tool();
        DigReport report = new DigReport(front, common.units());
        Optional<double[]> at = pose.fractions(front.linkage());
        return at.isPresent() ? onePose(front, report, at.get()) : sweep(front, report);
    }

    private int onePose(Front front, DigReport report, double[] fractions) {
        Digging digging = new Digging(front, edge);
        DigForce curl = digging.curlAt(fractions, ideal);
        Optional<DigForce> crowd = digging.crowdAt(fractions, ideal);
        common.tell(() -> report.poseJson(curl, crowd), () -> report.poseText(curl, crowd));
        return ExitStatus.DONE;
    }

    private int sweep(Front front, DigReport report) {
        DigSweep sweep = new DigSweep(front, edge, ideal, DigSweep.steps(front, countSteps()));
        Digging digging = new Digging(front, edge);
        DigForce curl = digging.ratedCurl();
        Optional<DigForce> crowd = digging.ratedCrowd();
        DigSummary summary = summary(sweep);
        common.folder(file.path()).ifPresent(folder -> files(front, report, sweep, folder));
        common.tell(front, () -> report.json(curl, crowd, summary), () -> report.text(curl, crowd, summary));
        return ExitStatus.DONE;
    }

    private DigSummary summary(DigSweep sweep) {
        try (Progress progress = common.progress("digging forces")) {
            return sweep.summary(common.threads(), progress);
        }
    }

    private int countSteps() {
        int count = LoadText.count("--steps", Optional.ofNullable(steps), DigSweep.MOST_STEPS);
        return count == 0 ? USUAL_STEPS : count;
    }

    private void files(Front front, DigReport report, DigSweep sweep, Path folder) {
        try (Progress progress = common.progress("dig.csv")) {
            report.csv(folder, sweep.columns(), rows -> sweep.rows(rows, common.threads(), progress));
        }
        report.pictures(folder, DigSweep.coarse(front, edge, ideal, DigReport.PICTURE_POSES, common.threads()));
    }
}
