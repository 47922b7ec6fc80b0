// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import static org.assertj.core.api.Assertions.assertThat;
import static tariff.bill.Bills.baseMonth;
import static tariff.bill.Bills.rate;
import static tariff.meter.Register.LEADING_KVARH;

import java.util.List;
import org.junit.jupiter.api.Test;
import tariff.json.RateFile;
import tariff.meter.MeteredMonth;
import tariff.meter.Site;

/** What low power factor costs in the base month: 160,000 kWh, 120,000 kvarh, 400 kW, 500 kVA. Own arithmetic on each rule. */
class PowerFactorCostTest {

    private static PowerFactorCost cost(String rate, MeteredMonth month) {
        return PowerFactorCost.of(new Billing(RateFile.parse(rate), Site.unnamed()), List.of(), List.of(month));
    }

    /** 475 kW instead of 400 at 10: 750; nothing more to gain above 0.95. */
    @Test
    void aCorrectedDemandIsFreeOfPenaltyAtItsTarget() {
        PowerFactorCost cost = cost(
                rate(
                        "{ 'name': 'Demand', 'quantity': { 'raised': { 'peak': 'kW' }, 'by': { 'powerFactor': 'billing', 'ratioTo': 0.95 } },"
                                + " 'price': 10 }"),
                baseMonth());
        assertThat(cost.penalty()).isEqualByComparingTo("750.00");
        assertThat(cost.toUnity()).isEqualByComparingTo("750.00");
        assertThat(cost.point().words()).isEqualTo("power factor 0.95");
    }

    /** Started points at the very target are none: the irrational kvarh of 0.95 must not tip the power factor below it. */
    @Test
    void theTargetItselfIsNotAPointBelow() {
        for (String target : List.of("0.95", "0.9", "0.85", "0.97", "0.83")) {
            PowerFactorCost cost = cost(
                    rate(
                            "{ 'name': 'Demand', 'quantity': { 'peak': 'kW' }, 'price': 10 }, { 'name': 'Surcharge', 'percentOf': ['Demand'],"
                                    + " 'schedule': { 'powerFactor': 'billing', 'points': 'started', 'slopes': [ { 'below': "
                                    + target
                                    + ", 'perPoint': 1 } ] } }"),
                    baseMonth());
            assertThat(cost.months().get(0).withoutPenalty().total()).isEqualByComparingTo("4000.00");
        }
    }

    /** 67,200 kvarh above 33 % at 0.0045: 302.40. */
    @Test
    void kvarhAboveTheFreeShareAreTheWholeCost() {
        PowerFactorCost cost = cost(
                rate(
                        "{ 'name': 'Energy', 'quantity': { 'energy': 'kWh' }, 'price': 0.1 }, { 'name': 'Reactive', 'quantity': { 'energy':"
                                + " 'lagging kvarh' }, 'blocks': [ { 'upTo': { 'share': 0.33, 'of': { 'energy': 'kWh' } }, 'price': 0 },"
                                + " { 'price': 0.0045 } ] }"),
                baseMonth());
        assertThat(cost.penalty()).isEqualByComparingTo("302.40");
        assertThat(cost.point().words()).isEqualTo("the lagging kvarh up to 33 % of the kWh");
    }

    /** Larger of kW and 0.95 kVA: 475 against 400. */
    @Test
    void theLargerOfTwoDemandsHasItsShareAsTarget() {
        PowerFactorCost cost = cost(
                rate(
                        "{ 'name': 'Demand', 'quantity': { 'largest': [ { 'peak': 'kW' }, { 'share': 0.95, 'of': { 'peak': 'kVA' } } ] },"
                                + " 'price': 10 }"),
                baseMonth());
        assertThat(cost.penalty()).isEqualByComparingTo("750.00");
    }

    /** A rate with a credit above its target: 7.5 % at 0.80, a credit of 2.5 % at unity. */
    @Test
    void aCreditBeyondTheTargetShowsOnlyAtUnity() {
        PowerFactorCost cost = cost(
                rate(
                        "{ 'name': 'Bill', 'quantity': { 'constant': 1000 }, 'price': 1 }, { 'name': 'PF', 'percentOf': ['Bill'], 'schedule':"
                                + " { 'powerFactor': 'billing', 'ratioTo': 0.90, 'below': 60, 'above': 25 } }"),
                baseMonth());
        assertThat(cost.penalty()).isEqualByComparingTo("75.00");
        assertThat(cost.toUnity()).isEqualByComparingTo("100.00");
    }

    /** Free kvar: 600 kW × 0.6197 as in the base month 400 × 0.6197 = 247.88; 300 − 247.88 → 52 whole kvar at 56.07. */
    @Test
    void kvarAboveAShareOfTheDemandAreTheWholeCost() {
        PowerFactorCost cost = cost(
                rate(
                        "{ 'name': 'kvar', 'quantity': { 'rounded': { 'excess': { 'peak': 'lagging kvar' }, 'over': { 'share': 0.6197, 'of':"
                                + " { 'peak': 'kW' } } }, 'to': 1 }, 'price': 56.07 }"),
                baseMonth());
        assertThat(cost.penalty()).isEqualByComparingTo("2915.64");
        assertThat(cost.months().get(0).withoutPenalty().total()).isEqualByComparingTo("0.00");
    }

    @Test
    void leadingKvarhStayOnBothSidesBecauseNoCapacitorRemovesThem() {
        PowerFactorCost cost = cost(
                rate(
                        "{ 'name': 'Leading', 'quantity': { 'energy': 'leading kvarh' }, 'price': 0.04 }, { 'name': 'Demand', 'quantity': {"
                                + " 'peak': 'kVA' }, 'price': 10 }"),
                baseMonth().with(LEADING_KVARH, 30_000));
        assertThat(cost.toUnity()).isEqualByComparingTo("1000.00");
        assertThat(cost.months().get(0).atUnity().amount("Leading")).isEqualByComparingTo("1200.00");
    }

    @Test
    void aRateWithoutAnythingReactiveHasNoCost() {
        PowerFactorCost cost =
                cost(rate("{ 'name': 'Energy', 'quantity': { 'energy': 'kWh' }, 'price': 0.1 }"), baseMonth());
        assertThat(cost.toUnity()).isEqualByComparingTo("0");
        assertThat(cost.point().words()).isEqualTo("none (the rate bills nothing reactive)");
    }
}
