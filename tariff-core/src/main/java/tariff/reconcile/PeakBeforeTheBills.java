// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.time.YearMonth;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import tariff.meter.MeteredMonth;
import tariff.meter.Period;
import tariff.meter.Register;
import tariff.meter.Triangle;
import tariff.rate.clause.Earlier;
import tariff.rate.clause.Metered;

/**
 * A ratchet remembers a peak from before the first bill that is given. The peak that the first differing bill asks for is sought, in the month
 * from which it is forgotten just after the last differing bill.
 */
record PeakBeforeTheBills() implements Cause {

    @Override
    public String code() {
        return "peak-before-the-bills";
    }

    @Override
    public Stream<Trial> trials(Case bills) {
        List<Integer> dearer =
                bills.open().stream().filter(place -> isDearer(bills, place)).toList();
        if (dearer.isEmpty()) {
            return Stream.empty();
        }
        int first = dearer.get(0);
        int last = dearer.get(dearer.size() - 1);
        return bills.rate()
                .clauses(Earlier.class)
                .filter(earlier -> earlier.take() == Earlier.Take.HIGHEST && earlier.months() > first)
                .flatMap(earlier -> earlier.of()
                        .all()
                        .filter(Metered.class::isInstance)
                        .map(Metered.class::cast)
                        .filter(metered ->
                                metered.register().isPeak() && metered.window().isEmpty())
                        .map(Metered::register)
                        .distinct()
                        .flatMap(register ->
                                solved(bills, first, Math.max(1, earlier.months() - last), register).stream()))
                .limit(2);
    }

    private static boolean isDearer(Case bills, int place) {
        ReconciledMonth month = bills.charged().get(place);
        return month != null && month.difference().signum() > 0;
    }

    /** The bill rises in proportion once the old peak rules it; two peaks that surely do so give the line. */
    private Optional<Trial> solved(Case bills, int first, int monthsBefore, Register register) {
        Optional<BigDecimal> peak = bills.months().get(first).totals().get(register);
        if (peak.isEmpty() || peak.get().signum() == 0) {
            return Optional.empty();
        }
        BigDecimal high = peak.get().multiply(BigDecimal.valueOf(4));
        BigDecimal higher = peak.get().multiply(BigDecimal.valueOf(5));
        Optional<ReconciledMonth> atHigh =
                trial(bills, register, high, monthsBefore).month(first, bills);
        Optional<ReconciledMonth> atHigher =
                trial(bills, register, higher, monthsBefore).month(first, bills);
        if (atHigh.isEmpty() || atHigher.isEmpty()) {
            return Optional.empty();
        }
        BigDecimal rise = atHigher.get().recomputed().subtract(atHigh.get().recomputed());
        if (rise.signum() <= 0) {
            return Optional.empty();
        }
        BigDecimal old = high.add(atHigh.get()
                .difference()
                .multiply(peak.get())
                .divide(rise, Triangle.PRECISION)
                .setScale(Math.max(0, peak.get().scale()), RoundingMode.HALF_UP));
        return old.compareTo(peak.get()) <= 0
                ? Optional.empty()
                : Optional.of(trial(bills, register, old, monthsBefore));
    }

    private Trial trial(Case bills, Register register, BigDecimal peak, int monthsBefore) {
        MeteredMonth first = bills.months().get(0);
        YearMonth start = first.period().month();
        List<MeteredMonth> past = new ArrayList<>();
        for (int back = monthsBefore; back > 0; back--) {
            MeteredMonth like = new MeteredMonth(Period.of(start.minusMonths(back)), first.totals());
            past.add(back == monthsBefore ? like.with(like.totals().with(register, peak)) : like);
        }
        return new Trial(
                code(),
                "a highest " + register.words() + " of " + Digits.shown(peak) + " in "
                        + past.get(0).period() + ", before the first bill,",
                bills.rate(),
                past,
                bills.months(),
                Trial.EVERY);
    }
}
