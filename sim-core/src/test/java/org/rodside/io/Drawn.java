package org.rodside.io;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.rodside.model.InputException;

/** Edited copies of the example linkage, for tests. */
final class Drawn {

    static final Path EXAMPLE = Path.of("..", "linkages", "sallow-22.json");

    static final ObjectMapper JSON = new ObjectMapper();

    /** What to call the source in tests. */
    static final String NAME = "x.json";

    private Drawn() {}

    static ObjectNode example() {
        try {
            return (ObjectNode) JSON.readTree(Files.readAllBytes(EXAMPLE));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    static String exampleText() {
        try {
            return Files.readString(EXAMPLE);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Puts a value, given as JSON text, at a path; {@code -} takes the key away. */
    static void edit(ObjectNode root, String path, String value) {
        try {
            String[] steps = path.split("\\.");
            JsonNode parent = root;
            for (int i = 0; i < steps.length - 1; i++) {
                parent = parent.isArray() ? parent.get(Integer.parseInt(steps[i])) : parent.get(steps[i]);
            }
            String key = steps[steps.length - 1];
            if (parent instanceof ArrayNode list) {
                if (Integer.parseInt(key) == list.size()) {
                    list.add(JSON.readTree(value));
                } else {
                    list.set(Integer.parseInt(key), JSON.readTree(value));
                }
            } else if (value.equals("-")) {
                ((ObjectNode) parent).remove(key);
            } else {
                ((ObjectNode) parent).set(key, JSON.readTree(value));
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** The example with edits written {@code path=json} (or {@code path=-}). */
    static ObjectNode edited(String... edits) {
        ObjectNode root = example();
        for (String edit : edits) {
            int equals = edit.indexOf('=');
            edit(root, edit.substring(0, equals), edit.substring(equals + 1));
        }
        return root;
    }

    static byte[] bytes(JsonNode root) {
        return root.toString().getBytes(StandardCharsets.UTF_8);
    }

    static List<String> faults(JsonNode root) {
        return faults(bytes(root));
    }

    static List<String> faults(String text) {
        return faults(text.getBytes(StandardCharsets.UTF_8));
    }

    /** The faults of a file, none when it is read. */
    static List<String> faults(byte[] bytes, String... overrides) {
        try {
            LinkageReader.read(NAME, bytes, List.of(overrides));
            return List.of();
        } catch (InputException e) {
            return e.faults();
        }
    }
}
