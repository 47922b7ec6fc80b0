// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import static tariff.meter.Register.ENERGY_KWH;
import static tariff.meter.Register.LAGGING_KVARH;
import static tariff.meter.Register.PEAK_KW;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.function.BiFunction;
import java.util.stream.IntStream;
import tariff.meter.MeteredMonth;
import tariff.meter.Register;
import tariff.notice.Finding;

/** Months that stand apart from the others. Five are needed to say so. The figures serve comparison only, so that they need not be exact. */
final class YearDoubts {
    private static final int LEAST_MONTHS = 5;

    /** Distances that nobody would ask about: own choice, no source. */
    private static final double LOAD_FACTOR = 0.15;

    private static final double POWER_FACTOR = 0.08;
    private static final double KWH_SHARE = 0.4;

    private final List<MeteredMonth> months;
    private final List<Finding> all = new ArrayList<>();

    private YearDoubts(List<MeteredMonth> months) {
        this.months = months;
    }

    static List<Finding> of(List<MeteredMonth> sorted) {
        YearDoubts doubts = new YearDoubts(sorted);
        doubts.loadFactors(doubts.with(PEAK_KW));
        doubts.energies(doubts.with(ENERGY_KWH));
        doubts.powerFactors(doubts.with(LAGGING_KVARH));
        return doubts.all;
    }

    private void loadFactors(List<MeteredMonth> given) {
        each(
                given,
                YearDoubts::loadFactor,
                LOAD_FACTOR,
                (month, others) -> Finding.warning(
                        "load-factor",
                        month.period().toString(),
                        "the load factor is " + two(loadFactor(month)) + ", in the other months about "
                                + two(others.median())
                                + "; kWh or kW are misread or estimated, or the plant ran otherwise"));
    }

    private void powerFactors(List<MeteredMonth> given) {
        each(given, YearDoubts::powerFactor, POWER_FACTOR, (month, others) -> {
            double swapped = Math.sqrt(1 - powerFactor(month) * powerFactor(month));
            boolean fits = Math.abs(swapped - others.median()) <= POWER_FACTOR / 2;
            return Finding.warning(
                    fits ? "registers-swapped" : "power-factor",
                    month.period().toString(),
                    "kWh and kvarh give a power factor of " + two(powerFactor(month)) + ", in the other months about "
                            + two(others.median())
                            + (fits
                                    ? "; in each other's place they would give " + two(swapped)
                                            + ", so they may be swapped"
                                    : "; one of the two is misread or estimated, or the plant ran otherwise"));
        });
    }

    private void energies(List<MeteredMonth> given) {
        if (given.size() < LEAST_MONTHS) {
            return;
        }
        Robust daily =
                Robust.of(given.stream().mapToDouble(YearDoubts::kwhPerDay).toArray());
        double least = KWH_SHARE * daily.median();
        for (int i = 0; i < given.size(); i++) {
            MeteredMonth month = given.get(i);
            if (daily.isFar(kwhPerDay(month), least)) {
                boolean madeUp = (i + 1 < given.size() && evensOut(month, given.get(i + 1), daily, least))
                        || (i > 0 && evensOut(given.get(i - 1), month, daily, least));
                all.add(Finding.warning(
                        madeUp ? "estimated-reading" : "energy",
                        month.period().toString(),
                        whole(kwhPerDay(month)) + " kWh a day, in the other months about " + whole(daily.median())
                                + (madeUp
                                        ? "; with its neighbour it evens out, so a reading may have been estimated"
                                        : "; the kWh are misread or estimated, or the plant ran otherwise")));
            }
        }
    }

    /** One is short of what the other has too much of, and together they are like the others. */
    private static boolean evensOut(MeteredMonth first, MeteredMonth second, Robust daily, double least) {
        double together = (amount(first, ENERGY_KWH) + amount(second, ENERGY_KWH))
                / (first.period().days() + second.period().days());
        boolean opposite = (kwhPerDay(first) - daily.median()) * (kwhPerDay(second) - daily.median()) < 0;
        return opposite && Math.abs(together - daily.median()) < least / 4;
    }

    private void each(
            List<MeteredMonth> given,
            java.util.function.ToDoubleFunction<MeteredMonth> figure,
            double least,
            BiFunction<MeteredMonth, Robust, Finding> finding) {
        if (given.size() < LEAST_MONTHS) {
            return;
        }
        Robust others = Robust.of(given.stream().mapToDouble(figure).toArray());
        IntStream.range(0, given.size())
                .filter(i -> others.isFar(figure.applyAsDouble(given.get(i)), least))
                .forEach(i -> all.add(finding.apply(given.get(i), others)));
    }

    private List<MeteredMonth> with(Register register) {
        return months.stream()
                .filter(month -> month.totals().has(ENERGY_KWH) && amount(month, register) > 0)
                .toList();
    }

    private static double kwhPerDay(MeteredMonth month) {
        return amount(month, ENERGY_KWH) / month.period().days();
    }

    private static double loadFactor(MeteredMonth month) {
        return kwhPerDay(month) / 24 / amount(month, PEAK_KW);
    }

    private static double powerFactor(MeteredMonth month) {
        double kwh = amount(month, ENERGY_KWH);
        return kwh / Math.hypot(kwh, amount(month, LAGGING_KVARH));
    }

    private static double amount(MeteredMonth month, Register register) {
        return month.totals().get(register).map(Number::doubleValue).orElse(0.0);
    }

    private static String two(double value) {
        return String.format(Locale.ROOT, "%.2f", value);
    }

    private static String whole(double value) {
        return String.format(Locale.ROOT, "%,.0f", value);
    }
}
