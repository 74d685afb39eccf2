package org.rodside.cli;

import java.io.BufferedWriter;
import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.OutputStreamWriter;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** The command {@code rodside} with its subcommands. */
@Command(
        name = "rodside",
        description = "Reach, forces, limits, sizes and load histories of an excavator front, from one drawing.",
        versionProvider = Version.class,
        mixinStandardHelpOptions = true,
        synopsisSubcommandLabel = "COMMAND",
        subcommands = {
            CheckCommand.class,
            PoseCommand.class,
            EnvelopeCommand.class,
            DigCommand.class,
            LiftCommand.class,
            LoadsCommand.class,
            SizeCommand.class,
            DutyCommand.class,
            HistoryCommand.class,
            CyclesCommand.class,
            StudyCommand.class
        },
        footer = {
            "",
            "Example:",
            "  rodside study linkages/sallow-22.json",
            "",
            "Exit status: 0 done, 2 bad input or usage, 1 a fault of the program."
        })
public final class Rodside implements Runnable {

    @Spec
    private CommandSpec spec;

    /** Runs one command on the process's own standard output (UTF-8, buffered) and standard error; exit status. */
    public int run(String... args) {
        try (PrintWriter out = utf8(FileDescriptor.out);
                PrintWriter err = utf8(FileDescriptor.err)) {
            return run(out, err, args);
        }
    }

    /** Runs one command with its output sent elsewhere; exit status. */
    static int run(PrintWriter out, PrintWriter err, String... args) {
        return run(commandLine(), out, err, args);
    }

    static int run(CommandLine line, PrintWriter out, PrintWriter err, String... args) {
        line.setOut(out).setErr(err);
        try {
            return line.execute(args);
        } catch (StackOverflowError | OutOfMemoryError e) {
            return ExitStatus.ofError(e, err);
        } finally {
            out.flush();
            err.flush();
        }
    }

    /** The command with every subcommand, configured once for all of them. */
    static CommandLine commandLine() {
        return configure(new CommandLine(new Rodside()));
    }

    static CommandLine configure(CommandLine line) {
        ExitStatus status = new ExitStatus();
        return line.setCaseInsensitiveEnumValuesAllowed(true)
                .setExpandAtFiles(false)
                .setUsageHelpWidth(100)
                .setExecutionExceptionHandler(status)
                .setParameterExceptionHandler(status);
    }

    @Override
    public void run() {
        throw new ParameterException(spec.commandLine(), "a command is missing");
    }

    private static PrintWriter utf8(FileDescriptor where) {
        return new PrintWriter(new BufferedWriter(
                new OutputStreamWriter(new FileOutputStream(where), StandardCharsets.UTF_8), 1 << 16));
    }
}
