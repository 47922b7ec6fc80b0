// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Pattern;
import tariff.meter.Register;
import tariff.meter.Unit;

/**
 * What a heading means: by its whole name if that is known, else by its unit and the words beside it. Names are remembered,
 * since the search for the header meets the same ones often.
 */
final class HeadingReader {
    private static final int LONGEST_NAME = 120;
    private static final Pattern PER_UNIT = Pattern.compile(
            "(/|\\bper\\b|\\bpro\\b|\\bje\\b|\\bpor\\b|\\bpar\\b)\\s*([kmg]?(wh|varh|vah|w|var|va)|day|tag|jour|dia|giorno|hour)\\b");
    private static final Pattern IN_BRACKETS = Pattern.compile("[(\\[][^)\\]]*[)\\]]");
    private final ReadingChoices choices;
    private final Map<String, Heading> known = new HashMap<>();

    HeadingReader(ReadingChoices choices) {
        this.choices = choices;
    }

    /** @param unitBelow the cell of a row of units under the header, or empty */
    Heading read(String name, String unitBelow) {
        String full = unitBelow.isEmpty() || Words.of(name).containsAll(Words.of(unitBelow))
                ? name
                : name + " (" + unitBelow + ")";
        return known.computeIfAbsent(full, this::read);
    }

    private Heading read(String full) {
        String shown = full.replaceAll("\\s+", " ").strip();
        if (shown.isEmpty()) {
            return Heading.ignored("", "it has no name");
        }
        if (shown.length() > LONGEST_NAME) {
            return Heading.ignored(shown.substring(0, 40) + "…", "its name is a text");
        }
        Parsed parsed = Parsed.of(shown, choices.windows());
        return line(shown, parsed).or(() -> named(shown, parsed)).orElseGet(() -> figure(shown, parsed));
    }

    private Optional<Heading> line(String name, Parsed parsed) {
        List<String> bare = withoutCurrency(Words.of(name));
        Optional<String> line = choices.lines().stream()
                .filter(each -> !Words.of(each).isEmpty()
                        && withoutCurrency(Words.of(each)).equals(bare))
                .findFirst();
        boolean maybeFigure = bare.size() == Words.of(name).size()
                && !parsed.says(Word.MONEY)
                && figure(name, parsed).meaning().isUsed();
        if (line.isPresent() && maybeFigure) {
            return Optional.of(Heading.doubtful(
                    name,
                    "it may be the figure of the meter or the amount of the rate's line; write the unit or the currency"
                            + " into the name"));
        }
        return line.map(found -> Heading.of(name, new Meaning.Line(found)));
    }

    private static Optional<Heading> named(String name, Parsed parsed) {
        if (!parsed.units().isEmpty()) {
            return Optional.empty();
        }
        String whole = String.join(" ", withoutCurrency(Words.of(name)));
        String outside = String.join(
                " ", withoutCurrency(Words.of(IN_BRACKETS.matcher(name).replaceAll(" "))));
        return Optional.ofNullable(NamedColumns.byName()
                        .getOrDefault(whole, NamedColumns.byName().get(outside)))
                .map(known -> Heading.of(name, known.meaning()).rank(known.rank()));
    }

    private static List<String> withoutCurrency(List<String> words) {
        return words.stream().filter(word -> !Currencies.WORDS.contains(word)).toList();
    }

    private static Heading figure(String name, Parsed parsed) {
        if (PER_UNIT.matcher(Words.plain(name)).find()) {
            return Heading.ignored(name, "a price or a rate per unit");
        }
        if (parsed.says(Word.MONEY)) {
            return Heading.ignored(name, "an amount of money that is neither the bill's total nor a line of the rate");
        }
        if (parsed.says(Word.AGREED)) {
            return Heading.ignored(name, "a figure of the contract, not of the month");
        }
        if (parsed.says(Word.NOT_THE_MONTH)) {
            return Heading.ignored(name, "not the month's own figure");
        }
        if (parsed.units().size() > 1) {
            return Heading.doubtful(name, "it names more than one unit; write one column for each");
        }
        if (parsed.says(Word.POWER_FACTOR)) {
            return powerFactor(name, parsed);
        }
        return parsed.units().isEmpty() ? UnitlessHeading.of(name, parsed) : measured(name, parsed);
    }

    private static Heading powerFactor(String name, Parsed parsed) {
        if (!parsed.units().isEmpty()) {
            return Heading.doubtful(name, "it names a power factor and the unit of something else");
        }
        if (parsed.says(Word.LEADING)) {
            return Heading.doubtful(name, "a leading power factor has no register of its own; give leading kvarh");
        }
        return finish(name, parsed, Register.POWER_FACTOR).percent(parsed.says(Word.PER_CENT));
    }

    private static Heading measured(String name, Parsed parsed) {
        UnitWord unit = parsed.units().get(0);
        boolean energy = unit.unit().dimension() == Unit.Dimension.ENERGY;
        if (parsed.says(Word.AVERAGE)) {
            return Heading.ignored(name, "an average or a lowest figure");
        }
        if (energy && parsed.says(Word.DEMAND)) {
            return Heading.doubtful(
                    name, "it says demand, yet " + unit.unit().symbol() + " count energy; write kW or kVA");
        }
        if (!energy
                && (parsed.says(Word.ENERGY) || parsed.says(Word.REACTIVE))
                && !parsed.says(Word.DEMAND)
                && !parsed.says(Word.PEAK)) {
            return Heading.doubtful(
                    name,
                    "it says energy, yet " + unit.unit().symbol() + " is a unit of demand; write "
                            + unit.unit().symbol() + "h if energy is meant");
        }
        if (parsed.window().isEmpty() && (parsed.says(Word.PART_OF_DAY) || (energy && parsed.says(Word.PEAK)))) {
            return Heading.doubtful(name, "it names a part of the day that is no window of the rate");
        }
        if (parsed.window().isPresent()
                && !energy
                && Words.of(parsed.window().get()).equals(List.of("peak"))
                && !parsed.says(Word.DEMAND)) {
            return Heading.ignored(name, "it can be read in two ways")
                    .error(
                            "heading-ambiguous",
                            "may be the month's highest " + unit.unit().symbol()
                                    + " or the one in the window \"peak\"; "
                                    + "write \"Max " + unit.unit().symbol() + "\" or \"Max "
                                    + unit.unit().symbol()
                                    + " peak\"");
        }
        return register(unit.unit(), parsed)
                .map(register -> finish(name, parsed, register).factor(unit.factor()))
                .orElseGet(() -> Heading.doubtful(name, "it does not say which way the energy flows"));
    }

    private static Optional<Register> register(Unit unit, Parsed parsed) {
        boolean leading = parsed.says(Word.LEADING);
        boolean export = parsed.says(Word.EXPORT);
        if ((leading && parsed.says(Word.LAGGING)) || (export && unit != Unit.KWH)) {
            return Optional.empty();
        }
        return Optional.of(
                switch (unit) {
                    case KVARH -> leading ? Register.LEADING_KVARH : Register.LAGGING_KVARH;
                    case KVAH -> Register.APPARENT_KVAH;
                    case KW -> Register.PEAK_KW;
                    case KVA -> Register.PEAK_KVA;
                    case KVAR -> leading ? Register.PEAK_LEADING_KVAR : Register.PEAK_LAGGING_KVAR;
                    default -> export ? Register.EXPORTED_KWH : Register.ENERGY_KWH;
                });
    }

    /** A heading that is read, with what else it says. */
    static Heading finish(String name, Parsed parsed, Register register) {
        Heading heading = Heading.of(name, new Meaning.Reading(register, parsed.window()));
        if (!parsed.rest().isEmpty()) {
            return heading.rank(2)
                    .remark(
                            "heading-says-more",
                            "is read as " + register.words() + "; nothing is made of \""
                                    + String.join(" ", parsed.rest()) + "\" in its name");
        }
        if (register.isPeak() && parsed.says(Word.BILLED) && !saysHighest(name)) {
            return heading.rank(1)
                    .remark(
                            "billed-demand",
                            "is read as the month's highest " + register.words()
                                    + "; a billed demand may already be raised"
                                    + " for low power factor or held up by earlier months");
        }
        return heading;
    }

    private static boolean saysHighest(String name) {
        return Words.of(name).stream()
                .anyMatch(word -> word.startsWith("max")
                        || word.startsWith("mass")
                        || word.startsWith("hoch")
                        || List.of("peak", "highest", "metered", "measured", "md")
                                .contains(word));
    }
}
