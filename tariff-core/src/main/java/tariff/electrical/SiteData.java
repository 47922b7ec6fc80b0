// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What is known of a site. Everything may be absent; a screen that needs what is absent says so. Start from {@link #unknown()}.
 *
 * @param transformerKva S_T of the transformer that feeds the bus [kVA], above 0
 * @param impedancePercent its short-circuit impedance [%], in (0, 100]
 * @param loadLossKw its load loss at rated current, Pk [kW], 0 or more
 * @param networkKva short-circuit power of the network on its supply side [kVA], above 0
 * @param serviceVolts nominal voltage at the bus, between lines [V], above 0
 * @param lightLoadVolts highest voltage at the bus when the load is light, without the bank [V], above 0
 * @param frequencyHz of the supply [Hz], above 0
 * @param peakKw active demand when the bank matters most [kW], above 0
 * @param displacementPf lagging displacement power factor at that demand, in (0, 1]
 * @param targetPf power factor that the bank is to reach, in (0, 1]
 * @param netKvarhPerMonth lagging less leading [kvarh], any sign
 * @param lightestKvar smallest reactive load that is always there [kvar], 0 or more
 * @param nonLinearKva rectifiers, drives and the like, together [kVA], 0 or more
 * @param currentThd harmonic over fundamental current at the bus, 0 or more; 0.25 for 25 %
 * @param harmonicVoltages measured, by order from 2, each a fraction of the fundamental; empty if nobody measured
 * @param ambientCelsius highest mean over a day where the bank will stand [°C]
 * @param motors motors in question; an empty list says that there are none
 * @param generators whether generators can feed the bus
 */
public record SiteData(
        OptionalDouble transformerKva,
        OptionalDouble impedancePercent,
        OptionalDouble loadLossKw,
        OptionalDouble networkKva,
        OptionalDouble serviceVolts,
        OptionalDouble lightLoadVolts,
        OptionalDouble frequencyHz,
        OptionalDouble peakKw,
        OptionalDouble displacementPf,
        OptionalDouble targetPf,
        OptionalDouble netKvarhPerMonth,
        OptionalDouble lightestKvar,
        OptionalDouble nonLinearKva,
        OptionalDouble currentThd,
        Map<Integer, Double> harmonicVoltages,
        OptionalDouble ambientCelsius,
        Optional<List<Motor>> motors,
        Optional<Boolean> generators) {

    /** Refuses figures outside their ranges with an {@link IllegalArgumentException}. */
    public SiteData {
        transformerKva.ifPresent(value -> Given.positive("transformerKva", value, "kVA"));
        impedancePercent.ifPresent(
                value -> Given.value("impedancePercent", value, value > 0 && value <= 100, "above 0, up to 100 %"));
        loadLossKw.ifPresent(value -> Given.notNegative("loadLossKw", value, "kW"));
        networkKva.ifPresent(value -> Given.positive("networkKva", value, "kVA"));
        serviceVolts.ifPresent(value -> Given.positive("serviceVolts", value, "V"));
        lightLoadVolts.ifPresent(value -> Given.positive("lightLoadVolts", value, "V"));
        frequencyHz.ifPresent(value -> Given.positive("frequencyHz", value, "Hz"));
        peakKw.ifPresent(value -> Given.positive("peakKw", value, "kW"));
        displacementPf.ifPresent(value -> Given.powerFactor("displacementPf", value));
        targetPf.ifPresent(value -> Given.powerFactor("targetPf", value));
        netKvarhPerMonth.ifPresent(value -> Given.finite("netKvarhPerMonth", value, "kvarh"));
        lightestKvar.ifPresent(value -> Given.notNegative("lightestKvar", value, "kvar"));
        nonLinearKva.ifPresent(value -> Given.notNegative("nonLinearKva", value, "kVA"));
        currentThd.ifPresent(value -> Given.notNegative("currentThd", value, "of the fundamental"));
        harmonicVoltages = Map.copyOf(harmonicVoltages);
        harmonicVoltages.keySet().forEach(Given::order);
        harmonicVoltages
                .values()
                .forEach(
                        share -> Given.value("harmonicVoltages", share, share >= 0 && share < 1, "0 or more, below 1"));
        ambientCelsius.ifPresent(value -> Given.finite("ambientCelsius", value, "°C"));
        motors = motors.map(List::copyOf);
    }

    /** A site of which nothing is known yet. */
    public static Builder unknown() {
        return new Builder();
    }

    /**
     * Short-circuit power at the bus [kVA], absent without the transformer. Where the network's own level is not known the transformer
     * alone is counted, which takes the network for infinitely strong.
     */
    public OptionalDouble shortCircuitKva() {
        if (transformerKva.isEmpty() || impedancePercent.isEmpty()) {
            return OptionalDouble.empty();
        }
        double kva = transformerKva.getAsDouble();
        double percent = impedancePercent.getAsDouble();
        return OptionalDouble.of(
                networkKva.isPresent()
                        ? ShortCircuit.behindTransformerKva(kva, percent, networkKva.getAsDouble())
                        : ShortCircuit.behindTransformerKva(kva, percent));
    }

    /** What {@link #shortCircuitKva} leaves out, for the end of a sentence. */
    String networkWords() {
        return networkKva.isPresent() ? "" : "; the network before the transformer is taken as infinitely strong";
    }

    /** Non-linear load over the transformer's rating, absent unless both are known. */
    public OptionalDouble nonLinearShare() {
        return nonLinearKva.isPresent() && transformerKva.isPresent()
                ? OptionalDouble.of(nonLinearKva.getAsDouble() / transformerKva.getAsDouble())
                : OptionalDouble.empty();
    }

    /** Measured voltage distortion, root of the sum of squares, a fraction of the fundamental; 0 if nobody measured. */
    public double voltageDistortion() {
        return Math.sqrt(harmonicVoltages.values().stream()
                .mapToDouble(share -> share * share)
                .sum());
    }

    /** The load at its peak, absent unless demand and power factor are known. */
    public Optional<PowerTriangle> peak() {
        return peakKw.isPresent() && displacementPf.isPresent()
                ? Optional.of(PowerTriangle.lagging(peakKw.getAsDouble(), displacementPf.getAsDouble()))
                : Optional.empty();
    }

    /** Collects what is known; what is never said stays absent. */
    public static final class Builder {
        private OptionalDouble transformerKva = OptionalDouble.empty();
        private OptionalDouble impedancePercent = OptionalDouble.empty();
        private OptionalDouble loadLossKw = OptionalDouble.empty();
        private OptionalDouble networkKva = OptionalDouble.empty();
        private OptionalDouble serviceVolts = OptionalDouble.empty();
        private OptionalDouble lightLoadVolts = OptionalDouble.empty();
        private OptionalDouble frequencyHz = OptionalDouble.empty();
        private OptionalDouble peakKw = OptionalDouble.empty();
        private OptionalDouble displacementPf = OptionalDouble.empty();
        private OptionalDouble targetPf = OptionalDouble.empty();
        private OptionalDouble netKvarhPerMonth = OptionalDouble.empty();
        private OptionalDouble lightestKvar = OptionalDouble.empty();
        private OptionalDouble nonLinearKva = OptionalDouble.empty();
        private OptionalDouble currentThd = OptionalDouble.empty();
        private Map<Integer, Double> harmonicVoltages = Map.of();
        private OptionalDouble ambientCelsius = OptionalDouble.empty();
        private Optional<List<Motor>> motors = Optional.empty();
        private Optional<Boolean> generators = Optional.empty();

        private Builder() {}

        public Builder transformerKva(double transformerKva) {
            this.transformerKva = OptionalDouble.of(transformerKva);
            return this;
        }

        public Builder impedancePercent(double impedancePercent) {
            this.impedancePercent = OptionalDouble.of(impedancePercent);
            return this;
        }

        public Builder loadLossKw(double loadLossKw) {
            this.loadLossKw = OptionalDouble.of(loadLossKw);
            return this;
        }

        public Builder networkKva(double networkKva) {
            this.networkKva = OptionalDouble.of(networkKva);
            return this;
        }

        public Builder serviceVolts(double serviceVolts) {
            this.serviceVolts = OptionalDouble.of(serviceVolts);
            return this;
        }

        public Builder lightLoadVolts(double lightLoadVolts) {
            this.lightLoadVolts = OptionalDouble.of(lightLoadVolts);
            return this;
        }

        public Builder frequencyHz(double frequencyHz) {
            this.frequencyHz = OptionalDouble.of(frequencyHz);
            return this;
        }

        public Builder peakKw(double peakKw) {
            this.peakKw = OptionalDouble.of(peakKw);
            return this;
        }

        public Builder displacementPf(double displacementPf) {
            this.displacementPf = OptionalDouble.of(displacementPf);
            return this;
        }

        public Builder targetPf(double targetPf) {
            this.targetPf = OptionalDouble.of(targetPf);
            return this;
        }

        public Builder netKvarhPerMonth(double netKvarhPerMonth) {
            this.netKvarhPerMonth = OptionalDouble.of(netKvarhPerMonth);
            return this;
        }

        public Builder lightestKvar(double lightestKvar) {
            this.lightestKvar = OptionalDouble.of(lightestKvar);
            return this;
        }

        public Builder nonLinearKva(double nonLinearKva) {
            this.nonLinearKva = OptionalDouble.of(nonLinearKva);
            return this;
        }

        public Builder currentThd(double currentThd) {
            this.currentThd = OptionalDouble.of(currentThd);
            return this;
        }

        public Builder harmonicVoltages(Map<Integer, Double> harmonicVoltages) {
            this.harmonicVoltages = harmonicVoltages;
            return this;
        }

        public Builder ambientCelsius(double ambientCelsius) {
            this.ambientCelsius = OptionalDouble.of(ambientCelsius);
            return this;
        }

        public Builder motors(List<Motor> motors) {
            this.motors = Optional.of(motors);
            return this;
        }

        public Builder generators(boolean generators) {
            this.generators = Optional.of(generators);
            return this;
        }

        public SiteData build() {
            return new SiteData(
                    transformerKva,
                    impedancePercent,
                    loadLossKw,
                    networkKva,
                    serviceVolts,
                    lightLoadVolts,
                    frequencyHz,
                    peakKw,
                    displacementPf,
                    targetPf,
                    netKvarhPerMonth,
                    lightestKvar,
                    nonLinearKva,
                    currentThd,
                    harmonicVoltages,
                    ambientCelsius,
                    motors,
                    generators);
        }
    }
}
