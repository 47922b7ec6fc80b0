// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

/**
 * One figure that a meter or a bill gives for a period. Lagging is inductive, drawn from the network; leading is capacitive,
 * sent back. Both are kept as positive numbers in registers of their own.
 */
public enum Register {
    ENERGY_KWH("energyKwh", "kWh", Unit.KWH),
    LAGGING_KVARH("laggingKvarh", "lagging kvarh", Unit.KVARH),
    LEADING_KVARH("leadingKvarh", "leading kvarh", Unit.KVARH),
    APPARENT_KVAH("apparentKvah", "kVAh", Unit.KVAH),
    EXPORTED_KWH("exportedKwh", "exported kWh", Unit.KWH),
    PEAK_KW("peakKw", "kW", Unit.KW),
    PEAK_KVA("peakKva", "kVA", Unit.KVA),
    PEAK_LAGGING_KVAR("peakLaggingKvar", "lagging kvar", Unit.KVAR),
    PEAK_LEADING_KVAR("peakLeadingKvar", "leading kvar", Unit.KVAR),
    /** The power factor as printed on the bill, in (0, 1]. */
    POWER_FACTOR("powerFactor", "power factor", Unit.NUMBER);

    private final String key;
    private final String words;
    private final Unit unit;

    Register(String key, String words, Unit unit) {
        this.key = key;
        this.words = words;
        this.unit = unit;
    }

    /** The name in files and messages: {@code peakKw}. */
    public String key() {
        return key;
    }

    /** As a rate sheet says it: {@code lagging kvarh}. */
    public String words() {
        return words;
    }

    public Unit unit() {
        return unit;
    }

    /** Whether this is the highest demand of the period rather than a count over it. */
    public boolean isPeak() {
        return unit.dimension() == Unit.Dimension.DEMAND;
    }
}
