// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

/** What is done about intervals that a file does not have. */
public enum GapRule {
    /** The file is refused, each gap named. */
    REFUSE("refuse"),
    /** They stay absent from the series; sums miss them, and each gap is listed as an assumption. */
    LEAVE_OUT("leave-out"),
    /** They are filled in a straight line between the neighbours, or a counter's rise is spread evenly; each is listed. */
    INTERPOLATE("interpolate");

    private final String word;

    GapRule(String word) {
        this.word = word;
    }

    /** The word that a user picks it by: {@code leave-out}. */
    public String word() {
        return word;
    }
}
