package org.rodside.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.rodside.io.LinkageReader;

/** The curl stroke of rated forces against a plain scan of strokes. */
class CurlStrokeTest {

    /** The scan steps past the best stroke by half a step: a force falls by the square of that. */
    private static final double SCAN_REL = 1e-4;

    /** Forces of a range of best strokes are the same to this; the search for them ends at 1e-9. */
    private static final double SAME_REL = 1e-8;

    private static final int STROKES = 101;

    private static Front front(String file) {
        return Front.of(LinkageReader.read(Path.of("../linkages", file), List.of()));
    }

    private static double[] curlAt(Front front, double stroke) {
        double[] fixed = new double[front.mechanism().cylinders()];
        Arrays.fill(fixed, Double.NaN);
        fixed[front.curl()] = stroke;
        return fixed;
    }

    private static DigSolver ideal(Front front) {
        return new DigSolver(new FrontSolver(front), front.tip(), front.curl(), true);
    }

    private static double alone(Front front, double stroke) {
        DigSolver dig = ideal(front);
        return new BoxMaximum(curlAt(front, stroke)).find(dig::alone).value();
    }

    @ParameterizedTest
    @ValueSource(strings = {"sallow-22.json", "fenbrook-backhoe.json", "cullen-bank-shovel.json"})
    void curlAloneIsLargestThere(String file) {
        Front front = front(file);
        double found = alone(front, new CurlStroke(front, ideal(front)).find());
        double scanned = 0;
        for (int i = 0; i < STROKES; i++) {
            scanned = Math.max(scanned, alone(front, i / (STROKES - 1.0)));
        }
        assertEquals(scanned, found, SCAN_REL * scanned);
        assertTrue(found >= scanned * (1 - SAME_REL));
    }

    /** On the shovel a third of the curl strokes give the same force; the rated curl force is the largest of theirs. */
    @Test
    void ofEqualStrokesTheOneWithTheLargestRatedForce() {
        Front front = front("cullen-bank-shovel.json");
        double rated = new Digging(front, Edge.TIP).ratedCurl().force();
        double most = alone(front, new CurlStroke(front, ideal(front)).find());
        double best = 0;
        int equal = 0;
        for (int i = 0; i < STROKES; i++) {
            double stroke = i / (STROKES - 1.0);
            if (alone(front, stroke) >= most * (1 - SAME_REL)) {
                equal++;
                DigSolver dig = ideal(front);
                best = Math.max(
                        best,
                        new BoxMaximum(curlAt(front, stroke))
                                .find(dig.asObjective())
                                .value());
            }
        }
        assertTrue(equal > 20, equal + " strokes");
        assertTrue(rated >= best, rated + " " + best);
        // the largest lies within a step of the range's end, over which the force rises by half a percent
        assertEquals(best, rated, 5e-3 * best);
    }
}
