// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.util.List;
import java.util.Optional;
import tariff.bill.Billing;
import tariff.meter.MeteredMonth;
import tariff.meter.MonthlySums;
import tariff.meter.Site;
import tariff.notice.Assumption;
import tariff.proposal.SavingsBySize;
import tariff.rate.Rate;

/**
 * What a command was given to work on.
 *
 * @param rate the rate
 * @param site what the contract says
 * @param months by date
 * @param sums the intervals behind the months, if interval data were given
 * @param assumptions what reading the file took to be so
 */
record Metered(
        Rate rate, Site site, List<MeteredMonth> months, Optional<MonthlySums> sums, List<Assumption> assumptions) {

    Billing billing() {
        return new Billing(rate, site);
    }

    SavingsBySize savingsBySize() {
        return sums.map(intervals -> SavingsBySize.of(billing(), intervals, SavingsBySize.USUAL_STEPS))
                .orElseGet(() -> SavingsBySize.of(billing(), months, SavingsBySize.USUAL_STEPS));
    }
}
