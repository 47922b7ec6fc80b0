// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Consumer;
import tariff.meter.Unit;
import tariff.notice.Finding;

/**
 * Where in a rate a clause stands, and what it may refer to there. Clauses report what is wrong with them to it.
 *
 * @param pointer JSON Pointer of the clause
 * @param names what the rate defines
 * @param lines the lines above, which percentages, floors and amounts may name
 * @param following names of quantities being looked into, to find one that is defined through itself
 * @param findings where findings go
 * @param doubting whether it is also looked for what is allowed but may not be meant
 */
public record Scope(
        String pointer,
        Names names,
        List<String> lines,
        Set<String> following,
        Consumer<Finding> findings,
        boolean doubting) {

    /** What a rate defines by name. */
    public record Names(
            Map<String, Quantity> quantities,
            Set<String> powerFactors,
            Set<String> windows,
            Set<String> seasons,
            Set<String> lines) {}

    public Scope at(String key) {
        return new Scope(
                pointer + "/" + key.replace("~", "~0").replace("/", "~1"), names, lines, following, findings, doubting);
    }

    public Scope at(int index) {
        return at(String.valueOf(index));
    }

    /** The same place, with other lines above. */
    public Scope withLines(List<String> above) {
        return new Scope(pointer, names, above, following, findings, doubting);
    }

    public void error(String code, String message) {
        findings.accept(Finding.error(code, pointer, message));
    }

    public void error(String code, String message, String found, String allowed) {
        findings.accept(Finding.error(code, pointer, message).found(found).allowed(allowed));
    }

    public void warn(String code, String message) {
        findings.accept(Finding.warning(code, pointer, message));
    }

    /** Reports a name that the rate does not define, with the nearest it does. */
    public void unknown(String what, String name, java.util.Collection<String> known) {
        error(
                "unknown-name",
                "there is no " + what + " \"" + name + "\"" + Nearest.hint(name, known),
                name,
                Nearest.list(known));
    }

    /** The unit of a quantity that must compare with {@code expected}; {@code subject} says whose unit that is. */
    public void expect(Quantity quantity, Optional<Unit> expected, String subject) {
        Optional<Unit> unit = quantity.unit(this);
        if (unit.isPresent() && expected.isPresent() && !unit.get().comparesWith(expected.get())) {
            error(
                    "unit",
                    "is in " + unitWords(unit.get()) + "; " + subject + " " + unitWords(expected.get())
                            + ", so this must be " + unitWords(expected.get()));
        }
    }

    public void checkWindow(Optional<String> window) {
        window.filter(name -> !names.windows().contains(name))
                .ifPresent(name -> at("in").unknown("window", name, names.windows()));
    }

    /** The scope for looking into a named quantity, or empty if it is being looked into already. */
    public Optional<Scope> follow(String name) {
        if (following.contains(name)) {
            return Optional.empty();
        }
        java.util.TreeSet<String> more = new java.util.TreeSet<>(following);
        more.add(name);
        return Optional.of(new Scope(pointer, names, lines, more, findings, doubting));
    }

    /** The same place, where findings have been made already and are not to be made again. */
    Scope silent() {
        return new Scope(pointer, names, lines, following, finding -> {}, false);
    }

    static String unitWords(Unit unit) {
        return unit == Unit.NUMBER ? "a plain number" : unit.symbol();
    }
}
