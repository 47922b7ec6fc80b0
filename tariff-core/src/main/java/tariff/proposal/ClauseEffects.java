// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import tariff.bill.Billing;
import tariff.bill.LineCost;
import tariff.bill.PowerFactorCost;
import tariff.bill.Staircase;
import tariff.correction.CapacitorBank;
import tariff.correction.Estimate;
import tariff.meter.MeteredMonth;
import tariff.meter.MonthOrder;
import tariff.meter.MonthlySums;
import tariff.meter.Period;
import tariff.notice.Assumption;
import tariff.notice.Refusal;

/**
 * Which clause bites: what each line costs because of reactive load, and what the next point of power factor or the next few kvar would
 * take off the bills.
 *
 * @param assessment the next few kvar, held against the months
 * @param bankKvar the size of the next few kvar, a fixed bank
 * @param lines each line over all months, in the rate's order
 * @param months the months in order
 */
public record ClauseEffects(Assessment assessment, BigDecimal bankKvar, List<LineCost> lines, List<Month> months) {
    /** The usual size of the next few kvar. Common practice, no source. */
    public static final BigDecimal USUAL_KVAR = BigDecimal.valueOf(50);

    /**
     * One month.
     *
     * @param period the month
     * @param lines each line, in the rate's order
     * @param ahead what a better power factor buys
     * @param nextBank what the next few kvar take off the bill in a settled year; below zero where it rises
     */
    public record Month(Period period, List<LineCost> lines, Staircase ahead, Map<Estimate, BigDecimal> nextBank) {
        public Month {
            lines = List.copyOf(lines);
            nextBank = Collections.unmodifiableMap(new EnumMap<>(nextBank));
        }
    }

    public ClauseEffects {
        lines = List.copyOf(lines);
        months = List.copyOf(months);
    }

    /**
     * Works it out for the last twelve of the months, or all if they are fewer; those before are their past.
     *
     * @param months in any order, none overlapping another
     * @param bankKvar the size of the next few kvar, 0 or more
     * @throws Refusal naming every month that lacks what the rate bills
     */
    public static ClauseEffects of(Billing billing, List<MeteredMonth> months, BigDecimal bankKvar) {
        return of(billing, months, bankKvar, Assessment.of(billing, months, next(bankKvar)));
    }

    /**
     * The same on interval data, where all three estimates are the same.
     *
     * @throws Refusal naming every month that lacks what the rate bills
     */
    public static ClauseEffects of(Billing billing, MonthlySums sums, BigDecimal bankKvar) {
        return of(billing, sums.months(), bankKvar, Assessment.of(billing, sums, next(bankKvar)));
    }

    private static Proposal next(BigDecimal bankKvar) {
        return Proposal.of(CapacitorBank.fixed(bankKvar));
    }

    private static ClauseEffects of(
            Billing billing, List<MeteredMonth> months, BigDecimal bankKvar, Assessment assessment) {
        PowerFactorCost today = assessment.today();
        List<MeteredMonth> sorted = MonthOrder.of(months);
        int first = sorted.size() - today.months().size();
        List<Staircase> ahead = Staircase.of(billing, sorted.subList(0, first), sorted.subList(first, sorted.size()));
        List<Month> all = new ArrayList<>();
        for (int i = 0; i < today.months().size(); i++) {
            PowerFactorCost.Month month = today.months().get(i);
            Map<Estimate, BigDecimal> nextBank = new EnumMap<>(Estimate.class);
            for (Estimate estimate : Estimate.values()) {
                nextBank.put(
                        estimate,
                        assessment.savings(estimate).settledYearMonths().get(i));
            }
            all.add(new Month(month.asItIs().month().period(), LineCost.of(month), ahead.get(i), nextBank));
        }
        return new ClauseEffects(assessment, bankKvar, LineCost.of(today), all);
    }

    /** The same answer, with what reading the files took to be so said first. */
    public ClauseEffects with(List<Assumption> more) {
        return new ClauseEffects(assessment.with(more), bankKvar, lines, months);
    }

    /** What the next 0.01 of power factor takes off all months together. */
    public BigDecimal nextPoint() {
        return sum(month -> month.ahead().nextPoint());
    }

    /** What the next few kvar take off all months together, in a settled year. */
    public BigDecimal nextBank(Estimate estimate) {
        return sum(month -> month.nextBank().getOrDefault(estimate, BigDecimal.ZERO));
    }

    /** The lines that reactive load moves, the dearest first. */
    public List<LineCost> biting() {
        return lines.stream()
                .filter(LineCost::bites)
                .sorted(Comparator.comparing(LineCost::toUnity).reversed())
                .toList();
    }

    /** The month that needs most kvar until nothing more is saved; empty if no month saves anything. */
    public Optional<Month> lastToFlatten() {
        return months.stream()
                .filter(month -> kvarToFlat(month).isPresent())
                .max(Comparator.comparing(month -> kvarToFlat(month).orElse(BigDecimal.ZERO)));
    }

    private static Optional<BigDecimal> kvarToFlat(Month month) {
        return month.ahead().flat().flatMap(Staircase.Place::kvar);
    }

    private BigDecimal sum(Function<Month, BigDecimal> part) {
        return months.stream().map(part).reduce(BigDecimal.ZERO, BigDecimal::add);
    }
}
