package org.rodside.study;

import static org.junit.jupiter.api.Assertions.assertEquals;

import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.rodside.io.LinkageReader;

/** Rated forces do not hang on the order in which a file names its cylinders. */
class RatedForceTest {

    /** The curl stroke of a smooth top is told to 1e-8 of the stroke. */
    private static final double FORCE_REL = 1e-7;

    private static Front reversed(Path file) throws IOException {
        ObjectMapper json = new ObjectMapper();
        ObjectNode linkage = (ObjectNode) json.readTree(Files.readString(file));
        ObjectNode cylinders = (ObjectNode) linkage.get("cylinders");
        List<String> names = new ArrayList<>();
        cylinders.fieldNames().forEachRemaining(names::add);
        Collections.reverse(names);
        ObjectNode turned = json.createObjectNode();
        names.forEach(name -> turned.set(name, cylinders.get(name)));
        linkage.set("cylinders", turned);
        return Front.of(LinkageReader.read("reversed.json", json.writeValueAsBytes(linkage), List.of()));
    }

    @ParameterizedTest
    @ValueSource(
            strings = {"sallow-22.json", "fenbrook-backhoe.json", "tarn-ridge-two-piece.json", "cullen-bank-shovel.json"
            })
    void sameForceAndLimitInAnyOrder(String file) throws IOException {
        Path path = Path.of("../linkages", file);
        Digging drawn = new Digging(Front.of(LinkageReader.read(path, List.of())), Edge.TIP);
        Digging turned = new Digging(reversed(path), Edge.TIP);
        same(drawn.ratedCurl(), turned.ratedCurl());
        same(drawn.ratedCrowd().orElseThrow(), turned.ratedCrowd().orElseThrow());
    }

    private static void same(DigForce one, DigForce two) {
        assertEquals(one.force(), two.force(), FORCE_REL * one.force());
        assertEquals(one.limit(), two.limit());
    }
}
