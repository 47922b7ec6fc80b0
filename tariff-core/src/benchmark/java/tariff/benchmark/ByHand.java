// SPDX-License-Identifier: Apache-2.0
package tariff.benchmark;

import static java.math.RoundingMode.CEILING;
import static java.math.RoundingMode.HALF_UP;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.List;
import tariff.meter.MeteredMonth;
import tariff.meter.Register;

/**
 * The same assessment in straight-line Java for this one rate: each month as it is, at the no-penalty point, at unity, and with the bank
 * at the least, between and at the most. No rate as data, no derivation, no assumption, no check of the input.
 */
final class ByHand {
    private static final MathContext WIDE = MathContext.DECIMAL128;
    private static final MathContext ROOT = new MathContext(30);
    private static final BigDecimal TARGET = new BigDecimal("0.95");

    private ByHand() {}

    /** Totals: billed, without penalty, at unity, saved least, between, most. */
    static BigDecimal[] assess(List<MeteredMonth> year, BigDecimal bank) {
        BigDecimal[] sums = new BigDecimal[6];
        java.util.Arrays.fill(sums, BigDecimal.ZERO);
        BigDecimal tangent =
                BigDecimal.ONE.subtract(TARGET.multiply(TARGET)).sqrt(ROOT).divide(TARGET, WIDE);
        for (MeteredMonth month : year) {
            BigDecimal days = BigDecimal.valueOf(month.period().days());
            BigDecimal hours = days.multiply(BigDecimal.valueOf(24));
            BigDecimal kwh = month.totals().get(Register.ENERGY_KWH).orElseThrow();
            BigDecimal kvarh = month.totals().get(Register.LAGGING_KVARH).orElseThrow();
            BigDecimal kw = month.totals().get(Register.PEAK_KW).orElseThrow();
            BigDecimal peak = month.totals().get(Register.PEAK_LAGGING_KVAR).orElseThrow();
            BigDecimal asItIs = bill(days, kwh, kvarh, kw);
            BigDecimal free = kvarh.min(kwh.multiply(tangent)).min(kwh.multiply(new BigDecimal("0.33")));
            sums[0] = sums[0].add(asItIs);
            sums[1] = sums[1].add(bill(days, kwh, free, kw));
            sums[2] = sums[2].add(bill(days, kwh, BigDecimal.ZERO, kw));
            BigDecimal most = peak.compareTo(bank) <= 0
                    ? BigDecimal.ZERO
                    : kvarh.multiply(peak.subtract(bank)).divide(peak, WIDE);
            BigDecimal least = kvarh.subtract(bank.multiply(hours)).max(BigDecimal.ZERO);
            BigDecimal between = Curve.left(kvarh, hours, peak, bank).min(most).max(least);
            sums[3] = sums[3].add(asItIs.subtract(bill(days, kwh, most, kw)));
            sums[4] = sums[4].add(asItIs.subtract(bill(days, kwh, between, kw)));
            sums[5] = sums[5].add(asItIs.subtract(bill(days, kwh, least, kw)));
        }
        return sums;
    }

    private static BigDecimal bill(BigDecimal days, BigDecimal kwh, BigDecimal kvarh, BigDecimal kw) {
        BigDecimal apparent = kvarh.signum() == 0
                ? kwh
                : kwh.multiply(kwh).add(kvarh.multiply(kvarh)).sqrt(ROOT);
        BigDecimal pf = kwh.divide(apparent, 20, HALF_UP).setScale(3, HALF_UP);
        BigDecimal raised = pf.compareTo(TARGET) >= 0
                ? kw
                : kw.multiply(BigDecimal.ONE.add(BigDecimal.valueOf(100)
                        .multiply(TARGET.subtract(pf))
                        .divide(pf, WIDE)
                        .movePointLeft(2)));
        BigDecimal demand = raised.max(new BigDecimal("0.6").multiply(new BigDecimal("450")))
                .setScale(0, HALF_UP);
        BigDecimal standing = cent(days.multiply(new BigDecimal("2.35")));
        BigDecimal dear = kwh.min(demand.multiply(BigDecimal.valueOf(200)));
        BigDecimal energy = cent(
                dear.multiply(new BigDecimal("0.1125")).add(kwh.subtract(dear).multiply(new BigDecimal("0.0890"))));
        BigDecimal power = cent(demand.multiply(new BigDecimal("12.40")));
        BigDecimal low = kwh.multiply(new BigDecimal("0.33"));
        BigDecimal high = kwh.multiply(new BigDecimal("0.75"));
        BigDecimal first = kvarh.min(high).subtract(low).max(BigDecimal.ZERO);
        BigDecimal second = kvarh.subtract(high).max(BigDecimal.ZERO);
        BigDecimal reactive =
                cent(first.multiply(new BigDecimal("0.0420")).add(second.multiply(new BigDecimal("0.0610"))));
        BigDecimal points = new BigDecimal("0.90")
                .subtract(pf)
                .max(BigDecimal.ZERO)
                .movePointRight(2)
                .setScale(0, CEILING);
        BigDecimal percent = points.min(BigDecimal.valueOf(25));
        BigDecimal surcharge = cent(energy.add(power).multiply(percent).movePointLeft(2));
        BigDecimal net = standing.add(energy).add(power).add(reactive).add(surcharge);
        return cent(net.add(cent(net.multiply(BigDecimal.valueOf(6)).movePointLeft(2))));
    }

    private static BigDecimal cent(BigDecimal money) {
        return money.setScale(2, HALF_UP);
    }
}
