// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import static org.assertj.core.api.Assertions.assertThat;
import static tariff.bill.Bills.baseMonth;
import static tariff.bill.Bills.bill;
import static tariff.bill.Bills.last;
import static tariff.bill.Bills.rate;
import static tariff.meter.Register.ENERGY_KWH;
import static tariff.meter.Register.LAGGING_KVARH;
import static tariff.meter.Register.POWER_FACTOR;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tariff.meter.MeteredMonth;
import tariff.meter.Site;
import tariff.meter.Unit;

/** Figures that utilities and regulators printed, each with its source. */
class PublishedBillsTest {

    /** CFE industrial bill of January 2004 (scribd.com/document/381288443): 15.6 % × (331,383.84 + 87,151.61) = 65,291.53. */
    @Test
    void mexicanSurchargeIsSixtyTimesTheRatioLessOne() {
        String rate = rate("'billing': { 'from': 'energies', 'round': { 'to': 0.0001 } }", "", """
                { 'name': 'Energy', 'quantity': { 'constant': 331383.84 }, 'price': 1 },
                { 'name': 'Demand', 'quantity': { 'constant': 87151.61 }, 'price': 1 },
                { 'name': 'Power factor', 'percentOf': 'all above', 'schedule': { 'powerFactor': 'billing', 'ratioTo': 0.90,
                  'below': 60, 'above': 25, 'atLeast': -2.5, 'atMost': 120, 'round': { 'to': 0.1 } } }""");
        MeteredMonth month =
                MeteredMonth.of("2004-01").with(ENERGY_KWH, 495_192).with(LAGGING_KVARH, 484_884);
        Statement statement = bill(rate, month);
        assertThat(last(statement)).isEqualTo("65291.53");
        assertThat(statement.lines().get(2).derivation().orElseThrow().derivation())
                .isEqualTo("65291.5302 = 418535.45 × 15.6 %");
    }

    /** TNB surcharge examples on a bill of 2,000 (pdfcoffee.com/pengiraan-surcaj-faktor-kuasa). */
    @ParameterizedTest
    @CsvSource({"0.85, 0.00", "0.80, 150.00", "0.75, 300.00", "0.60, 1200.00"})
    void malaysianSurchargeDoublesItsSlopeBelowThreeQuarters(String powerFactor, String surcharge) {
        String rate = rate("'billing': { 'from': 'printed' }", "", """
                { 'name': 'Bill', 'quantity': { 'constant': 2000 }, 'price': 1 },
                { 'name': 'Surcharge', 'percentOf': ['Bill'], 'schedule': { 'powerFactor': 'billing', 'slopes': [
                  { 'below': 0.85, 'perPoint': 1.5 }, { 'below': 0.75, 'perPoint': 3 } ] } }""");
        assertThat(last(bill(rate, baseMonth().with(POWER_FACTOR, powerFactor))))
                .isEqualTo(surcharge);
    }

    /** Chimney Rock PPD, schedule A-16-LP: hours-use blocks on billed kW; figures by own arithmetic on the published rule. */
    @Test
    void lowPowerFactorMovesEnergyIntoTheDearBlock() {
        String rate = rate("'billing': { 'from': 'printed' }", """
                'quantities': { 'billed demand': { 'raised': { 'peak': 'kW' }, 'by': { 'powerFactor': 'billing',
                  'slopes': [ { 'below': 0.95, 'perPoint': 2 } ] } } },""", """
                { 'name': 'Customer', 'quantity': { 'constant': 1 }, 'price': 275 },
                { 'name': 'Demand', 'quantity': 'billed demand', 'price': 10 },
                { 'name': 'Energy', 'quantity': { 'energy': 'kWh' }, 'blocks': [
                  { 'upTo': { 'hours': 200, 'of': 'billed demand' }, 'price': 0.077 },
                  { 'upTo': { 'hours': 400, 'of': 'billed demand' }, 'price': 0.051 }, { 'price': 0.044 } ] }""");
        MeteredMonth month =
                MeteredMonth.of("2026-04").with(ENERGY_KWH, 100_000).with(tariff.meter.Register.PEAK_KW, 300);
        assertThat(bill(rate, month.with(POWER_FACTOR, "0.90")).total()).isEqualTo("10391.00");
        assertThat(bill(rate, month.with(POWER_FACTOR, "0.95")).total()).isEqualTo("9935.00");
    }

    /** Ratchet: 80 % of the previous 11, 10.00 each kVA, 500 falling to 380: 400 billed for 11 months, then 380. Own arithmetic. */
    @Test
    void aRatchetDelaysTheSavingByElevenMonths() {
        String rate = rate("""
                { 'name': 'Demand', 'quantity': { 'largest': [ { 'peak': 'kVA' },
                  { 'share': 0.8, 'of': { 'earlier': 'highest', 'of': { 'peak': 'kVA' }, 'months': 11 } } ] }, 'price': 10 }""");
        java.util.ArrayList<MeteredMonth> months = new java.util.ArrayList<>();
        for (int i = 0; i < 24; i++) {
            months.add(MeteredMonth.of(
                            java.time.YearMonth.of(2025, 1).plusMonths(i).toString())
                    .with(tariff.meter.Register.PEAK_KVA, i < 12 ? 500 : 380));
        }
        List<Statement> bills = bill(rate, Site.unnamed(), months);
        assertThat(bills.subList(12, 23))
                .allSatisfy(each -> assertThat(each.total()).isEqualTo("4000.00"));
        assertThat(bills.get(23).total()).isEqualTo("3800.00");
    }

    /** Kerala SERC schedule from 1 Dec 2007: floor 75 % of contract, 150 % above it; price invented. Own arithmetic. */
    @Test
    void demandAboveTheContractIsDearer() {
        String rate = rate("""
                { 'name': 'Demand', 'quantity': { 'largest': [ { 'peak': 'kVA' }, { 'share': 0.75, 'of': { 'agreed': 'kVA' } } ] },
                  'blocks': [ { 'upTo': { 'agreed': 'kVA' }, 'price': 300 }, { 'price': 450 } ] }""");
        assertThat(bill(rate, Bills.agreed(Unit.KVA, "450"), List.of(baseMonth()))
                        .get(0)
                        .total())
                .isEqualTo("157500.00");
    }
}
