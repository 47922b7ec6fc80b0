// SPDX-License-Identifier: Apache-2.0
package tariff.service.request;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;
import tariff.meter.Window;
import tariff.notice.Finding;
import tariff.notice.Refusal;
import tariff.rate.WindowClause;
import tariff.rate.WindowWords;
import tariff.rate.clause.Written;

/** When a time switch keeps a bank off, as somebody says it. */
public final class OffHours {
    private static final String TIMES = "\\d\\d:\\d\\d-\\d\\d:\\d\\d";

    private OffHours() {}

    /** In the words of a rate's window, but for holidays, which a time switch does not know. */
    static Window read(Written in) {
        List<Finding> found = new ArrayList<>();
        Window off = WindowClause.readWithoutHolidays(in.toldAlso(found::add));
        if (found.isEmpty() && isAlways(off)) {
            in.wrongAs(
                    "always-off",
                    "keeps the bank off all the time",
                    WindowWords.of(off),
                    "a window that leaves the bank some hours");
        }
        return off;
    }

    /**
     * Every day between two times, {@code 22:00-06:00}, as an option of a command has it.
     *
     * @throws Refusal that names the option if the text is something else
     */
    public static Window daily(String option, String times) {
        List<Finding> findings = new ArrayList<>();
        Optional<Window> off =
                document(option, times, findings::add).map(window -> read(new Written(window, option, findings::add)));
        if (!findings.isEmpty()) {
            throw new Refusal(findings);
        }
        return off.orElseThrow();
    }

    /** Two times as a document holds a window; empty, with a finding, if the text is something else. */
    static Optional<Map<String, String>> document(String where, String times, Consumer<Finding> findings) {
        if (!times.matches(TIMES)) {
            findings.accept(Finding.error("times", where, "is not from one time to another")
                    .found(times)
                    .allowed("two times of day with a hyphen between, such as 22:00-06:00"));
            return Optional.empty();
        }
        return Optional.of(Map.of("from", times.substring(0, 5), "to", times.substring(6)));
    }

    private static boolean isAlways(Window off) {
        return off.weekdays().size() == 7
                && off.months().size() == 12
                && off.from().equals(off.to());
    }
}
