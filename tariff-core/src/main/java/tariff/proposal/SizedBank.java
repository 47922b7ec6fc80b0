// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import java.util.Collections;
import java.util.EnumMap;
import java.util.Map;
import java.util.Objects;
import tariff.correction.CapacitorBank;
import tariff.correction.Estimate;
import tariff.payback.Answer;
import tariff.payback.Investment;

/**
 * A size with its price and what comes of it.
 *
 * @param bank the capacitors
 * @param investment its price
 * @param gains for each estimate
 */
public record SizedBank(CapacitorBank bank, Investment investment, Map<Estimate, Gain> gains) {

    /**
     * What comes of a bank.
     *
     * @param firstYear savings of the first year
     * @param settledYear savings of every later year
     * @param netPresentValue of yearly flows
     * @param paybackYears cost ÷ (settled-year savings − upkeep)
     */
    public record Gain(
            BigDecimal firstYear,
            BigDecimal settledYear,
            BigDecimal netPresentValue,
            Answer<BigDecimal> paybackYears) {}

    public SizedBank {
        gains = Collections.unmodifiableMap(new EnumMap<>(gains));
    }

    /** Every estimate has a gain. */
    public Gain gain(Estimate estimate) {
        return Objects.requireNonNull(gains.get(estimate));
    }

    public BigDecimal kvar() {
        return bank.ratedKvar();
    }
}
