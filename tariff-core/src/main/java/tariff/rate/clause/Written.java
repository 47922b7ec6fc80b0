// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Consumer;
import java.util.function.Function;
import org.jspecify.annotations.Nullable;
import tariff.notice.Finding;

/**
 * A value as it stands in a rate file: a map, a list, a text, a number, true or false. Reading never throws: whatever is wrong is
 * reported with its place, a stand-in is returned, and reading goes on.
 */
public final class Written {
    private static final int MAX_EXPONENT = 30;
    private static final int MAX_DIGITS = 40;
    private static final int MAX_ENTRIES = 1000;

    private final @Nullable Object value;
    private final String pointer;
    private final Consumer<Finding> findings;
    private final Set<String> asked = new LinkedHashSet<>();

    public Written(@Nullable Object value, String pointer, Consumer<Finding> findings) {
        this.value = value;
        this.pointer = pointer;
        this.findings = findings;
    }

    /** The same value, whose findings somebody else is told too. */
    public Written toldAlso(Consumer<Finding> other) {
        return new Written(value, pointer, findings.andThen(other));
    }

    public String pointer() {
        return pointer;
    }

    public boolean isText() {
        return value instanceof String;
    }

    public boolean isNumber() {
        return value instanceof BigDecimal;
    }

    public boolean isObject() {
        return value instanceof Map;
    }

    /** The keys of an object in their order; none of anything else. */
    public Set<String> keys() {
        Set<String> keys = new LinkedHashSet<>();
        if (value instanceof Map<?, ?> map) {
            map.keySet().forEach(key -> keys.add(String.valueOf(key)));
        }
        return keys;
    }

    public boolean has(String key) {
        asked.add(key);
        return value instanceof Map<?, ?> map && map.containsKey(key);
    }

    /** The value under a key, which may be absent; asking makes the key a known one. */
    public Written at(String key) {
        asked.add(key);
        Object inner = value instanceof Map<?, ?> map ? map.get(key) : null;
        return new Written(inner, pointer + "/" + key.replace("~", "~0").replace("/", "~1"), findings);
    }

    public BigDecimal number(String key) {
        return present(key) ? at(key).number() : BigDecimal.ONE;
    }

    public Optional<BigDecimal> optionalNumber(String key) {
        return has(key) ? Optional.of(at(key).number()) : Optional.empty();
    }

    public int wholeNumber(String key, int least, int most) {
        return present(key) ? at(key).wholeNumber(least, most) : least;
    }

    public int wholeNumber(int least, int most) {
        if (!isNumber()) {
            number();
            return least;
        }
        BigDecimal number = number();
        if (number.stripTrailingZeros().scale() > 0
                || number.compareTo(BigDecimal.valueOf(least)) < 0
                || number.compareTo(BigDecimal.valueOf(most)) > 0) {
            wrong("number", "must be a whole number", "a whole number from " + least + " to " + most);
            return least;
        }
        return number.intValueExact();
    }

    public String text(String key) {
        return present(key) ? at(key).text() : "?";
    }

    public Optional<String> optionalText(String key) {
        return has(key) ? Optional.of(at(key).text()) : Optional.empty();
    }

    public boolean flag(String key) {
        if (!has(key)) {
            return false;
        }
        if (at(key).value instanceof Boolean flag) {
            return flag;
        }
        at(key).wrong("type", "must be true or false", "true, false");
        return false;
    }

    /** One of a set of words, by the word that stands for each; {@code fallback} if absent or wrong. */
    public <T> T word(String key, Map<String, T> words, T fallback) {
        return has(key) ? at(key).word(words, fallback) : fallback;
    }

    public <T> T requiredWord(String key, Map<String, T> words, T standIn) {
        return present(key) ? at(key).word(words, standIn) : standIn;
    }

    /** The entries of a list. */
    public List<Written> list(String key) {
        if (!present(key)) {
            return List.of();
        }
        Written list = at(key);
        List<Written> entries = list.entries();
        if (list.value instanceof List<?> written && written.isEmpty()) {
            list.wrong("empty", "is empty", "at least one entry");
        }
        return entries;
    }

    public List<String> texts(String key) {
        return list(key).stream().map(Written::text).toList();
    }

    /** An object whose keys are names that the rate gives; absent is empty. */
    public <T> Map<String, T> named(String key, Function<Written, T> read) {
        Map<String, T> all = new LinkedHashMap<>();
        if (has(key)) {
            Written object = at(key);
            if (!object.isObject()) {
                object.wrong("type", "must be an object with a name for each entry", "an object");
            }
            if (object.keys().size() > MAX_ENTRIES) {
                object.tooMany(object.keys().size());
                return all;
            }
            object.keys().forEach(name -> all.put(name, read.apply(object.at(name))));
        }
        return all;
    }

    public Quantity quantity(String key) {
        return present(key) ? QuantityKinds.read(at(key)) : Quantity.unreadable();
    }

    public List<Quantity> quantities(String key) {
        return list(key).stream().map(QuantityKinds::read).toList();
    }

    public BigDecimal number() {
        if (!(value instanceof BigDecimal number)) {
            wrong("type", "must be a number", "a number such as 0.95, without quotes");
            return BigDecimal.ONE;
        }
        if (number.precision() > MAX_DIGITS || Math.abs((long) number.precision() - number.scale()) > MAX_EXPONENT) {
            wrong("number", "is out of range", "up to " + MAX_DIGITS + " digits, below 1e" + MAX_EXPONENT);
            return BigDecimal.ONE;
        }
        return number;
    }

    public String text() {
        if (value instanceof String text && !text.isBlank()) {
            return text;
        }
        wrong("type", "must be a text", "a text in quotes, not empty");
        return "?";
    }

    /** One of a set of words, by the word that stands for each; {@code fallback} if it is none. */
    public <T> T word(Map<String, T> words, T fallback) {
        String written = text();
        T meant = words.get(written);
        if (meant == null) {
            if (!written.equals("?")) {
                wrong("word", "is not known" + Nearest.hint(written, words.keySet()), Nearest.list(words.keySet()));
            }
            return fallback;
        }
        return meant;
    }

    public List<Written> entries() {
        List<Written> entries = new ArrayList<>();
        if (value instanceof List<?> list) {
            if (list.size() > MAX_ENTRIES) {
                tooMany(list.size());
                return entries;
            }
            for (int i = 0; i < list.size(); i++) {
                entries.add(new Written(list.get(i), pointer + "/" + i, findings));
            }
        } else {
            wrong("type", "must be a list", "a list in square brackets");
        }
        return entries;
    }

    /** Reports that the value is wrong. */
    public void wrong(String code, String message, String allowed) {
        findings.accept(Finding.error(code, pointer, message).found(found()).allowed(allowed));
    }

    /** Reports that the value is wrong, with other words for what stands there. */
    public void wrongAs(String code, String message, String found, String allowed) {
        findings.accept(Finding.error(code, pointer, message).found(found).allowed(allowed));
    }

    /** Reports every key that nothing asked for: a rate never has keys that are silently ignored. */
    public void refuseOtherKeys() {
        List<String> known = List.copyOf(asked);
        for (String key : keys()) {
            if (!known.contains(key)) {
                findings.accept(
                        Finding.error("unknown-key", at(key).pointer, "is not a key here" + Nearest.hint(key, known))
                                .found(key)
                                .allowed(Nearest.list(known)));
            }
        }
    }

    private void tooMany(int count) {
        wrongAs("too-many", "has too many entries", String.valueOf(count), "at most " + MAX_ENTRIES);
    }

    private boolean present(String key) {
        if (has(key)) {
            return true;
        }
        if (isObject()) {
            findings.accept(Finding.error("missing-key", pointer, "\"" + key + "\" is missing"));
        } else {
            wrong("type", "must be an object", "an object in braces with \"" + key + "\"");
        }
        return false;
    }

    private String found() {
        if (value == null) {
            return "null";
        }
        if (value instanceof Map) {
            return "an object";
        }
        if (value instanceof List) {
            return "a list";
        }
        if (value instanceof String text) {
            return '"' + (text.length() > 60 ? text.substring(0, 60) + "…" : text) + '"';
        }
        return value instanceof BigDecimal number ? number.toString() : String.valueOf(value);
    }
}
