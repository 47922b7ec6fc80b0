// SPDX-License-Identifier: Apache-2.0
package tariff.service.request;

import jakarta.validation.constraints.AssertTrue;
import jakarta.validation.constraints.Max;
import jakarta.validation.constraints.Min;
import java.time.DateTimeException;
import java.time.ZoneId;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import tariff.csv.DateOrder;
import tariff.intervalfile.GapRule;
import tariff.intervalfile.IntervalFileOptions;
import tariff.intervalfile.Role;
import tariff.intervalfile.StampAt;
import tariff.meter.DemandInterval;
import tariff.meter.IntervalSeries;
import tariff.meter.MonthlySums;
import tariff.meter.ReadingDay;
import tariff.notice.Finding;
import tariff.notice.Refusal;
import tariff.rate.Rate;
import tariff.rate.clause.Written;

/**
 * What is said of interval data beside them.
 *
 * @param file how the rows are read
 * @param demandMinutes what a peak is averaged over; one interval unless said
 * @param slidingDemand whether that time moves on by each interval, in place of one block after another
 * @param readOn the day of the month on which a billing period begins
 */
public record IntervalTerms(
        IntervalFileOptions file,

        Optional<@Min(value = 5, message = MINUTES) @Max(value = 60, message = MINUTES) Integer> demandMinutes,

        boolean slidingDemand,

        @Min(value = 1, message = DAY) @Max(value = ReadingDay.LAST, message = DAY)
        int readOn) {
    private static final String MINUTES = "5 to 60 minutes";
    private static final String DAY = "1 to 28, a day that every month has";
    private static final Map<String, StampAt> STAMPS = Map.of("start", StampAt.START, "end", StampAt.END);
    private static final Map<String, DateOrder> DATES =
            Stream.of(DateOrder.values()).collect(Collectors.toMap(DateOrder::word, order -> order));
    private static final Map<String, GapRule> GAPS =
            Stream.of(GapRule.values()).collect(Collectors.toMap(GapRule::word, rule -> rule));
    private static final String COLUMN = "Column";

    static IntervalTerms read(Written in, List<Finding> findings) {
        IntervalFileOptions file = IntervalFileOptions.defaults()
                .gaps(in.word("gaps", GAPS, GapRule.REFUSE))
                .counter(in.flag("counter"))
                .columns(columns(in));
        Optional<ZoneId> zone = in.has("zone") ? zone(in.at("zone"), findings) : Optional.empty();
        if (zone.isPresent()) {
            file = file.zone(zone.get());
        }
        if (in.has("stamps")) {
            file = file.stampAt(in.word("stamps", STAMPS, StampAt.START));
        }
        if (in.has("dates")) {
            file = file.dateOrder(in.word("dates", DATES, DateOrder.DAY_FIRST));
        }
        IntervalTerms terms = new IntervalTerms(
                file,
                in.has("demandMinutes") ? Optional.of(in.wholeNumber("demandMinutes", 5, 60)) : Optional.empty(),
                in.flag("slidingDemand"),
                in.has("readOn") ? in.wholeNumber("readOn", 1, ReadingDay.LAST) : 1);
        findings.addAll(Declared.check(terms, ""));
        return terms;
    }

    /** What {@link #read} knows, as names of a query. */
    static Set<String> names() {
        Set<String> names = new TreeSet<>(
                Set.of("zone", "stamps", "dates", "gaps", "counter", "demandMinutes", "slidingDemand", "readOn"));
        names.addAll(columnNames());
        return names;
    }

    /** {@code activeColumn} and so on, each the header of a column. */
    static Set<String> columnNames() {
        return Stream.of(Role.values()).map(role -> role.word() + COLUMN).collect(Collectors.toUnmodifiableSet());
    }

    private static Map<Role, String> columns(Written in) {
        Map<Role, String> columns = new EnumMap<>(Role.class);
        for (Role role : Role.values()) {
            if (in.has(role.word() + COLUMN)) {
                columns.put(role, in.at(role.word() + COLUMN).text());
            }
        }
        return columns;
    }

    @AssertTrue(message = "a sliding demand with the minutes that it is averaged over")
    boolean isAveragedOver() {
        return !slidingDemand || demandMinutes.isPresent();
    }

    private static Optional<ZoneId> zone(Written in, List<Finding> findings) {
        try {
            return Optional.of(ZoneId.of(in.text()));
        } catch (DateTimeException unknown) {
            findings.add(Finding.error("zone", in.pointer(), "is not a time zone")
                    .found(in.text())
                    .allowed("a name such as Europe/Berlin, or a fixed offset such as +01:00"));
            return Optional.empty();
        }
    }

    /**
     * The series as the rate's bill will see it.
     *
     * @throws Refusal if peaks cannot be averaged over so many minutes
     */
    public MonthlySums sums(IntervalSeries series, Rate rate) {
        try {
            return rate.sums(
                    series,
                    new DemandInterval(demandMinutes.orElse(series.stepMinutes()), slidingDemand),
                    new ReadingDay(readOn));
        } catch (IllegalArgumentException step) {
            throw new Refusal(Finding.error(
                            "demand", "/demandMinutes", "is not a time that peaks of these data can be averaged over")
                    .found(demandMinutes.map(String::valueOf).orElse("nothing"))
                    .allowed("a multiple of " + series.stepMinutes() + " minutes that divides an hour"));
        }
    }
}
