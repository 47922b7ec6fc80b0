// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import tariff.bill.Billing;
import tariff.bill.PowerFactorCost;
import tariff.bill.Statement;
import tariff.correction.BankMonth;
import tariff.correction.CapacitorBank;
import tariff.correction.Estimate;
import tariff.correction.ExactMonths;
import tariff.meter.MeteredMonth;
import tariff.meter.MonthlySums;
import tariff.rate.clause.PowerFactorRule;

/** A year of bills that is asked again and again with other banks; what was asked once is kept. Lives for one question. */
final class RepeatedYear {
    private static final Saved NO_CEILING = new Saved(new BigDecimal("1e15"), new BigDecimal("1e15"));

    private final Billing billing;
    private final List<MeteredMonth> year;
    private final List<Statement> before;
    private final boolean looksBack;
    private final boolean netsLeading;
    private final Optional<ExactMonths> exact;
    private final Map<Asked, BankSavings> known = new HashMap<>();
    private final Map<AskedBetween, Saved> bounds = new HashMap<>();

    /** What a first and a later year save. */
    record Saved(BigDecimal firstYear, BigDecimal settledYear) {}

    private record Asked(CapacitorBank bank, Estimate estimate) {}

    private record AskedBetween(CapacitorBank smaller, CapacitorBank larger, Estimate estimate) {}

    /** @param exact interval data of the year, if there are any */
    RepeatedYear(
            Billing billing,
            PowerFactorCost today,
            List<MeteredMonth> year,
            boolean fullPast,
            Optional<MonthlySums> exact) {
        this.exact = exact.map(sums -> new ExactMonths(sums, billing.rate().looksInside()));
        this.billing = billing;
        this.year = year;
        this.looksBack = billing.rate().looksBack();
        this.netsLeading = billing.rate().definition().powerFactors().values().stream()
                .anyMatch(rule -> rule.leading() == PowerFactorRule.Leading.NETTED);
        this.before = looksBack && !fullPast
                ? billing.statements(year, year)
                : today.months().stream().map(PowerFactorCost.Month::asItIs).toList();
    }

    /** The months as they would be metered with a bank. */
    List<MeteredMonth> months(CapacitorBank bank, Estimate estimate) {
        if (exact.isPresent()) {
            return year.stream().map(exact.get().behind(bank)).toList();
        }
        BankMonth with =
                new BankMonth(bank, billing.rate().windows(), billing.rate().zone());
        return year.stream().map(month -> with.with(month, estimate)).toList();
    }

    BankSavings savings(CapacitorBank bank, Estimate estimate) {
        Asked asked = new Asked(bank, exact.isPresent() ? Estimate.CENTRAL : estimate);
        BankSavings savings = known.get(asked);
        if (savings == null) {
            savings = billed(months(bank, estimate));
            known.put(asked, savings);
        }
        return savings;
    }

    Saved saved(CapacitorBank bank, Estimate estimate) {
        return sums(savings(bank, estimate));
    }

    /**
     * What no bank between two can exceed, as long as no bill falls where its reactive readings rise. Where leading kvarh are taken from
     * lagging ones it may, and for interval data it is not worked out; then there is no ceiling.
     */
    Saved atMost(CapacitorBank smaller, CapacitorBank larger, Estimate estimate) {
        if (netsLeading || exact.isPresent()) {
            return NO_CEILING;
        }
        return Objects.requireNonNull(bounds.computeIfAbsent(new AskedBetween(smaller, larger, estimate), asked -> {
            KindestMonth kindest = new KindestMonth(smaller, larger, billing.rate(), estimate);
            return sums(billed(year.stream().map(kindest::of).toList()));
        }));
    }

    private BankSavings billed(List<MeteredMonth> after) {
        List<Statement> settled = looksBack ? billing.statements(after, after) : billing.statements(after);
        List<Statement> first = looksBack ? billing.statements(year, after) : settled;
        return new BankSavings(before, first, settled);
    }

    private static Saved sums(BankSavings savings) {
        return new Saved(savings.firstYearTotal(), savings.settledYearTotal());
    }
}
