// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Collections;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import java.util.Set;
import org.jspecify.annotations.Nullable;
import tariff.meter.Cut;
import tariff.meter.CutEnergies;
import tariff.meter.Derivable;
import tariff.meter.MeteredMonth;
import tariff.meter.Period;
import tariff.meter.Readings;
import tariff.meter.Register;
import tariff.meter.Unit;
import tariff.notice.Assumption;
import tariff.notice.Finding;
import tariff.rate.Rate;
import tariff.rate.clause.Facts;
import tariff.rate.clause.Figure;
import tariff.rate.clause.Line;
import tariff.rate.clause.MissingReading;
import tariff.rate.clause.Rounding;

/** One month under one rate, worked out as far as it is asked; what was worked out once is kept. Lives for one question. */
final class Reckoning implements Facts {
    private final Billing billing;
    private final MeteredMonth month;
    private final List<Reckoning> chain;
    private final int place;
    private final Map<String, Figure> quantities = new HashMap<>();
    private final Map<String, Optional<Figure>> powerFactors = new HashMap<>();
    private final Map<String, StatementLine> lines = new HashMap<>();
    private final Set<Assumption> assumptions = new LinkedHashSet<>();
    private @Nullable List<SeasonShare> seasons;

    /** @param chain the months in order; those before {@code place} are this month's past */
    Reckoning(Billing billing, MeteredMonth month, List<Reckoning> chain, int place) {
        this.billing = billing;
        this.month = month;
        this.chain = chain;
        this.place = place;
    }

    Statement statement() {
        List<StatementLine> all =
                rate().lines().stream().map(line -> line(line.name())).toList();
        BigDecimal total = BigDecimal.ZERO;
        for (StatementLine line : all) {
            total = line.shownOnly() ? total : total.add(line.amount());
        }
        BigDecimal rounded = rate().definition().roundTotal().apply(total);
        return new Statement(month, rate().currency(), all, rounded, List.copyOf(assumptions));
    }

    /** What keeps this month from being billed, line by line, each thing once. */
    List<Finding> whatIsMissing() {
        Set<String> messages = new LinkedHashSet<>();
        for (Line line : rate().lines()) {
            try {
                line(line.name());
            } catch (MissingReading missing) {
                messages.add(String.valueOf(missing.getMessage()));
            }
        }
        return messages.stream()
                .map(message -> Finding.error("missing-reading", month.period().toString(), message))
                .toList();
    }

    private Rate rate() {
        return billing.rate();
    }

    private StatementLine line(String name) {
        StatementLine known = lines.get(name);
        if (known == null) {
            known = work(rate().line(name));
            lines.put(name, known);
        }
        return known;
    }

    private StatementLine work(Line line) {
        boolean shownOnly = line.heading().shownOnly();
        if (line.heading().when().isPresent() && !line.heading().when().get().holds(this)) {
            return new StatementLine(line.name(), BigDecimal.ZERO, Optional.empty(), shownOnly);
        }
        Figure exact = line.amount(this);
        Optional<Rounding> rounding =
                line.heading().round().or(() -> rate().definition().roundLines());
        BigDecimal amount = rounding.isPresent() ? rounding.get().apply(exact.value()) : exact.value();
        return new StatementLine(line.name(), amount, Optional.of(exact), shownOnly);
    }

    @Override
    public Period period() {
        return month.period();
    }

    @Override
    public LocalDate statementDate() {
        return month.statementDate().orElse(month.period().last());
    }

    @Override
    public Figure register(Register register, Optional<String> window) {
        Optional<BigDecimal> read = month.get(register, window);
        if (read.isPresent()) {
            return Figure.given(read.get(), register.unit(), register.words());
        }
        Readings given =
                window.isEmpty() ? month.totals() : month.windows().getOrDefault(window.get(), Readings.none());
        if (!given.values().isEmpty()) {
            for (Derivable derivable : Derivable.values()) {
                Optional<BigDecimal> value =
                        derivable.register() == register ? derivable.from(given) : Optional.empty();
                if (value.isPresent()) {
                    assume(new Assumption(
                            derivable.code(), month.period().toString(), derivable.assumed(), derivable.remedy()));
                    return Figure.given(value.get(), register.unit(), derivable.assumed());
                }
            }
        }
        throw new MissingReading(missing(register, window));
    }

    private String missing(Register register, Optional<String> window) {
        if (window.isEmpty()) {
            return "the rate bills " + register.words() + "; the bill does not give \"" + register.key() + "\"";
        }
        String gives = month.totals().has(register) ? "gives only the period's total" : "does not give it";
        return "the rate bills " + register.words() + " in window \"" + window.get() + "\"; the bill " + gives;
    }

    @Override
    public boolean has(Register register, Optional<String> window) {
        return month.get(register, window).isPresent();
    }

    @Override
    public Figure agreed(Unit unit) {
        BigDecimal value = billing.site()
                .agreed(unit)
                .orElseThrow(() ->
                        new MissingReading("the rate bills the agreed " + unit.symbol() + "; the site gives none"));
        return Figure.given(value, unit, "agreed");
    }

    @Override
    public boolean option(String name) {
        return billing.site().options().contains(name);
    }

    @Override
    public Figure named(String name) {
        Figure known = quantities.get(name);
        if (known == null) {
            Figure inner = Objects.requireNonNull(
                            rate().definition().quantities().get(name))
                    .value(this);
            known = new Figure(inner.value(), inner.unit(), name, List.of(inner));
            quantities.put(name, known);
        }
        return known;
    }

    @Override
    public Optional<Figure> powerFactor(String name) {
        Optional<Figure> known = powerFactors.get(name);
        if (known == null) {
            known = Objects.requireNonNull(rate().definition().powerFactors().get(name))
                    .value(this);
            powerFactors.put(name, known);
            if (known.isEmpty()) {
                assume(new Assumption(
                        "no-power-factor",
                        month.period().toString(),
                        "a month without energy has no power factor; clauses that depend on \"" + name
                                + "\" do not apply",
                        "none is needed"));
            }
        }
        return known;
    }

    @Override
    public BigDecimal amount(String line) {
        return line(line).amount();
    }

    @Override
    public List<SeasonShare> seasons() {
        if (seasons == null) {
            seasons = SeasonShares.of(rate(), month.period(), statementDate());
        }
        return seasons;
    }

    @Override
    public List<Reckoning> earlier() {
        List<Reckoning> past = new ArrayList<>(chain.subList(0, place));
        Collections.reverse(past);
        return past;
    }

    @Override
    public List<Reckoning> each(Cut cut) {
        MeteredMonth.Detail detail = month.detail()
                .orElseThrow(() -> new MissingReading("the rate counts by the " + cut.one()
                        + "; the bill gives only totals of the period, so give interval data"));
        try {
            return detail.each(cut).stream()
                    .map(part -> new Reckoning(billing, part, List.of(), 0))
                    .toList();
        } catch (IllegalArgumentException tooCoarse) {
            throw new MissingReading("the rate counts by the " + cut.one() + "; " + tooCoarse.getMessage());
        }
    }

    @Override
    public Optional<CutEnergies> energies(Cut cut) {
        return month.detail().flatMap(detail -> detail.energies(cut));
    }

    @Override
    public void assume(Assumption assumption) {
        assumptions.add(assumption);
    }
}
