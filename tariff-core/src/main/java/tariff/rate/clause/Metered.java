// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.util.Optional;
import tariff.meter.Register;
import tariff.meter.Unit;

/** A quantity that a register gives as it is. */
public sealed interface Metered extends Quantity permits Energy, Peak {

    Register register();

    /** The window it is read in, the whole period if empty. */
    Optional<String> window();

    @Override
    default Optional<Unit> unit(Scope scope) {
        scope.checkWindow(window());
        return Optional.of(register().unit());
    }

    @Override
    default Figure value(Facts facts) {
        return facts.register(register(), window());
    }
}
