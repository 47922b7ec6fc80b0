// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.stream.Stream;
import tariff.meter.Register;

/** The power factor comes from other registers than the rate says. */
record PowerFactorBasis() implements Cause {
    private static final String FROM = "from";

    @Override
    public String code() {
        return "power-factor-basis";
    }

    @Override
    public Stream<Trial> trials(Case bills) {
        Map<String, String> bases = new LinkedHashMap<>();
        bases.put("energies", "from the period's kWh and kvarh");
        if (given(bills, Register.APPARENT_KVAH)) {
            bases.put("kVAh", "as kWh ÷ kVAh");
        }
        if (given(bills, Register.PEAK_KVA)) {
            bases.put("peak", "as highest kW ÷ highest kVA");
        }
        if (given(bills, Register.POWER_FACTOR)) {
            bases.put("printed", "as printed on the bill");
        }
        return bases.entrySet().stream()
                .flatMap(basis -> bills.written(
                        this,
                        "the power factor " + basis.getValue(),
                        PowerFactors.changed(bills.source(), rule -> from(rule, basis.getKey()))));
    }

    private static boolean given(Case bills, Register register) {
        return bills.anyMonth(month -> month.totals().has(register));
    }

    /** What leading kvarh do can only be said of a power factor from energies. */
    private static Map<?, ?> from(Map<?, ?> rule, String basis) {
        return basis.equals(rule.get(FROM)) ? rule : Keys.without(Keys.with(rule, FROM, basis), "leading");
    }
}
