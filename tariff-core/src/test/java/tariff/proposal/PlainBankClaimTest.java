// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tariff.bill.Billing;
import tariff.bill.Bills;
import tariff.correction.CapacitorBank;
import tariff.electrical.BankAtSite;
import tariff.electrical.BankData;
import tariff.electrical.SiteData;
import tariff.json.RateFile;
import tariff.meter.Site;
import tariff.payback.Outlook;

/** Whether a bank may do without reactors, where the site is known. */
class PlainBankClaimTest {
    private static final String RATE =
            Bills.rate("", "", "{ 'name': 'Energy', 'quantity': { 'energy': 'kWh' }, 'price': 0.1 }");

    /**
     * 1,000 kVA at 6 % give 16,667 kVA: 100 kvar resonate at √166.7 = 12.9, by the 13th harmonic; 600 kvar at √27.8 = 5.3, by the 5th; own
     * arithmetic. From 15 % of non-linear load the screens stop at a resonance, above 25 % they ask for reactors, see their limits.
     */
    @ParameterizedTest
    @CsvSource(
            nullValues = "-",
            value = {
                // kvar, non-linear kVA, share of the load, verdict
                "100, 420, -, beyond-physics",
                "100, 420, 0.1, beyond-physics",
                "600, 160, -, beyond-physics",
                "600, 100, 0.1, holds-only-if",
                "100, -, 0.3, beyond-physics",
                "100, -, 0.2, holds-only-if",
                "2, 50, -, holds-only-if",
                "2, -, -, cannot-tell"
            })
    void theSternerAnswerCounts(double kvar, Double nonLinearKva, BigDecimal share, String verdict) {
        SiteData.Builder site =
                SiteData.unknown().serviceVolts(400).transformerKva(1000).impedancePercent(6);
        Optional.ofNullable(nonLinearKva).ifPresent(site::nonLinearKva);
        CapacitorBank bank = CapacitorBank.fixed(BigDecimal.valueOf(kvar));
        BankData data = BankData.of(List.of(kvar), 400, 0, BankData.Switching.FIXED, 0);
        Proposal proposal = new Proposal(
                bank,
                Optional.empty(),
                Outlook.level(Optional.empty()),
                Optional.of(new BankAtSite(site.build(), data)));
        Offer offer = new Offer(proposal, Optional.empty(), Optional.ofNullable(share), Optional.empty(), List.of());
        ClaimReview review =
                ClaimReview.of(new Billing(RateFile.parse(RATE), Site.unnamed()), ReviewedSite.year(), offer);
        assertThat(review.claims()).hasSize(1);
        assertThat(review.claims().get(0).verdict().kind()).isEqualTo(verdict);
    }
}
