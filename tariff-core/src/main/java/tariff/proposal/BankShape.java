// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import tariff.correction.CapacitorBank;

/**
 * How a bank of any size is divided.
 *
 * @param fixedShare part that is always on, 0 to 1
 * @param steps equal switched steps of the rest; 0 only where all is fixed
 * @param like gives what does not depend on the size: controller, voltages, reactor, losses, time switch
 */
public record BankShape(BigDecimal fixedShare, int steps, CapacitorBank like) {
    private static final int STEP_DECIMALS = 2;

    /** Throws {@link IllegalArgumentException} if the share is outside 0 to 1, or the steps do not fit it. */
    public BankShape {
        if (fixedShare.signum() < 0 || fixedShare.compareTo(BigDecimal.ONE) > 0) {
            throw new IllegalArgumentException("fixedShare is " + fixedShare.toPlainString() + "; allowed: 0 to 1");
        }
        boolean allFixed = fixedShare.compareTo(BigDecimal.ONE) == 0;
        if (allFixed ? steps != 0 : steps < 1 || steps > 24) {
            throw new IllegalArgumentException("steps is " + steps + "; allowed: "
                    + (allFixed ? "0, as all kvar are fixed" : "1 to 24, as not all kvar are fixed"));
        }
    }

    /** A plain bank that is always on. */
    public static BankShape fixed() {
        return new BankShape(BigDecimal.ONE, 0, CapacitorBank.fixed("0"));
    }

    /** A plain bank of equal steps that aims at unity. */
    public static BankShape automatic(int steps) {
        return new BankShape(BigDecimal.ZERO, steps, CapacitorBank.fixed("0"));
    }

    /** A plain bank, partly always on, the rest in equal steps that aim at unity. */
    public static BankShape mixed(BigDecimal fixedShare, int steps) {
        return new BankShape(fixedShare, steps, CapacitorBank.fixed("0"));
    }

    /** The bank of this shape with so many rated kvar; the last step takes what the hundredths of the others leave. */
    public CapacitorBank of(BigDecimal kvar) {
        BigDecimal fixed = steps == 0 ? kvar : kvar.multiply(fixedShare);
        List<BigDecimal> each = List.of();
        if (steps > 0 && kvar.signum() > 0) {
            BigDecimal switched = kvar.subtract(fixed);
            BigDecimal step = switched.divide(BigDecimal.valueOf(steps), STEP_DECIMALS, RoundingMode.DOWN);
            each = new ArrayList<>(Collections.nCopies(steps - 1, step));
            each.add(switched.subtract(step.multiply(BigDecimal.valueOf(steps - 1L))));
        }
        return with(fixed, each);
    }

    CapacitorBank with(BigDecimal fixedKvar, List<BigDecimal> stepsKvar) {
        return like.withKvar(fixedKvar, stepsKvar);
    }
}
