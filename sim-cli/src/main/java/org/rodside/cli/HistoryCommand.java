package org.rodside.cli;

import java.nio.file.Path;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import org.rodside.io.CsvWriter;
import org.rodside.io.DutySource;
import org.rodside.io.LoadText;
import org.rodside.report.HistoryReport;
import org.rodside.study.Front;
import org.rodside.study.History;
import org.rodside.study.HistoryAccumulator;
import org.rodside.study.HistoryQuestion;
import org.rodside.units.Unit;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** The command {@code history}. */
@Command(
        name = "history",
        mixinStandardHelpOptions = true,
        description = "Load history of a duty: cylinder and bearing forces, pressures and flows, row by row.",
        footer = {
            "",
            "Example:",
            "  rodside history linkages/sallow-22.json results/sallow-22-pass/duty/duty.csv --pump 440"
        })
final class HistoryCommand implements Callable<Integer> {

    @Mixin
    private LinkageFile file;

    @Parameters(
            index = "1",
            paramLabel = "DUTY.csv",
            description = "Motion and loads over time; - for standard input, .gz packed.")
    private String duty;

    @Mixin
    private CommonOptions common;

    @Option(names = "--static", description = "Leave inertia out.")
    private boolean atRest;

    @Option(
            names = "--pump",
            paramLabel = "L/MIN",
            description = "Flow the pump can give; more is reported with time; in L/min.")
    private String pump;

    @Option(
            names = "--to",
            paramLabel = "FILE",
            description =
                    "Write the rows here instead of history.csv in the folder: .gz packs them, - is standard output.")
    private String to;

    @Override
    public Integer call() {
        OptionalDouble flow = LoadText.above("--pump", Optional.ofNullable(pump), Unit.LITRE_PER_MINUTE);
        Front front = Front.of(file.read(common));
        try (DutySource source = new DutySource(duty, front.linkage())) {
            HistoryQuestion question =
                    new HistoryQuestion(source.measured(), atRest, flow.orElse(Double.POSITIVE_INFINITY));
            HistoryAccumulator met = run(source, new History(front, question));
            HistoryReport report = new HistoryReport(met, question, common.units());
            if (common.json() || !"-".equals(to)) {
                common.tell(front, report::json, report::text);
            }
        }
        return ExitStatus.DONE;
    }

    private HistoryAccumulator run(DutySource source, History history) {
        if ("-".equals(to) && !common.json()) {
            CsvWriter writer = new CsvWriter(System.out, history.columns(), common.units());
            HistoryAccumulator met = history.run(source, writer, time -> {});
            writer.close();
            return met;
        }
        Optional<Path> target = to == null || "-".equals(to)
                ? common.folder(Path.of(duty)).map(folder -> folder.resolve("history.csv"))
                : Optional.of(Path.of(to));
        if (target.isEmpty()) {
            return history.run(source, row -> {}, time -> {});
        }
        HistoryAccumulator[] met = new HistoryAccumulator[1];
        CsvWriter.write(
                target.get(),
                history.columns(),
                common.units(),
                sink -> met[0] = history.run(source, sink, time -> {}));
        return met[0];
    }
}
