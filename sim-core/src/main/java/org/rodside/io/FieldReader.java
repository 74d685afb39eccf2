package org.rodside.io;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.regex.Pattern;
import org.rodside.model.Point;

/**
 * Reads the members of one JSON object, key by key. Whatever is wrong becomes a fault and the reading goes on with a
 * stand-in: NaN for a number, nothing for a text, an object without members for an object. Numbers come back in SI.
 */
final class FieldReader {

    static final String NAME_RULE = "a name is a letter (A to Z, a to z), then letters, digits or -";

    private static final Pattern NAME = Pattern.compile("[A-Za-z][A-Za-z0-9-]*");

    private final FaultAccumulator faults;
    private final String path;
    private final Map<String, Object> members = new LinkedHashMap<>();
    private final boolean sound;
    private final Set<String> meant = new HashSet<>();

    /** An object that should be at a path; anything else there is a fault. */
    FieldReader(FaultAccumulator faults, String path, Object node, String remedy) {
        this.faults = faults;
        this.path = path;
        this.sound = node instanceof Map<?, ?>;
        if (node instanceof Map<?, ?> map) {
            map.forEach((key, value) -> members.put((String) key, value));
        } else if (node != null) {
            faults.add(path, "must be an object in braces, found " + JsonTree.describe(node) + "; " + remedy);
        }
    }

    /** Refuses every key but these, naming the nearest right one. */
    FieldReader only(String... keys) {
        List<String> known = List.of(keys);
        for (String key : members.keySet()) {
            if (!known.contains(key)) {
                List<String> free = known.stream()
                        .filter(name -> !members.containsKey(name))
                        .toList();
                NearestName.of(key, free).ifPresent(meant::add);
                fault(
                        key,
                        "is not a key here; "
                                + NearestName.advice(
                                        key, NearestName.of(key, free).isPresent() ? free : known));
            }
        }
        return this;
    }

    boolean has(String key) {
        return members.containsKey(key);
    }

    String path(String key) {
        return JsonTree.join(path, key);
    }

    void fault(String key, String words) {
        faults.add(path(key), words);
    }

    /** The value of a key; null, with a fault unless its misspelling is one already, when it is missing. */
    Object node(String key, String remedy) {
        Object node = members.get(key);
        if (node == null && sound && !meant.contains(key)) {
            fault(key, "is missing; " + remedy);
        }
        return node;
    }

    /** A text that must be there and not be blank. */
    Optional<String> text(String key, String remedy) {
        return text(path(key), node(key, remedy), remedy);
    }

    /** A text that may be left out. */
    Optional<String> optionalText(String key, String remedy) {
        return has(key) ? text(key, remedy) : Optional.empty();
    }

    private Optional<String> text(String place, Object node, String remedy) {
        if (node instanceof String text && !text.isBlank()) {
            return Optional.of(text);
        } else if (node != null) {
            String must = node instanceof String
                    ? "must not be blank; "
                    : "must be a text, found " + JsonTree.describe(node) + "; ";
            faults.add(place, must + remedy);
        }
        return Optional.empty();
    }

    /** A number that must be there; in SI, NaN when at fault. */
    double number(String key, Amount amount) {
        return number(path(key), node(key, amount.remedy()), amount);
    }

    /** A number that may be left out; in SI, NaN when at fault. The fallback is in SI. */
    double number(String key, Amount amount, double fallback) {
        return has(key) ? number(key, amount) : fallback;
    }

    /** A number that may be left out; in SI. */
    OptionalDouble optionalNumber(String key, Amount amount) {
        return has(key) ? OptionalDouble.of(number(key, amount)) : OptionalDouble.empty();
    }

    /** The number at a place; in SI, NaN when at fault. */
    double number(String place, Object node, Amount amount) {
        if (node instanceof JsonTree.Number number) {
            Optional<String> fault = amount.fault(number.value());
            fault.ifPresent(
                    words -> faults.add(place, words + ", found " + JsonTree.describe(node) + "; " + amount.remedy()));
            // Adding 0 turns -0 into 0.
            return fault.isPresent() ? Double.NaN : amount.unit().toSi(number.value()) + 0.0;
        } else if (node != null) {
            faults.add(place, "must be a number, found " + JsonTree.describe(node) + "; " + amount.remedy());
        }
        return Double.NaN;
    }

    /** A place in the drawing that must be there; NaN where a coordinate is at fault. */
    Point point(String key, Amount coordinate) {
        return point(path(key), node(key, pointRemedy(coordinate)), coordinate);
    }

    /** The place in the drawing at a place in the file; NaN where a coordinate is at fault. */
    Point point(String place, Object node, Amount coordinate) {
        if (node instanceof List<?> list && list.size() == 2) {
            return new Point(
                    number(JsonTree.join(place, "0"), list.get(0), coordinate),
                    number(JsonTree.join(place, "1"), list.get(1), coordinate));
        } else if (node != null) {
            faults.add(
                    place,
                    "must be a list of two numbers, found " + JsonTree.describe(node) + "; " + pointRemedy(coordinate));
        }
        return new Point(Double.NaN, Double.NaN);
    }

    private static String pointRemedy(Amount coordinate) {
        return "give [x, y] in " + coordinate.unit().symbol();
    }

    /** An object that must be there. */
    FieldReader object(String key, String remedy) {
        return new FieldReader(faults, path(key), node(key, remedy), remedy);
    }

    /** An object that may be left out, read as one without members then. */
    FieldReader optionalObject(String key, String remedy) {
        return has(key) ? object(key, remedy) : new FieldReader(faults, path(key), Map.of(), remedy);
    }

    /** Refuses an object without members. */
    FieldReader notEmpty(String remedy) {
        if (sound && members.isEmpty()) {
            faults.add(path, "must not be empty; " + remedy);
        }
        return this;
    }

    /** The keys, which are names the user chose; a bad name is a fault but stays, so that uses of it resolve. */
    Set<String> userNames() {
        for (String name : members.keySet()) {
            if (!NAME.matcher(name).matches()) {
                fault(name, "is not a name; " + NAME_RULE);
            }
        }
        return members.keySet();
    }

    /** A list of different names that must be there, without those at fault. */
    List<String> names(String key, String remedy) {
        Object node = node(key, remedy);
        List<String> names = new ArrayList<>();
        if (node instanceof List<?> list) {
            if (list.isEmpty()) {
                fault(key, "must not be empty; " + remedy);
            }
            for (int i = 0; i < list.size(); i++) {
                String place = JsonTree.join(path(key), String.valueOf(i));
                text(place, list.get(i), remedy).ifPresent(name -> addOnce(names, name, place));
            }
        } else if (node != null) {
            fault(key, "must be a list of names in brackets, found " + JsonTree.describe(node) + "; " + remedy);
        }
        return names;
    }

    private void addOnce(List<String> names, String name, String place) {
        if (names.contains(name)) {
            faults.add(place, "the name " + JsonTree.shorten(name) + " stands in the list twice; keep one");
        } else {
            names.add(name);
        }
    }
}
