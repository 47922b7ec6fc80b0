// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import java.time.ZoneId;
import java.util.Map;
import java.util.Optional;
import java.util.function.LongConsumer;
import tariff.csv.DateOrder;

/**
 * What the reader of a file is told; what it is not told it recognises from the data, or asks for in a finding.
 *
 * @param zone the clock of the bill, and of stamps that carry no offset
 * @param stampAt which end of the interval a stamp marks
 * @param dateOrder how 3/4/2026 is meant
 * @param gaps what is done about missing intervals
 * @param counter whether energies are readings of a register that counts up, each taken at its stamp
 * @param columns the header of a column by its role, where headers do not tell
 * @param listed how many findings of one kind are listed, at least 1; the others are counted
 * @param progress told now and then how many rows were read
 */
public record IntervalFileOptions(
        Optional<ZoneId> zone,
        Optional<StampAt> stampAt,
        Optional<DateOrder> dateOrder,
        GapRule gaps,
        boolean counter,
        Map<Role, String> columns,
        int listed,
        LongConsumer progress) {
    public IntervalFileOptions {
        columns = Map.copyOf(columns);
        if (listed < 1) {
            throw new IllegalArgumentException("at least one finding must be listed");
        }
    }

    /** Everything recognised; gaps refused. */
    public static IntervalFileOptions defaults() {
        return new IntervalFileOptions(
                Optional.empty(), Optional.empty(), Optional.empty(), GapRule.REFUSE, false, Map.of(), 20, rows -> {});
    }

    /** Everything recognised but the clock: {@code in("Europe/Berlin")}. */
    public static IntervalFileOptions in(String zone) {
        return defaults().zone(ZoneId.of(zone));
    }

    public IntervalFileOptions zone(ZoneId value) {
        return new IntervalFileOptions(
                Optional.of(value), stampAt, dateOrder, gaps, counter, columns, listed, progress);
    }

    public IntervalFileOptions stampAt(StampAt value) {
        return new IntervalFileOptions(zone, Optional.of(value), dateOrder, gaps, counter, columns, listed, progress);
    }

    public IntervalFileOptions dateOrder(DateOrder value) {
        return new IntervalFileOptions(zone, stampAt, Optional.of(value), gaps, counter, columns, listed, progress);
    }

    public IntervalFileOptions gaps(GapRule value) {
        return new IntervalFileOptions(zone, stampAt, dateOrder, value, counter, columns, listed, progress);
    }

    public IntervalFileOptions counter(boolean value) {
        return new IntervalFileOptions(zone, stampAt, dateOrder, gaps, value, columns, listed, progress);
    }

    public IntervalFileOptions columns(Map<Role, String> value) {
        return new IntervalFileOptions(zone, stampAt, dateOrder, gaps, counter, value, listed, progress);
    }

    public IntervalFileOptions listed(int value) {
        return new IntervalFileOptions(zone, stampAt, dateOrder, gaps, counter, columns, value, progress);
    }

    public IntervalFileOptions progress(LongConsumer value) {
        return new IntervalFileOptions(zone, stampAt, dateOrder, gaps, counter, columns, listed, value);
    }
}
