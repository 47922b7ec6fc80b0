// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;

/** Whether the harmonics measured are more than the capacitors may bear. */
final class HarmonicDutyScreen implements Screen {
    @Override
    public String name() {
        return "harmonic duty";
    }

    @Override
    public String unit() {
        return "% of the limit";
    }

    @Override
    public String limit() {
        return "voltage 110 %, crest 120 %, current 135 %, kvar 135 % of rating; current 130 %; look closer "
                + "from 90 % of a limit";
    }

    @Override
    public String source() {
        return "IEEE Std 18-2002 as quoted in an application guide; IEC 60831-1:2014 (from memory)";
    }

    @Override
    public String settledBy() {
        return "spectra measured with the bank on, in every combination of steps: resonance can multiply what "
                + "was measured without it";
    }

    @Override
    public Screening ask(SiteData site, BankData bank) {
        Needs needs = new Needs();
        double volts = needs.of(site.serviceVolts(), "the service voltage");
        if (site.harmonicVoltages().isEmpty()) {
            needs.add("measured harmonic voltages");
        }
        if (needs.any()) {
            return notScreened(needs);
        }
        for (int order : site.harmonicVoltages().keySet()) {
            if (Math.abs(bank.reactorP() * order * order - 1) < 0.01) {
                return answer(
                        Verdict.STOP,
                        OptionalDouble.empty(),
                        "the reactors are tuned to harmonic " + order + " and would drain it from the network");
            }
        }
        HarmonicDuty duty = HarmonicDuty.of(volts / bank.ratedVolts(), site.harmonicVoltages(), bank.reactorP());
        return answer(duty);
    }

    private Screening answer(HarmonicDuty duty) {
        String words = "";
        double most = 0;
        for (DutyLimits limits : List.of(DutyLimits.IEEE_18, DutyLimits.IEC_60831)) {
            for (Map.Entry<String, Double> used : limits.used(duty).entrySet()) {
                if (used.getValue() > most) {
                    most = used.getValue();
                    words = used.getKey() + " takes up " + Figure.percent(most) + " of the limit of "
                            + limits.edition();
                }
            }
        }
        Verdict verdict = most > 1 ? Verdict.STOP : most > 0.9 ? Verdict.LOOK_CLOSER : Verdict.FINE;
        return answer(verdict, 100 * most, words);
    }
}
