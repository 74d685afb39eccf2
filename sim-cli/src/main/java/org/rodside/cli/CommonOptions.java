package org.rodside.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Supplier;
import org.rodside.io.JsonWriter;
import org.rodside.model.InputException;
import org.rodside.report.Cautions;
import org.rodside.study.Front;
import org.rodside.units.UnitSystem;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/**
 * What every command takes. Use as {@code @Mixin CommonOptions common}; then {@link #out()} is where the summary goes,
 * {@link #folder} where the files go.
 */
final class CommonOptions {

    /** Most threads that may be asked for: far above any desk, low enough to catch a slip of the finger. */
    static final int MOST_THREADS = 256;

    @Spec(Spec.Target.MIXEE)
    private CommandSpec spec;

    @Option(
            names = "--out",
            paramLabel = "DIR",
            description = "Folder for the files; made where missing. Default: results/<file stem>/<command>")
    private Path out;

    @Option(
            names = "--json",
            description = "Print the summary as one JSON object and nothing else; writes files only with --out.")
    private boolean json;

    @Option(
            names = "--units",
            paramLabel = "si|us",
            description = "Units of the output: si (mm, deg, kN, bar, kg) or us (in, deg, lbf, psi, lb). Default: si")
    private UnitSystem units = UnitSystem.SI;

    @Option(
            names = "--set",
            paramLabel = "PATH=VALUE",
            description = "Override a value of the linkage file, e.g. cylinders.boom.working=360. Repeatable.")
    private List<String> set = new ArrayList<>();

    private int threads = Runtime.getRuntime().availableProcessors();

    @Option(names = "--trace", hidden = true, description = "Print where a failure came from.")
    private boolean trace;

    @Option(
            names = "--threads",
            paramLabel = "N",
            description = "Threads to compute with, 1 to 256; never changes a result. Default: every processor")
    private void setThreads(int asked) {
        if (asked < 1 || asked > MOST_THREADS) {
            throw new ParameterException(
                    spec.commandLine(), "--threads: " + asked + " is outside 1 to " + MOST_THREADS);
        }
        threads = asked;
    }

    boolean json() {
        return json;
    }

    UnitSystem units() {
        return units;
    }

    /** Overrides of the linkage file as typed, in order. */
    List<String> overrides() {
        return List.copyOf(set);
    }

    int threads() {
        return threads;
    }

    /** Standard output: the summary. */
    PrintWriter out() {
        return spec.commandLine().getOut();
    }

    /** Prints an answer: one JSON object where asked for, else text. */
    void tell(Supplier<Map<String, ?>> json, Supplier<String> text) {
        out().println(this.json ? JsonWriter.text(json.get()) : text.get());
    }

    /** Prints the answer of a study: JSON, or the name of the linkage, the text and the cautions. */
    void tell(Front front, Supplier<Map<String, ?>> json, Supplier<String> text) {
        tell(json, () -> front.linkage().name() + "\n\n" + text.get() + "\n" + Cautions.text());
    }

    /** A note to the user on standard error. */
    void note(String text) {
        PrintWriter err = spec.commandLine().getErr();
        err.println(text);
        err.flush();
    }

    /** A progress line on standard error, silent unless a person is watching. */
    Progress progress(String label) {
        return Progress.on(label, spec.commandLine().getErr());
    }

    /**
     * The folder for the command's files, made where missing; empty where nothing is to be written ({@code --json}
     * without {@code --out}).
     *
     * @param input the file that the command is about; its stem names the default folder
     * @throws InputException where a file stands in the way
     */
    Optional<Path> folder(Path input) {
        if (json && out == null) {
            return Optional.empty();
        }
        Path folder = out == null ? Path.of("results", stem(input), spec.name()) : out;
        if (Files.exists(folder) && !Files.isDirectory(folder)) {
            throw new InputException("--out: " + folder + " is a file; a folder is wanted");
        }
        try {
            return Optional.of(Files.createDirectories(folder));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** A file's name without folder and endings ({@code a/pass.csv.gz}: {@code pass}); {@code input} for {@code -}. */
    static String stem(Path input) {
        Path last = input.getFileName();
        String name = last == null || "-".equals(last.toString()) ? "input" : last.toString();
        return name.replaceFirst("(?i)(?<=.)\\.gz$", "").replaceFirst("(?<=.)\\.[^.]*$", "");
    }
}
