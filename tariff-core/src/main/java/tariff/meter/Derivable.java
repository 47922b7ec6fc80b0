// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

import java.math.BigDecimal;
import java.util.Optional;
import java.util.function.Function;

/**
 * Registers that a bill leaves out and that follow from those it gives, under a named assumption. Nothing else is ever filled in.
 */
public enum Derivable {
    PEAK_KVA(
            Register.PEAK_KVA,
            "peak-kva-derived",
            "peak kVA taken as peak kW ÷ the month's power factor",
            "give peak kVA",
            readings -> both(
                    readings.get(Register.PEAK_KW),
                    powerFactor(readings),
                    (kw, pf) -> kw.divide(pf, Triangle.PRECISION))),
    PEAK_KW(
            Register.PEAK_KW,
            "peak-kw-derived",
            "peak kW taken as peak kVA × the month's power factor",
            "give peak kW",
            readings -> both(readings.get(Register.PEAK_KVA), powerFactor(readings), BigDecimal::multiply)),
    PEAK_LAGGING_KVAR(
            Register.PEAK_LAGGING_KVAR,
            "peak-kvar-derived",
            "peak kvar taken as √(kVA² − kW²), as if kW and kVA peaked together",
            "give peak kvar",
            readings -> both(readings.get(Register.PEAK_KW), readings.get(Register.PEAK_KVA), Triangle::reactive)),
    PEAK_LAGGING_KVAR_FROM_MONTH(
            Register.PEAK_LAGGING_KVAR,
            "peak-kvar-from-month",
            "peak kvar taken as peak kW × the month's kvarh ÷ kWh",
            "give peak kvar or peak kVA",
            readings -> both(
                    readings.get(Register.PEAK_KW),
                    powerFactor(readings),
                    (kw, pf) -> kw.multiply(Triangle.tangent(pf)))),
    LAGGING_KVARH(
            Register.LAGGING_KVARH,
            "kvarh-derived",
            "lagging kvarh worked out from kWh and the printed power factor",
            "give lagging kvarh",
            readings -> both(
                    readings.get(Register.ENERGY_KWH),
                    readings.get(Register.POWER_FACTOR),
                    (kwh, pf) -> kwh.multiply(Triangle.tangent(pf)))),
    LEADING_KVARH(
            Register.LEADING_KVARH,
            "leading-absent",
            "no leading kvarh on the bill, taken as none",
            "give leading kvarh, or 0",
            readings -> Optional.of(BigDecimal.ZERO)),
    PEAK_LEADING_KVAR(
            Register.PEAK_LEADING_KVAR,
            "peak-leading-absent",
            "no leading kvar on the bill, taken as none",
            "give peak leading kvar, or 0",
            readings -> Optional.of(BigDecimal.ZERO)),
    POWER_FACTOR(
            Register.POWER_FACTOR,
            "power-factor-derived",
            "the printed power factor taken as kWh ÷ √(kWh² + lagging kvarh²)",
            "give the power factor on the bill",
            Derivable::powerFactor),
    APPARENT_KVAH(
            Register.APPARENT_KVAH,
            "kvah-derived",
            "kVAh taken as √(kWh² + lagging kvarh²), which a meter that adds up kVAh never falls below",
            "give kVAh",
            readings ->
                    both(readings.get(Register.ENERGY_KWH), readings.get(Register.LAGGING_KVARH), Triangle::apparent)),
    EXPORTED_KWH(
            Register.EXPORTED_KWH,
            "export-absent",
            "no exported kWh on the bill, taken as none",
            "give exported kWh, or 0",
            readings -> Optional.of(BigDecimal.ZERO));

    private final Register register;
    private final String code;
    private final String assumed;
    private final String remedy;
    private final Function<Readings, Optional<BigDecimal>> rule;

    Derivable(
            Register register,
            String code,
            String assumed,
            String remedy,
            Function<Readings, Optional<BigDecimal>> rule) {
        this.register = register;
        this.code = code;
        this.assumed = assumed;
        this.remedy = remedy;
        this.rule = rule;
    }

    public Register register() {
        return register;
    }

    /** For programs: {@code peak-kva-derived}. */
    public String code() {
        return code;
    }

    /** What is assumed, in words. */
    public String assumed() {
        return assumed;
    }

    /** What would make it unnecessary. */
    public String remedy() {
        return remedy;
    }

    /** The value that follows, empty if the readings do not give enough. */
    public Optional<BigDecimal> from(Readings readings) {
        return rule.apply(readings);
    }

    private static Optional<BigDecimal> powerFactor(Readings readings) {
        Optional<BigDecimal> printed = readings.get(Register.POWER_FACTOR);
        if (printed.isPresent()) {
            return printed;
        }
        return both(readings.get(Register.ENERGY_KWH), readings.get(Register.LAGGING_KVARH), Derivable::ratio)
                .filter(pf -> pf.signum() > 0);
    }

    private static BigDecimal ratio(BigDecimal kwh, BigDecimal kvarh) {
        return kwh.signum() == 0 ? BigDecimal.ZERO : Triangle.powerFactor(kwh, Triangle.apparent(kwh, kvarh));
    }

    private static Optional<BigDecimal> both(
            Optional<BigDecimal> first,
            Optional<BigDecimal> second,
            java.util.function.BinaryOperator<BigDecimal> combine) {
        return first.flatMap(a -> second.map(b -> combine.apply(a, b)));
    }
}
