// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.time.Month;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tariff.bill.Bills;
import tariff.meter.MeteredMonth;
import tariff.meter.Readings;
import tariff.meter.Register;
import tariff.meter.Window;

/** The base month (April, 720 h, 120,000 kvarh, at most 300 kvar, 400 kW, 500 kVA) with a bank. Own arithmetic beside each case. */
class BankMonthTest {
    private static final Window NIGHT = Window.daily("22:00", "06:00");

    // register | low | high | 150 kvar fixed, 10 W per kvar, on for 480 of 720 h
    @ParameterizedTest
    @CsvSource({
        // low: 48,000 kvarh in the hours on, half of them removed; high: 150 × 480 = 72,000 removed
        "LAGGING_KVARH, 96000, 48000",
        // 72,000 delivered less 24,000 and 72,000 removed
        "LEADING_KVARH, 48000, 0",
        // 72,000 kvarh × 10 W whatever the load
        "ENERGY_KWH, 160720, 160720",
        // 150 × 10 W = 1.5 kW, or the peak fell at night
        "PEAK_KW, 401.5, 400",
        // as without the bank and its 1.5 kW; 500 − 150 is below the kW
        "PEAK_KVA, 501.5, 400",
        "PEAK_LAGGING_KVAR, 300, 150"
    })
    void aTimeSwitchLeavesTheBankTheOtherHours(Register register, String low, String high) {
        CapacitorBank bank =
                CapacitorBank.fixed("150").withLosses(BigDecimal.TEN).offIn(NIGHT);
        assertThat(after(bank, Estimate.LOW, register)).isEqualByComparingTo(low);
        assertThat(after(bank, Estimate.HIGH, register)).isEqualByComparingTo(high);
    }

    // register | low | high | the same bank always on
    @ParameterizedTest
    @CsvSource({
        // half removed; 150 × 720 = 108,000 removed
        "LAGGING_KVARH, 60000, 12000",
        // 108,000 delivered
        "LEADING_KVARH, 48000, 0",
        "ENERGY_KWH, 161080, 161080",
        "PEAK_KW, 401.5, 401.5",
        // √(400² + 150²) = 427.2002 and 1.5; the kW
        "PEAK_KVA, 428.7002, 401.5",
        "PEAK_LAGGING_KVAR, 150, 150"
    })
    void withoutOneItIsAlwaysOn(Register register, String low, String high) {
        CapacitorBank bank = CapacitorBank.fixed("150").withLosses(BigDecimal.TEN);
        assertThat(after(bank, Estimate.LOW, register).setScale(4, java.math.RoundingMode.HALF_UP))
                .isEqualByComparingTo(low);
        assertThat(after(bank, Estimate.HIGH, register)).isEqualByComparingTo(high);
    }

    // register | low | high | 100 kvar fixed and 100 switched that aim at unity, 10 W per kvar
    @ParameterizedTest
    @CsvSource({
        // low: 120,000 × (1 − 200 ÷ 300) = 40,000 and the dead band, 66.67 × 720 = 48,000; high: all
        "LAGGING_KVARH, 80000, 0",
        // low: 72,000 − 40,000 by the fixed kvar, and 48,000; high: 100 × 720 are all taken from what lags
        "LEADING_KVARH, 80000, 0",
        // low: no more than 200 × 720 = 144,000; high: at least 120,000 − 80,000 = 40,000 taken away, but 72,000 by the
        // fixed kvar
        "ENERGY_KWH, 161440, 160720",
        "PEAK_KW, 402, 401",
        // 300 − 200 and the dead band
        "PEAK_LAGGING_KVAR, 166.667, 100"
    })
    void whatTheFixedKvarTakeAwayIsNotBurntTwice(Register register, String low, String high) {
        CapacitorBank bank = CapacitorBank.plain(new BigDecimal("100"), List.of(new BigDecimal("100")))
                .withLosses(BigDecimal.TEN);
        assertThat(after(bank, Estimate.LOW, register).setScale(3, java.math.RoundingMode.HALF_UP))
                .isEqualByComparingTo(low);
        assertThat(after(bank, Estimate.HIGH, register)).isEqualByComparingTo(high);
    }

    @Test
    void aMonthInWhichTheBankIsNeverOnStaysAsItIs() {
        CapacitorBank bank = CapacitorBank.plain(new BigDecimal("100"), List.of(new BigDecimal("50")))
                .withLosses(BigDecimal.TEN)
                .offIn(Window.daily("00:00", "00:00").in(EnumSet.of(Month.APRIL)));
        for (Estimate estimate : Estimate.values()) {
            assertThat(promised(bank).with(Bills.baseMonth(), estimate)).isEqualTo(Bills.baseMonth());
        }
    }

    /** Both windows from 06:00 to 22:00 keep their 480 h; of the night, 22:00 to 06:00, nothing is left. */
    @Test
    void eachWindowLosesItsOwnHours() {
        Readings quarter = Readings.none().with(Register.LAGGING_KVARH, new BigDecimal("60000"));
        MeteredMonth month = Bills.baseMonth().withWindows(Map.of("day", quarter, "night", quarter));
        BankMonth promised = new BankMonth(
                CapacitorBank.fixed("100").offIn(NIGHT),
                Map.of("day", Window.daily("06:00", "22:00"), "night", NIGHT),
                ZoneOffset.UTC);
        Map<String, Readings> after = promised.with(month, Estimate.HIGH).windows();
        // 60,000 − 100 × 480
        assertThat(after.get("day").get(Register.LAGGING_KVARH))
                .hasValueSatisfying(kvarh -> assertThat(kvarh).isEqualByComparingTo("12000"));
        assertThat(after.get("night")).isEqualTo(quarter);
    }

    /** October has 745 h where the clock is put back: 120,000 − 100 × 745 = 45,500. */
    @Test
    void aMonthHasTheHoursOfTheRatesClock() {
        MeteredMonth october =
                MeteredMonth.of("2025-10").with(Register.LAGGING_KVARH, 120_000).with(Register.PEAK_LAGGING_KVAR, 300);
        BankMonth promised = new BankMonth(CapacitorBank.fixed("100"), Map.of(), ZoneId.of("Europe/Berlin"));
        assertThat(promised.with(october, Estimate.HIGH).totals().get(Register.LAGGING_KVARH))
                .hasValueSatisfying(kvarh -> assertThat(kvarh).isEqualByComparingTo("45500"));
    }

    private static BankMonth promised(CapacitorBank bank) {
        return new BankMonth(bank, Map.of(), ZoneOffset.UTC);
    }

    private static BigDecimal after(CapacitorBank bank, Estimate estimate, Register register) {
        return promised(bank)
                .with(Bills.baseMonth(), estimate)
                .totals()
                .get(register)
                .orElseThrow();
    }
}
