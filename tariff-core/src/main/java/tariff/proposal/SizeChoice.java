// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;
import tariff.correction.CapacitorBank;

/** The banks among which the best is sought. */
public sealed interface SizeChoice permits FreeSize, StepList {

    /** The best bank, the smaller of two that are equally good. */
    CapacitorBank best(Objective objective);

    /** The smallest bank of which something holds that holds of every larger one too, up to where it no longer does. */
    Optional<CapacitorBank> smallest(Predicate<CapacitorBank> holds);

    /** Those of the banks that are divided like this one. */
    SizeChoice like(CapacitorBank bank);

    /** Banks from small to large, enough of them to draw a curve. */
    List<CapacitorBank> curve();

    /** The largest kvar among the banks. */
    BigDecimal mostKvar();
}
