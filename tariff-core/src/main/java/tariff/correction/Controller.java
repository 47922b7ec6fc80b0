// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import java.math.BigDecimal;
import java.util.Optional;

/**
 * What the controller of switched steps is told.
 *
 * @param targetPowerFactor what it aims at, in (0, 1], lagging; empty for unity
 * @param delayMinutes for how long switching must have been wanted before it is done, 0 to 60. A walk through interval data counts whole
 *     intervals, rounded up; a delay shorter than the interval counts as quick, for within an interval nothing is known
 * @param operationsPerHour how many steps may be switched in or out in any 60 minutes, 1 or more; empty for no limit
 */
public record Controller(
        Optional<BigDecimal> targetPowerFactor, int delayMinutes, Optional<Integer> operationsPerHour) {
    public static final int MOST_DELAY_MINUTES = 60;

    /** @throws IllegalArgumentException naming what is out of range */
    public Controller {
        if (targetPowerFactor
                .filter(pf -> pf.signum() <= 0 || pf.compareTo(BigDecimal.ONE) > 0)
                .isPresent()) {
            throw new IllegalArgumentException("targetPowerFactor is "
                    + targetPowerFactor.get().toPlainString() + "; allowed: above 0, at most 1");
        }
        if (delayMinutes < 0 || delayMinutes > MOST_DELAY_MINUTES) {
            throw new IllegalArgumentException("delayMinutes is " + delayMinutes + "; allowed: 0 to 60");
        }
        if (operationsPerHour.filter(most -> most < 1).isPresent()) {
            throw new IllegalArgumentException(
                    "operationsPerHour is " + operationsPerHour.get() + "; allowed: 1 or more");
        }
    }

    /** Aims at unity, at once and as often as it likes. */
    public static Controller quick() {
        return new Controller(Optional.empty(), 0, Optional.empty());
    }

    /** Aims at a power factor, at once and as often as it likes. */
    public static Controller aimingAt(BigDecimal powerFactor) {
        return new Controller(Optional.of(powerFactor), 0, Optional.empty());
    }

    /** The delay in intervals of so many minutes. */
    int delayIntervals(int stepMinutes) {
        return delayMinutes < stepMinutes ? 0 : (delayMinutes + stepMinutes - 1) / stepMinutes;
    }

    /** Whether it is held back in any way. */
    public boolean isHeldBack() {
        return delayMinutes > 0 || operationsPerHour.isPresent();
    }
}
