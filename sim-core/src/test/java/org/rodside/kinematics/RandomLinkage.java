package org.rodside.kinematics;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import org.rodside.model.Cylinder;
import org.rodside.model.Friction;
import org.rodside.model.Link;
import org.rodside.model.Linkage;
import org.rodside.model.Pin;
import org.rodside.model.Point;
import org.rodside.model.Sides;
import org.rodside.model.Tube;

/**
 * Makes planar linkages nobody tuned: links pivoted on random earlier links with cylinders anchored on random earlier
 * links, four-bar loops between random pins, pins that join three bodies, cylinders either way round, names and orders
 * shuffled. Every coordinate is drawn so that no loop stands near a dead centre.
 */
public final class RandomLinkage {

    /** No corner of a drawn loop is flatter than this sine; no unit. */
    private static final double LEAST_SINE = 0.35;

    private final Random random;
    private final List<Pin> pins = new ArrayList<>();
    private final List<List<String>> bodyPins = new ArrayList<>();
    private final List<Cylinder> cylinders = new ArrayList<>();

    private RandomLinkage(long seed) {
        random = new Random(seed);
    }

    /** A linkage with the given number of cylinders. */
    public static Linkage of(long seed, int cylinders) {
        RandomLinkage made = new RandomLinkage(seed);
        made.body();
        made.newPin(0, made.spot(-2, 0));
        made.newPin(0, made.spot(2, 0));
        while (made.cylinders.size() < cylinders) {
            made.addDriven();
            if (made.random.nextBoolean()) {
                made.addLoop();
            }
        }
        return made.linkage();
    }

    private int body() {
        bodyPins.add(new ArrayList<>());
        return bodyPins.size() - 1;
    }

    private Point spot(double x, double y) {
        return new Point(x + 3 * random.nextDouble() - 1.5, y + 3 * random.nextDouble() - 1.5);
    }

    private String newPin(int body, Point at) {
        String name = "q" + (char) ('a' + random.nextInt(26)) + pins.size();
        pins.add(new Pin(name, at));
        bodyPins.get(body).add(name);
        return name;
    }

    private Point at(String pin) {
        return pins.stream()
                .filter(p -> p.name().equals(pin))
                .findFirst()
                .orElseThrow()
                .at();
    }

    private String anyPin() {
        return pins.get(random.nextInt(pins.size())).name();
    }

    private static double sine(Point corner, Point a, Point b) {
        double ax = a.x() - corner.x();
        double ay = a.y() - corner.y();
        double bx = b.x() - corner.x();
        double by = b.y() - corner.y();
        return Math.abs(ax * by - ay * bx) / (Math.hypot(ax, ay) * Math.hypot(bx, by));
    }

    private static double gap(Point a, Point b) {
        return Math.hypot(a.x() - b.x(), a.y() - b.y());
    }

    private void addDriven() {
        while (true) {
            String pivot = anyPin();
            String anchor = anyPin();
            Point eye = spot(at(pivot).x(), at(pivot).y());
            boolean clear = !pivot.equals(anchor)
                    && gap(eye, at(pivot)) > 0.5
                    && gap(eye, at(anchor)) > 0.5
                    && gap(at(pivot), at(anchor)) > 0.3
                    && sine(at(pivot), at(anchor), eye) > LEAST_SINE
                    && sine(eye, at(anchor), at(pivot)) > LEAST_SINE;
            if (clear) {
                int link = body();
                bodyPins.get(link).add(pivot);
                String eyePin = newPin(link, eye);
                newPin(link, spot(eye.x(), eye.y()));
                cylinders.add(cylinder(anchor, eyePin, gap(eye, at(anchor))));
                return;
            }
        }
    }

    private Cylinder cylinder(String anchor, String eye, double drawn) {
        boolean swap = random.nextBoolean();
        double travel = 0.08 * drawn;
        double bore = 0.08 + 0.1 * random.nextDouble();
        double rod = bore * (0.5 + 0.3 * random.nextDouble());
        int count = 1 + random.nextInt(2);
        double retracted = drawn - travel * random.nextDouble();
        return new Cylinder(
                "c" + cylinders.size(),
                swap ? eye : anchor,
                swap ? anchor : eye,
                count,
                bore,
                rod,
                retracted,
                travel,
                new Sides(30e6, 30e6),
                new Sides(34e6, 34e6),
                new Sides(0, 0.5e6),
                new Friction(1000, 0.02),
                50 + 100 * random.nextDouble(),
                1.0 / count,
                new Tube(0.6 * retracted, 1.2 * bore),
                350e6);
    }

    private void addLoop() {
        for (int tries = 0; tries < 200; tries++) {
            String one = anyPin();
            String two = anyPin();
            Point joint = spot(at(one).x(), at(one).y());
            boolean clear = !one.equals(two)
                    && gap(joint, at(one)) > 0.4
                    && gap(joint, at(two)) > 0.4
                    && gap(at(one), at(two)) > 0.3
                    && !sameBody(one, two)
                    && sine(joint, at(one), at(two)) > LEAST_SINE
                    && sine(at(one), joint, at(two)) > LEAST_SINE;
            if (clear) {
                int first = body();
                bodyPins.get(first).add(one);
                String middle = newPin(first, joint);
                int second = body();
                bodyPins.get(second).addAll(List.of(two, middle));
                newPin(second, spot(joint.x(), joint.y()));
                return;
            }
        }
    }

    private boolean sameBody(String one, String two) {
        return bodyPins.stream().anyMatch(list -> list.contains(one) && list.contains(two));
    }

    private Linkage linkage() {
        List<Link> links = new ArrayList<>();
        for (int i = 1; i < bodyPins.size(); i++) {
            List<String> shuffled = new ArrayList<>(bodyPins.get(i));
            Collections.shuffle(shuffled, random);
            Point first = at(shuffled.get(0));
            Point cg = spot(first.x(), first.y());
            links.add(new Link(
                    "l" + i,
                    shuffled,
                    100 + 900 * random.nextDouble(),
                    cg,
                    0.3 + random.nextDouble(),
                    Map.of("far", spot(first.x(), first.y()))));
        }
        Collections.shuffle(links, random);
        Collections.shuffle(pins, random);
        Collections.shuffle(cylinders, random);
        return new Linkage("random", "", pins, bodyPins.get(0), links, cylinders, Optional.empty(), Optional.empty());
    }
}
