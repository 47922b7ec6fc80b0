// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import tariff.bill.Billing;
import tariff.bill.PowerFactorCost;
import tariff.correction.CapacitorBank;
import tariff.correction.Estimate;
import tariff.meter.MeteredMonth;
import tariff.notice.Assumption;
import tariff.payback.Answer;

/** Puts the answers of a sizing together. */
final class SizeAnswers {
    private final Billing billing;
    private final PowerFactorCost today;
    private final List<MeteredMonth> year;
    private final RepeatedYear repeated;
    private final SizingTerms terms;
    private final Weighing weighing;

    SizeAnswers(
            Billing billing, PowerFactorCost today, List<MeteredMonth> year, RepeatedYear repeated, SizingTerms terms) {
        this.billing = billing;
        this.today = today;
        this.year = year;
        this.repeated = repeated;
        this.terms = terms;
        this.weighing = new Weighing(repeated, terms.prices(), terms.outlook());
    }

    /**
     * All of them.
     *
     * @param gaps what is assumed of days without a bill
     * @param exact whether interval data stand behind the months
     */
    Sizing all(List<Assumption> gaps, boolean exact) {
        Map<Estimate, CapacitorBank> best = new EnumMap<>(Estimate.class);
        Map<Estimate, Answer<SizedBank>> bestFor = new EnumMap<>(Estimate.class);
        Map<Estimate, BigDecimal> values = new EnumMap<>(Estimate.class);
        for (Estimate estimate : Estimate.values()) {
            CapacitorBank bank = terms.choice().best(weighing.highestValue(estimate));
            best.put(estimate, bank);
            bestFor.put(estimate, worthwhile(bank, estimate));
            values.put(estimate, weighing.value(bank, estimate).max(BigDecimal.ZERO));
        }
        CapacitorBank basis = Objects.requireNonNull(best.get(terms.basis()));
        Objective regret = weighing.leastRegret(values);
        CapacitorBank calmest = terms.choice().best(regret);
        BigDecimal ofBank = regret.at(calmest).negate();
        BigDecimal ofNone = values.values().stream().max(BigDecimal::compareTo).orElseThrow();
        SizeChoice alike = terms.choice().like(basis);
        List<LineReach> lines = new LineReaches(repeated, alike, terms.basis()).of(billing.rate());
        return new Sizing(
                today,
                Objects.requireNonNull(bestFor.get(terms.basis())),
                shortestPayback(),
                smallestWithoutPenalty(),
                bestFor,
                ofBank.compareTo(ofNone) < 0
                        ? Answer.known(weighing.sized(calmest))
                        : Answer.notApplicable(
                                "no bank at all is the calmest choice: at worst it forgoes " + Words.money(ofNone)),
                ofBank.min(ofNone),
                curve(alike, basis, lines),
                lines,
                basis.ratedKvar().compareTo(terms.choice().mostKvar()) >= 0,
                Undecided.of(bestFor, year),
                assumptions(basis, gaps, exact),
                BankCautions.of(basis));
    }

    private List<Assumption> assumptions(CapacitorBank bank, List<Assumption> gaps, boolean exact) {
        Set<Assumption> all = new LinkedHashSet<>();
        today.months().forEach(month -> all.addAll(month.asItIs().assumptions()));
        all.addAll(gaps);
        all.addAll(BankAssumptions.of(billing.rate(), Proposal.of(bank), year, exact, Optional.empty()));
        return List.copyOf(all);
    }

    /** Even points, the best size, and the sizes at which a line stops paying. */
    private List<SizedBank> curve(SizeChoice alike, CapacitorBank best, List<LineReach> lines) {
        Stream<CapacitorBank> kinks = lines.stream()
                .map(LineReach::fromKvar)
                .flatMap(kvar -> alike.smallest(bank -> bank.ratedKvar().compareTo(kvar) >= 0).stream());
        return Stream.of(alike.curve().stream(), Stream.of(best), kinks)
                .flatMap(banks -> banks)
                .distinct()
                .sorted(Comparator.comparing(CapacitorBank::ratedKvar))
                .map(weighing::sized)
                .toList();
    }

    private Answer<SizedBank> worthwhile(CapacitorBank bank, Estimate estimate) {
        SizedBank sized = weighing.sized(bank);
        return sized.gain(estimate).netPresentValue().signum() > 0
                ? Answer.known(sized)
                : Answer.notApplicable(new WhyNoBank(today, terms, sized, estimate).words());
    }

    private Answer<SizedBank> shortestPayback() {
        SizedBank sized = weighing.sized(terms.choice().best(weighing.shortestPayback(terms.basis())));
        return sized.gain(terms.basis()).paybackYears().map(years -> sized);
    }

    private Answer<SizedBank> smallestWithoutPenalty() {
        if (!today.point().named()) {
            return Answer.notApplicable("the rate names no point at which penalties end"
                    + (today.point().billsApparent() ? "; it bills kVA, which fall all the way to unity" : ""));
        }
        if (today.months().stream().allMatch(month -> month.penalty().signum() <= 0)) {
            return Answer.notApplicable("no month pays a penalty today");
        }
        Optional<CapacitorBank> bank = terms.choice().smallest(this::removesEveryPenalty);
        return bank.<Answer<SizedBank>>map(found -> Answer.known(weighing.sized(found)))
                .orElseGet(() -> Answer.notApplicable("no bank up to "
                        + Words.kvar(terms.choice().mostKvar()) + " takes the penalty from every month; it ends at "
                        + today.point().words()));
    }

    private boolean removesEveryPenalty(CapacitorBank bank) {
        List<MeteredMonth> after = repeated.months(bank, terms.basis());
        return PowerFactorCost.of(billing, after, after).months().stream()
                .allMatch(month -> month.penalty().signum() <= 0);
    }
}
