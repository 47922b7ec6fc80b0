// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.function.IntToLongFunction;
import java.util.stream.IntStream;
import tariff.meter.IntervalSeries;
import tariff.notice.Finding;
import tariff.notice.Refusal;

/** Writes feeds of meter data as NAESB REQ.21 lays them out: entries tied by their links. */
final class InventedFeed {
    private final StringBuilder entries = new StringBuilder();

    /** How a meter's clock differs from UTC, in seconds. */
    InventedFeed clock(int winter, int summer) {
        entry(
                "LocalTimeParameters/01",
                "LocalTimeParameters",
                "",
                "<LocalTimeParameters><dstOffset>" + summer + "</dstOffset><tzOffset>" + winter
                        + "</tzOffset></LocalTimeParameters>");
        return this;
    }

    /** A MeterReading and its ReadingType. */
    InventedFeed channel(String number, String... codes) {
        String self = "UsagePoint/01/MeterReading/" + number;
        entry(
                self,
                "UsagePoint/01/MeterReading",
                "<link rel=\"related\" href=\"" + self + "/IntervalBlock\"/><link rel=\"related\" href=\"ReadingType/"
                        + number + "\"/>",
                "<MeterReading/>");
        StringBuilder type = new StringBuilder("<ReadingType>");
        for (String code : codes) {
            String[] pair = code.split("=", 2);
            type.append('<')
                    .append(pair[0])
                    .append('>')
                    .append(pair[1])
                    .append("</")
                    .append(pair[0])
                    .append('>');
        }
        entry(
                "ReadingType/" + number,
                "ReadingType",
                "",
                type.append("</ReadingType>").toString());
        return this;
    }

    /** An IntervalBlock of a channel; readings are written out by {@link #reading}. */
    InventedFeed block(String number, long start, long seconds, List<String> readings) {
        String parent = "UsagePoint/01/MeterReading/" + number + "/IntervalBlock";
        entry(
                parent + "/" + start,
                parent,
                "",
                "<IntervalBlock><interval><duration>" + seconds + "</duration><start>" + start + "</start></interval>"
                        + String.join("\n", readings) + "</IntervalBlock>");
        return this;
    }

    static String reading(long start, long seconds, long value) {
        return "<IntervalReading><cost>7</cost><timePeriod><duration>" + seconds + "</duration><start>" + start
                + "</start></timePeriod><value>" + value + "</value></IntervalReading>";
    }

    /** The registers of a series in millionths of a kWh or kvarh, a block a day. */
    static InventedFeed of(IntervalSeries series) {
        InventedFeed feed = new InventedFeed();
        feed.days("1", series, series::scaledKwh);
        feed.days("2", series, series::scaledLaggingKvarh);
        feed.days("3", series, series::scaledLeadingKvarh);
        return feed.channel("1", "uom=72", "flowDirection=1", "accumulationBehaviour=4", "powerOfTenMultiplier=-3")
                .channel("2", "uom=73", "flowDirection=2", "accumulationBehaviour=4", "powerOfTenMultiplier=-3")
                .channel("3", "uom=73", "flowDirection=3", "accumulationBehaviour=4", "powerOfTenMultiplier=-3");
    }

    private void days(String number, IntervalSeries series, IntToLongFunction energy) {
        int perDay = 24 * series.perHour();
        long seconds = 60L * series.stepMinutes();
        long millionths = (long) Math.pow(10, 6 - series.scale());
        for (int from = 0; from < series.size(); from += perDay) {
            List<String> readings = IntStream.range(from, Math.min(from + perDay, series.size()))
                    .mapToObj(i ->
                            reading(series.startOf(i).getEpochSecond(), seconds, millionths * energy.applyAsLong(i)))
                    .toList();
            block(number, series.startOf(from).getEpochSecond(), seconds * readings.size(), readings);
        }
    }

    private void entry(String self, String up, String links, String content) {
        entries.append("<entry><link rel=\"self\" href=\"")
                .append(self)
                .append("\"/><link rel=\"up\" href=\"")
                .append(up)
                .append("\"/>")
                .append(links)
                .append("<title/><content>")
                .append(content.replaceFirst("^<(\\w+)", "<$1 xmlns=\"http://naesb.org/espi\""))
                .append("</content></entry>\n");
    }

    String text() {
        return "<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n<feed xmlns=\"http://www.w3.org/2005/Atom\"><title/>\n"
                + entries + "</feed>\n";
    }

    IntervalReading read(IntervalFileOptions options) throws IOException {
        return read(text(), options);
    }

    static IntervalReading read(String text, IntervalFileOptions options) throws IOException {
        return IntervalFile.read(new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8)), options);
    }

    /** With a channel of kWh, and one of a VArh in each quarter of an hour. */
    static InventedFeed withReactive(InventedFeed feed) {
        return feed.channel("1", "uom=72", "flowDirection=1")
                .channel("2", "uom=73", "flowDirection=4")
                .block(
                        "2",
                        0,
                        3_600,
                        IntStream.range(0, 4)
                                .mapToObj(i -> reading(900L * i, 900, 1))
                                .toList());
    }

    static String untimed(long value) {
        return "<IntervalReading><value>" + value + "</value></IntervalReading>";
    }

    static String estimated(long start, int quality) {
        return reading(start, 900, 1)
                .replace("<cost>7</cost>", "<ReadingQuality><quality>" + quality + "</quality></ReadingQuality>");
    }

    /** The errors for which a feed is refused. */
    static List<String> refusal(String text, IntervalFileOptions options) {
        Refusal refusal = catchThrowableOfType(Refusal.class, () -> read(text, options));
        assertThat(refusal).as("refused").isNotNull();
        return refusal.findings().stream()
                .filter(Finding::isError)
                .map(Finding::toString)
                .toList();
    }
}
