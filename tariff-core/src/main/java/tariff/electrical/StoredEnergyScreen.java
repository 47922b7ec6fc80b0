// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

import java.util.OptionalDouble;

/** A reminder, for every bank, of what stays in it. */
final class StoredEnergyScreen implements Screen {
    private static final String WARNING =
            " after it is switched off, which can kill; qualified persons only: isolate, lock out, wait"
                    + " 5 minutes or more, test for absence of voltage, then short and earth every unit";

    @Override
    public String name() {
        return "stored energy";
    }

    @Override
    public String unit() {
        return "J";
    }

    @Override
    public String limit() {
        return "50 V after 1 min by the NEC, 75 V after 3 min by IEC; discharge resistors fail open";
    }

    @Override
    public String source() {
        return "NEC (NFPA 70) 460.6 as quoted in EC&M; IEC 60831-1:2014 (from memory); Oregon OAR "
                + "437-002-2322(1) for waiting, shorting and grounding";
    }

    @Override
    public String settledBy() {
        return "a voltage test at every unit, every time";
    }

    /** A caution that is given whatever is known. */
    @Override
    public Screening ask(SiteData site, BankData bank) {
        if (site.frequencyHz().isEmpty()) {
            return answer(Verdict.LOOK_CLOSER, OptionalDouble.empty(), "the bank keeps a charge" + WARNING);
        }
        double joules = StoredEnergy.joules(bank.ratedKvar(), site.frequencyHz().getAsDouble());
        return answer(
                Verdict.LOOK_CLOSER,
                joules,
                "at rated voltage the bank keeps about " + Figure.of(joules, 0, "J") + WARNING);
    }
}
