package org.rodside.cli;

import java.util.Optional;
import java.util.concurrent.Callable;
import org.rodside.io.LoadText;
import org.rodside.report.CheckReport;
import org.rodside.study.Closure;
import org.rodside.study.ClosureAnswer;
import org.rodside.study.DigSweep;
import org.rodside.study.Front;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** The command {@code check}. */
@Command(
        name = "check",
        mixinStandardHelpOptions = true,
        description = "Reads and validates a linkage and assembles it over the whole stroke box.",
        footer = {
            "",
            "Poses that do not assemble are a finding: the exit status is 0 all the same.",
            "",
            "Example:",
            "  rodside check linkages/sallow-22.json"
        })
final class CheckCommand implements Callable<Integer> {

    @Mixin
    private LinkageFile file;

    @Mixin
    private CommonOptions common;

    @Option(
            names = "--steps",
            paramLabel = "N",
            description = "Grid points on each stroke. Default: 21, or fewer where there are many cylinders")
    private String steps;

    @Override
    public Integer call() {
        Front front = Front.of(file.read(common));
        int asked = LoadText.count("--steps", Optional.ofNullable(steps), 1000);
        ClosureAnswer answer = Closure.of(front, asked == 0 ? Closure.usualSteps(front) : DigSweep.steps(front, asked));
        CheckReport report = new CheckReport(front, answer, common.units());
        common.tell(report::json, report::text);
        return ExitStatus.DONE;
    }
}
