package org.rodside.report;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.rodside.units.Quantity;
import org.rodside.units.UnitSystem;

/** One JSON object being built: keys in order, each with the unit of its number behind it. Not thread-safe. */
final class Fields {

    private final UnitSystem units;
    private final Map<String, Object> map = new LinkedHashMap<>();

    Fields(UnitSystem units) {
        this.units = units;
    }

    /** A number given in SI; its key gets the unit. */
    Fields put(String name, Quantity quantity, double si) {
        map.put(units.key(name, quantity), units.of(si, quantity));
        return this;
    }

    /** A word, list, object or null under a key as it stands. */
    Fields put(String key, Object value) {
        map.put(key, value);
        return this;
    }

    /** A pose: fraction of stroke by name of cylinder. */
    static Map<String, Object> pose(List<String> cylinders, double[] fractions) {
        Map<String, Object> pose = new LinkedHashMap<>();
        for (int c = 0; c < fractions.length; c++) {
            pose.put(cylinders.get(c), fractions[c]);
        }
        return pose;
    }

    Map<String, Object> map() {
        return map;
    }
}
