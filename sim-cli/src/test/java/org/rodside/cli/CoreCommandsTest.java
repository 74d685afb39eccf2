package org.rodside.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import picocli.CommandLine;

/** The commands pose, dig and check from their arguments to their output, nonsense included. */
class CoreCommandsTest {

    private static final String FRONT = "../linkages/sallow-22.json";
    private static final String AT = "boom=0.4,stick=0.5,bucket=0.3";

    /** Millimetres of an inch, exactly; international yard and pound agreement 1959, from memory. */
    private static final double INCH = 25.4;

    /** The same double through two factors; no unit. */
    private static final double ROUNDING = 1e-12;

    private static final ObjectMapper JSON = new ObjectMapper().enable(DeserializationFeature.FAIL_ON_TRAILING_TOKENS);

    private String out;
    private String err;

    @TempDir
    Path folder;

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "pose | --at | boom=2,stick=0,bucket=0",
                "pose | --at | boom=nan,stick=0,bucket=0",
                "pose | --at | boom=0.4",
                "pose | --force | 1",
                "pose | --force | 1,2,3",
                "pose | --force | nan,1",
                "pose | --force | 1e300,0",
                "pose | --payload | -5",
                "pose | --payload | NaN",
                "pose | --directions | 0",
                "pose | --directions | 2000000000",
                "pose | --directions | 2.5",
                "pose | --drive | nobody",
                "pose | --units | furlong",
                "pose | --threads | 0",
                "pose | --bogus | 1",
                "dig | --at | boom=-1,stick=0,bucket=0",
                "dig | --steps | 0",
                "dig | --steps | 1",
                "dig | --steps | 99999999",
                "dig | --steps | many",
                "dig | --edge | heel",
                "dig | --units | furlong",
                "dig | --threads | -1",
                "dig | --bogus | 1",
                "check | --steps | 0",
                "check | --steps | 1",
                "check | --steps | 1000000",
                "check | --steps | many",
                "check | --units | furlong",
                "check | --threads | many",
                "check | --bogus | 1",
            })
    void nonsenseIsNamedAndEndsInStatusTwo(String command, String option, String value) {
        List<String> args = new ArrayList<>(List.of(command, FRONT, option, value));
        if (command.equals("pose") && !option.equals("--at")) {
            args.addAll(List.of("--at", AT));
        }
        assertEquals(2, run(args.toArray(String[]::new)), err);
        assertTrue(err.startsWith("rodside: ") && err.contains(option), err);
        assertEquals("", out);
    }

    @ParameterizedTest
    @ValueSource(strings = {"pose", "dig", "check"})
    void overridesMissingFilesAndMissingPosesAreFaults(String command) {
        assertEquals(2, run(command, FRONT, "--at", AT, "--set", "cylinders.boom.bor=1"));
        assertTrue(err.contains(command.equals("check") ? "--at" : "cylinders.boom.bor"), err);
        assertEquals(2, run(command, "../linkages/none.json"));
        assertTrue(err.contains("none.json"), err);
        assertEquals(2, run(command));
        assertTrue(err.contains("LINKAGE.json"), err);
    }

    @Test
    void aPoseIsWanted() {
        assertEquals(2, run("pose", FRONT));
        assertTrue(err.contains("--at: the pose is missing"), err);
    }

    @Test
    void aPassThatIsNamedMustBeThere() {
        assertEquals(2, run("study", FRONT, "--pass", "nowhere.json", "--json"));
        assertTrue(err.contains("nowhere.json: there is no such file"), err);
    }

    @Test
    void setReachesTheForces() throws IOException {
        double plain =
                json("pose", FRONT, "--at", AT).at("/cylinders/boom/cap_bar").asDouble();
        double wider = json("pose", FRONT, "--at", AT, "--set", "cylinders.boom.bore=150")
                .at("/cylinders/boom/cap_bar")
                .asDouble();
        assertTrue(wider < plain, plain + " bar becomes " + wider);
    }

    @Test
    void usUnitsChangeSuffixesAndValues() throws IOException {
        JsonNode si = json("pose", FRONT, "--at", AT);
        JsonNode us = json("pose", FRONT, "--at", AT, "--units", "us");
        double stroke = si.at("/pose/boom/stroke_mm").asDouble();
        assertEquals(stroke / INCH, us.at("/pose/boom/stroke_in").asDouble(), ROUNDING * stroke);
        assertTrue(us.at("/cylinders/boom/force_lbf").isNumber(), us.toString());
        assertTrue(us.at("/cylinders/boom/cap_psi").isNumber(), us.toString());
        for (String suffix : List.of("_mm\"", "_kN\"", "_bar\"", "_kg\"")) {
            assertFalse(out.contains(suffix), suffix);
        }
    }

    @Test
    void theSummarySaysWhatASweepLeavesOut() {
        String files = folder.resolve("dig").toString();
        assertEquals(0, run("dig", FRONT, "--steps", "3", "--ideal", "--out", files));
        assertTrue(out.contains("slip left out"), out);
        assertEquals(0, run("dig", FRONT, "--steps", "3", "--out", files));
        assertTrue(out.contains("slip counted"), out);
    }

    @ParameterizedTest
    @ValueSource(strings = {"pose", "dig", "check"})
    void jsonIsOneObjectAndWritesNothing(String command) throws IOException {
        List<String> before = files(Path.of("."));
        assertTrue(json(small(command)).isObject());
        assertEquals(before, files(Path.of(".")));
    }

    @ParameterizedTest
    @ValueSource(strings = {"dig", "check"})
    void threadsGiveTheSameBytes(String command) throws IOException {
        List<String> answers = new ArrayList<>();
        for (String threads : List.of("1", "3")) {
            Path to = folder.resolve(threads);
            assertEquals(
                    0, run(command, FRONT, "--steps", "7", "--json", "--threads", threads, "--out", to.toString()));
            answers.add(out + (command.equals("dig") ? Files.readString(to.resolve("dig.csv")) : ""));
        }
        assertEquals(answers.get(0), answers.get(1));
    }

    @ParameterizedTest
    @ValueSource(strings = {"pose", "dig", "check"})
    void helpShowsAnExample(String command) {
        assertEquals(0, run(command, "--help"));
        assertTrue(out.contains("rodside " + command + " linkages/"), out);
    }

    @Test
    void withoutToolOrMachine() throws IOException {
        Path bare = folder.resolve("bare.json");
        ObjectNode tree = (ObjectNode) JSON.readTree(Path.of(FRONT).toFile());
        tree.remove("machine");
        JSON.writeValue(bare.toFile(), tree);
        assertTrue(json("pose", bare.toString(), "--at", AT).path("ground").isMissingNode()
                || json("pose", bare.toString(), "--at", AT).path("ground").isNull());
        assertTrue(json("dig", bare.toString(), "--at", AT).at("/curl/force_kN").isNumber());
        tree.remove("tool");
        JSON.writeValue(bare.toFile(), tree);
        assertTrue(json("pose", bare.toString(), "--at", AT)
                .at("/cylinders/boom/force_kN")
                .isNumber());
        assertTrue(json("check", bare.toString(), "--steps", "5").isObject());
        assertEquals(2, run("dig", bare.toString()));
        assertTrue(err.contains("tool"), err);
        assertEquals(2, run("pose", bare.toString(), "--at", AT, "--force", "1,2"));
        assertTrue(err.contains("tool"), err);
    }

    private static String[] small(String command) {
        return command.equals("check")
                ? new String[] {command, FRONT, "--steps", "5"}
                : new String[] {command, FRONT, "--at", AT};
    }

    /** Every file of the working folder with its time: one written over by an earlier test shows as well. */
    private static List<String> files(Path where) throws IOException {
        List<String> files = new ArrayList<>();
        try (var entries = Files.walk(where)) {
            for (Path path : entries.filter(file -> !file.startsWith("./target"))
                    .sorted()
                    .toList()) {
                files.add(path + " " + Files.getLastModifiedTime(path));
            }
        }
        return files;
    }

    private JsonNode json(String... args) throws IOException {
        List<String> all = new ArrayList<>(List.of(args));
        all.add("--json");
        assertEquals(0, run(all.toArray(String[]::new)), err);
        return JSON.readTree(out);
    }

    private int run(String... args) {
        StringWriter o = new StringWriter();
        StringWriter e = new StringWriter();
        CommandLine line = Rodside.configure(new CommandLine(new Rodside()));
        int status = Rodside.run(line, new PrintWriter(o, true), new PrintWriter(e, true), args);
        out = o.toString();
        err = e.toString();
        return status;
    }
}
