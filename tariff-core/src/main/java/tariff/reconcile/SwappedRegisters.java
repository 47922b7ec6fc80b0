// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import tariff.meter.MeteredMonth;
import tariff.meter.Register;

/** kWh and kvarh stand in each other's place. */
record SwappedRegisters() implements Cause {

    @Override
    public String code() {
        return "registers-swapped";
    }

    @Override
    public Stream<Trial> trials(Case bills) {
        return bills.open().stream()
                .flatMap(place -> swapped(bills.months().get(place)).stream()
                        .map(month -> bills.read(this, "kWh and kvarh in each other's place", Map.of(place, month))));
    }

    private static Optional<MeteredMonth> swapped(MeteredMonth month) {
        return month.totals()
                .get(Register.ENERGY_KWH)
                .flatMap(kwh -> month.totals()
                        .get(Register.LAGGING_KVARH)
                        .map(kvarh -> month.with(
                                month.totals().with(Register.ENERGY_KWH, kvarh).with(Register.LAGGING_KVARH, kwh))));
    }
}
