package org.rodside.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.rodside.hydraulics.Column;
import org.rodside.hydraulics.CylinderLimits;
import org.rodside.io.LinkageReader;
import org.rodside.kinematics.DensePoseSolver;
import org.rodside.kinematics.Mechanism;
import org.rodside.kinematics.PoseBuffer;
import org.rodside.kinematics.PoseSolver;
import org.rodside.model.Cylinder;
import org.rodside.model.Linkage;
import org.rodside.statics.DenseForceSolver;
import org.rodside.statics.ForceBuffer;
import org.rodside.statics.LoadBuffer;

/** Worst loads against the dense solvers, which know no steps, and against a sweep twenty times finer than the grid. */
class LoadsSecondWayTest {

    /** Rounding of two solvers at poses that are not near a dead centre; no unit. */
    private static final double FORCE_REL = 1e-8;

    /** The direction of the tool force comes from a difference here, held to this share of the force; no unit. */
    private static final double DIFFERENCE_REL = 1e-5;

    /** Half the step of that difference, to both sides; in m. */
    private static final double STEP = 1e-5;

    /** A sweep may pass the optimum by no more than rounding; no unit. */
    private static final double SWEEP_REL = 1e-9;

    /** The grid of three cylinders has 21 points an axis. */
    private static final int TWENTY_TIMES_FINER = 401;

    private static Front front(String file, String... overrides) {
        return Front.of(LinkageReader.read(Path.of("../linkages", file), List.of(overrides)));
    }

    /** Poses and forces of one case by Newton and by one dense system of equations. */
    private static final class Dense {

        private final Front front;
        private final Mechanism mechanism;
        private final PoseSolver poses;
        private final DenseForceSolver forces;
        private final PoseBuffer pose;
        private final PoseBuffer moved;
        private final LoadBuffer loads;
        private final ForceBuffer found;

        Dense(Front front) {
            this.front = front;
            mechanism = front.mechanism();
            poses = new DensePoseSolver(mechanism);
            forces = new DenseForceSolver(mechanism);
            pose = new PoseBuffer(mechanism);
            moved = new PoseBuffer(mechanism);
            loads = new LoadBuffer(mechanism);
            found = new ForceBuffer(mechanism);
        }

        private void place(double[] at, int driven, double by, PoseBuffer out) {
            double[] strokes = new double[at.length];
            for (int c = 0; c < at.length; c++) {
                strokes[c] = at[c] * mechanism.stroke(c) + (c == driven ? by : 0);
            }
            assertEquals(PoseSolver.ASSEMBLED, poses.solve(strokes, out));
        }

        ForceBuffer solve(LoadCase load, double[] at) {
            place(at, -1, 0, pose);
            loads.clear();
            front.masses().addWeights(pose, loads);
            Place tip = front.tip();
            Place fill = front.fill();
            loads.add(fill.body(), fill.x(pose), fill.y(pose), 0, -load.payload() * Linkage.GRAVITY);
            loads.add(tip.body(), tip.x(pose), tip.y(pose), load.forceX(), load.forceY());
            if (load.kind() == LoadCase.Kind.CURL || load.kind() == LoadCase.Kind.CROWD) {
                int duty = load.kind() == LoadCase.Kind.CURL ? front.curl() : front.crowd();
                Digging digging = new Digging(front, Edge.TIP);
                double force = load.kind() == LoadCase.Kind.CURL
                        ? digging.curlAt(at, false).force()
                        : digging.crowdAt(at, false).orElseThrow().force();
                place(at, duty, STEP, moved);
                double dx = tip.x(moved);
                double dy = tip.y(moved);
                place(at, duty, -STEP, moved);
                dx -= tip.x(moved);
                dy -= tip.y(moved);
                double size = Math.hypot(dx, dy);
                loads.add(tip.body(), tip.x(pose), tip.y(pose), -force * dx / size, -force * dy / size);
            }
            forces.solve(pose, loads, found);
            return found;
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"sallow-22.json", "fenbrook-backhoe.json", "tarn-ridge-two-piece.json"})
    void denseSolversGiveTheSameLoads(String file) {
        Front front = front(file);
        List<LoadCase> cases = new ArrayList<>(WorstLoads.usualCases(front, 1800));
        cases.add(WorstLoads.given(front, "prod", new double[] {-12e3, 7e3, 300}));
        LoadsAnswer answer = WorstLoads.find(front, cases, 2, 1, done -> {});
        Dense dense = new Dense(front);
        for (LoadCase load : cases) {
            double tolerance = load.kind() == LoadCase.Kind.GIVEN || load.kind() == LoadCase.Kind.CARRY
                    ? FORCE_REL
                    : DIFFERENCE_REL;
            for (LoadsAnswer.OnCylinder row : answer.cylinders()) {
                if (row.loadCase().equals(load.name())) {
                    double force = dense.solve(load, row.at()).cylinder(row.cylinder());
                    assertEquals(force, row.total(), tolerance * Math.abs(force), row.toString());
                    withinLimits(front, load, row);
                }
            }
            for (LoadsAnswer.OnBearing row : answer.bearings()) {
                if (row.loadCase().equals(load.name())) {
                    ForceBuffer found = dense.solve(load, row.at());
                    double turn = dense.pose.turn(front.mechanism().bearingBody(row.bearing()));
                    // force in machine axes turned back by the link's turn: x + iy = (fx + ify)·e^(-i·turn)
                    double fx = found.bearingX(row.bearing());
                    double fy = found.bearingY(row.bearing());
                    double angle = Math.atan2(fy, fx) - turn;
                    double size = Math.hypot(fx, fy);
                    assertEquals(size, row.total(), tolerance * size, row.toString());
                    assertEquals(size * Math.cos(angle), row.x(), tolerance * size, row.toString());
                    assertEquals(size * Math.sin(angle), row.y(), tolerance * size, row.toString());
                }
            }
        }
    }

    /** Under a tool force no cylinder passes its limit where its own weight alone does not. */
    private static void withinLimits(Front front, LoadCase load, LoadsAnswer.OnCylinder row) {
        if (load.kind() != LoadCase.Kind.CURL && load.kind() != LoadCase.Kind.CROWD) {
            return;
        }
        int duty = load.kind() == LoadCase.Kind.CURL ? front.curl() : front.crowd();
        CylinderLimits limits = front.limits(row.cylinder(), false);
        double push = row.cylinder() == duty ? limits.drivingPush() : limits.holdingPush();
        double pull = row.cylinder() == duty ? limits.drivingPull() : limits.holdingPull();
        assertTrue(row.total() <= push * (1 + FORCE_REL) && -row.total() <= pull * (1 + FORCE_REL), row.toString());
    }

    /** All quantities on a plane of the stroke box through a worst pose, twenty times finer than the search's own grid. */
    @Test
    void aSweepTwentyTimesFinerThroughAWorstPoseFindsNothingWorse() {
        Front front = front("sallow-22.json");
        LoadsAnswer answer = WorstLoads.find(front, WorstLoads.usualCases(front, 1800), 2, done -> {});
        LoadCase load = LoadCase.curl();
        double[] at = answer.cylinders().stream()
                .filter(row -> row.loadCase().equals(load.name()) && row.sense() == LoadsAnswer.Sense.BUCKLE)
                .findFirst()
                .orElseThrow()
                .at()
                .clone();
        CaseSolver solver = new CaseSolver(front, load);
        List<LoadsAnswer.OnCylinder> rows = answer.cylinders().stream()
                .filter(row -> row.loadCase().equals(load.name()))
                .toList();
        List<LoadsAnswer.OnBearing> bearings = answer.bearings().stream()
                .filter(row -> row.loadCase().equals(load.name()))
                .toList();
        for (int i = 0; i < TWENTY_TIMES_FINER * TWENTY_TIMES_FINER; i++) {
            at[0] = i % TWENTY_TIMES_FINER / (TWENTY_TIMES_FINER - 1.0);
            at[1] = i / TWENTY_TIMES_FINER / (TWENTY_TIMES_FINER - 1.0);
            if (solver.solve(at)) {
                rows.forEach(row -> notWorse(row, solver));
                for (LoadsAnswer.OnBearing row : bearings) {
                    double size = size(solver, row.bearing());
                    assertTrue(size <= row.total() * (1 + SWEEP_REL), row.toString());
                }
            }
        }
    }

    private static double size(CaseSolver solver, int bearing) {
        double x = solver.bearingX(bearing);
        double y = solver.bearingY(bearing);
        return Math.sqrt(x * x + y * y);
    }

    private static void notWorse(LoadsAnswer.OnCylinder row, CaseSolver solver) {
        double worse = switch (row.sense()) {
            case PUSH -> solver.cylinder(row.cylinder()) / row.total();
            case PULL -> solver.cylinder(row.cylinder()) / row.total();
            case BUCKLE -> solver.columnWork(row.cylinder()) * row.bucklingFactor();
        };
        assertTrue(worse <= 1 + SWEEP_REL, row.toString());
    }

    /** Which eye is called the cap pin changes no force, only which part of the column is the tube. */
    @Test
    void swappedEndsCarryTheSame() {
        LoadsAnswer drawn = cylinders("tube.length=1500");
        LoadsAnswer swapped = cylinders("cap_pin=boom-rod-eye", "rod_pin=boom-cap-eye", "tube.length=1500");
        for (int i = 0; i < drawn.cylinders().size(); i++) {
            LoadsAnswer.OnCylinder one = drawn.cylinders().get(i);
            LoadsAnswer.OnCylinder two = swapped.cylinders().get(i);
            assertEquals(one.total(), two.total(), 1e-6 * Math.abs(one.total()), one + " " + two);
            if (one.total() > 0) {
                assertEquals(one.bucklingFactor(), two.bucklingFactor(), 1e-6 * one.bucklingFactor());
            }
        }
    }

    private static LoadsAnswer cylinders(String... overrides) {
        String[] full = Arrays.stream(overrides)
                .map(text ->
                        "cylinders.boom." + text.replace("tube.length=1500", "tube={\"length\":1500,\"outside\":152}"))
                .toArray(String[]::new);
        Front front = front("sallow-22.json", full);
        return WorstLoads.find(front, List.of(LoadCase.carry(1000)), 1, 1, done -> {});
    }

    /**
     * Sizes by hand: the pressure that drives a push is ((F/count + constant)/(1 − share) + back·A_rod)/A_cap, and the
     * factor of any size is no more than its column's at any pose of the loads.
     */
    @Test
    void sizesByHand() {
        Front front = front("sallow-22.json", "cylinders.boom.back={\"cap\":0,\"rod\":6}");
        LoadsAnswer loads = WorstLoads.find(front, WorstLoads.usualCases(front, 1800), 2, 1, done -> {});
        SizeQuestion question = new SizeQuestion(OptionalDouble.of(400e5), 2, 0.3, OptionalDouble.empty());
        List<SizeRow> sizes = Sizing.find(front, loads, question, 2, done -> {});
        double push = loads.cylinders().stream()
                .filter(row -> row.cylinder() == 0)
                .mapToDouble(LoadsAnswer.OnCylinder::total)
                .max()
                .orElseThrow();
        for (SizeRow size : sizes) {
            Cylinder cylinder = size.cylinder();
            double cap = Math.PI / 4 * cylinder.bore() * cylinder.bore();
            double ring = cap - Math.PI / 4 * cylinder.rod() * cylinder.rod();
            if (size.index() == 0) {
                double hand = ((push / 2 + 1600) / 0.98 + 6e5 * ring) / cap;
                assertEquals(hand, size.pushPressure(), 1e-9 * hand);
                assertEquals(2 * cap * 0.3, size.pushFlow(), 1e-12);
            }
            Column column = Column.of(cylinder);
            for (LoadsAnswer.OnCylinder row : loads.cylinders()) {
                if (row.cylinder() == size.index() && row.total() > 0) {
                    double length = cylinder.retracted() + row.at()[row.cylinder()] * cylinder.stroke();
                    assertTrue(
                            size.bucklingFactor() <= column.factor(length, row.total()) * (1 + 1e-6), size + " " + row);
                }
            }
        }
    }

    /**
     * A lever whose cylinder ends its stroke in line with the pivot: the force grows without end there. What is told is
     * finite, a note says that no relief holds it, and the pose in line is counted as left out or passed over.
     */
    @Test
    void deadCentreIsToldNotHidden() {
        String json = "{\"format\":\"rodside-linkage/1\",\"name\":\"dead\",\"units\":{\"length\":\"m\",\"mass\":\"kg\","
                + "\"pressure\":\"bar\"},\"pins\":{\"p\":[0,0],\"c\":[-1,0],\"e\":[0,0.5]},\"frame\":{\"pins\":[\"p\",\"c\"]},"
                + "\"links\":{\"arm\":{\"pins\":[\"p\",\"e\"],\"mass\":100,\"cg\":[1,0.5]}},\"cylinders\":{\"c\":{"
                + "\"cap_pin\":\"c\",\"rod_pin\":\"e\",\"bore\":0.1,\"rod\":0.06,\"retracted\":0.8,\"stroke\":0.7,"
                + "\"working\":250,\"relief\":280}}}";
        Front front = Front.of(LinkageReader.read("dead.json", json.getBytes(StandardCharsets.UTF_8), List.of()));
        LoadsAnswer answer = WorstLoads.find(front, WorstLoads.usualCases(front, 1800), 1, done -> {});
        LoadsAnswer.OnCylinder pull = answer.cylinders().get(0);
        assertTrue(pull.total() < -1e6 && pull.total() > Double.NEGATIVE_INFINITY, pull.toString());
        assertTrue(pull.reliefMargin() < 1, pull.toString());
        assertTrue(
                answer.notes().stream().anyMatch(note -> note.contains("dead centre")),
                answer.notes().toString());
        SizeQuestion question = new SizeQuestion(OptionalDouble.empty(), 3.5, 0.3, OptionalDouble.empty());
        SizeRow present = Sizing.find(front, answer, question, 1, done -> {}).get(0);
        assertEquals(Double.POSITIVE_INFINITY, present.bucklingFactor(), 0.0, "it never pushes");
        assertTrue(!present.carries());
    }
}
