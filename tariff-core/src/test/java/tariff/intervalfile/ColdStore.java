// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import java.math.BigDecimal;
import java.time.DayOfWeek;
import java.time.LocalDateTime;
import java.util.Random;

/**
 * The year 2025 of an invented cold store in Brazil, hour by hour; the figures of {@code examples/intervals/palmeira-cold-store.csv}. All in
 * tenths of a kWh or kvarh, and whole, so that the file is the same on every machine: {@link Random} is specified to the bit.
 *
 * <p>Compressors take more in summer, and far more from 6 to 20 h on days but Sunday. By day they draw three quarters of their kWh as kvarh,
 * at night three tenths, while defrosting a fifth. An old bank of 60 kvar was never switched off.
 */
final class ColdStore {
    private static final long SEED = 2025;
    private static final int HOURS = 365 * 24;
    private static final int OLD_BANK = 600;

    private ColdStore() {}

    static String csv() {
        Random random = new Random(SEED);
        StringBuilder rows = new StringBuilder("hour from,kWh,lagging kvarh,leading kvarh\n");
        LocalDateTime hour = LocalDateTime.of(2025, 1, 1, 0, 0);
        for (int i = 0; i < HOURS; i++) {
            boolean works = hour.getDayOfWeek() != DayOfWeek.SUNDAY && hour.getHour() >= 6 && hour.getHour() < 20;
            boolean defrosts = !works && random.nextInt(6) == 0;
            int kwh = 2300 + 4 * warmth(hour.getDayOfYear()) + (works ? 1500 : 0) + random.nextInt(300);
            int percent = works ? 75 : defrosts ? 20 : 30;
            int net = kwh * percent / 100 + random.nextInt(100) - OLD_BANK;
            rows.append(hour.toLocalDate()).append(' ').append(hour.toLocalTime());
            rows.append(',').append(tenths(kwh));
            rows.append(',').append(tenths(Math.max(0, net)));
            rows.append(',').append(tenths(Math.max(0, -net))).append('\n');
            hour = hour.plusHours(1);
        }
        return rows.toString();
    }

    /** 182 in the middle of January, 0 half a year from there. */
    private static int warmth(int dayOfYear) {
        int days = Math.abs(dayOfYear - 15);
        return 182 - Math.min(days, 365 - days);
    }

    private static String tenths(int value) {
        return BigDecimal.valueOf(value, 1).toPlainString();
    }
}
