// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/** Whether switching on draws more than contactors and capacitors bear. */
final class InrushScreen implements Screen {
    @Override
    public String name() {
        return "inrush current";
    }

    @Override
    public String unit() {
        return "times rated current";
    }

    @Override
    public String limit() {
        return "a crest of 100 times the rated current; up to 200 is reported for stepped banks without damping";
    }

    @Override
    public String source() {
        return "IEC 60831-1 as quoted by makers; a note on capacitor contactors";
    }

    @Override
    public String settledBy() {
        return "the inductance between the steps, contactors with damping resistors, and a discharge before "
                + "every reconnection";
    }

    @Override
    public Screening ask(SiteData site, BankData bank) {
        Needs needs = new Needs();
        double volts = needs.of(site.serviceVolts(), "the service voltage");
        double sc = needs.of(site.shortCircuitKva(), "the transformer's kVA and impedance");
        if (needs.any()) {
            return notScreened(needs);
        }
        double alone = bank.capacitorKvarInService(volts).stream()
                .mapToDouble(kvar -> Inrush.isolatedTimesRated(sc, kvar, bank.reactorP()))
                .max()
                .orElseThrow();
        boolean stepsMeet = !bank.isFixed() && bank.stepsKvar().size() > 1 && !bank.isDetuned();
        Verdict verdict = alone > Inrush.LIMIT || stepsMeet ? Verdict.LOOK_CLOSER : Verdict.FINE;
        String words = "switched on alone, the smallest part draws a crest of "
                + Figure.of(alone, 1, "times its rated current");
        return answer(
                verdict,
                alone,
                stepsMeet ? words + "; a later one, beside charged steps and without reactors, far more" : words);
    }
}
