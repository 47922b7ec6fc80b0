// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tariff.bill.Billing;
import tariff.json.JsonObject;
import tariff.json.ReconciliationJson;
import tariff.notice.Assumption;
import tariff.reconcile.Explanation;
import tariff.reconcile.ReconciledLine;
import tariff.reconcile.ReconciledMonth;
import tariff.reconcile.Reconciliation;

/** Bills held against a rate, printed. */
record ReconciliationAnswer(Billing billing, Reconciliation reconciliation) implements Format.Printable {

    @Override
    public String text() {
        StringBuilder out = new StringBuilder(Wrapped.text(Title.of(billing)));
        section(
                out,
                "Doubtful in the readings",
                reconciliation.doubts().stream().map(Object::toString).toList());
        out.append('\n').append(months()).append(Wrapped.text(count()));
        reconciliation.agreement().differing().stream()
                .filter(month -> !month.lines().isEmpty())
                .forEach(month -> out.append('\n')
                        .append(month.period())
                        .append(", line by line\n")
                        .append(lines(month)));
        section(
                out,
                "What would make them agree, the best match first; found by trying, so ask the utility",
                reconciliation.explanations().stream().map(Explanation::message).toList());
        section(
                out,
                "Nothing was found that would make these agree",
                reconciliation.unexplained().stream()
                        .map(month -> month.period() + ": " + signed(month.difference()))
                        .toList());
        section(out, "Taken to be so", Assumed.text(assumptions()));
        return out.toString();
    }

    private static void section(StringBuilder out, String heading, List<String> paragraphs) {
        if (!paragraphs.isEmpty()) {
            out.append('\n').append(heading).append('\n');
            paragraphs.forEach(each -> out.append(Wrapped.text("- " + each)));
        }
    }

    private String months() {
        Verdicts table = new Verdicts("Month");
        reconciliation
                .agreement()
                .months()
                .forEach(month -> table.row(
                        month.period().toString(),
                        money(month.charged()),
                        money(month.recomputed()),
                        signed(month.difference()),
                        month.verdict()));
        return table.text();
    }

    private String count() {
        int all = reconciliation.agreement().months().size();
        int agreeing = reconciliation.agreement().agreeing();
        return agreeing + " of " + all + (all == 1 ? " month agrees" : " months agree")
                + (agreeing == all
                        ? "."
                        : "; the others differ by "
                                + money(reconciliation.agreement().difference()) + " in all, signs left out.");
    }

    private static String lines(ReconciledMonth month) {
        Verdicts table = new Verdicts("  Line");
        month.lines()
                .forEach(line -> table.row(
                        "  " + line.name(),
                        money(line.charged()),
                        money(line.recomputed()),
                        signed(line.difference()),
                        line.verdict()));
        return table.text();
    }

    private List<Assumption> assumptions() {
        return reconciliation.agreement().months().stream()
                .flatMap(month -> month.statement().assumptions().stream())
                .toList();
    }

    private static String money(Optional<BigDecimal> value) {
        return value.map(ReconciliationAnswer::money).orElse("-");
    }

    private static String money(BigDecimal value) {
        return value.setScale(2, RoundingMode.HALF_UP).toPlainString();
    }

    private static String signed(BigDecimal value) {
        return (value.signum() > 0 ? "+" : "") + money(value);
    }

    @Override
    public JsonObject json() {
        return ReconciliationJson.write(billing.rate(), reconciliation);
    }

    /** One row for each bill as a whole, without a line's name, and one for each of its lines. */
    @Override
    public String csv() {
        Csv csv = new Csv(List.of("from", "to", "line", "charged", "recomputed", "difference", "verdict", "currency"));
        for (ReconciledMonth month : reconciliation.agreement().months()) {
            row(
                    csv,
                    month,
                    new ReconciledLine(
                            "", Optional.of(month.charged()), Optional.of(month.recomputed()), month.verdict()));
            month.lines().forEach(line -> row(csv, month, line));
        }
        return csv.text();
    }

    private void row(Csv csv, ReconciledMonth month, ReconciledLine line) {
        List<String> cells = new ArrayList<>(
                List.of(month.period().first().toString(), month.period().last().toString(), line.name()));
        cells.add(line.charged().map(BigDecimal::toPlainString).orElse(""));
        cells.add(line.recomputed().map(BigDecimal::toPlainString).orElse(""));
        cells.add(line.difference().toPlainString());
        cells.add(line.verdict().words());
        cells.add(billing.rate().currency());
        csv.row(cells);
    }
}
