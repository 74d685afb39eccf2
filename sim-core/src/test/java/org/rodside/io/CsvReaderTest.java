package org.rodside.io;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.FilterInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import java.util.zip.GZIPOutputStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.rodside.model.InputException;

class CsvReaderTest {

    @TempDir
    Path directory;

    private static CsvReader of(String text) {
        return new CsvReader(new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8)), "f.csv");
    }

    private static List<double[]> rows(CsvReader reader, int width) {
        List<double[]> rows = new ArrayList<>();
        double[] row = new double[width];
        while (reader.next(row)) {
            rows.add(row.clone());
        }
        reader.close();
        return rows;
    }

    private static String faults(String text) {
        return assertThrows(InputException.class, () -> {
                    CsvReader reader = of(text);
                    double[] row = new double[reader.header().size()];
                    while (reader.next(row)) {
                        continue;
                    }
                })
                .getMessage();
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "a,b\n1,2.5\n-3,4e2\n",
                "a,b\r\n1,2.5\r\n-3,4e2\r\n",
                "a,b\n1,2.5\n-3,400",
                "\uFEFFa,b\n1,2.5\n-3,400\n\n \r\n",
                "\"a\",\"b\"\n\"1\",2.5\n -3 ,\" 400 \"\n",
                "a;b\n1;2,5\n-3;400\n",
                "a;b\n1;2.5\n-3;400\n",
                "a;\"b,c\"\n1;2,5\n-3;4,00e2\n",
                "a\tb\n1\t2.5\n-3\t+400.\n",
                "a,b\n1.,+2.5E0\n-.3e1,.4e+3\n"
            })
    void everyWayToWriteTheSameRowsReadsTheSame(String text) {
        List<double[]> rows = rows(of(text), 2);
        assertEquals(2, rows.size());
        assertArrayEquals(new double[] {1, 2.5}, rows.get(0));
        assertArrayEquals(new double[] {-3, 400}, rows.get(1));
    }

    @Test
    void columnsNotAskedForMayHoldAnything() {
        CsvReader reader = of("limit,t,note,x\nboom.relief,0,\"a \"\"b\"\", c\n d\",5\n,1,,6\n");
        reader.choose(List.of("x", "t"));
        double[] row = new double[2];
        assertTrue(reader.next(row));
        assertArrayEquals(new double[] {5, 0}, row);
        assertEquals("f.csv: row 1 (line 3)", reader.where());
        assertTrue(reader.next(row));
        assertArrayEquals(new double[] {6, 1}, row);
        assertEquals("f.csv: row 2 (line 4)", reader.where());
        assertFalse(reader.next(row));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "a,tip.x_kN@1,2@3,x@ | f.csv: row 2 (line 3), column tip.x_kN: expected a number, found \"x\"",
                "a,b@1,@ | f.csv: row 1 (line 2), column b: expected a number, found nothing",
                "a,b@1,\"\"@ | f.csv: row 1 (line 2), column b: expected a number, found nothing",
                "a,b@NaN,1@ | f.csv: row 1 (line 2), column a: expected a number, found \"NaN\"",
                "a,b@1,-Infinity@ | column b: expected a number, found \"-Infinity\"",
                "a,b@1,1e999@ | column b: expected a number, found \"1e999\", too large",
                "a,b@1,0x10@ | column b: expected a number, found \"0x10\"",
                "a,b@1,5d@ | column b: expected a number, found \"5d\"",
                "a,b@1,-@ | column b: expected a number, found \"-\"",
                "a,b@1,1e@ | column b: expected a number, found \"1e\"",
                "a,b@1,1 2@ | column b: expected a number, found \"1 2\"",
                "a,b@1@ | f.csv: row 1 (line 2): 1 cells, where the heading has 2",
                "a,b@1,2,3@ | f.csv: row 1 (line 2): 3 cells, where the heading has 2; the last of them is \"3\"",
                "a,b@1,2@@3,4@ | f.csv: line 3 is empty, and rows follow",
                "a,b,a@1,2,3@ | f.csv: column a stands in the heading twice",
                "a,,c@1,2,3@ | f.csv: column 2 has no name in the heading",
                "a,b@ | f.csv: there is no row below the heading",
                "a,b@@@ | f.csv: there is no row below the heading",
                "@1,2@ | f.csv: the first line is empty",
                "a,b@1,\"2@3,4@ | f.csv: row 1 (line 2): a quote is opened and never closed",
                "a,\"b@1,2@ | f.csv: a quote in the heading is opened and never closed",
                "a;b@1,5;2@1.5;3@ | column a: expected a number, found \"1.5\" (the decimal mark of this file is the comma",
                "a;b@1.234,5;2@ | column a: expected a number, found \"1.234,5\" (the decimal mark of this file is the point",
            })
    void faultsNameRowLineColumnAndWhatWasFound(String text, String fault) {
        String told = faults(text.replace('@', '\n'));
        assertTrue(told.contains(fault), told);
    }

    @Test
    void emptyInputIsRefused() {
        assertTrue(faults("").contains("f.csv: the file is empty"));
        assertTrue(faults("\uFEFF").contains("f.csv: the first line is empty"));
    }

    @Test
    void headingThatIsNotUtf8IsRefused() {
        byte[] text = "a,f\u00fcll\n1,2\n".getBytes(StandardCharsets.ISO_8859_1);
        String told = assertThrows(InputException.class, () -> new CsvReader(new ByteArrayInputStream(text), "f.csv"))
                .getMessage();
        assertTrue(told.contains("f.csv: heading of column 2 is not UTF-8 text"), told);
    }

    @Test
    void upToTwentyFaultsAreToldTogetherAndRowsAfterTheFirstAreWithheld() {
        StringBuilder text = new StringBuilder("a,b\n1,2\n");
        for (int i = 0; i < 30; i++) {
            text.append("1,2\nx,2\n");
        }
        CsvReader reader = of(text.toString());
        double[] row = new double[2];
        assertTrue(reader.next(row));
        assertTrue(reader.next(row));
        InputException told = assertThrows(InputException.class, () -> reader.next(row));
        assertEquals(20, told.faults().size());
        assertEquals(
                "f.csv: row 41 (line 42), column a: expected a number, found \"x\"",
                told.faults().get(19));
    }

    @Test
    void columnsThatAreMissingAreNamedWithThoseThereAre() {
        CsvReader reader = of("a,b\n1,2\n");
        String told = assertThrows(InputException.class, () -> reader.choose(List.of("b", "c")))
                .getMessage();
        assertTrue(told.contains("f.csv: has no column c; it has a, b"), told);
    }

    @Test
    void overlongLineIsRefused() {
        String long1 = "a,b\n1," + "2".repeat(2 * LineReader.LINE_LIMIT) + "\n";
        assertTrue(faults(long1).contains("a line is longer than"), "overlong number");
        String open = "a,b\n1,\"" + "2\n".repeat(2 * LineReader.LINE_LIMIT);
        assertTrue(faults(open).contains("a line is longer than"), "open quote");
    }

    @Test
    void manyColumnsAndLongLinesWithinTheLimitAreRead() {
        int width = 20_000;
        StringBuilder text = new StringBuilder();
        for (int i = 0; i < width; i++) {
            text.append(i == 0 ? "" : ",").append("column").append(i);
        }
        for (int row = 0; row < 3; row++) {
            text.append('\n');
            for (int i = 0; i < width; i++) {
                text.append(i == 0 ? "" : ",").append(row + i * 0.001);
            }
        }
        List<double[]> rows = rows(of(text.toString()), width);
        assertEquals(3, rows.size());
        assertEquals(2 + 19_999 * 0.001, rows.get(2)[19_999]);
    }

    @Test
    void gzipIsReadByItsBytesAndDamageIsTold() throws IOException {
        ByteArrayOutputStream packed = new ByteArrayOutputStream();
        try (GZIPOutputStream gzip = new GZIPOutputStream(packed)) {
            gzip.write("a\n5\n6\n".getBytes(StandardCharsets.US_ASCII));
        }
        Path file = Files.write(directory.resolve("x.csv.gz"), packed.toByteArray());
        List<double[]> rows = rows(CsvReader.open(file.toString()), 1);
        assertEquals(6, rows.get(1)[0]);

        byte[] cut = java.util.Arrays.copyOf(packed.toByteArray(), packed.size() - 10);
        Path damaged = Files.write(directory.resolve("cut.csv.gz"), cut);
        String told = assertThrows(InputException.class, () -> rows(CsvReader.open(damaged.toString()), 1))
                .getMessage();
        assertTrue(told.contains("cut short or damaged"), told);

        Path plain = Files.writeString(directory.resolve("plain.csv.gz"), "a\n5\n");
        told = assertThrows(InputException.class, () -> CsvReader.open(plain.toString()))
                .getMessage();
        assertTrue(told.contains("holds no gzip data"), told);
    }

    @Test
    void noFileAndADirectoryAreRefused() {
        assertThrows(InputException.class, () -> CsvReader.open(directory.toString()));
        assertThrows(
                InputException.class,
                () -> CsvReader.open(directory.resolve("none.csv").toString()));
    }

    /** Text of up to 20 digits, with and without exponents, against the JDK's own parser. */
    @Test
    void numbersAreTheNearestDouble() {
        long seed = 20261201;
        SplittableRandom random = new SplittableRandom(seed);
        NumberReader number = new NumberReader();
        for (int i = 0; i < 60_000; i++) {
            StringBuilder text = new StringBuilder(random.nextInt(3) == 0 ? "-" : "");
            int digits = 1 + random.nextInt(20);
            int point = random.nextInt(digits + 2);
            for (int d = 0; d < digits; d++) {
                text.append(d == point ? "." : "").append(random.nextInt(10));
            }
            if (random.nextInt(4) == 0) {
                text.append('e').append(random.nextInt(-340, 330));
            }
            byte[] bytes = (text + "\n").getBytes(StandardCharsets.US_ASCII);
            String message = "seed " + seed + ": " + text;
            assertEquals(Double.parseDouble(text.toString()), number.at(bytes, 0), message);
            assertEquals(bytes.length - 1, number.end(), message);
        }
    }

    /** Whatever the bytes are, the outcome is rows of finite numbers or a told fault. */
    @Test
    void anyBytesGiveRowsOrFaults() {
        String letters = "0123456789.,;-+eE\n\n\n\r\"\t ab\u00e9";
        for (long seed = 0; seed < 4_000; seed++) {
            SplittableRandom random = new SplittableRandom(seed);
            StringBuilder text = new StringBuilder(random.nextBoolean() ? "a,b\n" : "a;b\n");
            int length = random.nextInt(60);
            for (int i = 0; i < length; i++) {
                text.append(letters.charAt(random.nextInt(letters.length())));
            }
            byte[] bytes = text.toString().getBytes(StandardCharsets.UTF_8);
            if (random.nextInt(5) == 0) {
                random.nextBytes(bytes);
            }
            readThrough(bytes, seed);
        }
    }

    private static void readThrough(byte[] bytes, long seed) {
        try {
            // One byte at a time: rows must not depend on where reading stopped.
            CsvReader slow = new CsvReader(drip(bytes), "f.csv");
            CsvReader fast = new CsvReader(new ByteArrayInputStream(bytes), "f.csv");
            double[] a = new double[slow.header().size()];
            double[] b = new double[slow.header().size()];
            while (slow.next(a)) {
                assertTrue(fast.next(b), "seed " + seed);
                assertArrayEquals(a, b, "seed " + seed);
                for (double value : a) {
                    assertTrue(Double.isFinite(value), "seed " + seed);
                }
            }
        } catch (InputException e) {
            assertFalse(e.faults().isEmpty());
        }
    }

    private static InputStream drip(byte[] bytes) {
        return new FilterInputStream(new ByteArrayInputStream(bytes)) {
            @Override
            public int read(byte[] b, int off, int len) throws IOException {
                return super.read(b, off, Math.min(len, 1));
            }

            @Override
            public int available() {
                return 0;
            }
        };
    }
}
