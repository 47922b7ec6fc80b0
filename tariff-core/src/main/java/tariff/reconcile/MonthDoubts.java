// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import static tariff.meter.Register.ENERGY_KWH;
import static tariff.meter.Register.LAGGING_KVARH;
import static tariff.meter.Register.LEADING_KVARH;
import static tariff.meter.Register.PEAK_KVA;
import static tariff.meter.Register.PEAK_KW;
import static tariff.meter.Register.PEAK_LAGGING_KVAR;
import static tariff.meter.Register.POWER_FACTOR;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tariff.meter.MeteredMonth;
import tariff.meter.Readings;
import tariff.meter.Register;
import tariff.meter.Triangle;
import tariff.notice.Finding;

/** Registers of one month that cannot all be right. Half a unit of each last printed digit is given away before anything is said. */
final class MonthDoubts {
    /** The day on which clocks go back has 25 hours. */
    private static final int CLOCK_CHANGE_HOURS = 1;

    private final MeteredMonth month;
    private final Readings read;
    private final List<Finding> all = new ArrayList<>();

    MonthDoubts(MeteredMonth month) {
        this.month = month;
        this.read = month.totals();
    }

    List<Finding> all() {
        notBelow(PEAK_KVA, PEAK_KW);
        notBelow(PEAK_KVA, PEAK_LAGGING_KVAR);
        energyWithin(ENERGY_KWH, PEAK_KW);
        energyWithin(LAGGING_KVARH, read.has(PEAK_LAGGING_KVAR) ? PEAK_LAGGING_KVAR : PEAK_KVA);
        printedPowerFactor();
        for (Register register : Register.values()) {
            windows(register);
        }
        return all;
    }

    private void notBelow(Register larger, Register smaller) {
        Optional<BigDecimal> most = read.get(larger);
        Optional<BigDecimal> least = read.get(smaller);
        if (most.isPresent() && least.isPresent() && high(most.get()).compareTo(low(least.get())) < 0) {
            doubt(
                    "peaks",
                    "the highest " + larger.words() + ", " + Digits.shown(most.get()) + ", is below the highest "
                            + smaller.words() + ", " + Digits.shown(least.get())
                            + "; it cannot be, so one of the two is misread");
        }
    }

    private void energyWithin(Register energy, Register peak) {
        Optional<BigDecimal> counted = read.get(energy);
        Optional<BigDecimal> highest = read.get(peak);
        BigDecimal hours = BigDecimal.valueOf(24L * month.period().days());
        if (counted.isPresent()
                && highest.isPresent()
                && low(counted.get())
                                .compareTo(
                                        high(highest.get()).multiply(hours.add(BigDecimal.valueOf(CLOCK_CHANGE_HOURS))))
                        > 0) {
            doubt(
                    "energy-beyond-peak",
                    shown(energy) + " are more than " + shown(peak) + " in every one of " + Digits.shown(hours)
                            + " hours, " + Digits.shown(highest.get().multiply(hours)) + " " + energy.words()
                            + "; one of the two is misread, or a multiplier is missing");
        }
    }

    /** Rounding moves the last digit by half a unit, cutting off by one; a power factor that counts leading kvarh is not doubted. */
    private void printedPowerFactor() {
        Optional<BigDecimal> printed = read.get(POWER_FACTOR);
        Optional<BigDecimal> kwh = read.get(ENERGY_KWH).filter(value -> value.signum() > 0);
        Optional<BigDecimal> kvarh = read.get(LAGGING_KVARH);
        boolean leads =
                read.get(LEADING_KVARH).filter(value -> value.signum() > 0).isPresent();
        if (printed.isEmpty() || kwh.isEmpty() || kvarh.isEmpty() || leads) {
            return;
        }
        BigDecimal least = powerFactor(low(kwh.get()), high(kvarh.get()));
        BigDecimal most = powerFactor(high(kwh.get()), low(kvarh.get()));
        BigDecimal unit = Digits.halfOfLast(printed.get()).multiply(BigDecimal.valueOf(2));
        if (printed.get().add(unit).compareTo(least) <= 0 || low(printed.get()).compareTo(most) > 0) {
            doubt(
                    "printed-power-factor",
                    "a power factor of " + printed.get().toPlainString() + " is printed, but " + shown(ENERGY_KWH)
                            + " and " + shown(LAGGING_KVARH) + " give "
                            + powerFactor(kwh.get(), kvarh.get())
                                    .setScale(Math.max(4, printed.get().scale()), RoundingMode.HALF_UP)
                                    .toPlainString()
                            + "; one of the three is misread, or the utility measures it another way");
        }
    }

    private void windows(Register register) {
        Optional<BigDecimal> total = read.get(register);
        List<BigDecimal> parts = month.windows().values().stream()
                .flatMap(window -> window.get(register).stream())
                .toList();
        if (register == POWER_FACTOR || total.isEmpty() || parts.isEmpty()) {
            return;
        }
        BigDecimal sum = BigDecimal.ZERO;
        BigDecimal least = BigDecimal.ZERO;
        for (BigDecimal part : parts) {
            sum = register.isPeak() ? sum.max(part) : sum.add(part);
            least = register.isPeak() ? least.max(low(part)) : least.add(low(part));
        }
        if (least.compareTo(high(total.get())) > 0) {
            doubt(
                    "windows",
                    register.isPeak()
                            ? "the highest " + register.words() + " in a window, " + Digits.shown(sum)
                                    + ", is above that of the period, " + Digits.shown(total.get())
                            : "the windows add up to " + Digits.shown(sum) + " " + register.words()
                                    + ", more than the period's " + Digits.shown(total.get())
                                    + "; windows of a bill do not usually overlap");
        }
    }

    private void doubt(String code, String message) {
        all.add(Finding.warning(code, month.period().toString(), message));
    }

    private String shown(Register register) {
        return Digits.shown(read.values().getOrDefault(register, BigDecimal.ZERO)) + " " + register.words();
    }

    private static BigDecimal powerFactor(BigDecimal kwh, BigDecimal kvarh) {
        BigDecimal active = kwh.max(BigDecimal.ZERO);
        BigDecimal apparent = Triangle.apparent(active, kvarh.max(BigDecimal.ZERO));
        return apparent.signum() == 0 ? BigDecimal.ONE : Triangle.powerFactor(active, apparent);
    }

    private static BigDecimal low(BigDecimal value) {
        return value.subtract(Digits.halfOfLast(value));
    }

    private static BigDecimal high(BigDecimal value) {
        return value.add(Digits.halfOfLast(value));
    }
}
