package org.rodside.kinematics;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.rodside.model.Cylinder;
import org.rodside.model.Link;
import org.rodside.model.Linkage;
import org.rodside.model.Pin;
import org.rodside.model.Point;

/**
 * A linkage compiled for computing: names become indices, the drawing becomes flat arrays and an assembly plan. Body 0
 * is the frame, body i the i-th link of the file. Immutable and safe to share; solvers made from it are not.
 *
 * <p>Body placement: a point drawn at (X, Y) stands at R·(X, Y) + t, where R turns anticlockwise from the drawn pose and
 * t is the image of the drawing's origin; in m, machine axes.
 */
public final class Mechanism {

    private final Linkage linkage;
    private final Map<String, Integer> pinIndex = new LinkedHashMap<>();
    private final Map<String, Integer> bodyIndex = new LinkedHashMap<>();
    private final Map<String, Integer> cylinderIndex = new LinkedHashMap<>();
    private final List<String> bodyNames;
    private final List<String> pinNames;
    private final double[] drawnX;
    private final double[] drawnY;
    private final int[][] pinsOfBody;
    private final int[][] bodiesOfPin;
    private final int[] capPin;
    private final int[] rodPin;
    private final double[] retracted;
    private final double[] stroke;
    private final int[] bearingPin;
    private final int[] bearingBody;
    private final int[] owner;
    private final int[][] ownedPins;
    private final List<Step> steps;

    private Mechanism(Linkage linkage) {
        this.linkage = linkage;
        bodyIndex.put(Linkage.FRAME, 0);
        linkage.links().forEach(link -> bodyIndex.put(link.name(), bodyIndex.size()));
        linkage.pins().forEach(pin -> pinIndex.put(pin.name(), pinIndex.size()));
        linkage.cylinders().forEach(c -> cylinderIndex.put(c.name(), cylinderIndex.size()));
        bodyNames = List.copyOf(bodyIndex.keySet());
        pinNames = List.copyOf(pinIndex.keySet());
        drawnX = linkage.pins().stream().map(Pin::at).mapToDouble(Point::x).toArray();
        drawnY = linkage.pins().stream().map(Pin::at).mapToDouble(Point::y).toArray();
        pinsOfBody = new int[bodyNames.size()][];
        pinsOfBody[0] = indices(linkage.framePins());
        for (int i = 0; i < linkage.links().size(); i++) {
            pinsOfBody[i + 1] = indices(linkage.links().get(i).pins());
        }
        bodiesOfPin = invert(pinsOfBody, drawnX.length);
        List<Cylinder> cylinders = linkage.cylinders();
        capPin = indices(cylinders.stream().map(Cylinder::capPin).toList());
        rodPin = indices(cylinders.stream().map(Cylinder::rodPin).toList());
        retracted = cylinders.stream().mapToDouble(Cylinder::retracted).toArray();
        stroke = cylinders.stream().mapToDouble(Cylinder::stroke).toArray();
        bearingPin = bearings(true);
        bearingBody = bearings(false);
        AssemblyPlan plan = new AssemblyPlan(this);
        steps = plan.steps();
        owner = plan.owners();
        ownedPins = invert(owner, bodyNames.size());
    }

    /**
     * Compiles a linkage.
     *
     * @throws org.rodside.model.InputException where the drawing shows a loop at its dead centre, so that it cannot tell
     *     which way the loop closes
     */
    public static Mechanism of(Linkage linkage) {
        return new Mechanism(linkage);
    }

    private int[] indices(List<String> names) {
        return names.stream().mapToInt(pinIndex::get).toArray();
    }

    private static int[][] invert(int[][] lists, int size) {
        List<List<Integer>> inverse = new ArrayList<>();
        for (int i = 0; i < size; i++) {
            inverse.add(new ArrayList<>());
        }
        for (int i = 0; i < lists.length; i++) {
            for (int value : lists[i]) {
                inverse.get(value).add(i);
            }
        }
        return inverse.stream()
                .map(list -> list.stream().mapToInt(Integer::intValue).toArray())
                .toArray(int[][]::new);
    }

    private static int[][] invert(int[] owners, int size) {
        int[][] lists = new int[owners.length][];
        for (int i = 0; i < owners.length; i++) {
            lists[i] = owners[i] < 0 ? new int[0] : new int[] {owners[i]};
        }
        return invert(lists, size);
    }

    private int[] bearings(boolean pins) {
        List<Integer> list = new ArrayList<>();
        for (int pin = 0; pin < bodiesOfPin.length; pin++) {
            for (int body : bodiesOfPin[pin]) {
                list.add(pins ? pin : body);
            }
        }
        return list.stream().mapToInt(Integer::intValue).toArray();
    }

    /** The drawing this was compiled from. */
    public Linkage linkage() {
        return linkage;
    }

    /** Number of bodies, the frame included. */
    public int bodies() {
        return bodyNames.size();
    }

    public int pins() {
        return drawnX.length;
    }

    public int cylinders() {
        return capPin.length;
    }

    /** Number of (pin, link) pairs, frame included: each carries one bearing force. */
    public int bearings() {
        return bearingPin.length;
    }

    /** Index of a link or {@code frame}; -1 where there is none of that name. */
    public int body(String name) {
        return bodyIndex.getOrDefault(name, -1);
    }

    /** Index of a pin; -1 where there is none of that name. */
    public int pin(String name) {
        return pinIndex.getOrDefault(name, -1);
    }

    /** Index of a cylinder; -1 where there is none of that name. */
    public int cylinder(String name) {
        return cylinderIndex.getOrDefault(name, -1);
    }

    public String bodyName(int body) {
        return bodyNames.get(body);
    }

    public String pinName(int pin) {
        return pinNames.get(pin);
    }

    public String cylinderName(int cylinder) {
        return linkage.cylinders().get(cylinder).name();
    }

    /** Where a named point or pin of a link is drawn, or null where the link has neither of that name. */
    public Point place(int body, String name) {
        Link link = linkage.links().get(body - 1);
        Point point = link.points().get(name);
        if (point == null && link.pins().contains(name)) {
            point = linkage.pins().get(pin(name)).at();
        }
        return point;
    }

    /** Drawn x of a pin; in m. */
    public double drawnX(int pin) {
        return drawnX[pin];
    }

    /** Drawn y of a pin; in m. */
    public double drawnY(int pin) {
        return drawnY[pin];
    }

    public int capPin(int cylinder) {
        return capPin[cylinder];
    }

    public int rodPin(int cylinder) {
        return rodPin[cylinder];
    }

    /** Retracted pin-to-pin length; in m. */
    public double retracted(int cylinder) {
        return retracted[cylinder];
    }

    /** Stroke; in m. */
    public double stroke(int cylinder) {
        return stroke[cylinder];
    }

    /** Pin-to-pin length in the drawn pose; in m. */
    public double drawnLength(int cylinder) {
        int cap = capPin[cylinder];
        int rod = rodPin[cylinder];
        return Math.hypot(drawnX[rod] - drawnX[cap], drawnY[rod] - drawnY[cap]);
    }

    public int bearingPin(int bearing) {
        return bearingPin[bearing];
    }

    public int bearingBody(int bearing) {
        return bearingBody[bearing];
    }

    /** The body that fixes a pin first in the order of assembly; -1 for a pin that joins cylinders only. */
    public int owner(int pin) {
        return owner[pin];
    }

    /** Pins that a body fixes; not to be modified. */
    public int[] ownedPins(int body) {
        return ownedPins[body];
    }

    /** Pins on a body; not to be modified. */
    public int[] pinsOf(int body) {
        return pinsOfBody[body];
    }

    /** Bodies at a pin; not to be modified. */
    public int[] bodiesAt(int pin) {
        return bodiesOfPin[pin];
    }

    /** Whether a pin is on a body. */
    boolean isOn(int pin, int body) {
        for (int other : bodiesOfPin[pin]) {
            if (other == body) {
                return true;
            }
        }
        return false;
    }

    /** True where every loop closes in closed form, one step after the other. */
    public boolean staged() {
        int placed = steps.stream()
                .mapToInt(step -> step instanceof PairStep ? 2 : 1)
                .sum();
        return placed == bodies() - 1;
    }

    /** The steps of assembly in order; they place every link only where {@link #staged()}. */
    public List<Step> steps() {
        return steps;
    }

    /** A solver for positions, velocities and accelerations; one per thread. */
    public PoseSolver newSolver() {
        return staged() ? new StagedPoseSolver(this) : new DensePoseSolver(this);
    }
}
