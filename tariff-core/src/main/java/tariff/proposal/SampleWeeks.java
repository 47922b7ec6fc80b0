// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;
import tariff.bill.Statement;
import tariff.correction.Estimate;
import tariff.meter.Register;

/**
 * How many weeks of interval data, spread over the year, would say to within ±10 %, about nine times in ten, what a bank takes off the lagging
 * kvarh of the bills.
 *
 * <p>Each week shows the share of its kvarh that the bank takes off; the bills give the kvarh. Shares of n weeks that vary by a coefficient
 * v have a mean within 10 % nine times in ten where 1.645 v ÷ √n is 0.1 (normal distribution). What bills show of v is how the central
 * shares of the months differ. If weeks differ no more than months do, that is v; if they are independent of one another, a month is the
 * mean of 52 ÷ 12 of them and v is √(52 ÷ 12) times as large. Own derivation. On a small steel plant's year (UCI 851) 10, 8,
 * 5, 4 and 3 weeks were needed for fixed banks of 10, 20, 40, 60 and 80 kvar, each between the two answers. Demands need the peak of every
 * month, which no sample has.
 *
 * @param fewest 2 to 52
 * @param most at least as many
 */
record SampleWeeks(int fewest, int most) {
    private static final double NINE_IN_TEN = 1.645;
    private static final double WITHIN = 0.1;
    private static final double WEEKS = 52;
    private static final double WEEKS_A_MONTH = WEEKS / 12;
    /** One week alone may be a holiday. */
    private static final int LEAST = 2;

    private static final int LEAST_MONTHS = 6;

    /** Empty where bills alone say it to within 10 %, or too few months have lagging kvarh. */
    static Optional<SampleWeeks> of(Map<Estimate, BankSavings> savings) {
        double[] lagging = lagging(savings.get(Estimate.CENTRAL), BankSavings::before);
        double[] central = lagging(savings.get(Estimate.CENTRAL), BankSavings::settledYear);
        double[] shares = IntStream.range(0, lagging.length)
                .filter(month -> lagging[month] > 0)
                .mapToDouble(month -> 1 - central[month] / lagging[month])
                .toArray();
        double removed =
                DoubleStream.of(lagging).sum() - DoubleStream.of(central).sum();
        double open = DoubleStream.of(lagging(savings.get(Estimate.LOW), BankSavings::settledYear))
                        .sum()
                - DoubleStream.of(lagging(savings.get(Estimate.HIGH), BankSavings::settledYear))
                        .sum();
        if (shares.length < LEAST_MONTHS || removed <= 0 || open / 2 <= WITHIN * removed) {
            return Optional.empty();
        }
        double ofMonths = Math.pow(NINE_IN_TEN * variation(shares) / WITHIN, 2);
        return Optional.of(new SampleWeeks(weeks(ofMonths), weeks(WEEKS_A_MONTH * ofMonths)));
    }

    private static double[] lagging(@Nullable BankSavings savings, Function<BankSavings, List<Statement>> year) {
        return savings == null
                ? new double[0]
                : year.apply(savings).stream()
                        .map(statement -> statement.month().totals().get(Register.LAGGING_KVARH))
                        .mapToDouble(kvarh -> kvarh.map(BigDecimal::doubleValue).orElse(0.0))
                        .toArray();
    }

    /** Standard deviation of a sample ÷ its mean. */
    private static double variation(double[] sample) {
        double mean = DoubleStream.of(sample).average().orElseThrow();
        double squares = DoubleStream.of(sample)
                .map(each -> (each - mean) * (each - mean))
                .sum();
        return Math.sqrt(squares / (sample.length - 1)) / mean;
    }

    private static int weeks(double needed) {
        return (int) Math.max(LEAST, Math.min(WEEKS, Math.ceil(needed)));
    }

    /** A noun phrase: {@code 2 to 8 weeks}. */
    String words() {
        return (fewest == most ? "" : fewest + " to ") + most + " weeks";
    }
}
