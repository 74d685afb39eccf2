package org.rodside.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class CyclesCommandTest {

    /** The signal of ASTM E1049-85 Fig. 6 (seen), as one pin's force at one sample a second. */
    private static final List<Integer> FIGURE_6 = List.of(-2, 1, -3, 5, -1, 3, -4, 4, -2);

    @TempDir
    Path directory;

    private Path file;
    private String out;
    private String err;

    @BeforeEach
    void write() throws IOException {
        file = recording("a.csv", FIGURE_6);
    }

    private Path recording(String name, List<Integer> values) throws IOException {
        StringBuilder text = new StringBuilder("time_s,pin.x_kN,pin.y_kN\n");
        for (int i = 0; i < values.size(); i++) {
            text.append(i).append(',').append(values.get(i)).append(",7\n");
        }
        return Files.writeString(directory.resolve(name), text);
    }

    private int run(Object... args) {
        StringWriter stdout = new StringWriter();
        StringWriter stderr = new StringWriter();
        String[] words = Stream.concat(Stream.of("cycles"), Stream.of(args))
                .map(String::valueOf)
                .toArray(String[]::new);
        int status = Rodside.run(new PrintWriter(stdout), new PrintWriter(stderr), words);
        out = stdout.toString();
        err = stderr.toString();
        return status;
    }

    private static Map<String, Double> byRange(Path cycles) throws IOException {
        return Files.readAllLines(cycles).stream()
                .skip(1)
                .map(line -> line.split(","))
                .collect(Collectors.toMap(
                        c -> c[0] + " " + (int) Double.parseDouble(c[1]), c -> Double.parseDouble(c[3]), Double::sum));
    }

    @Test
    void standardsFigureInTheFile() throws IOException {
        Path folder = directory.resolve("results");
        assertEquals(0, run(file, "--out", folder), () -> err);
        Map<String, Double> figure =
                Map.of("pin.x_kN 3", 0.5, "pin.x_kN 4", 1.5, "pin.x_kN 6", 0.5, "pin.x_kN 8", 1.0, "pin.x_kN 9", 0.5);
        assertEquals(figure, byRange(folder.resolve("cycles.csv")));
        assertEquals(
                "channel,range,mean,count",
                Files.readAllLines(folder.resolve("cycles.csv")).get(0));
        assertTrue(out.contains("single pass, residue as half cycles"), out);
        assertTrue(out.contains("pin.y_kN"), out);
    }

    /** Σ n·range³ of the figure = 13.5 + 96 + 108 + 512 + 364.5 = 1094 over 4 cycles. */
    @Test
    void jsonIsKeyedByChannelAndWritesNothing() throws IOException {
        assertEquals(0, run(file, "--json", "--slopes", "3,4.5", "--columns", "pin.x_kN"), () -> err);
        assertTrue(out.startsWith("{\n  \"pin.x_kN\" : {\n    \"cycles\" : 4.0,\n    \"max_range\" : 9.0,"), out);
        String m3 = out.replaceAll("(?s).*\"m3\" : ([0-9.]+),.*", "$1");
        assertEquals(Math.cbrt(1094 / 4.0), Double.parseDouble(m3), 1e-12);
        assertTrue(out.contains("\"m4.5\""), out);
        try (Stream<Path> files = Files.list(directory)) {
            assertEquals(List.of(file), files.toList());
        }
    }

    @Test
    void consecutiveFilesEqualTheWholeAndSeparateOnesAdd() throws IOException {
        Path one = recording("1.csv", FIGURE_6.subList(0, 5));
        Path two = recording("2.csv", FIGURE_6.subList(5, 9));
        Path whole = directory.resolve("whole");
        Path joined = directory.resolve("joined");
        Path apart = directory.resolve("apart");
        assertEquals(0, run(file, "--out", whole));
        assertEquals(0, run(one, two, "--out", joined));
        assertTrue(out.contains("2 recordings one after the other"), out);
        assertEquals(0, run(one, two, "--out", apart, "--separate"));
        assertTrue(out.contains("2 separate recordings"), out);
        assertEquals(Files.readString(whole.resolve("cycles.csv")), Files.readString(joined.resolve("cycles.csv")));
        // −2 1 −3 5 −1 and 3 −4 4 −2: three and four half cycles and one more, by hand.
        Map<String, Double> added =
                Map.of("pin.x_kN 3", 0.5, "pin.x_kN 4", 0.5, "pin.x_kN 8", 1.0, "pin.x_kN 6", 1.0, "pin.x_kN 7", 0.5);
        assertEquals(added, byRange(apart.resolve("cycles.csv")));
    }

    @Test
    void repeatingBlockHasFullCyclesOnly() throws IOException {
        Path folder = directory.resolve("r");
        assertEquals(0, run(file, "--repeat", "--out", folder));
        // From 5 round to 5: 5 −1 3 −4 4 −3(1 −2 between) …: closed by hand: 4 (−1–3), 3 (−2–1), 7 (4–−3), 9 (5–−4).
        Map<String, Double> full = Map.of("pin.x_kN 4", 1.0, "pin.x_kN 3", 1.0, "pin.x_kN 7", 1.0, "pin.x_kN 9", 1.0);
        assertEquals(full, byRange(folder.resolve("cycles.csv")));
        assertTrue(out.contains("repeating block"), out);
    }

    @Test
    void hoursScaleCountsAndDamageAndLeaveEquivalents() {
        assertEquals(0, run(file, "--json", "--columns", "pin.x_kN", "--curve", "m=3,range=10,cycles=1000"));
        double damage = figure("damage");
        double equivalent = figure("m3");
        assertEquals(1094 / 1000.0 / 1000, damage, 1e-15);
        // 8 s recorded, 4 h asked: 1800 times.
        assertEquals(
                0, run(file, "--json", "--columns", "pin.x_kN", "--curve", "m=3,range=10,cycles=1000", "--hours", "4"));
        assertEquals(1800, figure("factor"), 1e-9);
        assertEquals(4 * 1800, figure("cycles"), 1e-9);
        assertEquals(1800 * damage, figure("damage"), 1e-12);
        assertEquals(equivalent, figure("m3"), 1e-12);
    }

    private double figure(String key) {
        return Double.parseDouble(out.replaceAll("(?s).*\"" + key + "\" : ([-0-9.E]+).*", "$1"));
    }

    @Test
    void matrixAndBlocksAreWritten() throws IOException {
        Path folder = directory.resolve("b");
        assertEquals(
                0,
                run(file, "--columns", "pin.x_kN", "--bins", "3", "--blocks", "8", "--curve", "71", "--out", folder));
        List<String> blocks = Files.readAllLines(folder.resolve("blocks.csv"));
        assertEquals(9, blocks.size());
        assertEquals("pin.x_kN,1.000000000,9.000000000,0.500000000,0.500000000", blocks.get(1));
        double sum = Files.readAllLines(folder.resolve("matrix.csv")).stream()
                .skip(1)
                .mapToDouble(line -> Double.parseDouble(line.substring(line.lastIndexOf(',') + 1)))
                .sum();
        assertEquals(4, sum);
        assertTrue(out.contains("damage kept: m3"), out);
        assertEquals(
                0, run(file, "--columns", "pin.x_kN", "--blocks", "8", "--mean", "goodman=50", "--out", folder), err);
        assertTrue(out.contains("Goodman"), out);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "--columns=pin.z_kN | has no column pin.z_kN; it has time_s, pin.x_kN, pin.y_kN",
                "--slopes=0 | --slopes: 0.0 was given; wanted is a number from 1 to 30",
                "--blocks=7 | --blocks: 7.0 was given; wanted is a number 8, the only spectrum",
                "--gate=-1 | --gate: -1.0 was given",
                "--curve=m=3,range=71 | --curve: cycles is missing",
                "--curve=m=3,range=71,cycle=2e6 | 'cycle=2e6' is none of its parts",
                "--curve=steel | --curve: 'steel' is not a number",
                "--curve=m=3,range=71,cycles=2e6,cutoff=1e8 | m2 needs a knee, and cutoff needs m2",
                "--curve=-71 | --curve: slope, range and cycles must be above 0",
                "--hours=x | --hours",
            })
    void badOptionsAreTold(String option, String fault) {
        assertEquals(2, run(file, "--json", option));
        assertTrue(err.contains(fault), err);
        assertTrue(out.isEmpty(), out);
    }

    @Test
    void meansThatReachTheStrengthAndOtherRulesAreTold() {
        assertEquals(2, run(file, "--json", "--blocks", "8", "--mean", "goodman=1"));
        assertTrue(err.contains("reaches the strength of 1.0"), err);
        assertEquals(2, run(file, "--json", "--blocks", "8", "--mean", "gerber=1"));
        assertTrue(err.contains("wanted is kept or goodman=STRENGTH"), err);
    }

    @Test
    void faultsInTheFileLeaveNoResult() throws IOException {
        Path folder = directory.resolve("none");
        Files.writeString(file, "time_s,pin.x_kN\n0,1\n1,x\n2,3\n");
        assertEquals(2, run(file, "--out", folder));
        assertTrue(err.contains("a.csv: row 2 (line 3), column pin.x_kN: expected a number, found \"x\""), err);
        Files.writeString(file, "time_s,pin.x_kN\n0,1\n1,2\n1,3\n");
        assertEquals(2, run(file, "--out", folder));
        assertTrue(err.contains("row 3 (line 4), column time_s: 1.0 s follows 1.0 s"), err);
        assertFalse(Files.exists(folder));
        Files.writeString(file, "pin.x_kN\n1\n2\n");
        assertEquals(2, run(file, "--hours", "5", "--out", folder));
        assertTrue(err.contains("--hours: no recorded time is known"), err);
    }

    @Test
    void longTablesAreBinnedAndTold() throws IOException {
        StringBuilder text = new StringBuilder("a_MPa\n");
        for (int i = 0; i < 500_000; i++) {
            text.append(i % 2 == 0 ? 0 : 1 + i * 1e-5).append('\n');
        }
        Files.writeString(file, text);
        assertEquals(0, run(file, "--json"));
        assertTrue(err.contains("a_MPa: too many different cycles for the table"), err);
        assertTrue(out.contains("bin_width"), out);
    }
}
