// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.StringReader;
import java.math.BigDecimal;
import java.time.Instant;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.LocalTime;
import java.time.OffsetDateTime;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import tariff.meter.DemandInterval;
import tariff.meter.IntervalSeries;
import tariff.meter.MeteredMonth;
import tariff.meter.MonthlySums;
import tariff.meter.Period;
import tariff.meter.Readings;
import tariff.meter.Register;
import tariff.meter.Window;
import tariff.meter.WindowCalendar;

/**
 * Three days of quarter-hours, in the second of which clocks change: at two or three in the night, or at midnight. The k-th row has
 * 1000 − k kWh and, where k is even, k kvarh, so that a row in a wrong place shows: a day's first row has its peak kW, the last its kvar.
 */
class ClockChangeFileTest {
    private static final DateTimeFormatter STAMP = DateTimeFormatter.ofPattern("yyyy-MM-dd HH:mm");
    private static final Window NIGHT = Window.daily("22:00", "06:00");

    /** When the three days begin, how many quarter-hours the second has, and how many kWh of its are in the night. */
    private record Days(String zone, String second, String begin, int quarterHours, int nightKwh) {}

    /** How a day's last row is written. */
    private enum Midnight {
        OF_THE_NEXT_DAY,
        AS_24,
        OF_THE_SAME_DAY
    }

    /**
     * Clocks of each zone: time zone database. Sums: own arithmetic. The second day's rows are 97 to 188 or 196. Its night has the first 20
     * and the last 8 of 92: 28,000 − 20 × (97 + 116) ÷ 2 − 8 × (181 + 188) ÷ 2 = 24,394. Of 100 it has the first 28 and the last 8 where
     * an hour of the early morning comes twice: 36,000 − 3,094 − 1,540 = 31,366; the first 24 and the last 12 where the hour before midnight
     * does: 36,000 − 2,604 − 2,286 = 31,110.
     */
    private static final List<Days> ALL = List.of(
            new Days("Europe/Berlin", "2026-03-29", "2026-03-27T23:00:00Z", 92, 24_394),
            new Days("Europe/Berlin", "2026-10-25", "2026-10-23T22:00:00Z", 100, 31_366),
            new Days("America/Santiago", "2021-09-05", "2021-09-04T04:00:00Z", 92, 24_394),
            new Days("America/Santiago", "2021-04-03", "2021-04-02T03:00:00Z", 100, 31_110),
            new Days("Asia/Beirut", "2021-03-28", "2021-03-26T22:00:00Z", 92, 24_394),
            new Days("Asia/Beirut", "2021-10-30", "2021-10-28T21:00:00Z", 100, 31_110),
            new Days("America/Havana", "2021-03-14", "2021-03-13T05:00:00Z", 92, 24_394),
            new Days("America/Havana", "2021-11-07", "2021-11-06T04:00:00Z", 100, 31_366),
            new Days("Atlantic/Azores", "2021-03-28", "2021-03-27T01:00:00Z", 92, 24_394),
            new Days("Atlantic/Azores", "2021-10-31", "2021-10-30T00:00:00Z", 100, 31_366));

    static Stream<Arguments> endsOfIntervals() {
        return ALL.stream()
                .flatMap(days -> Arrays.stream(Midnight.values())
                        .flatMap(midnight -> Stream.of(false, true)
                                .flatMap(clockOfStart -> Stream.of(false, true)
                                        .map(offsets -> Arguments.of(days, midnight, clockOfStart, offsets)))));
    }

    /** @param clockOfStart whether an interval that ends as clocks change is stamped by the clock it began with */
    @ParameterizedTest
    @MethodSource("endsOfIntervals")
    void stampsOfEndsFindTheirDay(Days days, Midnight midnight, boolean clockOfStart, boolean offsets)
            throws IOException {
        check(days, rows(days, 0, 192 + days.quarterHours(), k -> end(days, k, midnight, clockOfStart, offsets)));
    }

    static Stream<Arguments> startsOfIntervals() {
        return ALL.stream().flatMap(days -> Stream.of(Arguments.of(days, false), Arguments.of(days, true)));
    }

    @ParameterizedTest
    @MethodSource("startsOfIntervals")
    void stampsOfStartsFindTheirDay(Days days, boolean offsets) throws IOException {
        check(days, rows(days, 0, 192 + days.quarterHours(), k -> start(days, k, offsets)));
    }

    /** The file may hold that day alone; then it is said what its stamps mark. */
    @ParameterizedTest
    @MethodSource("endsOfIntervals")
    void aFileOfTheDayAloneIsReadToo(Days days, Midnight midnight, boolean clockOfStart, boolean offsets)
            throws IOException {
        List<String> rows =
                rows(days, 96, 96 + days.quarterHours(), k -> end(days, k, midnight, clockOfStart, offsets));
        IntervalSeries series = read(rows, IntervalFileOptions.in(days.zone()).stampAt(StampAt.END))
                .series();
        assertThat(series.start()).isEqualTo(moment(days, 96));
        checkSecondDay(days, series);
    }

    @ParameterizedTest
    @MethodSource("startsOfIntervals")
    void aFileOfTheDayAloneMayStampStarts(Days days, boolean offsets) throws IOException {
        List<String> rows = rows(days, 96, 96 + days.quarterHours(), k -> start(days, k, offsets));
        IntervalSeries series = read(rows, IntervalFileOptions.in(days.zone()).stampAt(StampAt.START))
                .series();
        assertThat(series.start()).isEqualTo(moment(days, 96));
        checkSecondDay(days, series);
    }

    private static void check(Days days, List<String> rows) throws IOException {
        IntervalReading reading = read(rows, IntervalFileOptions.in(days.zone()));
        assertThat(reading.warnings()).isEmpty();
        IntervalSeries series = reading.series();
        assertThat(series.start()).isEqualTo(Instant.parse(days.begin()));
        assertThat(series.size()).isEqualTo(192 + days.quarterHours());
        LocalDate second = LocalDate.parse(days.second());
        assertThat(series.range(day(second.minusDays(1))).size()).isEqualTo(96);
        assertThat(series.range(day(second.plusDays(1))).size()).isEqualTo(96);
        checkSecondDay(days, series);
    }

    private static void checkSecondDay(Days days, IntervalSeries series) {
        assertThat(series.absentCount()).isZero();
        int n = days.quarterHours();
        MonthlySums sums = new MonthlySums(
                series, new WindowCalendar(series, Map.of("night", NIGHT)), DemandInterval.block(15), false);
        Period day = day(LocalDate.parse(days.second()));
        MeteredMonth month = sums.month(day);
        Readings totals = month.totals();
        assertThat(series.range(day).size()).isEqualTo(n);
        // own arithmetic: n × 1000 − n × (97 + 96 + n) ÷ 2; 4 × (1000 − 97) = 3612 kW; 4 × the last row's kvarh
        assertThat(totals.get(Register.ENERGY_KWH).orElseThrow())
                .isEqualByComparingTo(BigDecimal.valueOf(n * 1000 - n * (97 + 96 + n) / 2));
        assertThat(totals.get(Register.PEAK_KW).orElseThrow()).isEqualByComparingTo("3612");
        assertThat(totals.get(Register.PEAK_LAGGING_KVAR).orElseThrow())
                .isEqualByComparingTo(BigDecimal.valueOf(4 * (96 + n)));
        assertThat(sums.peaks(day).at(Register.PEAK_KW).orElseThrow().start()).isEqualTo(moment(days, 96));
        assertThat(sums.peaks(day).at(Register.PEAK_LAGGING_KVAR).orElseThrow().start())
                .isEqualTo(moment(days, 95 + n));
        assertThat(month.get(Register.ENERGY_KWH, Optional.of("night")).orElseThrow())
                .isEqualByComparingTo(BigDecimal.valueOf(days.nightKwh()));
    }

    private interface Stamps {
        String of(int row);
    }

    /** Rows counted from 0. */
    private static List<String> rows(Days days, int from, int to, Stamps stamps) {
        List<String> rows = new ArrayList<>(List.of("stamp;kWh;lagging kvarh;leading kvarh"));
        for (int k = from; k < to; k++) {
            rows.add(stamps.of(k) + ";" + (1000 - (k + 1)) + ";" + (k % 2 == 0 ? 0 : k + 1) + ";0");
        }
        return rows;
    }

    private static String start(Days days, int row, boolean offset) {
        OffsetDateTime at = clock(days, moment(days, row));
        return STAMP.format(at) + (offset ? at.getOffset() : "");
    }

    private static String end(Days days, int row, Midnight midnight, boolean clockOfStart, boolean offset) {
        OffsetDateTime start = clock(days, moment(days, row));
        OffsetDateTime end = clockOfStart ? start.plusMinutes(15) : clock(days, moment(days, row + 1));
        boolean endsDay = end.toLocalTime().equals(LocalTime.MIDNIGHT)
                && end.toLocalDate().isAfter(start.toLocalDate());
        return local(end.toLocalDateTime(), endsDay ? midnight : Midnight.OF_THE_NEXT_DAY)
                + (offset ? end.getOffset() : "");
    }

    private static String local(LocalDateTime end, Midnight midnight) {
        return switch (midnight) {
            case OF_THE_NEXT_DAY -> STAMP.format(end);
            case AS_24 -> end.toLocalDate().minusDays(1) + " 24:00";
            case OF_THE_SAME_DAY -> end.toLocalDate().minusDays(1) + " 00:00";
        };
    }

    private static OffsetDateTime clock(Days days, Instant moment) {
        ZoneOffset offset = ZoneId.of(days.zone()).getRules().getOffset(moment);
        return moment.atOffset(offset);
    }

    private static Instant moment(Days days, int row) {
        return Instant.parse(days.begin()).plusSeconds(900L * row);
    }

    private static Period day(LocalDate date) {
        return new Period(date, date);
    }

    private static IntervalReading read(List<String> rows, IntervalFileOptions options) throws IOException {
        return IntervalFile.read(new StringReader(String.join("\n", rows)), options);
    }
}
