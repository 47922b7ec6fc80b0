// SPDX-License-Identifier: Apache-2.0
package tariff.rate;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.function.Consumer;
import org.jspecify.annotations.Nullable;
import tariff.notice.Finding;
import tariff.rate.clause.Clause;
import tariff.rate.clause.Earlier;
import tariff.rate.clause.Line;
import tariff.rate.clause.Named;
import tariff.rate.clause.Scope;
import tariff.rate.clause.Season;

/** Finds everything that is wrong with a rate at once. */
final class RateCheck {
    /** Sets the names of lines apart from those of quantities. */
    private static final String LINE = "line ";

    private RateCheck() {}

    static void check(RateDefinition rate, Consumer<Finding> findings, boolean doubting) {
        if (RateSize.isTooLarge(rate)) {
            findings.accept(RateSize.tooLarge());
            return;
        }
        Scope top = new Scope("", names(rate), List.of(), Set.of(), findings, doubting);
        rate.powerFactors()
                .forEach((name, rule) -> rule.check(top.at("powerFactors").at(name)));
        seasons(rate, top.at("seasons"));
        Scope quantities =
                top.at("quantities").withLines(List.copyOf(top.names().lines()));
        rate.quantities()
                .forEach((name, quantity) ->
                        quantity.unit(quantities.at(name).follow(name).orElseThrow()));
        rate.quantities().keySet().forEach(name -> circular(rate, name, quantities.at(name)));
        lines(rate, top.at("lines"));
    }

    /** A quantity may lean on its own past, not on itself. */
    private static void circular(RateDefinition rate, String name, Scope scope) {
        if (leansOn(rate, rate.quantities().get(name), new LinkedHashSet<>()).contains(name)) {
            scope.error("circular", "\"" + name + "\" is defined through itself; only an earlier month's may be used");
        }
    }

    private static Set<String> leansOn(RateDefinition rate, @Nullable Clause clause, Set<String> names) {
        if (clause == null || clause instanceof Earlier) {
            return names;
        }
        if (clause instanceof Named named && names.add(named.name())) {
            leansOn(rate, rate.quantities().get(named.name()), names);
        }
        clause.parts().forEach(part -> leansOn(rate, part, names));
        for (String base : clause.bases()) {
            if (names.add(LINE + base)) {
                rate.lines().stream()
                        .filter(line -> line.name().equals(base))
                        .forEach(line -> leansOn(rate, line, names));
            }
        }
        return names;
    }

    /** What the rate defines by name. */
    static Scope.Names names(RateDefinition rate) {
        Set<String> lines = new LinkedHashSet<>();
        rate.lines().forEach(line -> lines.add(line.name()));
        return new Scope.Names(
                rate.quantities(),
                rate.powerFactors().keySet(),
                rate.windows().keySet(),
                rate.seasons().keySet(),
                lines);
    }

    private static void lines(RateDefinition rate, Scope scope) {
        List<String> above = new ArrayList<>();
        for (int i = 0; i < rate.lines().size(); i++) {
            Line line = rate.lines().get(i);
            Scope here = scope.at(i).withLines(List.copyOf(above));
            if (above.contains(line.name())) {
                here.at("name").error("line-name", "is the name of two lines: \"" + line.name() + "\"");
            }
            line.check(here);
            line.heading().when().ifPresent(condition -> condition.check(here.at("when")));
            above.add(line.name());
        }
    }

    /** Every day of a year must lie in exactly one season; 2028 is a leap year. */
    private static void seasons(RateDefinition rate, Scope scope) {
        if (rate.seasons().isEmpty()) {
            return;
        }
        for (LocalDate day = LocalDate.of(2028, 1, 1); day.getYear() == 2028; day = day.plusDays(1)) {
            if (seasonsOn(rate, day) == 1) {
                continue;
            }
            LocalDate today = day;
            List<String> holding = rate.seasons().entrySet().stream()
                    .filter(season -> season.getValue().holds(today))
                    .map(Map.Entry<String, Season>::getKey)
                    .toList();
            String date = String.format("%02d-%02d", day.getMonthValue(), day.getDayOfMonth());
            scope.error(
                    "seasons",
                    holding.isEmpty()
                            ? "leave a gap: " + date + " lies in none"
                            : "overlap: " + date + " lies in " + String.join(" and ", holding));
            return;
        }
    }

    private static int seasonsOn(RateDefinition rate, LocalDate day) {
        int holding = 0;
        for (Season season : rate.seasons().values()) {
            holding += season.holds(day) ? 1 : 0;
        }
        return holding;
    }
}
