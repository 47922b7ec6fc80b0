// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.function.Predicate;
import java.util.stream.Stream;
import tariff.correction.CapacitorBank;
import tariff.notice.Finding;
import tariff.notice.Refusal;

/**
 * A bank put together from units that can be bought, each as often as wanted. Every combination that differs in what a month sees of it
 * (fixed kvar, switched kvar, smallest step) is looked at, in the make of fewest units.
 *
 * @param unitsKvar the units on offer, each above 0
 * @param mostUnits units that a bank has room for, 1 to 24
 * @param fixed whether units may be always on
 * @param switched whether units may be switched
 * @param like gives what does not depend on the size
 */
public record StepList(List<BigDecimal> unitsKvar, int mostUnits, boolean fixed, boolean switched, CapacitorBank like)
        implements SizeChoice {
    private static final int MOST_BANKS = 2000;

    /** Throws {@link IllegalArgumentException} naming what is outside its range. */
    public StepList {
        unitsKvar = unitsKvar.stream().sorted().distinct().toList();
        if (unitsKvar.isEmpty() || unitsKvar.get(0).signum() <= 0) {
            throw new IllegalArgumentException("unitsKvar is " + unitsKvar + "; allowed: one or more, each above 0");
        }
        if (mostUnits < 1 || mostUnits > 24) {
            throw new IllegalArgumentException("mostUnits is " + mostUnits + "; allowed: 1 to 24");
        }
        if (!fixed && !switched) {
            throw new IllegalArgumentException(
                    "units may be neither fixed nor switched; allowed: one of the two, or both");
        }
    }

    @Override
    public CapacitorBank best(Objective objective) {
        return banks().stream()
                .max(Comparator.comparing(objective::at)
                        .thenComparing(
                                Comparator.comparing(CapacitorBank::ratedKvar).reversed()))
                .orElseThrow();
    }

    @Override
    public Optional<CapacitorBank> smallest(Predicate<CapacitorBank> holds) {
        return banks().stream().filter(holds).findFirst();
    }

    @Override
    public SizeChoice like(CapacitorBank bank) {
        boolean someFixed = fixed && bank.fixedKvar().signum() > 0;
        return new StepList(unitsKvar, mostUnits, someFixed, bank.isAutomatic(), like);
    }

    @Override
    public List<CapacitorBank> curve() {
        return banks();
    }

    @Override
    public BigDecimal mostKvar() {
        return unitsKvar.get(unitsKvar.size() - 1).multiply(BigDecimal.valueOf(mostUnits));
    }

    /** From the smallest to the largest. */
    List<CapacitorBank> banks() {
        List<List<BigDecimal>> switchedParts = switched ? parts(true) : List.of(List.of());
        List<List<BigDecimal>> fixedParts = fixed ? parts(false) : List.of(List.of());
        List<CapacitorBank> all = new ArrayList<>();
        for (List<BigDecimal> always : fixedParts) {
            for (List<BigDecimal> steps : switchedParts) {
                int units = always.size() + steps.size();
                if (units > 0 && units <= mostUnits) {
                    all.add(new BankShape(BigDecimal.ONE, 0, like).with(sum(always), steps));
                }
            }
            refuseIfTooMany(all.size());
        }
        all.sort(Comparator.comparing(CapacitorBank::ratedKvar));
        return all;
    }

    /** The combination of fewest units for each sum, and if asked for each smallest unit; unit by unit, so that the first is the shortest. */
    private List<List<BigDecimal>> parts(boolean bySmallest) {
        Map<String, List<BigDecimal>> best = new TreeMap<>();
        best.put("", List.of());
        List<List<BigDecimal>> latest = List.of(List.of());
        for (int count = 1; count <= mostUnits; count++) {
            List<List<BigDecimal>> next = new ArrayList<>();
            for (List<BigDecimal> shorter : latest) {
                for (BigDecimal unit : unitsKvar) {
                    List<BigDecimal> longer = Stream.concat(shorter.stream(), Stream.of(unit))
                            .sorted()
                            .toList();
                    String smallest = bySmallest ? longer.get(0).toPlainString() : "";
                    String key = sum(longer).stripTrailingZeros().toPlainString() + "/" + smallest;
                    if (best.putIfAbsent(key, longer) == null) {
                        next.add(longer);
                    }
                }
            }
            latest = next;
            refuseIfTooMany(best.size());
        }
        return List.copyOf(best.values());
    }

    private static void refuseIfTooMany(int banks) {
        if (banks > MOST_BANKS) {
            throw new Refusal(Finding.error(
                            "too-many-banks", "/unitsKvar", "can be put together in more ways than can be looked at")
                    .found("more than " + MOST_BANKS)
                    .allowed("fewer units, or fewer of them in a bank"));
        }
    }

    private static BigDecimal sum(List<BigDecimal> kvar) {
        return kvar.stream().reduce(BigDecimal.ZERO, BigDecimal::add);
    }
}
