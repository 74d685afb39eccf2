package org.rodside.cli;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import org.rodside.io.LoadText;
import org.rodside.report.SizeReport;
import org.rodside.study.Front;
import org.rodside.study.LoadsAnswer;
import org.rodside.study.SizeQuestion;
import org.rodside.study.SizeRow;
import org.rodside.study.Sizing;
import org.rodside.study.WorstLoads;
import org.rodside.units.Quantity;
import org.rodside.units.Unit;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** The command {@code size}. */
@Command(
        name = "size",
        mixinStandardHelpOptions = true,
        description = "Standard bores and rods that would carry the worst loads, and what the present cylinders need.",
        footer = {
            "",
            "Examples:",
            "  rodside size linkages/sallow-22.json --pressure 380 --factor 3",
            "  rodside size linkages/sallow-22.json --column loaded --eccentricity 3"
        })
final class SizeCommand implements Callable<Integer> {

    @Mixin
    private LinkageFile file;

    @Mixin
    private CommonOptions common;

    @Mixin
    private LoadsCommand.CaseOptions caseOptions;

    @Option(
            names = "--pressure",
            paramLabel = "P",
            description = "Pressure the loads may ask for; in the unit of the output. Default: working pressure")
    private String pressure;

    @Option(names = "--factor", paramLabel = "F", description = "Least buckling factor. Default: 3.5")
    private String factor;

    @Option(names = "--speed", paramLabel = "V", description = "Speed for the flows; in mm/s. Default: 300")
    private String speed;

    /** How the column is judged. */
    enum ColumnRule {
        PLAIN,
        LOADED
    }

    @Option(
            names = "--column",
            paramLabel = "plain|loaded",
            description = "loaded adds the column with its own weight, limited by rod stress. Default: plain")
    private ColumnRule column = ColumnRule.PLAIN;

    @Option(
            names = "--eccentricity",
            paramLabel = "E",
            description = "Add the loaded column: own weight, load off centre by E at both pins, limited by rod stress;"
                    + " in mm.")
    private String eccentricity;

    @Override
    public Integer call() {
        SizeQuestion question = question();
        Front front = Front.of(file.read(common));
        List<SizeRow> rows;
        try (Progress progress = common.progress("sizes")) {
            LoadsAnswer loads = WorstLoads.find(front, caseOptions.cases(front), common.threads(), progress);
            rows = Sizing.find(front, loads, question, common.threads(), progress);
        }
        SizeReport report = new SizeReport(front, question, rows, common.units());
        common.folder(file.path()).ifPresent(report::files);
        common.tell(front, report::json, report::text);
        return ExitStatus.DONE;
    }

    private SizeQuestion question() {
        return new SizeQuestion(
                LoadText.above(
                        "--pressure",
                        Optional.ofNullable(pressure),
                        common.units().unit(Quantity.PRESSURE)),
                LoadText.above("--factor", Optional.ofNullable(factor), Unit.ONE)
                        .orElse(SizeQuestion.USUAL_FACTOR),
                LoadText.above("--speed", Optional.ofNullable(speed), Unit.MILLIMETRE_PER_SECOND)
                        .orElse(SizeQuestion.USUAL_SPEED),
                eccentricity());
    }

    private OptionalDouble eccentricity() {
        if (eccentricity == null) {
            return column == ColumnRule.LOADED ? OptionalDouble.of(0) : OptionalDouble.empty();
        }
        return OptionalDouble.of(LoadText.notBelow("--eccentricity", eccentricity, Unit.MILLIMETRE));
    }
}
