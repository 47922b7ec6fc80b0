// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.io.PrintWriter;
import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeSet;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import tariff.csv.BillsFile;
import tariff.csv.BillsRead;
import tariff.csv.DateOrder;
import tariff.csv.DecimalMark;
import tariff.csv.ReadingChoices;
import tariff.json.BillsJson;
import tariff.meter.MeteredSite;
import tariff.meter.Site;
import tariff.meter.Unit;
import tariff.rate.Rate;

/** The rate and the bills that a command is given, the bills in any kind of file, and what that file may leave out. */
@SuppressWarnings("NullAway.Init") // picocli fills them in
final class RateAndBills {
    @Parameters(index = "0", paramLabel = "RATE", description = "the rate, a JSON file")
    private Path rate;

    @Parameters(
            index = "1",
            paramLabel = "BILLS",
            description = "the months: a JSON file with the site, or a table as a spreadsheet exports it")
    private Path bills;

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

    Rate rate() {
        return Files.rate(rate);
    }

    /** Reads the bills for a rate, whose windows and lines a table may name; how a table was read goes to {@code notes}. */
    MeteredSite bills(Rate under, PrintWriter notes) {
        MeteredSite read =
                Files.read(bills, bytes -> isJson(bytes) ? BillsJson.read(bytes) : table(bytes, under, notes));
        return new MeteredSite(completed(read.site()), read.months());
    }

    private static boolean isJson(byte[] bytes) {
        String text = new String(bytes, StandardCharsets.UTF_8).stripLeading();
        return text.startsWith("{") || text.startsWith("[");
    }

    private MeteredSite table(byte[] bytes, Rate under, PrintWriter notes) {
        List<String> lines = under.lines().stream().map(line -> line.name()).toList();
        List<String> windows = new ArrayList<>(under.definition().windows().keySet());
        BillsRead read = BillsFile.read(bytes, new ReadingChoices(dates, decimal, windows, lines));
        read.understood().forEach(notes::println);
        read.warnings().forEach(notes::println);
        notes.flush();
        return new MeteredSite(Site.unnamed(), read.months());
    }

    private Site completed(Site site) {
        Map<Unit, BigDecimal> figures = new EnumMap<>(Unit.class);
        figures.putAll(site.agreed());
        figures.putAll(agreed);
        TreeSet<String> all = new TreeSet<>(site.options());
        all.addAll(options);
        return new Site(site.name(), figures, all);
    }
}
