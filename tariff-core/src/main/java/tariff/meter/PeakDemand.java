// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import java.math.BigDecimal;
import java.time.Instant;

/**
 * One demand interval with everything that coincided in it.
 *
 * @param start when it began
 * @param kw average active power taken
 * @param laggingKvar average of the lagging register
 * @param leadingKvar average of the leading register
 * @param kva √(kW² + (lagging − leading)²)
 */
public record PeakDemand(Instant start, BigDecimal kw, BigDecimal laggingKvar, BigDecimal leadingKvar, BigDecimal kva) {
    /**
     * The figure of a peak register.
     *
     * @throws IllegalArgumentException if the register is not a peak
     */
    public BigDecimal get(Register register) {
        return switch (register) {
            case PEAK_KW -> kw;
            case PEAK_LAGGING_KVAR -> laggingKvar;
            case PEAK_LEADING_KVAR -> leadingKvar;
            case PEAK_KVA -> kva;
            default -> throw new IllegalArgumentException(register.key() + " is not a peak");
        };
    }
}
