// SPDX-License-Identifier: Apache-2.0
/**
 * A bank on the table: what it would save under a rate, when it pays, and what a person must know before buying it. In: what joins
 * bills, banks and money. Out: formulas of any of the three, file formats. Start at {@link tariff.proposal.Assessment}; {@link
 * tariff.proposal.Sizing} asks which bank is best, {@link tariff.proposal.ClaimReview} whether an offer holds.
 */
@NullMarked
package tariff.proposal;

import org.jspecify.annotations.NullMarked;
