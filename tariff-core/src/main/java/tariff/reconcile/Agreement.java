// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tariff.bill.Billing;
import tariff.bill.Statement;
import tariff.meter.MeteredMonth;
import tariff.notice.Assumption;
import tariff.notice.Refusal;

/**
 * How far a rate agrees with what was charged, without looking for causes.
 *
 * @param months those with something charged, in order
 */
public record Agreement(List<ReconciledMonth> months) {

    public Agreement {
        months = List.copyOf(months);
    }

    /**
     * Compares months in order.
     *
     * @param past earlier months, which are not compared
     * @throws Refusal naming every month that lacks what the rate bills
     */
    public static Agreement of(Billing billing, List<MeteredMonth> past, List<MeteredMonth> months) {
        if (months.stream().noneMatch(month -> month.charged().isKnown())) {
            return new Agreement(List.of());
        }
        List<MeteredMonth> chain = new ArrayList<>(past);
        chain.addAll(months);
        List<Statement> statements = billing.statements(past, months);
        List<ReconciledMonth> all = new ArrayList<>();
        for (int i = 0; i < statements.size(); i++) {
            Statement statement = statements.get(i);
            List<MeteredMonth> before = chain.subList(0, past.size() + i);
            ReconciledMonth.of(statement, () -> Slack.of(billing, before, statement))
                    .ifPresent(all::add);
        }
        return new Agreement(all);
    }

    /** How many agree, to the cent or within rounding. */
    public int agreeing() {
        return (int)
                months.stream().filter(month -> month.verdict().isAgreement()).count();
    }

    public int toTheCent() {
        return (int) months.stream()
                .filter(month -> month.verdict() == Verdict.AGREES)
                .count();
    }

    /** Those that do not agree. */
    public List<ReconciledMonth> differing() {
        return months.stream().filter(month -> !month.verdict().isAgreement()).toList();
    }

    public BigDecimal charged() {
        return months.stream().map(ReconciledMonth::charged).reduce(BigDecimal.ZERO, BigDecimal::add);
    }

    /** The differences of the months that do not agree, added up without their signs, so that they cannot cancel. */
    public BigDecimal difference() {
        return differing().stream().map(month -> month.difference().abs()).reduce(BigDecimal.ZERO, BigDecimal::add);
    }

    /** What an answer that rests on these bills takes to be so; empty if they agree, or nothing was charged. */
    public Optional<Assumption> assumption() {
        List<ReconciledMonth> differing = differing();
        if (differing.isEmpty()) {
            return Optional.empty();
        }
        BigDecimal charged = charged();
        String share = charged.signum() <= 0
                ? ""
                : ", "
                        + difference()
                                .movePointRight(2)
                                .divide(charged, 1, RoundingMode.HALF_UP)
                                .toPlainString() + " % of what was charged";
        return Optional.of(new Assumption(
                "bills-not-reconciled",
                "the bills",
                differing.size() + " of " + months.size() + (months.size() == 1 ? " bill" : " bills")
                        + (differing.size() == 1 ? " does" : " do") + " not agree with this rate; the difference is "
                        + Digits.shown(difference().setScale(2, RoundingMode.HALF_UP)) + " in all" + share,
                "reconcile the bills, and correct the rate or the readings"));
    }
}
