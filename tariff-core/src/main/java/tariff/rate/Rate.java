// SPDX-License-Identifier: Apache-2.0
package tariff.rate;

import java.time.LocalDate;
import java.time.ZoneId;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import org.jspecify.annotations.Nullable;
import tariff.meter.DemandInterval;
import tariff.meter.IntervalSeries;
import tariff.meter.MonthlySums;
import tariff.meter.ReadingDay;
import tariff.meter.Register;
import tariff.meter.Window;
import tariff.meter.WindowCalendar;
import tariff.notice.Finding;
import tariff.notice.Findings;
import tariff.notice.Refusal;
import tariff.rate.clause.Clause;
import tariff.rate.clause.Each;
import tariff.rate.clause.Earlier;
import tariff.rate.clause.Line;
import tariff.rate.clause.Metered;
import tariff.rate.clause.Named;
import tariff.rate.clause.Scope;
import tariff.rate.clause.Written;

/** A rate that has been checked: one that exists can be billed with. */
public final class Rate {
    private final RateDefinition definition;
    private final RateSource source;
    private final Map<String, Line> lines;
    private final List<Clause> clauses;
    private final SeasonCalendar seasons;

    private Rate(RateDefinition definition, RateSource source) {
        this.definition = definition;
        this.source = source;
        Map<String, Line> byName = new LinkedHashMap<>();
        definition.lines().forEach(line -> byName.put(line.name(), line));
        this.lines = Collections.unmodifiableMap(byName);
        this.clauses = Stream.concat(definition.lines().stream(), definition.quantities().values().stream())
                .flatMap(Clause::all)
                .toList();
        this.seasons = new SeasonCalendar(definition.seasons());
    }

    /**
     * Checks a rate as it stands in a file.
     *
     * @param file maps, lists, texts, decimals, true and false, as a JSON document holds them
     * @return everything that is wrong; or, if nothing is, the rate and everything that is doubtful
     */
    public static Checked check(@Nullable Object file) {
        return check(file, true);
    }

    /** @param doubting whether to look for what is doubtful too, which takes longer than all the rest */
    static Checked check(@Nullable Object file, boolean doubting) {
        Findings findings = new Findings();
        Written written = new Written(file, "", findings);
        if (!written.isObject()) {
            written.wrong("type", "must be a rate", "an object with \"name\", \"currency\" and \"lines\"");
            return new Checked(Optional.empty(), findings.list());
        }
        RateDefinition definition = RateDefinition.read(written);
        RateCheck.check(definition, findings, doubting);
        boolean usable = !findings.hasErrors();
        if (usable && doubting) {
            RateDoubts.check(definition, findings);
        }
        List<Finding> found = findings.list().stream()
                .filter(finding -> usable || finding.isError())
                .toList();
        return new Checked(usable ? Optional.of(new Rate(definition, RateSource.of(file))) : Optional.empty(), found);
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

    /** The rate as it was written, to write it otherwise. */
    public RateSource source() {
        return source;
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

    /** Whether a month's bill depends on the hours, days or other parts inside it. */
    public boolean looksInside() {
        return clauses(Each.class).findAny().isPresent();
    }

    /** The registers that a clause counts in this month, through the quantities it names; the past is left out. */
    public Set<Metered> registers(Clause clause) {
        Set<Metered> registers = new LinkedHashSet<>();
        collect(clause, registers);
        return registers;
    }

    private void collect(@Nullable Clause clause, Set<Metered> registers) {
        if (clause == null || clause instanceof Earlier) {
            return;
        }
        if (clause instanceof Metered metered) {
            registers.add(metered);
        }
        if (clause instanceof Named named) {
            collect(definition.quantities().get(named.name()), registers);
        }
        clause.parts().forEach(part -> collect(part, registers));
    }

    /** The rate's windows by name. */
    public Map<String, Window> windows() {
        return definition.windows();
    }

    /** The clock that the rate goes by. */
    public ZoneId zone() {
        return definition.zone();
    }

    /** Whether a bill under this rate looks at a register, directly or through a power factor. */
    public boolean reads(Register register) {
        return clauses(Metered.class).anyMatch(each -> each.register() == register)
                || definition.powerFactors().values().stream()
                        .anyMatch(rule -> rule.registers().contains(register));
    }

    /** Calendar months of a series as this rate reads them, with demands over one of its intervals. */
    public MonthlySums sums(IntervalSeries series) {
        return sums(series, DemandInterval.block(series.stepMinutes()), ReadingDay.FIRST_OF_MONTH);
    }

    /**
     * The billing periods of a series as this rate reads them: its windows, and kVAh only if it asks for any.
     *
     * @throws IllegalArgumentException if the series cannot give such a demand
     */
    public MonthlySums sums(IntervalSeries series, DemandInterval demand, ReadingDay readOn) {
        return new MonthlySums(
                series, new WindowCalendar(series, windows()), demand, readOn, reads(Register.APPARENT_KVAH));
    }

    /** The name of the season that a day lies in; the rate must define seasons. */
    public String season(LocalDate day) {
        return seasons.of(day);
    }

    /** The rate in plain words, clause by clause, worked out from what computes it. */
    public RateWords words() {
        return RateWords.of(
                definition,
                new Scope(
                        "", RateCheck.names(definition), List.copyOf(lines.keySet()), Set.of(), finding -> {}, false));
    }

    /**
     * What a check found.
     *
     * @param rate the rate, if there is no error
     * @param findings errors, or warnings if there is no error
     */
    public record Checked(Optional<Rate> rate, List<Finding> findings) {
        public Checked {
            findings = List.copyOf(findings);
        }
    }
}
