package org.rodside.io;

import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assertions.fail;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.rodside.model.InputException;
import org.rodside.model.Linkage;

/** Files broken at random are read or refused in words; nothing else ever comes out of the reader. */
class LinkageFuzzTest {

    private static final long SEED = 4471;

    private static final int FILES = 4000;

    private int read;
    private int refused;

    private void attempt(byte[] bytes, List<String> overrides, String what) {
        try {
            Linkage linkage = LinkageReader.read(Drawn.NAME, bytes, overrides);
            assertTrue(linkage.cylinders().stream().allMatch(cylinder -> cylinder.bore() > cylinder.rod()), what);
            read++;
        } catch (InputException e) {
            assertFalse(e.faults().isEmpty(), what);
            for (String fault : e.faults()) {
                assertTrue(fault.startsWith("x.json: ") && fault.lines().count() == 1, () -> what + ": " + fault);
            }
            refused++;
        } catch (RuntimeException | StackOverflowError e) {
            fail(what, e);
        }
    }

    @Test
    void randomBytes() {
        byte[] right = Drawn.exampleText().getBytes(StandardCharsets.UTF_8);
        SplittableRandom random = new SplittableRandom(SEED);
        for (int file = 0; file < FILES; file++) {
            byte[] bytes = right.clone();
            for (int change = random.nextInt(1, 4); change > 0; change--) {
                bytes[random.nextInt(bytes.length)] = random.nextInt(4) == 0
                        ? (byte) random.nextInt(256)
                        : "0123456789-.eE\"{}[],: nt".getBytes(StandardCharsets.UTF_8)[random.nextInt(24)];
            }
            attempt(bytes, List.of(), "file " + file + " of seed " + SEED);
        }
        assertTrue(read > FILES / 50 && refused > FILES / 2, read + " read, " + refused + " refused");
    }

    @Test
    void randomNodes() {
        SplittableRandom random = new SplittableRandom(SEED);
        for (int file = 0; file < FILES; file++) {
            ObjectNode root = Drawn.example();
            for (int change = random.nextInt(1, 4); change > 0; change--) {
                mutate(root, random);
            }
            attempt(Drawn.bytes(root), List.of(), "file " + file + " of seed " + SEED);
        }
        assertTrue(refused > FILES / 2, read + " read, " + refused + " refused");
    }

    @Test
    void randomOverrides() {
        byte[] right = Drawn.exampleText().getBytes(StandardCharsets.UTF_8);
        SplittableRandom random = new SplittableRandom(SEED);
        String[] steps = {
            "cylinders",
            "boom",
            "bore",
            "relief",
            "cap",
            "pins",
            "boom-foot",
            "0",
            "1",
            "2",
            "",
            "tool",
            "links",
            "bucket",
            "points",
            "x"
        };
        String[] values = {
            "=1", "=", "={}", "=[]", "=[1,2]", "=null", "=text", "", "={\"a\":1,\"a\":2}", "=-1", "=1e999", "=\"boom\""
        };
        for (int file = 0; file < FILES; file++) {
            List<String> overrides = new ArrayList<>();
            for (int count = random.nextInt(1, 3); count > 0; count--) {
                StringBuilder path = new StringBuilder(steps[random.nextInt(steps.length)]);
                for (int step = random.nextInt(4); step > 0; step--) {
                    path.append('.').append(steps[random.nextInt(steps.length)]);
                }
                overrides.add(path + values[random.nextInt(values.length)]);
            }
            attempt(right, overrides, overrides + ", file " + file + " of seed " + SEED);
        }
        assertTrue(refused > FILES / 2, read + " read, " + refused + " refused");
    }

    /** Takes away, doubles under another name, moves or replaces one node somewhere in the tree. */
    private static void mutate(ObjectNode root, SplittableRandom random) {
        List<JsonNode> parents = new ArrayList<>();
        List<JsonNode> all = new ArrayList<>();
        collect(root, parents, all);
        JsonNode other = all.get(random.nextInt(all.size())).deepCopy();
        JsonNode parent = parents.get(random.nextInt(parents.size()));
        if (parent.isEmpty()) {
            return;
        }
        int place = random.nextInt(parent.size());
        int kind = random.nextInt(4);
        if (parent instanceof ArrayNode list) {
            switch (kind) {
                case 0 -> list.remove(place);
                case 1 -> list.add(list.get(place).deepCopy());
                default -> list.set(place, other);
            }
        } else if (parent instanceof ObjectNode object) {
            List<String> keys = new ArrayList<>();
            object.fieldNames().forEachRemaining(keys::add);
            String key = keys.get(place);
            switch (kind) {
                case 0 -> object.remove(key);
                case 1 -> object.set(key + random.nextInt(10), object.get(key).deepCopy());
                case 2 -> object.set(key, other);
                default -> object.put(key, (random.nextDouble() - 0.5) * Math.pow(10, random.nextInt(-320, 308)));
            }
        }
    }

    private static void collect(JsonNode node, List<JsonNode> parents, List<JsonNode> all) {
        all.add(node);
        if (node.isContainerNode()) {
            parents.add(node);
            node.forEach(child -> collect(child, parents, all));
        }
    }
}
