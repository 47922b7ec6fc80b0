// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.math.BigDecimal;
import java.util.Optional;

/**
 * A line of a bill beside the same line worked out.
 *
 * @param name as the bill and the rate name it
 * @param charged what the bill prints; empty if it prints no such line
 * @param recomputed what the rate asks; empty if it has no such line
 */
public record ReconciledLine(
        String name, Optional<BigDecimal> charged, Optional<BigDecimal> recomputed, Verdict verdict) {

    static ReconciledLine of(
            String name, Optional<BigDecimal> charged, Optional<BigDecimal> recomputed, BigDecimal slack) {
        Verdict verdict = charged.isEmpty()
                ? Verdict.NOT_ON_BILL
                : recomputed.isEmpty()
                        ? Verdict.NOT_IN_RATE
                        : Verdict.of(charged.get().subtract(recomputed.get()), slack);
        return new ReconciledLine(name, charged, recomputed, verdict);
    }

    /** Charged less recomputed; a side that is absent counts as zero. */
    public BigDecimal difference() {
        return charged.orElse(BigDecimal.ZERO).subtract(recomputed.orElse(BigDecimal.ZERO));
    }
}
