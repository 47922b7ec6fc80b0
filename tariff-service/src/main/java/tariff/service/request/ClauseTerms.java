// SPDX-License-Identifier: Apache-2.0
package tariff.service.request;

import jakarta.validation.constraints.DecimalMax;
import jakarta.validation.constraints.DecimalMin;
import java.math.BigDecimal;
import tariff.proposal.ClauseEffects;
import tariff.rate.clause.Written;

/** What is asked of clauses: how many the next few kvar are, and whether charts are wanted. */
public record ClauseTerms(
        @DecimalMin(value = "0", inclusive = false, message = KVAR) @DecimalMax(value = MOST_KVAR, message = KVAR)
        BigDecimal kvar,

        boolean charts) {
    private static final String MOST_KVAR = "1000000";
    private static final String KVAR = "above 0, at most 1000000 kvar";

    static ClauseTerms read(Written in) {
        return new ClauseTerms(in.optionalNumber("kvar").orElse(ClauseEffects.USUAL_KVAR), in.flag("charts"));
    }
}
