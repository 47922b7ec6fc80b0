// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/** Whether a generator could be left with a leading load. */
final class GeneratorScreen implements Screen {
    @Override
    public String name() {
        return "generators";
    }

    @Override
    public String unit() {
        return "kvar";
    }

    @Override
    public String limit() {
        return "an alternator takes back 10 to 20 % of its rated kvar at most, then loses control of its voltage";
    }

    @Override
    public String source() {
        return "common practice (from memory); a paper on alternators with leading loads";
    }

    @Override
    public String settledBy() {
        return "an interlock that keeps the bank off, or the capability curve of the alternator";
    }

    @Override
    public Screening ask(SiteData site, BankData bank) {
        Needs needs = new Needs();
        boolean present = needs.of(site.generators(), false, "word whether generators can feed the bus");
        if (needs.any()) {
            return notScreened(needs);
        }
        double kvar = bank.ratedKvar();
        return present
                ? answer(
                        Verdict.LOOK_CLOSER,
                        kvar,
                        "generators can feed the bus: " + Figure.kvar(kvar) + " must be off while they do")
                : answer(Verdict.FINE, kvar, "no generator feeds the bus");
    }
}
