// SPDX-License-Identifier: Apache-2.0
package tariff.rate;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.UnaryOperator;
import org.jspecify.annotations.Nullable;

/**
 * A rate as it was written: objects as maps in their order, lists, texts, decimals, true and false. It can be written otherwise and
 * compiled again; the rate it came from stays as it is.
 *
 * @param tree the whole rate; nothing in it can be changed
 */
public record RateSource(Map<String, Object> tree) {

    static RateSource of(@Nullable Object file) {
        return new RateSource(object(file));
    }

    public RateSource {
        tree = object(frozen(tree));
    }

    /**
     * The same rate with each of its values written otherwise, from the innermost outward.
     *
     * @param change what stands in the place of an object, a list, a text, a number or a flag; the value itself to leave it
     */
    public RateSource rewritten(UnaryOperator<Object> change) {
        return new RateSource(object(rewritten(tree, change)));
    }

    /** The same rate with one of its own keys written otherwise. */
    public RateSource with(String key, Object value) {
        Map<String, Object> changed = new LinkedHashMap<>(tree);
        changed.put(key, value);
        return new RateSource(changed);
    }

    public RateSource without(String key) {
        Map<String, Object> changed = new LinkedHashMap<>(tree);
        changed.remove(key);
        return new RateSource(changed);
    }

    /** Whether an object anywhere in the rate has the key. */
    public boolean mentions(String key) {
        return mentions(tree, key);
    }

    /** Whether the value is an object that has the key, or holds one that has. */
    public static boolean mentions(Object value, String key) {
        if (value instanceof Map<?, ?> map) {
            return map.containsKey(key) || map.values().stream().anyMatch(each -> mentions(each, key));
        }
        return value instanceof List<?> list && list.stream().anyMatch(each -> mentions(each, key));
    }

    /** The rate, if it is one. */
    public Optional<Rate> compiled() {
        return Rate.check(tree, false).rate();
    }

    private static Object frozen(Object value) {
        return rewritten(value, same -> same);
    }

    private static Object rewritten(Object value, UnaryOperator<Object> change) {
        if (value instanceof Map<?, ?> map) {
            Map<String, Object> copy = new LinkedHashMap<>();
            map.forEach((key, inner) -> copy.put(String.valueOf(key), rewritten(inner, change)));
            return change.apply(Collections.unmodifiableMap(copy));
        }
        if (value instanceof List<?> list) {
            List<Object> copy = new ArrayList<>();
            list.forEach(inner -> copy.add(rewritten(inner, change)));
            return change.apply(Collections.unmodifiableList(copy));
        }
        return change.apply(value);
    }

    private static Map<String, Object> object(@Nullable Object value) {
        Map<String, Object> copy = new LinkedHashMap<>();
        if (value instanceof Map<?, ?> map) {
            map.forEach((key, inner) -> copy.put(String.valueOf(key), inner));
        }
        return Collections.unmodifiableMap(copy);
    }
}
