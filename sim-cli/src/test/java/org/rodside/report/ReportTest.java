package org.rodside.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.rodside.chart.Plot;
import org.rodside.report.DrawnPose.Cloud;
import org.rodside.table.Column;
import org.rodside.table.Table;
import org.rodside.units.Quantity;
import org.rodside.units.UnitSystem;
import org.w3c.dom.Document;

class ReportTest {

    private static final String NASTY = "</p><script>alert('1 & 2')</script>\u0000\uD800\"";

    @Test
    void aPageIsWellFormedAndTakesNothingFromOutside() throws Exception {
        String html = page().html();
        Document page = DocumentBuilderFactory.newInstance()
                .newDocumentBuilder()
                .parse(new ByteArrayInputStream(html.getBytes(StandardCharsets.UTF_8)));
        assertEquals(1, page.getElementsByTagName("svg").getLength());
        assertEquals(0, page.getElementsByTagName("script").getLength());
        for (String outside : List.of("src=", "url(", "@import", "<link")) {
            assertFalse(html.contains(outside), outside);
        }
        assertEquals(
                "s1",
                page.getElementsByTagName("h2")
                        .item(0)
                        .getAttributes()
                        .getNamedItem("id")
                        .getNodeValue());
    }

    @Test
    void whatIsWrittenIsReadBackAsTextWhateverItHolds() throws Exception {
        Document page = DocumentBuilderFactory.newInstance()
                .newDocumentBuilder()
                .parse(new ByteArrayInputStream(page().html().getBytes(StandardCharsets.UTF_8)));
        String readable = NASTY.replace('\u0000', '?').replace('\uD800', '?');
        assertEquals(readable, page.getElementsByTagName("h1").item(0).getTextContent());
        assertEquals(readable, page.getElementsByTagName("td").item(0).getTextContent());
        assertEquals(readable, page.getElementsByTagName("figcaption").item(0).getTextContent());
    }

    @Test
    void aPageCarriesEveryCaution() {
        String html = page().html();
        Cautions.estimates().forEach(line -> assertTrue(html.contains(line), line));
        Cautions.work().forEach(line -> assertTrue(html.contains(line), line));
    }

    @Test
    void aTableSaysHowMuchItLeavesOut() {
        String html =
                new PageWriter("t", "j").table("", table(), UnitSystem.US, 1).html();
        assertTrue(html.contains("<th>reach_in</th>"), html);
        assertTrue(html.contains("<td class=\"n\">393.7</td>"), html);
        assertTrue(html.contains("1 more rows"), html);
    }

    @Test
    void terminalTablesAreAligned() {
        assertEquals("""
                name   reach_mm  share
                -----  --------  -----
                boom      10000  0.125
                stick     254.0      -
                """, TextTable.of(table(), UnitSystem.SI));
    }

    @ParameterizedTest
    @CsvSource({
        "0,0",
        "-0.0,0",
        "12345.6,12346",
        "-1234.4,-1234",
        "999.96,1000",
        "3.14159,3.142",
        "0.00012345678,0.0001235",
        "1e-7,1.0E-7",
        "NaN,-",
        "Infinity,-",
        "250,250.0",
        "1e15,1000000000000000"
    })
    void numbersHaveFourDigitsAndWholeOnesAll(double value, String text) {
        assertEquals(text, TextTable.number(value));
    }

    @Test
    void aLinkageIsDrawnWithEveryPartNamed() {
        Cloud two = new Cloud(new double[] {0, 2}, new double[] {1, 2});
        Cloud four = new Cloud(new double[] {2, 3, 3, 2.6}, new double[] {2, 2, 1, 1.8});
        DrawnPose pose = new DrawnPose(
                new DrawnPose.Body("frame", two),
                List.of(new DrawnPose.Body("arm", two), new DrawnPose.Body("scoop", four)),
                List.of(new DrawnPose.Strut("curl", two, 1.2, 0.15, 0.08)),
                four,
                new DrawnPose.Ground(true, OptionalDouble.of(1), OptionalDouble.empty()));
        Plot plot = new LinkagePicture(pose, UnitSystem.SI).plot("t");
        assertTrue(plot.equalAspect());
        assertEquals(7, plot.series().size());
        assertTrue(plot.marks().toString().contains("scoop"));
        assertTrue(plot.marks().toString().contains("front tipping line"));
        assertFalse(plot.marks().toString().contains("rear tipping line"));
        assertEquals(2000, plot.series().get(6).x()[0], 1e-9);
    }

    @Test
    void anOutlineEnclosesItsPlacesAtTheRadius() {
        Cloud band = Outline.around(new Cloud(new double[] {0, 4, 1}, new double[] {0, 0, 0.1}), 0.5);
        double left = Arrays.stream(band.x()).min().orElseThrow();
        double right = Arrays.stream(band.x()).max().orElseThrow();
        assertEquals(-0.5, left, 1e-12);
        assertEquals(4.5, right, 1e-12);
        Cloud bar = Outline.bar(new Cloud(new double[] {0, 3}, new double[] {0, 4}), 0.2, 1, 0.1);
        assertEquals(0.1, Math.hypot(bar.x()[0] - bar.x()[3], bar.y()[0] - bar.y()[3]), 1e-12);
        assertEquals(4.0, Math.hypot(bar.x()[0] - bar.x()[1], bar.y()[0] - bar.y()[1]), 1e-12);
    }

    private static Table table() {
        Table table = new Table(List.of(
                Column.words("name", List.of("boom", "stick")),
                Column.of("reach", Quantity.LENGTH, 1),
                Column.of("share", Quantity.NONE, 3)));
        table.row(new double[] {0, 10, 0.125});
        table.row(new double[] {1, 0.254, Double.NaN});
        return table;
    }

    private static PageWriter page() {
        Plot plot = new Plot(NASTY, NASTY, "y", List.of(), false, List.of());
        return new PageWriter(NASTY, NASTY)
                .section(NASTY, NASTY)
                .figure(plot, NASTY, 0.6)
                .table(NASTY, List.of(NASTY), List.of(List.of(NASTY)))
                .note(NASTY)
                .cautions();
    }
}
