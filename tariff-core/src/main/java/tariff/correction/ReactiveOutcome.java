// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import java.math.BigDecimal;

/**
 * What the meter would have shown with a bank behind it.
 *
 * @param laggingKvarh lagging register after the bank
 * @param leadingKvarh leading register after the bank
 * @param avoidedKvarh lagging register before less after
 * @param peakLaggingKvar highest demand of the lagging register, 0 without a whole demand interval
 * @param peakLeadingKvar highest demand of the leading register, likewise
 * @param peakKva highest √(kW² + (lagging − leading)²), likewise
 */
public record ReactiveOutcome(
        BigDecimal laggingKvarh,
        BigDecimal leadingKvarh,
        BigDecimal avoidedKvarh,
        BigDecimal peakLaggingKvar,
        BigDecimal peakLeadingKvar,
        BigDecimal peakKva) {}
