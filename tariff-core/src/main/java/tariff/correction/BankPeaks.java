// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import static tariff.meter.Register.PEAK_KVA;
import static tariff.meter.Register.PEAK_KW;
import static tariff.meter.Register.PEAK_LAGGING_KVAR;
import static tariff.meter.Register.PEAK_LEADING_KVAR;

import java.math.BigDecimal;
import java.util.Optional;
import tariff.meter.Readings;
import tariff.meter.Triangle;

/**
 * The highest demands of a period after a bank. A controller leaves what its aim allows, at the most at the highest kW, and what its dead
 * band does; the low estimate counts both, the central the aim, the high neither. The bank's own kW are added to the highest kW
 * and, which is at least as much as they can add, to the highest kVA. Own derivation.
 *
 * @param bank the bank
 * @param slack kvar by which a controller may be off in the low estimate, 0 in the others
 * @param interrupted whether a time switch keeps it off for a part of the period, in which the peaks may have fallen: the low estimate then
 *     leaves kVA and lagging kvar no lower than they were
 * @param estimate which side of what is not known
 */
record BankPeaks(CapacitorBank bank, BigDecimal slack, boolean interrupted, Estimate estimate) {

    /** @param after the readings after the bank, to which the peaks are added */
    Readings in(Readings before, Readings after) {
        Readings result = after;
        Optional<BigDecimal> kw = before.get(PEAK_KW);
        Optional<BigDecimal> kva = before.get(PEAK_KVA);
        Optional<BigDecimal> kvar = before.get(PEAK_LAGGING_KVAR);
        BigDecimal sent = before.get(PEAK_LEADING_KVAR).orElse(BigDecimal.ZERO);
        if (kw.isPresent()) {
            result = result.with(PEAK_KW, kw.get().add(ownKw()));
        }
        if (kw.isPresent() && kva.isPresent()) {
            result = result.with(PEAK_KVA, apparent(kw.get(), kva.get(), sent));
        }
        if (kvar.isPresent()) {
            result = result.with(PEAK_LAGGING_KVAR, lagging(kvar.get(), kw));
        }
        BigDecimal more = estimate == Estimate.HIGH ? BigDecimal.ZERO : bank.effectiveFixedKvar();
        return result.with(PEAK_LEADING_KVAR, sent.add(more).max(slack));
    }

    private BigDecimal apparent(BigDecimal kw, BigDecimal kva, BigDecimal sent) {
        BigDecimal fixed = bank.effectiveFixedKvar();
        BigDecimal least = new PeakApparent(kw, kva.max(kw), sent).after(fixed, bank.effectiveSwitchedKvar(), estimate);
        if (estimate == Estimate.HIGH) {
            return capped(least, kw, kva).max(kw.add(ownKw()));
        }
        BigDecimal aimed = bank.isAutomatic()
                ? bank.controller()
                        .targetPowerFactor()
                        .map(pf -> kw.divide(pf, Triangle.PRECISION))
                        .orElse(kw)
                : kw;
        BigDecimal reached = capped(least.max(aimed).add(slack), kw, kva);
        return (asBefore() ? reached.max(kva) : reached).add(ownKw());
    }

    /** Steps alone follow the load and make no kVA higher, but for what they may lead within their dead band. */
    private BigDecimal capped(BigDecimal reached, BigDecimal kw, BigDecimal kva) {
        return bank.isAutomatic() && bank.fixedKvar().signum() == 0
                ? reached.min(kva.max(Triangle.apparent(kw, slack)))
                : reached;
    }

    private BigDecimal lagging(BigDecimal kvar, Optional<BigDecimal> kw) {
        if (asBefore()) {
            return kvar;
        }
        BigDecimal left = kvar.subtract(bank.effectiveKvar()).max(BigDecimal.ZERO);
        return left.max(aimedKvar(kvar, kw)).add(slack).min(kvar);
    }

    /** Lagging kvar that the controller leaves on purpose at the most; all of them where no highest kW tells. */
    private BigDecimal aimedKvar(BigDecimal kvar, Optional<BigDecimal> kw) {
        if (!bank.isAutomatic() || estimate == Estimate.HIGH) {
            return BigDecimal.ZERO;
        }
        return bank.controller()
                .targetPowerFactor()
                .map(pf -> kw.map(peak -> peak.multiply(Triangle.tangent(pf))).orElse(kvar))
                .orElse(BigDecimal.ZERO);
    }

    private boolean asBefore() {
        return interrupted && estimate == Estimate.LOW;
    }

    /** The bank's own kW at the highest kW: of all its kvar, but in the high estimate only of those that are always on. */
    private BigDecimal ownKw() {
        if (estimate != Estimate.HIGH) {
            return bank.ownKilowatts(bank.effectiveKvar());
        }
        return interrupted ? BigDecimal.ZERO : bank.ownKilowatts(bank.effectiveFixedKvar());
    }
}
