package org.rodside.study;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.DoubleConsumer;
import java.util.function.IntFunction;
import java.util.stream.IntStream;
import org.rodside.hydraulics.Column;
import org.rodside.hydraulics.CylinderLimits;
import org.rodside.hydraulics.CylinderPressure;
import org.rodside.kinematics.Mechanism;
import org.rodside.model.Cylinder;
import org.rodside.model.Tool;

/**
 * Worst loads of every cylinder and bearing over the whole stroke box (theory W1). One grid serves every quantity of a case;
 * each quantity's hills that could still hold the worst are then climbed to their continuous top. The same answer for any
 * number of threads.
 */
public final class WorstLoads {

    /** Density of what fills the bucket where nothing else is said: moist loam; in kg/m³. */
    public static final double USUAL_DENSITY = 1800;

    /** A load beyond the relief by less than this share is at it; no unit. */
    private static final double ROUNDING = 1e-6;

    /** A bearing force beyond what the cylinders hold by more than this factor comes from a dead centre; no unit. */
    private static final double FAR = 10;

    private final Front front;
    private final Mechanism mechanism;
    private final int threads;
    private final BoxMaximum search;
    private final int[] twin;
    private final int[] asked;
    private final List<Column> columns;
    private final List<CylinderPressure> pressures;
    private final List<LoadsAnswer.OnCylinder> onCylinders = new ArrayList<>();
    private final List<LoadsAnswer.OnBearing> onBearings = new ArrayList<>();
    private long skipped;

    private WorstLoads(Front front, int threads, int refinement) {
        this.front = front;
        this.threads = threads;
        mechanism = front.mechanism();
        search = BoxMaximum.overAll(mechanism.cylinders(), refinement);
        twin = twins();
        asked = IntStream.range(0, twin.length).filter(q -> twin[q] == q).toArray();
        columns = front.linkage().cylinders().stream().map(Column::of).toList();
        pressures = front.linkage().cylinders().stream()
                .map(c -> CylinderPressure.of(c, false))
                .toList();
    }

    /**
     * The usual cases: carry with a full bucket, curl and crowd as far as the linkage has them.
     *
     * @param density density of what fills the bucket; in kg/m³
     */
    public static List<LoadCase> usualCases(Front front, double density) {
        Tool tool = front.linkage().tool().orElse(null);
        if (tool == null) {
            return List.of(LoadCase.carry(0));
        }
        List<LoadCase> cases = new ArrayList<>();
        cases.add(LoadCase.carry(tool.capacity().orElse(0) * density));
        cases.add(LoadCase.curl());
        if (tool.crowd().isPresent()) {
            cases.add(LoadCase.crowd());
        }
        return cases;
    }

    /**
     * A case of the user's own.
     *
     * @param load force of the ground on the tip, x and y (N), and payload (kg); not modified
     */
    public static LoadCase given(Front front, String name, double[] load) {
        front.tool();
        return new LoadCase(name, LoadCase.Kind.GIVEN, load[0], load[1], load[2]);
    }

    /** Searches all cases. */
    public static LoadsAnswer find(Front front, List<LoadCase> cases, int threads, DoubleConsumer progress) {
        return find(front, cases, threads, 1, progress);
    }

    /** As {@link #find(Front, List, int, DoubleConsumer)} with a grid that many times finer. */
    static LoadsAnswer find(Front front, List<LoadCase> cases, int threads, int refinement, DoubleConsumer progress) {
        WorstLoads search = new WorstLoads(front, threads, refinement);
        for (int i = 0; i < cases.size(); i++) {
            search.add(cases.get(i));
            progress.accept((i + 1.0) / cases.size());
        }
        return new LoadsAnswer(
                cases,
                List.copyOf(search.onCylinders),
                List.copyOf(search.onBearings),
                search.intensified(),
                search.skipped,
                search.notes());
    }

    private List<String> notes() {
        List<String> notes = new ArrayList<>();
        if (front.linkage().tool().isEmpty()) {
            notes.add("The file has no tool: carry is the front's own weight alone.");
        } else if (front.tool().capacity().isEmpty()) {
            notes.add("The file has no tool.capacity: carry is with an empty bucket.");
        }
        if (front.linkage().tool().isPresent() && front.crowd() < 0) {
            notes.add("The file names no tool.crowd: the case crowd is left out.");
        }
        if (skipped > 0) {
            notes.add(skipped + " grid poses were left out: they do not assemble, or nothing limits the tool force.");
        }
        for (LoadsAnswer.OnCylinder load : onCylinders) {
            String beyond = beyondRelief(load);
            if (!beyond.isEmpty()) {
                notes.add(beyond);
            }
        }
        addBearingNotes(notes);
        for (LoadsAnswer.Intensified side : intensified()) {
            if (side.relief() < side.rod()) {
                notes.add(mechanism.cylinderName(side.cylinder())
                        + ": blocking the rod port while the cap side is pumped drives the rod side past its relief.");
            }
        }
        return notes;
    }

    private void addBearingNotes(List<String> notes) {
        for (LoadsAnswer.OnBearing load : onBearings) {
            if (load.total() > FAR * holding()) {
                notes.add(mechanism.pinName(mechanism.bearingPin(load.bearing())) + " on "
                        + mechanism.bodyName(mechanism.bearingBody(load.bearing())) + ", " + load.loadCase()
                        + ": the force is far more than the cylinders hold. Near a dead centre it has no upper end.");
            }
        }
    }

    /** What all cylinders together hold by their reliefs; in N. */
    private double holding() {
        double sum = 0;
        for (int c = 0; c < mechanism.cylinders(); c++) {
            CylinderLimits limits = front.limits(c, false);
            sum += Math.max(limits.holdingPush(), limits.holdingPull());
        }
        return sum;
    }

    /** What to say where a load asks for more than the cylinder's relief holds; empty where it does not. */
    private String beyondRelief(LoadsAnswer.OnCylinder load) {
        CylinderLimits limits = front.limits(load.cylinder(), false);
        double held = load.total() < 0 ? limits.holdingPull() : limits.holdingPush();
        if (load.sense() == LoadsAnswer.Sense.BUCKLE || Math.abs(load.total()) <= held * (1 + ROUNDING)) {
            return "";
        }
        return mechanism.cylinderName(load.cylinder()) + ", " + load.loadCase() + ": the worst "
                + (load.total() < 0 ? "pull" : "push")
                + " is more than the relief holds: the cylinder gives way before. Near a dead centre it has no upper end.";
    }

    private List<LoadsAnswer.Intensified> intensified() {
        List<LoadsAnswer.Intensified> list = new ArrayList<>();
        List<Cylinder> cylinders = front.linkage().cylinders();
        for (int c = 0; c < cylinders.size(); c++) {
            list.add(new LoadsAnswer.Intensified(
                    c,
                    pressures.get(c).intensifiedRod(0),
                    cylinders.get(c).relief().rod()));
        }
        return list;
    }

    /**
     * For every quantity the first that always has the same size: two links on a pin without a cylinder press on each other
     * alike.
     */
    private int[] twins() {
        int[] first = IntStream.range(0, quantities()).toArray();
        for (int b = 0; b < mechanism.bearings(); b++) {
            for (int other = 0; other < b; other++) {
                int pin = mechanism.bearingPin(b);
                if (mechanism.bearingPin(other) == pin && mechanism.bodiesAt(pin).length == 2 && !holdsCylinder(pin)) {
                    first[3 * mechanism.cylinders() + b] = 3 * mechanism.cylinders() + other;
                }
            }
        }
        return first;
    }

    private boolean holdsCylinder(int pin) {
        String name = mechanism.pinName(pin);
        return front.linkage().cylinders().stream()
                .anyMatch(c -> c.capPin().equals(name) || c.rodPin().equals(name));
    }

    /** Number of quantities: push, pull and buckling of every cylinder, size of every bearing force. */
    private int quantities() {
        return 3 * mechanism.cylinders() + mechanism.bearings();
    }

    private LoadQuantity quantity(CaseSolver solver, int q) {
        int cylinders = mechanism.cylinders();
        if (q >= 3 * cylinders) {
            return LoadQuantity.bearing(solver, q - 3 * cylinders);
        }
        return switch (q % 3) {
            case 0 -> LoadQuantity.push(solver, q / 3);
            case 1 -> LoadQuantity.pull(solver, q / 3);
            default -> LoadQuantity.columnWork(solver, q / 3);
        };
    }

    private void add(LoadCase load) {
        double[][] values = grid(load);
        List<Optimum> tops = new ArrayList<>();
        new Chunks(threads, done -> {}).<Optimum>inOrder(asked.length, () -> climber(load, values), tops::add);
        CaseSolver solver = new CaseSolver(front, load);
        for (int q = 0; q < twin.length; q++) {
            addRow(load, solver, q, tops.get(Arrays.binarySearch(asked, twin[q])));
        }
    }

    private void addRow(LoadCase load, CaseSolver solver, int q, Optimum top) {
        if (top.value() > 0 && solver.solve(top.at())) {
            if (q < 3 * mechanism.cylinders()) {
                onCylinders.add(row(load, solver, q / 3, LoadsAnswer.Sense.values()[q % 3], top));
            } else {
                onBearings.add(bearing(load, solver, q - 3 * mechanism.cylinders(), top));
            }
        }
    }

    /** Every quantity that is asked for at every grid pose. */
    private double[][] grid(LoadCase load) {
        double[][] values = new double[asked.length][search.cells()];
        int slices = search.cells() / search.cellsInASlice();
        new Chunks(threads, done -> {})
                .<Long>inOrder(slices, () -> gridWorker(load, values), count -> skipped += count);
        return values;
    }

    private IntFunction<Long> gridWorker(LoadCase load, double[][] values) {
        CaseSolver solver = new CaseSolver(front, load);
        LoadQuantity[] quantity = new LoadQuantity[values.length];
        Arrays.setAll(quantity, i -> quantity(solver, asked[i]));
        return slice -> {
            long left = 0;
            int first = slice * search.cellsInASlice();
            for (int cell = first; cell < first + search.cellsInASlice(); cell++) {
                boolean stands = solver.solve(search.point(cell));
                left += stands ? 0 : 1;
                for (int q = 0; q < values.length; q++) {
                    values[q][cell] = stands ? quantity[q].value() : Double.NaN;
                }
            }
            return left;
        };
    }

    private IntFunction<Optimum> climber(LoadCase load, double[][] values) {
        CaseSolver solver = new CaseSolver(front, load);
        return i -> search.findFrom(values[i], quantity(solver, asked[i]));
    }

    private LoadsAnswer.OnCylinder row(LoadCase load, CaseSolver solver, int c, LoadsAnswer.Sense sense, Optimum top) {
        double force = solver.cylinder(c);
        CylinderPressure pressure = pressures.get(c);
        double factor = force > 0 ? columns.get(c).factor(solver.pose().length(c), force) : Double.NaN;
        return new LoadsAnswer.OnCylinder(
                c,
                sense,
                load.name(),
                force,
                force * front.linkage().cylinders().get(c).harderShare(),
                pressure.cap(force),
                pressure.rod(force),
                pressure.reliefMargin(force),
                factor,
                top.at());
    }

    private LoadsAnswer.OnBearing bearing(LoadCase load, CaseSolver solver, int b, Optimum top) {
        int body = mechanism.bearingBody(b);
        double cos = solver.pose().cos(body);
        double sin = solver.pose().sin(body);
        double x = solver.bearingX(b);
        double y = solver.bearingY(b);
        return new LoadsAnswer.OnBearing(
                b, load.name(), Math.hypot(x, y), cos * x + sin * y, cos * y - sin * x, top.at());
    }
}
