// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import tariff.meter.Unit;

/**
 * A function of a power factor. On a line of its own it gives a percentage, in a price it gives money for each unit: one thing, two
 * uses. Written with {@code "powerFactor"} and one of {@code slopes}, {@code bands}, {@code ratioTo}.
 */
public sealed interface Schedule extends Clause permits Bands, RatioTo, Slopes {

    /** The rate's name for the power factor that is looked up. */
    String powerFactor();

    Limits limits();

    /** The value before floor, cap and rounding. */
    BigDecimal plain(BigDecimal powerFactor);

    /** The power factors at which the function changes its course, in rising order. */
    List<BigDecimal> edges();

    /** Reports what is wrong with this kind alone. */
    void checkKind(Scope scope);

    /** As a phrase, with the unit of the value: {@code %} or {@code per kvarh}. */
    String words(String unit);

    default void check(Scope scope) {
        if (!scope.names().powerFactors().contains(powerFactor())) {
            scope.at("powerFactor")
                    .unknown("power factor", powerFactor(), scope.names().powerFactors());
        }
        checkKind(scope);
        limits().check(scope);
        if (scope.doubting()) {
            ScheduleDoubts.check(this, scope);
        }
    }

    /** The value at a power factor, with floor, cap and rounding. */
    default BigDecimal at(BigDecimal powerFactor) {
        return limits().apply(plain(powerFactor));
    }

    /** The value in this month; empty in a month that has no power factor. */
    default Optional<Figure> value(Facts facts) {
        return facts.powerFactor(powerFactor())
                .map(figure -> Figure.of(at(figure.value()), Unit.NUMBER, "for power factor {}", figure));
    }

    @Override
    default List<? extends Clause> parts() {
        return List.of();
    }

    /** A power factor at which a schedule changes its course; 85 for 0.85 is a common slip. */
    static BigDecimal edge(Written in, String key) {
        BigDecimal edge = in.number(key);
        if (edge.signum() <= 0 || edge.compareTo(BigDecimal.ONE) > 0) {
            in.at(key).wrong("power-factor", "is not a power factor", "above 0, at most 1, such as 0.85");
        }
        return edge;
    }

    static Schedule read(Written parent, String key) {
        Written in = parent.at(key);
        if (!in.isObject()) {
            in.wrong(
                    "schedule",
                    "must be a schedule",
                    "an object with \"powerFactor\" and one of: slopes, bands, ratioTo");
            return new Bands("?", List.of(), Limits.none());
        }
        String powerFactor = in.text("powerFactor");
        Limits limits = Limits.read(in);
        Schedule schedule = in.has("slopes")
                ? Slopes.read(in, powerFactor, limits)
                : in.has("bands") ? Bands.read(in, powerFactor, limits) : readRatio(in, powerFactor, limits);
        in.refuseOtherKeys();
        return schedule;
    }

    private static Schedule readRatio(Written in, String powerFactor, Limits limits) {
        if (!in.has("ratioTo")) {
            in.wrong("schedule", "says no kind of schedule", "one of: slopes, bands, ratioTo");
        }
        return in.has("ratioTo") ? RatioTo.read(in, powerFactor, limits) : new Bands(powerFactor, List.of(), limits);
    }
}
