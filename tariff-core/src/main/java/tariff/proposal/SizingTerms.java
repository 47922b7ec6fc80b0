// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import tariff.correction.Estimate;
import tariff.payback.Outlook;

/**
 * Between what to choose, and by what to judge.
 *
 * @param choice the banks
 * @param prices what they cost
 * @param outlook the years ahead; its discount rate is needed
 * @param basis the estimate that answers rest on unless they say otherwise
 */
public record SizingTerms(SizeChoice choice, PriceList prices, Outlook outlook, Estimate basis) {

    /** Judged by the estimate between the bounds. */
    public static SizingTerms of(SizeChoice choice, PriceList prices, Outlook outlook) {
        return new SizingTerms(choice, prices, outlook, Estimate.CENTRAL);
    }
}
