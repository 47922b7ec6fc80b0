// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Stream;
import tariff.meter.MeteredMonth;
import tariff.meter.Register;

/** Two neighbouring digits of a reading stand in each other's place. Not sought where most months differ: such slips are rare. */
record SwappedDigits() implements Cause {
    private static final int FEW = 3;
    private static final Set<Register> READ = EnumSet.of(
            Register.ENERGY_KWH,
            Register.LAGGING_KVARH,
            Register.PEAK_KW,
            Register.PEAK_KVA,
            Register.PEAK_LAGGING_KVAR);

    @Override
    public String code() {
        return "digits-swapped";
    }

    @Override
    public Stream<Trial> trials(Case bills) {
        List<Integer> differing = bills.open().stream()
                .filter(place -> !isAgreement(bills, place))
                .toList();
        if (differing.size() > FEW && differing.size() * 2 > bills.charged().size()) {
            return Stream.empty();
        }
        return differing.stream().flatMap(place -> {
            MeteredMonth month = bills.months().get(place);
            return READ.stream()
                    .flatMap(register -> month.totals().get(register).stream()
                            .flatMap(value -> Digits.swapped(value).stream()
                                    .map(other -> bills.read(
                                            this,
                                            register.words() + " " + Digits.shown(other) + " for " + Digits.shown(value)
                                                    + " (digits swapped)",
                                            Map.of(
                                                    place,
                                                    month.with(month.totals().with(register, other)))))));
        });
    }

    /** A bill that agrees within rounding is not put down to a slip of the pen. */
    private static boolean isAgreement(Case bills, int place) {
        ReconciledMonth month = bills.charged().get(place);
        return month == null || month.verdict().isAgreement();
    }
}
