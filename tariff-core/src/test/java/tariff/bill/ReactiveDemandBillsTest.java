// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import static org.assertj.core.api.Assertions.assertThat;
import static tariff.bill.Bills.baseMonth;
import static tariff.bill.Bills.bill;
import static tariff.bill.Bills.last;
import static tariff.bill.Bills.rate;
import static tariff.meter.Register.PEAK_KW;
import static tariff.meter.Register.PEAK_LAGGING_KVAR;
import static tariff.meter.Register.PEAK_LEADING_KVAR;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tariff.meter.MeteredMonth;
import tariff.meter.Site;

/** kvar of demand above a share of the kW. */
class ReactiveDemandBillsTest {

    private static MeteredMonth peaks(String kw, String kvar) {
        return MeteredMonth.of("2026-04").with(PEAK_KW, kw).with(PEAK_LAGGING_KVAR, kvar);
    }

    /** Metropolitan Electricity Authority, Bangkok, Schedule 4: above 61.97 % of kW, whole kvar, 56.07 baht. Own arithmetic. */
    @ParameterizedTest
    @CsvSource({
        "600, 500,    7176.96", // 128.18 → 128
        "600, 371.82, 0.00",
        "600, 372.31, 0.00", // 0.49 is dropped
        "600, 372.32, 56.07", // 0.50 counts: the Thai text, from memory
        "600, 372.33, 56.07",
        "600, 300,    0.00"
    })
    void everyWholeKvarAboveTheFreeShareCosts(String kw, String kvar, String baht) {
        String rate = rate("""
                { 'name': 'Reactive', 'quantity': { 'rounded': { 'excess': { 'peak': 'lagging kvar' }, 'over': { 'share': 0.6197, 'of': {
                  'peak': 'kW' } } }, 'to': 1 }, 'price': 56.07 }""");
        assertThat(last(bill(rate, peaks(kw, kvar)))).isEqualTo(baht);
    }

    /** Imatran Seudun Sähkönsiirto: 7.17 for each kvar each way; free share of 20 % from memory. Own arithmetic: 300 − 80, then 100 − 80. */
    @ParameterizedTest
    @CsvSource({"0, 1577.40", "80, 1577.40", "81, 1584.57", "100, 1720.80"})
    void bothDirectionsHaveAFreeShare(String leadingKvar, String euros) {
        String rate = rate("""
                { 'name': 'Taken', 'quantity': { 'excess': { 'peak': 'lagging kvar' }, 'over': { 'share': 0.2, 'of': { 'peak': 'kW' } } },
                  'price': 7.17 },
                { 'name': 'Given', 'quantity': { 'excess': { 'peak': 'leading kvar' }, 'over': { 'share': 0.2, 'of': { 'peak': 'kW' } } },
                  'price': 7.17 }""");
        assertThat(bill(rate, baseMonth().with(PEAK_LEADING_KVAR, leadingKvar)).total())
                .isEqualTo(euros);
    }

    /** A price for each kvar above 40, 50 or 62 % of kW: common practice, no source. Own arithmetic on A at 0.30. */
    @ParameterizedTest
    @CsvSource({"0.40, 42.00", "0.50, 30.00", "0.62, 15.60"})
    void theFreeShareDiffersFromSheetToSheet(String share, String charge) {
        String rate =
                rate("{ 'name': 'Reactive', 'quantity': { 'peak': 'lagging kvar' }, 'blocks': [ { 'upTo': { 'share': "
                        + share + ", 'of': { 'peak': 'kW' } }, 'price': 0 }, { 'price': 0.30 } ] }");
        assertThat(last(bill(rate, baseMonth()))).isEqualTo(charge);
    }

    /** The same with a look back of 11 months: common practice, no source. 300 − 200 = 100 in April still counts in May. */
    @Test
    void theHighestExcessOfElevenMonthsMayStillCount() {
        String rate = rate("'billing': { 'from': 'energies' }", """
                'quantities': { 'excess': { 'excess': { 'peak': 'lagging kvar' }, 'over': { 'share': 0.5, 'of': { 'peak': 'kW' } } } },""", """
                { 'name': 'Reactive', 'quantity': { 'largest': [ 'excess', { 'earlier': 'highest', 'of': 'excess', 'months': 11 } ] },
                  'price': 0.30 }""");
        MeteredMonth may = MeteredMonth.of("2026-05").with(PEAK_KW, 400).with(PEAK_LAGGING_KVAR, 150);
        assertThat(last(bill(rate, Site.unnamed(), List.of(baseMonth(), may)).get(1)))
                .isEqualTo("30.00");
    }

    /** √(500² − 400²) = 300, under a named assumption; identity. */
    @Test
    void kvarFollowFromKilowattsAndKilovoltAmperes() {
        String rate = rate("{ 'name': 'Reactive', 'quantity': { 'peak': 'lagging kvar' }, 'price': 1 }");
        Statement statement = bill(rate, baseMonth().with(baseMonth().totals().without(PEAK_LAGGING_KVAR)));
        assertThat(last(statement)).isEqualTo("300.00");
        assertThat(statement.assumptions()).extracting("code").containsExactly("peak-kvar-derived");
    }
}
