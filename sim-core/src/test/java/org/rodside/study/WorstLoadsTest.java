package org.rodside.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.OptionalDouble;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.rodside.hydraulics.Column;
import org.rodside.io.LinkageReader;
import org.rodside.model.Cylinder;
import org.rodside.model.Linkage;

class WorstLoadsTest {

    /** A finer search finds nothing worse than this share beyond the usual one; 0.01 % is asked of buckling factors. */
    private static final double FINER_REL = 1e-4;

    private static final int FINER = 4;

    private static final int RANDOM_POSES = 100_000;

    private static Front front(String file, String... overrides) {
        return Front.of(LinkageReader.read(Path.of("../linkages", file), List.of(overrides)));
    }

    private static LoadsAnswer find(Front front, int threads, int refinement) {
        return WorstLoads.find(front, WorstLoads.usualCases(front, 1800), threads, refinement, done -> {});
    }

    @ParameterizedTest
    @ValueSource(strings = {"sallow-22.json", "fenbrook-backhoe.json", "cullen-bank-shovel.json"})
    void aFinerSearchFindsNothingWorse(String file) {
        Front front = front(file);
        LoadsAnswer usual = find(front, 2, 2);
        LoadsAnswer finer = find(front, 2, FINER);
        assertEquals(finer.cylinders().size(), usual.cylinders().size());
        for (int i = 0; i < usual.cylinders().size(); i++) {
            LoadsAnswer.OnCylinder one = usual.cylinders().get(i);
            LoadsAnswer.OnCylinder two = finer.cylinders().get(i);
            double size = Math.abs(two.total());
            if (one.sense() == LoadsAnswer.Sense.BUCKLE) {
                assertTrue(one.bucklingFactor() <= two.bucklingFactor() * (1 + FINER_REL), one + " " + two);
            } else {
                assertTrue(Math.abs(one.total()) >= size * (1 - FINER_REL), one + " " + two);
            }
        }
        for (int i = 0; i < usual.bearings().size(); i++) {
            assertTrue(
                    usual.bearings().get(i).total() >= finer.bearings().get(i).total() * (1 - FINER_REL),
                    usual.bearings().get(i) + " " + finer.bearings().get(i));
        }
    }

    @Test
    void noPoseAtRandomIsWorse() {
        Front front = front("tarn-ridge-two-piece.json");
        LoadsAnswer worst = find(front, 2, 1);
        SplittableRandom random = new SplittableRandom(5);
        for (LoadCase load : worst.cases()) {
            CaseSolver solver = new CaseSolver(front, load);
            for (int i = 0; i < RANDOM_POSES; i++) {
                double[] at = random.doubles(front.mechanism().cylinders()).toArray();
                assertTrue(solver.solve(at));
                for (LoadsAnswer.OnCylinder row : worst.cylinders()) {
                    if (row.loadCase().equals(load.name())) {
                        notWorse(front, row, solver);
                    }
                }
            }
        }
    }

    private static void notWorse(Front front, LoadsAnswer.OnCylinder row, CaseSolver solver) {
        double force = solver.cylinder(row.cylinder());
        switch (row.sense()) {
            case PUSH -> assertTrue(force <= row.total() * (1 + FINER_REL), row.toString());
            case PULL -> assertTrue(force >= row.total() * (1 + FINER_REL), row.toString());
            default -> {
                Cylinder cylinder = front.linkage().cylinders().get(row.cylinder());
                double factor = Column.of(cylinder).factor(solver.pose().length(row.cylinder()), force);
                assertTrue(factor >= row.bucklingFactor() * (1 - FINER_REL), row.toString());
            }
        }
    }

    @Test
    void threadsChangeNothing() {
        Front front = front("sallow-22.json");
        LoadsAnswer one = find(front, 1, 1);
        LoadsAnswer three = find(front, 3, 1);
        for (int i = 0; i < one.cylinders().size(); i++) {
            assertEquals(
                    one.cylinders().get(i).total(), three.cylinders().get(i).total(), 0.0);
        }
        for (int i = 0; i < one.bearings().size(); i++) {
            assertEquals(one.bearings().get(i).x(), three.bearings().get(i).x(), 0.0);
        }
    }

    /**
     * Hand case: a level arm of length 2 m on a pivot with 1000 kg at its end, held by a vertical cylinder 1 m out, far below:
     * the cylinder carries 2 · 9806.65 N, the pivot pulls down with the rest.
     */
    @Test
    void leverByHand() {
        String json =
                "{\"format\":\"rodside-linkage/1\",\"name\":\"lever\",\"units\":{\"length\":\"m\",\"mass\":\"kg\","
                        + "\"pressure\":\"bar\"},\"pins\":{\"p\":[0,10],\"c\":[1,0],\"e\":[1,10]},\"frame\":{\"pins\":[\"p\",\"c\"]},"
                        + "\"links\":{\"arm\":{\"pins\":[\"p\",\"e\"],\"mass\":1000,\"cg\":[2,10]}},\"cylinders\":{\"c\":{"
                        + "\"cap_pin\":\"c\",\"rod_pin\":\"e\",\"count\":2,\"harder_share\":0.6,\"bore\":0.1,\"rod\":0.07,"
                        + "\"retracted\":9.999999,\"stroke\":0.000002,\"working\":250,\"relief\":280}}}";
        Linkage linkage = LinkageReader.read("lever.json", json.getBytes(StandardCharsets.UTF_8), List.of());
        LoadsAnswer answer = find(Front.of(linkage), 1, 1);
        LoadsAnswer.OnCylinder push = answer.cylinders().get(0);
        // the stroke of 2 µm turns the arm by 1e-6 rad: six digits remain
        assertEquals(2 * 9806.65, push.total(), 2 * 9806.65e-6 * 2);
        assertEquals(0.6 * push.total(), push.each(), 1e-9);
        assertEquals(push.total() / 2 / (Math.PI / 4 * 0.01), push.cap(), 1e-3);
        assertEquals(280e5 / push.cap(), push.reliefMargin(), 1e-9);
    }

    @Test
    void presentSizeIsJudgedByTheWorstLoads() {
        Front front = front("sallow-22.json");
        LoadsAnswer loads = find(front, 1, 1);
        SizeQuestion question = new SizeQuestion(OptionalDouble.of(385e5), 1.9, 0.3, OptionalDouble.of(0.005));
        List<SizeRow> rows = Sizing.find(front, loads, question, 2, done -> {});
        for (int c = 0; c < 3; c++) {
            int cylinder = c;
            SizeRow present = rows.stream()
                    .filter(r -> r.index() == cylinder && r.present())
                    .findFirst()
                    .orElseThrow();
            double factor = loads.cylinders().stream()
                    .filter(l -> l.cylinder() == cylinder && l.sense() == LoadsAnswer.Sense.BUCKLE)
                    .mapToDouble(LoadsAnswer.OnCylinder::bucklingFactor)
                    .min()
                    .orElseThrow();
            assertEquals(factor, present.bucklingFactor(), 1e-6 * factor);
            assertTrue(
                    present.carries(),
                    "reliefs open at 373 bar, friction takes less than 12 of 385, factor 1.9 is below the smallest");
            assertTrue(present.loadedFactor() < present.bucklingFactor());
        }
        assertTrue(rows.stream().allMatch(r -> r.present() || r.carries()));
    }
}
