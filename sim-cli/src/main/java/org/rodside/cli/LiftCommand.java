package org.rodside.cli;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import org.rodside.io.LoadText;
import org.rodside.io.PoseText;
import org.rodside.report.LiftReport;
import org.rodside.study.Front;
import org.rodside.study.LiftCapacity;
import org.rodside.study.LiftPoint;
import org.rodside.study.LiftQuestion;
import org.rodside.units.Quantity;
import org.rodside.units.Unit;
import org.rodside.units.UnitSystem;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** The command {@code lift}. */
@Command(
        name = "lift",
        mixinStandardHelpOptions = true,
        description = "Lift capacity at the hook over a grid of radius and height. Not a rated-load chart.",
        footer = {"", "Example:", "  rodside lift linkages/sallow-22.json --over side --bare"})
final class LiftCommand implements Callable<Integer> {

    /** Which tipping line counts. */
    enum Over {
        FRONT,
        SIDE
    }

    @Mixin
    private LinkageFile file;

    @Mixin
    private CommonOptions common;

    @Option(
            names = "--grid",
            paramLabel = "STEP",
            description = "Grid step; in the unit of the output. Default: 1500 mm, or 60 in in us")
    private String grid;

    @Option(
            names = "--curl",
            paramLabel = "FRACTION",
            description = "Fraction of stroke of the curl cylinder. Default: 1, extended")
    private String curl;

    @Option(
            names = "--at",
            paramLabel = "POSE",
            description = "Fractions of stroke of cylinders that neither hoist, crowd nor curl. Default: 0.5 each")
    private String others;

    @Option(names = "--over", paramLabel = "front|side", description = "Tipping line. Default: front")
    private Over over = Over.FRONT;

    @Option(names = "--bare", description = "Leave out the mass of the tool link.")
    private boolean bare;

    @Override
    public Integer call() {
        Front front = Front.of(file.read(common));
        LiftQuestion question = new LiftQuestion(
                LoadText.above(
                                "--grid",
                                Optional.ofNullable(grid),
                                common.units().unit(Quantity.LENGTH))
                        .orElse(usualStep(common.units())),
                PoseText.others("--at", Optional.ofNullable(others), front.linkage(), curlFraction()),
                over == Over.SIDE,
                bare);
        List<LiftPoint> points;
        try (Progress progress = common.progress("lift")) {
            points = LiftCapacity.chart(front, question, common.threads(), progress);
        }
        LiftReport report = new LiftReport(front, question, points, common.units());
        common.folder(file.path()).ifPresent(report::files);
        common.tell(front, report::json, report::text);
        return ExitStatus.DONE;
    }

    static double usualStep(UnitSystem units) {
        return units == UnitSystem.US ? Unit.INCH.toSi(60) : Unit.MILLIMETRE.toSi(1500);
    }

    private double curlFraction() {
        OptionalDouble fraction =
                curl == null ? OptionalDouble.empty() : OptionalDouble.of(PoseText.fraction("--curl", curl));
        return fraction.orElse(1);
    }
}
