// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.PriorityQueue;
import java.util.stream.Stream;

/**
 * The highest demands of a period.
 *
 * @param sums whose demands
 * @param period in what days
 */
public record Peaks(MonthlySums sums, Period period) {
    /** The interval in which the register peaks, the earliest of equals, with what coincided; empty without a whole one. */
    public Optional<PeakDemand> at(Register register) {
        return highest(register, 1, Optional.empty()).stream().findFirst();
    }

    /** The same inside a window. */
    public Optional<PeakDemand> at(Register register, String window) {
        return highest(register, 1, Optional.of(window)).stream().findFirst();
    }

    /**
     * The n highest demand intervals, highest first, earlier before later where equal; fewer if the period has fewer. Sliding
     * intervals may overlap each other.
     *
     * @throws IllegalArgumentException if the register is not a peak, n is below 1, or there is no such window
     */
    public List<PeakDemand> highest(Register register, int n, Optional<String> window) {
        return highest(register, n, window, sums.series().range(period));
    }

    /** The highest demand interval of each day that has one, in order of days. */
    public List<PeakDemand> perDay(Register register, Optional<String> window) {
        return Stream.iterate(
                        period.first(), date -> !date.isAfter(period.last()), (LocalDate date) -> date.plusDays(1))
                .flatMap(date -> highest(register, 1, window, sums.series().range(new Period(date, date))).stream())
                .toList();
    }

    private List<PeakDemand> highest(Register register, int n, Optional<String> window, IntervalRange range) {
        if (n < 1 || !register.isPeak()) {
            throw new IllegalArgumentException("no " + n + " highest of " + register.key());
        }
        Comparator<Candidate> order =
                Comparator.comparingLong(Candidate::rank).thenComparing(Candidate::start, Comparator.reverseOrder());
        PriorityQueue<Candidate> best = new PriorityQueue<>(order);
        int perHour = sums.demand().perHour();
        new Demands(sums.series(), sums.calendar(), sums.demand())
                .walk(range, window.map(sums.calendar()::bit).orElse(0L), (start, kwh, lagging, leading) -> {
                    Candidate next = Candidate.of(register, start, kwh * perHour, lagging * perHour, leading * perHour);
                    if (best.size() < n || order.compare(next, best.element()) > 0) {
                        best.add(next);
                        if (best.size() > n) {
                            best.remove();
                        }
                    }
                });
        List<Candidate> sorted = new ArrayList<>(best);
        sorted.sort(order.reversed());
        return sorted.stream().map(candidate -> candidate.demand(sums.series())).toList();
    }

    private record Candidate(long rank, int start, long kw, long laggingKvar, long leadingKvar) {
        static Candidate of(Register register, int start, long kw, long laggingKvar, long leadingKvar) {
            long rank = switch (register) {
                case PEAK_KW -> kw;
                case PEAK_LAGGING_KVAR -> laggingKvar;
                case PEAK_LEADING_KVAR -> leadingKvar;
                default -> Apparent.of(kw, laggingKvar - leadingKvar);
            };
            return new Candidate(rank, start, kw, laggingKvar, leadingKvar);
        }

        PeakDemand demand(IntervalSeries series) {
            return new PeakDemand(
                    series.startOf(start),
                    series.decimal(kw),
                    series.decimal(laggingKvar),
                    series.decimal(leadingKvar),
                    series.decimal(Apparent.of(kw, laggingKvar - leadingKvar)));
        }
    }
}
