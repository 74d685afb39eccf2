package org.rodside.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.rodside.io.LinkageReader;
import org.rodside.kinematics.PoseBuffer;
import org.rodside.model.InputException;
import org.rodside.model.Linkage;
import org.rodside.model.Machine;
import org.rodside.statics.DenseForceSolver;
import org.rodside.statics.ForceBuffer;
import org.rodside.statics.LoadBuffer;

class LiftCapacityTest {

    /** Two ways to one load, by different solvers; no unit. */
    private static final double LOAD_REL = 1e-9;

    private static final int POINTS = 400;

    private static Front front(String file, String... overrides) {
        return Front.of(LinkageReader.read(Path.of("../linkages", file), List.of(overrides)));
    }

    private static LiftQuestion question(Front front, boolean side, boolean bare) {
        double[] at = new double[front.mechanism().cylinders()];
        Arrays.fill(at, 0.5);
        at[front.curl()] = 1;
        return new LiftQuestion(1.0, at, side, bare);
    }

    /** Every hook place made by strokes is found again, those strokes among the answers. */
    @ParameterizedTest
    @ValueSource(
            strings = {"sallow-22.json", "fenbrook-backhoe.json", "tarn-ridge-two-piece.json", "cullen-bank-shovel.json"
            })
    void inverseFindsEveryPose(String file) {
        Front front = front(file);
        FrontSolver solver = new FrontSolver(front);
        double[] at = question(front, false, false).fractions();
        HookInverse inverse = new HookInverse(solver, front.hook(), front.hoist(), front.crowd(), at);
        SplittableRandom random = new SplittableRandom(17);
        for (int i = 0; i < POINTS; i++) {
            at[front.hoist()] = i % 10 == 0 ? 1 : random.nextDouble();
            at[front.crowd()] = i % 10 == 1 ? 0 : random.nextDouble();
            solver.place(at);
            double x = front.hook().x(solver.pose());
            double y = front.hook().y(solver.pose());
            double[] wanted = at.clone();
            assertTrue(
                    inverse.solve(x, y).stream().anyMatch(found -> near(found, wanted)),
                    file + " " + Arrays.toString(wanted));
        }
    }

    private static boolean near(double[] one, double[] two) {
        for (int i = 0; i < one.length; i++) {
            if (Math.abs(one[i] - two[i]) > 1e-7) {
                return false;
            }
        }
        return true;
    }

    /** At the hydraulic capacity the named cylinder stands exactly at its limit, by the dense solver. */
    @ParameterizedTest
    @ValueSource(strings = {"sallow-22.json", "fenbrook-backhoe.json", "tarn-ridge-two-piece.json"})
    void theNamedLimitIsMetExactly(String file) {
        Front front = front(file);
        List<LiftPoint> points = LiftCapacity.chart(front, question(front, false, false), 2, done -> {});
        assertTrue(points.size() > 5);
        for (LiftPoint point : points) {
            if (point.hydraulic() == 0) {
                continue;
            }
            FrontSolver solver = new FrontSolver(front);
            solver.place(point.at());
            PoseBuffer pose = solver.pose();
            LoadBuffer loads = new LoadBuffer(front.mechanism());
            front.masses().addWeights(pose, loads);
            Place hook = front.hook();
            loads.add(hook.body(), hook.x(pose), hook.y(pose), 0, -point.hydraulic() * Linkage.GRAVITY);
            ForceBuffer forces = new ForceBuffer(front.mechanism());
            new DenseForceSolver(front.mechanism()).solve(pose, loads, forces);
            String name = point.hydraulicLimit().split("\\.")[0];
            int c = front.mechanism().cylinder(name);
            boolean push = point.hydraulicLimit().endsWith("cap");
            double most = c == front.hoist()
                    ? push
                            ? front.limits(c, false).drivingPush()
                            : front.limits(c, false).drivingPull()
                    : push
                            ? front.limits(c, false).holdingPush()
                            : front.limits(c, false).holdingPull();
            assertEquals(most, push ? forces.cylinder(c) : -forces.cylinder(c), LOAD_REL * most, point.toString());
            assertEquals(point.radius(), hook.x(pose), LOAD_REL);
            assertEquals(point.height(), hook.y(pose), LOAD_REL);
            double rated = Math.min(0.87 * point.hydraulic(), 0.75 * point.tipping());
            assertEquals(Double.isNaN(point.tipping()) ? 0.87 * point.hydraulic() : rated, point.rated(), 1e-9);
        }
    }

    /** Tipping by hand: every weight by its lever about the line, added up here from the drawing's own numbers. */
    @Test
    void tippingByLevers() {
        Front front = front("sallow-22.json");
        for (boolean side : new boolean[] {false, true}) {
            for (LiftPoint point : LiftCapacity.chart(front, question(front, side, true), 1, done -> {})) {
                Machine machine = front.machineOrFault();
                double line = side ? machine.tippingSide().getAsDouble() : machine.tippingFront();
                double stands = machine.swinging().mass()
                                * (line - machine.swinging().cg().x())
                        + machine.fixed().mass()
                                * (line - (side ? 0 : machine.fixed().cg().x()))
                        + frontMoment(front, point.at(), line);
                double expected = stands / (point.radius() - line);
                assertEquals(point.radius() > line ? expected : Double.NaN, point.tipping(), 1e-6 * Math.abs(expected));
            }
        }
    }

    private static double frontMoment(Front front, double[] at, double line) {
        FrontSolver solver = new FrontSolver(front);
        solver.place(at);
        double sum = 0;
        for (int body = 1; body < front.mechanism().bodies(); body++) {
            var link = front.linkage().links().get(body - 1);
            double mass = link.name().equals("bucket") ? 0 : link.mass();
            sum += mass * (line - solver.pose().x(body, link.cg().x(), link.cg().y()));
        }
        for (int c = 0; c < front.mechanism().cylinders(); c++) {
            var cylinder = front.linkage().cylinders().get(c);
            double half = 0.5 * cylinder.count() * cylinder.mass();
            sum += half * (line - solver.pose().pinX(front.mechanism().capPin(c)));
            sum += half * (line - solver.pose().pinX(front.mechanism().rodPin(c)));
        }
        return sum;
    }

    @Test
    void saysWhatIsMissing() {
        Front front = front(
                "sallow-22.json",
                "machine={\"swinging\":{\"mass\":9400,\"cg\":[-1120,1560]},"
                        + "\"fixed\":{\"mass\":7900,\"cg\":[0,520]},\"tipping\":{\"front\":1920,\"rear\":-1920}}");
        InputException fault = assertThrows(
                InputException.class, () -> LiftCapacity.chart(front, question(front, true, false), 1, done -> {}));
        assertTrue(fault.getMessage().contains("machine.tipping.side"), fault.getMessage());
    }
}
