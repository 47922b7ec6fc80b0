// SPDX-License-Identifier: Apache-2.0
package tariff.rate;

import java.time.LocalDate;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.time.format.DateTimeParseException;
import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import tariff.meter.Window;
import tariff.rate.clause.Line;
import tariff.rate.clause.PowerFactorRule;
import tariff.rate.clause.Quantity;
import tariff.rate.clause.QuantityKinds;
import tariff.rate.clause.Rounding;
import tariff.rate.clause.Season;
import tariff.rate.clause.Written;

/**
 * What stands in a rate file, and may be wrong.
 *
 * @param name the rate's name on the sheet
 * @param currency ISO 4217 code
 * @param validFrom the first day it applies
 * @param source where the rate was printed
 * @param follows which published family of rules it follows, for rates that serve as examples
 * @param powerFactors power factors by the names that clauses use
 * @param zone the clock that the rate goes by, UTC if it names none
 * @param windows windows of the day and week by name
 * @param seasons parts of the year by name
 * @param seasonBy which day decides the season of a period
 * @param quantities quantities defined once and used by name
 * @param lines the lines of the bill in order
 * @param roundLines how each line is rounded; empty for not at all
 * @param roundTotal how the total is rounded, to the cent unless written
 */
public record RateDefinition(
        String name,
        String currency,
        Optional<LocalDate> validFrom,
        Optional<String> source,
        Optional<String> follows,
        Map<String, PowerFactorRule> powerFactors,
        ZoneId zone,
        Map<String, Window> windows,
        Map<String, Season> seasons,
        SeasonBy seasonBy,
        Map<String, Quantity> quantities,
        List<Line> lines,
        Optional<Rounding> roundLines,
        Rounding roundTotal) {

    public RateDefinition {
        powerFactors = Collections.unmodifiableMap(new LinkedHashMap<>(powerFactors));
        windows = Collections.unmodifiableMap(new LinkedHashMap<>(windows));
        seasons = Collections.unmodifiableMap(new LinkedHashMap<>(seasons));
        quantities = Collections.unmodifiableMap(new LinkedHashMap<>(quantities));
        lines = List.copyOf(lines);
    }

    /** Reads what can be read; everything that is wrong goes to where {@code in} reports its findings. */
    static RateDefinition read(Written in) {
        RateDefinition definition = new RateDefinition(
                in.text("name"),
                currency(in),
                day(in, "validFrom"),
                in.optionalText("source"),
                in.optionalText("follows"),
                in.named("powerFactors", PowerFactorRule::read),
                zone(in),
                windows(in),
                in.named("seasons", Season::read),
                in.word("seasonBy", SeasonBy.WORDS, SeasonBy.DAYS),
                in.named("quantities", QuantityKinds::read),
                lines(in),
                roundLines(in),
                in.has("roundTotal") ? Rounding.readOptional(in, "roundTotal").orElseThrow() : Rounding.toTheCent());
        in.refuseOtherKeys();
        return definition;
    }

    private static Map<String, Window> windows(Written in) {
        Set<LocalDate> holidays = new TreeSet<>();
        for (Written each : in.has("holidays") ? in.list("holidays") : List.<Written>of()) {
            try {
                holidays.add(LocalDate.parse(each.text()));
            } catch (DateTimeParseException e) {
                each.wrong("date", "is not a day", "a day such as 2026-01-01");
            }
        }
        return in.named("windows", window -> WindowClause.read(window, holidays));
    }

    private static ZoneId zone(Written in) {
        if (!in.has("timeZone")) {
            return ZoneId.of("UTC");
        }
        String name = in.text("timeZone");
        if (!ZoneId.getAvailableZoneIds().contains(name)) {
            in.at("timeZone")
                    .wrong("time-zone", "is not a time zone", "a name such as Europe/Berlin (IANA time zone database)");
            return ZoneOffset.UTC;
        }
        return ZoneId.of(name);
    }

    private static List<Line> lines(Written in) {
        List<Line> lines = new ArrayList<>();
        List<String> counted = new ArrayList<>();
        for (Written each : in.list("lines")) {
            Line line = Line.read(each, counted);
            lines.add(line);
            if (!line.heading().shownOnly()) {
                counted.add(line.name());
            }
        }
        return lines;
    }

    private static Optional<Rounding> roundLines(Written in) {
        if (in.has("roundLines") && in.at("roundLines").isText()) {
            in.word("roundLines", Map.of("not", true), true);
            return Optional.empty();
        }
        return in.has("roundLines") ? Rounding.readOptional(in, "roundLines") : Optional.of(Rounding.toTheCent());
    }

    private static String currency(Written in) {
        String currency = in.text("currency");
        if (!currency.equals("?") && !currency.matches("[A-Z]{3}")) {
            in.at("currency")
                    .wrong("currency", "is not a currency code", "three capital letters, such as EUR (ISO 4217)");
        }
        return currency;
    }

    private static Optional<LocalDate> day(Written in, String key) {
        Optional<String> text = in.optionalText(key);
        try {
            return text.map(LocalDate::parse);
        } catch (DateTimeParseException e) {
            in.at(key).wrong("date", "is not a day", "a day such as 2026-01-01");
            return Optional.empty();
        }
    }
}
