// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import tariff.meter.Period;

/**
 * What a trial came to.
 *
 * @param months the months it is about that could be billed, by place; those that agree already are only billed if another came closer
 * @param gained how many came to agree: two for one to the cent, one for one within rounding
 */
record Outcome(Trial trial, SortedMap<Integer, ReconciledMonth> months, int gained) {

    /** Tries the first two months alone, and all of them only if both come to agree. */
    static Optional<Outcome> ofAllOrNothing(Trial trial, Case bills) {
        boolean promising = bills.open().stream()
                .limit(2)
                .allMatch(place -> gain(
                                trial.month(place, bills).orElse(null),
                                bills.charged().get(place))
                        > 0);
        return promising ? Optional.of(of(trial, bills)) : Optional.empty();
    }

    static Outcome of(Trial trial, Case bills) {
        SortedMap<Integer, ReconciledMonth> months = new TreeMap<>();
        List<Integer> open = bills.open();
        int gained = 0;
        for (int place : open) {
            if (trial.isAbout(place)) {
                trial.month(place, bills).ifPresent(month -> months.put(place, month));
                gained += gain(months.get(place), bills.charged().get(place));
            }
        }
        if (gained > 0) {
            bills.charged().keySet().stream()
                    .filter(place -> trial.isAbout(place) && !months.containsKey(place))
                    .forEach(place -> trial.month(place, bills).ifPresent(month -> months.put(place, month)));
        }
        return new Outcome(trial, months, gained);
    }

    private static int gain(@Nullable ReconciledMonth now, @Nullable ReconciledMonth before) {
        if (now == null || before == null || now.verdict().compareTo(before.verdict()) >= 0) {
            return 0;
        }
        return now.verdict() == Verdict.AGREES ? 2 : now.verdict() == Verdict.WITHIN_ROUNDING ? 1 : 0;
    }

    /** Two bills that are read otherwise together have to agree together. */
    boolean explainsAllItIsAbout(Case bills) {
        return gained > 0
                && trial.at().stream()
                        .allMatch(
                                place -> gain(months.get(place), bills.charged().get(place)) > 0);
    }

    /** The same with the later bills that remember the month. */
    Outcome withWhatFollows(Case bills) {
        if (!bills.rate().looksBack()) {
            return this;
        }
        Outcome whole = of(trial.everywhere(), bills);
        return whole.gained > gained && !whole.breaksSome(bills) ? whole : this;
    }

    boolean breaksSome(Case bills) {
        return !breaks(bills).isEmpty();
    }

    private List<Period> breaks(Case bills) {
        List<Period> breaks = new ArrayList<>();
        months.forEach((place, month) -> {
            ReconciledMonth before = bills.charged().get(place);
            if (before != null
                    && before.verdict().isAgreement()
                    && month.verdict().compareTo(before.verdict()) > 0) {
                breaks.add(before.period());
            }
        });
        return breaks;
    }

    /** Everything that still separates the bills from the rate, months outside the trial as they stand. */
    BigDecimal residual(Case bills) {
        return residual(bills, months);
    }

    static BigDecimal residualAsItStands(Case bills) {
        return residual(bills, Map.of());
    }

    /** Whether nothing but the rate is otherwise, so that it can be changed once more. */
    boolean isOfTheRateAlone(Case bills) {
        return trial.past().isEmpty() && !trial.rate().equals(bills.rate());
    }

    Explanation everyMonth(Case bills) {
        List<Explanation.Month> explains = new ArrayList<>();
        months.forEach((place, month) -> {
            if (gain(month, bills.charged().get(place)) > 0) {
                explains.add(new Explanation.Month(period(bills, place), trial.words(), month));
            }
        });
        return new Explanation(
                trial.code(),
                trial.words(),
                true,
                explains,
                breaks(bills),
                tally(bills, Map.of()),
                tally(bills, months),
                residual(bills));
    }

    /** What several outcomes of one cause explain together, each in its months alone. */
    static Explanation singleMonths(List<Outcome> outcomes, Case bills) {
        SortedMap<Integer, ReconciledMonth> best = new TreeMap<>();
        Map<Integer, List<String>> words = new LinkedHashMap<>();
        for (Outcome outcome : outcomes) {
            outcome.months.forEach((place, month) -> {
                ReconciledMonth known = best.get(place);
                int better = known == null ? -1 : month.verdict().compareTo(known.verdict());
                if (gain(month, bills.charged().get(place)) > 0 && better <= 0) {
                    best.put(place, month);
                    List<String> alternatives = words.computeIfAbsent(place, none -> new ArrayList<>());
                    if (better < 0) {
                        alternatives.clear();
                    }
                    alternatives.add(outcome.trial.words());
                }
            });
        }
        List<Explanation.Month> explains = best.entrySet().stream()
                .map(each -> new Explanation.Month(
                        period(bills, each.getKey()),
                        String.join(", or ", words.getOrDefault(each.getKey(), List.of())),
                        each.getValue()))
                .toList();
        return new Explanation(
                outcomes.get(0).trial.code(),
                outcomes.stream().map(each -> each.trial.words()).distinct().collect(Collectors.joining("; ")),
                false,
                explains,
                List.of(),
                tally(bills, Map.of()),
                tally(bills, best),
                residual(bills, best));
    }

    /** As the bill gives it, which a trial may change. */
    private static Period period(Case bills, int place) {
        return bills.months().get(place).period();
    }

    private static BigDecimal residual(Case bills, Map<Integer, ReconciledMonth> otherwise) {
        BigDecimal sum = BigDecimal.ZERO;
        for (Map.Entry<Integer, ReconciledMonth> each : bills.charged().entrySet()) {
            sum = sum.add(otherwise.getOrDefault(each.getKey(), each.getValue()).distance());
        }
        return sum;
    }

    private static Tally tally(Case bills, Map<Integer, ReconciledMonth> otherwise) {
        List<Verdict> verdicts = bills.charged().entrySet().stream()
                .map(each ->
                        otherwise.getOrDefault(each.getKey(), each.getValue()).verdict())
                .toList();
        return new Tally(
                (int) verdicts.stream().filter(Verdict::isAgreement).count(),
                (int) verdicts.stream().filter(Verdict.AGREES::equals).count(),
                verdicts.size());
    }
}
