// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import java.util.Collections;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.stream.Stream;
import tariff.bill.Billing;
import tariff.bill.PowerFactorCost;
import tariff.correction.Estimate;
import tariff.meter.MeteredMonth;
import tariff.meter.MonthOrder;
import tariff.meter.MonthlySums;
import tariff.notice.Assumption;
import tariff.notice.Caution;
import tariff.notice.Finding;
import tariff.notice.Refusal;
import tariff.payback.Answer;

/**
 * The best bank for a rate and a year of bills. Where the answers differ, {@link #highestValue} is the one to follow.
 *
 * @param today what low power factor costs without a bank
 * @param highestValue the bank of the highest net present value, or why no bank is best; on the basis of the terms
 * @param shortestPayback the bank of the shortest simple payback, or why none pays back
 * @param smallestWithoutPenalty the smallest bank that brings every month to the rate's own no-penalty point, or why none does
 * @param bestFor the bank of the highest net present value, estimate by estimate
 * @param leastRegret the bank whose worst regret is least; a regret is how far its net present value is below that of the best answer,
 *     a bank or none, for the same estimate
 * @param worstRegret the regret that is least, of that bank or of none
 * @param curve savings and value against size, for banks divided like the best one; also where a line stops paying
 * @param lines where each line of the bill stops paying, in the order of the bill
 * @param roomLimits whether the best size is the largest in the choice, so that a larger one might be better
 * @param undecided what in the answer depends on data that the bills do not hold
 * @param assumptions what was taken to be so
 * @param cautions what a person must know before buying the bank of the highest value
 */
public record Sizing(
        PowerFactorCost today,
        Answer<SizedBank> highestValue,
        Answer<SizedBank> shortestPayback,
        Answer<SizedBank> smallestWithoutPenalty,
        Map<Estimate, Answer<SizedBank>> bestFor,
        Answer<SizedBank> leastRegret,
        BigDecimal worstRegret,
        List<SizedBank> curve,
        List<LineReach> lines,
        boolean roomLimits,
        Optional<Undecided> undecided,
        List<Assumption> assumptions,
        List<Caution> cautions) {
    private static final int YEAR = 12;

    public Sizing {
        bestFor = Collections.unmodifiableMap(new EnumMap<>(bestFor));
        curve = List.copyOf(curve);
        lines = List.copyOf(lines);
        assumptions = List.copyOf(assumptions);
        cautions = List.copyOf(cautions);
    }

    /**
     * Sizes a bank on the last twelve of the months; those before are their past.
     *
     * @param months in any order
     * @throws Refusal naming the months that overlap, every month that lacks what the rate bills, fewer than twelve months, or a missing discount rate
     */
    public static Sizing of(Billing billing, List<MeteredMonth> months, SizingTerms terms) {
        return of(billing, months, Optional.empty(), terms);
    }

    /**
     * Sizes a bank on interval data, where nothing is left to bounds: every size is walked through the year, and all three estimates are
     * the same.
     *
     * @throws Refusal naming every month that lacks what the rate bills, fewer than twelve months, or a missing discount rate
     */
    public static Sizing of(Billing billing, MonthlySums sums, SizingTerms terms) {
        return of(billing, sums.months(), Optional.of(sums), terms);
    }

    private static Sizing of(
            Billing billing, List<MeteredMonth> months, Optional<MonthlySums> exact, SizingTerms terms) {
        List<MeteredMonth> sorted = MonthOrder.of(months);
        if (sorted.size() < YEAR) {
            throw new Refusal(Finding.error("not-twelve-months", "/months", "the best size needs a full year")
                    .found(sorted.size() + " months")
                    .allowed("12 months or more"));
        }
        List<MeteredMonth> past = sorted.subList(0, sorted.size() - YEAR);
        List<MeteredMonth> year = sorted.subList(past.size(), sorted.size());
        PowerFactorCost today = PowerFactorCost.of(billing, past, year);
        RepeatedYear repeated = new RepeatedYear(billing, today, year, past.size() >= YEAR, exact);
        List<Assumption> gaps = MonthOrder.gaps(sorted);
        return new SizeAnswers(billing, today, year, repeated, terms).all(gaps, exact.isPresent());
    }

    /** The best for an estimate, or why no bank is. */
    public Answer<SizedBank> bestFor(Estimate estimate) {
        return Objects.requireNonNull(bestFor.get(estimate));
    }

    /** The same answer, with what reading the files took to be so said first. */
    public Sizing with(List<Assumption> more) {
        return new Sizing(
                today,
                highestValue,
                shortestPayback,
                smallestWithoutPenalty,
                bestFor,
                leastRegret,
                worstRegret,
                curve,
                lines,
                roomLimits,
                undecided,
                Stream.concat(more.stream(), assumptions.stream()).toList(),
                cautions);
    }
}
