// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import static org.assertj.core.api.Assertions.assertThat;
import static tariff.meter.Register.PEAK_KW;

import java.math.BigDecimal;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import tariff.bill.Billing;
import tariff.bill.Bills;
import tariff.correction.CapacitorBank;
import tariff.correction.Controller;
import tariff.electrical.KwhShare.Place;
import tariff.json.RateFile;
import tariff.meter.MeteredMonth;
import tariff.meter.Site;
import tariff.payback.Investment;
import tariff.payback.Outlook;

/** Offers as customers get them, for an invented site. */
class ClaimReviewTest {
    /** 400 kW at 0.80 are billed as 400 × 0.95 ÷ 0.80 = 475: 75 × 10 × 12 = 9,000 a year are at stake, and not a cent more. */
    private static final String RAISED_DEMAND = Bills.rate(
            "'billing': { 'from': 'peak' }",
            "",
            "{ 'name': 'Energy', 'quantity': { 'energy': 'kWh' }, 'price': 0.1 }, { 'name': 'Demand', 'quantity': { 'raised': { 'peak':"
                    + " 'kW' }, 'by': { 'powerFactor': 'billing', 'ratioTo': 0.95, 'atLeast': 0 } }, 'price': 10 }");

    private static final String RATCHET = Bills.rate("""
            { 'name': 'Demand', 'quantity': { 'largest': [ { 'peak': 'kVA' },
              { 'share': 0.8, 'of': { 'earlier': 'highest', 'of': { 'peak': 'kVA' }, 'months': 11 } } ] }, 'price': 10 }""");

    private static BigDecimal number(String number) {
        return new BigDecimal(number);
    }

    private static Proposal proposal(CapacitorBank bank, String price, String upkeep) {
        return new Proposal(
                bank, Optional.of(Investment.plain(number(price), number(upkeep), 10)), Outlook.level(number("0.08")));
    }

    private static List<String> review(String rate, List<MeteredMonth> months, Offer offer) {
        return ClaimReview.of(new Billing(RateFile.parse(rate), Site.unnamed()), months, offer).claims().stream()
                .map(Reviewed::words)
                .toList();
    }

    /**
     * 180 kvar leave 120 at the peak: 400 ÷ √(400² + 120²) = 0.958, above the rate's 0.95, and 9,000 ÷ (9,000 − 180) = 1.02 years. Losses:
     * 1 % × (1 − 0.80²) = 0.36 %. Own arithmetic.
     */
    @Test
    void aGoodOfferHolds() {
        Offer offer = new Offer(
                proposal(CapacitorBank.automatic("30", "30", "60", "60"), "9000", "180"),
                Optional.of(Place.BEHIND_OWN_TRANSFORMER),
                Optional.of(number("0.1")),
                Optional.empty(),
                List.of(
                        SavingsClaim.yearly(number("8900")),
                        PaybackClaim.months(13),
                        new PowerFactorClaim(number("0.93")),
                        KwhClaim.share(number("0.002")),
                        new KwClaim(number("1"))));
        assertThat(review(RAISED_DEMAND, ReviewedSite.year(), offer))
                .containsExactly(
                        "saves 8900.00 a year: holds by the estimate between the bounds, 9000.00 a year; the bills alone promise 7112.16.",
                        "pays back in 1.08 years: holds: by the estimate between the bounds the cost is back in 1.02 years.",
                        "brings every month to power factor 0.93: holds by the estimate between the bounds, 0.989 in the lowest month.",
                        "saves 0.2 % of the kWh: holds: losses before the bank may fall by 0.36 % of the kWh.",
                        "lowers the demand by 1 kW: holds: losses before the bank may fall by 0.36 % of the kW.",
                        "needs no detuning reactor: holds only if measured harmonics and a resonance check agree; 10 % of the load is"
                                + " non-linear.");
    }

    /**
     * 100 kvar rated at 480 V give 100 × (400 ÷ 480)² = 69.44 at 400 V. At best they lower 500 kVA to 430.56: 400 × 0.95 ÷ 0.929 = 409.0
     * billed, 7,917 saved a year. Own arithmetic, like the 0.909 of February: 120,000 − 672 × 69.44 = 73,333 kvarh left to 160,000 kWh.
     */
    @Test
    void anInflatedOfferIsTakenApartClaimByClaim() {
        Map<String, BigDecimal> parts = new LinkedHashMap<>();
        parts.put("kVA demand", number("9000"));
        parts.put("power factor penalty", number("8000"));
        CapacitorBank bank = CapacitorBank.fixed("100").withVolts(number("480"), number("400"));
        Offer offer = new Offer(
                proposal(bank, "12000", "2000"),
                Optional.of(Place.AT_THE_METER),
                Optional.empty(),
                Optional.empty(),
                List.of(
                        SavingsClaim.yearly(number("17000")),
                        new SavingsByPart(parts),
                        SavingsClaim.shareOfBill(number("0.15")),
                        PaybackClaim.months(9),
                        new PaybackClaim(number("2.8")),
                        new PowerFactorClaim(number("0.98")),
                        KwhClaim.share(number("0.08")),
                        KwhClaim.yearly(number("12000")),
                        new KwClaim(number("40")),
                        new KvarClaim(number("100"))));
        assertThat(review(RAISED_DEMAND, ReviewedSite.year(), offer))
                .containsExactly(
                        "saves 17000.00 a year: exceeds what the rate can give: this bank saves at most 7916.64 a year; the rate pays up to"
                                + " power factor 0.95; counts the way to unity, but the rate pays only up to its own point.",
                        "saves 9000.00 by \"kVA demand\" and 8000.00 by \"power factor penalty\" a year: exceeds what the rate can give: this"
                                + " bank saves at most 7916.64 a year; the rate pays up to power factor 0.95; the same kW or kvar is counted in more"
                                + " than one part: a kVA charge and a power factor penalty on one demand are one charge, not two.",
                        "saves 15 % of the bill: exceeds what the rate can give: this bank saves at most 7916.64 a year; the rate pays up to"
                                + " power factor 0.95; counts the way to unity, but the rate pays only up to its own point.",
                        "pays back in 0.75 years: exceeds what the rate can give: the cost is back in 2.03 years at best; divides the cost by"
                                + " the claimed savings, which do not hold.",
                        "pays back in 2.8 years: holds only if the load's timing is kinder than assumed: the estimate is 5.07 years; interval"
                                + " data would tell; leaves out the upkeep.",
                        "brings every month to power factor 0.98: exceeds what physics can give: this bank brings the lowest month to 0.909 at"
                                + " best; needs more kvar than the bank has.",
                        "saves 8 % of the kWh: exceeds what physics can give: at the meter a bank saves at most 0 % of the kWh; a bank saves"
                                + " kWh only as heat in the conductors between the meter and itself.",
                        "saves 12000 kWh a year: exceeds what physics can give: at the meter a bank saves at most 0 % of the kWh; a bank saves"
                                + " kWh only as heat in the conductors between the meter and itself.",
                        "lowers the demand by 40 kW: exceeds what physics can give: at the meter a bank saves at most 0 % of the kW; a bank"
                                + " lowers kVA and kvar; it does not lower kW but for the losses before it.",
                        "gives 100 kvar: exceeds what physics can give: 100 kvar rated are 69.44 kvar at the service voltage; is the rating at"
                                + " another voltage; kvar go with the square of the voltage.",
                        "needs no detuning reactor: cannot be told from these data; the part of the load that is drives and rectifiers, and"
                                + " measured harmonics, would tell.");
    }

    /** 1 ÷ √(1 + (0.35 ÷ 0.80)²) = 0.916; a cut of 1 − 0.80² = 36 % makes 1.5 % out of 4.17 %. Own arithmetic. */
    @Test
    void aSiteOfDrivesMustNotGetAPlainBank() {
        Offer offer = new Offer(
                Proposal.of(CapacitorBank.fixed("180")),
                Optional.of(Place.AT_THE_LOAD),
                Optional.of(number("0.6")),
                Optional.of(number("0.35")),
                List.of(
                        new PowerFactorClaim(number("0.99")),
                        KwhClaim.share(number("0.015")),
                        PaybackClaim.months(12)));
        assertThat(review(RAISED_DEMAND, ReviewedSite.year(), offer))
                .containsExactly(
                        "brings every month to power factor 0.99: exceeds what physics can give: with this distortion capacitors reach power"
                                + " factor 0.916 at best; is the power factor of undistorted current; capacitors do not remove the distortion.",
                        "saves 1.5 % of the kWh: holds only if at least 4.17 % of the kWh are lost between the meter and the bank; usual at the"
                                + " load are 2 %; a bank saves kWh only as heat in the conductors between the meter and itself.",
                        "pays back in 1 year: cannot be told from these data; the price and the yearly upkeep would tell.",
                        "needs no detuning reactor: this site must not get a plain bank: 60 % of the load is non-linear, and capacitors without"
                                + " reactors would resonate with its harmonics or be overloaded by them; ask for a detuned bank or a filter, designed"
                                + " on measured harmonics.");
    }

    @Test
    void whereNothingReactiveIsBilledNothingIsSaved() {
        String energyAlone = Bills.rate("{ 'name': 'Energy', 'quantity': { 'energy': 'kWh' }, 'price': 0.1 }");
        Offer offer = Offer.of(
                proposal(CapacitorBank.fixed("100"), "5000", "0"),
                SavingsClaim.yearly(number("2000")),
                PaybackClaim.months(30));
        assertThat(review(energyAlone, ReviewedSite.year(), offer))
                .containsExactly(
                        "saves 2000.00 a year: exceeds what the rate can give: this bank saves at most 0.00 a year.",
                        "pays back in 2.5 years: exceeds what the rate can give: savings are not positive, so the cost is never recovered;"
                                + " divides the cost by the claimed savings, which do not hold.",
                        "needs no detuning reactor: cannot be told from these data; the part of the load that is drives and rectifiers, and"
                                + " measured harmonics, would tell.");
    }

    /** 500 to 380 kVA: 11 × 1,000 + 1,200 = 12,200 in the first year, 14,400 in each later one. Common practice, no source. */
    @Test
    void aRatchetHoldsTheFirstYearBack() {
        List<MeteredMonth> months = ReviewedSite.year().stream()
                .map(month -> month.with(PEAK_KW, 228))
                .toList();
        Offer offer = Offer.of(
                proposal(CapacitorBank.fixed("140.981"), "14000", "0"),
                SavingsClaim.yearly(number("14300")),
                SavingsClaim.settled(number("14300")),
                PaybackClaim.months(12));
        assertThat(review(RATCHET, months, offer))
                .containsExactly(
                        "saves 14300.00 a year: holds only from the second year on; the first saves about 12199.93; takes a settled year for"
                                + " the first; until the ratchet lets go, the bill remembers the demand from before the bank.",
                        "saves 14300.00 a year, once settled: holds: the bills promise at least 14399.16 a year.",
                        "pays back in 1 year: holds: by the estimate between the bounds the cost is back in 0.97 years; takes a settled year"
                                + " for the first; until the ratchet lets go, the bill remembers the demand from before the bank.",
                        "needs no detuning reactor: cannot be told from these data; the part of the load that is drives and rectifiers, and"
                                + " measured harmonics, would tell.");
    }

    @Test
    void whatTheDataDoNotHoldIsAskedFor() {
        List<MeteredMonth> few = ReviewedSite.year().subList(0, 3);
        CapacitorBank bank = new CapacitorBank(
                number("100"),
                List.of(),
                Controller.quick(),
                Optional.of(number("480")),
                Optional.empty(),
                BigDecimal.ZERO,
                BigDecimal.ZERO,
                Optional.empty());
        Offer offer = Offer.of(
                Proposal.of(bank),
                SavingsClaim.yearly(number("100")),
                PaybackClaim.months(12),
                KwhClaim.yearly(number("100")),
                new KvarClaim(number("90")));
        assertThat(review(RAISED_DEMAND, few, offer))
                .containsExactly(
                        "saves 100.00 a year: cannot be told from these data; the bills of a full year would tell.",
                        "pays back in 1 year: cannot be told from these data; the price and the yearly upkeep would tell.",
                        "saves 100 kWh a year: cannot be told from these data; the kWh of a full year would tell.",
                        "gives 90 kvar: cannot be told from these data; the voltage at the place would tell.",
                        "needs no detuning reactor: cannot be told from these data; the part of the load that is drives and rectifiers, and"
                                + " measured harmonics, would tell.");
    }
}
