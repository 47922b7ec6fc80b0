// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.util.Optional;
import tariff.meter.Unit;

/** What stands where a quantity could not be read; never part of a rate that compiled. */
record Unreadable() implements Quantity {

    @Override
    public Optional<Unit> unit(Scope scope) {
        return Optional.empty();
    }

    @Override
    public Figure value(Facts facts) {
        throw new IllegalStateException("a rate with an unreadable quantity does not compile");
    }

    @Override
    public String words() {
        return "?";
    }
}
