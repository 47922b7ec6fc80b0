// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Arrays;
import java.util.function.IntPredicate;
import tariff.meter.IntervalRange;
import tariff.meter.IntervalSeries;

/**
 * Lagging and leading kvarh after a fixed bank of any size, from one sorting: with the intervals' net kvar in order and their
 * running sums, Σ(q − c)⁺ and Σ(c − q)⁺ are two look-ups. Equal to {@link BankWalk#fixed} for every size.
 */
public final class BankCurve {
    private final IntervalSeries series;
    private final long[] netKvar;
    /** {@code below[i]}: the sum of the i lowest. */
    private final long[] below;

    private final long swing;

    /** What a bank leaves in the two registers. */
    public record Point(BigDecimal laggingKvarh, BigDecimal leadingKvarh) {}

    /**
     * @param range intervals that count
     * @param chosen which of them, such as those of a window; absent intervals never count
     */
    public BankCurve(IntervalSeries series, IntervalRange range, IntPredicate chosen) {
        this.series = series;
        long[] net = new long[range.size()];
        int count = 0;
        long both = 0;
        for (int i = range.from(); i < range.to(); i++) {
            if (!series.isAbsent(i) && chosen.test(i)) {
                long lag = series.scaledLaggingKvarh(i) * series.perHour();
                long lead = series.scaledLeadingKvarh(i) * series.perHour();
                net[count++] = lag - lead;
                both += Math.min(lag, lead);
            }
        }
        netKvar = Arrays.copyOf(net, count);
        swing = both;
        Arrays.sort(netKvar);
        below = new long[count + 1];
        for (int i = 0; i < count; i++) {
            below[i + 1] = below[i] + netKvar[i];
        }
    }

    public BankCurve(IntervalSeries series, IntervalRange range) {
        this(series, range, interval -> true);
    }

    /** Whether no interval counts. */
    boolean isEmpty() {
        return netKvar.length == 0;
    }

    /**
     * The registers after a bank of this size.
     *
     * @throws IllegalArgumentException if the bank is outside 0 to 1,000,000 kvar or finer than the series
     */
    public Point after(BigDecimal kvar) {
        long bank = BankWalk.scaled(series, kvar);
        int lower = atMost(bank);
        int count = netKvar.length;
        long lagging = below[count] - below[lower] - (long) (count - lower) * bank;
        long leading = lower * bank - below[lower];
        return new Point(energy(lagging + swing), energy(leading + swing));
    }

    /** How many of the sorted values are at most the bank. */
    private int atMost(long bank) {
        int low = 0;
        int high = netKvar.length;
        while (low < high) {
            int middle = (low + high) >>> 1;
            if (netKvar[middle] <= bank) {
                low = middle + 1;
            } else {
                high = middle;
            }
        }
        return low;
    }

    private BigDecimal energy(long scaledKvarIntervals) {
        return series.decimal(scaledKvarIntervals)
                .divide(BigDecimal.valueOf(series.perHour()), series.scale() + 2, RoundingMode.HALF_UP);
    }
}
