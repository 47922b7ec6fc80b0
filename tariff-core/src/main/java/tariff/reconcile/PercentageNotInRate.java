// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Stream;

/** A tax or rider on the whole bill that the rate does not have; the first month that differs gives its size. */
record PercentageNotInRate() implements Cause {
    private static final int MOST_DECIMALS = 3;

    @Override
    public String code() {
        return "percentage-not-in-rate";
    }

    @Override
    public Stream<Trial> trials(Case bills) {
        List<Integer> open = bills.open();
        ReconciledMonth first = open.isEmpty() ? null : bills.charged().get(open.get(0));
        if (first == null || first.recomputed().signum() <= 0) {
            return Stream.empty();
        }
        BigDecimal percent = first.difference().movePointRight(2).divide(first.recomputed(), 10, RoundingMode.HALF_UP);
        Set<BigDecimal> sizes = new LinkedHashSet<>();
        for (int decimals = 0; decimals <= MOST_DECIMALS; decimals++) {
            BigDecimal size = percent.setScale(decimals, RoundingMode.HALF_UP).stripTrailingZeros();
            boolean reaches = size.subtract(percent)
                            .abs()
                            .multiply(first.recomputed())
                            .movePointLeft(2)
                            .compareTo(first.slack().total().max(new BigDecimal("0.01")))
                    <= 0;
            if (size.signum() != 0 && reaches) {
                sizes.add(size);
            }
        }
        return sizes.stream()
                .limit(1)
                .flatMap(size -> bills.written(
                        this,
                        size.toPlainString() + " % on the whole bill, which the rate does not have,",
                        AddedLine.percentage(bills.source(), size)));
    }
}
