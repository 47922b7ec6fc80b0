// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import tariff.meter.Triangle;
import tariff.meter.Window;

/**
 * A capacitor bank as offered.
 *
 * @param fixedKvar rated kvar that is always on, 0 or more
 * @param stepsKvar rated kvar of each switched step; empty for a fixed bank
 * @param controller what the controller of the steps is told; a fixed bank has none and does not ask
 * @param ratedVolts the voltage the kvar are rated at, above zero; empty for the service voltage
 * @param serviceVolts the voltage at the place, above zero
 * @param reactorShare reactance of a detuning reactor ÷ reactance of the capacitor, 0 for a plain bank, below 0.3
 * @param wattsPerKvar the bank's own losses, 0 to 1000 W for each kvar given; 0 leaves them out
 * @param off when a time switch takes the whole bank off the network, the fixed kvar too; empty if nothing does
 */
public record CapacitorBank(
        BigDecimal fixedKvar,
        List<BigDecimal> stepsKvar,
        Controller controller,
        Optional<BigDecimal> ratedVolts,
        Optional<BigDecimal> serviceVolts,
        BigDecimal reactorShare,
        BigDecimal wattsPerKvar,
        Optional<Window> off) {
    private static final BigDecimal MOST_WATTS = BigDecimal.valueOf(1000);
    private static final BigDecimal WATTS_A_KILOWATT = BigDecimal.valueOf(1000);
    private static final BigDecimal DEAD_BAND = new BigDecimal("0.6666666667");
    private static final BigDecimal MOST_REACTOR = new BigDecimal("0.3");

    /** Throws {@link IllegalArgumentException} for a value outside its range, naming it. */
    public CapacitorBank {
        stepsKvar = List.copyOf(stepsKvar);
        require(fixedKvar.signum() >= 0, "fixedKvar", fixedKvar, "0 or more");
        stepsKvar.forEach(step -> require(step.signum() > 0, "a step", step, "above 0 kvar"));
        ratedVolts.ifPresent(volts -> require(volts.signum() > 0, "ratedVolts", volts, "above 0"));
        serviceVolts.ifPresent(volts -> require(volts.signum() > 0, "serviceVolts", volts, "above 0"));
        require(
                reactorShare.signum() >= 0 && reactorShare.compareTo(MOST_REACTOR) < 0,
                "reactorShare",
                reactorShare,
                "0 to below 0.3");
        require(
                wattsPerKvar.signum() >= 0 && wattsPerKvar.compareTo(MOST_WATTS) <= 0,
                "wattsPerKvar",
                wattsPerKvar,
                "0 to 1000");
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

    /** A plain bank rated at the service voltage, whose steps aim at unity and which no time switch holds off. */
    public static CapacitorBank plain(BigDecimal fixedKvar, List<BigDecimal> stepsKvar) {
        return new CapacitorBank(
                fixedKvar,
                stepsKvar,
                Controller.quick(),
                Optional.empty(),
                Optional.empty(),
                BigDecimal.ZERO,
                BigDecimal.ZERO,
                Optional.empty());
    }

    /** A bank like this one with other capacitors. */
    public CapacitorBank withKvar(BigDecimal newFixedKvar, List<BigDecimal> newStepsKvar) {
        return new CapacitorBank(
                newFixedKvar, newStepsKvar, controller, ratedVolts, serviceVolts, reactorShare, wattsPerKvar, off);
    }

    public CapacitorBank withController(Controller told) {
        return new CapacitorBank(fixedKvar, stepsKvar, told, ratedVolts, serviceVolts, reactorShare, wattsPerKvar, off);
    }

    public CapacitorBank withVolts(BigDecimal rated, BigDecimal service) {
        return new CapacitorBank(
                fixedKvar,
                stepsKvar,
                controller,
                Optional.of(rated),
                Optional.of(service),
                reactorShare,
                wattsPerKvar,
                off);
    }

    public CapacitorBank withReactor(BigDecimal share) {
        return new CapacitorBank(fixedKvar, stepsKvar, controller, ratedVolts, serviceVolts, share, wattsPerKvar, off);
    }

    public CapacitorBank withLosses(BigDecimal newWattsPerKvar) {
        return new CapacitorBank(
                fixedKvar, stepsKvar, controller, ratedVolts, serviceVolts, reactorShare, newWattsPerKvar, off);
    }

    /** The same bank behind a time switch. */
    public CapacitorBank offIn(Window window) {
        return new CapacitorBank(
                fixedKvar,
                stepsKvar,
                controller,
                ratedVolts,
                serviceVolts,
                reactorShare,
                wattsPerKvar,
                Optional.of(window));
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

    /**
     * No two outputs next to each other that the switched steps can give lie farther apart, at the service voltage; 0 for a fixed bank. Taken
     * by size, a step larger than all before it together leaves a gap of the difference; no other gap is larger than those there were.
     * Own derivation.
     */
    BigDecimal widestGapKvar() {
        BigDecimal gap = BigDecimal.ZERO;
        BigDecimal before = BigDecimal.ZERO;
        for (BigDecimal step : stepsKvar.stream().sorted().toList()) {
            gap = gap.max(step.subtract(before));
            before = before.add(step);
        }
        return effective(gap);
    }

    /**
     * How far a controller may leave its steps from what is wanted: two thirds of the smallest, within which it does not answer (common
     * practice, no source), or half of the widest gap between two outputs.
     */
    BigDecimal deadBandKvar() {
        return smallestStepKvar().multiply(DEAD_BAND).max(widestGapKvar().divide(BigDecimal.valueOf(2)));
    }

    /** What the bank burns: kW for kvar that it gives, kWh for kvarh. */
    BigDecimal ownKilowatts(BigDecimal kvar) {
        return kvar.multiply(wattsPerKvar).divide(WATTS_A_KILOWATT, Triangle.PRECISION);
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
