package org.rodside.study;

import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.rodside.kinematics.PoseBuffer;
import org.rodside.kinematics.PoseSolver;
import org.rodside.model.Point;
import org.rodside.model.Tool;

/** Named dimensions of the working range that belong to one pose each (docs/working-range.md; theory R1). Owns its scratch; one per
 * thread. */
final class RangeDimensions {

    /** Names, in the order of the answer. */
    static final List<String> NAMES = List.of(
            "reach",
            "ground_reach",
            "depth",
            "cutting_height",
            "dump_height",
            "dump_height_min",
            "level_depth",
            "wall_depth",
            "swing_radius",
            "hook_height",
            "hook_reach");

    /** Of these the smallest is told, of all others the largest. */
    private static final Set<String> SMALLEST = Set.of("dump_height_min", "swing_radius");

    /** Below ground counts this many times over while the swing radius is sought: more than any radius can gain by it. */
    private static final double GROUND_PENALTY = 100;

    /** A pose stands above the ground within; in m. */
    private static final double ABOVE = 1e-6;

    private final StrokeTrim trim;
    private final Front front;
    private final FrontSolver solver;
    private final PoseBuffer pose;
    private final Place tip;
    private final Place hook;
    private final Optional<Place> heel;
    private final double[] free;

    /**
     * @param trim the front, its strokes trimmed to where it assembles
     */
    RangeDimensions(StrokeTrim trim) {
        this.trim = trim;
        front = trim.front();
        solver = new FrontSolver(front);
        pose = solver.pose();
        tip = front.tip();
        hook = front.hook();
        Tool tool = front.tool();
        heel = tool.heel().map(front::place);
        free = new double[front.mechanism().cylinders()];
        Arrays.fill(free, Double.NaN);
    }

    /** The pose of a dimension and its length, in m; without a value where the linkage has none. */
    Optimum find(String name) {
        Optimum found = switch (name) {
            case "reach" -> best(() -> tip.x(pose));
            case "ground_reach" -> onLine(() -> tip.y(pose), () -> tip.x(pose), free);
            case "depth" -> best(() -> -tip.y(pose));
            case "cutting_height" -> best(() -> tip.y(pose));
            case "dump_height" -> onLine(this::tipBelowHook, () -> tip.y(pose), free);
            case "dump_height_min" -> lowestDump();
            // belongs to no one pose: found from the outline
            case "level_depth" -> new Optimum(Double.NaN, free);
            case "wall_depth" -> wall();
            case "swing_radius" -> swing();
            case "hook_height" -> best(() -> hook.y(pose));
            case "hook_reach" -> best(() -> hook.x(pose));
            default -> throw new IllegalArgumentException(name);
        };
        double value = SMALLEST.contains(name) ? -found.value() : found.value();
        return new Optimum(value, found.exists() ? trim.ofWhole(found.at()) : found.at());
    }

    /** A length read off the pose the solver stands at; in m. */
    @FunctionalInterface
    private interface Reading {
        double get();
    }

    private double read(double[] fractions, Reading reading) {
        return solver.place(fractions) == PoseSolver.ASSEMBLED ? reading.get() : Double.NaN;
    }

    private Optimum best(Reading reading) {
        return new BoxMaximum(free).find(fractions -> read(fractions, reading));
    }

    private Optimum onLine(Reading miss, Reading value, double[] fixed) {
        return new EqualitySearch(at -> read(at, miss), at -> read(at, value), fixed).find();
    }

    /** Zero where the tip stands straight below the hook; NaN where it stands above. */
    private double tipBelowHook() {
        return tip.y(pose) < hook.y(pose) ? tip.x(pose) - hook.x(pose) : Double.NaN;
    }

    private Optimum lowestDump() {
        if (front.hoist() < 0 || !trim.reachesItsEnd(front.hoist())) {
            return new Optimum(Double.NaN, free);
        }
        double[] hoisted = free.clone();
        hoisted[front.hoist()] = 1;
        return onLine(this::tipBelowHook, () -> -tip.y(pose), hoisted);
    }

    private Optimum wall() {
        if (heel.isEmpty()) {
            return new Optimum(Double.NaN, free);
        }
        Place back = heel.get();
        return onLine(
                () -> back.y(pose) > tip.y(pose) ? back.x(pose) - tip.x(pose) : Double.NaN, () -> -tip.y(pose), free);
    }

    private Optimum swing() {
        SwingRoom room = new SwingRoom();
        Optimum best = new BoxMaximum(free).find(room);
        return best.exists() && read(best.at(), room::leastY) >= -ABOVE ? best : new Optimum(Double.NaN, free);
    }

    /** The swing radius, less is better, with what lies below ground charged; its pieces pair an outermost with a lowest place. */
    private final class SwingRoom implements BoxMaximum.Objective {

        private final int pins = front.mechanism().pins();
        private final Point[] points = toolPoints().values().toArray(new Point[0]);
        private final int places = pins + points.length;

        @Override
        public double at(double[] fractions) {
            return read(fractions, () -> {
                double most = Double.NEGATIVE_INFINITY;
                for (int i = 0; i < places; i++) {
                    most = Math.max(most, x(i));
                }
                return -most - GROUND_PENALTY * Math.max(0, -leastY());
            });
        }

        @Override
        public int pieces() {
            return places * (places + 1);
        }

        @Override
        public void tellPieces(double[] out) {
            for (int i = 0; i < places; i++) {
                for (int j = 0; j <= places; j++) {
                    out[i * (places + 1) + j] = -x(i) + (j == places ? 0 : GROUND_PENALTY * y(j));
                }
            }
        }

        double leastY() {
            double least = Double.POSITIVE_INFINITY;
            for (int i = 0; i < places; i++) {
                least = Math.min(least, y(i));
            }
            return least;
        }

        private double x(int i) {
            return i < pins ? pose.pinX(i) : pose.x(tip.body(), points[i - pins].x(), points[i - pins].y());
        }

        private double y(int i) {
            return i < pins ? pose.pinY(i) : pose.y(tip.body(), points[i - pins].x(), points[i - pins].y());
        }
    }

    private Map<String, Point> toolPoints() {
        return front.linkage().links().get(tip.body() - 1).points();
    }
}
