// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import java.time.DayOfWeek;
import java.time.LocalDate;
import java.time.LocalDateTime;
import java.time.ZoneId;
import java.util.BitSet;
import java.util.Optional;
import java.util.Random;

/**
 * A year of an invented workshop, the same for the same seed: two shifts on weekdays, some noise, a bank that was left on at
 * night and sends leading kvarh back. Every figure has three decimals, like a meter's.
 */
public final class InventedYear {
    private InventedYear() {}

    /** From local midnight on 1 January 2026 to the next. */
    public static IntervalSeries of(long seed, String zone, int stepMinutes) {
        return between(seed, zone, stepMinutes, LocalDate.of(2026, 1, 1), LocalDate.of(2027, 1, 1), new BitSet());
    }

    /** The same workshop between two local midnights, with intervals that were not recorded. */
    public static IntervalSeries between(
            long seed, String zoneName, int stepMinutes, LocalDate first, LocalDate end, BitSet absent) {
        ZoneId zone = ZoneId.of(zoneName);
        long from = first.atStartOfDay(zone).toEpochSecond();
        int size = (int) ((end.atStartOfDay(zone).toEpochSecond() - from) / 60 / stepMinutes);
        long[] kwh = new long[size];
        long[] lagging = new long[size];
        long[] leading = new long[size];
        Random random = new Random(seed);
        for (int i = 0; i < size; i++) {
            LocalDateTime at =
                    first.atStartOfDay(zone).plusMinutes((long) i * stepMinutes).toLocalDateTime();
            boolean works = at.getDayOfWeek() != DayOfWeek.SUNDAY && at.getHour() >= 6 && at.getHour() < 22;
            double kw = works ? 180 + 90 * random.nextDouble() : 20 + 10 * random.nextDouble();
            double kvar = works ? 0.8 * kw + 30 * random.nextGaussian() : 10 - 25 * random.nextDouble();
            kwh[i] = Math.round(kw * stepMinutes / 60 * 1000) * 1000;
            long net = Math.round(kvar * stepMinutes / 60 * 1000) * 1000;
            long both = random.nextInt(20) == 0 ? 500_000 : 0;
            lagging[i] = Math.max(0, net) + both;
            leading[i] = Math.max(0, -net) + both;
        }
        return new IntervalSeries(
                first.atStartOfDay(zone).toInstant(),
                stepMinutes,
                zone,
                6,
                kwh,
                lagging,
                leading,
                Optional.empty(),
                absent);
    }
}
