// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.Set;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import tariff.json.JsonTree;
import tariff.notice.Finding;
import tariff.rate.Rate;

/** The schema and the program agree on rates that nobody wrote: parts of the shelf put together anew, and rates with a slip in them. */
class RateSchemaMutationsTest {
    private static final Contract CONTRACT = new Contract();

    /** Findings about what a rate looks like; all others are about what it means, which a schema cannot say. */
    private static final Set<String> SHAPE = Set.of(
            "type",
            "missing-key",
            "unknown-key",
            "word",
            "number",
            "empty",
            "quantity",
            "price",
            "schedule",
            "condition",
            "line",
            "bound",
            "band",
            "slope",
            "percent",
            "currency",
            "date",
            "time",
            "month",
            "weekdays",
            "days",
            "power-factor");

    private static final Object[] SLIPS = {
        true,
        "",
        " ",
        "x",
        "0.9",
        "2026-13-45",
        "25:00",
        "Monday",
        List.of(),
        Map.of(),
        List.of(BigDecimal.ONE),
        new BigDecimal("-1"),
        BigDecimal.ZERO,
        new BigDecimal("0.5"),
        new BigDecimal("2"),
        new BigDecimal("85"),
        new BigDecimal("400")
    };

    private static Object tree(String json) {
        return java.util.Objects.requireNonNull(JsonTree.read(json.getBytes(StandardCharsets.UTF_8)));
    }

    private static List<Object> shelf() {
        return Stream.concat(Examples.rates().stream(), Stream.of(Examples.path("examples/template/every-kind.json")))
                .map(Examples::read)
                .map(RateSchemaMutationsTest::tree)
                .toList();
    }

    /** The values on the shelf by the key that they stand under. */
    private static Map<String, List<Object>> parts(List<Object> shelf) {
        Map<String, List<Object>> parts = new LinkedHashMap<>();
        shelf.forEach(rate -> collect(rate, parts));
        return parts;
    }

    private static void collect(Object json, Map<String, List<Object>> parts) {
        if (json instanceof Map<?, ?> map) {
            map.forEach((key, value) -> {
                parts.computeIfAbsent(String.valueOf(key), each -> new ArrayList<>())
                        .add(value);
                collect(value, parts);
            });
        } else if (json instanceof List<?> list) {
            list.forEach(each -> collect(each, parts));
        }
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4})
    void partsOfRatesPutTogetherAnewMeetTheSchemaIfTheProgramTakesThem(long seed) {
        Random random = new Random(seed);
        List<Object> shelf = shelf();
        Map<String, List<Object>> parts = parts(shelf);
        int usable = 0;
        for (int i = 0; i < 60; i++) {
            Object rate = shelf.get(random.nextInt(shelf.size()));
            for (int change = 0; change < 4; change++) {
                rate = changed(rate, random, (key, value) -> pick(parts.get(key), random));
            }
            usable += assertAgreed(rate) ? 1 : 0;
        }
        assertThat(usable).isGreaterThan(15);
    }

    @ParameterizedTest
    @ValueSource(longs = {11, 12, 13, 14})
    void aSlipInARateIsRefusedByBothOrByNeither(long seed) {
        Random random = new Random(seed);
        List<Object> shelf = shelf();
        int refused = 0;
        for (int i = 0; i < 60; i++) {
            Object rate = changed(
                    shelf.get(random.nextInt(shelf.size())),
                    random,
                    (key, value) -> SLIPS[random.nextInt(SLIPS.length)]);
            refused += assertAgreed(rate) ? 0 : 1;
        }
        assertThat(refused).isGreaterThan(15);
    }

    @ParameterizedTest
    @ValueSource(longs = {21, 22})
    void aKeyTooManyOrTooFewIsRefusedByBothOrByNeither(long seed) {
        Random random = new Random(seed);
        List<Object> shelf = shelf();
        Map<String, List<Object>> parts = parts(shelf);
        List<String> keys = List.copyOf(parts.keySet());
        int refused = 0;
        for (int i = 0; i < 60; i++) {
            Object rate = changed(shelf.get(random.nextInt(shelf.size())), random, (key, value) -> {
                if (!(value instanceof Map<?, ?> map) || map.isEmpty()) {
                    return value;
                }
                Map<Object, Object> other = new LinkedHashMap<>(map);
                if (random.nextBoolean()) {
                    other.remove(pick(new ArrayList<>(map.keySet()), random));
                } else {
                    String more = keys.get(random.nextInt(keys.size()));
                    other.put(more, pick(parts.get(more), random));
                }
                return other;
            });
            refused += assertAgreed(rate) ? 0 : 1;
        }
        assertThat(refused).isGreaterThan(8);
    }

    @Test
    void aWrongRateOfTheShelfFailsTheSchemaIfItsShapeIsWrong() {
        for (Path file : Examples.in("examples/bad", ".json")) {
            assertAgreed(tree(Examples.read(file)));
        }
    }

    /** Whether the program takes it. */
    private static boolean assertAgreed(Object rate) {
        String text = Json.text(rate);
        Rate.Checked checked = Rate.check(tree(text));
        List<String> wrongInShape = checked.findings().stream()
                .filter(finding -> finding.isError() && SHAPE.contains(finding.code()))
                .map(Finding::toString)
                .toList();
        if (wrongInShape.isEmpty()) {
            if (checked.rate().isPresent()) {
                assertThat(CONTRACT.rateErrors(text)).as(text).isEmpty();
            }
        } else {
            assertThat(CONTRACT.rateErrors(text))
                    .as("%s in %s", wrongInShape, text)
                    .isNotEmpty();
        }
        return checked.rate().isPresent();
    }

    private interface Change {
        Object of(String key, Object value);
    }

    /** The rate with one value changed, any of them as likely. */
    private static Object changed(Object rate, Random random, Change change) {
        int[] left = {random.nextInt(count(rate))};
        return walk("", rate, left, change);
    }

    private static int count(Object json) {
        Stream<?> inner = json instanceof Map<?, ?> map
                ? map.values().stream()
                : json instanceof List<?> list ? list.stream() : Stream.empty();
        return inner.mapToInt(each -> 1 + count(each)).sum();
    }

    private static Object walk(String key, Object json, int[] left, Change change) {
        if (json instanceof Map<?, ?> map) {
            Map<Object, Object> copy = new LinkedHashMap<>();
            map.forEach((name, value) -> copy.put(
                    name,
                    left[0]-- == 0
                            ? change.of(String.valueOf(name), value)
                            : walk(String.valueOf(name), value, left, change)));
            return copy;
        }
        if (json instanceof List<?> list) {
            List<Object> copy = new ArrayList<>();
            list.forEach(value -> copy.add(
                    left[0]-- == 0 && !key.isEmpty() && !(value instanceof Map)
                            ? change.of(key, value)
                            : walk(key, value, left, change)));
            return copy;
        }
        return json;
    }

    private static Object pick(@Nullable List<?> values, Random random) {
        List<?> some = java.util.Objects.requireNonNull(values);
        return java.util.Objects.requireNonNull(some.get(random.nextInt(some.size())));
    }
}
