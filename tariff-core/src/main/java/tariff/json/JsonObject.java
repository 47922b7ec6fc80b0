// SPDX-License-Identifier: Apache-2.0
package tariff.json;

import java.math.BigDecimal;
import java.util.Collection;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;

/** A JSON object being written; keys stand in the order they are given. */
public final class JsonObject {
    private final Map<String, Object> entries = new LinkedHashMap<>();

    public JsonObject with(String key, String text) {
        return put(key, text);
    }

    public JsonObject with(String key, BigDecimal number) {
        return put(key, number);
    }

    public JsonObject with(String key, long number) {
        return put(key, BigDecimal.valueOf(number));
    }

    public JsonObject with(String key, boolean flag) {
        return put(key, flag);
    }

    public JsonObject with(String key, JsonObject object) {
        return put(key, object.entries());
    }

    /** A number as it stands, anything else as its text; an absent value leaves the key out. */
    public JsonObject withIf(String key, Optional<?> value) {
        value.ifPresent(present -> put(key, present instanceof BigDecimal ? present : present.toString()));
        return this;
    }

    /** Leaves the key out if the object has no entry. */
    public JsonObject withUnlessEmpty(String key, JsonObject object) {
        return object.entries.isEmpty() ? this : with(key, object);
    }

    public JsonObject withTexts(String key, Collection<String> texts) {
        return put(key, List.copyOf(texts));
    }

    public JsonObject withNumbers(String key, List<BigDecimal> numbers) {
        return put(key, numbers);
    }

    /** A list with an object for each value. */
    public <T> JsonObject withAll(String key, Collection<T> values, Function<? super T, JsonObject> write) {
        return put(
                key, values.stream().map(value -> write.apply(value).entries()).toList());
    }

    public Map<String, Object> entries() {
        return Collections.unmodifiableMap(entries);
    }

    /** The document in UTF-8. */
    public byte[] bytes() {
        return JsonText.write(entries);
    }

    /** A value that is JSON already: maps, lists, texts, decimals, true and false. */
    JsonObject put(String key, Object value) {
        entries.put(key, value);
        return this;
    }
}
