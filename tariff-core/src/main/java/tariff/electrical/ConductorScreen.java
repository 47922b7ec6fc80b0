// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/** Whether conductors and disconnect carry the bank's current. */
final class ConductorScreen implements Screen {
    @Override
    public String name() {
        return "conductor rating";
    }

    @Override
    public String unit() {
        return "% of the bank's current";
    }

    @Override
    public String limit() {
        return "135 % of the bank's current by the NEC, stop below; 143 % by IEC with capacitance at +10 %, "
                + "look closer below";
    }

    @Override
    public String source() {
        return "NEC (NFPA 70) 460.8(A) as quoted in EC&M; IEC 60831-1:2014 (from memory)";
    }

    @Override
    public String settledBy() {
        return "the local wiring rules applied by a licensed engineer: ambient, grouping, fault rating, protection";
    }

    @Override
    public Screening ask(SiteData site, BankData bank) {
        Needs needs = new Needs();
        double volts = needs.of(site.serviceVolts(), "the service voltage");
        if (needs.any()) {
            return notScreened(needs);
        }
        double rated = CapacitorCurrent.ratedAmps(bank.effectiveKvar(volts), volts);
        double least = rated * Math.max(CapacitorCurrent.NEC_FACTOR, CapacitorCurrent.IEC_FACTOR_WITH_TOLERANCE);
        double necLeast = CapacitorCurrent.conductorAmps(rated);
        double ampacity = needs.of(
                bank.conductorAmps(),
                "the ampacity of conductors and disconnect; the bank draws " + Figure.of(rated, 1, "A")
                        + ", so at least " + Figure.of(necLeast, 1, "A") + " by the NEC and " + Figure.of(least, 1, "A")
                        + " by IEC");
        if (needs.any()) {
            return notScreened(needs);
        }
        Verdict verdict = ampacity < necLeast ? Verdict.STOP : ampacity < least ? Verdict.LOOK_CLOSER : Verdict.FINE;
        return answer(
                verdict,
                100 * ampacity / rated,
                "the bank draws " + Figure.of(rated, 1, "A") + " at the service voltage; " + Figure.of(ampacity, 1, "A")
                        + " is " + Figure.percent(ampacity / rated) + " of it");
    }
}
