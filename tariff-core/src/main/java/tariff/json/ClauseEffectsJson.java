// SPDX-License-Identifier: Apache-2.0
package tariff.json;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Arrays;
import java.util.Locale;
import java.util.function.Function;
import tariff.bill.LineCost;
import tariff.bill.Staircase;
import tariff.correction.Estimate;
import tariff.proposal.Assessment;
import tariff.proposal.ClauseEffects;

/** Which clause bites, and what the next point of power factor or the next few kvar would take off the bills. */
public final class ClauseEffectsJson {
    private static final int DECIMALS = 7;

    private ClauseEffectsJson() {}

    public static JsonObject write(ClauseEffects effects) {
        Assessment assessment = effects.assessment();
        return new JsonObject()
                .with("rate", assessment.billing().rate().name())
                .with("currency", assessment.billing().rate().currency())
                .with("noPenaltyPoint", assessment.today().point().words())
                .with("kvar", effects.bankKvar())
                .withAll("lines", effects.lines(), ClauseEffectsJson::write)
                .with("nextPoint", effects.nextPoint())
                .with("nextBank", estimates(effects::nextBank))
                .withAll("months", effects.months(), ClauseEffectsJson::write)
                .withAll("assumptions", assessment.assumptions(), NoticeJson::write)
                .withAll("cautions", assessment.cautions(), NoticeJson::write);
    }

    private static JsonObject write(ClauseEffects.Month month) {
        Staircase ahead = month.ahead();
        JsonObject json = PeriodJson.write(new JsonObject(), month.period())
                .withIf("powerFactor", ahead.powerFactor().map(ClauseEffectsJson::rounded))
                .withAll("lines", month.lines(), ClauseEffectsJson::write)
                .with("nextPoint", ahead.nextPoint())
                .with("nextBank", estimates(estimate -> month.nextBank().getOrDefault(estimate, BigDecimal.ZERO)));
        ahead.nextStep()
                .ifPresent(step -> json.with(
                        "nextStep",
                        place(step.at()).with("beyond", step.beyond()).with("saving", step.saving())));
        ahead.flat().ifPresent(flat -> json.with("savingsEnd", place(flat)));
        return json;
    }

    private static JsonObject write(LineCost line) {
        JsonObject json = new JsonObject()
                .with("name", line.line())
                .with("billed", line.asItIs())
                .with("penalty", line.penalty())
                .with("toUnity", line.toUnity());
        return line.shownOnly() ? json.with("shownOnly", true) : json;
    }

    private static JsonObject place(Staircase.Place place) {
        return new JsonObject()
                .with("improvement", rounded(place.improvement()))
                .withIf("powerFactor", place.powerFactor().map(ClauseEffectsJson::rounded))
                .withIf("kvar", place.kvar());
    }

    /** To the digits that the place of a step is known to. */
    private static BigDecimal rounded(BigDecimal powerFactor) {
        return powerFactor.setScale(DECIMALS, RoundingMode.HALF_UP);
    }

    private static JsonObject estimates(Function<Estimate, BigDecimal> value) {
        JsonObject json = new JsonObject();
        Arrays.stream(Estimate.values())
                .forEach(each -> json.with(each.name().toLowerCase(Locale.ROOT), value.apply(each)));
        return json;
    }
}
