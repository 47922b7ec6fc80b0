// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.List;
import java.util.Locale;
import java.util.function.Function;
import java.util.stream.Stream;
import tariff.bill.PowerFactorCost;
import tariff.correction.Estimate;
import tariff.json.AssessmentJson;
import tariff.json.JsonObject;
import tariff.payback.Answer;
import tariff.payback.Appraisal;
import tariff.proposal.Assessment;
import tariff.proposal.BankSavings;

/** An assessment, printed. */
record AssessmentAnswer(Assessment assessment) implements Format.Printable {

    @Override
    public String text() {
        PowerFactorCost today = assessment.today();
        StringBuilder out =
                new StringBuilder(Wrapped.text(assessment.billing().rate().name() + ", amounts in "
                        + assessment.billing().rate().currency()));
        out.append("\nToday, over ").append(today.months().size()).append(" months\n");
        out.append(new Table()
                .row("  Billed", money(today.billed()))
                .row("  Paid for being short of the point without penalty", money(today.penalty()))
                .row("  Paid for being short of unity", money(today.toUnity()))
                .text());
        out.append(Wrapped.text("  The point without penalty: " + today.point().words()));
        out.append("\nWith a bank of ")
                .append(assessment.proposal().bank().ratedKvar().toPlainString());
        out.append(" kvar\n").append(savings());
        assessment.whyNoPayback().ifPresent(why -> out.append(Wrapped.text("  No payback: " + why)));
        out.append("\nTaken to be so\n");
        Assumed.text(assessment.assumptions()).forEach(each -> out.append(Wrapped.text("- " + each)));
        out.append("\nBefore anybody acts on this\n");
        assessment.cautions().forEach(each -> out.append(Wrapped.text("- " + each.message())));
        return out.toString();
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
            row(table, "Cost ÷ settled year, years", each -> measure(each, Appraisal::simplePaybackYears));
            row(
                    table,
                    "Paid back after months",
                    each -> measure(
                            each, appraisal -> appraisal.payback().lasting().map(BigDecimal::valueOf)));
            row(table, "Net present value", each -> measure(each, Appraisal::netPresentValue));
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
                : measure.apply(appraisal).<String>fold(AssessmentAnswer::plain, reason -> "none");
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

    @Override
    public String csv() {
        Csv csv = new Csv(List.of("from", "to", "estimate", "saved in first year", "saved in settled year"));
        for (Estimate estimate : Estimate.values()) {
            BankSavings bank = assessment.savings(estimate);
            for (int i = 0; i < bank.before().size(); i++) {
                csv.row(List.of(
                        bank.before().get(i).month().period().first().toString(),
                        bank.before().get(i).month().period().last().toString(),
                        estimate.name().toLowerCase(Locale.ROOT),
                        bank.firstYearMonths().get(i).toPlainString(),
                        bank.settledYearMonths().get(i).toPlainString()));
            }
        }
        return csv.text();
    }
}
