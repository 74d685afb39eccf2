package org.rodside.io;

import java.util.ArrayList;
import java.util.Collection;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.rodside.model.Cylinder;
import org.rodside.model.Link;
import org.rodside.model.Linkage;
import org.rodside.model.Machine;
import org.rodside.model.Pin;
import org.rodside.model.Point;
import org.rodside.model.Tool;

/**
 * Holds the values of a linkage against each other: names against what they name, places against places, sizes against
 * sizes. Values that were at fault already are NaN or blank here and pass, so that one slip is one fault.
 */
final class LinkageChecks {

    /**
     * Coordinates are taken off drawings that are rounded to about this; a drawn cylinder may miss its ends by it, and
     * two pins closer than it cannot be told apart; in m.
     */
    static final double DRAWING_ROUNDING = 1e-4;

    /** 1/count written with fifteen figures is still 1/count; no unit. */
    private static final double SHARE_ROUNDING = 1e-12;

    private final Linkage linkage;
    private final FileUnits units;
    private final FaultAccumulator faults;
    private final Map<String, Point> pins = new LinkedHashMap<>();
    private final Map<String, Cylinder> cylinders = new LinkedHashMap<>();

    LinkageChecks(Linkage linkage, FileUnits units, FaultAccumulator faults) {
        this.linkage = linkage;
        this.units = units;
        this.faults = faults;
        linkage.pins().forEach(pin -> pins.put(pin.name(), pin.at()));
        linkage.cylinders().forEach(cylinder -> cylinders.put(cylinder.name(), cylinder));
    }

    void run() {
        pinsInUse();
        body(Linkage.FRAME, linkage.framePins());
        for (Link link : linkage.links()) {
            body("links." + link.name(), link.pins());
            points(link);
        }
        for (Cylinder cylinder : linkage.cylinders()) {
            String path = "cylinders." + cylinder.name();
            sizes(cylinder, path);
            eyes(cylinder, path);
        }
        linkage.tool().ifPresent(this::tool);
        linkage.machine().ifPresent(this::machine);
    }

    private void pinsInUse() {
        Set<String> used = new LinkedHashSet<>(linkage.framePins());
        linkage.links().forEach(link -> used.addAll(link.pins()));
        linkage.cylinders().forEach(cylinder -> used.addAll(List.of(cylinder.capPin(), cylinder.rodPin())));
        for (Pin pin : linkage.pins()) {
            if (!used.contains(pin.name())) {
                faults.add("pins." + pin.name(), "no link and no cylinder uses the pin; use it or leave it out");
            }
        }
    }

    /** Pins of a link or of the frame: known, and no two at one place. */
    private void body(String path, List<String> names) {
        for (int i = 0; i < names.size(); i++) {
            String name = names.get(i);
            if (!pins.containsKey(name)) {
                unknown(path + ".pins." + i, "pin", name, pins.keySet());
                continue;
            }
            for (String earlier : names.subList(0, i)) {
                if (distance(earlier, name) < DRAWING_ROUNDING) {
                    faults.add(
                            path + ".pins",
                            "the pins " + earlier + " and " + name
                                    + " are at the same place; take both off the drawing again, or make them one pin");
                }
            }
        }
    }

    private void points(Link link) {
        for (String point : link.points().keySet()) {
            if (link.pins().contains(point)) {
                faults.add(
                        "links." + link.name() + ".points." + point,
                        "a pin of the link has the same name; call the point something else");
            }
        }
    }

    private void sizes(Cylinder cylinder, String path) {
        if (cylinder.rod() >= cylinder.bore()) {
            faults.add(
                    path + ".rod",
                    "must be below the bore of " + shown(cylinder.bore()) + ", found " + shown(cylinder.rod())
                            + "; swap them or measure again");
        }
        if (cylinder.retracted() <= cylinder.stroke()) {
            faults.add(
                    path + ".retracted",
                    "must be above the stroke of " + shown(cylinder.stroke()) + ", found " + shown(cylinder.retracted())
                            + "; give the pin-to-pin length with the rod fully in");
        }
        if (cylinder.harderShare() < 1.0 / cylinder.count() - SHARE_ROUNDING) {
            faults.add(
                    path + ".harder_share",
                    "must be from 1/count to 1, found " + Shown.number(cylinder.harderShare()) + " with count "
                            + cylinder.count() + "; leave it out for equal shares");
        }
        double tube = cylinder.tube().length();
        if (tube <= 0 || tube >= cylinder.retracted()) {
            faults.add(
                    path + ".tube.length",
                    "must be above 0 and below the retracted length of " + shown(cylinder.retracted()) + ", is "
                            + shown(tube) + " (where left out: retracted - 1.25 rod); give cap pin to gland face");
        }
        if (cylinder.tube().outside() <= cylinder.bore()) {
            faults.add(
                    path + ".tube.outside",
                    "must be above the bore of " + shown(cylinder.bore()) + ", found "
                            + shown(cylinder.tube().outside()) + "; give the outside diameter of the tube");
        }
    }

    /** Both eyes of a cylinder: known pins, apart, not on one link, and as far apart as the cylinder can be. */
    private void eyes(Cylinder cylinder, String path) {
        boolean known = eye(path + ".cap_pin", cylinder.capPin()) & eye(path + ".rod_pin", cylinder.rodPin());
        if (!known) {
            return;
        }
        if (cylinder.capPin().equals(cylinder.rodPin())) {
            faults.add(
                    path + ".rod_pin", "both ends are on the pin " + cylinder.capPin() + "; name two different pins");
            return;
        }
        for (Map.Entry<String, List<String>> body : bodies().entrySet()) {
            if (body.getValue().containsAll(List.of(cylinder.capPin(), cylinder.rodPin()))) {
                faults.add(
                        path,
                        "both ends are on the link " + body.getKey()
                                + ", so it moves nothing; name a pin of another link");
            }
        }
        double drawn = distance(cylinder.capPin(), cylinder.rodPin());
        if (drawn < DRAWING_ROUNDING) {
            faults.add(
                    path,
                    "the pins " + cylinder.capPin() + " and " + cylinder.rodPin()
                            + " at its ends are at the same place; take both off the drawing again");
        } else if (drawn < cylinder.retracted() - DRAWING_ROUNDING || drawn > cylinder.extended() + DRAWING_ROUNDING) {
            faults.add(
                    path,
                    "is drawn " + shown(drawn) + " long from " + cylinder.capPin() + " to " + cylinder.rodPin()
                            + ", but reaches from "
                            + Shown.number(units.length().fromSi(cylinder.retracted())) + " to "
                            + shown(cylinder.extended()) + "; check both pins, retracted and stroke");
        }
    }

    private boolean eye(String path, String name) {
        if (name.isEmpty()) {
            return false;
        }
        if (!pins.containsKey(name)) {
            unknown(path, "pin", name, pins.keySet());
            return false;
        }
        return true;
    }

    private Map<String, List<String>> bodies() {
        Map<String, List<String>> bodies = new LinkedHashMap<>();
        bodies.put(Linkage.FRAME, linkage.framePins());
        linkage.links().forEach(link -> bodies.put(link.name(), link.pins()));
        return bodies;
    }

    private void tool(Tool tool) {
        Optional<Link> link = linkage.links().stream()
                .filter(candidate -> candidate.name().equals(tool.link()))
                .findFirst();
        if (link.isEmpty() && !tool.link().isEmpty()) {
            unknown(
                    "tool.link",
                    "link",
                    tool.link(),
                    linkage.links().stream().map(Link::name).toList());
        }
        if (link.isPresent()) {
            List<String> places = new ArrayList<>(link.get().points().keySet());
            places.addAll(link.get().pins());
            place("tip", tool.tip(), places);
            tool.lip().ifPresent(name -> place("lip", name, places));
            tool.heel().ifPresent(name -> place("heel", name, places));
            if (!tool.fill().equals(tool.tip())) {
                place("fill", tool.fill(), places);
            }
            place("hook", tool.hook(), places);
        }
        Map<String, String> dutyOf = new HashMap<>();
        tool.hoist().ifPresent(name -> duty("hoist", name, dutyOf));
        tool.crowd().ifPresent(name -> duty("crowd", name, dutyOf));
        duty("curl", tool.curl(), dutyOf);
    }

    private void place(String key, String name, List<String> places) {
        if (!name.isEmpty() && !places.contains(name)) {
            unknown("tool." + key, "point or pin of the tool link", name, places);
        }
    }

    private void duty(String key, String name, Map<String, String> dutyOf) {
        if (name.isEmpty()) {
            return;
        }
        if (!cylinders.containsKey(name)) {
            unknown("tool." + key, "cylinder", name, cylinders.keySet());
        }
        String other = dutyOf.putIfAbsent(name, key);
        if (other != null) {
            faults.add(
                    "tool." + key,
                    "the cylinder " + JsonTree.shorten(name) + " does the duty " + other + " already; name another");
        }
    }

    private void machine(Machine machine) {
        if (machine.tippingFront() <= machine.tippingRear()) {
            faults.add(
                    "machine.tipping.front",
                    "must be above rear, which is " + shown(machine.tippingRear()) + ", found "
                            + shown(machine.tippingFront()) + "; x is positive towards the front");
        }
    }

    private void unknown(String path, String kind, String name, Collection<String> right) {
        faults.add(path, "there is no " + kind + " " + JsonTree.shorten(name) + "; " + NearestName.advice(name, right));
    }

    private String shown(double si) {
        return Shown.in(units.length(), si);
    }

    /** Distance of two pins in the drawing, NaN where one is unknown; in m. */
    private double distance(String a, String b) {
        Point from = pins.get(a);
        Point to = pins.get(b);
        return from == null || to == null ? Double.NaN : Math.hypot(to.x() - from.x(), to.y() - from.y());
    }
}
