// SPDX-License-Identifier: Apache-2.0
package tariff.service.request;

import jakarta.validation.Valid;
import jakarta.validation.constraints.DecimalMax;
import jakarta.validation.constraints.DecimalMin;
import java.math.BigDecimal;
import java.util.Optional;
import tariff.payback.Outlook;
import tariff.payback.Taxation;
import tariff.rate.clause.Written;

/** What is expected of the years ahead, with the ranges of {@link Outlook}. */
public record OutlookTerms(
        Optional<@DecimalMin(value = "0", message = SHARE) @DecimalMax(value = "1", message = SHARE) BigDecimal>
                discountRate,

        @DecimalMin(value = "-0.9", message = RISE) @DecimalMax(value = "1", message = RISE)
        BigDecimal savingsEscalation,

        @DecimalMin(value = "-0.9", message = RISE) @DecimalMax(value = "1", message = RISE)
        BigDecimal upkeepEscalation,

        @DecimalMin(value = "0", message = SHARE) @DecimalMax(value = "1", message = SHARE)
        BigDecimal savingsDegradation,

        Optional<@Valid TaxTerms> taxation) {
    private static final String SHARE = "0 to 1";
    private static final String RISE = "-0.9 to 1";

    /** Tax on what the bank earns. */
    public record TaxTerms(
            @DecimalMin(value = "0", message = SHARE) @DecimalMax(value = "1", message = SHARE)
            BigDecimal rate,

            int depreciationYears) {}

    /** Level prices, nothing discounted, no tax. */
    public static OutlookTerms level() {
        return level(Optional.empty());
    }

    public static OutlookTerms level(Optional<BigDecimal> discountRate) {
        return new OutlookTerms(discountRate, BigDecimal.ZERO, BigDecimal.ZERO, BigDecimal.ZERO, Optional.empty());
    }

    static OutlookTerms read(Written in) {
        if (!in.isObject()) {
            in.wrong(
                    "type",
                    "must be an object",
                    "an object with any of: discountRate, savingsEscalation, upkeepEscalation, savingsDegradation,"
                            + " taxation");
            return level();
        }
        OutlookTerms terms = new OutlookTerms(
                in.optionalNumber("discountRate"),
                in.optionalNumber("savingsEscalation").orElse(BigDecimal.ZERO),
                in.optionalNumber("upkeepEscalation").orElse(BigDecimal.ZERO),
                in.optionalNumber("savingsDegradation").orElse(BigDecimal.ZERO),
                in.has("taxation") ? Optional.of(taxation(in.at("taxation"))) : Optional.empty());
        in.refuseOtherKeys();
        return terms;
    }

    private static TaxTerms taxation(Written in) {
        TaxTerms terms = new TaxTerms(in.number("rate"), in.wholeNumber("depreciationYears", 1, 60));
        in.refuseOtherKeys();
        return terms;
    }

    public Outlook outlook() {
        return new Outlook(
                discountRate,
                savingsEscalation,
                upkeepEscalation,
                savingsDegradation,
                taxation.map(tax -> new Taxation(tax.rate(), tax.depreciationYears())));
    }
}
