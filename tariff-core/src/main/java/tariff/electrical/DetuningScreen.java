// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/** Whether the bank needs reactors, or has the right ones. */
final class DetuningScreen implements Screen {
    @Override
    public String name() {
        return "detuning";
    }

    @Override
    public String unit() {
        return "% of the transformer";
    }

    @Override
    public String limit() {
        return "non-linear load over the transformer's rating: plain up to 15 %, stronger capacitors up to 25 "
                + "%, reactors up to 60 %, filters above; plain up to 3 % voltage distortion; tuning below order "
                + "4.5; capacitors rated for the voltage behind the reactor";
    }

    @Override
    public String source() {
        return "Electrical Installation Guide 2008, ch. L, simplified rule up to 2 MVA (from memory); "
                + "distortion and tuning common practice, no source";
    }

    @Override
    public String settledBy() {
        return "measured voltage and current spectra, the 3rd harmonic among them where loads are single-phase";
    }

    @Override
    public Screening ask(SiteData site, BankData bank) {
        Needs needs = new Needs();
        double volts = bank.isDetuned() ? needs.of(site.serviceVolts(), "the service voltage") : Double.NaN;
        double share = needs.of(site.nonLinearShare(), "the non-linear load in kVA and the transformer's kVA");
        if (needs.any()) {
            return notScreened(needs);
        }
        return bank.isDetuned() ? detuned(share, volts, bank) : plain(share, site.voltageDistortion());
    }

    private Screening plain(double share, double distortion) {
        Verdict verdict =
                share > 0.25 ? Verdict.STOP : share > 0.15 || distortion > 0.03 ? Verdict.LOOK_CLOSER : Verdict.FINE;
        return answer(
                verdict,
                100 * share,
                "non-linear load is " + Figure.percent(share) + " of the transformer"
                        + (distortion > 0 ? ", voltage distortion " + Figure.percent(distortion) : "")
                        + "; the bank has no reactors");
    }

    private Screening detuned(double share, double volts, BankData bank) {
        double order = Detuning.order(bank.reactorP());
        double ratio = Detuning.capacitorVolts(volts, bank.reactorP()) / bank.ratedVolts();
        Verdict verdict = ratio > 1 || order >= 5
                ? Verdict.STOP
                : share > 0.60 || order > 4.5 ? Verdict.LOOK_CLOSER : Verdict.FINE;
        return answer(
                verdict,
                100 * share,
                "non-linear load is " + Figure.percent(share) + " of the transformer; the reactors tune to order "
                        + Figure.of(order, 2, "") + " and put " + Figure.percent(ratio)
                        + " of rated voltage on the capacitors");
    }
}
