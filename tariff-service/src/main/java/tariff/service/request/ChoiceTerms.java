// SPDX-License-Identifier: Apache-2.0
package tariff.service.request;

import jakarta.validation.constraints.AssertTrue;
import jakarta.validation.constraints.DecimalMax;
import jakarta.validation.constraints.DecimalMin;
import jakarta.validation.constraints.Max;
import jakarta.validation.constraints.Min;
import jakarta.validation.constraints.Size;
import java.math.BigDecimal;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import tariff.rate.clause.Written;

/**
 * Among which banks to choose: any size in increments, or what can be put together from units that can be bought.
 *
 * @param shapes how a bank may be divided
 * @param steps equal switched steps of a bank of any size
 * @param fixedShare part of a mixed bank of any size that is always on
 * @param incrementKvar the difference between sizes; a round one unless said
 * @param mostKvar the largest bank; what the meters read at most unless said
 * @param availableKvar units that can be bought; empty for any size
 * @param mostUnits units that a bank has room for
 * @param make what does not depend on the size
 */
public record ChoiceTerms(
        Set<Shape> shapes,

        @Min(value = 1, message = STEPS) @Max(value = 24, message = STEPS)
        int steps,

        @DecimalMin(value = "0", inclusive = false, message = SHARE)
        @DecimalMax(value = "1", inclusive = false, message = SHARE)
        BigDecimal fixedShare,

        Optional<@DecimalMin(value = "0.01", message = KVAR) @DecimalMax(value = "1000000", message = KVAR) BigDecimal>
                incrementKvar,
        Optional<@DecimalMin(value = "0.01", message = KVAR) @DecimalMax(value = "1000000", message = KVAR) BigDecimal>
                mostKvar,

        @Size(max = 12, message = "at most 12 units to choose from")
        List<@DecimalMin(value = "0.01", message = KVAR) @DecimalMax(value = "1000000", message = KVAR) BigDecimal>
                availableKvar,

        @Min(value = 1, message = UNITS) @Max(value = 24, message = UNITS)
        int mostUnits,

        BankTerms make) {
    static final int USUAL_STEPS = 5;
    static final BigDecimal USUAL_SHARE = new BigDecimal("0.3");
    static final int USUAL_UNITS = 6;
    private static final String STEPS = "1 to 24 steps";
    private static final String UNITS = "1 to 24 units";
    private static final String SHARE = "above 0, below 1";
    private static final String KVAR = "0.01 to 1000000 kvar";
    private static final Set<String> OF_UNITS = Set.of("mostUnits");
    private static final Set<String> OF_ANY_SIZE = Set.of("steps", "fixedShare", "incrementKvar", "mostKvar");

    /** How a bank may be divided. */
    public enum Shape {
        FIXED,
        AUTOMATIC,
        MIXED
    }

    public ChoiceTerms {
        shapes = Set.copyOf(new TreeSet<>(shapes));
        availableKvar = List.copyOf(availableKvar);
    }

    /** Fixed and automatic banks of any size. */
    public static ChoiceTerms usual() {
        return new ChoiceTerms(
                Set.of(Shape.FIXED, Shape.AUTOMATIC),
                USUAL_STEPS,
                USUAL_SHARE,
                Optional.empty(),
                Optional.empty(),
                List.of(),
                USUAL_UNITS,
                BankTerms.plain(BigDecimal.ONE, List.of()));
    }

    static ChoiceTerms read(Written in) {
        if (!in.isObject()) {
            in.wrong("type", "must be an object", "an object with \"shapes\", \"incrementKvar\", \"availableKvar\" …");
            return usual();
        }
        ChoiceTerms terms = new ChoiceTerms(
                in.has("shapes") ? shapes(in) : usual().shapes(),
                in.has("steps") ? in.wholeNumber("steps", 1, 24) : USUAL_STEPS,
                in.optionalNumber("fixedShare").orElse(USUAL_SHARE),
                in.optionalNumber("incrementKvar"),
                in.optionalNumber("mostKvar"),
                in.has("availableKvar")
                        ? in.list("availableKvar").stream().map(Written::number).toList()
                        : List.of(),
                in.has("mostUnits") ? in.wholeNumber("mostUnits", 1, 24) : USUAL_UNITS,
                in.has("make") ? BankTerms.readMake(in.at("make")) : usual().make());
        Set<String> other = in.has("availableKvar") ? OF_ANY_SIZE : OF_UNITS;
        in.keys().stream()
                .filter(other::contains)
                .forEach(key -> in.at(key)
                        .wrong(
                                "not-both",
                                "does not go with this choice",
                                in.has("availableKvar")
                                        ? "\"availableKvar\" and \"mostUnits\" alone"
                                        : "only beside \"availableKvar\""));
        in.refuseOtherKeys();
        return terms;
    }

    private static Set<Shape> shapes(Written in) {
        Map<String, Shape> words = Stream.of(Shape.values())
                .collect(Collectors.toMap(
                        shape -> shape.name().toLowerCase(java.util.Locale.ROOT),
                        shape -> shape,
                        (a, b) -> a,
                        TreeMap::new));
        Set<Shape> shapes = new TreeSet<>();
        in.list("shapes").forEach(each -> shapes.add(each.word(words, Shape.FIXED)));
        return shapes.isEmpty() ? usual().shapes() : shapes;
    }

    @AssertTrue(message = "\"mostKvar\" at least as large as \"incrementKvar\", at most 500 times it")
    boolean isSearchable() {
        if (mostKvar.isEmpty() || incrementKvar.isEmpty() || incrementKvar.get().signum() <= 0) {
            return true;
        }
        BigDecimal most = incrementKvar.get().multiply(BigDecimal.valueOf(Sizes.MOST));
        return mostKvar.get().compareTo(incrementKvar.get()) >= 0
                && mostKvar.get().compareTo(most) <= 0;
    }

    @AssertTrue(message = "one shape or more")
    boolean isShaped() {
        return !shapes.isEmpty();
    }
}
