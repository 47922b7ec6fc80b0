// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

import java.util.Map;
import java.util.OptionalDouble;
import java.util.TreeMap;

/**
 * What a capacitor may bear for long, as multiples of its rating. These are margins for contingencies, not a basis of design.
 *
 * @param edition the standard
 * @param rmsVoltage over rated
 * @param peakVoltage over rated crest, if the standard has such a limit
 * @param rmsCurrent over rated
 * @param kvar over rated, if the standard has such a limit
 */
public record DutyLimits(
        String edition, double rmsVoltage, OptionalDouble peakVoltage, double rmsCurrent, OptionalDouble kvar) {

    /** IEEE Std 18-2002: 110 % voltage, 120 % crest, 135 % current, 135 % kvar. Source: as quoted in an application guide. */
    public static final DutyLimits IEEE_18 =
            new DutyLimits("IEEE Std 18-2002", 1.10, OptionalDouble.of(1.20), 1.35, OptionalDouble.of(1.35));

    /** IEC 60831-1:2014: 1.10 of voltage (8 h in 24 h), 1.30 of current. From memory. */
    public static final DutyLimits IEC_60831 =
            new DutyLimits("IEC 60831-1:2014", 1.10, OptionalDouble.empty(), 1.30, OptionalDouble.empty());

    /** Each part of a duty over its limit, by name; above 1 it is exceeded. */
    public Map<String, Double> used(HarmonicDuty duty) {
        Map<String, Double> used = new TreeMap<>();
        used.put("rms voltage", duty.rmsVoltage() / rmsVoltage);
        used.put("rms current", duty.rmsCurrent() / rmsCurrent);
        peakVoltage.ifPresent(limit -> used.put("peak voltage", duty.peakVoltage() / limit));
        kvar.ifPresent(limit -> used.put("kvar", duty.kvar() / limit));
        return used;
    }

    /** Whether every part is within its limit. */
    public boolean allow(HarmonicDuty duty) {
        return used(duty).values().stream().allMatch(share -> share <= 1);
    }
}
