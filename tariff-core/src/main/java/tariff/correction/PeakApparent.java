// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import java.math.BigDecimal;
import tariff.meter.Triangle;

/**
 * The highest kVA after a bank, from the highest kW (P) and kVA (S) before it, which need not fall together; q₀ = √(S² − P²).
 *
 * <p>For a constant bank c: max(P, S − c) ≤ S′ ≤ √(P² + max((l + c)², (q₀ − c)²)), with l the leading kvar that were there before.
 * S′² = p² + (q − c)² is convex, so its highest value over the loads that the bill allows lies at one of their corners. Without leading
 * kvar and up to c = q₀ ÷ 2 the usual formula with both peaks together is therefore a promise; beyond, it is an estimate. Steps that
 * follow the load never lead, so for them S′ ≤ √(P² + ((q₀ − c)⁺)²). Own derivation.
 *
 * @param kw P
 * @param kva S, at least P
 * @param leadingKvar l, the highest that was read, 0 if none was
 */
record PeakApparent(BigDecimal kw, BigDecimal kva, BigDecimal leadingKvar) {

    /** Nothing leads before the bank. */
    PeakApparent(BigDecimal kw, BigDecimal kva) {
        this(kw, kva, BigDecimal.ZERO);
    }

    /**
     * The highest kVA after a bank.
     *
     * @param fixedKvar always on
     * @param switchedKvar follows the load
     */
    BigDecimal after(BigDecimal fixedKvar, BigDecimal switchedKvar, Estimate estimate) {
        BigDecimal all = fixedKvar.add(switchedKvar);
        if (all.signum() == 0) {
            return kva;
        }
        BigDecimal together = Triangle.reactive(kw, kva);
        BigDecimal lagging = together.subtract(all).max(BigDecimal.ZERO);
        BigDecimal leading = fixedKvar.subtract(together).max(BigDecimal.ZERO);
        return switch (estimate) {
            case HIGH -> kva.subtract(all).max(kw);
            case CENTRAL -> Triangle.apparent(kw, lagging.max(leading));
            case LOW -> Triangle.apparent(kw, lagging.max(leading).max(leadingKvar.add(fixedKvar)));
        };
    }
}
