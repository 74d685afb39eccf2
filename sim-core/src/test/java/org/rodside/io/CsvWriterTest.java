package org.rodside.io;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.math.BigDecimal;
import java.math.RoundingMode;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import java.util.stream.Stream;
import java.util.zip.GZIPInputStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.rodside.model.InputException;
import org.rodside.table.Column;
import org.rodside.units.Quantity;
import org.rodside.units.UnitSystem;

class CsvWriterTest {

    @TempDir
    Path directory;

    private static String written(double value, int decimals) {
        DigitBuffer buffer = new DigitBuffer();
        buffer.number(value, decimals);
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        try {
            buffer.writeTo(out);
        } catch (IOException e) {
            throw new AssertionError(e);
        }
        return out.toString(StandardCharsets.US_ASCII);
    }

    private static String exact(double value, int decimals) {
        BigDecimal rounded = new BigDecimal(value).setScale(decimals, RoundingMode.HALF_UP);
        return rounded.toPlainString();
    }

    @ParameterizedTest
    @CsvSource({
        "0, 3, 0.000",
        "-0.0, 3, 0.000",
        "-0.0004, 3, 0.000",
        "-0.0005, 3, -0.001",
        "0.5, 0, 1",
        "1.5, 0, 2",
        "2.5, 0, 3",
        "-2.5, 0, -3",
        "0.125, 2, 0.13",
        "1.005, 2, 1.00", // the double is 1.00499999999999989…
        "9.9999999996, 9, 10.000000000",
        "99.995, 2, 100.00", // the double is 99.9950000000000045…
        "999999999999999.9, 1, 999999999999999.9",
        "999999999999999.875, 0, 1000000000000000",
        "1e15, 3, 1.0E15",
        "-1e300, 3, -1.0E300",
        "Infinity, 3, Infinity",
        "NaN, 3, ''",
        "4.9e-324, 15, 0.000000000000000",
        "123456.123456789, 9, 123456.123456789"
    })
    void fixedDecimals(double value, int decimals, String text) {
        assertEquals(text, written(value, decimals));
    }

    /** Against the exact binary value rounded by BigDecimal: any size, many of them at or beside a tie. */
    @Test
    void roundingIsThatOfTheExactValue() {
        long seed = 71;
        SplittableRandom random = new SplittableRandom(seed);
        for (int i = 0; i < 60_000; i++) {
            int decimals = random.nextInt(16);
            double size = Math.pow(10, random.nextDouble() * 30 - 16);
            double value = (random.nextDouble() - 0.5) * 2 * size;
            if (random.nextBoolean()) {
                double power = Math.pow(10, decimals);
                value = (Math.rint(value * power) + 0.5) / power;
                value += random.nextInt(-1, 2) * Math.ulp(value);
            }
            if (Math.abs(value) < 1e15) {
                String text = exact(value, decimals);
                if (new BigDecimal(text).signum() == 0) {
                    text = text.replace("-", "");
                }
                assertEquals(text, written(value, decimals), "seed " + seed + ": " + value + " to " + decimals);
            }
        }
    }

    private static final List<Column> COLUMNS = List.of(
            Column.of("time", Quantity.TIME),
            Column.of("tip.x", Quantity.FORCE),
            Column.of("boom.fraction", Quantity.NONE),
            Column.words("limit", List.of("none", "boom.relief.cap", "a, \"b\"")));

    private static String text(UnitSystem units, double[]... rows) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        CsvWriter writer = new CsvWriter(out, COLUMNS, units);
        for (double[] row : rows) {
            writer.row(row);
        }
        writer.close();
        return out.toString(StandardCharsets.UTF_8);
    }

    @Test
    void unitsWordsAndEmptyCells() {
        double[] a = {0.02, 100_000.000_05, 0.5, 2};
        double[] b = {0.04, Double.NaN, -0.0, Double.NaN};
        assertEquals(
                "time_s,tip.x_kN,boom.fraction,limit\n"
                        + "0.020000,100.000000050,0.500000000,\"a, \"\"b\"\"\"\n0.040000,,0.000000000,\n",
                text(UnitSystem.SI, a, b));
        // 1 lbf = 4.4482216152605 N exactly, NIST SP 811 appendix B (memory).
        assertTrue(text(UnitSystem.US, new double[] {1, 4.4482216152605, 1, 0})
                .endsWith("time_s,tip.x_lbf,boom.fraction,limit\n1.000000,1.000000000,1.000000000,none\n"));
    }

    @Test
    void writtenRowsAreReadBackToHalfTheLastDecimal() throws IOException {
        long seed = 5;
        SplittableRandom random = new SplittableRandom(seed);
        List<double[]> rows = new ArrayList<>();
        Path file = directory.resolve("deep/er/rows.csv.gz");
        CsvWriter.write(file, COLUMNS, UnitSystem.SI, sink -> {
            for (int i = 0; i < 20_000; i++) {
                double force = (random.nextDouble() - 0.5) * Math.pow(10, random.nextInt(9));
                double[] row = {i * 0.02, force, random.nextDouble(), random.nextInt(3)};
                rows.add(row);
                sink.row(row);
            }
        });
        CsvReader reader = CsvReader.open(file.toString());
        reader.choose(List.of("tip.x_kN", "time_s", "boom.fraction"));
        double[] row = new double[3];
        for (double[] original : rows) {
            assertTrue(reader.next(row), "seed " + seed);
            // Half of the ninth decimal of a kN, in N, and rounding of the numbers themselves.
            assertEquals(original[1], row[0] * 1000, 0.51e-6 + 1e-15 * Math.abs(original[1]), "seed " + seed);
            assertEquals(original[0], row[1], 0.51e-6);
            assertEquals(original[2], row[2], 0.51e-9);
        }
        assertFalse(reader.next(row));
        reader.close();
        assertEquals(List.of("rows.csv.gz"), names(file.getParent()));
    }

    private static List<String> names(Path folder) throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.map(f -> f.getFileName().toString()).toList();
        }
    }

    @Test
    void aTableThatFailsHalfWayLeavesTheOldFileAndNoOther() throws IOException {
        Path file = Files.writeString(directory.resolve("t.csv"), "old");
        assertThrows(
                InputException.class,
                () -> CsvWriter.write(file, COLUMNS, UnitSystem.SI, sink -> {
                    sink.row(new double[4]);
                    throw new InputException("row 2: no");
                }));
        CsvWriter aborted = new CsvWriter(file, COLUMNS, UnitSystem.SI);
        aborted.row(new double[4]);
        aborted.abort();
        aborted.close();
        CsvWriter wrong = new CsvWriter(file, COLUMNS, UnitSystem.SI);
        assertThrows(IllegalArgumentException.class, () -> wrong.row(new double[3]));
        wrong.close();
        assertEquals("old", Files.readString(file));
        assertEquals(List.of("t.csv"), names(directory));
    }

    @Test
    void theFileIsNotThereUntilClosed() throws IOException {
        Path file = directory.resolve("t.csv.gz");
        CsvWriter writer = new CsvWriter(file, COLUMNS, UnitSystem.SI);
        writer.row(new double[4]);
        assertFalse(Files.exists(file));
        writer.close();
        try (GZIPInputStream in = new GZIPInputStream(Files.newInputStream(file))) {
            assertTrue(new String(in.readAllBytes(), StandardCharsets.UTF_8).startsWith("time_s,"));
        }
    }

    @Test
    void placesThatCannotBeWrittenAreTold() throws IOException {
        assertThrows(InputException.class, () -> new CsvWriter(directory, COLUMNS, UnitSystem.SI));
        Path file = Files.writeString(directory.resolve("file"), "");
        assertThrows(InputException.class, () -> new CsvWriter(file.resolve("x.csv"), COLUMNS, UnitSystem.SI));
    }

    @Test
    void longWordsAndOneEmptyColumnSurvive() {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        String word = "long ".repeat(40_000);
        CsvWriter writer = new CsvWriter(out, List.of(Column.words("w", List.of(word))), UnitSystem.SI);
        writer.row(new double[] {0});
        writer.row(new double[] {Double.NaN});
        writer.close();
        assertEquals("w\n" + word + "\n\"\"\n", out.toString(StandardCharsets.UTF_8));
    }
}
