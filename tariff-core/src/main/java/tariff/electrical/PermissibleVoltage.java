// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

import java.util.List;

/**
 * How long a capacitor may stand a voltage.
 *
 * @param ratio voltage over rated
 * @param duration as the standard says it
 */
public record PermissibleVoltage(double ratio, String duration) {

    /** IEC 60831-1:2014, highest permissible voltage in service. Source: a page on capacitor life quoting it; 1.00 from memory. */
    public static final List<PermissibleVoltage> IEC_60831 = List.of(
            new PermissibleVoltage(1.00, "continuously"),
            new PermissibleVoltage(1.10, "8 h in 24 h"),
            new PermissibleVoltage(1.15, "30 min in 24 h"),
            new PermissibleVoltage(1.20, "5 min"),
            new PermissibleVoltage(1.30, "1 min"));

    /** IEEE Std 18-2002, power-frequency overvoltage. Source: quoted in an application guide. */
    public static final List<PermissibleVoltage> IEEE_18 = List.of(
            new PermissibleVoltage(1.10, "continuously"),
            new PermissibleVoltage(1.25, "30 min"),
            new PermissibleVoltage(1.30, "1 min"),
            new PermissibleVoltage(1.40, "15 s"),
            new PermissibleVoltage(1.70, "1 s"),
            new PermissibleVoltage(2.00, "0.25 s"),
            new PermissibleVoltage(2.20, "0.1 s"));

    /**
     * How long a table allows a voltage: the duration of the first row that reaches it, {@code never} beyond the last.
     *
     * @param table rising, such as {@link #IEC_60831}
     * @param ratio voltage over rated, above 0
     * @throws IllegalArgumentException if the ratio is not above 0
     */
    public static String durationAt(List<PermissibleVoltage> table, double ratio) {
        Given.positive("ratio", ratio, "of rated voltage");
        return table.stream()
                .filter(row -> ratio <= row.ratio)
                .map(PermissibleVoltage::duration)
                .findFirst()
                .orElse("never");
    }
}
