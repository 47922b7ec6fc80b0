// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/** What the bank sets free in the transformer at the peak, harmonics left out. */
final class ReleasedCapacityScreen implements Screen {
    @Override
    public String name() {
        return "released capacity";
    }

    @Override
    public String unit() {
        return "kVA";
    }

    @Override
    public String limit() {
        return "some capacity set free, and at most 100 % of the transformer's rating afterwards";
    }

    @Override
    public String source() {
        return "IEEE Std 141-1993, ch. 8 (from memory)";
    }

    @Override
    public String settledBy() {
        return "the kVA and kvar of the highest demand intervals, from the meter";
    }

    @Override
    public Screening ask(SiteData site, BankData bank) {
        Needs needs = new Needs();
        double volts = needs.of(site.serviceVolts(), "the service voltage");
        double rating = needs.of(site.transformerKva(), "the transformer's kVA");
        PowerTriangle before = needs.of(
                site.peak(), new PowerTriangle(0, 0), "the peak active demand and its displacement power factor");
        if (needs.any()) {
            return notScreened(needs);
        }
        PowerTriangle after =
                before.withBank(bank.effectiveKvar(volts) * bank.tolerance().low());
        double released = before.apparentKva() - after.apparentKva();
        Verdict verdict = released <= 0 || after.apparentKva() > rating ? Verdict.LOOK_CLOSER : Verdict.FINE;
        return answer(
                verdict,
                released,
                Figure.of(released, 1, "kVA") + " set free at the peak; the transformer's load goes from "
                        + Figure.percent(before.apparentKva() / rating) + " to "
                        + Figure.percent(after.apparentKva() / rating) + " of its rating");
    }
}
