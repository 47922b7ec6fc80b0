// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeSet;
import tariff.correction.Estimate;
import tariff.meter.MeteredMonth;
import tariff.meter.Register;
import tariff.payback.Answer;

/**
 * What the best size depends on that the bills do not say.
 *
 * @param words how far the answers lie apart
 * @param reading what would settle it
 */
public record Undecided(String words, String reading) {
    private static final BigDecimal CLOSE = new BigDecimal("0.9");

    /** Nothing if the sizes for all estimates are within a tenth of each other. */
    static Optional<Undecided> of(Map<Estimate, Answer<SizedBank>> best, List<MeteredMonth> year) {
        TreeSet<BigDecimal> sizes = new TreeSet<>();
        best.values().forEach(answer -> sizes.add(answer.fold(SizedBank::kvar, why -> BigDecimal.ZERO)));
        BigDecimal least = sizes.first();
        BigDecimal most = sizes.last();
        if (least.compareTo(most.multiply(CLOSE)) >= 0) {
            return Optional.empty();
        }
        String words = "when the kvarh were drawn decides between "
                + (least.signum() == 0 ? "no bank" : Words.kvar(least)) + " and " + Words.kvar(most)
                + "; the bills do not say";
        boolean peaks = year.stream().allMatch(month -> month.totals().has(Register.PEAK_LAGGING_KVAR));
        return Optional.of(
                new Undecided(
                        words,
                        peaks
                                ? "interval data of kWh and kvarh settle it"
                                : "the highest lagging kvar of each month narrows it; interval data of kWh and kvarh settle it"));
    }
}
