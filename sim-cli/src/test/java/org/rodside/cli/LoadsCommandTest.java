package org.rodside.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The commands loads and size on a real file: files, columns, units, faults. */
class LoadsCommandTest {

    private static final String FRONT = "../linkages/sallow-22.json";

    @TempDir
    private Path folder;

    private final StringWriter out = new StringWriter();
    private final StringWriter err = new StringWriter();

    private int run(String... args) {
        return Rodside.run(new PrintWriter(out), new PrintWriter(err), args);
    }

    private List<String> lines(String name) throws IOException {
        return Files.readAllLines(folder.resolve(name));
    }

    @Test
    void loadsWritesBothTablesAndTellsTheCautions() throws IOException {
        assertEquals(0, run("loads", FRONT, "--out", folder.toString(), "--case", "prod=-12,7,300"), err.toString());
        List<String> loads = lines("loads.csv");
        assertEquals(
                "cylinder,sense,case,total_kN,each_kN,cap_bar,rod_bar,relief_margin,buckling_factor,"
                        + "boom.fraction,stick.fraction,bucket.fraction",
                loads.get(0));
        for (String name : List.of("carry", "curl", "crowd", "prod")) {
            assertTrue(loads.stream().anyMatch(line -> line.startsWith("boom,push," + name + ",")), name);
        }
        List<String> bearings = lines("bearings.csv");
        assertEquals("pin,link,case,total_kN,x_kN,y_kN,boom.fraction,stick.fraction,bucket.fraction", bearings.get(0));
        // 17 places where a pin sits in a link, four cases
        assertEquals(1 + 17 * 4, bearings.size());
        assertTrue(out.toString().contains("Cautions:"), out.toString());
    }

    @Test
    void jsonInUsUnitsWritesNoFile() throws IOException {
        assertEquals(0, run("loads", FRONT, "--json", "--units", "us"), err.toString());
        assertTrue(out.toString().contains("\"total_lbf\""), out.toString());
        assertTrue(!out.toString().contains("_kN"), out.toString());
        assertTrue(out.toString().contains("\"cautions\""), out.toString());
    }

    @Test
    void everyFaultOfTheCasesAtOnce() {
        assertEquals(
                2,
                run(
                        "loads",
                        FRONT,
                        "--json",
                        "--case",
                        "a=1,2",
                        "--case",
                        "curl=1,2,3",
                        "--case",
                        "b=1,x,4",
                        "--density",
                        "-3"));
        assertEquals(4, err.toString().lines().count(), err.toString());
    }

    @Test
    void sizeTakesTheLoadedColumn() throws IOException {
        assertEquals(
                0,
                run("size", FRONT, "--out", folder.toString(), "--column", "loaded", "--eccentricity", "3"),
                err.toString());
        List<String> sizes = lines("size.csv");
        int factor = List.of(sizes.get(0).split(",")).indexOf("buckling_factor");
        int loaded = List.of(sizes.get(0).split(",")).indexOf("loaded_factor");
        for (String line : sizes.subList(1, sizes.size())) {
            String[] cells = line.split(",");
            assertTrue(Double.parseDouble(cells[loaded]) < Double.parseDouble(cells[factor]), line);
        }
        assertEquals(2, run("size", FRONT, "--json", "--pressure", "-1"));
    }
}
