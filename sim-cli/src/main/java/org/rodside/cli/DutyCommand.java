package org.rodside.cli;

import java.nio.file.Path;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import org.rodside.io.DutyPassReader;
import org.rodside.io.LoadText;
import org.rodside.report.DutyReport;
import org.rodside.study.DutyMaker;
import org.rodside.study.Front;
import org.rodside.table.Table;
import org.rodside.units.Unit;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** The command {@code duty}. */
@Command(
        name = "duty",
        mixinStandardHelpOptions = true,
        description = "Makes a duty file from waypoints of the tip and the resistance of the ground.",
        footer = {"", "Example:", "  rodside duty linkages/sallow-22.json linkages/sallow-22-pass.json --pump 440"})
final class DutyCommand implements Callable<Integer> {

    @Mixin
    private LinkageFile file;

    @Parameters(index = "1", paramLabel = "PASS.json", description = "The pass: waypoints, timing, ground.")
    private Path pass;

    @Mixin
    private CommonOptions common;

    @Option(
            names = "--pump",
            paramLabel = "L/MIN",
            description = "Flow the pump can give; more is reported with time; in L/min.")
    private String pump;

    @Override
    public Integer call() {
        OptionalDouble flow = LoadText.above("--pump", Optional.ofNullable(pump), Unit.LITRE_PER_MINUTE);
        Front front = Front.of(file.read(common));
        Table duty = DutyMaker.make(front, DutyPassReader.read(pass, front.linkage()));
        DutyReport report = new DutyReport(
                front, duty, DutyMaker.judge(front, duty, flow.orElse(Double.POSITIVE_INFINITY)), common.units());
        common.folder(pass).ifPresent(report::files);
        common.tell(front, report::json, report::text);
        return ExitStatus.DONE;
    }
}
