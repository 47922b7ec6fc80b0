// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/** Whether a step is so large that lamps and drives notice it. */
final class StepSizeScreen implements Screen {
    @Override
    public String name() {
        return "step size";
    }

    @Override
    public String unit() {
        return "%";
    }

    @Override
    public String limit() {
        return "a voltage change of 3 % at one switching; a dead band of two thirds of the smallest step";
    }

    @Override
    public String source() {
        return "common practice, no source";
    }

    @Override
    public String settledBy() {
        return "the network operator's rule on voltage changes, and interval data for the steps that the load "
                + "asks for";
    }

    @Override
    public Screening ask(SiteData site, BankData bank) {
        Needs needs = new Needs();
        double volts = needs.of(site.serviceVolts(), "the service voltage");
        double sc = needs.of(site.shortCircuitKva(), "the transformer's kVA and impedance");
        if (needs.any()) {
            return notScreened(needs);
        }
        double step = bank.largestSwitchedKvar(volts);
        double change = VoltageRise.percent(step, sc);
        return answer(
                change > 3 ? Verdict.LOOK_CLOSER : Verdict.FINE,
                change,
                "switching " + Figure.kvar(step) + " at once moves the voltage by " + Figure.of(change, 2, "%")
                        + "; "
                        + (bank.isFixed()
                                ? "nothing is regulated"
                                : "regulation leaves up to "
                                        + Figure.kvar(StepControl.residualKvar(bank.smallestStepKvar(volts)))));
    }
}
