// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/** Whether the busiest step is switched too often. */
final class OperationsScreen implements Screen {
    @Override
    public String name() {
        return "operations";
    }

    @Override
    public String unit() {
        return "a year";
    }

    @Override
    public String limit() {
        return "5000 switchings a year; a contactor of 100 000 operations should last the 10 years that a bank "
                + "is planned for";
    }

    @Override
    public String source() {
        return "IEC 60831 type guidance, AC-6b contactors (both from memory)";
    }

    @Override
    public String settledBy() {
        return "the controller's counter after a month, and longer delays if it hunts";
    }

    @Override
    public Screening ask(SiteData site, BankData bank) {
        Needs needs = new Needs();
        double perDay = needs.of(bank.operationsPerDay(), "the operations per day of the busiest step");
        if (needs.any()) {
            return notScreened(needs);
        }
        double perYear = SwitchingLife.perYear(perDay);
        double years = SwitchingLife.contactorYears(perDay);
        Verdict verdict = perYear > SwitchingLife.PER_YEAR || years < 10 ? Verdict.LOOK_CLOSER : Verdict.FINE;
        String life = Double.isInfinite(years) ? "does not wear" : "lasts about " + Figure.of(years, 1, "years");
        return answer(verdict, perYear, Figure.of(perYear, 0, "operations a year") + "; a contactor " + life);
    }
}
