package org.rodside.io;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaLocation;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/**
 * Holds docs/linkage.schema.json and the reader to each other, with a general-purpose validator of JSON Schema 2020-12
 * as the judge: on some thousand files broken in one place each, the schema refuses exactly those that the reader refuses
 * for a single value, and the reader refuses all that the schema refuses.
 */
class LinkageSchemaTest {

    private static final Path SCHEMA_FILE = Path.of("..", "docs", "linkage.schema.json");

    /** What is put in the place of every value; numbers stay below the limits that depend on the unit. */
    private static final List<String> REPLACEMENTS = List.of(
            "null",
            "true",
            "\"\"",
            "\" \"",
            "\"text\"",
            "\"1\"",
            "\"mm\"",
            "\"N\"",
            "\"frame\"",
            "-1",
            "0",
            "-0.0",
            "0.2",
            "0.999",
            "1",
            "1.0",
            "1.5",
            "2",
            "8",
            "9",
            "[]",
            "[1]",
            "[1, 2]",
            "[1, 2, 3]",
            "[1, null]",
            "[\"a\"]",
            "[\"a\", \"a\"]",
            "[\"a\", 1]",
            "{}",
            "{\"a\": 1}",
            "{\"cap\": 1, \"rod\": 0}",
            "{\"cap\": 1}",
            "{\"cap\": 1, \"rod\": -1}",
            "{\"mass\": 1, \"cg\": [0, 0]}",
            "{\"a\": [1, 2]}",
            "{\"length\": 1}",
            "{\"share\": 1}",
            "{\"pins\": [\"a\"]}",
            "{\"pins\": [\"a\"], \"mass\": 1}");

    private static final List<String> KEYS =
            List.of("extra", "a b", "1a", "a_b", "-a", "frame", "A-1", "é", "cap", "rod", "pins", "mass");

    private final Schema schema = SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
            .getSchema(schemaNode());

    private static JsonNode schemaNode() {
        try {
            return Drawn.JSON.readTree(Files.readAllBytes(SCHEMA_FILE));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static final ObjectNode EVERY_KEY = Drawn.edited(
            "cylinders.boom.working={\"cap\":343,\"rod\":300}",
            "cylinders.boom.back={\"cap\":0,\"rod\":5}",
            "cylinders.boom.harder_share=0.6",
            "cylinders.boom.tube={\"length\":1720,\"outside\":152}",
            "cylinders.boom.yield=5000");

    private static ObjectNode everyKey() {
        return EVERY_KEY.deepCopy();
    }

    @Test
    void theSchemaItselfIsValid() {
        Schema meta = SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
                .getSchema(SchemaLocation.of("https://json-schema.org/draft/2020-12/schema"));
        assertEquals(List.of(), meta.validate(schemaNode()));
    }

    @Test
    void everyLinkageOfTheRepositoryPassesBoth() throws IOException {
        try (Stream<Path> files = Files.list(Drawn.EXAMPLE.getParent())) {
            List<Path> linkages = files.filter(file -> file.toString().endsWith(".json")
                            && !file.toString().endsWith("-pass.json"))
                    .toList();
            int read = 0;
            for (Path file : linkages) {
                JsonNode root = Drawn.JSON.readTree(Files.readAllBytes(file));
                if (root.path("format").asText().equals(LinkageReader.FORMAT)) {
                    assertEquals(List.of(), schema.validate(root), file::toString);
                    LinkageReader.read(file, List.of());
                    read++;
                }
            }
            assertTrue(read > 0);
        }
        assertEquals(List.of(), schema.validate(everyKey()));
        assertEquals(List.of(), Drawn.faults(everyKey()));
    }

    @Test
    void bothRefuseTheSameFiles() {
        List<String> paths = new ArrayList<>();
        collect(everyKey(), "", paths);
        Set<String> edits = new LinkedHashSet<>();
        paths.forEach(path -> edits.addAll(edits(path)));
        int refused = 0;
        for (String edit : edits) {
            ObjectNode root = everyKey();
            Drawn.edit(root, edit.substring(0, edit.indexOf('=')), edit.substring(edit.indexOf('=') + 1));
            byte[] bytes = Drawn.bytes(root);
            List<String> single = LinkageReader.faultsOfSingleValues(bytes);
            List<?> schemaFaults = schema.validate(root);
            assertEquals(
                    schemaFaults.isEmpty(),
                    single.isEmpty(),
                    () -> edit + "\nschema: " + schemaFaults + "\nreader: " + single);
            assertTrue(schemaFaults.isEmpty() || !Drawn.faults(bytes).isEmpty(), edit);
            refused += schemaFaults.isEmpty() ? 0 : 1;
        }
        int taken = edits.size() - refused;
        assertTrue(refused > 3000 && taken > 300, refused + " refused, " + taken + " taken");
    }

    /** Every way in which the value at a path is broken: replaced, taken away, or given one more key. */
    private static List<String> edits(String path) {
        List<String> edits = new ArrayList<>();
        REPLACEMENTS.forEach(value -> edits.add(path + "=" + value));
        String[] steps = path.split("\\.");
        if (!Character.isDigit(steps[steps.length - 1].charAt(0))) {
            edits.add(path + "=-");
            String parent = path.substring(0, path.length() - steps[steps.length - 1].length());
            KEYS.forEach(key -> edits.add(parent + key + "=[1, 2]"));
        }
        return edits;
    }

    private static void collect(JsonNode node, String path, List<String> paths) {
        if (!path.isEmpty()) {
            paths.add(path);
        }
        if (node.isObject()) {
            node.properties().forEach(entry -> collect(entry.getValue(), JsonTree.join(path, entry.getKey()), paths));
        } else {
            for (int i = 0; i < node.size(); i++) {
                collect(node.get(i), JsonTree.join(path, String.valueOf(i)), paths);
            }
        }
    }
}
