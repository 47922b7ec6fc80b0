// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import java.util.Map;
import java.util.Optional;

/**
 * What the values of a MeterReading are. The codes are those of NAESB REQ.21 (ESPI), schema 4.0 of 2023-12-13: UnitSymbolKind,
 * FlowDirectionKind, AccumulationKind, DataQualifierKind, CommodityKind, UnitMultiplierKind.
 *
 * @param unit 72 Wh, 73 VArh, 38 W, 63 VAr
 * @param flow 1 forward, 2 lagging, 3 leading, 4 net, 5 to 18 quadrants, 19 reverse; 0 not said
 * @param accumulation 4 what was added in the interval; 0 not said
 * @param qualifier 2 average
 * @param commodity 1, 2 and 26 electricity; 0 not said
 * @param multiplier power of ten of the values
 * @param intervalSeconds length of an interval whose reading does not say it; 0 not said
 */
record EspiReadingType(
        int unit, int flow, int accumulation, int qualifier, int commodity, int multiplier, int intervalSeconds) {
    private static final int WH = 72;
    private static final int VARH = 73;
    private static final int W = 38;
    private static final int VAR = 63;

    /** @throws NumberFormatException if a code is no whole number */
    static EspiReadingType of(Map<String, String> fields) {
        return new EspiReadingType(
                code(fields, "uom"),
                code(fields, "flowDirection"),
                code(fields, "accumulationBehaviour"),
                code(fields, "dataQualifier"),
                code(fields, "commodity"),
                code(fields, "powerOfTenMultiplier"),
                code(fields, "intervalLength"));
    }

    private static int code(Map<String, String> fields, String name) {
        return Integer.parseInt(fields.getOrDefault(name, "0"));
    }

    /** Empty for what a bill of electricity has no use for: gas, volts, registers, values of an instant. */
    Optional<Role> role() {
        boolean electricity = commodity <= 2 || commodity == 26;
        boolean energy = (unit == WH || unit == VARH) && (accumulation == 4 || accumulation == 0);
        boolean average = (unit == W || unit == VAR) && qualifier == 2;
        if (!electricity || !(energy || average)) {
            return Optional.empty();
        }
        return unit == WH || unit == W ? active() : reactive();
    }

    private Optional<Role> active() {
        return switch (flow) {
            case 0, 1, 4, 8 -> Optional.of(Role.ACTIVE);
            case 10, 19 -> Optional.of(Role.EXPORTED);
            default -> Optional.empty();
        };
    }

    /** Lagging is what a load takes: the first quadrant, and the second where a meter adds both. */
    private Optional<Role> reactive() {
        return switch (flow) {
            case 1, 2, 5, 15 -> Optional.of(Role.LAGGING);
            case 3, 13, 18, 19 -> Optional.of(Role.LEADING);
            case 0, 4, 9 -> Optional.of(Role.REACTIVE);
            default -> Optional.empty();
        };
    }

    boolean isPower() {
        return unit == W || unit == VAR;
    }

    String words() {
        return "uom " + unit + ", flowDirection " + flow + ", accumulationBehaviour " + accumulation;
    }
}
