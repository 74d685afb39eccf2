package org.rodside.cli;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.rodside.io.DutyPassReader;
import org.rodside.io.WholeFile;
import org.rodside.model.DutyPass;
import org.rodside.model.InputException;
import org.rodside.model.Linkage;
import org.rodside.report.Cautions;
import org.rodside.report.PageWriter;
import org.rodside.study.Front;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** The command {@code study}: every question in one run, one page of summary, all files and a report. */
@Command(
        name = "study",
        mixinStandardHelpOptions = true,
        description = "Everything about one linkage: all tables and pictures, a one-page summary and report.html.",
        footer = {"", "Example:", "  rodside study linkages/sallow-22.json"})
final class StudyCommand implements Callable<Integer> {

    private static final List<StudyPart> PARTS = List.of(
            new CheckPart(),
            new EnvelopePart(),
            new DigPart(),
            new LiftPart(),
            new LoadsPart(),
            new SizePart(),
            new PassPart());

    @Mixin
    private LinkageFile file;

    @Mixin
    private CommonOptions common;

    @Option(
            names = "--pass",
            paramLabel = "PASS.json",
            description = "Pass for duty, history and cycles. Default: <file stem>-pass.json beside the linkage file")
    private Path pass;

    private final Map<String, Object> told = new LinkedHashMap<>();
    private final Map<String, Object> leftOut = new LinkedHashMap<>();
    private final StringBuilder text = new StringBuilder();

    @Override
    public Integer call() {
        Linkage linkage = file.read(common);
        Front front = Front.of(linkage);
        Path passFile = pass == null ? PassPart.usual(file.path()) : pass;
        Optional<DutyPass> given = pass == null && Files.notExists(passFile)
                ? Optional.empty()
                : Optional.of(DutyPassReader.read(passFile, linkage));
        Optional<Path> folder = common.folder(file.path());
        PageWriter page = new PageWriter(
                linkage.name(),
                "Reach, forces, limits and sizes of the front drawn in "
                        + file.path().getFileName() + ", computed from its pin coordinates.");
        if (!linkage.note().isEmpty()) {
            page.text(linkage.note());
        }
        page.cautions();
        told.put("name", linkage.name());
        answer(new StudyPart.Desk(
                front, common, folder, page, new LoadsOnce(front, common.threads()), given, passFile));
        told.put("left_out", leftOut);
        told.put("cautions", Cautions.estimates());
        folder.ifPresent(
                f -> WholeFile.write(f.resolve("report.html"), page.html().getBytes(StandardCharsets.UTF_8)));
        common.tell(() -> told, () -> summary(linkage, folder));
        return ExitStatus.DONE;
    }

    private void answer(StudyPart.Desk desk) {
        try (Progress progress = common.progress("study")) {
            for (int i = 0; i < PARTS.size(); i++) {
                StudyPart part = PARTS.get(i);
                try {
                    StudyPart.Told answer = part.tell(desk);
                    told.put(part.name(), answer.json());
                    text.append(answer.text()).append('\n');
                } catch (InputException e) {
                    leftOut.put(part.name(), e.getMessage());
                }
                progress.accept((i + 1.0) / PARTS.size());
            }
        }
    }

    private String summary(Linkage linkage, Optional<Path> folder) {
        StringBuilder page = new StringBuilder(linkage.name()).append("\n\n").append(text);
        leftOut.forEach((name, why) ->
                page.append("Left out: ").append(name).append(": ").append(why).append('\n'));
        folder.ifPresent(
                f -> page.append("Files and report.html are in ").append(f).append("\n\n"));
        return page.append(Cautions.text()).toString();
    }
}
