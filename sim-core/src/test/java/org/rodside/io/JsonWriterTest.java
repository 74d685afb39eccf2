package org.rodside.io;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

class JsonWriterTest {

    @Test
    void layout() {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("text", "a \"b\"\n");
        tree.put("numbers", Arrays.asList(1, 2.5, Double.NaN, Double.NEGATIVE_INFINITY, -0.0, null));
        tree.put("inner", Map.of("flag", true));
        tree.put("empty", Map.of());
        assertEquals("""
                {
                  "text" : "a \\"b\\"\\n",
                  "numbers" : [ 1, 2.5, null, null, 0.0, null ],
                  "inner" : {
                    "flag" : true
                  },
                  "empty" : { }
                }
                """, JsonWriter.text(tree));
    }

    @Test
    void doublesReadBackAsTheSameWithFewestDigits() throws IOException {
        long seed = 20261201;
        SplittableRandom random = new SplittableRandom(seed);
        List<Double> values = new ArrayList<>(List.of(2e-3, 2.0e23, 0.1 + 0.2, Double.MIN_VALUE, Double.MAX_VALUE));
        for (int i = 0; i < 2000; i++) {
            double value = Double.longBitsToDouble(random.nextLong());
            values.add(Double.isFinite(value) ? value : 1.0);
        }
        String text = JsonWriter.text(Map.of("v", values));
        JsonNode back = Drawn.JSON.readTree(text).get("v");
        for (int i = 0; i < values.size(); i++) {
            assertEquals(values.get(i), back.get(i).doubleValue(), "value " + i + " of seed " + seed);
        }
        // 2e23 and 2^-44 are numbers for which older Java versions print more digits than are needed.
        assertEquals("{\n  \"v\" : 2.0E23\n}\n", JsonWriter.text(Map.of("v", 2e23)));
        assertEquals("{\n  \"v\" : 5.684341886080802E-14\n}\n", JsonWriter.text(Map.of("v", 0x1p-44)));
    }

    @Test
    void nothingElseIsWritten() {
        Map<String, Object> tree = Map.of("x", new StringBuilder("x"));
        assertThrows(IllegalArgumentException.class, () -> JsonWriter.text(tree));
    }
}
