// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.util.List;

/** The causes that are tried. A new one needs a line here and nowhere else. */
final class Causes {
    /** What may be otherwise in every month, likeliest first. */
    static final List<Cause> OF_THE_RATE = List.of(
            new PowerFactorRounding(),
            new PowerFactorBasis(),
            new LeadingKvarh(),
            new PointCount(),
            new DemandRounding(),
            new DemandRegister(),
            new AmountRounding(),
            new SeasonChoice(),
            new SeasonPrices(),
            new DaysBilled(),
            new RatchetLeftOut(),
            new LineLeftOut(),
            new PercentageNotInRate(),
            new AmountNotInRate(),
            new PeakBeforeTheBills());

    /** What may have happened to single bills. */
    static final List<Cause> OF_A_MONTH = List.of(
            new LinesNotInRate(),
            new SwappedTotal(),
            new SwappedDigits(),
            new SwappedRegisters(),
            new ReadingsOfTheMonthBefore(),
            new EstimatedReading());

    private Causes() {}
}
