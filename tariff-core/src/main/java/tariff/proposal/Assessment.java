// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.util.Collections;
import java.util.EnumMap;
import java.util.IdentityHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.BiFunction;
import java.util.stream.Stream;
import tariff.bill.Billing;
import tariff.bill.ByTheTotals;
import tariff.bill.PowerFactorCost;
import tariff.bill.Statement;
import tariff.correction.BankMonth;
import tariff.correction.BankYear;
import tariff.correction.Estimate;
import tariff.correction.YearInService;
import tariff.meter.MeteredMonth;
import tariff.meter.MonthOrder;
import tariff.meter.MonthlySums;
import tariff.notice.Assumption;
import tariff.notice.Caution;
import tariff.notice.Refusal;
import tariff.payback.Appraisal;
import tariff.payback.Savings;
import tariff.payback.Venture;
import tariff.reconcile.Agreement;

/**
 * A bank held against a year of bills: what low power factor costs today, what the bank would save, when it pays back, and on what all
 * that rests.
 *
 * @param billing the rate and the site
 * @param proposal what is offered
 * @param today what low power factor costs without the bank
 * @param savings the least, an estimate between, and the most that the bills allow
 * @param appraisals payback and its kin for each; empty without a price or a full year of twelve months
 * @param exact the bank run through interval data, if there are any
 * @param assumptions what was taken to be so
 * @param cautions what a person must know
 */
public record Assessment(
        Billing billing,
        Proposal proposal,
        PowerFactorCost today,
        Map<Estimate, BankSavings> savings,
        Map<Estimate, Appraisal> appraisals,
        Optional<BankYear> exact,
        List<Assumption> assumptions,
        List<Caution> cautions) {
    private static final int YEAR = 12;

    public Assessment {
        savings = Collections.unmodifiableMap(new EnumMap<>(savings));
        appraisals = appraisals.isEmpty() ? Map.of() : Collections.unmodifiableMap(new EnumMap<>(appraisals));
        assumptions = List.copyOf(assumptions);
        cautions = List.copyOf(cautions);
    }

    /**
     * Assesses a proposal on the last twelve of the months, or all if they are fewer; those before are their past.
     *
     * @param months in any order
     * @throws Refusal naming the months that overlap, or every month that lacks what the rate bills
     */
    public static Assessment of(Billing billing, List<MeteredMonth> months, Proposal proposal) {
        BankMonth bank = new BankMonth(
                proposal.bank(), billing.rate().windows(), billing.rate().zone());
        return of(billing, months, proposal, bank::with, Optional.empty());
    }

    /**
     * Assesses a proposal on interval data, where nothing is left to bounds: all three estimates are the same. The months are the
     * billing periods of the series.
     *
     * @throws Refusal naming every month that lacks what the rate bills
     */
    public static Assessment of(Billing billing, MonthlySums sums, Proposal proposal) {
        BankYear bank = BankYear.of(sums, proposal.bank());
        return of(billing, sums.months(), proposal, (month, estimate) -> bank.month(month.period()), Optional.of(bank));
    }

    private static Assessment of(
            Billing billing,
            List<MeteredMonth> months,
            Proposal proposal,
            BiFunction<MeteredMonth, Estimate, MeteredMonth> bank,
            Optional<BankYear> exact) {
        List<MeteredMonth> sorted = MonthOrder.of(months);
        List<MeteredMonth> past = sorted.subList(0, Math.max(0, sorted.size() - YEAR));
        List<MeteredMonth> year = sorted.subList(past.size(), sorted.size());
        PowerFactorCost today = PowerFactorCost.of(billing, past, year);
        Map<Estimate, BankSavings> savings = savings(billing, today, past, year, bank, exact.isPresent());
        Set<Assumption> assumptions = new LinkedHashSet<>();
        today.months().forEach(month -> assumptions.addAll(month.asItIs().assumptions()));
        assumptions.addAll(MonthOrder.gaps(sorted));
        exact.flatMap(walked -> ByTheTotals.note(billing, statements(today))).ifPresent(assumptions::add);
        Agreement.of(billing, past, year).assumption().ifPresent(assumptions::add);
        assumptions.addAll(
                BankAssumptions.of(billing.rate(), proposal, year, exact.isPresent(), SampleWeeks.of(savings)));
        return new Assessment(
                billing,
                proposal,
                today,
                savings,
                appraisals(savings, proposal),
                exact,
                List.copyOf(assumptions),
                BankCautions.of(proposal.bank()));
    }

    /** The same answer, with what reading the files took to be so said first. */
    public Assessment with(List<Assumption> more) {
        List<Assumption> all =
                Stream.concat(more.stream(), assumptions.stream()).toList();
        return new Assessment(billing, proposal, today, savings, appraisals, exact, all, cautions);
    }

    /** What the bank does to the meter month by month, where interval data say it. */
    public Optional<YearInService> inService() {
        return exact.map(bank -> YearInService.of(
                bank,
                today.months().stream()
                        .map(month -> month.asItIs().month().period())
                        .toList()));
    }

    /** The bank's savings month by month; the estimate between the bounds unless another is asked for. */
    public BankSavings savings(Estimate estimate) {
        return savings.getOrDefault(estimate, new BankSavings(List.of(), List.of(), List.of()));
    }

    /** @param exact whether the bank does the same to a month in all three estimates */
    static Map<Estimate, BankSavings> savings(
            Billing billing,
            PowerFactorCost today,
            List<MeteredMonth> past,
            List<MeteredMonth> year,
            BiFunction<MeteredMonth, Estimate, MeteredMonth> bank,
            boolean exact) {
        boolean looksBack = billing.rate().looksBack();
        List<Statement> before = looksBack && past.size() < YEAR ? billing.statements(year, year) : statements(today);
        Map<Estimate, BankSavings> all = new EnumMap<>(Estimate.class);
        for (Estimate estimate : Estimate.values()) {
            if (exact && !all.isEmpty()) {
                all.put(estimate, all.values().iterator().next());
                continue;
            }
            List<MeteredMonth> after =
                    year.stream().map(month -> bank.apply(month, estimate)).toList();
            List<Statement> settled = looksBack ? billing.statements(after, after) : billing.statements(after);
            List<Statement> first = looksBack ? billing.statements(year, after) : settled;
            all.put(estimate, new BankSavings(before, first, settled));
        }
        return all;
    }

    private static List<Statement> statements(PowerFactorCost today) {
        return today.months().stream().map(PowerFactorCost.Month::asItIs).toList();
    }

    private static Map<Estimate, Appraisal> appraisals(Map<Estimate, BankSavings> savings, Proposal proposal) {
        Map<Estimate, Appraisal> all = new EnumMap<>(Estimate.class);
        IdentityHashMap<BankSavings, Appraisal> known = new IdentityHashMap<>();
        savings.forEach((estimate, bank) -> {
            if (bank.before().size() == YEAR) {
                venture(bank, proposal)
                        .ifPresent(venture ->
                                all.put(estimate, known.computeIfAbsent(bank, same -> Appraisal.of(venture))));
            }
        });
        return all;
    }

    private static Optional<Venture> venture(BankSavings bank, Proposal proposal) {
        return proposal.investment()
                .map(investment -> new Venture(
                        investment, new Savings(bank.firstYearMonths(), bank.settledYearMonths()), proposal.outlook()));
    }

    /** The bank as its owner's money sees it; empty where there is no payback. */
    public Optional<Venture> venture(Estimate estimate) {
        return appraisals.containsKey(estimate) ? venture(savings(estimate), proposal) : Optional.empty();
    }

    /** Why there is no payback, if there is none. */
    public Optional<String> whyNoPayback() {
        if (!appraisals.isEmpty()) {
            return Optional.empty();
        }
        return Optional.of(
                proposal.investment().isEmpty()
                        ? "no price is given"
                        : "payback needs a year of twelve months; "
                                + today.months().size() + " are given");
    }
}
