package org.rodside.chart;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.SplittableRandom;
import java.util.stream.Stream;
import javax.imageio.ImageIO;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.w3c.dom.Document;

class PlotTest {

    /** Equal aspect in the painted picture; a circle some 600 pixels wide cannot be measured finer than a few pixels. */
    private static final double ASPECT = 0.01;

    @ParameterizedTest
    @CsvSource({"1200,900", "1600,500", "500,900"})
    void aCircleIsRoundInThePicture(int width, int height) throws Exception {
        Plot plot = new Plot("", "x, mm", "y, mm", List.of(circle(4000, 2500, 1800)), true, List.of());
        int[] box = coloured(paint(plot, width, height), Palette.category(1));
        assertEquals(1.0, (double) (box[1] - box[0]) / (box[3] - box[2]), ASPECT);
        assertTrue(box[1] - box[0] > 250, "the circle fills the picture");
    }

    @Test
    void withoutEqualAspectTheCircleFillsThePicture() throws Exception {
        Plot plot = new Plot("", "x, mm", "y, mm", List.of(circle(4000, 2500, 1800)), false, List.of());
        int[] box = coloured(paint(plot, 1600, 500), Palette.category(1));
        assertTrue(box[1] - box[0] > 2 * (box[3] - box[2]));
    }

    @Test
    void anEqualAspectDrawingIsRoundAsSvgToo() throws Exception {
        Plot plot = new Plot("a <b> & \"c\"", "x", "y", List.of(circle(0, 0, 1)), true, List.of());
        String d = xml(Svg.of(plot, 900, 400))
                .getElementsByTagName("path")
                .item(2)
                .getAttributes()
                .getNamedItem("d")
                .getNodeValue();
        double[] numbers = Stream.of(d.replaceAll("[MLZ]", " ").strip().split(" +"))
                .mapToDouble(Double::parseDouble)
                .toArray();
        double[] box = {1e9, -1e9, 1e9, -1e9};
        for (int i = 0; i < numbers.length; i += 2) {
            box[0] = Math.min(box[0], numbers[i]);
            box[1] = Math.max(box[1], numbers[i]);
            box[2] = Math.min(box[2], numbers[i + 1]);
            box[3] = Math.max(box[3], numbers[i + 1]);
        }
        assertEquals(1.0, (box[1] - box[0]) / (box[3] - box[2]), 1e-3);
    }

    @Test
    void emptyFlatAndBrokenDataArePaintedToo() throws Exception {
        double[] nan = {1, Double.NaN, 3, Double.POSITIVE_INFINITY, 2};
        for (Plot plot : List.of(
                new Plot("", "", "", List.of(), false, List.of()),
                new Plot(
                        "t",
                        "x",
                        "y",
                        List.of(Series.line("a", 0, new double[] {5}, new double[] {7})),
                        true,
                        List.of()),
                new Plot(
                        "t",
                        "x",
                        "y",
                        List.of(Series.line("a", 0, nan, nan), Series.points("", Series.Symbol.CROSS, 1, nan, nan)),
                        false,
                        List.of(new Mark.Level(4, "four"))))) {
            assertEquals(300, paint(plot, 400, 300).getHeight());
            xml(Svg.of(plot, 400, 300));
        }
    }

    @Test
    void aLongLineIsThinnedButKeepsItsPeaks() {
        SplittableRandom random = new SplittableRandom(11);
        int n = 400_000;
        double[] x = new double[n];
        double[] y = new double[n];
        for (int i = 0; i < n; i++) {
            x[i] = i;
            y[i] = random.nextDouble();
        }
        y[123_457] = 40;
        y[300_001] = -40;
        Series series = Series.line("", 0, x, y);
        View view = View.around(new Plot("", "", "", List.of(series), false, List.of()));
        double[][] kept = Thinning.of(series, view, 800, 600);
        assertTrue(kept[0].length <= 4 * 801, "kept " + kept[0].length);
        assertTrue(Stream.of(40.0, -40.0).allMatch(v -> contains(kept[1], v)));
        assertEquals(0, kept[0][0]);
        assertEquals(n - 1, kept[0][kept[0].length - 1]);
    }

    @ParameterizedTest
    @CsvSource({"0,10,6,2", "0,1,6,0.2", "-3.2,7.9,10,2", "0,0.0007,8,0.0001", "1000,9999,4,2000", "-7500,7500,7,2000"})
    void ticksStepByOneTwoOrFive(double low, double high, int most, double step) {
        Ticks ticks = Ticks.of(low, high, most);
        assertEquals(step, ticks.step(), 1e-12 * step);
        assertTrue(ticks.values().length <= most);
        for (double value : ticks.values()) {
            assertTrue(value >= low - 1e-9 * step && value <= high + 1e-9 * step, "tick " + value);
            assertEquals(Math.rint(value / step), value / step, 1e-9);
        }
    }

    @Test
    void tickTextsAreShortAndExact() {
        Ticks tenths = Ticks.of(0, 0.5, 6);
        assertArrayEquals(new double[] {0, 0.1, 0.2, 0.3, 0.4, 0.5}, tenths.values());
        assertEquals("0.3", tenths.text(0.3));
        assertEquals("\u22122000", Ticks.text(-2000, 0));
        assertEquals("12\u2009000", Ticks.text(12000, 0));
        assertEquals("0.0", Ticks.text(-0.01, 1));
    }

    @Test
    void bandsCoverEveryValueOnceBetweenRoundNumbers() {
        SplittableRandom random = new SplittableRandom(3);
        double[] v = random.doubles(5000, 61, 178).toArray();
        v[7] = Double.NaN;
        List<Series> bands = Bands.byValue(v, v, v, "kN");
        assertEquals(v.length - 1, bands.stream().mapToInt(s -> s.x().length).sum());
        assertTrue(bands.size() <= Bands.MOST && bands.size() > 4, "bands " + bands.size());
        assertEquals("60\u201380 kN", bands.get(0).name());
        bands.forEach(band -> {
            double low = Double.parseDouble(band.name().split("\u2013")[0]);
            for (double value : band.x()) {
                assertTrue(value >= low && value <= low + 20, value + " in " + band.name());
            }
        });
        assertEquals(List.of(), Bands.byValue(new double[] {1}, new double[] {1}, new double[] {Double.NaN}, ""));
        assertEquals(
                1,
                Bands.byValue(new double[] {1}, new double[] {1}, new double[] {5}, "")
                        .size());
    }

    @Test
    void wordsKeepTheirColourWhateverOccurs() {
        double[] p = {1, 2, 3};
        List<Series> kinds = Bands.byWord(p, p, new int[] {2, -1, 2}, List.of("a", "b", "c"));
        assertEquals(1, kinds.size());
        assertEquals("c", kinds.get(0).name());
        assertEquals(Palette.category(2), kinds.get(0).colour());
        assertArrayEquals(new double[] {1, 3}, kinds.get(0).x());
    }

    @Test
    void labelsDoNotCoverEachOther() {
        LabelPlaceBuffer places = new LabelPlaceBuffer(new LabelPlaceBuffer.Box(0, 0, 400, 300), List.of());
        List<LabelPlaceBuffer.Box> boxes = new ArrayList<>();
        for (int i = 0; i < 8; i++) {
            boxes.add(places.place(200 + i, 150 - i, 70, 16));
        }
        for (int i = 0; i < boxes.size(); i++) {
            assertTrue(boxes.get(i).left() >= 0 && boxes.get(i).right() <= 400);
            for (int j = 0; j < i; j++) {
                assertFalse(boxes.get(i).meets(boxes.get(j)), i + " covers " + j);
            }
        }
    }

    @Test
    void abscissasAndOrdinatesComeInPairs() {
        assertThrows(IllegalArgumentException.class, () -> Series.line("a", 0, new double[2], new double[3]));
    }

    private static Series circle(double x, double y, double radius) {
        double[] px = new double[721];
        double[] py = new double[721];
        for (int i = 0; i < px.length; i++) {
            px[i] = x + radius * Math.cos(Math.toRadians(0.5 * i));
            py[i] = y + radius * Math.sin(Math.toRadians(0.5 * i));
        }
        return Series.line("", Palette.category(1), px, py);
    }

    private static BufferedImage paint(Plot plot, int width, int height) throws Exception {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        PlotWriter.png(plot, bytes, width, height);
        return ImageIO.read(new ByteArrayInputStream(bytes.toByteArray()));
    }

    /** Box of all pixels of a colour: left, right, top, bottom. */
    private static int[] coloured(BufferedImage image, int rgb) {
        int[] box = {image.getWidth(), -1, image.getHeight(), -1};
        for (int y = 0; y < image.getHeight(); y++) {
            for (int x = 0; x < image.getWidth(); x++) {
                if ((image.getRGB(x, y) & 0xFFFFFF) == rgb) {
                    box = new int[] {Math.min(box[0], x), Math.max(box[1], x), Math.min(box[2], y), Math.max(box[3], y)
                    };
                }
            }
        }
        return box;
    }

    private static boolean contains(double[] values, double value) {
        return Arrays.stream(values).anyMatch(v -> v == value);
    }

    private static Document xml(String text) throws Exception {
        return DocumentBuilderFactory.newInstance()
                .newDocumentBuilder()
                .parse(new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8)));
    }
}
