// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import java.math.BigDecimal;
import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneId;
import java.util.BitSet;
import java.util.Optional;
import java.util.Set;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;

/**
 * What one meter gave interval by interval, without a break in time: an interval that was not recorded is absent, which is not
 * the same as zero.
 *
 * <p>Energies are whole multiples of 10<sup>−scale</sup> kWh or kvarh, so that sums are exact. Every energy is at least 0;
 * export is a register of its own. An interval belongs to the day, the window and the period in which it starts.
 */
public final class IntervalSeries {
    private static final Set<Long> STEPS = Set.of(5L, 10L, 15L, 30L, 60L);
    /** So large a total still fits a long after it is multiplied by the twelve five-minute intervals of an hour. */
    private static final long LARGEST_TOTAL = 1L << 59;
    /** So large a figure stays in the range of {@link Apparent} as the power of a five-minute interval. */
    private static final long LARGEST = 1L << 51;

    private final Instant start;
    private final int stepMinutes;
    private final ZoneId zone;
    private final int scale;
    private final long[] kwh;
    private final long[] laggingKvarh;
    private final long[] leadingKvarh;
    private final long @Nullable [] exportedKwh;
    private final BitSet absent;
    private final boolean isWhole;

    /**
     * @param start when the first interval begins, on a whole minute
     * @param stepMinutes 5, 10, 15, 30 or 60
     * @param zone the clock that the bill goes by
     * @param scale decimals of the energies, 0 to 9
     * @param kwh active energy taken, in 10<sup>−scale</sup> kWh; what stands at an absent interval is not looked at
     * @param laggingKvarh as long as {@code kwh}
     * @param leadingKvarh as long as {@code kwh}
     * @param exportedKwh as long as {@code kwh}, if the meter has the register
     * @param absent the intervals that were not recorded
     * @throws IllegalArgumentException if the arrays differ in length or are empty, an energy is below zero, one is beyond
     *     2<sup>51</sup>, a total beyond 2<sup>59</sup>, or start, step or scale is not as said
     */
    public IntervalSeries(
            Instant start,
            int stepMinutes,
            ZoneId zone,
            int scale,
            long[] kwh,
            long[] laggingKvarh,
            long[] leadingKvarh,
            Optional<long[]> exportedKwh,
            BitSet absent) {
        require(isStep(stepMinutes), "an interval of " + stepMinutes + " minutes; allowed: 5, 10, 15, 30, 60");
        require(start.getEpochSecond() % 60 == 0 && start.getNano() == 0, "a series cannot start at " + start);
        require(scale >= 0 && scale <= 9, "a scale of " + scale + "; allowed: 0 to 9");
        require(kwh.length > 0, "a series needs an interval");
        this.start = start;
        this.stepMinutes = stepMinutes;
        this.zone = zone;
        this.scale = scale;
        this.absent = (BitSet) absent.clone();
        this.isWhole = absent.isEmpty();
        int size = kwh.length;
        this.kwh = checked(kwh, size, "kWh");
        this.laggingKvarh = checked(laggingKvarh, size, "lagging kvarh");
        this.leadingKvarh = checked(leadingKvarh, size, "leading kvarh");
        this.exportedKwh = exportedKwh.isPresent() ? checked(exportedKwh.get(), size, "exported kWh") : null;
        require(absent.length() <= kwh.length, "interval " + (absent.length() - 1) + " is absent from " + kwh.length);
    }

    /** Whether meters give intervals of so many minutes: 5, 10, 15, 30 or 60. */
    public static boolean isStep(long minutes) {
        return STEPS.contains(minutes);
    }

    public Instant start() {
        return start;
    }

    /** When the last interval ends. */
    public Instant end() {
        return startOf(size());
    }

    public int stepMinutes() {
        return stepMinutes;
    }

    /** How many intervals make an hour: kW = kWh of an interval × this. */
    public int perHour() {
        return 60 / stepMinutes;
    }

    public ZoneId zone() {
        return zone;
    }

    public int scale() {
        return scale;
    }

    /** Intervals from start to end, absent ones too. */
    public int size() {
        return kwh.length;
    }

    public int absentCount() {
        return absent.cardinality();
    }

    public boolean isAbsent(int interval) {
        return !isWhole && absent.get(interval);
    }

    /** The first interval from this one on that was not recorded; {@link #size} if all were. */
    public int nextAbsent(int from) {
        int next = absent.nextSetBit(from);
        return next < 0 ? size() : next;
    }

    /** Whether any interval of a range was recorded. */
    boolean recordedIn(IntervalRange range) {
        return absent.nextClearBit(range.from()) < range.to();
    }

    public boolean hasExport() {
        return exportedKwh != null;
    }

    /** In 10<sup>−scale</sup> kWh; 0 where absent. */
    public long scaledKwh(int interval) {
        return kwh[interval];
    }

    /** In 10<sup>−scale</sup> kvarh; 0 where absent. */
    public long scaledLaggingKvarh(int interval) {
        return laggingKvarh[interval];
    }

    /** In 10<sup>−scale</sup> kvarh; 0 where absent. */
    public long scaledLeadingKvarh(int interval) {
        return leadingKvarh[interval];
    }

    /** In 10<sup>−scale</sup> kWh; 0 where absent or without the register. */
    public long scaledExportedKwh(int interval) {
        return exportedKwh == null ? 0 : exportedKwh[interval];
    }

    /** A scaled figure as a decimal. */
    public BigDecimal decimal(long scaled) {
        return BigDecimal.valueOf(scaled, scale);
    }

    public Instant startOf(int interval) {
        return start.plusSeconds(60L * stepMinutes * interval);
    }

    /** The first interval that starts at the moment or later, kept inside 0 … size. */
    public int firstFrom(Instant moment) {
        return firstFrom(moment.getEpochSecond());
    }

    int firstFrom(long epochSecond) {
        long seconds = epochSecond - start.getEpochSecond();
        long index = -Math.floorDiv(-seconds, 60L * stepMinutes);
        return (int) Math.max(0, Math.min(size(), index));
    }

    /** The intervals that start in the period by the series' own clock; empty if the series knows none. */
    public IntervalRange range(Period period) {
        return new IntervalRange(
                firstFrom(midnight(period.first())),
                firstFrom(midnight(period.last().plusDays(1))));
    }

    public IntervalRange all() {
        return new IntervalRange(0, size());
    }

    /** The days that the series touches. */
    public Period days() {
        return new Period(
                start.atZone(zone).toLocalDate(),
                startOf(size() - 1).atZone(zone).toLocalDate());
    }

    /** How much of the period the series holds. */
    public Coverage coverage(Period period) {
        long minutes = (midnight(period.last().plusDays(1)).getEpochSecond()
                        - midnight(period.first()).getEpochSecond())
                / 60;
        IntervalRange range = range(period);
        int missing = absent.get(range.from(), range.to()).cardinality();
        return new Coverage(Math.toIntExact(minutes / stepMinutes), range.size() - missing);
    }

    /** The same meter with other reactive energies, as a bank would leave them. */
    public IntervalSeries withReactive(long[] newLaggingKvarh, long[] newLeadingKvarh) {
        return with(kwh, newLaggingKvarh, newLeadingKvarh);
    }

    /** The same meter with another active energy taken, as losses behind it would leave it. */
    public IntervalSeries withActive(long[] newKwh) {
        return with(newKwh, laggingKvarh, leadingKvarh);
    }

    private IntervalSeries with(long[] newKwh, long[] newLaggingKvarh, long[] newLeadingKvarh) {
        return new IntervalSeries(
                start,
                stepMinutes,
                zone,
                scale,
                newKwh,
                newLaggingKvarh,
                newLeadingKvarh,
                Optional.ofNullable(exportedKwh),
                absent);
    }

    private Instant midnight(LocalDate date) {
        return date.atStartOfDay(zone).toInstant();
    }

    private long[] checked(long[] given, int size, String name) {
        require(given.length == size, name + " of " + given.length + " intervals beside kWh of " + size);
        long[] copy = given.clone();
        absent.stream().filter(each -> each < size).forEach(each -> copy[each] = 0);
        long anyNegative = 0;
        long largest = 0;
        long total = 0;
        boolean isTooMuch = false;
        for (long each : copy) {
            anyNegative |= each;
            largest = Math.max(largest, each);
            total += each;
            isTooMuch |= total > LARGEST_TOTAL;
        }
        if (anyNegative < 0) {
            int first = IntStream.range(0, size)
                    .filter(each -> copy[each] < 0)
                    .findFirst()
                    .orElseThrow();
            throw new IllegalArgumentException(name + " of the interval from " + startOf(first) + " is below zero");
        }
        require(largest <= LARGEST && !isTooMuch, name + " add up to more than can be held");
        return copy;
    }

    private static void require(boolean holds, String message) {
        if (!holds) {
            throw new IllegalArgumentException(message);
        }
    }
}
