package org.rodside.study;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.Consumer;
import java.util.function.DoubleConsumer;
import java.util.function.IntFunction;
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

    /** The usual first grid is this many times finer than for one quantity, for it serves them all; no unit. */
    private static final int REFINEMENT = 2;

    /** A load beyond the relief by less than this share is at it; no unit. */
    private static final double ROUNDING = 1e-6;

    private final Front front;
    private final Mechanism mechanism;
    private final int threads;
    private final BoxMaximum search;
    private final List<Column> columns;
    private final List<CylinderPressure> pressures;
    private final List<LoadsAnswer.OnCylinder> onCylinders = new ArrayList<>();
    private final List<LoadsAnswer.OnBearing> onBearings = new ArrayList<>();
    private long skipped;

    private WorstLoads(Front front, int threads, int refinement) {
        this.front = front;
        this.threads = threads;
        mechanism = front.mechanism();
        double[] all = new double[mechanism.cylinders()];
        Arrays.fill(all, Double.NaN);
        search = new BoxMaximum(all, refinement);
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
        return find(front, cases, threads, REFINEMENT, progress);
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
        for (LoadsAnswer.Intensified side : intensified()) {
            if (side.relief() < side.rod()) {
                notes.add(mechanism.cylinderName(side.cylinder())
                        + ": blocking the rod port while the cap side is pumped drives the rod side past its relief.");
            }
        }
        return notes;
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

    /** Number of quantities: push, pull and buckling of every cylinder, size of every bearing force. */
    private int quantities() {
        return 3 * mechanism.cylinders() + mechanism.bearings();
    }

    /** A quantity at the pose a solver stands at; larger is worse; one that stays below zero does not occur; NaN where it is not finite. */
    private double quantity(CaseSolver solver, int quantity) {
        double value = anyQuantity(solver, quantity);
        return Math.abs(value) < Double.POSITIVE_INFINITY ? value : Double.NaN;
    }

    private double anyQuantity(CaseSolver solver, int quantity) {
        int cylinders = mechanism.cylinders();
        if (quantity >= 3 * cylinders) {
            int bearing = quantity - 3 * cylinders;
            double x = solver.bearingX(bearing);
            double y = solver.bearingY(bearing);
            return Math.sqrt(x * x + y * y);
        }
        int c = quantity / 3;
        double force = solver.cylinder(c);
        return switch (quantity % 3) {
            case 0 -> force;
            case 1 -> -force;
            default -> solver.columnWork(c);
        };
    }

    private void add(LoadCase load) {
        double[][] values = grid(load);
        new Chunks(threads, done -> {})
                .<Optimum>inOrder(quantities(), () -> climber(load, values), new OptimumTaker(load));
    }

    /** Every quantity at every grid pose. */
    private double[][] grid(LoadCase load) {
        double[][] values = new double[quantities()][search.cells()];
        int slices = search.cells() / search.cellsInASlice();
        new Chunks(threads, done -> {})
                .<Long>inOrder(slices, () -> gridWorker(load, values), count -> skipped += count);
        return values;
    }

    private IntFunction<Long> gridWorker(LoadCase load, double[][] values) {
        CaseSolver solver = new CaseSolver(front, load);
        return slice -> {
            long left = 0;
            int first = slice * search.cellsInASlice();
            for (int cell = first; cell < first + search.cellsInASlice(); cell++) {
                boolean stands = solver.solve(search.point(cell));
                left += stands ? 0 : 1;
                for (int q = 0; q < values.length; q++) {
                    values[q][cell] = stands ? quantity(solver, q) : Double.NaN;
                }
            }
            return left;
        };
    }

    private IntFunction<Optimum> climber(LoadCase load, double[][] values) {
        CaseSolver solver = new CaseSolver(front, load);
        return q -> search.findFrom(values[q], at -> solver.solve(at) ? quantity(solver, q) : Double.NaN);
    }

    /** Turns the tops, which arrive in the order of the quantities, into rows. */
    private final class OptimumTaker implements Consumer<Optimum> {

        private final LoadCase load;
        private final CaseSolver solver;
        private int quantity;

        OptimumTaker(LoadCase load) {
            this.load = load;
            solver = new CaseSolver(front, load);
        }

        @Override
        public void accept(Optimum top) {
            int q = quantity++;
            if (!(top.value() > 0) || !solver.solve(top.at())) {
                return;
            }
            if (q < 3 * mechanism.cylinders()) {
                onCylinders.add(row(q / 3, LoadsAnswer.Sense.values()[q % 3], top));
            } else {
                onBearings.add(bearing(q - 3 * mechanism.cylinders(), top));
            }
        }

        private LoadsAnswer.OnCylinder row(int c, LoadsAnswer.Sense sense, Optimum top) {
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

        private LoadsAnswer.OnBearing bearing(int b, Optimum top) {
            int body = mechanism.bearingBody(b);
            double cos = solver.pose().cos(body);
            double sin = solver.pose().sin(body);
            double x = solver.bearingX(b);
            double y = solver.bearingY(b);
            return new LoadsAnswer.OnBearing(
                    b, load.name(), Math.hypot(x, y), cos * x + sin * y, cos * y - sin * x, top.at());
        }
    }
}
