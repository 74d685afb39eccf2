package org.rodside.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.rodside.io.LinkageReader;
import org.rodside.model.InputException;
import org.rodside.model.Linkage;

class ClosureTest {

    private static Front front(String... overrides) {
        return Front.of(LinkageReader.read(Path.of("../linkages/sallow-22.json"), List.of(overrides)));
    }

    @Test
    void theDemoAssemblesEverywhere() {
        ClosureAnswer answer = Closure.of(front(), 11);
        assertEquals(1331, answer.poses());
        assertEquals(1331, answer.assembled());
        assertTrue(answer.firstFailure().isEmpty());
        assertTrue(answer.closedForm());
        answer.corners().forEach(corner -> assertTrue(Double.isNaN(corner.smallestFailing())));
    }

    /** By hand: the boom's lever arm is twice the triangle's area over the cylinder length, smallest here when retracted. */
    @Test
    void leverArmByTheTrianglesArea() {
        Front front = front();
        ClosureAnswer.Corner boom = Closure.of(front, 3).corners().get(0);
        double a = Math.hypot(120 - 550, 1780 - 1100) / 1000;
        double b = Math.hypot(1780.7 - 120, 3758.9 - 1780) / 1000;
        double length = 1.850;
        double s = (a + b + length) / 2;
        double area = Math.sqrt(s * (s - a) * (s - b) * (s - length));
        assertEquals(0, boom.armAt()[0], 1e-6);
        assertEquals(2 * area / length, boom.arm(), 1e-9);
    }

    @Test
    void aStrokeTooLongIsFound() {
        ClosureAnswer answer = Closure.of(front("cylinders.bucket.stroke=1400"), 21);
        assertTrue(answer.assembled() < answer.poses());
        assertEquals("rocker", answer.failingLink());
        ClosureAnswer.Corner bucket = answer.corners().get(2);
        assertEquals(1, bucket.largestFailing(), 0.0);
        assertTrue(bucket.smallestFailing() > 0.8);
        assertTrue(bucket.angle() < Math.toRadians(0.1), "the loop ends at its dead centre");
    }

    /** Counting freedoms passes this one: a frame-to-frame truss is locked twice while a link swings free. */
    @Test
    void aLockedPartWithALooseOneIsRefused() {
        String json =
                "{\"format\":\"rodside-linkage/1\",\"name\":\"x\",\"units\":{\"length\":\"m\",\"mass\":\"kg\",\"pressure\":"
                        + "\"bar\"},\"pins\":{\"a\":[0,0],\"b\":[2,0],\"c\":[1,1],\"d\":[3,1],\"e\":[0,3],\"f\":[4,0],\"g\":[5,2]},"
                        + "\"frame\":{\"pins\":[\"a\",\"b\",\"e\",\"f\"]},\"links\":{\"one\":{\"pins\":[\"a\",\"c\"]},\"two\":{\"pins\":"
                        + "[\"b\",\"c\"]},\"loose\":{\"pins\":[\"f\",\"g\"]}},\"cylinders\":{\"k\":{\"cap_pin\":\"e\",\"rod_pin\":\"c\","
                        + "\"bore\":0.1,\"rod\":0.05,\"retracted\":2,\"stroke\":1,\"working\":200,\"relief\":220}}}";
        Linkage linkage = null;
        try {
            linkage = LinkageReader.read(
                    "x.json", json.replace(",\"d\":[3,1]", "").getBytes(StandardCharsets.UTF_8), List.of());
        } catch (InputException refused) {
            assertTrue(refused.getMessage().contains("degrees of freedom"), refused.getMessage());
            return;
        }
        Linkage read = linkage;
        assertThrows(InputException.class, () -> Front.of(read));
    }
}
