// SPDX-License-Identifier: Apache-2.0
package tariff.service.request;

import jakarta.validation.Valid;
import jakarta.validation.constraints.AssertTrue;
import jakarta.validation.constraints.DecimalMax;
import jakarta.validation.constraints.DecimalMin;
import jakarta.validation.constraints.Max;
import jakarta.validation.constraints.Min;
import jakarta.validation.constraints.Size;
import java.math.BigDecimal;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import tariff.correction.CapacitorBank;
import tariff.correction.Controller;
import tariff.electrical.TemperatureClass;
import tariff.meter.Window;
import tariff.rate.clause.Written;

/** A bank as somebody offers it, with the ranges of {@link CapacitorBank} and bounds beyond any real one. */
public record BankTerms(
        @DecimalMin(value = "0", message = KVAR) @DecimalMax(value = MOST_KVAR, message = KVAR)
        BigDecimal fixedKvar,

        @Size(max = 64, message = "at most 64 steps")
        List<
                        @DecimalMin(value = "0", inclusive = false, message = STEP)
                        @DecimalMax(value = MOST_KVAR, message = STEP) BigDecimal>
                stepsKvar,

        Optional<
                        @DecimalMin(value = "0.5", message = "0.5 to 1") @DecimalMax(value = "1", message = "0.5 to 1")
                        BigDecimal>
                targetPowerFactor,

        Optional<@Min(value = 0, message = DELAY) @Max(value = Controller.MOST_DELAY_MINUTES, message = DELAY) Integer>
                switchingDelayMinutes,
        Optional<@Min(value = 1, message = OPERATIONS) @Max(value = MOST_OPERATIONS, message = OPERATIONS) Integer>
                operationsPerHour,
        Optional<@DecimalMin(value = "50", message = VOLTS) @DecimalMax(value = MOST_VOLTS, message = VOLTS) BigDecimal>
                ratedVolts,
        Optional<@DecimalMin(value = "50", message = VOLTS) @DecimalMax(value = MOST_VOLTS, message = VOLTS) BigDecimal>
                serviceVolts,

        @DecimalMin(value = "0", message = "0 to 0.25") @DecimalMax(value = "0.25", message = "0 to 0.25")
        BigDecimal reactorShare,

        @DecimalMin(value = "0", message = "0 to 50") @DecimalMax(value = "50", message = "0 to 50")
        BigDecimal wattsPerKvar,

        Optional<Window> off,
        Optional<@Valid Duty> duty) {
    private static final String MOST_KVAR = "1000000";
    private static final String MOST_VOLTS = "1000000";
    private static final String KVAR = "0 to 1000000 kvar";
    private static final String STEP = "above 0, at most 1000000 kvar";
    private static final String DELAY = "0 to 60 minutes";
    private static final int MOST_OPERATIONS = 10_000;
    private static final String OPERATIONS = "1 to 10000 an hour";
    private static final String VOLTS = "50 to 1000000 V";

    /** What only screens ask of a bank. */
    public record Duty(
            Optional<
                            @DecimalMin(value = "0", message = "0 to 100000 a day")
                            @DecimalMax(value = "100000", message = "0 to 100000 a day") BigDecimal>
                    operationsPerDay,
            Optional<
                            @DecimalMin(value = "0.1", message = "0.1 to 100000 A")
                            @DecimalMax(value = "100000", message = "0.1 to 100000 A") BigDecimal>
                    conductorAmps,
            Optional<TemperatureClass> temperatureClass) {
        static final Duty UNKNOWN = new Duty(Optional.empty(), Optional.empty(), Optional.empty());

        static Duty read(Written in) {
            Map<String, TemperatureClass> classes = Stream.of(TemperatureClass.values())
                    .collect(Collectors.toMap(each -> each.name(), each -> each, (a, b) -> a, TreeMap::new));
            Duty duty = new Duty(
                    in.optionalNumber("operationsPerDay"),
                    in.optionalNumber("conductorAmps"),
                    in.has("temperatureClass")
                            ? Optional.of(in.word("temperatureClass", classes, TemperatureClass.A))
                            : Optional.empty());
            in.refuseOtherKeys();
            return duty;
        }
    }

    public BankTerms {
        stepsKvar = List.copyOf(stepsKvar);
    }

    /** A plain bank at the service voltage. */
    public static BankTerms plain(BigDecimal fixedKvar, List<BigDecimal> stepsKvar) {
        return new BankTerms(
                fixedKvar,
                stepsKvar,
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                BigDecimal.ZERO,
                BigDecimal.ZERO,
                Optional.empty(),
                Optional.empty());
    }

    /** The same bank with what its controller is told, and when a time switch keeps it off. */
    public BankTerms told(
            Optional<BigDecimal> target,
            Optional<Integer> delayMinutes,
            Optional<Integer> mostAnHour,
            Optional<Window> keptOff) {
        return new BankTerms(
                fixedKvar,
                stepsKvar,
                target,
                delayMinutes,
                mostAnHour,
                ratedVolts,
                serviceVolts,
                reactorShare,
                wattsPerKvar,
                keptOff,
                duty);
    }

    static BankTerms read(Written in) {
        if (!in.isObject()) {
            in.wrong("type", "must be a bank", "an object with \"fixedKvar\", \"stepsKvar\" or both");
            return plain(BigDecimal.ONE, List.of());
        }
        BigDecimal fixedKvar = in.optionalNumber("fixedKvar").orElse(BigDecimal.ZERO);
        List<BigDecimal> stepsKvar = in.has("stepsKvar")
                ? in.list("stepsKvar").stream().map(Written::number).toList()
                : List.of();
        Optional<Duty> duty = in.has("duty") ? Optional.of(Duty.read(in.at("duty"))) : Optional.empty();
        return read(in, fixedKvar, stepsKvar, duty);
    }

    /** What does not depend on the size of a bank; the kvar are a stand-in. */
    static BankTerms readMake(Written in) {
        if (!in.isObject()) {
            in.wrong("type", "must be an object", "an object with \"ratedVolts\", \"reactorShare\" …");
            return plain(BigDecimal.ONE, List.of());
        }
        return read(in, BigDecimal.ZERO, List.of(BigDecimal.ONE), Optional.empty());
    }

    private static BankTerms read(Written in, BigDecimal fixedKvar, List<BigDecimal> stepsKvar, Optional<Duty> duty) {
        BankTerms terms = new BankTerms(
                fixedKvar,
                stepsKvar,
                in.optionalNumber("targetPowerFactor"),
                whole(in, "switchingDelayMinutes", 0, Controller.MOST_DELAY_MINUTES),
                whole(in, "operationsPerHour", 1, MOST_OPERATIONS),
                in.optionalNumber("ratedVolts"),
                in.optionalNumber("serviceVolts"),
                in.optionalNumber("reactorShare").orElse(BigDecimal.ZERO),
                in.optionalNumber("wattsPerKvar").orElse(BigDecimal.ZERO),
                in.has("off") ? Optional.of(OffHours.read(in.at("off"))) : Optional.empty(),
                duty);
        in.refuseOtherKeys();
        return terms;
    }

    private static Optional<Integer> whole(Written in, String key, int least, int most) {
        return in.has(key) ? Optional.of(in.wholeNumber(key, least, most)) : Optional.empty();
    }

    @AssertTrue(message = "\"fixedKvar\" above 0, \"stepsKvar\", or both")
    boolean isBank() {
        return fixedKvar.signum() > 0 || !stepsKvar.isEmpty();
    }

    @AssertTrue(message = "\"ratedVolts\" and \"serviceVolts\" together, or neither")
    boolean isVoltagePair() {
        return ratedVolts.isPresent() == serviceVolts.isPresent();
    }

    @AssertTrue(message = "\"switchingDelayMinutes\" and \"operationsPerHour\" only beside \"stepsKvar\"")
    boolean isToldToSteps() {
        return !stepsKvar.isEmpty() || (switchingDelayMinutes.isEmpty() && operationsPerHour.isEmpty());
    }

    public CapacitorBank bank() {
        return new CapacitorBank(
                fixedKvar,
                stepsKvar,
                new Controller(targetPowerFactor, switchingDelayMinutes.orElse(0), operationsPerHour),
                ratedVolts,
                serviceVolts,
                reactorShare,
                wattsPerKvar,
                off);
    }
}
