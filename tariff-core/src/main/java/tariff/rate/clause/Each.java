// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import tariff.meter.Cut;
import tariff.meter.CutEnergies;
import tariff.meter.Triangle;
import tariff.meter.Unit;

/**
 * The same quantity inside each hour, half-hour, quarter-hour or day, then added up or the highest taken: {@code { "each": "hour", "take":
 * "sum", "of": … }}. Registers and power factors inside are the hour's own. {@code "take": "meanOfHighest", "count": 3} averages the three
 * highest. Needs interval data.
 *
 * @param count how many of the highest are averaged; 1 for the highest itself, 0 for the sum
 */
public record Each(Cut cut, int count, Quantity of) implements Quantity {

    static Quantity read(Written in) {
        Map<String, Cut> cuts = new LinkedHashMap<>();
        for (Cut cut : Cut.values()) {
            cuts.put(cut.key(), cut);
        }
        Map<String, Integer> takes = new LinkedHashMap<>();
        takes.put("sum", 0);
        takes.put("highest", 1);
        takes.put("meanOfHighest", 2);
        Cut cut = in.requiredWord("each", cuts, Cut.HOURS);
        int take = in.requiredWord("take", takes, 0);
        int count = take == 2 ? in.wholeNumber("count", 2, 100) : take;
        return new Each(cut, count, in.quantity("of"));
    }

    @Override
    public Optional<Unit> unit(Scope scope) {
        return of.unit(scope.at("of"));
    }

    @Override
    public Figure value(Facts facts) {
        return inWholeNumbers(facts).orElseGet(() -> inDecimals(facts));
    }

    /** The sum in whole numbers, where that is possible; the same to the last digit, and a hundred times quicker. */
    private Optional<Figure> inWholeNumbers(Facts facts) {
        Optional<CutEnergies> parts = count == 0 ? facts.energies(cut) : Optional.empty();
        try {
            return parts.flatMap(energies -> of.column(energies, facts)
                    .map(column -> Figure.given(column.sum(), column.unit(), how(energies.size()))));
        } catch (ArithmeticException tooLarge) {
            return Optional.empty();
        }
    }

    private Figure inDecimals(Facts facts) {
        List<Figure> figures = facts.each(cut).stream().map(of::value).toList();
        if (figures.isEmpty()) {
            return Figure.given(BigDecimal.ZERO, Unit.NUMBER, "no " + cut.one());
        }
        BigDecimal value;
        if (count == 0) {
            value = figures.stream().map(Figure::value).reduce(BigDecimal.ZERO, BigDecimal::add);
        } else {
            int taken = Math.min(count, figures.size());
            value = figures.stream()
                    .map(Figure::value)
                    .sorted(Comparator.reverseOrder())
                    .limit(taken)
                    .reduce(BigDecimal.ZERO, BigDecimal::add)
                    .divide(BigDecimal.valueOf(taken), Triangle.PRECISION);
        }
        return Figure.given(value, figures.get(0).unit(), how(figures.size()));
    }

    @Override
    public boolean needsBrackets() {
        return true;
    }

    @Override
    public String words() {
        return takeWords() + ", over each " + cut.one() + ", of " + of.words();
    }

    @Override
    public List<Clause> parts() {
        return List.of(of);
    }

    private String how(int parts) {
        return takeWords() + " over " + parts + " " + cut.words();
    }

    private String takeWords() {
        return switch (count) {
            case 0 -> "the sum";
            case 1 -> "the highest";
            default -> "the mean of the " + count + " highest";
        };
    }
}
