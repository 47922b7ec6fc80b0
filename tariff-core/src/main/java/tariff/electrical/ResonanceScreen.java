// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

import java.util.Comparator;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;

/**
 * Whether any combination of steps meets the network at a harmonic. Danger stops a bank only where harmonics are known to
 * be real, by non-linear load of 15 % of the transformer or a measured distortion above 3 %; where neither is known it is
 * still looked at closer, and any order that was measured counts beside the 5th, 7th, 11th and 13th.
 */
final class ResonanceScreen implements Screen {
    /** A share of the transformer's rating from which harmonic sources count. Common practice 15 to 20 %. */
    private static final double REAL_SHARE = 0.15;

    /** A measured voltage distortion from which they count too. Common practice 3 to 5 %. */
    private static final double REAL_DISTORTION = 0.03;

    @Override
    public String name() {
        return "parallel resonance";
    }

    @Override
    public String unit() {
        return "order";
    }

    @Override
    public String limit() {
        return "danger where a harmonic current is lifted 5 times or more, caution from 3 times, with the "
                + "capacitance anywhere in its tolerance";
    }

    @Override
    public String source() {
        return "order √(S/Q) as in IEEE Std 141-1993 (from memory); the bands are common practice, no source";
    }

    @Override
    public String settledBy() {
        return "a harmonic study: measured spectra, every supply configuration, damping; this estimate has none "
                + "of them";
    }

    @Override
    public Screening ask(SiteData site, BankData bank) {
        Needs needs = new Needs();
        double volts = needs.of(site.serviceVolts(), "the service voltage");
        double sc = needs.of(site.shortCircuitKva(), "the transformer's kVA and impedance");
        if (needs.any()) {
            return notScreened(needs);
        }
        Set<Integer> harmonics = new TreeSet<>(Set.of(5, 7, 11, 13));
        harmonics.addAll(site.harmonicVoltages().keySet());
        List<ResonancePoint> points = ResonancePoint.over(
                bank.capacitorKvarInService(volts), sc, bank.reactorP(), bank.tolerance(), harmonics);
        ResonancePoint worst = points.stream()
                .max(Comparator.comparingDouble(ResonancePoint::amplification))
                .orElseThrow();
        return answer(verdict(worst.band(), site), worst.order(), words(points, worst) + site.networkWords());
    }

    private static Verdict verdict(ResonanceBand band, SiteData site) {
        if (band == ResonanceBand.LOW) {
            return Verdict.FINE;
        }
        boolean harmonicsAreReal =
                site.nonLinearShare().orElse(0) >= REAL_SHARE || site.voltageDistortion() > REAL_DISTORTION;
        return band == ResonanceBand.DANGER && harmonicsAreReal ? Verdict.STOP : Verdict.LOOK_CLOSER;
    }

    private static String words(List<ResonancePoint> points, ResonancePoint worst) {
        return count(points, ResonanceBand.DANGER) + " of " + points.size() + " step combinations in the danger band, "
                + count(points, ResonanceBand.CAUTION) + " in the caution band; worst with "
                + Figure.kvar(worst.capacitorKvar()) + ": resonance at order " + Figure.of(worst.order(), 2, "")
                + ", harmonic "
                + worst.harmonic() + " multiplied by " + factor(worst.amplification());
    }

    private static String factor(double amplification) {
        return amplification < 20 ? Figure.of(amplification, 1, "") : "more than 20 unless damping stops it";
    }

    private static long count(List<ResonancePoint> points, ResonanceBand band) {
        return points.stream().filter(point -> point.band() == band).count();
    }
}
