// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import tariff.meter.MeteredMonth;
import tariff.notice.Refusal;

/**
 * What low power factor costs: the bills as they are, less the same bills at the rate's own no-penalty point, and less the same bills at
 * unity. The difference never holds a charge that reactive load does not move: kWh, kW, floors and fixed charges stand on both sides.
 *
 * @param point where the rate's penalties end
 * @param months each month three times
 */
public record PowerFactorCost(NoPenaltyPoint point, List<Month> months) {

    /** A month's statement as it is, without penalty, and at unity. */
    public record Month(Statement asItIs, Statement withoutPenalty, Statement atUnity) {

        /** What the month pays for being short of the no-penalty point; below zero where a credit is given up by staying there. */
        public BigDecimal penalty() {
            return asItIs.total().subtract(withoutPenalty.total());
        }

        /** What the month pays for being short of unity. */
        public BigDecimal toUnity() {
            return asItIs.total().subtract(atUnity.total());
        }

        /** The same for one line. */
        public BigDecimal penalty(String line) {
            return asItIs.amount(line).subtract(withoutPenalty.amount(line));
        }
    }

    public PowerFactorCost {
        months = List.copyOf(months);
    }

    /**
     * Works it out for months in the order of their dates.
     *
     * @param past earlier months that are not counted; taken to have been without penalty too where the months are
     * @throws Refusal naming every month that lacks what the rate bills
     */
    public static PowerFactorCost of(Billing billing, List<MeteredMonth> past, List<MeteredMonth> months) {
        NoPenaltyPoint point = NoPenaltyPoint.of(billing.rate());
        List<Statement> asTheyAre = billing.statements(past, months);
        List<Statement> without = billing.statements(
                past.stream().map(month -> point.reach(month, billing)).toList(),
                months.stream().map(month -> point.reach(month, billing)).toList());
        List<Statement> unity = billing.statements(
                past.stream().map(point::unity).toList(),
                months.stream().map(point::unity).toList());
        List<Month> all = new ArrayList<>();
        for (int i = 0; i < months.size(); i++) {
            all.add(new Month(asTheyAre.get(i), without.get(i), unity.get(i)));
        }
        return new PowerFactorCost(point, all);
    }

    public BigDecimal penalty() {
        return months.stream().map(Month::penalty).reduce(BigDecimal.ZERO, BigDecimal::add);
    }

    public BigDecimal toUnity() {
        return months.stream().map(Month::toUnity).reduce(BigDecimal.ZERO, BigDecimal::add);
    }

    public BigDecimal billed() {
        return months.stream().map(month -> month.asItIs().total()).reduce(BigDecimal.ZERO, BigDecimal::add);
    }
}
