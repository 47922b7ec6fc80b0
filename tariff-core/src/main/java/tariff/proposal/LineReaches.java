// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;
import tariff.correction.CapacitorBank;
import tariff.correction.Estimate;
import tariff.rate.Rate;
import tariff.rate.clause.Line;

/** Finds where each line of a bill stops paying for more kvar. */
final class LineReaches {
    /** A line has stopped paying once it saves all but a hundredth of the most it ever does. */
    private static final BigDecimal ALL_BUT_A_HUNDREDTH = new BigDecimal("0.99");

    /** Below a unit of money a year a line does not move: that is what rounding alone can make of it. */
    private static final BigDecimal NOTHING = BigDecimal.ONE;

    private final RepeatedYear year;
    private final SizeChoice choice;
    private final Estimate estimate;

    LineReaches(RepeatedYear year, SizeChoice choice, Estimate estimate) {
        this.year = year;
        this.choice = choice;
        this.estimate = estimate;
    }

    List<LineReach> of(Rate rate) {
        return rate.lines().stream()
                .filter(line -> !line.heading().shownOnly())
                .map(Line::name)
                .map(this::reach)
                .flatMap(Optional::stream)
                .toList();
    }

    private Optional<LineReach> reach(String line) {
        BigDecimal most = choice.curve().stream()
                .map(bank -> saves(line, bank))
                .max(Comparator.naturalOrder())
                .orElse(BigDecimal.ZERO);
        if (most.compareTo(NOTHING) >= 0) {
            BigDecimal enough = most.multiply(ALL_BUT_A_HUNDREDTH);
            return from(line, most, bank -> saves(line, bank).compareTo(enough) >= 0);
        }
        return from(line, BigDecimal.ZERO, bank -> saves(line, bank).negate().compareTo(NOTHING) >= 0);
    }

    private Optional<LineReach> from(String line, BigDecimal saves, Predicate<CapacitorBank> holds) {
        return choice.smallest(holds).map(bank -> new LineReach(line, saves, bank.ratedKvar()));
    }

    private BigDecimal saves(String line, CapacitorBank bank) {
        return year.savings(bank, estimate).settledYear(line);
    }
}
