// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import tariff.bill.Statement;

/**
 * What a bank takes off the bills if the year repeats itself.
 *
 * @param before each month without the bank, with the same year as its past
 * @param firstYear each month with the bank, which goes into service on the first day of the first of them; a ratchet still
 *     remembers the year before
 * @param settledYear each month with the bank, when the year before had it too
 */
public record BankSavings(List<Statement> before, List<Statement> firstYear, List<Statement> settledYear) {
    public BankSavings {
        before = List.copyOf(before);
        firstYear = List.copyOf(firstYear);
        settledYear = List.copyOf(settledYear);
    }

    /** Savings of each month of the first year; below zero where a bill rises. */
    public List<BigDecimal> firstYearMonths() {
        return less(firstYear);
    }

    /** Savings of each month of every later year. */
    public List<BigDecimal> settledYearMonths() {
        return less(settledYear);
    }

    public BigDecimal firstYearTotal() {
        return sum(firstYearMonths());
    }

    public BigDecimal settledYearTotal() {
        return sum(settledYearMonths());
    }

    /** What a line saves in a settled year. */
    public BigDecimal settledYear(String line) {
        BigDecimal saved = BigDecimal.ZERO;
        for (int i = 0; i < before.size(); i++) {
            saved = saved.add(before.get(i).amount(line))
                    .subtract(settledYear.get(i).amount(line));
        }
        return saved;
    }

    private List<BigDecimal> less(List<Statement> after) {
        List<BigDecimal> saved = new ArrayList<>();
        for (int i = 0; i < before.size(); i++) {
            saved.add(before.get(i).total().subtract(after.get(i).total()));
        }
        return saved;
    }

    private static BigDecimal sum(List<BigDecimal> amounts) {
        return amounts.stream().reduce(BigDecimal.ZERO, BigDecimal::add);
    }
}
