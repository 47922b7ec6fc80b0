// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.util.List;
import java.util.Optional;
import tariff.bill.Billing;
import tariff.meter.MeteredMonth;
import tariff.meter.MonthOrder;
import tariff.notice.Assumption;
import tariff.notice.Finding;
import tariff.notice.Refusal;

/**
 * Bills that were paid, held against a rate: what is doubtful in them, how far each agrees, and what would make the others agree.
 *
 * @param doubts what is doubtful about the readings before anything is worked out
 * @param agreement each month with something charged, line by line
 * @param explanations the best few that were found, the best first; never certain
 * @param unexplained the months that do not agree and that no explanation brings to agreement
 */
public record Reconciliation(
        List<Finding> doubts, Agreement agreement, List<Explanation> explanations, List<ReconciledMonth> unexplained) {

    public Reconciliation {
        doubts = List.copyOf(doubts);
        explanations = List.copyOf(explanations);
        unexplained = List.copyOf(unexplained);
    }

    /**
     * Reconciles months; those without anything charged only serve as the past of the others.
     *
     * @param months in any order
     * @throws Refusal naming the months that overlap, or every month that lacks what the rate bills; or if nothing was charged at all
     */
    public static Reconciliation of(Billing billing, List<MeteredMonth> months) {
        List<MeteredMonth> sorted = MonthOrder.of(months);
        Agreement agreement = Agreement.of(billing, List.of(), sorted);
        if (agreement.months().isEmpty()) {
            throw new Refusal(Finding.error("nothing-charged", "the bills", "no month says what was charged")
                    .allowed("\"charged\" with \"total\", \"lines\" or both in at least one month, or a column of a"
                            + " table with the amounts"));
        }
        List<Explanation> explanations = Search.of(new Case(billing, sorted, agreement));
        List<ReconciledMonth> unexplained = agreement.differing().stream()
                .filter(month -> explanations.stream().noneMatch(each -> each.explains(month.period())))
                .toList();
        return new Reconciliation(BillDoubts.of(sorted), agreement, explanations, unexplained);
    }

    /** What savings worked out from these bills take to be so; empty if all agree. */
    public Optional<Assumption> assumption() {
        return agreement.assumption();
    }
}
