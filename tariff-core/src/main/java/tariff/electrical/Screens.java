// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

import java.util.List;

/**
 * Every question that a bank must answer. An answer is a screening estimate from few numbers; it shows where to look and is never a
 * design.
 */
public final class Screens {
    private static final List<Screen> HARMONICS =
            List.of(new ResonanceScreen(), new DetuningScreen(), new HarmonicDutyScreen(), new DistortionScreen());

    private static final List<Screen> ALL = List.of(
            new StoredEnergyScreen(),
            new ResonanceScreen(),
            new DetuningScreen(),
            new HarmonicDutyScreen(),
            new DistortionScreen(),
            new VoltageRiseScreen(),
            new LightLoadScreen(),
            new GeneratorScreen(),
            new MotorScreen(),
            new ConductorScreen(),
            new InrushScreen(),
            new StepSizeScreen(),
            new OperationsScreen(),
            new LifeScreen(),
            new ReleasedCapacityScreen(),
            new LossScreen());

    private Screens() {}

    /** The answers of those that look at harmonics: resonance, detuning, duty and distortion. */
    static List<Screening> harmonics(SiteData site, BankData bank) {
        return HARMONICS.stream().map(screen -> screen.ask(site, bank)).toList();
    }

    /** The answer of every screen, always all of them, in a fixed order. Missing data give {@link Verdict#NOT_SCREENED}. */
    public static List<Screening> all(SiteData site, BankData bank) {
        return ALL.stream().map(screen -> screen.ask(site, bank)).toList();
    }
}
