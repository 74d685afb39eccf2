package org.rodside.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.UncheckedIOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.nio.file.NoSuchFileException;
import java.util.List;
import org.rodside.io.NearestName;
import org.rodside.model.InputException;
import picocli.CommandLine;
import picocli.CommandLine.IExecutionExceptionHandler;
import picocli.CommandLine.IParameterExceptionHandler;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.ParseResult;
import picocli.CommandLine.UnmatchedArgumentException;

/**
 * The one place where a failure becomes an exit status and a message: 0 done, 2 bad input or usage (also a file that
 * cannot be read or written), 1 a fault of the program.
 */
final class ExitStatus implements IExecutionExceptionHandler, IParameterExceptionHandler {

    static final int DONE = 0;
    static final int OURS = 1;
    static final int YOURS = 2;

    private static final String PREFIX = "rodside: ";

    @Override
    public int handleParseException(ParameterException e, String[] args) {
        CommandLine command = e.getCommandLine();
        PrintWriter err = command.getErr();
        print(List.of(message(e)), err);
        err.println("Try: " + command.getCommandSpec().qualifiedName() + " --help");
        return YOURS;
    }

    @Override
    public int handleExecutionException(Exception e, CommandLine command, ParseResult parsed) {
        PrintWriter err = command.getErr();
        if (traceAsked(parsed)) {
            e.printStackTrace(err);
        }
        if (e instanceof InputException input) {
            print(input.faults(), err);
            return YOURS;
        }
        if (e instanceof UncheckedIOException unchecked) {
            print(List.of(fileFault(unchecked.getCause())), err);
            return YOURS;
        }
        if (e instanceof IOException io) {
            print(List.of(fileFault(io)), err);
            return YOURS;
        }
        return ofError(e, err);
    }

    /** A fault of the program: one line that names it and asks for a report. */
    static int ofError(Throwable e, PrintWriter err) {
        String what = e instanceof OutOfMemoryError
                ? "memory ran out; give Java more with -Xmx, or ask for fewer steps (" + e + ")"
                : "a fault of the program, please report it with the command you typed: " + e
                        + " (--trace shows where)";
        print(List.of(what), err);
        return OURS;
    }

    private static void print(List<String> faults, PrintWriter err) {
        faults.stream().flatMap(String::lines).forEach(line -> err.println(PREFIX + line));
    }

    private static String message(ParameterException e) {
        if (!(e instanceof UnmatchedArgumentException unmatched)) {
            return e.getMessage();
        }
        CommandLine command = e.getCommandLine();
        String found = unmatched.getUnmatched().get(0);
        if (unmatched.isUnknownOption()) {
            String name = found.split("=", 2)[0];
            List<String> known = command.getCommandSpec().options().stream()
                    .filter(option -> !option.hidden())
                    .map(option -> option.longestName())
                    .toList();
            return "there is no option " + name + "; " + NearestName.advice(name, known);
        }
        return command.getSubcommands().isEmpty()
                ? "'" + found + "' is one argument too many"
                : "there is no command '" + found + "'; "
                        + NearestName.advice(found, command.getSubcommands().keySet());
    }

    private static String fileFault(IOException e) {
        if (e instanceof NoSuchFileException) {
            return e.getMessage() + ": there is no such file or folder";
        }
        if (e instanceof AccessDeniedException) {
            return e.getMessage() + ": not allowed to read or write here";
        }
        return e instanceof FileSystemException ? e.getMessage() : "reading or writing failed: " + e.getMessage();
    }

    private static boolean traceAsked(ParseResult parsed) {
        ParseResult last = parsed;
        while (last.hasSubcommand()) {
            last = last.subcommand();
        }
        return last.hasMatchedOption("--trace");
    }
}
