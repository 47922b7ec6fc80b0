// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.function.UnaryOperator;
import java.util.stream.Stream;
import tariff.bill.Billing;
import tariff.meter.MeteredMonth;
import tariff.meter.Period;
import tariff.rate.Rate;
import tariff.rate.RateSource;

/** Bills held against a rate as it stands, and the rates written otherwise that were tried on them, each compiled once. */
final class Case {
    private final Billing billing;
    private final List<MeteredMonth> months;
    private final SortedMap<Integer, ReconciledMonth> charged;
    private final Map<RateSource, Optional<Rate>> compiled;
    private final Set<Period> settled;

    /** @param months in order; those without anything charged are history */
    Case(Billing billing, List<MeteredMonth> months, Agreement agreement) {
        this(billing, months, byPlace(months, agreement), new HashMap<>(), Set.of());
    }

    private Case(
            Billing billing,
            List<MeteredMonth> months,
            SortedMap<Integer, ReconciledMonth> charged,
            Map<RateSource, Optional<Rate>> compiled,
            Set<Period> settled) {
        this.billing = billing;
        this.months = months;
        this.charged = charged;
        this.compiled = compiled;
        this.settled = settled;
    }

    private static SortedMap<Integer, ReconciledMonth> byPlace(List<MeteredMonth> months, Agreement agreement) {
        SortedMap<Integer, ReconciledMonth> charged = new TreeMap<>();
        int next = 0;
        for (int place = 0; place < months.size() && next < agreement.months().size(); place++) {
            if (months.get(place).period().equals(agreement.months().get(next).period())) {
                charged.put(place, agreement.months().get(next++));
            }
        }
        return charged;
    }

    /** The same bills as if the rate were another. */
    Case with(Rate rate) {
        return new Case(new Billing(rate, billing.site()), months, charged, compiled, settled);
    }

    /** The same bills without looking any further into some of the months. */
    Case settled(Set<Period> explained) {
        return new Case(billing, months, charged, compiled, explained);
    }

    Billing billing() {
        return billing;
    }

    Rate rate() {
        return billing.rate();
    }

    RateSource source() {
        return rate().source();
    }

    List<MeteredMonth> months() {
        return months;
    }

    /** The months with something charged, by their place among all. */
    SortedMap<Integer, ReconciledMonth> charged() {
        return charged;
    }

    /** The places of the months that do not agree to the cent and are not settled. */
    List<Integer> open() {
        return charged.entrySet().stream()
                .filter(month -> month.getValue().verdict() != Verdict.AGREES)
                .filter(month -> !settled.contains(month.getValue().period()))
                .map(Map.Entry::getKey)
                .toList();
    }

    boolean anyMonth(java.util.function.Predicate<MeteredMonth> holds) {
        return months.stream().anyMatch(holds);
    }

    /** A trial of the rate written otherwise; none if nothing changes or what comes out is no rate. */
    Stream<Trial> rewritten(Cause cause, String words, UnaryOperator<Object> change) {
        return written(cause, words, source().rewritten(change));
    }

    Stream<Trial> written(Cause cause, String words, RateSource source) {
        if (source.equals(source())) {
            return Stream.empty();
        }
        return compiled.computeIfAbsent(source, RateSource::compiled).stream()
                .map(rate -> new Trial(cause.code(), words, rate, List.of(), months, Trial.EVERY));
    }

    /** A trial of one month, or some, read otherwise. */
    Trial read(Cause cause, String words, Map<Integer, MeteredMonth> otherwise) {
        List<MeteredMonth> changed = new java.util.ArrayList<>(months);
        otherwise.forEach(changed::set);
        return new Trial(cause.code(), words, rate(), List.of(), changed, otherwise.keySet());
    }
}
