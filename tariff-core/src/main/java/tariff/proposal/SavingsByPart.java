// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import tariff.correction.Estimate;
import tariff.proposal.Reviewed.Working;

/**
 * A year's savings as a sum of parts, such as a demand charge and a penalty.
 *
 * @param parts money a year by what the offer calls it, at least one
 */
public record SavingsByPart(Map<String, BigDecimal> parts) implements Claim {
    public SavingsByPart {
        parts = Collections.unmodifiableMap(new LinkedHashMap<>(parts));
    }

    @Override
    public String words() {
        return "saves "
                + parts.entrySet().stream()
                        .map(part -> Words.money(part.getValue()) + " by \"" + part.getKey() + "\"")
                        .collect(Collectors.joining(" and "))
                + " a year";
    }

    /** The sum stands or falls like a single figure; if it falls, though no part does alone, the parts overlap. */
    @Override
    public Reviewed review(Evidence evidence) {
        BigDecimal sum = parts.values().stream().reduce(BigDecimal.ZERO, BigDecimal::add);
        Reviewed whole = SavingsClaim.yearly(sum).review(evidence);
        List<Working> working = new ArrayList<>();
        working.add(new Working("sum of the parts", Words.money(sum)));
        working.addAll(whole.working());
        List<Slip> slips = new ArrayList<>(whole.slips());
        BigDecimal most = parts.values().stream().max(BigDecimal::compareTo).orElse(sum);
        if (whole.verdict() instanceof Verdict.BeyondRate beyond
                && parts.size() > 1
                && most.compareTo(beyond.ceiling()
                                .max(evidence.assessment().today().toUnity()))
                        <= 0) {
            slips.add(0, Slip.COUNTED_TWICE);
            slips.remove(Slip.UNITY_NOT_PAID);
        }
        for (String part : parts.keySet()) {
            BigDecimal line = evidence.savings(Estimate.HIGH).settledYear(part);
            if (evidence.assessment().billing().rate().lines().stream()
                    .anyMatch(each -> each.name().equals(part))) {
                working.add(new Working("most that the line \"" + part + "\" saves", Words.money(line)));
            }
        }
        return new Reviewed(this, whole.verdict(), working, slips);
    }
}
