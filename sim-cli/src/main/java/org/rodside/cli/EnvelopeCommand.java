package org.rodside.cli;

import java.util.concurrent.Callable;
import org.rodside.report.EnvelopeReport;
import org.rodside.study.Front;
import org.rodside.study.WorkingRange;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;

/** The command {@code envelope}. */
@Command(
        name = "envelope",
        mixinStandardHelpOptions = true,
        description = "Working range: the true outline of the tip and the named dimensions.",
        footer = {"", "Example:", "  rodside envelope linkages/sallow-22.json"})
final class EnvelopeCommand implements Callable<Integer> {

    @Mixin
    private LinkageFile file;

    @Mixin
    private CommonOptions common;

    @Override
    public Integer call() {
        Front front = Front.of(file.read(common));
        EnvelopeReport report = new EnvelopeReport(front, WorkingRange.of(front, common.threads()), common.units());
        common.folder(file.path()).ifPresent(report::files);
        common.tell(front, report::json, report::text);
        return ExitStatus.DONE;
    }
}
