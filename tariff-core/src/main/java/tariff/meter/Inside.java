// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.IntToLongFunction;

/** The hours and days inside a period of a series. */
record Inside(MonthlySums sums, Period period) implements MeteredMonth.Detail {

    @Override
    public List<MeteredMonth> each(Cut cut) {
        return sums.each(cut, period).map(SubPeriod::registers).toList();
    }

    @Override
    public Optional<CutEnergies> energies(Cut cut) {
        IntervalSeries series = sums.series();
        if (series.stepMinutes() > cut.minutes()) {
            return Optional.empty();
        }
        List<IntervalRange> parts = new ArrayList<>();
        for (LocalDate date = period.first(); !date.isAfter(period.last()); date = date.plusDays(1)) {
            sums.cut(cut, date, (from, to, range) -> {
                if (series.recordedIn(range)) {
                    parts.add(range);
                }
            });
        }
        return Optional.of(new CutEnergies(
                series.scale(),
                sum(parts, series::scaledKwh),
                sum(parts, series::scaledLaggingKvarh),
                sum(parts, series::scaledLeadingKvarh),
                sum(parts, series::scaledExportedKwh)));
    }

    private static long[] sum(List<IntervalRange> parts, IntToLongFunction register) {
        long[] sums = new long[parts.size()];
        for (int part = 0; part < sums.length; part++) {
            for (int i = parts.get(part).from(); i < parts.get(part).to(); i++) {
                sums[part] += register.applyAsLong(i);
            }
        }
        return sums;
    }
}
