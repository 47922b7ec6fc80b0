// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import java.util.Map;
import java.util.Optional;
import tariff.meter.IntervalSeries;
import tariff.meter.Window;
import tariff.meter.WindowCalendar;

/** Holds a bank off in a window, by the clock of a series; an interval goes by its start. */
final class TimeSwitch {
    private static final String OFF = "off";

    private final WindowCalendar calendar;

    TimeSwitch(IntervalSeries series, Optional<Window> off) {
        this.calendar = new WindowCalendar(
                series, off.map(window -> Map.of(OFF, window)).orElse(Map.of()));
    }

    boolean isOff(int interval) {
        return calendar.mask(interval) != 0;
    }
}
