// SPDX-License-Identifier: Apache-2.0
package tariff.service.request;

import jakarta.validation.Valid;
import jakarta.validation.constraints.AssertTrue;
import jakarta.validation.constraints.DecimalMax;
import jakarta.validation.constraints.DecimalMin;
import jakarta.validation.constraints.Max;
import jakarta.validation.constraints.Min;
import java.math.BigDecimal;
import java.util.List;
import tariff.payback.Investment;
import tariff.payback.Replacement;
import tariff.rate.clause.Written;

/** What a bank costs, with the ranges of {@link Investment} and bounds beyond any real price. */
public record InvestmentTerms(
        @DecimalMin(value = "0", message = MONEY) @DecimalMax(value = MOST, message = MONEY)
        BigDecimal purchase,

        @DecimalMin(value = "0", message = MONEY) @DecimalMax(value = MOST, message = MONEY)
        BigDecimal installation,

        @DecimalMin(value = "0", message = MONEY) @DecimalMax(value = MOST, message = MONEY)
        BigDecimal incentives,

        @DecimalMin(value = "0", message = MONEY) @DecimalMax(value = MOST, message = MONEY)
        BigDecimal yearlyUpkeep,

        @Min(value = 1, message = YEARS) @Max(value = 60, message = YEARS)
        int lifeYears,

        List<@Valid ReplacementTerms> replacements,

        @DecimalMin(value = "-" + MOST, message = RESIDUAL) @DecimalMax(value = MOST, message = RESIDUAL)
        BigDecimal residual) {
    private static final String MOST = "1000000000000";
    private static final String MONEY = "0 to " + MOST;
    private static final String RESIDUAL = "-" + MOST + " to " + MOST;
    private static final String YEARS = "1 to 60 years";
    private static final int USUAL_LIFE = 15;

    /** A later purchase at the end of a year. */
    public record ReplacementTerms(
            int year,

            @DecimalMin(value = "0", message = MONEY) @DecimalMax(value = MOST, message = MONEY)
            BigDecimal cost) {}

    public InvestmentTerms {
        replacements = List.copyOf(replacements);
    }

    /** A price without incentive, replacement or residual value. */
    public static InvestmentTerms plain(BigDecimal purchase, BigDecimal yearlyUpkeep, int lifeYears) {
        return new InvestmentTerms(
                purchase, BigDecimal.ZERO, BigDecimal.ZERO, yearlyUpkeep, lifeYears, List.of(), BigDecimal.ZERO);
    }

    static InvestmentTerms read(Written in) {
        InvestmentTerms terms = new InvestmentTerms(
                in.number("purchase"),
                orNothing(in, "installation"),
                orNothing(in, "incentives"),
                orNothing(in, "yearlyUpkeep"),
                in.has("lifeYears") ? in.wholeNumber("lifeYears", 1, 60) : USUAL_LIFE,
                in.has("replacements")
                        ? in.list("replacements").stream()
                                .map(InvestmentTerms::replacement)
                                .toList()
                        : List.of(),
                orNothing(in, "residual"));
        in.refuseOtherKeys();
        return terms;
    }

    private static ReplacementTerms replacement(Written in) {
        ReplacementTerms terms = new ReplacementTerms(in.wholeNumber("year", 1, 60), in.number("cost"));
        in.refuseOtherKeys();
        return terms;
    }

    private static BigDecimal orNothing(Written in, String key) {
        return in.optionalNumber(key).orElse(BigDecimal.ZERO);
    }

    @AssertTrue(message = "replacements within the life of the bank")
    boolean isReplacedInItsLife() {
        return replacements.stream().allMatch(each -> each.year() <= lifeYears);
    }

    public Investment investment() {
        return new Investment(
                purchase,
                installation,
                incentives,
                yearlyUpkeep,
                lifeYears,
                replacements.stream()
                        .map(each -> new Replacement(each.year(), each.cost()))
                        .toList(),
                residual);
    }
}
