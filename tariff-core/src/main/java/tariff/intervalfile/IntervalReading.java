// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import java.util.List;
import java.util.stream.Stream;
import tariff.meter.IntervalSeries;
import tariff.meter.MonthlySums;
import tariff.notice.Assumption;
import tariff.notice.Finding;

/**
 * What a file gave.
 *
 * @param series the meter's intervals
 * @param warnings what was odd and how it was handled
 * @param assumptions what was taken to be so, every filled or omitted gap among it
 */
public record IntervalReading(IntervalSeries series, List<Finding> warnings, List<Assumption> assumptions) {
    public IntervalReading {
        warnings = List.copyOf(warnings);
        assumptions = List.copyOf(assumptions);
    }

    /** The assumptions, with the periods that the file holds only part of. */
    public List<Assumption> assumptions(MonthlySums sums) {
        return Stream.concat(assumptions.stream(), sums.partPeriods().stream()).toList();
    }
}
