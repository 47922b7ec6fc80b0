// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import tariff.meter.Apparent;

/**
 * The highest demands of a stretch behind a fixed bank of any size. With P, n and b the active, lagging − leading and bank's energy of an
 * interval, its square of kVA is P² + n² − 2bn + b²: whatever the bank, one that lags more and has the smaller P² + n² is never the
 * highest. What is left is a handful.
 */
final class DemandFront {
    /** Below any net energy, with room for a bank. */
    private static final long NONE = Long.MIN_VALUE / 2;

    private final List<Interval> highest = new ArrayList<>();
    private long mostSwing;
    private long mostLagging = NONE;
    private long mostLeading = NONE;

    /**
     * One interval.
     *
     * @param active energy taken
     * @param net lagging − leading
     * @param swing what both registers counted
     */
    record Interval(long active, long net, long swing) {
        boolean isSmall() {
            return Apparent.squaresFit(active, net);
        }

        long squared() {
            return active * active + net * net;
        }
    }

    DemandFront(List<Interval> intervals) {
        long most = -1;
        for (Interval each :
                intervals.stream().sorted(Comparator.comparing(Interval::net)).toList()) {
            mostSwing = Math.max(mostSwing, each.swing());
            mostLagging = Math.max(mostLagging, each.swing() + each.net());
            mostLeading = Math.max(mostLeading, each.swing() - each.net());
            if (!each.isSmall()) {
                highest.add(each);
            } else if (each.squared() > most) {
                most = each.squared();
                highest.add(each);
            }
        }
    }

    long lagging(long bank) {
        return Math.max(mostSwing, mostLagging - bank);
    }

    long leading(long bank) {
        return Math.max(mostSwing, mostLeading + bank);
    }

    /** kVA in the unit of the energies × intervals per hour, each rounded half up as a month's are. */
    long apparent(long bank, int perHour) {
        return highest.stream()
                .mapToLong(each -> Apparent.of(each.active() * perHour, (each.net() - bank) * perHour))
                .max()
                .orElse(0);
    }
}
