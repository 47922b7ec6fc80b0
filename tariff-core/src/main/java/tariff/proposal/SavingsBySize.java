// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.Collections;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.BiFunction;
import java.util.function.Function;
import java.util.function.UnaryOperator;
import java.util.stream.Stream;
import tariff.bill.Billing;
import tariff.bill.PowerFactorCost;
import tariff.bill.StatementLine;
import tariff.correction.BankMonth;
import tariff.correction.CapacitorBank;
import tariff.correction.Estimate;
import tariff.correction.ExactMonths;
import tariff.meter.Derivable;
import tariff.meter.MeteredMonth;
import tariff.meter.MonthOrder;
import tariff.meter.MonthlySums;
import tariff.meter.Readings;
import tariff.meter.Register;
import tariff.meter.Triangle;
import tariff.notice.Refusal;

/**
 * What fixed banks of rising size would save in a settled year.
 *
 * @param currency ISO 4217 code
 * @param sizes from no bank up, in even steps
 */
public record SavingsBySize(String currency, List<Size> sizes) {
    /** Enough for a smooth curve. */
    public static final int USUAL_STEPS = 40;

    private static final int YEAR = 12;
    private static final BigDecimal BEYOND_UNITY = new BigDecimal("1.2");
    private static final BigDecimal ALL_BUT_HALF_A_PERCENT = new BigDecimal("0.995");

    /** A bank and what it saves. */
    public record Size(BigDecimal kvar, Map<Estimate, BankSavings> savings) {
        public Size {
            savings = Collections.unmodifiableMap(new EnumMap<>(savings));
        }

        /** Total of a settled year. */
        public BigDecimal total(Estimate estimate) {
            return of(estimate).settledYearTotal();
        }

        BankSavings of(Estimate estimate) {
            return savings.getOrDefault(estimate, new BankSavings(List.of(), List.of(), List.of()));
        }
    }

    /** From which size on a line saves no more. */
    public record Stop(String line, BigDecimal kvar) {}

    public SavingsBySize {
        sizes = List.copyOf(sizes);
    }

    /**
     * Banks from 0 to 1.2 times what the highest reactive demand of the year needs.
     *
     * @param months as for {@link Assessment#of}
     * @param steps how many banks besides none, 1 or more
     * @throws Refusal naming every month that lacks what the rate bills
     */
    public static SavingsBySize of(Billing billing, List<MeteredMonth> months, int steps) {
        return of(billing, months, steps, false, bank -> {
            BankMonth in =
                    new BankMonth(bank, billing.rate().windows(), billing.rate().zone());
            return in::with;
        });
    }

    /** The same on interval data, where all three estimates are the same. */
    public static SavingsBySize of(Billing billing, MonthlySums sums, int steps) {
        ExactMonths months = new ExactMonths(sums, billing.rate().looksInside());
        return of(billing, sums.months(), steps, true, bank -> {
            UnaryOperator<MeteredMonth> behind = months.behind(bank);
            return (month, estimate) -> behind.apply(month);
        });
    }

    private static SavingsBySize of(
            Billing billing,
            List<MeteredMonth> months,
            int steps,
            boolean exact,
            Function<CapacitorBank, BiFunction<MeteredMonth, Estimate, MeteredMonth>> bank) {
        List<MeteredMonth> sorted = MonthOrder.of(months);
        List<MeteredMonth> past = sorted.subList(0, Math.max(0, sorted.size() - YEAR));
        List<MeteredMonth> year = sorted.subList(past.size(), sorted.size());
        PowerFactorCost today = PowerFactorCost.of(billing, past, year);
        BigDecimal step = kvarForUnity(year)
                .multiply(BEYOND_UNITY)
                .divide(BigDecimal.valueOf(steps), 1, RoundingMode.UP)
                .max(BigDecimal.ONE.movePointLeft(1));
        List<Size> sizes = new ArrayList<>();
        for (int i = 0; i <= steps; i++) {
            BigDecimal kvar = step.multiply(BigDecimal.valueOf(i));
            sizes.add(new Size(
                    kvar,
                    Assessment.savings(billing, today, past, year, bank.apply(CapacitorBank.fixed(kvar)), exact)));
        }
        return new SavingsBySize(billing.rate().currency(), sizes);
    }

    /**
     * Where each line that saves anything has all but half a per cent of the most it can save, read off the sizes, so up to a step late.
     * Lines that still save more at the last size are left out.
     */
    public List<Stop> stops(Estimate estimate) {
        List<Stop> stops = new ArrayList<>();
        for (String line : lines()) {
            List<BigDecimal> saved = sizes.stream()
                    .map(size -> size.of(estimate).settledYear(line))
                    .toList();
            BigDecimal enough = Collections.max(saved).multiply(ALL_BUT_HALF_A_PERCENT);
            int at = firstReaching(saved, enough);
            if (enough.signum() > 0 && at < saved.size() - 1) {
                stops.add(new Stop(line, sizes.get(at).kvar()));
            }
        }
        return stops;
    }

    private static int firstReaching(List<BigDecimal> saved, BigDecimal enough) {
        int at = 0;
        while (saved.get(at).compareTo(enough) < 0) {
            at++;
        }
        return at;
    }

    private List<String> lines() {
        return sizes.get(0).of(Estimate.CENTRAL).before().stream()
                .limit(1)
                .flatMap(statement -> statement.lines().stream())
                .filter(line -> !line.shownOnly())
                .map(StatementLine::name)
                .toList();
    }

    /** The highest lagging kvar of any month, as read or as follows from kW and kVA; else the highest mean. */
    private static BigDecimal kvarForUnity(List<MeteredMonth> year) {
        return year.stream().flatMap(month -> highestKvar(month).stream()).reduce(BigDecimal.ZERO, BigDecimal::max);
    }

    private static Optional<BigDecimal> highestKvar(MeteredMonth month) {
        Readings totals = month.totals();
        BigDecimal hours = BigDecimal.valueOf(24L * month.period().days());
        return Stream.of(
                        totals.get(Register.PEAK_LAGGING_KVAR),
                        Derivable.PEAK_LAGGING_KVAR.from(totals),
                        Derivable.PEAK_LAGGING_KVAR_FROM_MONTH.from(totals),
                        totals.get(Register.LAGGING_KVARH).map(kvarh -> kvarh.divide(hours, Triangle.PRECISION)))
                .flatMap(Optional::stream)
                .findFirst();
    }
}
