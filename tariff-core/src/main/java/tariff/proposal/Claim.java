// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

/** Something an offer says that its bank does. A new kind is one new file and a name below. */
public sealed interface Claim
        permits KvarClaim,
                KwClaim,
                KwhClaim,
                PaybackClaim,
                PlainBankClaim,
                PowerFactorClaim,
                SavingsByPart,
                SavingsClaim {

    /** The claim itself: {@code saves 9000.00 a year}. */
    String words();

    /** What there is to say of it. */
    Reviewed review(Evidence evidence);
}
