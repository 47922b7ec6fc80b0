// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import java.math.BigDecimal;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import tariff.meter.MeteredMonth;
import tariff.meter.Site;
import tariff.notice.Assumption;
import tariff.notice.Refusal;
import tariff.rate.Rate;

/**
 * What a rate that adds up a rule hour by hour would ask if it counted the rule once, over the month's totals. Where a charge is convex in the
 * energies and grows in proportion with them, such as E × (0.92 ÷ PF − 1)⁺, its sum over hours is never below the charge of their sums
 * (Jensen's inequality): a good hour does not make up for a bad one.
 */
public final class ByTheTotals {
    private static final String EACH = "each";

    private ByTheTotals() {}

    /** Billing by totals; empty for a rate that adds up nothing by parts of a month. */
    public static Optional<Billing> of(Rate rate, Site site) {
        return rate.looksInside()
                ? rate.source()
                        .rewritten(ByTheTotals::once)
                        .compiled()
                        .filter(once -> !once.source().equals(rate.source()))
                        .map(once -> new Billing(once, site))
                : Optional.empty();
    }

    private static Object once(Object value) {
        if (value instanceof Map<?, ?> map && map.containsKey(EACH) && "sum".equals(map.get("take"))) {
            Object of = map.get("of");
            return of == null ? value : of;
        }
        return value;
    }

    /** What the totals would have said of the same months, beside what was billed. */
    public static Optional<Assumption> note(Billing billing, List<Statement> statements) {
        List<MeteredMonth> months = statements.stream().map(Statement::month).toList();
        try {
            return of(billing.rate(), billing.site())
                    .filter(once -> !months.isEmpty())
                    .map(once -> note(months, sum(statements), sum(once.statements(months))));
        } catch (Refusal totalsLackAReading) {
            return Optional.empty();
        }
    }

    private static Assumption note(List<MeteredMonth> months, BigDecimal counted, BigDecimal byTotals) {
        return new Assumption(
                "counted-by-the-hour",
                months.get(0).period().through(months.get(months.size() - 1).period()),
                "the rate counts by the hour or by another part of the month and asks " + counted.toPlainString()
                        + "; the months' totals alone would have said " + byTotals.toPlainString()
                        + (byTotals.compareTo(counted) < 0
                                ? ", which is less because in a total good hours make up for bad ones, and hour by hour they do not"
                                : ""),
                "none; it is the rate's own way");
    }

    private static BigDecimal sum(List<Statement> statements) {
        return statements.stream().map(Statement::total).reduce(BigDecimal.ZERO, BigDecimal::add);
    }
}
