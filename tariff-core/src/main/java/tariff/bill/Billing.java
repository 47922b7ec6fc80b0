// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import java.util.ArrayList;
import java.util.List;
import tariff.meter.MeteredMonth;
import tariff.meter.MonthOrder;
import tariff.meter.Site;
import tariff.notice.Finding;
import tariff.notice.Refusal;
import tariff.rate.Rate;
import tariff.rate.clause.MissingReading;

/**
 * Bills metered months under a rate.
 *
 * @param rate the rate
 * @param site what the contract says of the site
 */
public record Billing(Rate rate, Site site) {

    /**
     * A statement for each month, in the order of their dates; each month sees those before it as its past.
     *
     * @param months in any order
     * @throws Refusal naming the months that overlap, or every month and what the rate bills that it does not give
     */
    public List<Statement> statements(List<MeteredMonth> months) {
        return statements(List.of(), MonthOrder.of(months));
    }

    /**
     * The same with a past that is not billed again.
     *
     * @param past earlier months, the earliest first; their dates need not join up with the months', so that a year can be its own
     *     past
     * @param months the months to bill, in order
     * @throws Refusal naming every month and what the rate bills that it does not give
     */
    public List<Statement> statements(List<MeteredMonth> past, List<MeteredMonth> months) {
        List<Reckoning> chain = new ArrayList<>();
        past.forEach(month -> chain.add(new Reckoning(this, month, chain, chain.size())));
        List<Statement> statements = new ArrayList<>();
        List<Finding> missing = new ArrayList<>();
        for (MeteredMonth month : months) {
            Reckoning reckoning = new Reckoning(this, month, chain, chain.size());
            chain.add(reckoning);
            try {
                statements.add(reckoning.statement());
            } catch (MissingReading reading) {
                missing.addAll(reckoning.whatIsMissing());
            }
        }
        if (!missing.isEmpty()) {
            throw new Refusal(missing);
        }
        return statements;
    }
}
