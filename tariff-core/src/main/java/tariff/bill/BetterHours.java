// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import static tariff.meter.Register.APPARENT_KVAH;
import static tariff.meter.Register.ENERGY_KWH;
import static tariff.meter.Register.LAGGING_KVARH;
import static tariff.meter.Register.LEADING_KVARH;
import static tariff.meter.Register.PEAK_KVA;
import static tariff.meter.Register.PEAK_KW;
import static tariff.meter.Register.PEAK_LAGGING_KVAR;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import tariff.meter.Cut;
import tariff.meter.CutEnergies;
import tariff.meter.MeteredMonth;
import tariff.meter.Readings;
import tariff.meter.Register;

/**
 * The hours or days inside a month, with every power factor better by so much, as {@link BetterPowerFactor} does it for the month. They are
 * worked out in doubles and rounded to a millionth, for a search bills all hours of a month hundreds of times.
 */
record BetterHours(MeteredMonth.Detail detail, BetterPowerFactor better, BigDecimal by) implements MeteredMonth.Detail {
    private static final int DECIMALS = 6;
    private static final double MILLION = 1e6;

    @Override
    public List<MeteredMonth> each(Cut cut) {
        return detail.each(cut).stream()
                .map(part -> part.windows().isEmpty() ? part.with(better(part.totals())) : better.month(part, by))
                .toList();
    }

    @Override
    public Optional<CutEnergies> energies(Cut cut) {
        return detail.energies(cut).flatMap(this::better);
    }

    private Optional<CutEnergies> better(CutEnergies before) {
        try {
            CutEnergies fine = before.scaledTo(DECIMALS);
            long[] lagging = new long[fine.size()];
            for (int part = 0; part < lagging.length; part++) {
                lagging[part] =
                        Math.round(lagging((double) fine.kwh()[part], (double) fine.laggingKvarh()[part], (double)
                                fine.leadingKvarh()[part]));
            }
            return Optional.of(
                    new CutEnergies(fine.scale(), fine.kwh(), lagging, fine.leadingKvarh(), fine.exportedKwh()));
        } catch (ArithmeticException tooLarge) {
            return Optional.empty();
        }
    }

    private Readings better(Readings before) {
        double kwh = value(before, ENERGY_KWH);
        double kw = value(before, PEAK_KW);
        Readings after = before;
        after = with(after, LAGGING_KVARH, lagging(kwh, value(before, LAGGING_KVARH), value(before, LEADING_KVARH)));
        after = with(after, PEAK_LAGGING_KVAR, reactive(kw, value(before, PEAK_LAGGING_KVAR)));
        after = with(after, APPARENT_KVAH, apparent(kwh, value(before, APPARENT_KVAH)));
        return with(after, PEAK_KVA, apparent(kw, value(before, PEAK_KVA)));
    }

    private double lagging(double kwh, double laggingKvarh, double leadingKvarh) {
        double sent = switch (better.leading()) {
            case ADDED -> leadingKvarh;
            case NETTED -> -leadingKvarh;
            case IGNORED, LARGER -> 0;
        };
        return Math.max(0, reactive(kwh, laggingKvarh + sent) - sent);
    }

    private double reactive(double active, double before) {
        if (active <= 0 || before <= 0) {
            return before;
        }
        double powerFactor = raised(active / Math.hypot(active, before));
        return active * Math.sqrt(1 / (powerFactor * powerFactor) - 1);
    }

    private double apparent(double active, double before) {
        return active <= 0 || before <= active ? before : active / raised(active / before);
    }

    private double raised(double powerFactor) {
        return Math.min(1, powerFactor + by.doubleValue());
    }

    private static double value(Readings readings, Register register) {
        return readings.get(register).orElse(BigDecimal.ZERO).doubleValue();
    }

    private static Readings with(Readings readings, Register register, double value) {
        return readings.has(register)
                ? readings.with(register, BigDecimal.valueOf(Math.round(value * MILLION), DECIMALS))
                : readings;
    }
}
