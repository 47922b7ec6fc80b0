// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.time.Instant;
import java.time.ZoneId;
import java.util.Arrays;
import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;
import java.util.stream.LongStream;
import tariff.meter.IntervalSeries;
import tariff.notice.Finding;

/** Lays the channels of a feed side by side: one row for each interval that any of them has. */
final class EspiRows {
    private static final int LARGEST_MULTIPLIER = 12;
    private static final long EARLIEST = Instant.parse("1900-01-01T00:00:00Z").getEpochSecond();
    private static final long LATEST = Instant.parse("2200-12-31T00:00:00Z").getEpochSecond();
    private static final BigDecimal LARGEST = BigDecimal.valueOf(Decimals.LARGEST);

    private final EspiFeed feed;
    private final IntervalFileOptions options;
    private final Notices notices;
    private final Map<Role, Channel> channels = new EnumMap<>(Role.class);
    private long rounded;

    private record Channel(EspiMeterReading entry, EspiReadingType type, EspiValues values) {}

    EspiRows(EspiFeed feed, IntervalFileOptions options, Notices notices) {
        this.feed = feed;
        this.options = options;
        this.notices = notices;
    }

    /** @throws tariff.notice.Refusal if a channel that bills need is missing, or the feed contradicts itself */
    Understood understood() {
        feed.channels().forEach(this::choose);
        requireChannels();
        notices.refuseIfWrong();
        int step = step();
        long[] starts = starts();
        notices.refuseIfWrong();
        Optional<ZoneId> zone =
                new EspiClock(feed, notices).zone(options.zone(), Instant.ofEpochSecond(60 * starts[0]));
        notices.refuseIfWrong();
        Map<Role, Layout.Figures> figures = new EnumMap<>(Role.class);
        Map<Role, long[]> columns = new EnumMap<>(Role.class);
        int[] lines = new int[starts.length];
        channels.forEach((role, channel) -> {
            figures.put(
                    role,
                    new Layout.Figures(
                            figures.size(),
                            channel.entry().name(),
                            0,
                            channel.type().isPower()));
            columns.put(role, column(channel, starts, lines));
        });
        notices.refuseIfWrong();
        RawColumns rows = new RawColumns(starts.length, new long[starts.length], lines, columns, rounded);
        return new Understood(figures, rows, timeline(starts, step, zone.orElseThrow()));
    }

    private void choose(EspiMeterReading entry) {
        Optional<EspiReadingType> type = entry.related().stream()
                .filter(feed.types()::containsKey)
                .map(feed.types()::get)
                .findFirst();
        Optional<Role> role = type.flatMap(EspiReadingType::role);
        if (role.isEmpty()) {
            notices.warning(
                    "not-read",
                    "row " + entry.line(),
                    Texts.quoted(entry.name()) + " is left out: "
                            + type.map(each ->
                                            each.words() + " is not what a bill of electricity counts by the interval")
                                    .orElse("the feed has no ReadingType for it"));
            return;
        }
        String wanted = options.columns().getOrDefault(role.get(), entry.name());
        EspiValues values = feed.valuesOf(entry);
        if (!wanted.equals(entry.name()) || values.count() == 0) {
            return;
        }
        Channel other = channels.putIfAbsent(role.get(), new Channel(entry, type.orElseThrow(), values));
        if (other != null) {
            notices.error(
                    "column-twice",
                    "row " + entry.line(),
                    Texts.quoted(other.entry().name()) + " and " + Texts.quoted(entry.name()) + " could both be "
                            + role.get().words() + "; name the one to use");
        }
        if (values.estimated() > 0) {
            notices.assume(
                    "readings-estimated",
                    entry.name(),
                    values.estimated() + " readings of " + role.get().words()
                            + " are marked as estimated, questionable or projected, and read as they stand",
                    "give the meter's own readings for these intervals");
        }
    }

    private void requireChannels() {
        if (!channels.containsKey(Role.ACTIVE)) {
            missing("a MeterReading of Wh taken, interval by interval,");
        }
        boolean oneColumn = channels.containsKey(Role.REACTIVE);
        if (!oneColumn && !channels.containsKey(Role.LAGGING)) {
            missing("a MeterReading of VArh, interval by interval,");
        }
        if (oneColumn && (channels.containsKey(Role.LAGGING) || channels.containsKey(Role.LEADING))) {
            notices.error(
                    "column-twice",
                    "",
                    "VArh of both signs stand beside lagging or leading VArh; name the MeterReadings to use");
        }
    }

    private void missing(String what) {
        notices.error("column-missing", "", what + " is missing from the feed");
    }

    private int step() {
        int step = 0;
        for (Channel channel : channels.values()) {
            for (int i = 0; i < channel.values().count(); i++) {
                int said = channel.values().seconds(i);
                int seconds = said > 0 ? said : channel.type().intervalSeconds();
                step = step == 0 ? seconds : step;
                if (seconds != step) {
                    notices.error(
                            "changed-step",
                            "row " + channel.values().line(i),
                            "lasts " + seconds + " seconds, others last " + step);
                }
            }
        }
        if (step % 60 != 0 || !IntervalSeries.isStep(step / 60)) {
            notices.add(Finding.error("step", "", "readings are not at the step of a meter")
                    .found(step + " seconds")
                    .allowed("5, 10, 15, 30 or 60 minutes"));
        }
        return step / 60;
    }

    /** In minutes, each once, by time. */
    private long[] starts() {
        for (Channel channel : channels.values()) {
            for (int i = 0; i < channel.values().count(); i++) {
                long start = channel.values().start(i);
                if (start == EspiValues.NOT_SAID) {
                    stamp(channel, i, "neither the reading nor its block says when it was");
                } else if (start % 60 != 0 || start < EARLIEST || start > LATEST) {
                    stamp(channel, i, "does not begin on a whole minute between 1900 and 2200");
                }
            }
        }
        return channels.values().stream()
                .map(Channel::values)
                .flatMapToLong(values -> LongStream.range(0, values.count()).map(i -> values.start((int) i) / 60))
                .sorted()
                .distinct()
                .toArray();
    }

    private void stamp(Channel channel, int i, String message) {
        notices.error("stamp", "row " + channel.values().line(i), message);
    }

    private long[] column(Channel channel, long[] starts, int[] lines) {
        long[] column = new long[starts.length];
        Arrays.fill(column, Grid.NONE);
        EspiValues values = channel.values();
        for (int i = 0; i < values.count(); i++) {
            int row = Arrays.binarySearch(starts, values.start(i) / 60);
            long value = scaled(channel, i);
            if (column[row] != Grid.NONE) {
                String where = "row " + values.line(i);
                if (column[row] == value) {
                    notices.warning("repeated", where, "repeats an earlier reading with the same value; left out");
                } else {
                    notices.error(
                            "repeated-differently", where, "has the time of an earlier reading and another value");
                }
            }
            column[row] = value;
            lines[row] = lines[row] == 0 ? values.line(i) : lines[row];
        }
        return column;
    }

    /** Thousandths of a Wh are millionths of a kWh, but for the power of ten that the ReadingType says. */
    private long scaled(Channel channel, int i) {
        int multiplier = channel.type().multiplier();
        boolean sound = multiplier >= -LARGEST_MULTIPLIER && multiplier <= LARGEST_MULTIPLIER;
        BigDecimal exact = BigDecimal.valueOf(channel.values().scaled(i)).scaleByPowerOfTen(sound ? multiplier : 0);
        if (!sound || exact.abs().compareTo(LARGEST) > 0) {
            notices.error(
                    "figure",
                    "row " + channel.values().line(i),
                    "is beyond what a meter counts, with a powerOfTenMultiplier of " + multiplier);
            return 0;
        }
        BigDecimal whole = exact.setScale(0, RoundingMode.HALF_UP);
        rounded += whole.compareTo(exact) == 0 ? 0 : 1;
        return whole.longValueExact();
    }

    private static Timeline timeline(long[] starts, int step, ZoneId zone) {
        long[] locals = LongStream.of(starts)
                .map(minute -> minute
                        + zone.getRules()
                                        .getOffset(Instant.ofEpochSecond(60 * minute))
                                        .getTotalSeconds()
                                / 60)
                .toArray();
        return new Timeline(starts, locals, step, zone);
    }
}
