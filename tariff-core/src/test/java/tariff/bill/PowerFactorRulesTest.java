// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static tariff.bill.Bills.baseMonth;
import static tariff.bill.Bills.bill;
import static tariff.bill.Bills.energies;
import static tariff.bill.Bills.last;
import static tariff.bill.Bills.rate;
import static tariff.meter.Register.APPARENT_KVAH;
import static tariff.meter.Register.ENERGY_KWH;
import static tariff.meter.Register.LAGGING_KVARH;
import static tariff.meter.Register.LEADING_KVARH;
import static tariff.meter.Register.PEAK_KVA;
import static tariff.meter.Register.PEAK_KW;
import static tariff.meter.Register.POWER_FACTOR;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tariff.meter.MeteredMonth;
import tariff.meter.Readings;
import tariff.notice.Refusal;

/** What a clause takes for the power factor: the basis, the leading kvarh, the rounding. */
class PowerFactorRulesTest {

    /** Bills 100 − 100 × PF to six decimals, which lays the power factor open. */
    private static String pointsLost(String rule) {
        return rate("'billing': {" + rule + "}", "'roundLines': { 'to': 0.000001 },", """
                { 'name': 'Points', 'quantity': { 'constant': 1 }, 'price': { 'bySchedule': { 'powerFactor': 'billing',
                  'slopes': [ { 'below': 1, 'perPoint': 1 } ] } } }""");
    }

    private static MeteredMonth withLeading() {
        return baseMonth().with(LEADING_KVARH, 30_000);
    }

    /** 160,000 kWh, 120,000 kvarh lagging, 30,000 leading. Own arithmetic: 160 ÷ √(160² + 120², 150², 90²). */
    @ParameterizedTest
    @CsvSource({
        "ignored, 20.000000", // 1 − 0.800000
        "added,   27.046280", // 1 − 0.729537; China adds absolute values ((83) Shui-Dian-Cai-Zi 215)
        "netted,  12.842446", // 1 − 0.871576
        "larger,  20.000000" // Maharashtra takes the larger register (MSEDCL tariff 2023)
    })
    void leadingKvarhMoveThePowerFactorByFourteenPoints(String leading, String lost) {
        assertThat(last(bill(pointsLost("'from': 'energies', 'leading': '" + leading + "'"), withLeading())))
                .isEqualTo(lost);
    }

    /** Maharashtra: the larger register counts, equal ones count as lagging; either way the power factor is the same. Own arithmetic. */
    @ParameterizedTest
    @CsvSource({"29999, 20.000000", "120000, 20.000000", "160000, 29.289322"})
    void theLargerOfTheTwoRegistersCounts(String leadingKvarh, String lost) {
        MeteredMonth month = baseMonth().with(LEADING_KVARH, leadingKvarh);
        assertThat(last(bill(pointsLost("'from': 'energies', 'leading': 'larger'"), month)))
                .isEqualTo(lost);
    }

    /** Two hours of 100 kWh, one with 75 kvarh: kVAh 125 + 100. Own arithmetic: 200 ÷ 225 = 0.888889; 200 ÷ √(200² + 75²) = 0.936329. */
    @Test
    void kilovoltAmpereHoursNeverGiveABetterPowerFactorThanEnergies() {
        MeteredMonth month = energies("200", "75").with(APPARENT_KVAH, 225);
        assertThat(last(bill(pointsLost("'from': 'kVAh'"), month))).isEqualTo("11.111111");
        assertThat(last(bill(pointsLost("'from': 'energies'"), month))).isEqualTo("6.367082");
    }

    /** Columbia River, Hydro-Québec and other demand clauses take the peak: 400 ÷ 500. Identity. */
    @Test
    void thePowerFactorAtThePeakIsKilowattsOverKilovoltAmperes() {
        assertThat(last(bill(pointsLost("'from': 'peak'"), baseMonth().with(LAGGING_KVARH, 1))))
                .isEqualTo("20.000000");
    }

    /** Chubu Electric: energies of 08–22 h only. Own arithmetic: 80 ÷ √(80² + 60²) in the window, whatever the night does. */
    @Test
    void aWindowsPowerFactorDoesNotSeeTheNight() {
        String rate = rate(
                "'billing': { 'from': 'energies', 'in': 'day' }",
                "'windows': { 'day': { 'from': '08:00', 'to': '22:00' } }, 'roundLines': { 'to': 0.000001 },",
                """
                { 'name': 'Points', 'quantity': { 'constant': 1 }, 'price': { 'bySchedule': { 'powerFactor': 'billing',
                  'slopes': [ { 'below': 1, 'perPoint': 1 } ] } } }""");
        MeteredMonth month = energies("160000", "60000")
                .withWindow("day", Readings.none().with(ENERGY_KWH, 80_000).with(LAGGING_KVARH, 60_000));
        assertThat(last(bill(rate, month))).isEqualTo("20.000000");
        assertThatThrownBy(() -> bill(rate, energies("160000", "60000")))
                .isInstanceOf(Refusal.class)
                .hasMessage("2026-04: the rate bills kWh in window \"day\"; the bill gives only the period's total");
    }

    /** PF 0.837199 of 153,000 kWh and 99,947 kvarh; own arithmetic on each way to round. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "                                                | 16.280123",
                ", 'round': { 'to': 0.0001 }                     | 16.280000", // Mexico: four decimals
                ", 'round': { 'to': 0.01 }                       | 16.000000", // Japan: whole per cent
                ", 'round': { 'to': 0.01, 'mode': 'down' }       | 17.000000", // truncated
                ", 'round': { 'to': 0.01, 'mode': 'up' }         | 16.000000",
                ", 'round': { 'to': 0.05 }                       | 15.000000"
            })
    void aPowerFactorIsRoundedAsTheRateSays(String round, String lost) {
        String rule = "'from': 'energies'" + (round == null ? "" : round);
        assertThat(last(bill(pointsLost(rule), energies("153000", "99947")))).isEqualTo(lost);
    }

    /** Exactly half a hundredth: 0.845 is 0.85 half up, 0.84 half down and half even; own arithmetic. */
    @ParameterizedTest
    @CsvSource({"halfUp, 15.000000", "halfDown, 16.000000", "halfEven, 16.000000", "up, 15.000000", "down, 16.000000"})
    void aPrintedPowerFactorIsRoundedToo(String mode, String lost) {
        String rule = "'from': 'printed', 'round': { 'to': 0.01, 'mode': '" + mode + "' }";
        assertThat(last(bill(pointsLost(rule), baseMonth().with(POWER_FACTOR, "0.845"))))
                .isEqualTo(lost);
    }

    /** 1 kWh beside 1,000 kVAh is 0.001, which rounds to 0.00; it stays 0.001: 100 × (0.95 ÷ 0.001 − 1) is 94,900 %. Own arithmetic. */
    @Test
    void aPowerFactorIsNeverRoundedToNothing() {
        String rate = rate("'billing': { 'from': 'kVAh', 'round': { 'to': 0.01 } }", "", """
                { 'name': 'Bill', 'quantity': { 'constant': 100 }, 'price': 1 },
                { 'name': 'Surcharge', 'percentOf': ['Bill'], 'schedule': { 'powerFactor': 'billing', 'ratioTo': 0.95 } }""");
        assertThat(last(bill(rate, energies("1", "1000").with(APPARENT_KVAH, 1000))))
                .isEqualTo("94900.00");
    }

    /** tan φ = √(1 ÷ PF² − 1) at thresholds that rates quote, as whole kvarh for 10,000 kWh; identity. */
    @ParameterizedTest
    @CsvSource({
        "0.70, 10202", // uncorrected induction load: common practice, no source
        "0.75, 8819", // second step in Malaysia and Salta
        "0.80, 7500", // Italy's 75 %
        "0.85, 6197", // Thailand's 61.97 %
        "0.90, 4843", // Mexico, Vietnam, China
        "0.92, 4260", // Brazil
        "0.93, 3952", // Chile
        "0.95, 3287", // Britain's exact share
        "0.98, 2031", // Turkey's 20 %
        "0.99, 1425", // Turkey's 15 % capacitive
        "1, 0"
    })
    void thePrintedPowerFactorGivesTheKvarh(String powerFactor, String kvarh) {
        String rate = rate("{ 'name': 'Reactive', 'quantity': { 'rounded': { 'energy': 'lagging kvarh' }, 'to': 1 },"
                + " 'price': 1, 'round': { 'to': 1 } }");
        MeteredMonth month = MeteredMonth.of("2026-04").with(ENERGY_KWH, 10_000).with(POWER_FACTOR, powerFactor);
        Statement statement = bill(rate, month);
        assertThat(last(statement)).isEqualTo(kvarh);
        assertThat(statement.assumptions()).extracting("code").containsExactly("kvarh-derived");
    }

    /** A: 67,200.00 kvarh above 33 %, 67,410.54 above tan φ of 0.95; own arithmetic. */
    @ParameterizedTest
    @CsvSource({"0.33, 67200.00", "0.328684105178863, 67410.54"})
    void oneThirdAndNinetyFiveAreNotTheSameNumber(String share, String excess) {
        String rate = rate("{ 'name': 'Excess', 'quantity': { 'excess': { 'energy': 'lagging kvarh' }, 'over': {"
                + " 'share': " + share + ", 'of': { 'energy': 'kWh' } } }, 'price': 1 }");
        assertThat(last(bill(rate, baseMonth()))).isEqualTo(excess);
    }

    /** A table row "below 0.60" must not catch 0 ÷ 0; common practice, no source. */
    @Test
    void aMonthWithoutEnergyHasNoPowerFactorAndNoSurcharge() {
        String lines = """
                { 'name': 'Standing', 'quantity': { 'constant': 1 }, 'price': 500 },
                { 'name': 'Demand', 'quantity': { 'raised': { 'peak': 'kW' }, 'by': { 'powerFactor': 'billing', 'ratioTo': 0.95 } }, 'price': 1 },
                { 'name': 'By price', 'quantity': { 'energy': 'lagging kvarh' }, 'price': { 'bySchedule': { 'powerFactor': 'billing',
                  'bands': [ { 'below': 0.6, 'value': 9 }, { 'value': 0 } ] } } },
                { 'name': 'Surcharge', 'percentOf': ['Standing'], 'schedule': { 'powerFactor': 'billing',
                  'bands': [ { 'below': 0.6, 'value': 52.54 }, { 'value': 0 } ] } }""";
        for (String from : java.util.List.of("energies", "printed")) {
            Statement statement = bill(
                    rate("'billing': { 'from': '" + from + "' }", "", lines),
                    energies("0", "120").with(PEAK_KW, 7));
            assertThat(statement.total()).isEqualTo("507.00");
            assertThat(statement.assumptions())
                    .extracting("message")
                    .containsExactly(
                            "a month without energy has no power factor; clauses that depend on \"billing\" do not apply");
        }
    }

    @Test
    void aRateThatAsksForKvarhNeverTakesAMissingRegisterForZero() {
        MeteredMonth month = MeteredMonth.of("2026-04").with(ENERGY_KWH, 160_000);
        assertThatThrownBy(() -> bill(pointsLost("'from': 'energies'"), month))
                .isInstanceOf(Refusal.class)
                .hasMessage("2026-04: the rate bills lagging kvarh; the bill does not give \"laggingKvarh\"");
    }

    /** kW ÷ PF stands in for kVA under a name; 400 ÷ 0.8 = 500, identity. */
    @Test
    void apparentDemandFollowsFromThePrintedPowerFactorUnderANamedAssumption() {
        String rate = rate("{ 'name': 'Demand', 'quantity': { 'peak': 'kVA' }, 'price': 1 }");
        Statement statement =
                bill(rate, MeteredMonth.of("2026-04").with(PEAK_KW, 400).with(POWER_FACTOR, "0.8"));
        assertThat(last(statement)).isEqualTo("500.00");
        assertThat(statement.assumptions()).extracting("code").containsExactly("peak-kva-derived");
        assertThat(bill(rate, MeteredMonth.of("2026-04").with(PEAK_KVA, 500)).assumptions())
                .isEmpty();
    }
}
