// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/** Whether capacitors alone can reach the target, where the meter counts harmonics. */
final class DistortionScreen implements Screen {
    @Override
    public String name() {
        return "true power factor";
    }

    @Override
    public String unit() {
        return "power factor";
    }

    @Override
    public String limit() {
        return "the target no higher than the best true power factor, look closer within 0.01 of it";
    }

    @Override
    public String source() {
        return "IEEE Std 1459-2010 (from memory); the margin common practice, no source";
    }

    @Override
    public String settledBy() {
        return "whether the meter bills true or displacement power factor, and the distortion at the billed demand";
    }

    @Override
    public Screening ask(SiteData site, BankData bank) {
        Needs needs = new Needs();
        double thd = needs.of(site.currentThd(), "the distortion of the current");
        double target = needs.of(site.targetPf(), "the power factor to reach");
        double displacement = needs.of(site.displacementPf(), "the present displacement power factor");
        if (needs.any()) {
            return notScreened(needs);
        }
        double ceiling = Distortion.ceiling(displacement, thd);
        Verdict verdict =
                target > ceiling ? Verdict.STOP : target > ceiling - 0.01 ? Verdict.LOOK_CLOSER : Verdict.FINE;
        return answer(
                verdict,
                ceiling,
                "with " + Figure.percent(thd) + " distortion capacitors reach a true power factor of "
                        + Figure.of(ceiling, 3, "") + " at best; the target is " + Figure.of(target, 3, ""));
    }
}
