// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.util.Map;
import java.util.stream.Stream;

/** Demand is billed on kVA where the rate says kW, or the other way about. */
record DemandRegister() implements Cause {

    @Override
    public String code() {
        return "demand-register";
    }

    @Override
    public Stream<Trial> trials(Case bills) {
        return Stream.concat(swapped(bills, "kW", "kVA"), swapped(bills, "kVA", "kW"));
    }

    private Stream<Trial> swapped(Case bills, String rated, String billed) {
        return bills.rewritten(this, billed + " billed where the rate says " + rated, value -> {
            boolean isRated = value instanceof Map<?, ?> map && rated.equals(map.get("peak"));
            return isRated ? Keys.with((Map<?, ?>) value, "peak", billed) : value;
        });
    }
}
