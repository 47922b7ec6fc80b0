// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/** Whether the bank turns the site leading when the load is light. */
final class LightLoadScreen implements Screen {
    @Override
    public String name() {
        return "leading power at light load";
    }

    @Override
    public String unit() {
        return "kvar";
    }

    @Override
    public String limit() {
        return "a fixed bank no larger than the smallest reactive load; a larger one also above 15 % of the "
                + "transformer's rating is stopped";
    }

    @Override
    public String source() {
        return "IEEE Std 1036-2010 for the smallest load, Electrical Installation Guide 2008, ch. L for 15 % "
                + "(both from memory)";
    }

    @Override
    public String settledBy() {
        return "interval data of kvarh over a week that holds a holiday, and what the rate says of leading kvarh";
    }

    @Override
    public Screening ask(SiteData site, BankData bank) {
        Needs needs = new Needs();
        double volts = needs.of(site.serviceVolts(), "the service voltage");
        double lightest = bank.isFixed()
                ? needs.of(site.lightestKvar(), "the smallest reactive load that is always there")
                : Double.NaN;
        if (needs.any()) {
            return notScreened(needs);
        }
        return bank.isFixed() ? fixed(site, bank, volts, lightest) : automatic(bank, volts);
    }

    private Screening fixed(SiteData site, BankData bank, double volts, double lightest) {
        double most = bank.effectiveKvar(volts) * bank.tolerance().high();
        double leading = Math.max(0, most - lightest);
        boolean large = site.transformerKva().isPresent()
                && most > 0.15 * site.transformerKva().getAsDouble();
        return answer(
                leading == 0 ? Verdict.FINE : large ? Verdict.STOP : Verdict.LOOK_CLOSER,
                leading,
                "a fixed bank of up to " + Figure.kvar(most) + " on " + Figure.kvar(lightest) + " sends back up to "
                        + Figure.kvar(leading));
    }

    private Screening automatic(BankData bank, double volts) {
        double residual = StepControl.residualKvar(bank.smallestStepKvar(volts));
        return answer(
                Verdict.FINE,
                residual,
                "a controller that takes out its last step sends back no more than " + Figure.kvar(residual));
    }
}
