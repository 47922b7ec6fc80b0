// SPDX-License-Identifier: Apache-2.0
package tariff.report;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tariff.bill.LineCost;
import tariff.bill.PowerFactorCost;
import tariff.meter.Derivable;
import tariff.meter.MeteredMonth;
import tariff.meter.Readings;
import tariff.meter.Register;
import tariff.proposal.ProposalCharts;

/** The bills as they are, month by month and line by line, and what of them is power factor. */
final class TodaysBill implements Section {
    private static final String PENALTY = "For missing the point without penalty";
    private static final String UNITY = "For missing unity";

    @Override
    public String id() {
        return "bill";
    }

    @Override
    public String title() {
        return "The bill today";
    }

    @Override
    public void write(Html page, Report report) {
        PowerFactorCost today = report.assessment().today();
        page.paragraph("The rate's own point without penalty: " + today.point().words() + ".");
        page.paragraph(
                "Each month is billed three times: as metered, at that point, and at unity. The differences are what low power"
                        + " factor costs. What reactive load does not move, such as kWh, kW, fixed charges and floors, stands on both sides: no"
                        + " capacitor removes it.");
        months(report).write(page);
        Drawing.write(
                page,
                "bill-chart",
                "The bills by line; hatched is what each line asks for being short of unity.",
                ProposalCharts.bill(report.assessment()).svg());
        lines(report).write(page);
    }

    private static Table months(Report report) {
        PowerFactorCost today = report.assessment().today();
        Table table = new Table(
                "bill-months",
                "Metered and billed, in " + report.currency(),
                List.of(
                        "Month",
                        "kWh",
                        "Lagging kvarh",
                        "kW",
                        "kVA",
                        "Lagging kvar",
                        "Power factor",
                        "Billed",
                        PENALTY,
                        UNITY));
        today.months().forEach(month -> table.row(month(month)));
        return table.row(
                        "All",
                        "",
                        "",
                        "",
                        "",
                        "",
                        "",
                        Shown.money(today.billed()),
                        Shown.money(today.penalty()),
                        Shown.money(today.toUnity()))
                .withoutEmptyColumns();
    }

    private static List<String> month(PowerFactorCost.Month month) {
        MeteredMonth metered = month.asItIs().month();
        Readings totals = metered.totals();
        List<String> cells = new ArrayList<>(List.of(metered.period().toString()));
        for (Register register : List.of(
                Register.ENERGY_KWH,
                Register.LAGGING_KVARH,
                Register.PEAK_KW,
                Register.PEAK_KVA,
                Register.PEAK_LAGGING_KVAR)) {
            cells.add(Shown.whole(totals.get(register)));
        }
        Optional<BigDecimal> powerFactor =
                totals.get(Register.POWER_FACTOR).or(() -> Derivable.POWER_FACTOR.from(totals));
        cells.add(powerFactor.map(value -> Shown.decimals(value, 3)).orElse(""));
        cells.add(Shown.money(month.asItIs().total()));
        cells.add(Shown.money(month.penalty()));
        cells.add(Shown.money(month.toUnity()));
        return cells;
    }

    private static Table lines(Report report) {
        Table table = new Table(
                "bill-lines",
                "All months by line of the bill, in " + report.currency(),
                List.of("Line", "Billed", PENALTY, UNITY));
        for (LineCost line : LineCost.of(report.assessment().today())) {
            table.row(
                    line.line() + (line.shownOnly() ? " (shown only, not in the total)" : ""),
                    Shown.money(line.asItIs()),
                    Shown.money(line.penalty()),
                    Shown.money(line.toUnity()));
        }
        return table;
    }
}
