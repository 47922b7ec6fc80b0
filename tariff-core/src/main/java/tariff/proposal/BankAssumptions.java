// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import static tariff.meter.Register.PEAK_KVA;
import static tariff.meter.Register.PEAK_LAGGING_KVAR;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tariff.correction.CapacitorBank;
import tariff.meter.MeteredMonth;
import tariff.notice.Assumption;
import tariff.rate.Rate;
import tariff.rate.WindowWords;
import tariff.rate.clause.Metered;

/** What an assessment takes to be so about a bank and the year it would meet. */
final class BankAssumptions {
    private static final String YEAR = "the year";
    private static final String INTERVALS = "interval data settle it";

    private BankAssumptions() {}

    /** @param open how many weeks of interval data would settle what totals leave open, if they leave much */
    static List<Assumption> of(
            Rate rate, Proposal proposal, List<MeteredMonth> year, boolean exact, Optional<SampleWeeks> open) {
        CapacitorBank bank = proposal.bank();
        List<Assumption> all = new ArrayList<>();
        if (!exact) {
            all.addAll(ofTotals(rate, year, open));
        }
        if (!exact) {
            all.addAll(ofSwitching(bank));
        }
        all.add(new Assumption(
                "bank-always-on",
                YEAR,
                bank.off()
                                .map(off -> "a time switch keeps the whole bank off " + WindowWords.of(off)
                                        + "; in the other hours ")
                                .orElse("")
                        + inService(bank, exact),
                bank.off().isPresent() ? "none" : "switch it by time, and say in which hours"));
        all.add(new Assumption(
                "rated-output",
                YEAR,
                "the bank gives its rated kvar at the stated voltage; new capacitors may differ by −5 to +10 % (IEC 60831-1:2014, from memory)",
                "give the measured kvar"));
        if (bank.wattsPerKvar().signum() == 0) {
            all.add(new Assumption(
                    "bank-losses", YEAR, "the bank's own losses are left out", "give its losses in W per kvar"));
        }
        all.add(new Assumption(
                "year-repeats", YEAR, "every later year has the same load as the year of the bills", "none"));
        if (rate.looksBack()) {
            all.add(new Assumption(
                    "in-service-on-the-first-day",
                    YEAR,
                    "the bank goes into service on the first day of the first month; the ratchet then remembers the year before",
                    "none"));
        }
        return all;
    }

    private static String inService(CapacitorBank bank, boolean exact) {
        boolean always = bank.off().isEmpty();
        if (!bank.isAutomatic()) {
            return always ? "the bank is on in every hour of the year" : "it is always on";
        }
        String fixed = always ? "the fixed kvar are on in every hour; " : "the fixed kvar are always on; ";
        return (bank.fixedKvar().signum() > 0 ? fixed : "")
                + (exact
                        ? "the steps follow the load interval by interval, as their controller lets them"
                        : "the steps follow the load as far as whole steps can: the low savings count two thirds of the smallest"
                                + " step, or half of a wider gap between two outputs, against them in every hour, the central"
                                + " what the load curve tells, the high nothing");
    }

    /** What monthly totals do not show of a bank that is switched off or held back. */
    private static List<Assumption> ofSwitching(CapacitorBank bank) {
        List<Assumption> all = new ArrayList<>();
        bank.off()
                .ifPresent(off -> all.add(new Assumption(
                        "off-hours",
                        YEAR,
                        "a month's totals do not show what flows while the time switch keeps the bank off: the low savings take as much"
                                + " of the kvarh to fall there as can be and the highest kVA and kvar too, the high as little, the"
                                + " central in proportion to the hours",
                        INTERVALS)));
        if (bank.isAutomatic() && bank.controller().isHeldBack()) {
            all.add(new Assumption(
                    "switching-not-seen",
                    YEAR,
                    "a month's totals do not show how often the load changes: the switching delay and the limit of operations an hour are"
                            + " not counted",
                    INTERVALS));
        }
        return all;
    }

    /** What monthly totals leave open. */
    private static List<Assumption> ofTotals(Rate rate, List<MeteredMonth> year, Optional<SampleWeeks> open) {
        List<Assumption> all = new ArrayList<>();
        all.add(new Assumption(
                "kvarh-spread",
                YEAR,
                "a month's kvarh do not say when they were drawn: the low savings take them as all drawn at the peak, the high as drawn"
                        + " evenly, the central lie between by an assumed load curve",
                INTERVALS
                        + open.map(
                                        weeks -> "; " + weeks.words()
                                                + " of them, spread over the year, would bring the kvarh taken off to within about 10 %")
                                .orElse("")));
        if (year.stream().anyMatch(month -> !month.totals().has(PEAK_LAGGING_KVAR))) {
            all.add(new Assumption(
                    "highest-kvar",
                    YEAR,
                    year.stream().allMatch(month -> month.totals().has(PEAK_KVA))
                            ? "the highest kvar is not on every bill; it cannot be above the highest kVA"
                            : "neither the highest kvar nor the highest kVA is on every bill; the low savings then count no kvarh",
                    "give peak lagging kvar"));
        }
        if (rate.clauses(Metered.class).anyMatch(each -> each.register() == PEAK_KVA)) {
            all.add(new Assumption(
                    "peaks-together",
                    YEAR,
                    "the central savings take the highest kW and the highest kVA to fall together; low and high do not",
                    INTERVALS));
        }
        return all;
    }
}
