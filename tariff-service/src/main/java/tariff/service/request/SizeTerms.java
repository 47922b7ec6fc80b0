// SPDX-License-Identifier: Apache-2.0
package tariff.service.request;

import java.util.List;
import tariff.correction.Estimate;
import tariff.meter.MeteredMonth;
import tariff.proposal.SizingTerms;

/**
 * What a sizing is asked with.
 *
 * @param choice among which banks
 * @param prices what they cost
 * @param outlook the years ahead, with a discount rate
 * @param basis the estimate that answers rest on
 */
public record SizeTerms(ChoiceTerms choice, PriceTerms prices, OutlookTerms outlook, Estimate basis) {

    /** The terms for these months, which tell how large a bank may be if nobody said it. */
    public SizingTerms on(List<MeteredMonth> months) {
        return new SizingTerms(new Sizes(choice).among(months), prices.prices(), outlook.outlook(), basis);
    }
}
