// SPDX-License-Identifier: Apache-2.0
package tariff.service.request;

import jakarta.validation.constraints.DecimalMax;
import jakarta.validation.constraints.DecimalMin;
import jakarta.validation.constraints.Max;
import jakarta.validation.constraints.Min;
import java.math.BigDecimal;
import java.util.Optional;
import tariff.proposal.PriceList;
import tariff.rate.clause.Written;

/** What banks cost, with the ranges of {@link PriceList} and bounds beyond any real price. */
public record PriceTerms(
        @DecimalMin(value = "0", message = MONEY) @DecimalMax(value = MOST, message = MONEY)
        BigDecimal fixedPart,

        @DecimalMin(value = "0", message = MONEY) @DecimalMax(value = MOST, message = MONEY)
        BigDecimal perFixedKvar,

        @DecimalMin(value = "0", message = MONEY) @DecimalMax(value = MOST, message = MONEY)
        BigDecimal perSwitchedKvar,

        @DecimalMin(value = "0", message = MONEY) @DecimalMax(value = MOST, message = MONEY)
        BigDecimal perStep,

        @DecimalMin(value = "0", message = "0 to 1") @DecimalMax(value = "1", message = "0 to 1")
        BigDecimal yearlyUpkeepShare,

        @Min(value = 1, message = "1 to 60 years") @Max(value = 60, message = "1 to 60 years")
        int lifeYears) {
    private static final String MOST = "1000000000";
    private static final String MONEY = "0 to " + MOST;
    private static final int USUAL_LIFE = 15;

    public static PriceTerms read(Written in) {
        Optional<BigDecimal> perKvar = in.optionalNumber("perKvar");
        PriceTerms terms = new PriceTerms(
                in.optionalNumber("fixedPart").orElse(BigDecimal.ZERO),
                each(in, "perFixedKvar", perKvar),
                each(in, "perSwitchedKvar", perKvar),
                in.optionalNumber("perStep").orElse(BigDecimal.ZERO),
                in.optionalNumber("yearlyUpkeepShare").orElse(BigDecimal.ZERO),
                in.has("lifeYears") ? in.wholeNumber("lifeYears", 1, 60) : USUAL_LIFE);
        if (!in.isObject()) {
            in.wrong("type", "must be a list of prices", "an object with \"perKvar\"");
        } else if (perKvar.isEmpty() && !(in.has("perFixedKvar") && in.has("perSwitchedKvar"))) {
            in.wrongAs(
                    "missing-key",
                    "says no price per kvar",
                    "neither \"perKvar\" nor both of the others",
                    "\"perKvar\", or \"perFixedKvar\" and \"perSwitchedKvar\"");
        }
        in.refuseOtherKeys();
        return terms;
    }

    private static BigDecimal each(Written in, String key, Optional<BigDecimal> perKvar) {
        return in.optionalNumber(key).or(() -> perKvar).orElse(BigDecimal.ZERO);
    }

    public PriceList prices() {
        return new PriceList(fixedPart, perFixedKvar, perSwitchedKvar, perStep, yearlyUpkeepShare, lifeYears);
    }
}
