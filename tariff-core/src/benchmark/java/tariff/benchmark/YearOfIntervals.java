// SPDX-License-Identifier: Apache-2.0
package tariff.benchmark;

import java.nio.charset.StandardCharsets;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.BitSet;
import java.util.Optional;
import java.util.Random;
import tariff.meter.IntervalSeries;

/** An invented plant's year of quarter-hours: a day shift, weekends, a fixed bank that leads at night; seeded. */
final class YearOfIntervals {
    static final int SIZE = 35_040;

    /** Decimals of the energies. */
    static final int SCALE = 2;

    private YearOfIntervals() {}

    static IntervalSeries series(long seed) {
        Random random = new Random(seed);
        long[] kwh = new long[SIZE];
        long[] lagging = new long[SIZE];
        long[] leading = new long[SIZE];
        for (int i = 0; i < SIZE; i++) {
            int hour = i / 4 % 24;
            boolean shift = hour >= 6 && hour < 22 && i / 96 % 7 < 5;
            kwh[i] = shift ? 8_000 + random.nextInt(4_000) : 900 + random.nextInt(300);
            long kvarh = (shift ? 5_000 + random.nextInt(4_000) : 500 + random.nextInt(300)) - 700;
            lagging[i] = Math.max(0, kvarh);
            leading[i] = Math.max(0, -kvarh);
        }
        return new IntervalSeries(
                Instant.parse("2025-01-01T00:00:00Z"),
                15,
                ZoneOffset.UTC,
                SCALE,
                kwh,
                lagging,
                leading,
                Optional.empty(),
                new BitSet());
    }

    /** The series as a meter's file. */
    static byte[] file(IntervalSeries series) {
        StringBuilder rows = new StringBuilder("from,kWh,lagging kvarh,leading kvarh\n");
        for (int i = 0; i < series.size(); i++) {
            rows.append(series.startOf(i).toString().substring(0, 16).replace('T', ' '));
            rows.append(',').append(series.decimal(series.scaledKwh(i)).toPlainString());
            rows.append(',').append(series.decimal(series.scaledLaggingKvarh(i)).toPlainString());
            rows.append(',').append(series.decimal(series.scaledLeadingKvarh(i)).toPlainString());
            rows.append('\n');
        }
        return rows.toString().getBytes(StandardCharsets.UTF_8);
    }
}
