// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.math.BigDecimal;
import java.util.List;
import java.util.stream.Collectors;
import tariff.meter.Period;

/**
 * Something that would make bills agree. It is found by trying, so that it may be so; that it is so, only the utility can say.
 *
 * @param code which cause, for programs; two of them joined by {@code +} where only both together do it
 * @param words what would be otherwise; for single months the words are theirs
 * @param ofEveryMonth whether it is said of every month, or only of those that it explains
 * @param explains the months that would come to agree
 * @param breaks the months that agree as the rate stands and would no longer
 * @param now how many agree as the rate stands
 * @param then how many would agree
 * @param residual what would still separate all the bills from the rate, without signs
 */
public record Explanation(
        String code,
        String words,
        boolean ofEveryMonth,
        List<Month> explains,
        List<Period> breaks,
        Tally now,
        Tally then,
        BigDecimal residual) {

    /**
     * A month that would agree.
     *
     * @param period as the bill gives it
     * @param words what would be otherwise in it
     * @param month its amounts and lines as they would then compare
     */
    public record Month(Period period, String words, ReconciledMonth month) {

        String sentence() {
            return period() + " would agree " + (month.verdict() == Verdict.AGREES ? "to the cent" : "within rounding")
                    + " with " + words;
        }
    }

    public Explanation {
        explains = List.copyOf(explains);
        breaks = List.copyOf(breaks);
    }

    /** The sentence for a reader: what, how many months it would make agree, how many it would break. */
    public String message() {
        if (!ofEveryMonth) {
            return explains.stream().map(Month::sentence).collect(Collectors.joining("; "));
        }
        String broken = breaks.isEmpty()
                ? ""
                : "; " + breaks.stream().map(Period::toString).collect(Collectors.joining(", "))
                        + " would agree less well than now";
        return words + " would make " + then.words() + "; as the rate stands " + now.words() + broken;
    }

    /** How many months it explains, those to the cent twice: they cannot be a coincidence so easily. */
    int weight() {
        return explains.stream()
                .mapToInt(each -> each.month().verdict() == Verdict.AGREES ? 2 : 1)
                .sum();
    }

    /** Whether it makes more agree than it breaks. */
    boolean isBetterThanNow() {
        return then.agreeing() + then.toTheCent() > now.agreeing() + now.toTheCent();
    }

    boolean explains(Period period) {
        return explains.stream().anyMatch(each -> each.period().equals(period));
    }
}
