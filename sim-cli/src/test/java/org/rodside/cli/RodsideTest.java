package org.rodside.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.Callable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.rodside.model.InputException;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.Parameters;

class RodsideTest {

    private final StringWriter out = new StringWriter();
    private final StringWriter err = new StringWriter();

    @Command(name = "probe", mixinStandardHelpOptions = true)
    static final class Probe implements Callable<Integer> {

        @Mixin
        private CommonOptions common;

        @Parameters(index = "0", paramLabel = "FILE")
        private Path file;

        private final Callable<Object> body;

        Probe(Callable<Object> body) {
            this.body = body;
        }

        @Override
        public Integer call() throws Exception {
            common.out()
                    .println(common.folder(file) + " " + common.units() + " " + common.overrides() + " "
                            + common.threads() + " " + body.call());
            return 0;
        }
    }

    @Test
    void aDoneJobIsZeroAndSpeaksOnStandardOutputOnly(@TempDir Path dir) {
        String made = dir.resolve("a/b").toString();
        assertEquals(
                0,
                probe(
                        () -> "½",
                        "x.json",
                        "--out",
                        made,
                        "--units",
                        "us",
                        "--set",
                        "a=1",
                        "--set",
                        "b.c=2",
                        "--threads",
                        "3"));
        assertEquals(
                "Optional[" + made + "] US [a=1, b.c=2] 3 ½\n", out.toString().replace("\r", ""));
        assertTrue(Files.isDirectory(Path.of(made)));
        assertEquals("", err.toString());
    }

    @Test
    void jsonWithoutAFolderWritesNothing() {
        assertEquals(0, probe(() -> "", "x.json", "--json"));
        assertTrue(out.toString().startsWith("Optional.empty SI []"), out.toString());
    }

    @Test
    void aFileInPlaceOfTheFolderIsRefused(@TempDir Path dir) throws Exception {
        Path file = Files.createFile(dir.resolve("taken"));
        assertEquals(2, probe(() -> "", "x.json", "--out", file.toString()));
        assertEquals(
                "rodside: --out: " + file + " is a file; a folder is wanted",
                err.toString().strip());
    }

    @Test
    void everyFaultOfTheInputHasItsLine() {
        assertEquals(
                2,
                probe(
                        () -> {
                            throw new InputException(List.of("x.json: pins.a: first", "x.json: pins.b: second"));
                        },
                        "x.json",
                        "--json"));
        assertEquals(
                List.of("rodside: x.json: pins.a: first", "rodside: x.json: pins.b: second"),
                err.toString().lines().toList());
        assertEquals("", out.toString());
    }

    @Test
    void aFileThatCannotBeReadIsTheUsersToMend() {
        assertEquals(
                2,
                probe(
                        () -> {
                            throw new NoSuchFileException("gone.csv");
                        },
                        "x.json",
                        "--json"));
        assertEquals(
                "rodside: gone.csv: there is no such file or folder",
                err.toString().strip());
    }

    @Test
    void aFaultOfOursIsOneFriendlyLineAndATraceOnlyOnDemand() {
        Callable<Object> broken = () -> {
            throw new IllegalStateException("index went astray");
        };
        assertEquals(1, probe(broken, "x.json", "--json"));
        assertEquals(1, err.toString().lines().count());
        assertTrue(err.toString().contains("report it"), err.toString());
        assertTrue(err.toString().contains("IllegalStateException: index went astray"), err.toString());
        assertEquals(1, probe(broken, "x.json", "--json", "--trace"));
        assertTrue(err.toString().contains("\tat org.rodside.cli.RodsideTest"), err.toString());
    }

    @Test
    void errorsOfTheMachineAreCaughtToo() {
        assertEquals(
                1,
                probe(
                        () -> {
                            throw new OutOfMemoryError("heap");
                        },
                        "x.json",
                        "--json"));
        assertTrue(err.toString().contains("-Xmx"), err.toString());
    }

    @Test
    void aMisspeltOptionIsAnsweredWithTheNearest() {
        assertEquals(2, probe(() -> "", "x.json", "--unit", "us"));
        assertEquals(
                List.of(
                        "rodside: there is no option --unit; the nearest right one is --units",
                        "Try: rodside probe --help"),
                err.toString().lines().toList());
    }

    @Test
    void aMisspeltCommandIsAnsweredWithTheNearest() {
        assertEquals(2, run("prbe"));
        assertEquals(
                List.of("rodside: there is no command 'prbe'; the nearest right one is probe", "Try: rodside --help"),
                err.toString().lines().toList());
    }

    @ParameterizedTest
    @ValueSource(strings = {"0", "257", "-1", "two", "1.5"})
    void threadsOutsideTheRangeAreRefused(String threads) {
        assertEquals(2, probe(() -> "", "x.json", "--json", "--threads", threads));
        assertTrue(err.toString().contains(threads), err.toString());
        assertEquals("", out.toString());
    }

    @Test
    void noCommandIsAUsageError() {
        assertEquals(2, run());
        assertTrue(err.toString().startsWith("rodside: a command is missing"), err.toString());
        assertEquals("", out.toString());
    }

    @Test
    void versionAndHelpAreDone() {
        assertEquals(0, run("--version"));
        assertTrue(out.toString().startsWith("rodside "), out.toString());
        assertEquals(0, run("--help"));
        assertTrue(out.toString().contains("Usage: rodside"), out.toString());
    }

    @Test
    void everyCommandExplainsItselfWithAnExample() {
        for (CommandLine command : Rodside.commandLine().getSubcommands().values()) {
            String name = command.getCommandName();
            assertTrue(command.getUsageMessage().contains("rodside " + name + " "), name + " shows no example");
            assertTrue(command.getCommandSpec().usageMessage().description().length > 0, name + " has no description");
            for (OptionSpec option : command.getCommandSpec().options()) {
                assertTrue(option.description().length > 0, name + " " + option.longestName() + " is not described");
            }
            assertTrue(command.getCommandSpec().findOption("--help") != null, name + " has no --help");
        }
    }

    @Test
    void stemsLoseFolderAndEndings() {
        assertEquals("sallow-22", CommonOptions.stem(Path.of("linkages/sallow-22.json")));
        assertEquals("pass", CommonOptions.stem(Path.of("a/pass.csv.gz")));
        assertEquals("v1.2", CommonOptions.stem(Path.of("v1.2.json")));
        assertEquals(".hidden", CommonOptions.stem(Path.of(".hidden")));
        assertEquals("input", CommonOptions.stem(Path.of("-")));
    }

    @Test
    void progressIsSilentInAPipeAndErasedAtTheEnd() throws InterruptedException {
        try (Progress silent = new Progress("dig", new PrintWriter(err), false)) {
            Thread.sleep(250);
            silent.accept(0.5);
        }
        assertEquals("", err.toString());
        try (Progress seen = new Progress("dig", new PrintWriter(err), true)) {
            seen.accept(0.1);
            Thread.sleep(250);
            seen.accept(0.5);
            seen.accept(0.6);
        }
        assertEquals("\rdig 50 %\r        \r", err.toString());
        assertFalse(err.toString().contains("60"));
    }

    private int run(String... args) {
        return runWith(() -> "", args);
    }

    private int probe(Callable<Object> body, String... args) {
        String[] all = new String[args.length + 1];
        all[0] = "probe";
        System.arraycopy(args, 0, all, 1, args.length);
        return runWith(body, all);
    }

    private int runWith(Callable<Object> body, String... args) {
        out.getBuffer().setLength(0);
        err.getBuffer().setLength(0);
        CommandLine line = Rodside.configure(
                new CommandLine(new Rodside()).addSubcommand("probe", new CommandLine(new Probe(body))));
        return Rodside.run(line, new PrintWriter(out), new PrintWriter(err), args);
    }
}
