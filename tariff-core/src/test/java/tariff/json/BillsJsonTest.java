// SPDX-License-Identifier: Apache-2.0
package tariff.json;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.time.LocalDate;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tariff.meter.MeteredMonth;
import tariff.meter.MeteredSite;
import tariff.meter.Period;
import tariff.meter.Readings;
import tariff.meter.Register;
import tariff.meter.Site;
import tariff.meter.Unit;
import tariff.notice.Refusal;

class BillsJsonTest {
    private static final String FULL = """
            { "site": { "name": "Tollgate Foundry", "agreed": { "kW": 450, "kVA": 600.50 }, "options": ["primary metered"] },
              "months": [
                { "from": "2026-02-05", "to": "2026-03-04", "peakKw": 402.0, "powerFactor": 0.80, "estimated": true },
                { "month": "2026-01", "energyKwh": 160000, "laggingKvarh": 120000.10,
                  "windows": { "day": { "energyKwh": 90000 } }, "statementDate": "2026-02-03",
                  "charged": { "total": 1234.50, "lines": { "Energy": 1300, "Credit": -65.50 } } } ] }""";

    private static MeteredSite read(String json) {
        return BillsJson.read(json.getBytes(StandardCharsets.UTF_8));
    }

    @Test
    void billsAreReadInTheOrderOfTheirDates() {
        MeteredSite bills = read(FULL);
        assertThat(bills.site().agreed(Unit.KVA)).contains(new BigDecimal("600.50"));
        assertThat(bills.site().options()).containsExactly("primary metered");
        assertThat(bills.months())
                .extracting(month -> month.period().toString())
                .containsExactly("2026-01", "2026-02-05 to 2026-03-04");
        MeteredMonth january = bills.months().get(0);
        assertThat(january.totals().get(Register.LAGGING_KVARH)).contains(new BigDecimal("120000.10"));
        assertThat(january.windows().get("day").get(Register.ENERGY_KWH)).contains(new BigDecimal("90000"));
        assertThat(january.statementDate()).contains(LocalDate.of(2026, 2, 3));
        assertThat(january.charged().lines()).containsEntry("Credit", new BigDecimal("-65.50"));
        assertThat(bills.months().get(1).estimated()).isTrue();
    }

    @Test
    void whatIsWrittenIsReadBackAlikeDigitForDigit() {
        MeteredSite bills = read(FULL);
        assertThat(BillsJson.read(BillsJson.write(bills))).isEqualTo(bills);
        assertThat(BillsJson.write(bills)).isEqualTo(BillsJson.write(read(FULL)));
    }

    @Test
    void anyBillsAreReadBackAlike() {
        Random random = new Random(9457);
        for (int i = 0; i < 200; i++) {
            MeteredSite bills = any(random);
            assertThat(BillsJson.read(BillsJson.write(bills))).isEqualTo(bills);
        }
    }

    private static MeteredSite any(Random random) {
        java.util.List<MeteredMonth> months = new java.util.ArrayList<>();
        LocalDate day = LocalDate.of(2020 + random.nextInt(5), 1 + random.nextInt(12), 1);
        for (int i = random.nextInt(14); i >= 0; i--) {
            Period period = new Period(day, day.plusDays(random.nextInt(62)));
            Readings readings = Readings.none();
            for (Register register : Register.values()) {
                if (random.nextBoolean()) {
                    readings = readings.with(
                            register, BigDecimal.valueOf(1 + random.nextInt(9999), 4 + random.nextInt(3)));
                }
            }
            months.add(new MeteredMonth(period, readings).withWindow("n/~\u00e9" + i, readings));
            day = period.last().plusDays(1 + random.nextInt(3));
        }
        return new MeteredSite(Site.unnamed(), months);
    }

    @Test
    void everythingThatIsWrongIsSaidAtOnce() {
        assertThatThrownBy(() -> read("""
                        { "site": { "agreed": { "kw": 3 } }, "bills": 1, "months": [
                          { "month": "2026-01", "peakKw": -4, "powerFactor": 1.01, "windows": { "day": 3 } },
                          { "peakKw": 4 }, { "month": "2026-01", "from": "2026-01-01" }, { "from": "2026-03-01" },
                          { "from": "2026-03-31", "to": "2026-03-01" }, { "month": "2026-01" },
                          { "month": "2026-04", "charged": { "total": "9" }, "estimated": "no" } ] }""")).isInstanceOf(Refusal.class).hasMessage("""
                        /site/agreed/kw: is not a key here; did you mean "kW"?; found kw; allowed: kW, kVA, kvar, kWh
                        /months/0/peakKw: cannot be a reading of kW; found -4; allowed: 0 or more
                        /months/0/powerFactor: cannot be a reading of power factor; found 1.01; allowed: above 0, at most 1
                        /months/0/windows/day: must be an object; found 3; allowed: an object with the registers of the window
                        /months/1: does not say which days it bills; found an object; allowed: "month": "2026-01", or "from":\
                         "2026-01-05" with "to": "2026-02-04"
                        /months/2: says both "month" and "from" or "to"; found an object; allowed: "month": "2026-01", or "from":\
                         "2026-01-05" with "to": "2026-02-04"
                        /months/3: "to" is missing
                        /months/4/to: does not end a billing period; found "2026-03-01"; allowed: from 2026-03-31 on, at most 366 days
                        /months/5: bills days that /months/0 bills too; found 2026-01; allowed: days outside 2026-01
                        /months/6/charged/total: must be a number; found "9"; allowed: a number such as 0.95, without quotes
                        /months/6/estimated: must be true or false; found "no"; allowed: true, false
                        /bills: is not a key here; found bills; allowed: site, months""");
    }

    /** One day either side of what a period may be; own reasoning. */
    @ParameterizedTest
    @CsvSource({
        "1900-01-01, 1900-01-01, true",
        "1899-12-31, 1900-01-01, false",
        "2199-01-01, 2199-12-31, true",
        "2199-12-31, 2200-01-01, false",
        "2025-01-01, 2026-01-01, true",
        "2025-01-01, 2026-01-02, false",
        "2025-02-28, 2025-02-29, false",
        "2025-1-1, 2025-01-31, false"
    })
    void aPeriodHasAtMostAYear(String from, String to, boolean holds) {
        String json = "{\"months\":[{\"from\":\"" + from + "\",\"to\":\"" + to + "\"}]}";
        if (holds) {
            assertThat(read(json).months()).hasSize(1);
        } else {
            assertThatThrownBy(() -> read(json)).isInstanceOf(Refusal.class);
        }
    }
}
