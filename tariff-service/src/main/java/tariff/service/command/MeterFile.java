// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.io.PrintWriter;
import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeSet;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import tariff.csv.BillsFile;
import tariff.csv.BillsRead;
import tariff.csv.DateOrder;
import tariff.csv.DecimalMark;
import tariff.csv.ReadingChoices;
import tariff.intervalfile.IntervalReading;
import tariff.json.BillsJson;
import tariff.meter.MeteredSite;
import tariff.meter.MonthlySums;
import tariff.meter.Site;
import tariff.meter.Unit;
import tariff.notice.Finding;
import tariff.notice.Refusal;
import tariff.rate.Rate;
import tariff.service.request.IntervalTerms;

/** The rate and the bills or interval data that a command is given, and what those files may leave out. */
@SuppressWarnings("NullAway.Init") // picocli fills them in
final class MeterFile {
    @Parameters(index = "0", paramLabel = "RATE", description = "the rate, a JSON file")
    private Path rate;

    @Parameters(
            index = "1",
            arity = "0..1",
            paramLabel = "BILLS",
            description = "the months: a JSON file with the site, or a table as a spreadsheet exports it")
    private Optional<Path> bills;

    @Option(
            names = "--intervals",
            paramLabel = "FILE",
            description = "interval data in place of BILLS: a table, or a feed of NAESB REQ.21 in XML")
    private Optional<Path> intervals;

    @Option(names = "--site", paramLabel = "NAME", description = "what the site is called")
    private Optional<String> name;

    @Option(
            names = "--agreed",
            paramLabel = "UNIT=NUMBER",
            description = "a figure agreed with the utility: kW=450, kVA=500")
    private Map<Unit, BigDecimal> agreed = Map.of();

    @Option(names = "--option", paramLabel = "WORDS", description = "what holds for the site: \"primary metered\"")
    private List<String> options = List.of();

    @Option(
            names = "--dates",
            description = "the order of dates in a table, if it does not show it: day-first or month-first")
    private Optional<DateOrder> dates;

    @Option(names = "--decimal", description = "the decimal mark of a table, if it does not show it: comma or point")
    private Optional<DecimalMark> decimal;

    @Mixin
    private IntervalOptions said;

    @Spec(Spec.Target.MIXEE)
    private CommandSpec command;

    /** Reads the files; how they were understood is told on {@code notes}. */
    Metered read(PrintWriter notes) {
        if (intervals.isPresent() == bills.isPresent()) {
            throw new Refusal(Finding.error("no-meter-file", "", "give either BILLS or --intervals"));
        }
        if (bills.isPresent()) {
            said.refuseBesideBills(command.commandLine().getParseResult());
        }
        Rate under = Files.rate(rate);
        Metered read = intervals.isPresent()
                ? intervals(under, intervals.get(), notes)
                : bills(under, bills.orElseThrow(), notes);
        notes.flush();
        return read;
    }

    /** A rate names windows and lines that a table of bills may have columns for. */
    private Metered bills(Rate under, Path file, PrintWriter notes) {
        MeteredSite read =
                Files.read(file, bytes -> isJson(bytes) ? BillsJson.read(bytes) : table(bytes, under, notes));
        return new Metered(under, completed(read.site()), read.months(), Optional.empty(), List.of());
    }

    private static boolean isJson(byte[] bytes) {
        String text = new String(bytes, StandardCharsets.UTF_8).stripLeading();
        return text.startsWith("{") || text.startsWith("[");
    }

    private MeteredSite table(byte[] bytes, Rate under, PrintWriter notes) {
        List<String> lines = under.lines().stream().map(line -> line.name()).toList();
        List<String> windows = List.copyOf(under.windows().keySet());
        BillsRead read = BillsFile.read(bytes, new ReadingChoices(dates, decimal, windows, lines));
        read.understood().forEach(notes::println);
        read.warnings().forEach(notes::println);
        return new MeteredSite(Site.unnamed(), read.months());
    }

    private Metered intervals(Rate under, Path file, PrintWriter notes) {
        IntervalTerms terms = said.terms(dates, notes);
        IntervalReading read = Files.intervals(file, terms.file());
        read.warnings().forEach(notes::println);
        MonthlySums sums = terms.sums(read.series(), under);
        return new Metered(under, completed(Site.unnamed()), sums.months(), Optional.of(sums), read.assumptions(sums));
    }

    private Site completed(Site site) {
        Map<Unit, BigDecimal> figures = new EnumMap<>(Unit.class);
        figures.putAll(site.agreed());
        figures.putAll(agreed);
        TreeSet<String> all = new TreeSet<>(site.options());
        all.addAll(options);
        return new Site(name.orElse(site.name()), figures, all);
    }
}
