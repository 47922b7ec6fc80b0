// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import static org.assertj.core.api.Assertions.assertThat;
import static tariff.bill.Bills.bill;
import static tariff.bill.Bills.last;
import static tariff.bill.Bills.rate;
import static tariff.meter.Register.ENERGY_KWH;
import static tariff.meter.Register.PEAK_KW;
import static tariff.meter.Register.POWER_FACTOR;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tariff.meter.MeteredMonth;

/** Energy blocks by hours of use; blocks read on billed kW. Chimney Rock PPD, Schedule A-16-LP. Own arithmetic. */
class HoursOfUseBillsTest {
    private static final String CHIMNEY_ROCK = rate("'billing': { 'from': 'printed' }", """
            'quantities': { 'billed demand': { 'raised': { 'peak': 'kW' }, 'by': { 'powerFactor': 'billing',
              'slopes': [ { 'below': 0.95, 'perPoint': 2 } ] } } },""", """
            { 'name': 'Demand', 'quantity': 'billed demand', 'price': 10 },
            { 'name': 'Energy', 'quantity': { 'energy': 'kWh' }, 'blocks': [
              { 'upTo': { 'hours': 200, 'of': 'billed demand' }, 'price': 0.077 },
              { 'upTo': { 'hours': 400, 'of': 'billed demand' }, 'price': 0.051 }, { 'price': 0.044 } ] }""");

    private static MeteredMonth month(String kwh, String powerFactor) {
        return MeteredMonth.of("2026-04")
                .with(ENERGY_KWH, kwh)
                .with(PEAK_KW, 300)
                .with(POWER_FACTOR, powerFactor);
    }

    /** 300 kW at 0.90 is 330 kW; 456.00 more than at 0.95, of which 300.00 on the demand line. */
    @Test
    void aThirdOfThePenaltyHidesInTheEnergyLines() {
        Statement low = bill(CHIMNEY_ROCK, month("100000", "0.90"));
        Statement good = bill(CHIMNEY_ROCK, month("100000", "0.95"));
        assertThat(low.total().subtract(good.total())).isEqualTo("456.00");
        assertThat(low.amount("Energy").subtract(good.amount("Energy"))).isEqualTo("156.00");
    }

    /** At 300 kW the edges lie at 60,000 and 120,000 kWh. */
    @ParameterizedTest
    @CsvSource({
        "59999,  4619.92",
        "60000,  4620.00",
        "60001,  4620.05",
        "120000, 7680.00",
        "120001, 7680.04",
        "150000, 9000.00",
        "0,      0.00"
    })
    void aKilowattHourMovesIntoTheNextBlockAboveItsEdge(String kwh, String charge) {
        assertThat(last(bill(CHIMNEY_ROCK, month(kwh, "0.95")))).isEqualTo(charge);
    }

    /** A site that runs under 200 hours pays the dear price for all of it, whatever its power factor. */
    @Test
    void aStretchedBlockCostsNothingWhereItIsNotFilled() {
        assertThat(bill(CHIMNEY_ROCK, month("50000", "0.70")).amount("Energy"))
                .isEqualTo(bill(CHIMNEY_ROCK, month("50000", "0.95")).amount("Energy"))
                .isEqualTo("3850.00");
    }

    /** Two edges at once, one by hours and one fixed: 200 h × 300 kW, but at most 50,000 kWh; common practice, no source. */
    @Test
    void anEdgeMayBeTheSmallerOfTwo() {
        String rate = rate("""
                { 'name': 'Energy', 'quantity': { 'energy': 'kWh' }, 'blocks': [ { 'upTo': { 'smallest': [ { 'hours': 200, 'of': { 'peak': 'kW' } },
                  { 'constant': 50000, 'unit': 'kWh' } ] }, 'price': 0.10 }, { 'price': 0.05 } ] }""");
        // 50,000 × 0.10 + 50,000 × 0.05
        assertThat(last(bill(rate, month("100000", "1")))).isEqualTo("7500.00");
    }
}
