package org.rodside.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.SplittableRandom;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.LUDecomposition;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.rodside.io.LinkageReader;
import org.rodside.kinematics.Mechanism;
import org.rodside.kinematics.MotionBuffer;
import org.rodside.kinematics.PoseBuffer;
import org.rodside.model.InputException;
import org.rodside.model.Linkage;
import org.rodside.statics.Masses;
import org.rodside.table.RowSource;

class HistoryTest {

    /** Windowed against whole spline, and both against a dense solve; share of the largest value. */
    private static final double SPLINE_REL = 1e-9;

    /** Power in against power out; share of the peak power. */
    private static final double POWER_REL = 1e-9;

    /** A known tip force from the pressures it makes; share of its size. */
    private static final double FIT_REL = 1e-9;

    private static final int ROWS = 700;

    private static Front front(String file) {
        return Front.of(LinkageReader.read(Path.of("../linkages", file), List.of()));
    }

    /** A smooth motion well inside every stroke, unevenly sampled, with forces and a payload that change. */
    private static List<double[]> duty(Front front, int count) {
        int n = front.mechanism().cylinders();
        SplittableRandom random = new SplittableRandom(23);
        List<double[]> rows = new ArrayList<>();
        double time = 0;
        for (int i = 0; i < count; i++) {
            double[] row = new double[4 + 3 * n];
            Arrays.fill(row, 4 + n, row.length, Double.NaN);
            row[0] = time;
            for (int c = 0; c < n; c++) {
                row[1 + c] = front.mechanism().stroke(c) * (0.5 + 0.35 * Math.sin((0.7 + 0.4 * c) * time + c));
            }
            row[1 + n] = 2e4 * Math.sin(time);
            row[2 + n] = 3e4 * Math.cos(1.7 * time);
            row[3 + n] = 500 + 200 * Math.sin(0.5 * time);
            rows.add(row);
            time += 0.004 + 0.02 * random.nextDouble();
        }
        return rows;
    }

    private static RowSource source(List<double[]> rows) {
        return new RowSource() {
            private int next;

            @Override
            public boolean next(double[] values) {
                if (next == rows.size()) {
                    return false;
                }
                System.arraycopy(rows.get(next++), 0, values, 0, values.length);
                return true;
            }

            @Override
            public String name() {
                return "test";
            }
        };
    }

    private static List<double[]> run(Front front, List<double[]> duty, boolean measured, boolean atRest, int block) {
        List<double[]> out = new ArrayList<>();
        HistoryQuestion question = new HistoryQuestion(measured, atRest, Double.POSITIVE_INFINITY);
        new History(front, question, block).run(source(duty), row -> out.add(row.clone()), time -> {});
        return out;
    }

    @ParameterizedTest
    @ValueSource(ints = {1, 7, 64, 300})
    void windowsEqualTheWholeSpline(int block) {
        Front front = front("sallow-22.json");
        List<double[]> duty = duty(front, ROWS);
        List<double[]> whole = run(front, duty, false, false, ROWS + 10);
        List<double[]> windows = run(front, duty, false, false, block);
        assertEquals(ROWS, windows.size());
        for (int column = 0; column < whole.get(0).length; column++) {
            double most = 0;
            for (double[] row : whole) {
                most = Math.max(most, Math.abs(row[column]));
            }
            for (int i = 0; i < ROWS; i++) {
                assertEquals(whole.get(i)[column], windows.get(i)[column], SPLINE_REL * most, "row " + i);
            }
        }
    }

    /** Second way: the not-a-knot spline's equations solved as one dense system by a general library (commons-math3). */
    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3, 4, 5, 40})
    void splineAgainstADenseSolve(int n) {
        SplittableRandom random = new SplittableRandom(n);
        double[] t = new double[n];
        double[] y = new double[n];
        StrokeSplineSolver spline = new StrokeSplineSolver(1, 100);
        for (int i = 0; i < n; i++) {
            t[i] = i == 0 ? 0 : t[i - 1] + 0.1 + random.nextDouble();
            y[i] = random.nextDouble();
            spline.add(t[i], new double[] {y[i]}, 0);
        }
        spline.solveLast();
        double[] m = n < 4 ? few(t, y) : dense(t, y);
        for (int i = 0; i < n; i++) {
            assertEquals(m[i], spline.acceleration(0, i), 1e-9 * 100, "n " + n + " i " + i);
        }
    }

    private static double[] few(double[] t, double[] y) {
        double[] m = new double[t.length];
        if (t.length == 3) {
            double s0 = (y[1] - y[0]) / (t[1] - t[0]);
            double s1 = (y[2] - y[1]) / (t[2] - t[1]);
            Arrays.fill(m, 2 * (s1 - s0) / (t[2] - t[0]));
        }
        return m;
    }

    private static double[] dense(double[] t, double[] y) {
        int n = t.length;
        double[][] a = new double[n][n];
        double[] b = new double[n];
        for (int i = 1; i < n - 1; i++) {
            double h0 = t[i] - t[i - 1];
            double h1 = t[i + 1] - t[i];
            a[i][i - 1] = h0;
            a[i][i] = 2 * (h0 + h1);
            a[i][i + 1] = h1;
            b[i] = 6 * ((y[i + 1] - y[i]) / h1 - (y[i] - y[i - 1]) / h0);
        }
        for (int end : new int[] {0, n - 3}) {
            int row = end == 0 ? 0 : n - 1;
            double h0 = t[end + 1] - t[end];
            double h1 = t[end + 2] - t[end + 1];
            a[row][end] = 1 / h0;
            a[row][end + 1] = -1 / h0 - 1 / h1;
            a[row][end + 2] = 1 / h1;
        }
        return new LUDecomposition(new Array2DRowRealMatrix(a))
                .getSolver()
                .solve(new ArrayRealVector(b))
                .toArray();
    }

    /** Σ F·v of the cylinders = growth of kinetic and potential energy + work on the ground. */
    @ParameterizedTest
    @ValueSource(
            strings = {"sallow-22.json", "fenbrook-backhoe.json", "tarn-ridge-two-piece.json", "cullen-bank-shovel.json"
            })
    void powerBalances(String file) {
        Front front = front(file);
        int n = front.mechanism().cylinders();
        SplittableRandom random = new SplittableRandom(41);
        HistorySolver solver = new HistorySolver(front, new HistoryQuestion(false, false, Double.POSITIVE_INFINITY));
        double[] out = new double[solver.columns().size()];
        for (double[] row : duty(front, 200)) {
            double[] rates = random.doubles(n, -0.4, 0.4).toArray();
            double[] accelerations = random.doubles(n, -2, 2).toArray();
            solver.solve(row, rates, accelerations, out);
            double given = 0;
            double size = 0;
            for (int c = 0; c < n; c++) {
                given += out[3 + 6 * c] * rates[c];
                size += Math.abs(out[3 + 6 * c] * rates[c]);
            }
            assertEquals(taken(front, solver, row), given, POWER_REL * size, file);
        }
    }

    private static double taken(Front front, HistorySolver solver, double[] row) {
        Mechanism mechanism = front.mechanism();
        PoseBuffer pose = solver.pose();
        MotionBuffer motion = solver.motion();
        Masses masses = front.masses();
        int n = mechanism.cylinders();
        double sum = 0;
        for (int body = 1; body < mechanism.bodies(); body++) {
            double x = pose.x(body, masses.cgX(body), masses.cgY(body));
            double y = pose.y(body, masses.cgX(body), masses.cgY(body));
            sum += masses.mass(body)
                    * (motion.vx(pose, body, x, y) * motion.ax(pose, body, x, y)
                            + motion.vy(pose, body, x, y) * (motion.ay(pose, body, x, y) + Linkage.GRAVITY));
            sum += masses.inertia(body) * motion.omega(body) * motion.alpha(body);
        }
        for (int pin = 0; pin < mechanism.pins(); pin++) {
            sum += masses.eyeMass(pin)
                    * (motion.pinVx(pin) * motion.pinAx(pin)
                            + motion.pinVy(pin) * (motion.pinAy(pin) + Linkage.GRAVITY));
        }
        Place fill = front.fill();
        double x = fill.x(pose);
        double y = fill.y(pose);
        sum += row[3 + n]
                * (motion.vx(pose, fill.body(), x, y) * motion.ax(pose, fill.body(), x, y)
                        + motion.vy(pose, fill.body(), x, y) * (motion.ay(pose, fill.body(), x, y) + Linkage.GRAVITY));
        Place tip = front.tip();
        double vx = motion.vx(pose, tip.body(), tip.x(pose), tip.y(pose));
        double vy = motion.vy(pose, tip.body(), tip.x(pose), tip.y(pose));
        return sum - row[1 + n] * vx - row[2 + n] * vy;
    }

    @ParameterizedTest
    @ValueSource(strings = {"sallow-22.json", "fenbrook-backhoe.json", "tarn-ridge-two-piece.json"})
    void recoversAKnownTipForceFromPressures(String file) {
        Front front = front(file);
        int n = front.mechanism().cylinders();
        List<double[]> duty = duty(front, 150);
        List<double[]> first = run(front, duty, false, false, 4096);
        List<double[]> measured = new ArrayList<>();
        for (int i = 0; i < duty.size(); i++) {
            double[] row = duty.get(i).clone();
            row[1 + n] = 0;
            row[2 + n] = 0;
            for (int c = 0; c < n; c++) {
                row[4 + n + 2 * c] = first.get(i)[4 + 6 * c];
                row[5 + n + 2 * c] = first.get(i)[5 + 6 * c];
            }
            measured.add(row);
        }
        List<double[]> second = run(front, measured, true, false, 4096);
        for (int i = 0; i < duty.size(); i++) {
            double size = 3e4;
            assertEquals(duty.get(i)[1 + n], second.get(i)[3 + 6 * n], FIT_REL * size);
            assertEquals(duty.get(i)[2 + n], second.get(i)[4 + 6 * n], FIT_REL * size);
            assertTrue(second.get(i)[second.get(i).length - 1] < FIT_REL * 1e6);
        }
    }

    @Test
    void atRestLeavesInertiaOut() {
        Front front = front("sallow-22.json");
        List<double[]> duty = duty(front, 20);
        double[] moving = run(front, duty, false, false, 64).get(10);
        double[] still = run(front, duty, false, true, 64).get(10);
        double[] fractions = new double[3];
        for (int c = 0; c < 3; c++) {
            fractions[c] = duty.get(10)[1 + c] / front.mechanism().stroke(c);
        }
        PoseAnswer pose = PoseStudy.answer(
                front, new PoseQuestion(fractions, duty.get(10)[4], duty.get(10)[5], duty.get(10)[6], -1, 0));
        for (int c = 0; c < 3; c++) {
            assertEquals(pose.forces().cylinder(c), still[3 + 6 * c], 1e-6);
            assertTrue(Math.abs(moving[3 + 6 * c] - still[3 + 6 * c]) > 1);
            assertEquals(moving[2 + 6 * c], still[2 + 6 * c], 0.0, "speeds are told all the same");
        }
    }

    /** An arm on one cylinder that reaches its dead centre, where it can carry nothing, when it is all out. */
    @Test
    void refusesADeadCentre() {
        String text = """
                {"format": "rodside-linkage/1", "name": "arm", "units": {"length": "m", "mass": "kg", "pressure": "bar"},
                 "pins": {"foot": [0, 0], "anchor": [-1, 0], "eye": [0, 1]}, "frame": {"pins": ["foot", "anchor"]},
                 "links": {"arm": {"pins": ["foot", "eye"], "mass": 100, "cg": [0.5, 0.5]}},
                 "cylinders": {"lift": {"cap_pin": "anchor", "rod_pin": "eye", "bore": 0.1, "rod": 0.05,
                   "retracted": 1.2, "stroke": 0.8, "working": 200, "relief": 250}},
                 "tool": {"link": "arm", "tip": "eye", "hook": "eye", "curl": "lift"}}
                """;
        Front front = Front.of(LinkageReader.read("arm.json", text.getBytes(StandardCharsets.UTF_8), List.of()));
        double[] clear = {0, 0.3, 0, 0, 0, Double.NaN, Double.NaN};
        double[] dead = {1, 0.8, 0, 0, 0, Double.NaN, Double.NaN};
        assertEquals(1, run(front, List.<double[]>of(clear), false, true, 8).size());
        InputException fault =
                assertThrows(InputException.class, () -> run(front, List.of(clear, dead), false, true, 8));
        assertTrue(fault.getMessage().contains("dead centre"), fault.getMessage());
        assertTrue(fault.getMessage().contains("time_s 1.0"), fault.getMessage());
    }
}
