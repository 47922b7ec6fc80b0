// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/** Whether the whole bank on a light load lifts the bus, or the capacitors, too high. */
final class VoltageRiseScreen implements Screen {
    @Override
    public String name() {
        return "voltage rise at light load";
    }

    @Override
    public String unit() {
        return "%";
    }

    @Override
    public String limit() {
        return "bus: look closer above 105 %, stop above 110 % of nominal; capacitors: 100 % continuously, 110 "
                + "% for 8 h in 24 h";
    }

    @Override
    public String source() {
        return "IEC 60831-1:2014 and IEEE Std 18-2002 for capacitors; ANSI C84.1 and EN 50160 for the bus (from "
                + "memory)";
    }

    @Override
    public String settledBy() {
        return "the voltage at the bus recorded over a week that holds a holiday";
    }

    @Override
    public Screening ask(SiteData site, BankData bank) {
        Needs needs = new Needs();
        double volts = needs.of(site.serviceVolts(), "the service voltage");
        double sc = needs.of(site.shortCircuitKva(), "the transformer's kVA and impedance");
        double light = needs.of(site.lightLoadVolts(), "the highest voltage at light load");
        if (needs.any()) {
            return notScreened(needs);
        }
        double rise =
                VoltageRise.percent(bank.effectiveKvar(volts) * bank.tolerance().high(), sc);
        double busVolts = light * (1 + rise / 100);
        double busRatio = busVolts / volts;
        double capacitorRatio = Detuning.capacitorVolts(busVolts, bank.reactorP()) / bank.ratedVolts();
        Verdict verdict = busRatio > 1.10 || capacitorRatio > 1.10
                ? Verdict.STOP
                : busRatio > 1.05 || capacitorRatio > 1 ? Verdict.LOOK_CLOSER : Verdict.FINE;
        return answer(
                verdict,
                rise,
                "the whole bank lifts the bus by " + Figure.of(rise, 2, "%") + ", to " + Figure.percent(busRatio)
                        + " of nominal at light load; the capacitors then stand " + Figure.percent(capacitorRatio)
                        + " of their rated voltage" + site.networkWords());
    }
}
