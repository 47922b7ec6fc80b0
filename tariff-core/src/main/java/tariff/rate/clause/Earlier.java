// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.time.Month;
import java.time.format.TextStyle;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import tariff.meter.Triangle;
import tariff.meter.Unit;
import tariff.notice.Assumption;

/**
 * A quantity's past, which makes ratchets: {@code { "earlier": "highest", "of": { "peak": "kW" }, "months": 11 }}. {@code "onlyIn"} keeps
 * some months of the year; {@code "since": 1} reaches back to January instead of a fixed number of months. This month is not part of
 * it.
 *
 * @param months how many months back, 0 when {@code since} says how far
 */
public record Earlier(Take take, Quantity of, int months, Optional<Month> since, Set<Month> onlyIn)
        implements Quantity {

    /** What is made of the months. */
    public enum Take {
        HIGHEST("highest", "highest value"),
        LOWEST("lowest", "lowest value"),
        SUM("sum", "sum"),
        MEAN("mean", "mean");

        private final String word;
        private final String noun;

        Take(String word, String noun) {
            this.word = word;
            this.noun = noun;
        }
    }

    private static final Map<String, Take> TAKES = new LinkedHashMap<>();

    static {
        for (Take take : Take.values()) {
            TAKES.put(take.word, take);
        }
    }

    static Quantity read(Written in) {
        Take take = in.requiredWord("earlier", TAKES, Take.HIGHEST);
        Quantity of = in.quantity("of");
        Optional<Month> since =
                in.has("since") ? Optional.of(Month.of(in.wholeNumber("since", 1, 12))) : Optional.empty();
        int months = since.isPresent() && !in.has("months") ? 0 : in.wholeNumber("months", 1, 60);
        Set<Month> onlyIn = new TreeSet<>();
        if (in.has("onlyIn")) {
            for (Written month : in.list("onlyIn")) {
                onlyIn.add(Month.of(month.wholeNumber(1, 12)));
            }
        }
        return new Earlier(take, of, months, since, onlyIn);
    }

    @Override
    public Optional<Unit> unit(Scope scope) {
        Scope inThePast = scope.at("of").withLines(List.copyOf(scope.names().lines()));
        if (of instanceof Named named && scope.following().contains(named.name())) {
            return Optional.empty();
        }
        return of.unit(inThePast);
    }

    @Override
    public Figure value(Facts facts) {
        List<Figure> figures = new ArrayList<>();
        int reached = 0;
        int wanted = wanted(facts.period().month().getMonth());
        for (Facts past : facts.earlier()) {
            if (reached == wanted) {
                break;
            }
            reached++;
            if (onlyIn.isEmpty() || onlyIn.contains(past.period().month().getMonth())) {
                figures.add(of.value(past));
            }
        }
        if (reached < wanted) {
            facts.assume(new Assumption(
                    "history-short",
                    facts.period().toString(),
                    words() + ": only " + reached + " of " + wanted
                            + " earlier months are given; the others are taken not to matter",
                    "give the bills of the months before"));
        }
        return combine(figures);
    }

    private int wanted(Month now) {
        return since.map(month -> Math.floorMod(now.getValue() - month.getValue(), 12))
                .orElse(months);
    }

    private Figure combine(List<Figure> figures) {
        if (figures.isEmpty()) {
            return Figure.given(BigDecimal.ZERO, Unit.NUMBER, "no earlier month");
        }
        BigDecimal value = figures.get(0).value();
        for (Figure figure : figures.subList(1, figures.size())) {
            value = switch (take) {
                case HIGHEST -> value.max(figure.value());
                case LOWEST -> value.min(figure.value());
                case SUM, MEAN -> value.add(figure.value());
            };
        }
        if (take == Take.MEAN) {
            value = value.divide(BigDecimal.valueOf(figures.size()), Triangle.PRECISION);
        }
        String how = take.word + " of {}" + ", {}".repeat(figures.size() - 1);
        return new Figure(value, figures.get(0).unit(), how, figures);
    }

    @Override
    public String words() {
        String reach =
                since.map(month -> "the months since " + name(month)).orElse("the previous " + months + " months");
        String only = onlyIn.isEmpty()
                ? ""
                : " (only " + onlyIn.stream().map(Earlier::name).collect(Collectors.joining(", ")) + ")";
        return "the " + take.noun + " of " + of.innerWords() + " in " + reach + only;
    }

    @Override
    public List<Clause> parts() {
        return List.of(of);
    }

    private static String name(Month month) {
        return month.getDisplayName(TextStyle.FULL, Locale.ENGLISH);
    }
}
