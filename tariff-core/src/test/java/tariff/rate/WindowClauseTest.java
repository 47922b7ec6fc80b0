// SPDX-License-Identifier: Apache-2.0
package tariff.rate;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.YearMonth;
import org.junit.jupiter.api.Test;
import tariff.bill.Bills;
import tariff.json.JsonTree;
import tariff.meter.Period;

class WindowClauseTest {

    private static Rate.Checked check(String definitions) {
        String rate = Bills.rate(
                "", definitions, "{ 'name': 'Energy', 'quantity': { 'energy': 'kWh', 'in': 'day' }, 'price': 0.1 }");
        return Rate.check(JsonTree.read(rate.getBytes(java.nio.charset.StandardCharsets.UTF_8)));
    }

    /** January 2026 has 22 days from Monday to Friday, one of them New Year: 21 × 14 h, own count. */
    @Test
    void hoursOfAWindowLeaveOutTheHolidaysThatTheRateExcludes() {
        Rate rate = check(
                        "'holidays': ['2026-01-01'], 'windows': { 'day': { 'weekdays': 'Mon-Fri', 'from': '07:00', 'to': '21:00',"
                                + " 'holidays': 'excluded' } },")
                .rate()
                .orElseThrow();
        assertThat(rate.windows().get("day").hoursIn(Period.of(YearMonth.of(2026, 1)), rate.zone()))
                .isEqualByComparingTo("294");
        assertThat(rate.words().definitions())
                .containsExactly("Window \"day\": Mon to Fri 07:00 to 21:00 (UTC time), not on holidays (1 given).");
    }

    @Test
    void everyMistakeInAWindowIsNamed() {
        assertThat(check(
                                "'timeZone': 'Mars/Olympus', 'holidays': ['soon'], 'windows': { 'day': { 'weekdays': 'Mon-Fry', 'from': '7',"
                                        + " 'to': '25:00', 'months': [13], 'holidays': 'sundays', 'until': '9' } },")
                        .findings())
                .extracting(Object::toString)
                .containsExactlyInAnyOrder(
                        "/holidays/0: is not a day; found \"soon\"; allowed: a day such as 2026-01-01",
                        "/timeZone: is not a time zone; found \"Mars/Olympus\"; allowed: a name such as Europe/Berlin (IANA time zone"
                                + " database)",
                        "/windows/day/weekdays: are not days of the week; found \"Mon-Fry\"; allowed: days or ranges such as"
                                + " \"Mon-Fri\" or \"Sat, Sun\"",
                        "/windows/day/from: is not a time of day; found \"7\"; allowed: hours and minutes, 00:00 to 24:00",
                        "/windows/day/to: is not a time of day; found \"25:00\"; allowed: hours and minutes, 00:00 to 24:00",
                        "/windows/day/months/0: is not a month; found 13; allowed: 1 (January) to 12",
                        "/windows/day/holidays: is not known; did you mean \"sunday\"?; found \"sundays\"; allowed: weekday, sunday,"
                                + " excluded",
                        "/windows/day/until: is not a key here; found until; allowed: weekdays, from, to, months, holidays");
    }
}
