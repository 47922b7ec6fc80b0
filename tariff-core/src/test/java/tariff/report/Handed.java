// SPDX-License-Identifier: Apache-2.0
package tariff.report;

import static tariff.meter.Register.ENERGY_KWH;
import static tariff.meter.Register.LAGGING_KVARH;

import java.math.BigDecimal;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.IntStream;
import tariff.bill.Billing;
import tariff.bill.Bills;
import tariff.correction.CapacitorBank;
import tariff.electrical.BankData;
import tariff.electrical.Screens;
import tariff.electrical.SiteData;
import tariff.json.RateFile;
import tariff.meter.MeteredMonth;
import tariff.meter.Site;
import tariff.payback.Investment;
import tariff.payback.Outlook;
import tariff.proposal.Assessment;
import tariff.proposal.ClaimReview;
import tariff.proposal.KwhClaim;
import tariff.proposal.Offer;
import tariff.proposal.Proposal;
import tariff.proposal.SavingsBySize;
import tariff.proposal.SavingsClaim;

/** Reports on twelve base months: 160,000 kWh, 120,000 kvarh, 400 kW, 300 kvar in each. */
final class Handed {
    static final String LINES = """
            { 'name': 'Energy', 'quantity': { 'energy': 'kWh' }, 'price': 0.10 },
            { 'name': 'Reactive demand', 'quantity': { 'excess': { 'peak': 'lagging kvar' },
              'over': { 'share': 0.5, 'of': { 'peak': 'kW' } } }, 'price': 8 }""";

    private Handed() {}

    static List<MeteredMonth> year() {
        return IntStream.rangeClosed(1, 12)
                .mapToObj(month -> MeteredMonth.of(String.format("2025-%02d", month))
                        .with(Bills.baseMonth().totals()))
                .toList();
    }

    static Proposal proposal() {
        return new Proposal(
                CapacitorBank.fixed("100"),
                Optional.of(Investment.plain(new BigDecimal("4800"), new BigDecimal("100"), 10)),
                Outlook.level(new BigDecimal("0.08")));
    }

    static Billing billing(String site, String rate) {
        return new Billing(RateFile.parse(rate), new Site(site, Map.of(), Set.of()));
    }

    /** With no more than an assessment. */
    static Report plain() {
        return Report.of(Assessment.of(billing("Tollgate Foundry", Bills.rate(LINES)), year(), proposal()));
    }

    /** With everything that a report can hold. */
    static Report full() {
        Billing billing = billing("Tollgate Foundry", Bills.rate(LINES));
        ClaimReview review = ClaimReview.of(
                billing,
                year(),
                Offer.of(
                        proposal(),
                        SavingsClaim.yearly(new BigDecimal("20000")),
                        KwhClaim.yearly(new BigDecimal("150000"))));
        SiteData site =
                SiteData.unknown().transformerKva(630).impedancePercent(4).build();
        BankData bank = BankData.of(List.of(100.0), 400, 0, BankData.Switching.FIXED, 0.5);
        return Report.of(review.assessment())
                .withSizes(SavingsBySize.of(billing, year(), SavingsBySize.USUAL_STEPS))
                .withScreens(Screens.all(site, bank))
                .withClaims(review.claims());
    }

    /** A single month that gives kWh and kvarh alone, and a bank without a price. */
    static Report bare() {
        String rate =
                Bills.rate("{ 'name': 'Reactive energy', 'quantity': { 'energy': 'lagging kvarh' }, 'price': 0.01 }");
        MeteredMonth month =
                MeteredMonth.of("2025-01").with(ENERGY_KWH, 160_000).with(LAGGING_KVARH, 120_000);
        return Report.of(
                Assessment.of(billing("", rate), List.of(month), Proposal.of(CapacitorBank.automatic("50", "50"))));
    }
}
