// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import tariff.meter.Triangle;

/**
 * A capacitor bank as offered.
 *
 * @param fixedKvar rated kvar that is always on, 0 or more
 * @param stepsKvar rated kvar of each switched step; empty for a fixed bank
 * @param targetPowerFactor what the controller of the steps aims at, in (0, 1]; empty for unity
 * @param ratedVolts the voltage the kvar are rated at, above zero; empty for the service voltage
 * @param serviceVolts the voltage at the place, above zero
 * @param reactorShare reactance of a detuning reactor ÷ reactance of the capacitor, 0 for a plain bank, below 0.3
 * @param wattsPerKvar the bank's own losses; 0 leaves them out
 */
public record CapacitorBank(
        BigDecimal fixedKvar,
        List<BigDecimal> stepsKvar,
        Optional<BigDecimal> targetPowerFactor,
        Optional<BigDecimal> ratedVolts,
        Optional<BigDecimal> serviceVolts,
        BigDecimal reactorShare,
        BigDecimal wattsPerKvar) {
    private static final BigDecimal MOST_REACTOR = new BigDecimal("0.3");

    /** Throws {@link IllegalArgumentException} for a value outside its range, naming it. */
    public CapacitorBank {
        stepsKvar = List.copyOf(stepsKvar);
        require(fixedKvar.signum() >= 0, "fixedKvar", fixedKvar, "0 or more");
        stepsKvar.forEach(step -> require(step.signum() > 0, "a step", step, "above 0 kvar"));
        targetPowerFactor.ifPresent(pf -> require(
                pf.signum() > 0 && pf.compareTo(BigDecimal.ONE) <= 0, "targetPowerFactor", pf, "above 0, at most 1"));
        ratedVolts.ifPresent(volts -> require(volts.signum() > 0, "ratedVolts", volts, "above 0"));
        serviceVolts.ifPresent(volts -> require(volts.signum() > 0, "serviceVolts", volts, "above 0"));
        require(
                reactorShare.signum() >= 0 && reactorShare.compareTo(MOST_REACTOR) < 0,
                "reactorShare",
                reactorShare,
                "0 to below 0.3");
        require(wattsPerKvar.signum() >= 0, "wattsPerKvar", wattsPerKvar, "0 or more");
    }

    /** A plain bank, always on, rated at the service voltage. */
    public static CapacitorBank fixed(String kvar) {
        return fixed(new BigDecimal(kvar));
    }

    public static CapacitorBank fixed(BigDecimal kvar) {
        return plain(kvar, List.of());
    }

    /** A plain bank of switched steps that aims at unity, rated at the service voltage. */
    public static CapacitorBank automatic(String... stepsKvar) {
        return plain(BigDecimal.ZERO, Stream.of(stepsKvar).map(BigDecimal::new).toList());
    }

    private static CapacitorBank plain(BigDecimal fixed, List<BigDecimal> steps) {
        return new CapacitorBank(
                fixed, steps, Optional.empty(), Optional.empty(), Optional.empty(), BigDecimal.ZERO, BigDecimal.ZERO);
    }

    /** kvar on the nameplate, all steps in. */
    public BigDecimal ratedKvar() {
        return fixedKvar.add(switchedKvar());
    }

    /**
     * kvar given at the service voltage: Q = Qr × (V ÷ Vr)² ÷ (1 − p), with Qr and Vr the rating of the bare capacitor and p the reactor's
     * share. IEC 60831-1 and IEEE 1036, from memory.
     */
    public BigDecimal effectiveKvar() {
        return effective(ratedKvar());
    }

    public BigDecimal effectiveFixedKvar() {
        return effective(fixedKvar);
    }

    public BigDecimal effectiveSwitchedKvar() {
        return effective(switchedKvar());
    }

    /** Each switched step at the service voltage. */
    public List<BigDecimal> effectiveStepsKvar() {
        return stepsKvar.stream().map(this::effective).toList();
    }

    /** The smallest switched step at the service voltage, 0 for a fixed bank. */
    public BigDecimal smallestStepKvar() {
        return stepsKvar.stream()
                .min(BigDecimal::compareTo)
                .map(this::effective)
                .orElse(BigDecimal.ZERO);
    }

    public boolean isAutomatic() {
        return !stepsKvar.isEmpty();
    }

    private BigDecimal switchedKvar() {
        return stepsKvar.stream().reduce(BigDecimal.ZERO, BigDecimal::add);
    }

    private BigDecimal effective(BigDecimal rated) {
        BigDecimal kvar = rated;
        if (ratedVolts.isPresent() && serviceVolts.isPresent()) {
            BigDecimal ratio = serviceVolts.get().divide(ratedVolts.get(), Triangle.PRECISION);
            kvar = kvar.multiply(ratio).multiply(ratio, Triangle.PRECISION);
        }
        return reactorShare.signum() == 0
                ? kvar
                : kvar.divide(BigDecimal.ONE.subtract(reactorShare), Triangle.PRECISION);
    }

    private static void require(boolean holds, String name, BigDecimal given, String allowed) {
        if (!holds) {
            throw new IllegalArgumentException(name + " is " + given.toPlainString() + "; allowed: " + allowed);
        }
    }
}
