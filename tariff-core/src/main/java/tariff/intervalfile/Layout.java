// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import java.util.Map;
import java.util.Optional;

/**
 * Which column holds what.
 *
 * @param firstRow the row of the sample where data begin
 * @param stamp the column of stamps, or of dates
 * @param time the column of times beside the dates, −1 if stamps carry them
 * @param figures the columns of figures
 * @param stampAt which end the stamps mark, if headers or a second stamp column tell
 * @param mark the decimal mark, 0 if not known
 */
record Layout(int firstRow, int stamp, int time, Map<Role, Figures> figures, Optional<StampAt> stampAt, char mark) {

    /**
     * One column of figures.
     *
     * @param column counted from 0
     * @param header as written
     * @param exponent power of ten to the kilo: −3 for Wh, 3 for MWh
     * @param isPower whether it is the average of an interval rather than its energy
     */
    record Figures(int column, String header, int exponent, boolean isPower) {}
}
