// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

/** Objects of a rate file with one key written otherwise. */
final class Keys {
    private Keys() {}

    static Optional<Object> get(Map<?, ?> object, String key) {
        return Optional.ofNullable(object.get(key));
    }

    static Map<String, Object> with(Map<?, ?> object, String key, Object value) {
        Map<String, Object> changed = copy(object);
        changed.put(key, value);
        return changed;
    }

    static Map<String, Object> without(Map<?, ?> object, String key) {
        Map<String, Object> changed = copy(object);
        changed.remove(key);
        return changed;
    }

    static Map<String, Object> copy(Map<?, ?> object) {
        Map<String, Object> copy = new LinkedHashMap<>();
        object.forEach((key, value) -> copy.put(String.valueOf(key), value));
        return copy;
    }
}
