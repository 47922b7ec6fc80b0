// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import tariff.notice.Assumption;
import tariff.notice.Finding;
import tariff.notice.Refusal;

/** Gathers what is to be said of a file; of each kind of finding so many are kept and the others counted. */
final class Notices {
    private final int listed;
    private final List<Finding> findings = new ArrayList<>();
    private final List<Assumption> assumptions = new ArrayList<>();
    private final Map<String, Integer> counts = new LinkedHashMap<>();
    private final Map<String, Finding> firsts = new LinkedHashMap<>();
    private boolean anyError;

    Notices(int listed) {
        this.listed = listed;
    }

    void error(String code, String where, String message) {
        add(Finding.error(code, where, message));
    }

    void warning(String code, String where, String message) {
        add(Finding.warning(code, where, message));
    }

    void add(Finding finding) {
        anyError |= finding.isError();
        firsts.putIfAbsent(finding.code(), finding);
        if (counts.merge(finding.code(), 1, Integer::sum) <= listed) {
            findings.add(finding);
        }
    }

    void assume(String code, String where, String message, String remedy) {
        assumptions.add(new Assumption(code, where, message, remedy));
    }

    /** Ends the reading here if anything was an error. */
    void refuseIfWrong() {
        if (anyError) {
            throw new Refusal(findings());
        }
    }

    List<Finding> findings() {
        List<Finding> all = new ArrayList<>(findings);
        counts.forEach((code, count) -> {
            if (count > listed) {
                String message = "and " + (count - listed) + " more like the " + listed + " listed";
                Finding first = firsts.get(code);
                all.add(
                        first != null && first.isError()
                                ? Finding.error(code, "", message)
                                : Finding.warning(code, "", message));
            }
        });
        return all;
    }

    List<Assumption> assumptions() {
        return assumptions;
    }
}
