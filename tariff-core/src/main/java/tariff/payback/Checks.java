// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import tariff.notice.Finding;
import tariff.notice.Refusal;

/** Collects what is wrong with an input, so that it is refused once with everything. */
final class Checks {
    private final List<Finding> findings = new ArrayList<>();

    Checks notNegative(String where, BigDecimal amount) {
        if (amount.signum() < 0) {
            add("negative", where, "is less than nothing", amount.toPlainString(), "0 or more");
        }
        return this;
    }

    /** A fraction of one, from {@code least} to 1; the usual slip is 8 for 8 %. */
    Checks fraction(String where, BigDecimal share, String least) {
        if (share.compareTo(new BigDecimal(least)) < 0 || share.compareTo(BigDecimal.ONE) > 0) {
            add(
                    "not-a-fraction",
                    where,
                    "must be a fraction of one, where 0.08 means 8 %",
                    share.toPlainString(),
                    least + " to 1");
        }
        return this;
    }

    Checks whole(String where, int number, int least, int most) {
        if (number < least || number > most) {
            add("out-of-range", where, "is out of range", Integer.toString(number), least + " to " + most);
        }
        return this;
    }

    void add(String code, String where, String message, String found, String allowed) {
        findings.add(Finding.error(code, where, message).found(found).allowed(allowed));
    }

    void refuseIfAny() {
        if (!findings.isEmpty()) {
            throw new Refusal(findings);
        }
    }
}
