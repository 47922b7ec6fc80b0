// SPDX-License-Identifier: Apache-2.0
package tariff.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tariff.bill.StatementLine;
import tariff.correction.Estimate;
import tariff.proposal.BankSavings;
import tariff.proposal.ProposalCharts;

/** What the bank takes off the bills: low, central and high, in the first and in a settled year. */
final class SavedByTheBank implements Section {
    @Override
    public String id() {
        return "savings";
    }

    @Override
    public String title() {
        return "What the bank would save";
    }

    @Override
    public void write(Html page, Report report) {
        page.paragraph(
                report.assessment().exact().isPresent()
                        ? "Interval data are at hand, so the bank was run through every interval; nothing is left to bounds, and the three"
                                + " estimates are the same."
                        : "Monthly bills do not say when kvarh were drawn. \"Low\" and \"high\" are the least and the most that the bills allow;"
                                + " \"central\" lies between them and rests on an assumed load curve. A negative saving is a bill that rises.");
        page.paragraph(
                "In the first year a ratchet may still remember the demand from before the bank; in a settled year it does not.");
        totals(report).write(page);
        months(report).write(page);
        lines(report).write(page);
        report.bySize()
                .ifPresent(sizes -> Drawing.write(
                        page,
                        "size-chart",
                        "Savings of a settled " + report.year()
                                + " against size, for banks that are always on. The slope is what another kvar earns.",
                        ProposalCharts.savings(
                                        "Savings by size of the bank",
                                        sizes,
                                        Optional.of(report.assessment()
                                                .proposal()
                                                .bank()
                                                .ratedKvar()))
                                .svg()));
    }

    private static Table totals(Report report) {
        return new Table("savings-totals", "Savings in " + report.currency(), Shown.heads("All months"))
                .row(Shown.row(
                        "First year", each -> Shown.money(report.savings(each).firstYearTotal())))
                .row(Shown.row(
                        "Settled year", each -> Shown.money(report.savings(each).settledYearTotal())));
    }

    private static Table months(Report report) {
        List<String> heads = new ArrayList<>(List.of("Month"));
        for (String year : List.of("First year", "Settled year")) {
            for (Estimate estimate : Estimate.values()) {
                heads.add(year + ", " + Shown.word(estimate));
            }
        }
        Table table = new Table("savings-months", "Savings month by month, in " + report.currency(), heads);
        for (int i = 0; i < report.periods().size(); i++) {
            List<String> cells = new ArrayList<>(List.of(report.periods().get(i).toString()));
            for (Estimate estimate : Estimate.values()) {
                cells.add(Shown.money(report.savings(estimate).firstYearMonths().get(i)));
            }
            for (Estimate estimate : Estimate.values()) {
                cells.add(
                        Shown.money(report.savings(estimate).settledYearMonths().get(i)));
            }
            table.row(cells);
        }
        return table;
    }

    private static Table lines(Report report) {
        BankSavings central = report.savings(Estimate.CENTRAL);
        Table table = new Table(
                "savings-lines",
                "Savings of a settled year by line of the bill, in " + report.currency(),
                Shown.heads("Line"));
        central.before().stream()
                .limit(1)
                .flatMap(statement -> statement.lines().stream())
                .filter(line -> !line.shownOnly())
                .map(StatementLine::name)
                .forEach(line -> table.row(
                        Shown.row(line, each -> Shown.money(report.savings(each).settledYear(line)))));
        return table;
    }
}
