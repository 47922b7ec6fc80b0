// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;

import org.junit.jupiter.api.Test;
import tariff.notice.Refusal;

class ReconciliationTest {

    @Test
    void monthsWithoutAnythingChargedAreRefused() {
        Refusal refusal = catchThrowableOfType(
                Refusal.class, () -> Reconciliation.of(PaidBills.billing(PaidBills.RATE), PaidBills.year(1)));
        assertThat(refusal.findings())
                .extracting(Object::toString)
                .containsExactly(
                        "the bills: no month says what was charged; allowed: \"charged\" with \"total\", \"lines\""
                                + " or both in at least one month, or a column of a table with the amounts");
    }
}
