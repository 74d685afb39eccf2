package org.rodside.io;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.rodside.model.InputException;
import org.rodside.model.Linkage;

class DutySourceTest {

    private static final Linkage DEMO = LinkageReader.read(Path.of("../linkages/sallow-22.json"), List.of());

    private static DutySource open(String text) {
        byte[] bytes = text.getBytes(StandardCharsets.UTF_8);
        return new DutySource(new CsvReader(new ByteArrayInputStream(bytes), "d.csv"), "d.csv", DEMO);
    }

    private static void readAll(String text) {
        try (DutySource source = open(text)) {
            double[] row = new double[DutySource.width(3)];
            while (source.next(row)) {
                assertTrue(row[0] >= 0);
            }
        }
    }

    @Test
    void unitsAndWaysToTellAStroke() {
        String text = "\uFEFFtime_s,stick.stroke_in,boom.fraction,bucket.length_mm,payload_lb,tip.y_lbf,tip.x_lbf\r\n"
                + "0,10,0.5,2000,100,1000,-2000\r\n";
        try (DutySource source = open(text)) {
            double[] row = new double[DutySource.width(3)];
            assertTrue(source.next(row));
            assertEquals(0.5 * 1.165, row[1], 1e-12);
            assertEquals(0.254, row[2], 1e-12);
            assertEquals(0.4, row[3], 1e-12);
            assertEquals(-2000 * 4.4482216152605, row[4], 1e-9);
            assertEquals(1000 * 4.4482216152605, row[5], 1e-9);
            assertEquals(45.359237, row[6], 1e-12);
            assertTrue(Double.isNaN(row[7]) && !source.measured());
            assertTrue(!source.next(row));
        }
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "boom.fraction,stick.fraction,bucket.fraction|0,0,0|time_s",
                "time_s,boom.fraction,stick.fraction|0,0,0|bucket",
                "time_s,boom.fraction,stick.fraction,bucket.fractoin|0,0,0,0|bucket.fractoin",
                "time_s,boom.fraction,boom.stroke_mm,stick.fraction,bucket.fraction|0,0,0,0,0|twice",
                "time_s,boom.fraction,stick.fraction,bucket.fraction,tip.x_kN|0,0,0,0,0|tip.y",
                "time_s,boom.fraction,stick.fraction,bucket.fraction,boom.cap_bar|0,0,0,0,9|every cylinder",
                "time_s,boom.fraction,stick.fraction,bucket.fraction|0,0,1.2,0|stick.fraction",
                "time_s,boom.fraction,stick.fraction,bucket.fraction|0,0,,0|stick.fraction",
                "time_s,boom.fraction,stick.fraction,bucket.fraction|0,0,NaN,0|stick.fraction",
                "time_s,boom.fraction,stick.fraction,bucket.fraction,payload_kg|0,0,0,0,-3|payload_kg",
            })
    void everyFaultNamesItsPlace(String heading, String row, String named) {
        InputException fault = assertThrows(InputException.class, () -> readAll(heading + "\n" + row + "\n"));
        assertTrue(fault.getMessage().contains(named), fault.getMessage());
        assertTrue(fault.getMessage().contains("d.csv"), fault.getMessage());
    }

    @Test
    void timeMustRise() {
        String text = "time_s,boom.fraction,stick.fraction,bucket.fraction\n0,0,0,0\n1,0,0,0\n1,0,0,0\n";
        InputException fault = assertThrows(InputException.class, () -> readAll(text));
        assertTrue(fault.getMessage().contains("row 3"), fault.getMessage());
        assertTrue(fault.getMessage().contains("time_s"), fault.getMessage());
    }
}
