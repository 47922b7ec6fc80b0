// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import static org.assertj.core.api.Assertions.assertThat;
import static tariff.intervalfile.InventedFeed.estimated;
import static tariff.intervalfile.InventedFeed.reading;
import static tariff.intervalfile.InventedFeed.refusal;
import static tariff.intervalfile.InventedFeed.untimed;
import static tariff.intervalfile.InventedFeed.withReactive;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import tariff.meter.IntervalSeries;
import tariff.meter.InventedYear;
import tariff.notice.Finding;

/**
 * Feeds as NAESB REQ.21 (ESPI) lays them out. Codes: schema espi.xsd, version 4.0 of 2023-12-13. Samples: those published with the
 * standard by its implementers' project, version 0.7 of 2013-02-08, from which structure, codes and figures are taken.
 */
class EspiFeedTest {
    private static final IntervalFileOptions UTC = IntervalFileOptions.in("UTC");
    private static final long START = 1_333_263_600;

    @ParameterizedTest
    @CsvSource({"Europe/Berlin, 15", "America/New_York, 60", "Asia/Kolkata, 30"})
    void aYearComesBackAsItWasWritten(String zone, int step) throws IOException {
        IntervalSeries year = InventedYear.of(8, zone, step);
        IntervalReading read = InventedFeed.of(year).read(IntervalFileOptions.in(zone));
        IntervalFileTest.assertSame(read.series(), year);
        assertThat(read.warnings()).isEmpty();
        assertThat(read.assumptions()).isEmpty();
    }

    /** The published hourly sample, its first two days: blocks of 24 readings in one entry, 3,081 Wh each, clocks 8 h behind UTC. */
    @Test
    void theStandardsHourlySampleIsReadReadingByReading() throws IOException {
        List<String> first = hours(START, 24);
        List<String> second = hours(START + 86_400, 24);
        String text = new InventedFeed()
                .clock(-28_800, 3_600)
                .block("01", START, 86_400, first)
                .block("01", START + 86_400, 86_400, second)
                .channel(
                        "01",
                        "accumulationBehaviour= 4 ",
                        "commodity= 1 ",
                        "dataQualifier= 12 ",
                        "flowDirection= 1 ",
                        "intervalLength= 3600 ",
                        "kind= 12 ",
                        "phase= 769 ",
                        "powerOfTenMultiplier= 0 ",
                        "uom=72")
                .text();
        Notices notices = new Notices(20);
        List<Long> news = new ArrayList<>();
        EspiFeed feed = EspiFeed.read(bytes(text), notices, news::add);
        EspiMeterReading channel = feed.channels().get(0);
        EspiValues values = feed.valuesOf(channel);
        assertThat(feed.types().get("ReadingType/01").role()).contains(Role.ACTIVE);
        assertThat(feed.winterOffset()).contains(-28_800);
        assertThat(feed.hasSummerTime()).isTrue();
        assertThat(values.count()).isEqualTo(48);
        assertThat(IntStream.range(0, 48).mapToLong(values::scaled).sum())
                .as("Wh, own arithmetic: 48 × 3,081")
                .isEqualTo(147_888_000);
        assertThat(values.start(47)).isEqualTo(START + 47 * 3_600);
        assertThat(news).containsExactly(48L);
        assertThat(refusal(text, UTC))
                .as("the sample has no VArh")
                .containsExactly("a MeterReading of VArh, interval by interval, is missing from the feed");
    }

    /** The published sample of reading types: one reading of 2,745 under ten of them. */
    @ParameterizedTest
    @CsvSource({
        "Energy Delivered,          4,  1, 1,  12, 72,  ACTIVE",
        "Real Power,                12, 1, 1,  37, 38,  ",
        "Apparent Power,            12, 1, 1,  12, 61,  ",
        "Reactive Power,            12, 1, 1,  12, 63,  ",
        "Energy Received Net Flow,  4,  1, 4,  12, 72,  ACTIVE",
        "Forward Energy,            4,  1, 1,  12, 72,  ACTIVE",
        "Reverse Energy,            4,  1, 19, 12, 72,  EXPORTED",
        "Energy Register,           1,  1, 1,  12, 72,  ",
        "Gas Energy Delivered,      4,  7, 1,  12, 169, ",
    })
    void theStandardsReadingTypesAreWhatTheirCodesSay(
            String title, int accumulation, int commodity, int flow, int kind, int unit, Role role) {
        EspiReadingType type = new EspiReadingType(unit, flow, accumulation, 12, commodity, 0, 3_600);
        assertThat(type.role()).as(title).isEqualTo(Optional.ofNullable(role));
    }

    /** FlowDirectionKind of espi.xsd: 2 lagging, 3 leading, 15 and 18 the first and fourth quadrant, 5 and 13 sums of two, 4 and 9 differences. */
    @ParameterizedTest
    @CsvSource({
        "1, LAGGING",
        "2, LAGGING",
        "5, LAGGING",
        "15, LAGGING",
        "3, LEADING",
        "13, LEADING",
        "18, LEADING",
        "19, LEADING",
        "0, REACTIVE",
        "4, REACTIVE",
        "9, REACTIVE",
        "7, ",
        "16, ",
        "20, "
    })
    void reactiveEnergyIsLaggingOrLeadingByItsDirection(int flow, Role role) {
        assertThat(new EspiReadingType(73, flow, 4, 12, 1, 0, 900).role()).isEqualTo(Optional.ofNullable(role));
    }

    @Test
    void averagePowerBecomesTheEnergyOfItsInterval() throws IOException {
        IntervalSeries series = new InventedFeed()
                .clock(3_600, 0)
                .channel("1", "uom=38", "flowDirection=1", "dataQualifier=2", "powerOfTenMultiplier=3")
                .channel("2", "uom=63", "flowDirection=4", "dataQualifier=2", "powerOfTenMultiplier=2")
                .block("1", 0, 1_800, List.of(reading(0, 900, 120), reading(900, 900, 124)))
                .block("2", 0, 1_800, List.of(reading(0, 900, 800), reading(900, 900, -20)))
                .read(IntervalFileOptions.defaults())
                .series();
        assertThat(series.zone())
                .as("no summer time, so the offset is the clock")
                .hasToString("+01:00");
        assertThat(series.decimal(series.scaledKwh(1)))
                .as("124 kW over a quarter")
                .isEqualByComparingTo("31");
        assertThat(series.decimal(series.scaledLaggingKvarh(0))).as("80 kvar").isEqualByComparingTo("20");
        assertThat(series.decimal(series.scaledLeadingKvarh(1))).as("2 kvar").isEqualByComparingTo("0.5");
    }

    @Test
    void readingsWithoutATimeFollowOneAnotherThroughTheirBlock() throws IOException {
        IntervalSeries series = withReactive(new InventedFeed()
                        .block("1", 0, 3_600, List.of(untimed(1_000), untimed(2_000), untimed(3_000), untimed(4_000))))
                .read(UTC)
                .series();
        assertThat(series.stepMinutes()).isEqualTo(15);
        assertThat(LongStream.range(0, 4).map(i -> series.scaledKwh((int) i) / 1_000_000))
                .containsExactly(1L, 2L, 3L, 4L);
    }

    @Test
    void estimatedReadingsAreListedAndChannelsWithoutUseNamed() throws IOException {
        IntervalReading read = withReactive(new InventedFeed()
                        .channel("9", "uom=72", "flowDirection=1", "accumulationBehaviour=1")
                        .block(
                                "1",
                                0,
                                3_600,
                                List.of(
                                        estimated(0, 8),
                                        estimated(900, 9),
                                        estimated(1_800, 17),
                                        reading(2_700, 900, 1))))
                .read(UTC);
        assertThat(read.assumptions().get(0).toString())
                .contains(
                        "2 readings of kWh are marked as estimated, questionable or projected, and read as they stand");
        assertThat(read.warnings())
                .map(Finding::toString)
                .containsExactly("row 3: \"UsagePoint/01/MeterReading/9\" is left out: uom 72, flowDirection 1,"
                        + " accumulationBehaviour 1 is not what a bill of electricity counts by the interval");
    }

    @Test
    void twoChannelsOfOneKindAreNamedAndOneMayBeChosen() throws IOException {
        InventedFeed feed = withReactive(new InventedFeed()
                .channel("4", "uom=72", "flowDirection=1")
                .block("1", 0, 900, List.of(reading(0, 900, 1_000)))
                .block("4", 0, 900, List.of(reading(0, 900, 7_000))));
        assertThat(refusal(feed.text(), UTC))
                .singleElement()
                .asString()
                .endsWith(
                        "\"UsagePoint/01/MeterReading/4\" and \"UsagePoint/01/MeterReading/1\" could both be kWh; name the one to use");
        IntervalReading chosen =
                feed.read(UTC.gaps(GapRule.LEAVE_OUT).columns(Map.of(Role.ACTIVE, "UsagePoint/01/MeterReading/4")));
        assertThat(chosen.series().scaledKwh(0)).isEqualTo(7_000_000);
    }

    @Test
    void theClockOfTheBillIsAskedForWhereTheFeedOnlyHintsAtIt() throws IOException {
        InventedFeed feed = withReactive(new InventedFeed()
                .clock(3_600, 3_600)
                .block("1", 0, 3_600, List.of(untimed(1), untimed(2), untimed(3), untimed(4))));
        assertThat(refusal(feed.text(), IntervalFileOptions.defaults()))
                .containsExactly(
                        "the time zone of the bill is not known; found +01:00 with summer time; allowed: name one,"
                                + " such as Europe/Berlin, or a fixed offset such as +01:00");
        assertThat(feed.read(IntervalFileOptions.in("Europe/Berlin")).warnings())
                .isEmpty();
        assertThat(feed.read(IntervalFileOptions.in("America/Chicago")).warnings())
                .map(Finding::toString)
                .containsExactly("the feed's clock is +01:00 in winter, that of America/Chicago -06:00");
    }

    @ParameterizedTest
    @ValueSource(longs = {Long.MIN_VALUE, 30, 999_999_999_999_999L, -999_999_999_999_999L})
    void aReadingThatIsNotInTimeIsRefused(long start) {
        String reading = start == Long.MIN_VALUE ? untimed(1) : reading(start, 900, 1);
        String text = withReactive(new InventedFeed().block("1", 0, 900, List.of(reading)))
                .text()
                .replaceFirst("<start>0</start>", "");
        assertThat(refusal(text, UTC))
                .containsExactly(
                        start == Long.MIN_VALUE
                                ? "row 3: neither the reading nor its block says when it was"
                                : "row 3: does not begin on a whole minute between 1900 and 2200");
    }

    @Test
    void gapsAreFoundAsInATable() throws IOException {
        InventedFeed feed = withReactive(new InventedFeed()
                .block("1", 0, 3_600, List.of(reading(0, 900, 1), reading(900, 900, 1), reading(2_700, 900, 1))));
        assertThat(refusal(feed.text(), UTC))
                .containsExactly("1970-01-01 00:30 to 1970-01-01 00:45: 1 interval is missing");
        assertThat(feed.read(UTC.gaps(GapRule.LEAVE_OUT)).series().absentCount())
                .isEqualTo(1);
    }

    @Test
    void aReadingGivenTwiceIsLeftOutOrRefused() throws IOException {
        String twice = reading(0, 900, 5);
        InventedFeed same = withReactive(new InventedFeed().block("1", 0, 900, List.of(twice, twice)));
        assertThat(same.read(UTC.gaps(GapRule.LEAVE_OUT)).warnings())
                .extracting(Finding::code)
                .containsExactly("repeated");
        InventedFeed other = withReactive(new InventedFeed().block("1", 0, 900, List.of(twice, reading(0, 900, 6))));
        assertThat(refusal(other.text(), UTC))
                .singleElement()
                .asString()
                .contains("has the time of an earlier reading and another value");
    }

    @Test
    void stepsThatChangeAreRefusedWithTheirLine() {
        InventedFeed feed = withReactive(
                new InventedFeed().block("1", 0, 2_700, List.of(reading(0, 900, 5), reading(900, 1_800, 6))));
        assertThat(refusal(feed.text(), UTC)).containsExactly("row 4: lasts 1800 seconds, others last 900");
    }

    @ParameterizedTest
    @ValueSource(ints = {13, 2147483647, -2147483648})
    void aMultiplierBeyondAnyMeterIsRefused(int multiplier) {
        InventedFeed feed = withReactive(new InventedFeed()
                .channel("7", "uom=72", "flowDirection=19", "powerOfTenMultiplier=" + multiplier)
                .block("1", 0, 900, List.of(reading(0, 900, 1)))
                .block("7", 0, 900, List.of(reading(0, 900, 1))));
        assertThat(refusal(feed.text(), UTC))
                .containsExactly("row 6: is beyond what a meter counts, with a powerOfTenMultiplier of " + multiplier);
    }

    @Test
    void codesAndValuesThatAreNoNumbersAreAllNamed() {
        InventedFeed feed = new InventedFeed()
                .channel("1", "uom=72")
                .channel("2", "uom=seventy-three")
                .block(
                        "1",
                        0,
                        900,
                        List.of(reading(0, 900, 1), "<IntervalReading><value>many</value></IntervalReading>"));
        assertThat(refusal(feed.text(), UTC))
                .containsExactly("row 6: has a code that is no whole number", "row 8: \"many\" is not a value");
    }

    private static List<String> hours(long start, int count) {
        return IntStream.range(0, count)
                .mapToObj(i -> reading(start + 3_600L * i, 3_600, 3_081))
                .toList();
    }

    private static InputStream bytes(String text) {
        return new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8));
    }
}
