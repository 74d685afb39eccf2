package org.rodside.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/**
 * The sample run kept in results/sample, made anew and compared field by field. To write it anew after a change that is meant:
 * {@code mvn -pl sim-cli -am test -Dtest=SampleRunTest -Dsurefire.failIfNoSpecifiedTests=false -DargLine=-Drodside.sample=write};
 * then read the difference before committing it.
 */
class SampleRunTest {

    private static final Path SAMPLE = Path.of("../results/sample/study.json");

    /** Searches end within 1e-6 of a top on any processor; places on a flat top may differ and are not compared. */
    private static final double SAMPLE_REL = 1e-5;

    /** Below this a number is rounding; in any unit of the sample. */
    private static final double NOTHING = 1e-6;

    private final List<String> differences = new ArrayList<>();
    private int compared;

    @Test
    void theSampleRunComesOutAgain() throws IOException {
        StringWriter out = new StringWriter();
        StringWriter err = new StringWriter();
        int status = Rodside.run(
                new PrintWriter(out), new PrintWriter(err), "study", "../linkages/sallow-22.json", "--json");
        assertEquals(0, status, err.toString());
        if ("write".equals(System.getProperty("rodside.sample"))) {
            Files.writeString(SAMPLE, out.toString());
        }
        ObjectMapper mapper = new ObjectMapper();
        compare("", mapper.readTree(SAMPLE.toFile()), mapper.readTree(out.toString()));
        assertEquals(List.of(), differences);
        assertTrue(compared > 300, "only " + compared + " values compared");
    }

    private void compare(String path, JsonNode kept, JsonNode made) {
        if (path.endsWith("/at") || path.endsWith("_at") || path.contains("/at/") || path.contains("_at/")) {
            return;
        }
        if (kept.isObject()) {
            assertEquals(List.copyOf(names(kept)), List.copyOf(names(made)), path);
            names(kept).forEach(name -> compare(path + "/" + name, kept.get(name), made.get(name)));
        } else if (kept.isArray()) {
            assertEquals(kept.size(), made.size(), path);
            for (int i = 0; i < kept.size(); i++) {
                compare(path + "/" + i, kept.get(i), made.get(i));
            }
        } else {
            leaf(path, kept, made);
        }
    }

    private void leaf(String path, JsonNode kept, JsonNode made) {
        compared++;
        boolean same = kept.isNumber() && made.isNumber()
                ? Math.abs(kept.asDouble() - made.asDouble()) <= NOTHING + SAMPLE_REL * Math.abs(kept.asDouble())
                : kept.equals(made);
        if (!same && !onAFlatTop(path)) {
            differences.add(path + ": kept " + kept + ", made " + made);
        }
    }

    /** A buckling factor or bearing direction told beside a load that is largest over a whole area belongs to the pose found. */
    private static boolean onAFlatTop(String path) {
        return path.endsWith("/push/buckling_factor") || path.endsWith("/pull/buckling_factor");
    }

    private static List<String> names(JsonNode node) {
        List<String> names = new ArrayList<>();
        node.fieldNames().forEachRemaining(names::add);
        return names;
    }
}
