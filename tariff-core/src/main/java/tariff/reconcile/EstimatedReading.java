// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import tariff.meter.MeteredMonth;
import tariff.meter.Readings;
import tariff.meter.Register;
import tariff.meter.Triangle;

/**
 * Two bills that only agree together: one was billed on an estimated reading, the next made up for it. The kWh to move from one to the other
 * are sought so that the first agrees; the second then has to agree by itself.
 */
record EstimatedReading() implements Cause {
    private static final int STEPS = 8;
    private static final BigDecimal NUDGE = new BigDecimal(16);

    @Override
    public String code() {
        return "estimated-reading";
    }

    @Override
    public Stream<Trial> trials(Case bills) {
        return IntStream.range(0, bills.months().size() - 1)
                .filter(place -> bills.open().contains(place)
                        && areOpposite(
                                bills.charged().get(place), bills.charged().get(place + 1)))
                .boxed()
                .flatMap(place -> Stream.of(false, true).flatMap(withKvarh -> moved(bills, place, withKvarh).stream()));
    }

    /** The differences cancel at least by half; power factor clauses keep them from doing so wholly. */
    private static boolean areOpposite(@Nullable ReconciledMonth first, @Nullable ReconciledMonth second) {
        return first != null
                && second != null
                && first.verdict() == Verdict.DIFFERS
                && second.verdict() == Verdict.DIFFERS
                && first.difference().signum() * second.difference().signum() < 0
                && first.difference()
                                .add(second.difference())
                                .abs()
                                .multiply(BigDecimal.valueOf(2))
                                .compareTo(first.difference()
                                        .abs()
                                        .max(second.difference().abs()))
                        <= 0;
    }

    /** Follows the slope of the first bill to the amount that was charged; steps of the rate may take several goes. */
    private Optional<Trial> moved(Case bills, int place, boolean withKvarh) {
        Optional<BigDecimal> kwh = bills.months().get(place).totals().get(Register.ENERGY_KWH);
        int decimals = Math.max(0, kwh.map(BigDecimal::scale).orElse(0));
        BigDecimal at = BigDecimal.ZERO;
        for (int step = 0; step < STEPS && kwh.isPresent(); step++) {
            BigDecimal further = at.add(NUDGE.movePointLeft(decimals));
            Optional<ReconciledMonth> here = first(bills, place, at, withKvarh);
            Optional<ReconciledMonth> there = first(bills, place, further, withKvarh);
            if (here.isEmpty() || there.isEmpty()) {
                return Optional.empty();
            }
            if (here.get().verdict() == Verdict.AGREES) {
                return trial(bills, place, at, withKvarh);
            }
            BigDecimal closed = here.get().difference().subtract(there.get().difference());
            if (closed.signum() == 0) {
                return Optional.empty();
            }
            at = at.add(further.subtract(at).multiply(here.get().difference()).divide(closed, Triangle.PRECISION))
                    .setScale(decimals, RoundingMode.HALF_UP);
        }
        return Optional.empty();
    }

    private Optional<ReconciledMonth> first(Case bills, int place, BigDecimal kwh, boolean withKvarh) {
        return trial(bills, place, kwh, withKvarh).flatMap(trial -> trial.month(place, bills));
    }

    private Optional<Trial> trial(Case bills, int place, BigDecimal kwh, boolean withKvarh) {
        MeteredMonth first = bills.months().get(place);
        MeteredMonth second = bills.months().get(place + 1);
        Optional<Readings> more = more(first.totals(), kwh, withKvarh ? kvarh(first, kwh) : BigDecimal.ZERO);
        Optional<Readings> less = more(
                second.totals(), kwh.negate(), withKvarh ? kvarh(first, kwh).negate() : BigDecimal.ZERO);
        if (more.isEmpty() || less.isEmpty()) {
            return Optional.empty();
        }
        List<MeteredMonth> ends = kwh.signum() > 0 ? List.of(second, first) : List.of(first, second);
        String words = Digits.shown(kwh.abs()) + " kWh" + (withKvarh ? " and their kvarh" : "") + " moved from "
                + ends.get(0).period() + " to " + ends.get(1).period() + " (an estimated reading)";
        return Optional.of(
                bills.read(this, words, Map.of(place, first.with(more.get()), place + 1, second.with(less.get()))));
    }

    /** The kvarh that go with so many kWh at the month's own proportion. */
    private static BigDecimal kvarh(MeteredMonth month, BigDecimal kwh) {
        BigDecimal all = month.totals().get(Register.ENERGY_KWH).orElse(BigDecimal.ONE);
        BigDecimal kvarh = month.totals().get(Register.LAGGING_KVARH).orElse(BigDecimal.ZERO);
        return kvarh.multiply(kwh).divide(all, Math.max(0, kvarh.scale()), RoundingMode.HALF_UP);
    }

    private static Optional<Readings> more(Readings readings, BigDecimal kwh, BigDecimal kvarh) {
        Optional<BigDecimal> active =
                readings.get(Register.ENERGY_KWH).map(kwh::add).filter(sum -> sum.signum() >= 0);
        if (active.isEmpty()) {
            return Optional.empty();
        }
        Readings moved = readings.with(Register.ENERGY_KWH, active.get());
        if (kvarh.signum() == 0) {
            return Optional.of(moved);
        }
        return readings.get(Register.LAGGING_KVARH)
                .map(kvarh::add)
                .filter(sum -> sum.signum() >= 0)
                .map(sum -> moved.with(Register.LAGGING_KVARH, sum));
    }
}
