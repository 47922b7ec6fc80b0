// SPDX-License-Identifier: Apache-2.0
package tariff.report;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import tariff.bill.PowerFactorCost;
import tariff.bill.Statement;
import tariff.correction.Estimate;
import tariff.meter.MeteredMonth;
import tariff.meter.Readings;
import tariff.meter.Register;

/** The appendix: the first month's bill and that of the highest demand, step by step, and the meters with the bank. */
final class WorkedOut implements Section {
    private static final List<Register> MOVED =
            List.of(Register.LAGGING_KVARH, Register.LEADING_KVARH, Register.PEAK_KVA, Register.PEAK_LAGGING_KVAR);

    @Override
    public String id() {
        return "working";
    }

    @Override
    public String title() {
        return "Appendix: every figure, worked out";
    }

    @Override
    public void write(Html page, Report report) {
        page.paragraph(
                "Each figure stands before the working that gives it, and below it the figures of that working. Savings are the bill"
                        + " so worked out, less the same working with the meters as they would be with the bank.");
        List<Statement> all = report.assessment().today().months().stream()
                .map(PowerFactorCost.Month::asItIs)
                .toList();
        Statement first = all.get(0);
        Statement highest =
                all.stream().max(Comparator.comparing(WorkedOut::demand)).orElse(first);
        statement(page, first, "the first month");
        if (!highest.month().period().equals(first.month().period())) {
            statement(page, highest, "the month of the highest demand");
        }
        page.text("h3", "The meters with the bank");
        meters(report).write(page);
    }

    private static BigDecimal demand(Statement statement) {
        Readings totals = statement.month().totals();
        return totals.get(Register.PEAK_KW)
                .or(() -> totals.get(Register.PEAK_KVA))
                .orElse(statement.total());
    }

    private static void statement(Html page, Statement statement, String which) {
        page.text("h3", "Bill of " + statement.month().period() + ", " + which);
        page.open("ul", "class", "working");
        Steps steps = new Steps(page);
        statement.lines().forEach(steps::write);
        page.text("li", "Total: " + statement.total().toPlainString() + " " + statement.currency());
        page.close();
    }

    private static Table meters(Report report) {
        List<String> heads = new ArrayList<>(List.of("Month"));
        MOVED.forEach(register -> {
            heads.add(register.words() + ", today");
            heads.add(register.words() + ", with the bank");
        });
        Table table = new Table("working-meters", "Today and in a settled year with the bank, central estimate", heads);
        List<Statement> after = report.savings(Estimate.CENTRAL).settledYear();
        for (int i = 0; i < after.size(); i++) {
            MeteredMonth before =
                    report.assessment().today().months().get(i).asItIs().month();
            List<String> cells = new ArrayList<>(List.of(before.period().toString()));
            for (Register register : MOVED) {
                cells.add(shown(before.totals().get(register)));
                cells.add(shown(after.get(i).month().totals().get(register)));
            }
            table.row(cells);
        }
        return table.withoutEmptyColumns();
    }

    private static String shown(Optional<BigDecimal> value) {
        return value.map(number -> Shown.plain(number.setScale(3, java.math.RoundingMode.HALF_UP)))
                .orElse("");
    }
}
