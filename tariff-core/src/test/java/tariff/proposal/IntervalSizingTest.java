// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.BitSet;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import tariff.bill.Billing;
import tariff.bill.Bills;
import tariff.correction.Estimate;
import tariff.json.RateFile;
import tariff.meter.IntervalSeries;
import tariff.meter.MonthlySums;
import tariff.meter.Site;
import tariff.payback.Outlook;

/** With interval data a size is walked through the year, and the estimates agree. */
class IntervalSizingTest {
    private static final Billing KVARH = new Billing(RateFile.parse(Bills.rate("""
                    { 'name': 'Reactive', 'quantity': { 'energy': 'lagging kvarh' }, 'price': 0.04 },
                    { 'name': 'Leading', 'quantity': { 'energy': 'leading kvarh' }, 'price': 0.04 }""")), Site.unnamed());

    /** 2025 by the hour: 60 kvar for ten hours of each day, 20 kvar for fourteen; 100 kW throughout. */
    private static MonthlySums year() {
        int hours = 8760;
        long[] kwh = new long[hours];
        long[] lagging = new long[hours];
        for (int hour = 0; hour < hours; hour++) {
            kwh[hour] = 100;
            lagging[hour] = hour % 24 < 10 ? 60 : 20;
        }
        return MonthlySums.of(new IntervalSeries(
                Instant.parse("2025-01-01T00:00:00Z"),
                60,
                ZoneOffset.UTC,
                0,
                kwh,
                lagging,
                new long[hours],
                Optional.empty(),
                new BitSet()));
    }

    /**
     * Up to 20 kvar each saves 24 h × 365 × 0.04 = 350.40 a year; beyond, ten hours save what fourteen cost again: 20 kvar are best, and
     * save 7,008. Own arithmetic.
     */
    @Test
    void theBestFixedSizeIsTheLoadThatIsAlwaysThere() {
        SizingTerms terms = SizingTerms.of(
                FreeSize.upTo(new BigDecimal("40"), BankShape.fixed()),
                PriceList.perKvar(new BigDecimal("50"), 10),
                Outlook.level(new BigDecimal("0.08")));
        Sizing sizing = Sizing.of(KVARH, year(), terms);
        SizedBank best = sizing.highestValue().optional().orElseThrow();
        assertThat(best.kvar()).isEqualByComparingTo("20");
        for (Estimate estimate : Estimate.values()) {
            assertThat(best.gain(estimate).settledYear()).isEqualByComparingTo("7008.00");
        }
        assertThat(sizing.undecided()).isEmpty();
        assertThat(sizing.worstRegret()).isEqualByComparingTo("0");

        Offer offer = Offer.of(Proposal.of(best.bank()), SavingsClaim.yearly(new BigDecimal("7008")));
        assertThat(ClaimReview.of(KVARH, year(), offer).claims().get(0).words())
                .isEqualTo("saves 7008.00 a year: holds: the bills promise at least 7008.00 a year.");
    }
}
