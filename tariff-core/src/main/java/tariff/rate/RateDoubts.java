// SPDX-License-Identifier: Apache-2.0
package tariff.rate;

import java.util.LinkedHashSet;
import java.util.Optional;
import java.util.Set;
import java.util.function.Consumer;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import tariff.notice.Finding;
import tariff.rate.clause.Clause;
import tariff.rate.clause.Line;
import tariff.rate.clause.Metered;
import tariff.rate.clause.Named;
import tariff.rate.clause.PowerFactorRule;
import tariff.rate.clause.Schedule;
import tariff.rate.clause.Scope;

/** Warns of what is allowed in a whole rate but may not be meant; what a clause can tell by itself, it tells when it is checked. */
final class RateDoubts {
    private RateDoubts() {}

    static void check(RateDefinition rate, Consumer<Finding> findings) {
        Scope top = new Scope("", RateCheck.names(rate), java.util.List.of(), Set.of(), findings, true);
        linesThatAskNothing(rate, top.at("lines"));
        Set<Clause> clauses = Stream.concat(rate.lines().stream(), rate.quantities().values().stream())
                .flatMap(Clause::all)
                .collect(Collectors.toCollection(LinkedHashSet::new));
        unused("power factor", rate.powerFactors().keySet(), powerFactors(clauses), top.at("powerFactors"));
        unused("window", rate.windows().keySet(), windows(rate, clauses), top.at("windows"));
        unused("quantity", rate.quantities().keySet(), quantities(rate), top.at("quantities"));
        if (!rate.seasons().isEmpty() && clauses.stream().noneMatch(Clause::looksAtSeasons)) {
            top.at("seasons").warn("unused", "are defined, but no price and no condition looks at them");
        }
    }

    private static void linesThatAskNothing(RateDefinition rate, Scope scope) {
        Set<String> nothing = new LinkedHashSet<>();
        for (int i = 0; i < rate.lines().size(); i++) {
            Line line = rate.lines().get(i);
            Optional<String> why = line.asksNothing(nothing);
            if (why.isPresent()) {
                nothing.add(line.name());
                scope.at(i).warn("asks-nothing", why.get());
            }
        }
    }

    private static void unused(String what, Set<String> defined, Set<String> used, Scope scope) {
        defined.stream()
                .filter(name -> !used.contains(name))
                .forEach(name -> scope.at(name).warn("unused", "is a " + what + " that nothing in the rate uses"));
    }

    private static Set<String> powerFactors(Set<Clause> clauses) {
        return clauses.stream()
                .filter(Schedule.class::isInstance)
                .map(clause -> ((Schedule) clause).powerFactor())
                .collect(Collectors.toSet());
    }

    private static Set<String> windows(RateDefinition rate, Set<Clause> clauses) {
        return Stream.concat(
                        rate.powerFactors().values().stream().map(PowerFactorRule::window),
                        clauses.stream().filter(Metered.class::isInstance).map(clause -> ((Metered) clause).window()))
                .flatMap(Optional::stream)
                .collect(Collectors.toSet());
    }

    /** A quantity that only looks at its own past is not used by that. */
    private static Set<String> quantities(RateDefinition rate) {
        Stream<String> inLines = rate.lines().stream().flatMap(RateDoubts::names);
        Stream<String> inQuantities = rate.quantities().entrySet().stream()
                .flatMap(each -> names(each.getValue()).filter(name -> !name.equals(each.getKey())));
        return Stream.concat(inLines, inQuantities).collect(Collectors.toSet());
    }

    private static Stream<String> names(Clause clause) {
        return clause.all().filter(Named.class::isInstance).map(each -> ((Named) each).name());
    }
}
