// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import static org.assertj.core.api.Assertions.assertThat;
import static tariff.bill.Bills.bill;
import static tariff.bill.Bills.energies;
import static tariff.bill.Bills.last;
import static tariff.bill.Bills.rate;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Decimals round where, and only where, the rate says so. */
class RoundingTest {

    /** 1,450 kvarh × 0.0421 = 61.045, an exact half: 61.05 half up, 61.04 half even. Own arithmetic. */
    @ParameterizedTest
    @CsvSource({
        "halfUp,   0.01,  61.05",
        "halfDown, 0.01,  61.04",
        "halfEven, 0.01,  61.04",
        "up,       0.01,  61.05",
        "down,     0.01,  61.04",
        "halfUp,   0.001, 61.045",
        "halfUp,   0.05,  61.05",
        "down,     0.05,  61.00",
        "halfUp,   1,     61",
        "up,       1,     62",
        "halfUp,   10,    60",
        "up,       2.5,   62.5"
    })
    void anExactHalfGoesWhereTheRateSays(String mode, String step, String amount) {
        String rate = rate(
                "{ 'name': 'Reactive', 'quantity': { 'energy': 'lagging kvarh' }, 'price': 0.0421, 'round': { 'to': "
                        + step + ", 'mode': '" + mode + "' } }");
        assertThat(last(bill(rate, energies("1", "1450")))).isEqualTo(amount);
    }

    /** A credit of an exact half: half up leaves zero ("away from zero"), cutting off goes towards it. Own arithmetic on −61.045. */
    @ParameterizedTest
    @CsvSource({"halfUp, -61.05", "halfDown, -61.04", "halfEven, -61.04", "up, -61.05", "down, -61.04"})
    void creditsRoundByTheirSize(String mode, String amount) {
        String rate = rate(
                "{ 'name': 'Credit', 'quantity': { 'energy': 'lagging kvarh' }, 'price': -0.0421, 'round': { 'to': 0.01,"
                        + " 'mode': '" + mode + "' } }");
        assertThat(last(bill(rate, energies("1", "1450")))).isEqualTo(amount);
    }

    /** Three lines of 0.004: 0.00 each when rounded, 0.012 together. Own arithmetic. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "| 0.00",
                "'roundLines': \"not\", | 0.01",
                "'roundLines': \"not\", 'roundTotal': { 'to': 0.001 }, | 0.012",
                "'roundLines': \"not\", 'roundTotal': { 'to': 0.05, 'mode': 'up' }, | 0.05"
            })
    void linesOrTotalAreRounded(String rounding, String total) {
        String rate = rate("", rounding == null ? "" : rounding, """
                { 'name': 'a', 'quantity': { 'constant': 4 }, 'price': 0.001 }, { 'name': 'b', 'quantity': { 'constant': 4 }, 'price': 0.001 },
                { 'name': 'c', 'quantity': { 'constant': 4 }, 'price': 0.001 }""");
        assertThat(bill(rate, energies("1", "1")).total()).isEqualTo(total);
    }

    /** kW × 0.95 ÷ (kW ÷ kVA) is 0.95 kVA: 475.95 at 1.5 is 713.925, an exact half, though 370 ÷ 501 has no end. Own arithmetic. */
    @Test
    void aDivisionOnTheWayDoesNotSpoilAnExactHalf() {
        String rate = rate("'peak': { 'from': 'peak' }", "", """
                { 'name': 'Demand', 'quantity': { 'raised': { 'peak': 'kW' }, 'by': { 'powerFactor': 'peak', 'ratioTo': 0.95 } },
                  'price': 1.5 }""");
        assertThat(last(bill(
                        rate,
                        Bills.baseMonth()
                                .with(tariff.meter.Register.PEAK_KW, 370)
                                .with(tariff.meter.Register.PEAK_KVA, 501))))
                .isEqualTo("713.93");
    }

    /** 10 kWh × 10 ÷ 30 × 3 is 10 kWh, cut off to 10 and not to 9. Own arithmetic. */
    @Test
    void aThirdTimesThreeIsWhole() {
        String rate = rate(
                "{ 'name': 'Energy', 'quantity': { 'rounded': { 'share': 3, 'of': { 'prorated': { 'energy': 'kWh' }, 'perDays': 90"
                        + " } }, 'to': 1, 'mode': 'down' }, 'price': 1 }");
        assertThat(last(bill(rate, energies("10", "0")))).isEqualTo("10.00");
    }

    /** A percentage is taken of the amounts as printed: 6 % of 0.01, not of 0.0149. Own arithmetic with a price of 0.0149. */
    @Test
    void aPercentageIsTakenOfPrintedAmounts() {
        String rate = rate("", "", """
                { 'name': 'a', 'quantity': { 'constant': 1 }, 'price': 0.0149 },
                { 'name': 'tax', 'percentOf': 'all above', 'percent': 6, 'round': { 'to': 0.000001 } }""");
        assertThat(last(bill(rate, energies("1", "1")))).isEqualTo("0.000600");
    }

    /** A register difference times a transformer ratio, a loss factor, then whole units: 1,234.5 × 40 × 1.02, cut off. Own arithmetic. */
    @Test
    void roundingGoesInsideOutAsTheClauseIsWritten() {
        String rate = rate(
                "{ 'name': 'Energy', 'quantity': { 'rounded': { 'share': 1.02, 'of': { 'rounded': { 'share': 40, 'of': { 'energy':"
                        + " 'kWh' } }, 'to': 100, 'mode': 'down' } }, 'to': 1, 'mode': 'down' }, 'price': 1 }");
        // 49,380 → 49,300 → 50,286
        assertThat(last(bill(rate, energies("1234.5", "0")))).isEqualTo("50286.00");
    }

    /** Prices keep the decimals they were written with: 0.041554 × 3 = 0.124662. Own arithmetic. */
    @Test
    void aPriceMayHaveMoreDecimalsThanMoney() {
        String rate =
                rate("{ 'name': 'a', 'quantity': { 'constant': 3 }, 'price': 0.041554, 'round': { 'to': 0.000001 } }");
        assertThat(last(bill(rate, energies("1", "1")))).isEqualTo("0.124662");
    }
}
