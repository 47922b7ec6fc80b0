// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import tariff.bill.Billing;
import tariff.meter.MeteredMonth;
import tariff.notice.Refusal;
import tariff.rate.Rate;

/**
 * One thing to try: the bills worked out again with a rate, a past and readings that may be other than those given.
 *
 * @param code the cause's
 * @param words what would be otherwise, as the subject of a sentence: {@code the power factor cut off to 0.01}
 * @param past months before the first, usually none
 * @param months as many as there are, in order
 * @param at the places of the months it is about; {@link #EVERY} for all of them
 */
record Trial(
        String code, String words, Rate rate, List<MeteredMonth> past, List<MeteredMonth> months, Set<Integer> at) {
    static final Set<Integer> EVERY = Set.of();

    Trial {
        past = List.copyOf(past);
        months = List.copyOf(months);
        at = Set.copyOf(at);
    }

    /** The same said of every month: a reading that is otherwise may follow a ratchet into later bills. */
    Trial everywhere() {
        return new Trial(code, words, rate, past, months, EVERY);
    }

    /** This change of the rate and another made to the changed rate. */
    Trial and(Trial other) {
        return new Trial(
                code + "+" + other.code, words + " and " + other.words, other.rate, other.past, other.months, EVERY);
    }

    boolean isAbout(int place) {
        return at.isEmpty() || at.contains(place);
    }

    /** The month compared again; empty if it lacks what the rate now bills. */
    Optional<ReconciledMonth> month(int place, Case bills) {
        ReconciledMonth asItStands = bills.charged().get(place);
        if (asItStands == null) {
            return Optional.empty();
        }
        List<MeteredMonth> before = new ArrayList<>();
        if (rate.looksBack()) {
            before.addAll(past);
            before.addAll(months.subList(0, place));
        }
        MeteredMonth month = months.get(place);
        try {
            return new Billing(rate, bills.billing().site())
                    .statements(before, List.of(month)).stream()
                            .map(each -> ReconciledMonth.of(each, month.charged(), asItStands.slack()))
                            .findFirst();
        } catch (Refusal lacksReadings) {
            return Optional.empty();
        }
    }
}
