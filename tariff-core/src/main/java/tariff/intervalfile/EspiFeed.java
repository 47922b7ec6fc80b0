// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import java.io.CharConversionException;
import java.io.IOException;
import java.io.InputStream;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.Set;
import java.util.function.LongConsumer;
import javax.xml.stream.XMLStreamException;
import org.jspecify.annotations.Nullable;
import tariff.notice.Refusal;

/**
 * What a feed of NAESB REQ.21 (Energy Services Provider Interface, ESPI) says of a meter: Atom entries whose links tie a MeterReading to
 * its ReadingType and to the IntervalBlocks with its values, in any order.
 */
final class EspiFeed {
    private static final long READINGS_BETWEEN_NEWS = 100_000;
    /** QualityOfReading: estimated in two ways, questionable, projected. */
    private static final Set<String> ESTIMATED = Set.of("8", "9", "10", "12");

    private final Map<String, EspiReadingType> types = new LinkedHashMap<>();
    private final List<EspiMeterReading> channels = new ArrayList<>();
    private final Map<String, EspiValues> values = new LinkedHashMap<>();
    private final Decimals decimals = new Decimals('.');
    private final EspiXml xml;
    private final Notices notices;
    private final LongConsumer progress;
    private Map<String, String> clock = Map.of();
    private long count;

    private EspiFeed(EspiXml xml, Notices notices, LongConsumer progress) {
        this.xml = xml;
        this.notices = notices;
        this.progress = progress;
    }

    /**
     * @throws Refusal with everything that is wrong with the feed
     * @throws IOException if it cannot be read at all
     */
    static EspiFeed read(InputStream file, Notices notices, LongConsumer progress) throws IOException {
        try {
            EspiFeed feed = new EspiFeed(new EspiXml(file), notices, progress);
            feed.entries();
            progress.accept(feed.count);
            return feed;
        } catch (XMLStreamException malformed) {
            if (malformed.getNestedException() instanceof IOException broken
                    && !(broken instanceof CharConversionException)) {
                throw broken;
            }
            notices.error(
                    "text",
                    "row " + malformed.getLocation().getLineNumber(),
                    "is not XML as a feed of meter data has it");
            throw new Refusal(notices.findings());
        }
    }

    /** By the link of their entry. */
    Map<String, EspiReadingType> types() {
        return types;
    }

    List<EspiMeterReading> channels() {
        return channels;
    }

    EspiValues valuesOf(EspiMeterReading channel) {
        EspiValues all = new EspiValues();
        values.forEach((parent, some) -> {
            if (channel.owns(parent)) {
                all.addAll(some);
            }
        });
        return all;
    }

    /** Seconds from UTC of the meter's clock in winter, if the feed says. */
    Optional<Integer> winterOffset() {
        return whole(clock.get("tzOffset"))
                .filter(seconds -> Math.abs(seconds) <= 18 * 3600)
                .map(Long::intValue);
    }

    boolean hasSummerTime() {
        return whole(clock.get("dstOffset")).filter(seconds -> seconds != 0).isPresent();
    }

    private void entries() throws XMLStreamException {
        String root = xml.child();
        if (root.equals("entry")) {
            entry();
            return;
        }
        for (String name = xml.child(); !name.isEmpty(); name = xml.child()) {
            if (name.equals("entry")) {
                entry();
            } else {
                xml.skip();
            }
        }
    }

    private void entry() throws XMLStreamException {
        int line = xml.line();
        String self = "";
        String up = "";
        Set<String> related = new HashSet<>();
        Content content = new Content();
        for (String name = xml.child(); !name.isEmpty(); name = xml.child()) {
            if (name.equals("content")) {
                content(content);
                continue;
            }
            if (name.equals("link")) {
                String href = xml.attribute("href");
                String rel = xml.attribute("rel");
                self = rel.equals("self") ? href : self;
                up = rel.equals("up") ? href : up;
                if (rel.equals("related")) {
                    related.add(href);
                }
            }
            xml.skip();
        }
        if (content.isChannel) {
            channels.add(new EspiMeterReading(self, related, line));
        }
        if (content.type != null) {
            types.put(self, content.type);
        }
        if (content.values.count() > 0) {
            values.computeIfAbsent(up, parent -> new EspiValues()).addAll(content.values);
        }
    }

    /** What one entry holds, before its links are known. */
    private static final class Content {
        private boolean isChannel;
        private @Nullable EspiReadingType type;
        private final EspiValues values = new EspiValues();
    }

    private void content(Content into) throws XMLStreamException {
        for (String name = xml.child(); !name.isEmpty(); name = xml.child()) {
            int line = xml.line();
            switch (name) {
                case "MeterReading" -> {
                    into.isChannel = true;
                    xml.skip();
                }
                case "ReadingType" -> into.type = type(xml.texts(), line);
                case "LocalTimeParameters", "TimeConfiguration" -> clock = xml.texts();
                case "IntervalBlock" -> block(into.values);
                default -> xml.skip();
            }
        }
    }

    private @Nullable EspiReadingType type(Map<String, String> codes, int line) {
        try {
            return EspiReadingType.of(codes);
        } catch (NumberFormatException noCode) {
            notices.error("reading-type", "row " + line, "has a code that is no whole number");
            return null;
        }
    }

    private void block(EspiValues into) throws XMLStreamException {
        Map<String, String> whole = Map.of();
        EspiValues readings = new EspiValues();
        for (String name = xml.child(); !name.isEmpty(); name = xml.child()) {
            if (name.equals("interval")) {
                whole = xml.texts();
            } else if (name.equals("IntervalReading")) {
                reading(readings);
            } else {
                xml.skip();
            }
        }
        into.addAll(readings.spreadOver(start(whole), seconds(whole)));
    }

    private void reading(EspiValues into) throws XMLStreamException {
        int line = xml.line();
        Map<String, String> period = Map.of();
        long value = Decimals.EMPTY;
        boolean estimated = false;
        for (String name = xml.child(); !name.isEmpty(); name = xml.child()) {
            switch (name) {
                case "timePeriod" -> period = xml.texts();
                case "value" -> value = value(xml.text(), line);
                case "ReadingQuality" ->
                    estimated |= ESTIMATED.contains(xml.texts().getOrDefault("quality", ""));
                default -> xml.skip();
            }
        }
        if (value != Decimals.EMPTY) {
            into.add(start(period), seconds(period), value, line, estimated);
        }
        if (++count % READINGS_BETWEEN_NEWS == 0) {
            progress.accept(count);
        }
    }

    private long value(String text, int line) {
        long value = decimals.read(text.toCharArray(), 0, text.length(), EspiValues.DECIMALS);
        if (value == Decimals.UNREADABLE) {
            notices.error("figure", "row " + line, Texts.quoted(text) + " is not a value");
            return Decimals.EMPTY;
        }
        return value;
    }

    private static long start(Map<String, String> period) {
        return whole(period.get("start")).orElse(EspiValues.NOT_SAID);
    }

    private static int seconds(Map<String, String> period) {
        return whole(period.get("duration"))
                .filter(seconds -> seconds > 0 && seconds <= Integer.MAX_VALUE)
                .orElse(0L)
                .intValue();
    }

    private static Optional<Long> whole(@Nullable String text) {
        String digits = Objects.requireNonNullElse(text, "");
        return digits.matches("-?\\d{1,15}") ? Optional.of(Long.valueOf(digits)) : Optional.empty();
    }
}
