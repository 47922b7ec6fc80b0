// SPDX-License-Identifier: Apache-2.0
package tariff.json;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import tariff.notice.Assumption;
import tariff.rate.Rate;
import tariff.reconcile.Explanation;
import tariff.reconcile.ReconciledLine;
import tariff.reconcile.ReconciledMonth;
import tariff.reconcile.Reconciliation;
import tariff.reconcile.Tally;
import tariff.reconcile.Verdict;

/** Bills held against a rate: what is doubtful, how far each agrees, and what would make the others agree. */
public final class ReconciliationJson {
    private ReconciliationJson() {}

    /**
     * A reconciliation under one rate.
     *
     * @param rate the one that the bills were held against
     */
    public static JsonObject write(Rate rate, Reconciliation reconciliation) {
        List<ReconciledMonth> months = reconciliation.agreement().months();
        Set<Assumption> assumptions = new LinkedHashSet<>();
        months.forEach(month -> assumptions.addAll(month.statement().assumptions()));
        return new JsonObject()
                .with("rate", rate.name())
                .with("currency", rate.currency())
                .withAll("doubts", reconciliation.doubts(), NoticeJson::write)
                .with("agreeing", reconciliation.agreement().agreeing())
                .with("toTheCent", reconciliation.agreement().toTheCent())
                .with("charged", reconciliation.agreement().charged())
                .with("difference", reconciliation.agreement().difference())
                .withAll("months", months, ReconciliationJson::write)
                .withAll("explanations", reconciliation.explanations(), ReconciliationJson::write)
                .withAll(
                        "unexplained",
                        reconciliation.unexplained(),
                        month -> PeriodJson.write(new JsonObject(), month.period())
                                .with("difference", month.difference()))
                .withAll("assumptions", assumptions, NoticeJson::write);
    }

    private static JsonObject write(ReconciledMonth month) {
        return PeriodJson.write(new JsonObject(), month.period())
                .with("charged", month.charged())
                .with("recomputed", month.recomputed())
                .with("difference", month.difference())
                .with("verdict", key(month.verdict()))
                .withAll("lines", month.lines(), ReconciliationJson::write);
    }

    private static JsonObject write(ReconciledLine line) {
        return new JsonObject()
                .with("name", line.name())
                .withIf("charged", line.charged())
                .withIf("recomputed", line.recomputed())
                .with("difference", line.difference())
                .with("verdict", key(line.verdict()));
    }

    private static JsonObject write(Explanation explanation) {
        return new JsonObject()
                .with("code", explanation.code())
                .with("message", explanation.message())
                .with("ofEveryMonth", explanation.ofEveryMonth())
                .withAll(
                        "explains",
                        explanation.explains(),
                        month -> PeriodJson.write(new JsonObject(), month.period())
                                .with("words", month.words())
                                .with("verdict", key(month.month().verdict())))
                .withAll("breaks", explanation.breaks(), period -> PeriodJson.write(new JsonObject(), period))
                .with("now", write(explanation.now()))
                .with("then", write(explanation.then()))
                .with("residual", explanation.residual());
    }

    private static JsonObject write(Tally tally) {
        return new JsonObject()
                .with("agreeing", tally.agreeing())
                .with("toTheCent", tally.toTheCent())
                .with("months", tally.months());
    }

    private static String key(Verdict verdict) {
        return verdict.name().toLowerCase(Locale.ROOT).replace('_', '-');
    }
}
