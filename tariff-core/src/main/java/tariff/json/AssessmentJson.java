// SPDX-License-Identifier: Apache-2.0
package tariff.json;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.List;
import java.util.Locale;
import java.util.stream.IntStream;
import tariff.bill.PowerFactorCost;
import tariff.bill.Statement;
import tariff.bill.StatementLine;
import tariff.correction.Estimate;
import tariff.electrical.Screening;
import tariff.payback.Answer;
import tariff.payback.Appraisal;
import tariff.payback.Recovery;
import tariff.proposal.Assessment;
import tariff.proposal.BankSavings;

/** A bank held against a year of bills. */
public final class AssessmentJson {
    private static final int CENT = 2;
    private static final int RATE_DECIMALS = 6;

    private AssessmentJson() {}

    public static JsonObject write(Assessment assessment) {
        JsonObject savings = new JsonObject();
        assessment.savings().forEach((estimate, bank) -> savings.with(key(estimate), savings(bank)));
        JsonObject payback = new JsonObject();
        assessment.appraisals().forEach((estimate, appraisal) -> payback.with(key(estimate), payback(appraisal)));
        JsonObject json = new JsonObject()
                .with("rate", assessment.billing().rate().name())
                .with("currency", assessment.billing().rate().currency())
                .with("today", today(assessment.today()))
                .with("savings", savings)
                .withUnlessEmpty("payback", payback)
                .withIf("whyNoPayback", assessment.whyNoPayback());
        List<Screening> screens = assessment.proposal().screens();
        if (!screens.isEmpty()) {
            json.withAll("screens", screens, ScreeningsJson::write);
        }
        return json.withAll("assumptions", assessment.assumptions(), NoticeJson::write)
                .withAll("cautions", assessment.cautions(), NoticeJson::write);
    }

    static String key(Estimate estimate) {
        return estimate.name().toLowerCase(Locale.ROOT);
    }

    static JsonObject today(PowerFactorCost cost) {
        return new JsonObject()
                .with("billed", cost.billed())
                .with("penalty", cost.penalty())
                .with("toUnity", cost.toUnity())
                .with("noPenaltyPoint", cost.point().words())
                .withAll(
                        "months",
                        cost.months(),
                        month -> PeriodJson.write(
                                        new JsonObject(), month.asItIs().month().period())
                                .with("billed", month.asItIs().total())
                                .with("penalty", month.penalty())
                                .with("toUnity", month.toUnity()));
    }

    private static JsonObject savings(BankSavings savings) {
        List<BigDecimal> first = savings.firstYearMonths();
        List<BigDecimal> settled = savings.settledYearMonths();
        List<String> lines = savings.before().stream()
                .limit(1)
                .map(Statement::lines)
                .flatMap(List::stream)
                .map(StatementLine::name)
                .toList();
        return new JsonObject()
                .with("firstYear", savings.firstYearTotal())
                .with("settledYear", savings.settledYearTotal())
                .withAll(
                        "lines",
                        lines,
                        line -> new JsonObject().with("name", line).with("settledYear", savings.settledYear(line)))
                .withAll(
                        "months",
                        IntStream.range(0, first.size()).boxed().toList(),
                        i -> PeriodJson.write(
                                        new JsonObject(),
                                        savings.before().get(i).month().period())
                                .with("firstYear", first.get(i))
                                .with("settledYear", settled.get(i)));
    }

    private static JsonObject payback(Appraisal appraisal) {
        JsonObject json = new JsonObject();
        measure(json, "simplePaybackYears", appraisal.simplePaybackYears(), RATE_DECIMALS);
        recovery(json, "paybackMonths", Answer.known(appraisal.payback()));
        recovery(json, "discountedPaybackMonths", appraisal.discountedPayback());
        measure(json, "netPresentValue", appraisal.netPresentValue(), CENT);
        measure(json, "internalReturn", appraisal.internalReturn(), RATE_DECIMALS);
        measure(json, "modifiedReturn", appraisal.modifiedReturn(), RATE_DECIMALS);
        measure(json, "savingsToInvestment", appraisal.savingsToInvestment(), RATE_DECIMALS);
        return json;
    }

    /** The month from whose end on the cost is recovered for good. */
    private static void recovery(JsonObject json, String key, Answer<Recovery> recovery) {
        measure(json, key, recovery.flatMap(Recovery::lasting).map(BigDecimal::valueOf), 0);
    }

    static void measure(JsonObject json, String key, Answer<BigDecimal> answer) {
        measure(json, key, answer, RATE_DECIMALS);
    }

    private static void measure(JsonObject json, String key, Answer<BigDecimal> answer, int decimals) {
        JsonObject either = answer.<JsonObject>fold(
                value -> new JsonObject().with("value", value.setScale(decimals, RoundingMode.HALF_UP)),
                reason -> new JsonObject().with("reason", reason));
        json.with(key, either);
    }
}
