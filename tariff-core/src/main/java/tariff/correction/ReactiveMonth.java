// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Optional;
import tariff.meter.Triangle;

/**
 * What is known of a month's reactive load before a bank, and what follows for the kvarh after it. Writing q(t) for the lagging kvar, Q for
 * their sum over T hours, c for a constant bank: the lagging kvarh left are R = ∫(q − c)⁺.
 *
 * <p>Bounds: max(0, Q − cT) ≤ R ≤ Q × max(0, 1 − c ÷ M), with M the highest q. The first is Jensen's inequality for the convex (q − c)⁺,
 * reached by an even load; the second its chord on [0, M], reached by a load that is M or nothing. No tighter bound exists without a load
 * curve. Own derivation.
 *
 * @param laggingKvarh Q, 0 or more
 * @param hours T, above zero
 * @param highestKvar M, an upper limit of the lagging kvar; empty if nothing is known
 * @param likelyPeakKvar the best guess of the highest lagging kvar, at most M; empty if nothing is known
 */
record ReactiveMonth(
        BigDecimal laggingKvarh,
        BigDecimal hours,
        Optional<BigDecimal> highestKvar,
        Optional<BigDecimal> likelyPeakKvar) {
    private static final int DECIMALS = 3;

    /**
     * What is known of the hours in which a time switch lets the bank be on, T′ of the T hours. Their lagging kvarh Q′ lie between
     * max(0, Q − M (T − T′)), everything else drawn at M while the bank was off, and min(Q, M T′). What a bank removes of them rises with
     * Q′, at the least Q′ × min(1, c ÷ M) and at the most min(Q′, c T′); so the low estimate takes the least Q′, the high the most, the
     * central Q′ = Q × T′ ÷ T, which lies between, for M is at least Q ÷ T. Own derivation.
     *
     * @param hoursOn T′, above zero, at most T
     */
    ReactiveMonth during(BigDecimal hoursOn, Estimate estimate) {
        if (hoursOn.compareTo(hours) == 0) {
            return this;
        }
        Optional<BigDecimal> peak = highestKvar.map(highest -> highest.max(meanKvar()));
        BigDecimal hoursOff = hours.subtract(hoursOn);
        BigDecimal laggingOn = switch (estimate) {
            case LOW ->
                peak.map(highest -> laggingKvarh
                                .subtract(highest.multiply(hoursOff))
                                .max(BigDecimal.ZERO))
                        .orElse(BigDecimal.ZERO);
            case CENTRAL -> laggingKvarh.multiply(hoursOn).divide(hours, Triangle.PRECISION);
            case HIGH ->
                peak.map(highest -> highest.multiply(hoursOn).min(laggingKvarh)).orElse(laggingKvarh);
        };
        return new ReactiveMonth(laggingOn, hoursOn, peak, likelyPeakKvar);
    }

    /** R, the lagging kvarh that a constant bank leaves. */
    BigDecimal left(BigDecimal bankKvar, Estimate estimate) {
        if (bankKvar.signum() == 0) {
            return laggingKvarh;
        }
        return switch (estimate) {
            case LOW -> most(bankKvar);
            case HIGH -> least(bankKvar);
            case CENTRAL -> central(bankKvar).min(most(bankKvar)).max(least(bankKvar));
        };
    }

    private BigDecimal least(BigDecimal bankKvar) {
        return laggingKvarh.subtract(bankKvar.multiply(hours)).max(BigDecimal.ZERO);
    }

    private BigDecimal most(BigDecimal bankKvar) {
        if (highestKvar.isEmpty()) {
            return laggingKvarh;
        }
        BigDecimal peak = highestKvar.get().max(meanKvar());
        if (peak.compareTo(bankKvar) <= 0) {
            return BigDecimal.ZERO;
        }
        return laggingKvarh.multiply(peak.subtract(bankKvar)).divide(peak, Triangle.PRECISION);
    }

    private BigDecimal central(BigDecimal bankKvar) {
        return BigDecimal.valueOf(curve().left(bankKvar.doubleValue())).setScale(DECIMALS, RoundingMode.HALF_UP);
    }

    /** The load curve that the central case assumes. */
    LoadCurve curve() {
        BigDecimal peak = likelyPeakKvar.or(() -> highestKvar).orElse(meanKvar().add(meanKvar()));
        return LoadCurve.of(laggingKvarh, hours, peak.max(meanKvar()));
    }

    private BigDecimal meanKvar() {
        return laggingKvarh.divide(hours, Triangle.PRECISION);
    }
}
