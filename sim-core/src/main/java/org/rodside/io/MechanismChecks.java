package org.rodside.io;

import java.util.HashMap;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.rodside.model.Cylinder;
import org.rodside.model.Link;
import org.rodside.model.Linkage;
import org.rodside.model.Pin;

/**
 * Whether the links of a drawn linkage hang together and can be driven: every link reaches the frame through shared pins
 * or cylinders, and there is one cylinder for each degree of freedom. Names that lead nowhere are left out here; where
 * there are any, degrees of freedom are not counted, for the count would be of another linkage.
 */
final class MechanismChecks {

    private final Linkage linkage;
    private final FaultAccumulator faults;
    private final Set<String> pins = new HashSet<>();
    private final Map<String, List<String>> bodies = new LinkedHashMap<>();
    private boolean whole = true;

    MechanismChecks(Linkage linkage, FaultAccumulator faults) {
        this.linkage = linkage;
        this.faults = faults;
        linkage.pins().stream().map(Pin::name).forEach(pins::add);
        bodies.put(Linkage.FRAME, known(linkage.framePins()));
        linkage.links().forEach(link -> bodies.put(link.name(), known(link.pins())));
        for (Cylinder cylinder : linkage.cylinders()) {
            whole &= pins.contains(cylinder.capPin()) && pins.contains(cylinder.rodPin());
        }
        whole &= !linkage.links().isEmpty() && !linkage.cylinders().isEmpty();
    }

    private List<String> known(List<String> names) {
        List<String> known = names.stream().filter(pins::contains).toList();
        whole &= !names.isEmpty() && known.size() == names.size();
        return known;
    }

    void run() {
        reachFrame();
        if (whole) {
            freeEyes();
            drivable();
        }
    }

    private void reachFrame() {
        Set<String> reached = new HashSet<>(bodies.get(Linkage.FRAME));
        boolean grew = !reached.isEmpty();
        while (grew) {
            grew = false;
            for (List<String> body : bodies.values()) {
                grew |= body.stream().anyMatch(reached::contains) && reached.addAll(body);
            }
            for (Cylinder cylinder : linkage.cylinders()) {
                List<String> ends = List.of(cylinder.capPin(), cylinder.rodPin());
                grew |= pins.containsAll(ends) && ends.stream().anyMatch(reached::contains) && reached.addAll(ends);
            }
        }
        for (Link link : linkage.links()) {
            List<String> on = bodies.get(link.name());
            if (!reached.isEmpty() && !on.isEmpty() && on.stream().noneMatch(reached::contains)) {
                faults.add(
                        "links." + link.name(),
                        "no chain of pins and cylinders leads from the link to the frame; share a pin with another link");
            }
        }
    }

    /** An end that holds on to nothing but its own cylinder. */
    private void freeEyes() {
        Map<String, Integer> holders = new HashMap<>();
        bodies.values().forEach(body -> body.forEach(pin -> holders.merge(pin, 1, Integer::sum)));
        for (Cylinder cylinder : linkage.cylinders()) {
            holders.merge(cylinder.capPin(), 1, Integer::sum);
            holders.merge(cylinder.rodPin(), 1, Integer::sum);
        }
        for (Cylinder cylinder : linkage.cylinders()) {
            freeEye(cylinder, "cap_pin", cylinder.capPin(), holders);
            freeEye(cylinder, "rod_pin", cylinder.rodPin(), holders);
        }
    }

    private void freeEye(Cylinder cylinder, String key, String pin, Map<String, Integer> holders) {
        if (holders.get(pin) == 1) {
            faults.add(
                    "cylinders." + cylinder.name() + "." + key,
                    "the pin " + pin
                            + " is on no link and no other cylinder; list it under the link or frame that it is on");
        }
    }

    private void drivable() {
        int freedom = degreesOfFreedom();
        int driven = linkage.cylinders().size();
        if (freedom != driven) {
            String remedy = freedom > driven
                    ? "a link lacks a pin or a cylinder is missing"
                    : "a link is held by too many pins or a cylinder is too many";
            faults.add(
                    "links",
                    "the linkage has " + freedom + (freedom == 1 ? " degree" : " degrees")
                            + " of freedom, but the number of cylinders is " + driven + "; " + remedy);
        }
    }

    /**
     * Three for each moving link and two for each pin on no link, less two for every further link (the frame is one) that
     * a pin joins: the count of Chebyshev, Grübler and Kutzbach for plane linkages of turning joints.
     */
    private int degreesOfFreedom() {
        Map<String, Integer> joined = new HashMap<>();
        bodies.values().forEach(body -> body.forEach(pin -> joined.merge(pin, 1, Integer::sum)));
        int freedom = 3 * linkage.links().size();
        for (int links : joined.values()) {
            freedom -= 2 * (links - 1);
        }
        Set<String> loose = new HashSet<>();
        for (Cylinder cylinder : linkage.cylinders()) {
            loose.add(cylinder.capPin());
            loose.add(cylinder.rodPin());
        }
        loose.removeAll(joined.keySet());
        return freedom + 2 * loose.size();
    }
}
