// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Stream;
import tariff.bill.PowerFactorCost;
import tariff.correction.Estimate;
import tariff.json.AssessmentJson;
import tariff.json.JsonObject;
import tariff.meter.Derivable;
import tariff.meter.MeteredMonth;
import tariff.meter.Readings;
import tariff.meter.Register;
import tariff.payback.Answer;
import tariff.payback.Appraisal;
import tariff.proposal.Assessment;
import tariff.proposal.BankSavings;

/** An assessment, printed. */
record AssessmentAnswer(Assessment assessment) implements Format.Printable {
    private static final List<Register> SHOWN =
            List.of(Register.ENERGY_KWH, Register.LAGGING_KVARH, Register.PEAK_KW, Register.PEAK_KVA);

    @Override
    public String text() {
        StringBuilder out = new StringBuilder(Wrapped.text(Title.of(assessment.billing())));
        out.append('\n').append(months());
        out.append('\n')
                .append(Wrapped.text("The rate's own point without penalty: "
                        + assessment.today().point().words() + "."));
        out.append(
                Wrapped.text(
                        "\"To that point\" and \"to unity\" are what the bill would fall by if reactive load were lower and"
                                + " nothing else changed: kWh, kW, fixed charges and floors stand on both sides, for no capacitor removes them."));
        out.append('\n')
                .append(Wrapped.text("The proposal: " + ProposedText.of(assessment.proposal())))
                .append('\n')
                .append(savings());
        assessment.whyNoPayback().ifPresent(why -> out.append(Wrapped.text("  No payback: " + why + ".")));
        reasons().forEach(reason -> out.append(Wrapped.text("  " + reason + ".")));
        if (!assessment.proposal().screens().isEmpty()) {
            out.append("\nThe bank at its place, screened\n")
                    .append(ScreensAnswer.text(assessment.proposal().screens()));
        }
        assessment.inService().ifPresent(year -> out.append('\n').append(InServiceText.of(year)));
        out.append("\nTaken to be so\n");
        Assumed.text(assessment.assumptions()).forEach(each -> out.append(Wrapped.text("- " + each)));
        return out.append('\n')
                .append(ScreensAnswer.cautions(assessment.cautions()))
                .toString();
    }

    private String months() {
        Table table =
                new Table().row("Month", "kWh", "kvarh", "kW", "kVA", "PF", "Billed", "To that point", "To unity");
        for (PowerFactorCost.Month month : assessment.today().months()) {
            MeteredMonth metered = month.asItIs().month();
            List<String> cells = new ArrayList<>(List.of(metered.period().toString()));
            SHOWN.forEach(register -> cells.add(figure(metered.totals().get(register))));
            cells.add(powerFactor(metered.totals()));
            cells.add(money(month.asItIs().total()));
            cells.add(money(month.penalty()));
            cells.add(money(month.toUnity()));
            table.row(cells.toArray(String[]::new));
        }
        PowerFactorCost today = assessment.today();
        return table.row(
                        "All",
                        "",
                        "",
                        "",
                        "",
                        "",
                        money(today.billed()),
                        money(today.penalty()),
                        money(today.toUnity()))
                .text();
    }

    private static String figure(Optional<BigDecimal> value) {
        return value.map(number -> number.setScale(0, RoundingMode.HALF_UP).toPlainString())
                .orElse("-");
    }

    /** As printed on the bill, else from the month's energies. */
    private static String powerFactor(Readings readings) {
        return readings.get(Register.POWER_FACTOR)
                .or(() -> Derivable.POWER_FACTOR.from(readings))
                .map(value -> value.setScale(3, RoundingMode.HALF_UP).toPlainString())
                .orElse("-");
    }

    private String savings() {
        Table table = new Table().row("", "low", "central", "high");
        row(
                table,
                "Saved in the first year",
                each -> money(assessment.savings(each).firstYearTotal()));
        row(
                table,
                "Saved in a settled year",
                each -> money(assessment.savings(each).settledYearTotal()));
        if (!assessment.appraisals().isEmpty()) {
            row(table, "Cost ÷ settled year, in years", each -> measure(each, Appraisal::simplePaybackYears));
            row(
                    table,
                    "Paid back at the end of month",
                    each -> measure(
                            each, appraisal -> appraisal.payback().lasting().map(BigDecimal::valueOf)));
            row(table, "Net present value", each -> measure(each, Appraisal::netPresentValue));
            row(
                    table,
                    "Internal rate of return, %",
                    each -> measure(
                            each, appraisal -> appraisal.internalReturn().map(rate -> rate.movePointRight(2))));
        }
        return table.text();
    }

    private static void row(Table table, String name, Function<Estimate, String> cell) {
        table.row(Stream.concat(
                        Stream.of("  " + name), Stream.of(Estimate.values()).map(cell))
                .toArray(String[]::new));
    }

    private String measure(Estimate estimate, Function<Appraisal, Answer<BigDecimal>> measure) {
        Appraisal appraisal = assessment.appraisals().get(estimate);
        return appraisal == null
                ? "-"
                : measure.apply(appraisal).<String>fold(AssessmentAnswer::plain, reason -> "n/a");
    }

    /** Why a measure has no value, each reason once with the estimates it holds for. */
    private List<String> reasons() {
        return assessment.appraisals().entrySet().stream()
                .flatMap(each -> Stream.<Answer<?>>of(
                                each.getValue().simplePaybackYears(),
                                each.getValue().payback().lasting(),
                                each.getValue().netPresentValue(),
                                each.getValue().internalReturn())
                        .flatMap(answer -> answer.<Stream<String>>fold(value -> Stream.empty(), Stream::of))
                        .map(reason -> "n/a, " + each.getKey().name().toLowerCase(Locale.ROOT) + ": " + reason))
                .distinct()
                .toList();
    }

    private static String plain(BigDecimal value) {
        return value.scale() <= 0 ? value.toPlainString() : money(value);
    }

    private static String money(BigDecimal value) {
        return value.setScale(2, RoundingMode.HALF_UP).toPlainString();
    }

    @Override
    public JsonObject json() {
        return AssessmentJson.write(assessment);
    }

    /** One row for each month; a spreadsheet adds up what it wants. */
    @Override
    public String csv() {
        List<String> header = new ArrayList<>(List.of("from", "to"));
        SHOWN.forEach(register -> header.add(register.words()));
        header.addAll(List.of("power factor", "billed", "to no-penalty point", "to unity"));
        for (Estimate estimate : Estimate.values()) {
            String name = estimate.name().toLowerCase(Locale.ROOT);
            header.add("saved first year " + name);
            header.add("saved settled year " + name);
        }
        Csv csv = new Csv(header);
        List<PowerFactorCost.Month> months = assessment.today().months();
        for (int i = 0; i < months.size(); i++) {
            csv.row(cells(months.get(i), i));
        }
        return csv.text();
    }

    private List<String> cells(PowerFactorCost.Month month, int place) {
        MeteredMonth metered = month.asItIs().month();
        List<String> cells = new ArrayList<>(List.of(
                metered.period().first().toString(), metered.period().last().toString()));
        SHOWN.forEach(register -> cells.add(
                metered.totals().get(register).map(BigDecimal::toPlainString).orElse("")));
        cells.add(powerFactor(metered.totals()).replace("-", ""));
        cells.add(month.asItIs().total().toPlainString());
        cells.add(month.penalty().toPlainString());
        cells.add(month.toUnity().toPlainString());
        for (Estimate estimate : Estimate.values()) {
            BankSavings bank = assessment.savings(estimate);
            cells.add(bank.firstYearMonths().get(place).toPlainString());
            cells.add(bank.settledYearMonths().get(place).toPlainString());
        }
        return cells;
    }
}
