// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import static org.assertj.core.api.Assertions.assertThat;
import static tariff.meter.Register.ENERGY_KWH;
import static tariff.meter.Register.LAGGING_KVARH;
import static tariff.meter.Register.PEAK_KVA;
import static tariff.meter.Register.PEAK_KW;
import static tariff.meter.Register.PEAK_LAGGING_KVAR;
import static tariff.meter.Register.POWER_FACTOR;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.function.UnaryOperator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tariff.bill.Bills;
import tariff.meter.MeteredMonth;
import tariff.meter.Period;
import tariff.meter.Readings;
import tariff.notice.Finding;

/** The base month is 160,000 kWh, 120,000 kvarh, 400 kW, 300 kvar, 500 kVA, power factor 0.80, in 30 days. All by own arithmetic. */
class BillDoubtsTest {
    private static List<String> doubts(UnaryOperator<MeteredMonth> change) {
        return doubts(List.of(change.apply(Bills.baseMonth())));
    }

    private static List<String> doubts(List<MeteredMonth> months) {
        return BillDoubts.of(months).stream()
                .map(finding -> finding.code() + " " + finding)
                .toList();
    }

    @Test
    void theBaseMonthIsBeyondDoubt() {
        assertThat(doubts(month -> month.with(POWER_FACTOR, "0.80"))).isEmpty();
    }

    /** 400 kW × 720 h = 288,000 kWh; the hour of a clock change and half a digit are given away: 721 h × 400.5 kW = 288,760.5. */
    @Test
    void energyCannotBeMoreThanThePeakInEveryHour() {
        assertThat(doubts(month -> month.with(ENERGY_KWH, 288_760).with(LAGGING_KVARH, 0)))
                .isEmpty();
        assertThat(doubts(month -> month.with(ENERGY_KWH, 300_000).with(LAGGING_KVARH, 0)))
                .containsExactly(
                        "energy-beyond-peak 2026-04: 300,000 kWh are more than 400 kW in every one of 720 hours,"
                                + " 288,000 kWh; one of the two is misread, or a multiplier is missing");
    }

    @Test
    void kvarhCannotBeMoreThanTheHighestKvarAllowsOrElseTheHighestKva() {
        assertThat(doubts(month -> month.with(LAGGING_KVARH, 220_000)))
                .containsExactly(
                        "energy-beyond-peak 2026-04: 220,000 lagging kvarh are more than 300 lagging kvar in every one"
                                + " of 720 hours, 216,000 lagging kvarh; one of the two is misread, or a multiplier is missing");
        assertThat(doubts(month ->
                        month.with(month.totals().without(PEAK_LAGGING_KVAR)).with(LAGGING_KVARH, 361_000)))
                .containsExactly(
                        "energy-beyond-peak 2026-04: 361,000 lagging kvarh are more than 500 kVA in every one of 720"
                                + " hours, 360,000 lagging kvarh; one of the two is misread, or a multiplier is missing");
    }

    @Test
    void kvaIsNeverBelowKwOrKvar() {
        assertThat(doubts(month -> month.with(PEAK_KVA, 390)))
                .containsExactly(
                        "peaks 2026-04: the highest kVA, 390, is below the highest kW, 400; it cannot be, so one of"
                                + " the two is misread");
        assertThat(doubts(month -> month.with(PEAK_LAGGING_KVAR, 510)))
                .containsExactly(
                        "peaks 2026-04: the highest kVA, 500, is below the highest lagging kvar, 510; it cannot be, so"
                                + " one of the two is misread");
    }

    /** 160,000 ÷ 200,000 = 0.8: rounded it prints 0.80; cut off it may print 0.79, as the kWh may be half a unit short. */
    @ParameterizedTest
    @CsvSource({
        "0.80, false",
        "0.8, false",
        "0.79, false",
        "0.78, true",
        "0.81, true",
        "0.8000, false",
        "0.8002, true",
        "0.85, true"
    })
    void aPrintedPowerFactorFollowsFromTheEnergiesWithinItsDigits(String printed, boolean doubtful) {
        assertThat(doubts(month -> month.with(POWER_FACTOR, printed)))
                .containsExactlyElementsOf(
                        doubtful
                                ? List.of("printed-power-factor 2026-04: a power factor of " + printed
                                        + " is printed, but 160,000 kWh and 120,000 lagging kvarh give 0.8000; one of the three"
                                        + " is misread, or the utility measures it another way")
                                : List.of());
    }

    @Test
    void windowsDoNotAddUpToMoreThanThePeriod() {
        assertThat(doubts(month -> month.withWindow("day", Readings.none().with(ENERGY_KWH, 110_000))
                        .withWindow(
                                "night",
                                Readings.none().with(ENERGY_KWH, 60_000).with(PEAK_KW, 420))))
                .containsExactly(
                        "windows 2026-04: the windows add up to 170,000 kWh, more than the period's 160,000; windows of a"
                                + " bill do not usually overlap",
                        "windows 2026-04: the highest kW in a window, 420, is above that of the period, 400");
    }

    @Test
    void gapsOverlapsAndUnusualLengthsAreNamed() {
        List<MeteredMonth> months = List.of(
                days("2026-01-01", "2026-01-31"),
                days("2026-02-03", "2026-02-28"),
                days("2026-02-28", "2026-03-31"),
                days("2026-04-01", "2026-04-12"));
        assertThat(doubts(months))
                .containsExactly(
                        "gap 2026-02-03 to 2026-02-28: 2 days between 2026-01 and this period are on no bill; give the bill"
                                + " between, or correct the days",
                        "overlap 2026-02-28 to 2026-03-31: shares 1 day with 2026-02-03 to 2026-02-28; a day belongs to one"
                                + " period",
                        "period-length 2026-04-01 to 2026-04-12: 12 days are billed, where 26 to 36 are expected; check the"
                                + " first and the last day");
        assertThat(BillDoubts.of(months)).filteredOn(Finding::isError).hasSize(1);
    }

    private static MeteredMonth days(String first, String last) {
        return new MeteredMonth(new Period(LocalDate.parse(first), LocalDate.parse(last)), Readings.none());
    }

    private static List<MeteredMonth> year(int place, UnaryOperator<MeteredMonth> change) {
        List<MeteredMonth> months = new ArrayList<>();
        for (int month = 1; month <= 12; month++) {
            months.add(MeteredMonth.of(String.format("2025-%02d", month))
                    .with(ENERGY_KWH, 160_000 + 2_000 * (month % 3))
                    .with(LAGGING_KVARH, 90_000 + 1_000 * (month % 4))
                    .with(PEAK_KW, 400));
        }
        months.set(place, change.apply(months.get(place)));
        return months;
    }

    @Test
    void anEvenYearIsBeyondDoubt() {
        assertThat(doubts(year(0, month -> month))).isEmpty();
    }

    /** 164,000 kWh ÷ (744 h × 1,200 kW) = 0.18; the others 160,000 to 164,000 ÷ (720 h × 400 kW) = 0.56 and so on. */
    @Test
    void aMonthsLoadFactorFarFromTheOthersIsNamed() {
        assertThat(doubts(year(4, month -> month.with(PEAK_KW, 1_200))))
                .containsExactly(
                        "load-factor 2025-05: the load factor is 0.18, in the other months about 0.55; kWh or kW are"
                                + " misread or estimated, or the plant ran otherwise");
    }

    @Test
    void kwhAndKvarhInEachOthersPlaceAreNamed() {
        assertThat(doubts(year(4, month -> month.with(ENERGY_KWH, 91_000).with(LAGGING_KVARH, 164_000))))
                .contains(
                        "registers-swapped 2025-05: kWh and kvarh give a power factor of 0.49, in the other months about 0.87;"
                                + " in each other's place they would give 0.87, so they may be swapped");
    }

    @Test
    void aPowerFactorFarFromTheOthersIsNamed() {
        assertThat(doubts(year(4, month -> month.with(LAGGING_KVARH, 9_100))))
                .containsExactly(
                        "power-factor 2025-05: kWh and kvarh give a power factor of 1.00, in the other months about 0.87;"
                                + " one of the two is misread or estimated, or the plant ran otherwise");
    }

    @Test
    void aMonthThatTheNextMakesUpForMayHaveBeenEstimated() {
        List<MeteredMonth> months = new ArrayList<>(year(4, month -> month.with(ENERGY_KWH, 80_000)));
        assertThat(doubts(months))
                .contains(
                        "energy 2025-05: 2,581 kWh a day, in the other months about 5,258; the kWh are misread or estimated,"
                                + " or the plant ran otherwise");
        months.set(5, months.get(5).with(ENERGY_KWH, 242_000));
        assertThat(doubts(months))
                .contains(
                        "estimated-reading 2025-05: 2,581 kWh a day, in the other months about 5,258; with its neighbour it"
                                + " evens out, so a reading may have been estimated")
                .contains(
                        "estimated-reading 2025-06: 8,067 kWh a day, in the other months about 5,258; with its neighbour it"
                                + " evens out, so a reading may have been estimated");
    }
}
