// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import tariff.json.JsonTree;
import tariff.notice.Finding;
import tariff.rate.Rate;
import tariff.rate.clause.QuantityKinds;

/** The text for people who write their first rate names everything that a rate may hold, and every piece of it works. */
class HowToWriteARateTest {
    private static final String TEXT = Examples.text("examples/template/HOW-TO-WRITE-A-RATE.md");
    private static final String TEMPLATE = Examples.text("examples/template/every-kind.json");
    private static final Pattern SNIPPET = Pattern.compile("(?ms)^```json (\\w+)\\n(.*?)\\n```$");

    /** What surrounds a piece of a rate, by the word after {@code ```json}; %s is where the piece goes. */
    private static final Map<String, String> AROUND = Map.of(
            "rate", "%s",
            "definitions", "{ 'name': 'A', 'currency': 'EUR', %s, 'lines': [" + line("'price': 1") + "] }",
            "quantity", rate("{ 'name': 'It', 'quantity': %s, 'price': 1 }"),
            "price", rate(line("'price': %s")),
            "schedule", rate("{ 'name': 'It', 'percentOf': 'all above', 'schedule': %s }"),
            "condition", rate(line("'price': 1, 'when': %s")),
            "line", rate("%s"));

    private static String line(String rest) {
        return "{ 'name': 'It', 'quantity': { 'energy': 'kWh' }, " + rest + " }";
    }

    private static String rate(String line) {
        return "{ 'name': 'A', 'currency': 'EUR', 'powerFactors': { 'billing': { 'from': 'energies' } },"
                + " 'windows': { 'day': { 'from': '07:00', 'to': '21:00' } },"
                + " 'seasons': { 'summer': { 'from': '05-01', 'to': '09-30' }, 'winter': { 'from': '10-01', 'to': '04-30' } },"
                + " 'quantities': { 'billed demand': { 'peak': 'kW' } }, 'lines': ["
                + " { 'name': 'Energy', 'quantity': { 'energy': 'kWh' }, 'price': 1 },"
                + " { 'name': 'Demand', 'quantity': 'billed demand', 'price': 1 }, " + line + "] }";
    }

    static Stream<Arguments> snippets() {
        return SNIPPET.matcher(TEXT).results().map(found -> Arguments.of(found.group(1), found.group(2)));
    }

    @ParameterizedTest
    @MethodSource("snippets")
    void everyPieceOfTheTextIsARateOrPartOfOne(String kind, String snippet) {
        assertThat(AROUND).containsKey(kind);
        String whole = AROUND.get(kind).replace('\'', '"').replace("%s", snippet);
        assertThat(errors(whole)).isEmpty();
        assertThat(new Contract().rateErrors(whole)).isEmpty();
    }

    @Test
    void everyBlockOfJsonInTheTextIsTried() {
        assertThat(TEXT.lines().filter(text -> text.startsWith("```json")))
                .hasSize((int) snippets().count());
    }

    @Test
    void theTemplateChecks() {
        assertThat(errors(TEMPLATE)).isEmpty();
        assertThat(new Contract().rateErrors(TEMPLATE)).isEmpty();
    }

    @Test
    void everyKindOfQuantityStandsInBoth() {
        assertThat(keys(tree(TEMPLATE), new TreeSet<>())).containsAll(QuantityKinds.keys());
        assertThat(QuantityKinds.keys()).allSatisfy(key -> assertThat(TEXT).contains("**`" + key + "`**"));
    }

    /** Kinds of price, schedule, condition and line, and everything else, by the keys and words that the schema knows. */
    @Test
    void everyKeyOfARateStandsInBoth() {
        Set<String> properties = new TreeSet<>();
        Set<String> words = new TreeSet<>();
        schema(tree(Examples.text("openapi/rate.schema.json")), properties, words);
        assertThat(properties).contains("bySeason", "byDate", "bySchedule", "slopes", "bands", "ratioTo", "percentOf");
        assertThat(words).contains("majorFraction", "netted", "all above");
        assertThat(keys(tree(TEMPLATE), new TreeSet<>())).containsAll(properties);
        assertThat(properties).allSatisfy(key -> assertThat(TEXT).containsAnyOf("`" + key + "`", "\"" + key + "\""));
        assertThat(words).allSatisfy(word -> assertThat(TEXT).containsAnyOf("`" + word + "`", "\"" + word + "\""));
    }

    private static Object tree(String json) {
        return java.util.Objects.requireNonNull(JsonTree.read(json.getBytes(StandardCharsets.UTF_8)));
    }

    private static Stream<String> errors(String rate) {
        return Rate.check(tree(rate)).findings().stream()
                .filter(Finding::isError)
                .map(Finding::toString);
    }

    private static Set<String> keys(Object json, Set<String> keys) {
        if (json instanceof Map<?, ?> map) {
            map.forEach((key, value) -> {
                keys.add(String.valueOf(key));
                keys(value, keys);
            });
        } else if (json instanceof Collection<?> list) {
            list.forEach(each -> keys(each, keys));
        }
        return keys;
    }

    private static void schema(Object json, Set<String> properties, Set<String> words) {
        if (json instanceof Map<?, ?> map) {
            Map<Object, Object> rest = new LinkedHashMap<>(map);
            rest.remove("examples");
            if (rest.remove("properties") instanceof Map<?, ?> named) {
                named.forEach((key, value) -> {
                    properties.add(String.valueOf(key));
                    schema(value, properties, words);
                });
            }
            if (rest.remove("enum") instanceof Collection<?> all) {
                all.forEach(word -> words.add(String.valueOf(word)));
            }
            if (rest.remove("const") instanceof String word) {
                words.add(word);
            }
            rest.values().forEach(value -> schema(value, properties, words));
        } else if (json instanceof Collection<?> list) {
            list.forEach(each -> schema(each, properties, words));
        }
    }
}
