// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.io.PrintWriter;
import java.math.BigDecimal;
import java.nio.file.Path;
import java.time.ZoneId;
import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import tariff.csv.BillsRead;
import tariff.csv.DateOrder;
import tariff.csv.DecimalMark;
import tariff.csv.ReadingChoices;
import tariff.intervalfile.GapRule;
import tariff.intervalfile.IntervalFileOptions;
import tariff.intervalfile.IntervalReading;
import tariff.intervalfile.StampAt;
import tariff.meter.DemandInterval;
import tariff.meter.MeteredSite;
import tariff.meter.MonthlySums;
import tariff.meter.Register;
import tariff.meter.Site;
import tariff.meter.Unit;
import tariff.meter.WindowCalendar;
import tariff.notice.Finding;
import tariff.notice.Refusal;
import tariff.rate.Rate;

/** The bills or the interval data that a command is given, and what a person knows about the file. */
@SuppressWarnings("NullAway.Init") // picocli fills them in
final class MeterFile {
    private static final long ROWS_WORTH_NEWS = 1_000_000;

    @Parameters(index = "0", paramLabel = "RATE", description = "the rate, a JSON file")
    private Path rate;

    @Parameters(
            index = "1",
            arity = "0..1",
            paramLabel = "BILLS",
            description = "twelve months of bills: JSON, or CSV as a spreadsheet exports it")
    private Optional<Path> bills;

    @Option(names = "--intervals", paramLabel = "FILE", description = "interval data instead of bills: CSV")
    private Optional<Path> intervals;

    @Option(
            names = "--site",
            paramLabel = "NAME",
            description = "what the site is called, where a CSV file cannot say it")
    private Optional<String> name;

    @Option(
            names = "--agreed",
            paramLabel = "UNIT=NUMBER",
            split = ",",
            description = "figures in the contract: kW=900")
    private Map<String, BigDecimal> agreed = Map.of();

    @Option(
            names = "--holds",
            paramLabel = "WORDS",
            description = "what holds for the site: \"primary metered\"; may be repeated")
    private List<String> options = List.of();

    @Option(names = "--dates", paramLabel = "ORDER", description = "how 03/04/2026 is meant: day-first or month-first")
    private Optional<String> dates;

    @Option(names = "--decimal", paramLabel = "MARK", description = "how 1,234 is meant: decimal comma or point")
    private Optional<String> decimal;

    @Option(names = "--zone", paramLabel = "ZONE", description = "the clock of interval data: Europe/Berlin")
    private Optional<ZoneId> zone;

    @Option(names = "--stamps", paramLabel = "END", description = "what the stamps of intervals mark: start or end")
    private Optional<StampAt> stamps;

    @Option(
            names = "--gaps",
            paramLabel = "RULE",
            description = "missing intervals: refuse, leave-out or interpolate (refuse unless said)",
            defaultValue = "refuse")
    private String gaps;

    @Option(
            names = "--demand-minutes",
            paramLabel = "MINUTES",
            description = "what a peak is averaged over; the interval unless said")
    private Optional<Integer> demandMinutes;

    /** Reads what the command was given; how the file was understood is told on {@code err}. */
    Metered read(PrintWriter err) {
        Rate under = Files.rate(rate);
        if (intervals.isPresent() == bills.isPresent()) {
            throw new Refusal(Finding.error("no-meter-file", "", "give either BILLS or --intervals"));
        }
        return intervals.isPresent() ? intervals(under, intervals.get(), err) : bills(under, bills.orElseThrow(), err);
    }

    private Metered bills(Rate under, Path file, PrintWriter err) {
        if (file.toString().toLowerCase(Locale.ROOT).endsWith(".json")) {
            MeteredSite site = Files.bills(file);
            return new Metered(under, completed(site.site()), site.months(), Optional.empty(), List.of());
        }
        BillsRead read = Files.spreadsheet(file, choices(under));
        read.understood().forEach(line -> err.println("read: " + line));
        read.warnings().forEach(err::println);
        return new Metered(under, site(), read.months(), Optional.empty(), List.of());
    }

    private Metered intervals(Rate under, Path file, PrintWriter err) {
        IntervalFileOptions choices = IntervalFileOptions.defaults()
                .gaps(word(gaps, GapRule.class, "--gaps"))
                .progress(rows -> {
                    if (rows >= ROWS_WORTH_NEWS) {
                        err.println("read: " + rows + " rows");
                        err.flush();
                    }
                });
        if (zone.isPresent()) {
            choices = choices.zone(zone.get());
        }
        if (stamps.isPresent()) {
            choices = choices.stampAt(stamps.get());
        }
        if (dates.isPresent()) {
            choices = choices.dateOrder(word(dates.get(), tariff.intervalfile.DateOrder.class, "--dates"));
        }
        IntervalReading read = Files.intervals(file, choices);
        read.warnings().forEach(err::println);
        MonthlySums sums = new MonthlySums(
                read.series(),
                new WindowCalendar(read.series(), under.windows()),
                DemandInterval.block(demandMinutes.orElse(read.series().stepMinutes())),
                under.reads(Register.APPARENT_KVAH));
        return new Metered(under, site(), sums.calendarMonths(), Optional.of(sums), read.assumptions());
    }

    private ReadingChoices choices(Rate under) {
        ReadingChoices choices = ReadingChoices.none()
                .windows(under.windows().keySet().toArray(String[]::new))
                .lines(under.lines().stream().map(line -> line.name()).toArray(String[]::new));
        if (dates.isPresent()) {
            choices = choices.dates(word(dates.get(), DateOrder.class, "--dates"));
        }
        return decimal.isPresent() ? choices.decimal(word(decimal.get(), DecimalMark.class, "--decimal")) : choices;
    }

    private Site site() {
        return completed(Site.unnamed());
    }

    /** A site with what the options say beside it; where both say something, the options hold. */
    private Site completed(Site site) {
        Map<Unit, BigDecimal> figures = new EnumMap<>(Unit.class);
        figures.putAll(site.agreed());
        agreed.forEach((unit, number) -> figures.put(unit(unit), number));
        Set<String> all = new TreeSet<>(site.options());
        all.addAll(options);
        return new Site(name.orElse(site.name()), figures, all);
    }

    private static Unit unit(String symbol) {
        for (Unit unit : Unit.values()) {
            if (unit.symbol().equalsIgnoreCase(symbol)) {
                return unit;
            }
        }
        throw new Refusal(
                Finding.error("word", "--agreed", "is not a unit").found(symbol).allowed("kW, kVA, kvar, kWh"));
    }

    private static <E extends Enum<E>> E word(String written, Class<E> words, String option) {
        for (E each : words.getEnumConstants()) {
            if (each.name().replace('_', '-').equalsIgnoreCase(written)) {
                return each;
            }
        }
        List<String> known = java.util.stream.Stream.of(words.getEnumConstants())
                .map(each -> each.name().replace('_', '-').toLowerCase(Locale.ROOT))
                .toList();
        throw new Refusal(
                Finding.error("word", option, "is not known").found(written).allowed(String.join(", ", known)));
    }
}
