// SPDX-License-Identifier: Apache-2.0
package tariff.rate;

import java.math.BigDecimal;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import tariff.meter.Period;
import tariff.notice.Finding;
import tariff.notice.Findings;
import tariff.notice.Refusal;
import tariff.rate.clause.Clause;
import tariff.rate.clause.Earlier;
import tariff.rate.clause.Line;
import tariff.rate.clause.Scope;
import tariff.rate.clause.Written;

/** A rate that has been checked: one that exists can be billed with. */
public final class Rate {
    private final RateDefinition definition;
    private final Map<String, Line> lines;
    private final List<Clause> clauses;

    private Rate(RateDefinition definition) {
        this.definition = definition;
        Map<String, Line> byName = new LinkedHashMap<>();
        definition.lines().forEach(line -> byName.put(line.name(), line));
        this.lines = Collections.unmodifiableMap(byName);
        this.clauses = Stream.concat(definition.lines().stream(), definition.quantities().values().stream())
                .flatMap(Clause::all)
                .toList();
    }

    /**
     * Checks a rate as it stands in a file.
     *
     * @param file maps, lists, texts, decimals, true and false, as a JSON document holds them
     * @return everything that is wrong or doubtful, and the rate if nothing is wrong
     */
    public static Checked check(@Nullable Object file) {
        Findings findings = new Findings();
        Written written = new Written(file, "", findings);
        if (!written.isObject()) {
            written.wrong("type", "must be a rate", "an object with \"name\", \"currency\" and \"lines\"");
            return new Checked(Optional.empty(), findings.list());
        }
        RateDefinition definition = RateDefinition.read(written);
        RateCheck.check(definition, findings);
        boolean usable = !findings.hasErrors();
        if (usable) {
            RateDoubts.check(definition, findings);
        }
        return new Checked(usable ? Optional.of(new Rate(definition)) : Optional.empty(), findings.list());
    }

    /**
     * The rate in a file.
     *
     * @throws Refusal with everything that is wrong
     */
    public static Rate of(@Nullable Object file) {
        Checked checked = check(file);
        return checked.rate().orElseThrow(() -> new Refusal(checked.findings()));
    }

    public RateDefinition definition() {
        return definition;
    }

    public String name() {
        return definition.name();
    }

    public String currency() {
        return definition.currency();
    }

    public List<Line> lines() {
        return definition.lines();
    }

    /** A line by its name, which must be one of the rate's. */
    public Line line(String name) {
        return Objects.requireNonNull(lines.get(name), name);
    }

    /** Every clause of one kind, wherever in the rate it stands. */
    public <T extends Clause> Stream<T> clauses(Class<T> kind) {
        return clauses.stream().filter(kind::isInstance).map(kind::cast);
    }

    /** Whether a month's bill depends on the months before it. */
    public boolean looksBack() {
        return clauses(Earlier.class).findAny().isPresent();
    }

    /** The hours of one of the rate's windows in a period; empty if the rate does not define it. */
    public Optional<BigDecimal> hours(Period period, String window) {
        return Optional.ofNullable(definition.windows().get(window)).map(each -> each.hours(period));
    }

    /** The rate in plain words, clause by clause, worked out from what computes it. */
    public RateWords words() {
        return RateWords.of(
                definition,
                new Scope("", RateCheck.names(definition), List.copyOf(lines.keySet()), Set.of(), finding -> {}));
    }

    /**
     * What a check found.
     *
     * @param rate the rate, if there is no error
     * @param findings errors and warnings in the order of the file
     */
    public record Checked(Optional<Rate> rate, List<Finding> findings) {
        public Checked {
            findings = List.copyOf(findings);
        }
    }
}
