package org.rodside.io;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * Puts values given beside a file, {@code PATH=VALUE}, in the place of those in it. The path is keys and list positions
 * (from 0) with dots between; the value is JSON where it can be read as JSON and plain text otherwise.
 */
final class Overrides {

    /** Objects a file may leave out, which a path therefore may go through although the file has none. */
    private static final Set<String> MAY_BE_MADE = Set.of(
            "tool",
            "machine",
            "swinging",
            "fixed",
            "tipping",
            "points",
            "friction",
            "tube",
            "working",
            "relief",
            "back");

    /** Where one number stands for both sides of a piston, a path may name one side. */
    private static final Set<String> TWO_SIDED = Set.of("working", "relief", "back");

    private static final Set<String> SIDES = Set.of("cap", "rod");

    private final FaultAccumulator faults;

    private Overrides(FaultAccumulator faults) {
        this.faults = faults;
    }

    /** Changes the tree below the root, which must be an object to be changed at all; later overrides win. */
    static void apply(List<String> overrides, Object root, FaultAccumulator faults) {
        Overrides all = new Overrides(faults);
        for (String override : overrides) {
            all.apply(override, root);
        }
    }

    private void apply(String override, Object root) {
        int equals = override.indexOf('=');
        if (equals <= 0) {
            fault(
                    override,
                    (equals < 0 ? "has no equals sign" : "has no path")
                            + "; write PATH=VALUE, as in cylinders.boom.working=360");
            return;
        }
        List<String> path = List.of(override.substring(0, equals).strip().split("\\.", -1));
        if (path.contains("")) {
            fault(
                    override,
                    "has an empty step in its path; write steps with one dot between, as in pins.boom-foot.1=1800");
            return;
        }
        Object parent = root;
        for (int i = 0; i < path.size() - 1 && parent != null; i++) {
            parent = step(override, parent, path.subList(0, i + 1), path.get(i + 1));
        }
        if (parent != null) {
            String place = String.join(".", path);
            put(override, parent, path, value(override.substring(equals + 1), place));
        }
    }

    private Object value(String text, String place) {
        FaultAccumulator own = new FaultAccumulator("override");
        JsonTree.Parsed parsed = JsonTree.parse(text, place, own);
        if (parsed.trouble() != null) {
            return text;
        }
        if (own.count() > 0) {
            faults.add(place, "a key appears twice in the value of the override; keep one");
        }
        return parsed.root();
    }

    /** The value one step down the path, made where a file may leave it out; null, with a fault, where there is none. */
    private Object step(String override, Object parent, List<String> soFar, String next) {
        String key = soFar.get(soFar.size() - 1);
        if (parent instanceof Map<?, ?>) {
            Map<String, Object> members = members(parent);
            Object child = members.get(key);
            if (child == null && MAY_BE_MADE.contains(key)) {
                child = new LinkedHashMap<String, Object>();
                members.put(key, child);
            } else if (child == null) {
                fault(
                        override,
                        "there is no " + String.join(".", soFar) + "; " + NearestName.advice(key, members.keySet()));
            } else if (child instanceof JsonTree.Number && TWO_SIDED.contains(key) && SIDES.contains(next)) {
                Map<String, Object> both = new LinkedHashMap<>();
                SIDES.stream().sorted().forEach(side -> both.put(side, members.get(key)));
                child = both;
                members.put(key, child);
            }
            return child;
        } else if (parent instanceof List<?> list) {
            int position = position(override, list, key, soFar);
            return position < 0 ? null : list.get(position);
        }
        return dead(override, parent, soFar);
    }

    private void put(String override, Object parent, List<String> path, Object value) {
        String key = path.get(path.size() - 1);
        if (parent instanceof Map<?, ?>) {
            members(parent).put(key, value);
        } else if (parent instanceof List<?> list) {
            int position = position(override, list, key, path);
            if (position < 0) {
                return;
            }
            items(parent).set(position, value);
        } else {
            dead(override, parent, path);
            return;
        }
        faults.noteOverride(String.join(".", path));
    }

    private Object dead(String override, Object parent, List<String> path) {
        String place = String.join(".", path.subList(0, path.size() - 1));
        fault(
                override,
                "leads through " + (place.isEmpty() ? "the file" : place) + ", which is " + JsonTree.describe(parent)
                        + " and holds nothing; end the path there");
        return null;
    }

    private int position(String override, List<?> list, String key, List<String> path) {
        boolean digits = key.length() <= 6 && key.chars().allMatch(c -> c >= '0' && c <= '9');
        int position = digits ? Integer.parseInt(key) : -1;
        if (position < 0 || position >= list.size()) {
            fault(
                    override,
                    "there is no " + String.join(".", path) + "; the list has positions "
                            + (list.isEmpty() ? "none" : "0 to " + (list.size() - 1)));
            return -1;
        }
        return position;
    }

    private void fault(String override, String words) {
        faults.add("override \"" + JsonTree.shorten(override) + "\"", words);
    }

    @SuppressWarnings("unchecked")
    private static Map<String, Object> members(Object node) {
        return (Map<String, Object>) node;
    }

    @SuppressWarnings("unchecked")
    private static List<Object> items(Object node) {
        return (List<Object>) node;
    }
}
