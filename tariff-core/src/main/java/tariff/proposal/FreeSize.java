// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;
import java.util.stream.IntStream;
import tariff.correction.CapacitorBank;

/**
 * A bank of any size that is a whole number of kvar increments.
 *
 * @param shapes ways of dividing it, at least one
 * @param incrementKvar the smallest bank and the difference between sizes, above 0
 * @param mostKvar the largest bank that has room, at least one increment and at most 5000 of them
 */
public record FreeSize(List<BankShape> shapes, BigDecimal incrementKvar, BigDecimal mostKvar) implements SizeChoice {
    private static final int MOST_SIZES = 5000;
    private static final int CURVE_POINTS = 24;

    /** Throws {@link IllegalArgumentException} naming what is outside its range. */
    public FreeSize {
        shapes = List.copyOf(shapes);
        if (shapes.isEmpty()) {
            throw new IllegalArgumentException("shapes is empty; allowed: one or more");
        }
        if (incrementKvar.signum() <= 0) {
            throw new IllegalArgumentException(
                    "incrementKvar is " + incrementKvar.toPlainString() + "; allowed: above 0");
        }
        int sizes = mostKvar.divide(incrementKvar, 0, RoundingMode.DOWN)
                .min(BigDecimal.valueOf(MOST_SIZES + 1))
                .intValue();
        if (sizes < 1 || sizes > MOST_SIZES) {
            throw new IllegalArgumentException("mostKvar is " + mostKvar.toPlainString()
                    + "; allowed: 1 to 5000 times the increment of " + incrementKvar.toPlainString());
        }
    }

    /** Whole kvar. */
    public static FreeSize upTo(BigDecimal mostKvar, BankShape... shapes) {
        return new FreeSize(List.of(shapes), BigDecimal.ONE, mostKvar);
    }

    @Override
    public CapacitorBank best(Objective objective) {
        return shapes.stream()
                .map(shape -> SizeSearch.best(1, sizes(), size -> bank(shape, size), objective))
                .max(Comparator.comparing(objective::at)
                        .thenComparing(
                                Comparator.comparing(CapacitorBank::ratedKvar).reversed()))
                .orElseThrow();
    }

    @Override
    public Optional<CapacitorBank> smallest(Predicate<CapacitorBank> holds) {
        return shapes.stream()
                .map(shape -> smallest(shape, holds))
                .flatMap(Optional::stream)
                .min(Comparator.comparing(CapacitorBank::ratedKvar));
    }

    private Optional<CapacitorBank> smallest(BankShape shape, Predicate<CapacitorBank> holds) {
        if (holds.test(bank(shape, sizes()))) {
            return Optional.of(bank(shape, firstAbove(0, sizes(), shape, holds)));
        }
        int before = 0;
        for (int size : points().toArray()) {
            if (holds.test(bank(shape, size))) {
                return Optional.of(bank(shape, firstAbove(before, size, shape, holds)));
            }
            before = size;
        }
        return Optional.empty();
    }

    private int firstAbove(int not, int yes, BankShape shape, Predicate<CapacitorBank> holds) {
        int low = not;
        int high = yes;
        while (high - low > 1) {
            int middle = (low + high) >>> 1;
            if (holds.test(bank(shape, middle))) {
                high = middle;
            } else {
                low = middle;
            }
        }
        return high;
    }

    @Override
    public SizeChoice like(CapacitorBank bank) {
        List<BankShape> same = shapes.stream()
                .filter(shape -> shape.of(bank.ratedKvar()).equals(bank))
                .limit(1)
                .toList();
        return same.isEmpty() ? this : new FreeSize(same, incrementKvar, mostKvar);
    }

    @Override
    public List<CapacitorBank> curve() {
        return shapes.stream()
                .flatMap(shape -> points().mapToObj(size -> bank(shape, size)))
                .sorted(Comparator.comparing(CapacitorBank::ratedKvar))
                .toList();
    }

    private IntStream points() {
        return IntStream.rangeClosed(1, CURVE_POINTS)
                .map(part -> Math.max(1, part * sizes() / CURVE_POINTS))
                .distinct();
    }

    private int sizes() {
        return mostKvar.divide(incrementKvar, 0, RoundingMode.DOWN).intValue();
    }

    private CapacitorBank bank(BankShape shape, int size) {
        return shape.of(incrementKvar.multiply(BigDecimal.valueOf(size)));
    }
}
