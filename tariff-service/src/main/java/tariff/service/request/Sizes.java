// SPDX-License-Identifier: Apache-2.0
package tariff.service.request;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import tariff.correction.CapacitorBank;
import tariff.meter.MeteredMonth;
import tariff.meter.Register;
import tariff.notice.Finding;
import tariff.notice.Refusal;
import tariff.proposal.BankShape;
import tariff.proposal.FreeSize;
import tariff.proposal.SizeChoice;
import tariff.proposal.StepList;
import tariff.service.request.ChoiceTerms.Shape;

/** The banks to choose among, once the months are known: no site needs more kvar than its meters ever read kVA. */
final class Sizes {
    /** Sizes that are looked at in one question. */
    static final int MOST = 500;

    private static final int USUAL = 200;
    private static final int MOST_MADE_OF_UNITS = 500;
    private static final List<BigDecimal> ROUND = List.of(BigDecimal.ONE, BigDecimal.valueOf(2), BigDecimal.valueOf(5));

    private final ChoiceTerms terms;
    private final CapacitorBank like;

    Sizes(ChoiceTerms terms) {
        this.terms = terms;
        this.like = terms.make().bank();
    }

    /** @throws Refusal if the months do not tell how large a bank may be and nobody said it, or if there are too many sizes */
    SizeChoice among(List<MeteredMonth> months) {
        return terms.availableKvar().isEmpty() ? anySize(months) : ofUnits();
    }

    private SizeChoice anySize(List<MeteredMonth> months) {
        BigDecimal wanted = terms.mostKvar().orElseGet(() -> highest(months));
        BigDecimal step = terms.incrementKvar().orElseGet(() -> round(wanted));
        BigDecimal increment = terms.mostKvar().isPresent() ? step.min(wanted) : step;
        RoundingMode end = terms.mostKvar().isPresent() ? RoundingMode.DOWN : RoundingMode.CEILING;
        BigDecimal sizes = wanted.divide(increment, 0, end).max(BigDecimal.ONE);
        if (sizes.compareTo(BigDecimal.valueOf(MOST)) > 0) {
            throw new Refusal(
                    Finding.error("too-many-sizes", "/choice/incrementKvar", "gives too many sizes to look at")
                            .found(increment.toPlainString() + " up to " + wanted.toPlainString() + " kvar")
                            .allowed("at most " + MOST + " sizes"));
        }
        List<BankShape> shapes =
                terms.shapes().stream().sorted().map(this::shape).toList();
        return new FreeSize(shapes, increment, increment.multiply(sizes));
    }

    private BankShape shape(Shape shape) {
        return switch (shape) {
            case FIXED -> new BankShape(BigDecimal.ONE, 0, like);
            case AUTOMATIC -> new BankShape(BigDecimal.ZERO, terms.steps(), like);
            case MIXED -> new BankShape(terms.fixedShare(), terms.steps(), like);
        };
    }

    private SizeChoice ofUnits() {
        boolean mixed = terms.shapes().contains(Shape.MIXED);
        StepList list = new StepList(
                terms.availableKvar(),
                terms.mostUnits(),
                mixed || terms.shapes().contains(Shape.FIXED),
                mixed || terms.shapes().contains(Shape.AUTOMATIC),
                like);
        int banks = banks(list);
        if (banks > MOST_MADE_OF_UNITS) {
            throw new Refusal(Finding.error(
                            "too-many-banks",
                            "/choice/availableKvar",
                            "can be put together in too many ways to look at")
                    .found(banks == Integer.MAX_VALUE ? "thousands" : String.valueOf(banks))
                    .allowed("at most " + MOST_MADE_OF_UNITS + ": fewer units, or a smaller \"mostUnits\""));
        }
        return list;
    }

    private static int banks(StepList list) {
        try {
            return list.curve().size();
        } catch (Refusal tooMany) {
            return Integer.MAX_VALUE;
        }
    }

    private static BigDecimal highest(List<MeteredMonth> months) {
        List<BigDecimal> read = new ArrayList<>();
        for (MeteredMonth month : months) {
            Stream.of(Register.PEAK_LAGGING_KVAR, Register.PEAK_KVA, Register.PEAK_KW)
                    .map(month.totals()::get)
                    .flatMap(Optional::stream)
                    .forEach(read::add);
        }
        return read.stream()
                .max(BigDecimal::compareTo)
                .filter(most -> most.signum() > 0)
                .orElseThrow(() -> new Refusal(Finding.error(
                                "missing-key",
                                "/choice",
                                "\"mostKvar\" is missing, and no month gives a highest kvar, kVA or kW to go by")
                        .allowed("the largest bank that has room")));
    }

    /** The least of 1, 2, 5, 10, 20 … that leaves no more than some two hundred sizes. */
    private static BigDecimal round(BigDecimal most) {
        BigDecimal least = most.divide(BigDecimal.valueOf(USUAL), java.math.MathContext.DECIMAL64);
        for (int tens = 0; ; tens++) {
            for (BigDecimal digit : ROUND) {
                BigDecimal increment = digit.movePointRight(tens);
                if (increment.compareTo(least) >= 0) {
                    return increment;
                }
            }
        }
    }
}
