// SPDX-License-Identifier: Apache-2.0
package tariff.rate;

import static org.assertj.core.api.Assertions.assertThat;
import static tariff.rate.Sheets.words;

import java.util.List;
import org.junit.jupiter.api.Test;
import tariff.bill.Bills;
import tariff.bill.Statement;
import tariff.meter.MeteredMonth;
import tariff.meter.Register;
import tariff.meter.Site;

/** A bill can be worked out from the words alone, with a pencil: the words, the pencil work, and then the engine. */
class WordsAloneTest {

    private static void assertBill(Statement statement, String... amountsAndTotal) {
        List<String> printed = new java.util.ArrayList<>(statement.lines().stream()
                .map(line -> line.amount().toPlainString())
                .toList());
        printed.add(statement.total().toPlainString());
        assertThat(printed).containsExactly(amountsAndTotal);
    }

    @Test
    void reactiveEnergyInTwoSteps() {
        String sheet = Sheets.plain(
                "",
                "{ 'name': 'Reactive energy', 'quantity': { 'energy': 'lagging kvarh' }, 'blocks': [ { 'upTo': { 'share': 0.33, 'of': {"
                        + " 'energy': 'kWh' } }, 'price': 0 }, { 'upTo': { 'share': 0.75, 'of': { 'energy': 'kWh' } }, 'price': 0.0420 }, {"
                        + " 'price': 0.0610 } ] }",
                "{ 'name': 'Tax', 'percentOf': 'all above', 'percent': 6 }");
        assertThat(words(sheet).text()).isEqualTo("""
                Sheet, prices in EUR
                Reactive energy: lagging kvarh: up to 33 % of the kWh free, then up to 75 % of the kWh at 0.0420 per kvarh, the rest at 0.0610 per kvarh.
                Tax: 6 % of all lines above.
                Total: the lines added up, each line rounded half up to 0.01, the total rounded half up to 0.01.
                """);
        // 160,000 kWh and 130,000 kvarh. 33 % of the kWh: 52,800; 75 %: 120,000.
        // 120,000 − 52,800 = 67,200 at 0.0420 = 2,822.40; 130,000 − 120,000 = 10,000 at 0.0610 = 610.00; together
        // 3,432.40.
        // 6 % of 3,432.40 = 205.944, so 205.94. Total 3,638.34.
        assertBill(
                Bills.bill(sheet.replace('\'', '"'), Bills.energies("160000", "130000")),
                "3432.40",
                "205.94",
                "3638.34");
    }

    @Test
    void correctedDemandThatStretchesTheEnergyBlocks() {
        String sheet = Sheets.rate(
                "'quantities': { 'billed demand': { 'rounded': { 'largest': [ { 'raised': { 'peak': 'kW' }, 'by': { 'powerFactor': 'billing',"
                        + " 'ratioTo': 0.95 } }, { 'share': 0.8, 'of': { 'earlier': 'highest', 'of': { 'peak': 'kW' }, 'months': 2 } } ] },"
                        + " 'to': 1 } },",
                "{ 'name': 'Demand', 'quantity': 'billed demand', 'price': 10 }",
                "{ 'name': 'Energy', 'quantity': { 'energy': 'kWh' }, 'blocks': [ { 'upTo': { 'hours': 200, 'of': 'billed demand' }, 'price':"
                        + " 0.08 }, { 'price': 0.05 } ] }");
        assertThat(words(sheet).text()).isEqualTo("""
                Sheet, prices in EUR
                Power factor "billing": from the period's kWh and kvarh, leading kvarh ignored, not rounded.
                Quantity "billed demand": the largest of (the highest kW raised by 100 × (0.95 ÷ the billing power factor − 1) % under 0.95; 80 % of the highest value of the highest kW in the previous 2 months), rounded half up to a whole number.
                Demand: billed demand, at 10 per kW.
                Energy: kWh: up to 200 hours of billed demand at 0.08 per kWh, the rest at 0.05 per kWh.
                Total: the lines added up, each line rounded half up to 0.01, the total rounded half up to 0.01.
                """);
        // April: 401 kW, 160,000 kWh, 120,000 kvarh: √(160² + 120²) = 200, power factor 160 ÷ 200 = 0.80.
        // 100 × (0.95 ÷ 0.80 − 1) = 18.75 %; 401 × 1.1875 = 476.1875. 80 % of 600 = 480 is larger. Billed 480 kW.
        // Demand 480 × 10 = 4,800.00. 200 h × 480 = 96,000 kWh at 0.08 = 7,680.00; 64,000 at 0.05 = 3,200.00:
        // 10,880.00. Total 15,680.00.
        MeteredMonth march = Bills.energies("1", "0").with(Register.PEAK_KW, 600);
        march = new MeteredMonth(tariff.meter.Period.of(java.time.YearMonth.of(2026, 3)), march.totals());
        MeteredMonth april = Bills.energies("160000", "120000").with(Register.PEAK_KW, 401);
        assertBill(
                Bills.bill(sheet.replace('\'', '"'), Site.unnamed(), List.of(march, april))
                        .get(1),
                "4800.00",
                "10880.00",
                "15680.00");
    }

    @Test
    void aSurchargeByStartedPointsAndAMinimum() {
        String sheet =
                "{ 'name': 'Sheet', 'currency': 'EUR', 'powerFactors': { 'billing': { 'from': 'energies', 'leading': 'added', 'round':"
                        + " { 'to': 0.001 } } }, 'lines': [ { 'name': 'Energy', 'quantity': { 'energy': 'kWh' }, 'price': 0.11 }, { 'name':"
                        + " 'Surcharge', 'percentOf': ['Energy'], 'schedule': { 'powerFactor': 'billing', 'points': 'started', 'slopes': [ {"
                        + " 'below': 0.90, 'perPoint': 1 } ], 'atMost': 25 } }, { 'name': 'Minimum', 'atLeast': { 'constant': 250, 'unit': 'money' },"
                        + " 'of': 'all above' } ] }";
        assertThat(words(sheet).text()).isEqualTo("""
                Sheet, prices in EUR
                Power factor "billing": from the period's kWh and kvarh, leading kvarh added to lagging, rounded half up to 0.001.
                Energy: kWh, at 0.11 per kWh.
                Surcharge: on Energy, 1 % for each 0.01 or part of it that the billing power factor is below 0.90, at most 25 %.
                Minimum: brings all lines above up to at least 250.
                Total: the lines added up, each line rounded half up to 0.01, the total rounded half up to 0.01.
                """);
        // 2,000 kWh, 1,000 kvarh lagging and 200 leading: 1,200 together. √(2,000² + 1,200²) = 2,332.38; 2,000 ÷
        // 2,332.38 = 0.8575, so 0.857
        // (0.85749…). 0.90 − 0.857 = 0.043: 4.3 points, 5 begun, 5 %. Energy 220.00, surcharge 11.00; 250 − 231 =
        // 19.00. Total 250.00.
        assertBill(
                Bills.bill(
                        sheet.replace('\'', '"'), Bills.energies("2000", "1000").with(Register.LEADING_KVARH, 200)),
                "220.00",
                "11.00",
                "19.00",
                "250.00");
    }
}
