// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Collectors;
import tariff.meter.Triangle;

/** Tries the causes on bills that do not agree, and ranks what would make them agree. */
final class Search {
    private static final int BEST = 5;
    private static final int PAIRED_WITH = 2;

    private static final Comparator<Explanation> RANK = Comparator.comparing(
                    (Explanation each) -> !each.breaks().isEmpty())
            .thenComparing(Comparator.comparingInt(Explanation::weight).reversed())
            .thenComparing(Explanation::residual)
            .thenComparing(each -> !each.ofEveryMonth());

    private final Case bills;
    private final List<Outcome> ofTheRate = new ArrayList<>();
    private final List<Explanation> found = new ArrayList<>();

    private Search(Case bills) {
        this.bills = bills;
    }

    /** The best few, the best first. */
    static List<Explanation> of(Case bills) {
        if (bills.open().isEmpty()) {
            return List.of();
        }
        Search search = new Search(bills);
        search.tryRates();
        search.tryMonths();
        if (!search.isEnough()) {
            search.tryPairs();
        }
        return search.best();
    }

    private void tryRates() {
        for (Cause cause : Causes.OF_THE_RATE) {
            cause.trials(bills).forEach(trial -> {
                Outcome outcome = Outcome.of(trial, bills);
                ofTheRate.add(outcome);
                if (outcome.gained() > 0) {
                    found.add(outcome.everyMonth(bills));
                    if (cause.mayBeOfSingleMonths() && outcome.breaksSome(bills)) {
                        found.add(Outcome.singleMonths(List.of(outcome), bills));
                    }
                }
            });
        }
    }

    /** A month that a change of the rate brings to the cent, without breaking another, is not put down to something of its own. */
    private void tryMonths() {
        Case left = bills.settled(found.stream()
                .filter(each -> each.breaks().isEmpty())
                .flatMap(each -> each.explains().stream())
                .filter(each -> each.month().verdict() == Verdict.AGREES)
                .map(Explanation.Month::period)
                .collect(Collectors.toSet()));
        for (Cause cause : Causes.OF_A_MONTH) {
            List<Outcome> outcomes = cause.trials(left)
                    .map(trial -> Outcome.of(trial, left))
                    .filter(outcome -> outcome.explainsAllItIsAbout(bills))
                    .map(outcome -> outcome.withWhatFollows(bills))
                    .toList();
            if (!outcomes.isEmpty()) {
                found.add(Outcome.singleMonths(outcomes, bills));
            }
        }
    }

    /** Pairs cost much and explain anything sooner or later, so they are tried only if most months remain without an explanation. */
    private boolean isEnough() {
        long differing = bills.charged().values().stream()
                .filter(month -> !month.verdict().isAgreement())
                .count();
        long explained = bills.charged().values().stream()
                .filter(month -> !month.verdict().isAgreement())
                .filter(month ->
                        found.stream().anyMatch(each -> each.breaks().isEmpty() && each.explains(month.period())))
                .count();
        return explained * 2 > differing || differing == 0;
    }

    /** Whatever closed at least half of the distance, together with each other change of the rate. */
    private void tryPairs() {
        BigDecimal half = Outcome.residualAsItStands(bills).divide(BigDecimal.valueOf(2), Triangle.PRECISION);
        ofTheRate.stream()
                .filter(outcome -> outcome.isOfTheRateAlone(bills))
                .filter(outcome -> outcome.residual(bills).compareTo(half) <= 0)
                .sorted(Comparator.comparing(outcome -> outcome.residual(bills)))
                .limit(PAIRED_WITH)
                .forEach(outcome -> tryPairsWith(outcome.trial()));
    }

    private void tryPairsWith(Trial one) {
        Case changed = bills.with(one.rate());
        Causes.OF_THE_RATE.stream()
                .filter(cause -> !cause.code().equals(one.code()))
                .flatMap(cause -> cause.trials(changed))
                .flatMap(two -> Outcome.ofAllOrNothing(one.and(two), bills).stream())
                .filter(outcome -> outcome.gained() > 0)
                .forEach(outcome -> found.add(outcome.everyMonth(bills)));
    }

    /** Leaves out what explains only a part of what a better one explains. */
    private List<Explanation> best() {
        List<Explanation> best = new ArrayList<>();
        for (Explanation each :
                found.stream().filter(Explanation::isBetterThanNow).sorted(RANK).toList()) {
            boolean isPartOfABetter = best.stream().anyMatch(better -> covers(better, each));
            if (best.size() < BEST && !isPartOfABetter) {
                best.add(each);
            }
        }
        return best;
    }

    private static boolean covers(Explanation better, Explanation other) {
        return better.weight() > other.weight()
                && other.explains().stream().allMatch(month -> better.explains(month.period()));
    }
}
