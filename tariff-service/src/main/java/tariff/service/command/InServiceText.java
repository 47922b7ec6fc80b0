// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.List;
import java.util.stream.Collectors;
import tariff.correction.SteppedWalk;
import tariff.correction.YearInService;
import tariff.meter.Readings;
import tariff.meter.Register;

/** What a bank did through the months of interval data, printed. */
final class InServiceText {
    private static final List<Register> SHOWN =
            List.of(Register.LAGGING_KVARH, Register.LEADING_KVARH, Register.PEAK_KVA);

    private InServiceText() {}

    static String of(YearInService year) {
        Table table = new Table()
                .row("Month", "lagging kvarh", "with bank", "leading kvarh", "with bank", "kVA", "with bank");
        year.months()
                .forEach(month -> table.row(
                        month.period().toString(),
                        figure(month.before(), 0),
                        figure(month.after(), 0),
                        figure(month.before(), 1),
                        figure(month.after(), 1),
                        figure(month.before(), 2),
                        figure(month.after(), 2)));
        return "The bank in service, from the interval data\n" + table.text()
                + Wrapped.text("Leading kvarh that the bank creates: " + whole(year.leadingKvarhCreated()) + ".")
                + year.steps().map(walk -> Wrapped.text(steps(year, walk))).orElse("");
    }

    private static String steps(YearInService year, SteppedWalk walk) {
        return "Steps switched in or out " + year.operations() + " times ("
                + walk.operations().stream().map(String::valueOf).collect(Collectors.joining(", "))
                + " by step); every step in for " + whole(walk.hoursAtFullOutput()) + " hours.";
    }

    private static String figure(Readings readings, int place) {
        return readings.get(SHOWN.get(place)).map(InServiceText::whole).orElse("-");
    }

    private static String whole(BigDecimal value) {
        return value.setScale(0, RoundingMode.HALF_UP).toPlainString();
    }
}
