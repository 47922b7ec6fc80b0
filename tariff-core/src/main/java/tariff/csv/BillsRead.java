// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.util.List;
import tariff.meter.MeteredMonth;
import tariff.notice.Finding;

/**
 * A bills file, read.
 *
 * @param months the billing periods by date, none overlapping another, at least one
 * @param understood how the file was read, one sentence each: encoding, separator, marks, columns, rows left out
 * @param warnings what is doubtful but does not stop the reading
 */
public record BillsRead(List<MeteredMonth> months, List<String> understood, List<Finding> warnings) {
    public BillsRead {
        months = List.copyOf(months);
        understood = List.copyOf(understood);
        warnings = List.copyOf(warnings);
    }
}
