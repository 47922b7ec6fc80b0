// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import java.math.BigDecimal;
import java.util.Collections;
import java.util.List;

/**
 * What the bank takes off the bills. The two years differ where a ratchet remembers the demand from before the bank.
 *
 * <p>Values outside their ranges are refused, all at once, with a {@link tariff.notice.Refusal}.
 *
 * @param firstYear twelve monthly savings after the bank goes into service; less than nothing where a bill rises
 * @param settledYear twelve monthly savings of every later year, at first-year prices and of a bank as good as new
 */
public record Savings(List<BigDecimal> firstYear, List<BigDecimal> settledYear) {
    public Savings {
        firstYear = List.copyOf(firstYear);
        settledYear = List.copyOf(settledYear);
        Checks checks = new Checks();
        twelve(checks, "/firstYear", firstYear.size());
        twelve(checks, "/settledYear", settledYear.size());
        checks.refuseIfAny();
    }

    private static void twelve(Checks checks, String where, int months) {
        if (months != 12) {
            checks.add("not-twelve-months", where, "needs one saving for each month", months + " months", "12 months");
        }
    }

    /** The same in every year, in the same order of months. */
    public static Savings settledAtOnce(List<BigDecimal> year) {
        return new Savings(year, year);
    }

    /** The same amount in every month. */
    public static Savings level(BigDecimal monthly) {
        return settledAtOnce(Collections.nCopies(12, monthly));
    }

    public BigDecimal firstYearTotal() {
        return total(firstYear);
    }

    public BigDecimal settledYearTotal() {
        return total(settledYear);
    }

    Savings times(BigDecimal factor) {
        return new Savings(times(firstYear, factor), times(settledYear, factor));
    }

    private static List<BigDecimal> times(List<BigDecimal> year, BigDecimal factor) {
        return year.stream().map(factor::multiply).toList();
    }

    private static BigDecimal total(List<BigDecimal> year) {
        return year.stream().reduce(BigDecimal.ZERO, BigDecimal::add);
    }
}
