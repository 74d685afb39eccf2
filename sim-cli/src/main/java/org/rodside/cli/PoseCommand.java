package org.rodside.cli;

import java.util.Optional;
import java.util.concurrent.Callable;
import org.rodside.io.LoadText;
import org.rodside.io.PoseText;
import org.rodside.model.InputException;
import org.rodside.report.PoseReport;
import org.rodside.study.Front;
import org.rodside.study.PoseQuestion;
import org.rodside.study.PoseStudy;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** The command {@code pose}. */
@Command(
        name = "pose",
        mixinStandardHelpOptions = true,
        description = "One pose: places, cylinder forces and pressures, bearing forces, ground reaction.",
        footer = {
            "",
            "Example:",
            "  rodside pose linkages/sallow-22.json --at boom=0.4,stick=0.5,bucket=0.3 --payload 1500"
        })
final class PoseCommand implements Callable<Integer> {

    @Mixin
    private LinkageFile file;

    @Mixin
    private PoseArgument pose;

    @Mixin
    private CommonOptions common;

    @Option(names = "--force", paramLabel = "X,Y", description = "Force of the ground on the tip; in kN.")
    private String force;

    @Option(names = "--payload", paramLabel = "KG", description = "Payload at the fill point; in kg.")
    private String payload;

    @Option(
            names = "--drive",
            paramLabel = "CYL",
            description = "Cylinder that moves: its pressure overcomes its friction too.")
    private String drive;

    @Option(
            names = "--directions",
            paramLabel = "N",
            description = "Add the force polygon: the largest holding force in N directions.")
    private String directions;

    @Override
    public Integer call() {
        Front front = Front.of(file.read(common));
        double[] fractions = pose.fractions(front.linkage())
                .orElseThrow(() -> new InputException("--at: the pose is missing; give a fraction of stroke for each"
                        + " cylinder, for example --at " + PoseText.example(front.linkage())));
        double[] tip = LoadText.force("--force", Optional.ofNullable(force));
        PoseQuestion question = new PoseQuestion(
                fractions,
                tip[0],
                tip[1],
                LoadText.mass("--payload", Optional.ofNullable(payload)),
                drive == null ? -1 : PoseText.cylinder("--drive", drive, front.linkage()),
                LoadText.count("--directions", Optional.ofNullable(directions), 3600));
        PoseReport report = new PoseReport(PoseStudy.answer(front, question), common.units());
        common.folder(file.path()).ifPresent(report::files);
        common.tell(report::json, report::text);
        return ExitStatus.DONE;
    }
}
