// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import java.time.LocalDateTime;
import java.time.format.DateTimeFormatter;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import tariff.meter.IntervalSeries;

/** Writes an invented series as a meter might. */
final class InventedFile {
    private InventedFile() {}

    /** Header and rows, {@code ;} between columns, stamped at the start or the end of the interval by the local clock. */
    static List<String> rows(IntervalSeries series, String pattern, boolean atEnd) {
        DateTimeFormatter format = DateTimeFormatter.ofPattern(pattern, Locale.ROOT);
        List<String> rows = new ArrayList<>();
        rows.add("stamp;kWh;lagging kvarh;leading kvarh");
        for (int i = 0; i < series.size(); i++) {
            var at = series.startOf(i + (atEnd ? 1 : 0)).atZone(series.zone());
            rows.add(row(at.format(format), series, i));
        }
        return rows;
    }

    /** Stamped at the end, the day's last row 00:00 of the same day. */
    static List<String> sameDayMidnight(IntervalSeries series) {
        DateTimeFormatter format = DateTimeFormatter.ofPattern("d/M/yyyy H:mm", Locale.ROOT);
        List<String> rows = new ArrayList<>();
        rows.add("stamp;kWh;lagging kvarh;leading kvarh");
        for (int i = 0; i < series.size(); i++) {
            LocalDateTime start = series.startOf(i).atZone(series.zone()).toLocalDateTime();
            LocalDateTime end = start.plusMinutes(series.stepMinutes());
            rows.add(row(start.toLocalDate().atTime(end.toLocalTime()).format(format), series, i));
        }
        return rows;
    }

    private static String row(String stamp, IntervalSeries series, int i) {
        return stamp + ";" + plain(series, series.scaledKwh(i)) + ";" + plain(series, series.scaledLaggingKvarh(i))
                + ";" + plain(series, series.scaledLeadingKvarh(i));
    }

    private static String plain(IntervalSeries series, long scaled) {
        return series.decimal(scaled).stripTrailingZeros().toPlainString();
    }
}
