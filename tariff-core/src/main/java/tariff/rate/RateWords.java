// SPDX-License-Identifier: Apache-2.0
package tariff.rate;

import java.time.MonthDay;
import java.time.format.TextStyle;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Collectors;
import tariff.rate.clause.Line;
import tariff.rate.clause.Scope;

/**
 * A rate in words, to hold beside the printed sheet.
 *
 * @param heading name, currency, first day
 * @param definitions what the rate defines by name, each as a sentence
 * @param lines the lines of the bill in order, each as a sentence
 * @param closing what the total is and how it is rounded
 */
public record RateWords(String heading, List<String> definitions, List<String> lines, String closing) {

    static RateWords of(RateDefinition rate, Scope scope) {
        List<String> definitions = new ArrayList<>();
        rate.powerFactors()
                .forEach((name, rule) -> definitions.add("Power factor \"" + name + "\": " + rule.words() + "."));
        rate.windows()
                .forEach((name, window) ->
                        definitions.add("Window \"" + name + "\": " + WindowWords.of(window, rate.zone()) + "."));
        if (!rate.seasons().isEmpty()) {
            definitions.add("Seasons: " + seasons(rate) + "; " + rate.seasonBy().words() + ".");
        }
        rate.quantities()
                .forEach((name, quantity) -> definitions.add("Quantity \"" + name + "\": " + quantity.words() + "."));
        List<String> lines =
                rate.lines().stream().map(line -> sentence(line, scope)).toList();
        return new RateWords(
                rate.name() + ", prices in " + rate.currency()
                        + rate.validFrom().map(day -> ", from " + day).orElse(""),
                List.copyOf(definitions),
                lines,
                closing(rate));
    }

    /** The whole rate as text, one clause a line. */
    public String text() {
        List<String> all = new ArrayList<>();
        all.add(heading);
        all.addAll(definitions);
        all.addAll(lines);
        all.add(closing);
        return String.join("\n", all) + "\n";
    }

    private static String sentence(Line line, Scope scope) {
        String when = line.heading()
                .when()
                .map(condition -> ", " + condition.ending())
                .orElse("");
        String round =
                line.heading().round().map(rounding -> "; " + rounding.words()).orElse("");
        String shown = line.heading().shownOnly() ? "; shown only, not part of the total" : "";
        return line.name() + ": " + withoutArticle(line.words(scope)) + when + round + shown + ".";
    }

    private static String withoutArticle(String words) {
        return words.startsWith("the ") ? words.substring(4) : words;
    }

    private static String seasons(RateDefinition rate) {
        Map<String, String> all = new LinkedHashMap<>();
        rate.seasons().forEach((name, season) -> all.put(name, day(season.from()) + " to " + day(season.to())));
        return all.entrySet().stream()
                .map(each -> each.getKey() + " " + each.getValue())
                .collect(Collectors.joining(", "));
    }

    private static String day(MonthDay day) {
        return day.getDayOfMonth() + " " + day.getMonth().getDisplayName(TextStyle.FULL, Locale.ENGLISH);
    }

    private static String closing(RateDefinition rate) {
        return "Total: the lines added up, "
                + rate.roundLines()
                        .map(rounding -> "each line " + rounding.words())
                        .orElse("lines not rounded")
                + ", the total " + rate.roundTotal().words() + ".";
    }
}
