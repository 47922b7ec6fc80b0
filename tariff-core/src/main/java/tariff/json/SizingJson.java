// SPDX-License-Identifier: Apache-2.0
package tariff.json;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Optional;
import tariff.bill.Billing;
import tariff.correction.CapacitorBank;
import tariff.correction.Controller;
import tariff.correction.Estimate;
import tariff.payback.Answer;
import tariff.proposal.LineReach;
import tariff.proposal.SizedBank;
import tariff.proposal.Sizing;

/** The best bank, or why none is. */
public final class SizingJson {
    private static final int CENT = 2;

    private SizingJson() {}

    public static JsonObject write(Billing billing, Sizing sizing) {
        JsonObject bestFor = new JsonObject();
        sizing.bestFor().forEach((estimate, answer) -> bestFor.with(AssessmentJson.key(estimate), answer(answer)));
        JsonObject json = new JsonObject()
                .with("rate", billing.rate().name())
                .with("currency", billing.rate().currency())
                .with("today", AssessmentJson.today(sizing.today()))
                .with("highestValue", answer(sizing.highestValue()))
                .with("shortestPayback", answer(sizing.shortestPayback()))
                .with("smallestWithoutPenalty", answer(sizing.smallestWithoutPenalty()))
                .with("bestFor", bestFor)
                .with("leastRegret", answer(sizing.leastRegret()))
                .with("worstRegret", sizing.worstRegret().setScale(CENT, RoundingMode.HALF_UP))
                .withAll("curve", sizing.curve(), SizingJson::sized)
                .withAll("lines", sizing.lines(), SizingJson::line)
                .with("roomLimits", sizing.roomLimits());
        sizing.undecided()
                .ifPresent(undecided -> json.with(
                        "undecided",
                        new JsonObject().with("words", undecided.words()).with("reading", undecided.reading())));
        return json.withAll("assumptions", sizing.assumptions(), NoticeJson::write)
                .withAll("cautions", sizing.cautions(), NoticeJson::write);
    }

    /** A bank, or the reason why there is none. */
    private static JsonObject answer(Answer<SizedBank> answer) {
        return answer.<JsonObject>fold(SizingJson::sized, reason -> new JsonObject().with("reason", reason));
    }

    private static JsonObject sized(SizedBank sized) {
        JsonObject gains = new JsonObject();
        for (Estimate estimate : Estimate.values()) {
            gains.with(AssessmentJson.key(estimate), gain(sized.gain(estimate)));
        }
        return new JsonObject()
                .with("kvar", sized.kvar())
                .with("bank", bank(sized.bank()))
                .with("cost", sized.investment().netCost())
                .with("yearlyUpkeep", sized.investment().yearlyUpkeep())
                .with("gains", gains);
    }

    /** As a request for an assessment takes it. */
    private static JsonObject bank(CapacitorBank bank) {
        JsonObject json = new JsonObject();
        if (bank.fixedKvar().signum() > 0 || !bank.isAutomatic()) {
            json.with("fixedKvar", bank.fixedKvar());
        }
        if (bank.isAutomatic()) {
            json.withNumbers("stepsKvar", bank.stepsKvar());
        }
        Controller told = bank.controller();
        if (bank.isAutomatic() && told.delayMinutes() > 0) {
            json.with("switchingDelayMinutes", told.delayMinutes());
        }
        if (bank.isAutomatic()) {
            told.operationsPerHour().ifPresent(most -> json.with("operationsPerHour", most));
        }
        bank.off().ifPresent(off -> json.with("off", WindowJson.write(off)));
        return json.withIf("targetPowerFactor", told.targetPowerFactor())
                .withIf("ratedVolts", bank.ratedVolts())
                .withIf("serviceVolts", bank.serviceVolts())
                .withIf("reactorShare", given(bank.reactorShare()))
                .withIf("wattsPerKvar", given(bank.wattsPerKvar()));
    }

    private static Optional<BigDecimal> given(BigDecimal share) {
        return Optional.of(share).filter(number -> number.signum() > 0);
    }

    private static JsonObject gain(SizedBank.Gain gain) {
        JsonObject json = new JsonObject()
                .with("firstYear", gain.firstYear())
                .with("settledYear", gain.settledYear())
                .with("netPresentValue", gain.netPresentValue().setScale(CENT, RoundingMode.HALF_UP));
        AssessmentJson.measure(json, "paybackYears", gain.paybackYears());
        return json;
    }

    private static JsonObject line(LineReach line) {
        return new JsonObject()
                .with("line", line.line())
                .with("saves", line.saves())
                .with("fromKvar", line.fromKvar())
                .with("words", line.words());
    }
}
