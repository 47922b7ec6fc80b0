// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import java.math.BigDecimal;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import tariff.meter.MeteredMonth;

/** Months that are all better by so much, kept for the months that look back on them. Lives for one question. */
final class BetterYear {
    private final Billing billing;
    private final List<MeteredMonth> months;
    private final BetterPowerFactor better;
    private final boolean looksBack;
    private final Map<BigDecimal, List<MeteredMonth>> known = new HashMap<>();

    /** @param months the earliest first */
    BetterYear(Billing billing, List<MeteredMonth> months) {
        this.billing = billing;
        this.months = List.copyOf(months);
        this.better = BetterPowerFactor.under(billing.rate());
        this.looksBack = billing.rate().looksBack();
    }

    Billing billing() {
        return billing;
    }

    /** One month, so much better. */
    MeteredMonth month(int place, BigDecimal by) {
        return better.month(months.get(place), by);
    }

    /** Its bill, with the months before as much better. */
    BigDecimal bill(int place, BigDecimal by) {
        List<MeteredMonth> past = looksBack ? all(by).subList(0, place) : List.of();
        return billing.statements(past, List.of(month(place, by))).get(0).total();
    }

    /** How far a month can be bettered. */
    BigDecimal room(int place) {
        return better.room(months.get(place));
    }

    private List<MeteredMonth> all(BigDecimal by) {
        return known.computeIfAbsent(
                by,
                each -> months.stream().map(month -> better.month(month, each)).toList());
    }
}
