// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/**
 * Whether the bank saves more in the transformer than it burns itself. A fixed bank exactly; for an automatic one, a bank
 * fixed at the mean reactive load (or at its whole size, if that is less) saves no more and burns no less as long as the
 * load itself never leads, so the balance is at least about this.
 */
final class LossScreen implements Screen {
    /** A twelfth of a year [h]. */
    private static final double HOURS = 730;

    @Override
    public String name() {
        return "losses";
    }

    @Override
    public String unit() {
        return "kWh a month";
    }

    @Override
    public String limit() {
        return "more saved in the transformer than lost in the bank; no other kWh are saved";
    }

    @Override
    public String source() {
        return "I²R, own arithmetic";
    }

    @Override
    public String settledBy() {
        return "the transformer's test report, cable lengths if the bank stands at the load, and interval data";
    }

    @Override
    public Screening ask(SiteData site, BankData bank) {
        Needs needs = new Needs();
        double volts = needs.of(site.serviceVolts(), "the service voltage");
        double rating = needs.of(site.transformerKva(), "the transformer's kVA");
        double loadLoss = needs.of(site.loadLossKw(), "the transformer's load loss");
        double net = needs.of(site.netKvarhPerMonth(), "the net kvarh of a month");
        if (needs.any()) {
            return notScreened(needs);
        }
        double kvar = bank.effectiveKvar(volts);
        if (!bank.isFixed()) {
            kvar = Math.min(kvar, Math.max(0, net / HOURS));
        }
        double saved = SeriesLosses.savedKwh(SeriesLosses.perKva2(loadLoss, rating), kvar, net, HOURS);
        double own = SeriesLosses.ownKwh(bank.lossWattsPerKvar(), kvar, HOURS);
        return answer(
                saved > own ? Verdict.FINE : Verdict.LOOK_CLOSER,
                saved - own,
                "in " + Figure.of(HOURS, 0, "h") + " the transformer loses about "
                        + Figure.of(saved, 1, "kWh") + " less and the bank turns about "
                        + Figure.of(own, 1, "kWh") + " into heat");
    }
}
