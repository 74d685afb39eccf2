package org.rodside.model;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;

/** Unmodifiable map copies that keep the order of the file; {@code Map.copyOf} does not. */
final class Ordered {

    private Ordered() {}

    static <K, V> Map<K, V> copyOf(Map<K, V> map) {
        return Collections.unmodifiableMap(new LinkedHashMap<>(map));
    }
}
