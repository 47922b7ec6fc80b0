// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.io.PrintWriter;
import java.time.ZoneId;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParseResult;
import picocli.CommandLine.Spec;
import tariff.csv.DateOrder;
import tariff.intervalfile.GapRule;
import tariff.intervalfile.IntervalFileOptions;
import tariff.intervalfile.Role;
import tariff.intervalfile.StampAt;
import tariff.notice.Finding;
import tariff.notice.Refusal;
import tariff.service.request.Declared;
import tariff.service.request.IntervalTerms;

/** What interval data may leave out, and what the bill makes of them. */
@SuppressWarnings("NullAway.Init") // picocli fills them in
final class IntervalOptions {
    private static final long ROWS_WORTH_NEWS = 1_000_000;

    @Option(names = "--zone", paramLabel = "ZONE", description = "the clock of interval data: Europe/Berlin")
    private Optional<ZoneId> zone;

    @Option(names = "--stamps", description = "what the stamps of intervals mark, if they do not show it: start or end")
    private Optional<StampAt> stamps;

    @Option(
            names = "--gaps",
            description = "missing intervals: refuse, leave-out or interpolate (${DEFAULT-VALUE} unless said)",
            defaultValue = "refuse")
    private GapRule gaps;

    @Option(
            names = "--counter",
            description = "energies are readings of registers that count up, each taken at its stamp")
    private boolean counter;

    @Option(
            names = "--column",
            paramLabel = "WHAT=HEADER",
            description =
                    "a column of intervals that its header does not tell, or a MeterReading of a feed by its link;"
                            + " active, lagging, leading, reactive or exported: \"active=Meter 3\"")
    private Map<Role, String> columns = Map.of();

    @Option(
            names = "--demand-minutes",
            paramLabel = "MINUTES",
            description = "what a peak is averaged over; one interval unless said")
    private Optional<Integer> demandMinutes;

    @Option(
            names = "--sliding",
            description = "the minutes of a peak move on by each interval; one block after another unless said")
    private boolean sliding;

    @Option(
            names = "--read-on",
            paramLabel = "DAY",
            description =
                    "the day of the month on which a billing period begins, 1 to 28 (${DEFAULT-VALUE} unless said)",
            defaultValue = "1")
    private int readOn;

    @Spec
    private CommandSpec options;

    /** Bills leave nothing of this open. */
    void refuseBesideBills(ParseResult given) {
        List<Finding> findings = options.options().stream()
                .map(OptionSpec::longestName)
                .filter(given::hasMatchedOption)
                .map(name -> Finding.error(
                        "interval-option", "", name + " is said of interval data, and the file holds bills"))
                .toList();
        if (!findings.isEmpty()) {
            throw new Refusal(findings);
        }
    }

    /** @param dates the order of dates, which bills may need too */
    IntervalTerms terms(Optional<DateOrder> dates, PrintWriter notes) {
        return Declared.require(new IntervalTerms(file(dates, notes), demandMinutes, sliding, readOn));
    }

    private IntervalFileOptions file(Optional<DateOrder> dates, PrintWriter notes) {
        IntervalFileOptions choices = IntervalFileOptions.defaults()
                .gaps(gaps)
                .counter(counter)
                .columns(columns)
                .progress(rows -> {
                    if (rows >= ROWS_WORTH_NEWS) {
                        notes.println(rows + " rows read");
                        notes.flush();
                    }
                });
        if (zone.isPresent()) {
            choices = choices.zone(zone.get());
        }
        if (stamps.isPresent()) {
            choices = choices.stampAt(stamps.get());
        }
        return dates.isPresent() ? choices.dateOrder(dates.get()) : choices;
    }
}
