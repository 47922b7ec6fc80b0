// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/** What temperature and voltage leave of the capacitors' life. Neither coolness nor a low voltage is credited. */
final class LifeScreen implements Screen {
    @Override
    public String name() {
        return "life";
    }

    @Override
    public String unit() {
        return "times rated life";
    }

    @Override
    public String limit() {
        return "the day's mean of the temperature class and the rated voltage; stop beyond 10 K or 110 %, or "
                + "below half the rated life";
    }

    @Override
    public String source() {
        return "IEC 60831-1 classes (means from memory); 10 K rule and ninth power from a note quoting a maker; "
                + "the verdict common practice, no source";
    }

    @Override
    public String settledBy() {
        return "the temperature inside the cabinet in summer, and the maker's life curve";
    }

    @Override
    public Screening ask(SiteData site, BankData bank) {
        Needs needs = new Needs();
        double volts = needs.of(site.serviceVolts(), "the service voltage");
        double ambient = needs.of(site.ambientCelsius(), "the highest mean temperature over a day");
        TemperatureClass letter =
                needs.of(bank.temperatureClass(), TemperatureClass.A, "the capacitors' temperature class");
        if (needs.any()) {
            return notScreened(needs);
        }
        double ratio = Detuning.capacitorVolts(volts, bank.reactorP()) / bank.ratedVolts();
        double kelvin = ambient - letter.dayMeanCelsius();
        double life = Math.min(1, Life.temperatureFactor(kelvin)) * Math.min(1, Life.voltageFactor(ratio));
        Verdict verdict = kelvin > 10 || ratio > 1.10 || life < 0.5
                ? Verdict.STOP
                : kelvin > 0 || ratio > 1 ? Verdict.LOOK_CLOSER : Verdict.FINE;
        return answer(
                verdict,
                life,
                "a day's mean of " + Figure.of(ambient, 0, "°C") + " against " + letter.dayMeanCelsius()
                        + " °C of class " + letter
                        + " and " + Figure.percent(ratio) + " of rated voltage give about "
                        + Figure.of(life, 2, "times")
                        + " the rated life");
    }
}
