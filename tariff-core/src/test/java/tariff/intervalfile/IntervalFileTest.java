// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.io.IOException;
import java.io.StringReader;
import java.time.Instant;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.BitSet;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tariff.csv.DateOrder;
import tariff.meter.IntervalSeries;
import tariff.meter.InventedYear;
import tariff.notice.Assumption;
import tariff.notice.Finding;
import tariff.notice.Refusal;

class IntervalFileTest {
    private static final IntervalFileOptions UTC = IntervalFileOptions.in("UTC");

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "Europe/Berlin | yyyy-MM-dd'T'HH:mmXXX | false | 15",
                "Europe/Berlin | yyyy-MM-dd HH:mm | false | 15",
                "Europe/Berlin | yyyy-MM-dd HH:mm | true | 15",
                "America/New_York | M/d/yyyy h:mm a | false | 30",
                "America/New_York | M/d/yyyy H:mm | true | 5",
                "Europe/Berlin | dd.MM.yyyy HH:mm | true | 60",
                "Asia/Kolkata | d/M/yyyy HH:mm | false | 10",
            })
    void aYearComesBackAsItWasWritten(String zone, String pattern, boolean atEnd, int step) throws IOException {
        IntervalSeries year = InventedYear.of(8, zone, step);
        IntervalReading reading = read(InventedFile.rows(year, pattern, atEnd), IntervalFileOptions.in(zone));
        assertSame(reading.series(), year);
        assertThat(reading.warnings()).isEmpty();
        assertThat(reading.assumptions()).isEmpty();
    }

    @Test
    void theLastRowOfADayStampedOnTheSameDayIsMovedAndListed() throws IOException {
        IntervalSeries year = InventedYear.of(8, "Asia/Kolkata", 15);
        IntervalReading reading = read(InventedFile.sameDayMidnight(year), IntervalFileOptions.in("Asia/Kolkata"));
        assertSame(reading.series(), year);
        assertThat(reading.assumptions())
                .containsExactly(new Assumption(
                        "midnight-same-day",
                        "row 97",
                        "365 rows that end a day are stamped 00:00 of that day; read as 00:00 of the next",
                        "stamp the end of a day 00:00 of the next day or 24:00"));
    }

    @Test
    void averagesInDecimalCommasWithSeparateDateAndTimeAndOneSignedColumn() throws IOException {
        IntervalReading reading = read(
                List.of(
                        "Meter;4711",
                        "",
                        "Date;Time from;Active kW;Reactive kvar",
                        "01.03.2026;00:00;12,4;8,0",
                        "01.03.2026;00:15;12,8;-2,0",
                        "01.03.2026;00:30;0,0;0,1"),
                UTC);
        assertThat(reading.series().scaledKwh(0)).isEqualTo(3_100_000); // own arithmetic: 12.4 kW × ¼ h
        assertThat(reading.series().scaledLaggingKvarh(0)).isEqualTo(2_000_000);
        assertThat(reading.series().scaledLeadingKvarh(1)).isEqualTo(500_000);
        assertThat(reading.series().scaledLaggingKvarh(2)).isEqualTo(25_000);
        assertThat(reading.assumptions()).extracting(Assumption::code).containsExactly("negative-is-leading");
    }

    @Test
    void negativeKwhIsExportAndSaidSo() throws IOException {
        IntervalReading reading = read(
                List.of(
                        "from,kWh,lagging kvarh,leading kvarh",
                        "2026-03-01T00:00Z,5,1,0",
                        "2026-03-01T00:15Z,-2.5,1,0"),
                UTC);
        assertThat(reading.series().hasExport()).isTrue();
        assertThat(reading.series().scaledExportedKwh(1)).isEqualTo(2_500_000);
        assertThat(reading.series().scaledKwh(1)).isZero();
        assertThat(reading.assumptions())
                .extracting(Assumption::message)
                .containsExactly("kWh below zero, here and in 0 other rows, are read as exported");
    }

    @Test
    void megawattHoursAndWattHoursAreReadByTheirHeader() throws IOException {
        IntervalReading reading = read(
                List.of(
                        "start\tMWh\tvarh lagging\tvarh leading",
                        "2026-03-01 00:00\t0.0123\t4500\t0",
                        "2026-03-01 01:00\t1\t1\t0"),
                UTC);
        assertThat(reading.series().scaledKwh(0)).isEqualTo(12_300_000);
        assertThat(reading.series().scaledLaggingKvarh(0)).isEqualTo(4_500_000);
    }

    @Test
    void aGapIsRefusedLeftOutOrFilledAsTheCallerChooses() throws IOException {
        List<String> rows = List.of(
                "from,kWh,lagging kvarh,leading kvarh",
                "2026-04-01 00:00,1,4,0",
                "2026-04-01 00:15,2,4,0",
                "2026-04-01 01:00,5,7,0");
        assertThat(refusal(rows, UTC)).containsExactly("2026-04-01 00:30 to 2026-04-01 01:00: 2 intervals are missing");
        IntervalReading out = read(rows, UTC.gaps(GapRule.LEAVE_OUT));
        assertThat(out.series().absentCount()).isEqualTo(2);
        IntervalReading filled = read(rows, UTC.gaps(GapRule.INTERPOLATE));
        assertThat(filled.series().absentCount()).isZero();
        assertThat(filled.series().scaledKwh(2)).isEqualTo(3_000_000);
        assertThat(filled.series().scaledLaggingKvarh(3)).isEqualTo(6_000_000);
        assertThat(filled.assumptions())
                .containsExactly(new Assumption(
                        "gap-filled",
                        "2026-04", // own arithmetic: 2 of 2,880 quarter hours
                        "2 intervals are missing from 2026-04-01 00:30 to 2026-04-01 01:00, 0.07 % of the month; filled in a"
                                + " straight line between the neighbours",
                        "give the meter's own values for these intervals"));
    }

    @Test
    void aGapAcrossMonthsIsListedInEach() throws IOException {
        IntervalReading reading = read(
                List.of(
                        "from,kWh,lagging kvarh,leading kvarh",
                        "2026-04-30 22:00,1,4,0",
                        "2026-04-30 23:00,2,4,0",
                        "2026-05-01 02:00,5,7,0",
                        "2026-05-01 03:00,5,7,0"),
                UTC.gaps(GapRule.LEAVE_OUT));
        assertThat(reading.assumptions()).extracting(Assumption::where).containsExactly("2026-05");
        assertThat(reading.series().absentCount()).isEqualTo(2);
    }

    @Test
    void repeatsAndRowsOutOfOrderAreNamed() throws IOException {
        List<String> rows = new ArrayList<>(day());
        rows.add(5, rows.get(4)); // row 6 repeats row 5
        Collections.swap(rows, 20, 21);
        IntervalReading reading = read(rows, UTC);
        assertThat(reading.warnings())
                .extracting(Finding::toString)
                .containsExactly(
                        "row 6 (2026-01-01 00:45): repeats row 5 with the same figures; left out",
                        "row 22 (2026-01-01 04:30): stands after a later row; put in its place by its stamp");
        assertThat(reading.series().absentCount()).isZero();
    }

    @Test
    void aRepeatedStampWithOtherFiguresIsRefused() throws IOException {
        List<String> rows = new ArrayList<>(day());
        rows.add(5, "2026-01-01 00:45;999;1;1");
        assertThat(refusal(rows, UTC))
                .containsExactly("row 6 (2026-01-01 00:45): has the stamp of row 5 and other figures");
    }

    @Test
    void aFileWithItsNewestRowFirstIsReadFromTheEnd() throws IOException {
        List<String> rows = new ArrayList<>(day());
        Collections.reverse(rows.subList(1, rows.size()));
        IntervalReading reading = read(rows, UTC);
        assertSame(reading.series(), oneDay());
        assertThat(reading.warnings())
                .extracting(Finding::toString)
                .containsExactly("the file has its newest row first; read from the end");
    }

    @Test
    void aChangedStepIsNamedWhereItBegins() throws IOException {
        List<String> rows = new ArrayList<>(day());
        for (int k = 0; k < 12; k++) {
            rows.add(java.time.LocalDateTime.parse("2026-01-02T00:15").plusMinutes(30L * k) + ";1;1;0");
        }
        assertThat(refusal(rows, UTC.stampAt(StampAt.START).gaps(GapRule.LEAVE_OUT)))
                .containsExactly("row 97 (2026-01-01 23:45): from here on rows are 30 minutes apart instead of 15");
    }

    @Test
    void aRegisterThatCountsUpIsAskedAboutAndReadWhenSaidToBe() throws IOException {
        List<String> rows = new ArrayList<>();
        rows.add("stamp;kWh;lagging kvarh;leading kvarh");
        for (int k = 0; k <= 96; k++) {
            rows.add(java.time.LocalDateTime.parse("2026-01-01T00:00").plusMinutes(15L * k) + ";" + (5000 + 3 * k) + ";"
                    + 2 * k + ";0");
        }
        assertThat(refusal(rows, UTC.stampAt(StampAt.END)))
                .contains(
                        "\"kWh\": never falls from the first row to the last; allowed: say that it is a counter if it is;"
                                + " energies per interval otherwise");
        IntervalSeries series = read(rows, UTC.counter(true)).series();
        assertThat(series.start()).isEqualTo(Instant.parse("2026-01-01T00:00:00Z"));
        assertThat(series.size()).isEqualTo(96);
        assertThat(series.scaledKwh(0)).isEqualTo(3_000_000);
        assertThat(series.scaledLaggingKvarh(95)).isEqualTo(2_000_000);
    }

    @Test
    void aGapInACounterKeepsItsTotalWhenFilled() throws IOException {
        List<String> rows = List.of(
                "stamp,kWh,lagging kvarh,leading kvarh",
                "2026-01-01 00:00,100,1,0",
                "2026-01-01 00:15,103,1,0",
                "2026-01-01 01:00,113,1,0");
        IntervalSeries series =
                read(rows, UTC.counter(true).gaps(GapRule.INTERPOLATE)).series();
        assertThat(series.scaledKwh(1) + series.scaledKwh(2) + series.scaledKwh(3))
                .isEqualTo(10_000_000);
    }

    @Test
    void whichEndAStampMarksIsAskedWhenTheDataDoNotShow() throws IOException {
        List<String> rows = List.of("stamp,kWh,kvarh", "2026-03-01 10:00,1,1", "2026-03-01 10:15,1,1");
        assertThat(refusal(rows, UTC))
                .containsExactly(
                        "the data do not show whether a stamp marks the start or the end of its interval; found first"
                                + " 2026-03-01 10:00, last 2026-03-01 10:15; allowed: say start or end");
    }

    @Test
    void dayOrMonthFirstIsAskedWhenTheDatesDoNotShow() throws IOException {
        List<String> rows = List.of("from,kWh,kvarh", "3/4/2026 10:00,1,1", "3/4/2026 10:15,1,1");
        assertThat(refusal(rows, UTC))
                .containsExactly(
                        "row 2: the dates do not show whether day or month comes first; allowed: say day first or"
                                + " month first");
        assertThat(read(rows, UTC.dateOrder(DateOrder.MONTH_FIRST)).series().start())
                .isEqualTo(Instant.parse("2026-03-04T10:00:00Z"));
    }

    @Test
    void aZoneIsAskedForUnlessStampsCarryOneOffset() throws IOException {
        List<String> local = List.of("from,kWh,kvarh", "2026-03-01 10:00,1,1", "2026-03-01 10:15,1,1");
        assertThat(refusal(local, IntervalFileOptions.defaults()))
                .containsExactly(
                        "the time zone of the bill is not known; allowed: name one, such as Europe/Berlin, or a fixed"
                                + " offset such as +01:00");
        List<String> offset = List.of("from,kWh,kvarh", "2026-03-01T10:00+01:00,1,1", "2026-03-01T10:15+01:00,1,1");
        assertThat(read(offset, IntervalFileOptions.defaults()).series().zone()).hasToString("+01:00");
    }

    @Test
    void aMeterWithoutSummerTimeIsRefusedByTheHourThatDoesNotExist() throws IOException {
        List<String> rows =
                List.of("from,kWh,kvarh", "2026-03-29 01:45,1,1", "2026-03-29 02:00,1,1", "2026-03-29 02:15,1,1");
        assertThat(refusal(rows, IntervalFileOptions.in("Europe/Berlin")).get(0))
                .isEqualTo(
                        "row 3 (2026-03-29 02:00): clocks in Europe/Berlin skipped this hour; allowed: give the meter's own"
                                + " clock as zone, such as +01:00 for one that has no summer time");
    }

    @Test
    void aFileThatLacksTheRepeatedHourHasAGapThere() throws IOException {
        IntervalSeries day = InventedYear.between(
                1, "Europe/Berlin", 15, LocalDate.of(2026, 10, 25), LocalDate.of(2026, 10, 26), new BitSet());
        List<String> rows = new ArrayList<>(InventedFile.rows(day, "yyyy-MM-dd HH:mm", false));
        rows.subList(13, 17).clear();
        assertThat(refusal(rows, IntervalFileOptions.in("Europe/Berlin")))
                .containsExactly("2026-10-25 02:00 to 2026-10-25 03:00: 4 intervals are missing");
    }

    @Test
    void everythingWrongIsSaidAtOnceAndTheRestCounted() throws IOException {
        List<String> rows = new ArrayList<>(day());
        for (int row = 10; row < 20; row++) {
            rows.set(row, "2026-01-01 00:00;much;1;1");
        }
        rows.set(30, "soon;1;1;1");
        assertThat(refusal(rows, UTC.listed(2)))
                .containsExactly(
                        "row 11: \"much\" is not a figure of kWh",
                        "row 12: \"much\" is not a figure of kWh",
                        "row 31: \"soon\" is not a date and time on a whole minute",
                        "and 8 more like the 2 listed");
    }

    @Test
    void columnsThatCannotBeToldApartAreNamed() throws IOException {
        List<String> rows = List.of("from,kWh A,kWh B,kvarh", "2026-03-01 10:00,1,2,1", "2026-03-01 10:15,1,2,1");
        assertThat(refusal(rows, UTC))
                .containsExactly("headers: \"kWh A\" and \"kWh B\" could both be kWh; name the column to use");
        assertThat(read(rows, UTC.columns(Map.of(Role.ACTIVE, "kWh B")))
                        .series()
                        .scaledKwh(0))
                .isEqualTo(2_000_000);
    }

    private static IntervalSeries oneDay() {
        return InventedYear.between(1, "UTC", 15, LocalDate.of(2026, 1, 1), LocalDate.of(2026, 1, 2), new BitSet());
    }

    private static List<String> day() {
        return InventedFile.rows(oneDay(), "yyyy-MM-dd HH:mm", false);
    }

    private static IntervalReading read(List<String> rows, IntervalFileOptions options) throws IOException {
        return IntervalFile.read(new StringReader(String.join("\n", rows)), options);
    }

    private static List<String> refusal(List<String> rows, IntervalFileOptions options) {
        Refusal refusal = catchThrowableOfType(Refusal.class, () -> read(rows, options));
        assertThat(refusal).as("refused").isNotNull();
        return refusal.findings().stream()
                .filter(Finding::isError)
                .map(Finding::toString)
                .toList();
    }

    static void assertSame(IntervalSeries read, IntervalSeries written) {
        assertThat(read.start()).isEqualTo(written.start());
        assertThat(read.stepMinutes()).isEqualTo(written.stepMinutes());
        assertThat(read.size()).isEqualTo(written.size());
        assertThat(read.absentCount()).isZero();
        for (int i = 0; i < read.size(); i++) {
            assertThat(read.scaledKwh(i)).isEqualTo(written.scaledKwh(i));
            assertThat(read.scaledLaggingKvarh(i)).isEqualTo(written.scaledLaggingKvarh(i));
            assertThat(read.scaledLeadingKvarh(i)).isEqualTo(written.scaledLeadingKvarh(i));
        }
    }
}
