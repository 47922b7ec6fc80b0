// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.util.List;

/**
 * A claim with what there is to say of it.
 *
 * @param claim as it was made
 * @param verdict the answer
 * @param working the figures it rests on, in the order they are needed
 * @param slips ways of claiming too much that were recognised
 */
public record Reviewed(Claim claim, Verdict verdict, List<Working> working, List<Slip> slips) {

    /**
     * A figure of the working.
     *
     * @param what its name
     * @param figure number and unit as shown
     */
    public record Working(String what, String figure) {}

    public Reviewed {
        working = List.copyOf(working);
        slips = List.copyOf(slips);
    }

    /** Claim, verdict and slips in words: {@code saves 9000.00 a year: …}. */
    public String words() {
        StringBuilder all = new StringBuilder(claim.words()).append(": ").append(verdict.words());
        slips.forEach(slip -> all.append("; ").append(slip.words()));
        return all.append('.').toString();
    }
}
