// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.math.BigDecimal;
import java.util.LinkedHashMap;
import java.util.Map;

/** A rounding as a rate file writes it; an empty step for none. */
record Steps(String to, String mode) {
    static final Steps NONE = new Steps("", "");

    boolean isNone() {
        return to.isEmpty();
    }

    /** {@code { "to": 0.01, "mode": "halfUp" }}. */
    Map<String, Object> written() {
        Map<String, Object> written = new LinkedHashMap<>();
        written.put("to", new BigDecimal(to));
        written.put("mode", mode);
        return written;
    }

    /** The object with this rounding under a key, as it is if it rounds so already. */
    Map<String, Object> under(Map<?, ?> object, String key) {
        if (isNone()) {
            return Keys.without(object, key);
        }
        return Keys.with(object, key, object.get(key) instanceof Map<?, ?> old && same(old) ? old : written());
    }

    /** Whether a rounding that is written is this one. */
    boolean same(Map<?, ?> old) {
        Object oldMode = old.get("mode");
        return !isNone()
                && old.get("to") instanceof BigDecimal step
                && step.compareTo(new BigDecimal(to)) == 0
                && mode.equals(oldMode == null ? "halfUp" : oldMode);
    }

    String words() {
        String step = to.equals("1") ? "a whole number" : to;
        return switch (mode) {
            case "" -> "not rounded";
            case "up" -> "rounded up to " + step;
            case "down" -> "cut off to " + step;
            default -> "rounded half up to " + step;
        };
    }
}
