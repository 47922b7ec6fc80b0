// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import tariff.bill.LineCost;
import tariff.bill.PowerFactorCost;
import tariff.bill.Staircase;
import tariff.correction.Estimate;
import tariff.proposal.ClauseEffects;

/** One row for each month as a whole, without a line's name, and one for each of its lines. */
final class ClauseEffectsCsv {
    private static final int DECIMALS = 7;

    private ClauseEffectsCsv() {}

    static String of(ClauseEffects effects) {
        Csv csv = new Csv(List.of(
                "from",
                "to",
                "line",
                "billed",
                "to no-penalty point",
                "to unity",
                "next 0.01",
                "next kvar low",
                "next kvar central",
                "next kvar high",
                "next step power factor",
                "next step kvar",
                "next step saves",
                "savings end power factor",
                "savings end kvar"));
        List<PowerFactorCost.Month> today = effects.assessment().today().months();
        for (int i = 0; i < today.size(); i++) {
            ClauseEffects.Month month = effects.months().get(i);
            List<String> whole = cells(
                    month,
                    "",
                    today.get(i).asItIs().total(),
                    today.get(i).penalty(),
                    today.get(i).toUnity());
            whole.addAll(ahead(month));
            csv.row(whole);
            for (LineCost line : month.lines()) {
                List<String> part = cells(month, line.line(), line.asItIs(), line.penalty(), line.toUnity());
                part.addAll(Collections.nCopies(whole.size() - part.size(), ""));
                csv.row(part);
            }
        }
        return csv.text();
    }

    private static List<String> cells(ClauseEffects.Month month, String line, BigDecimal... amounts) {
        List<String> cells = new ArrayList<>(
                List.of(month.period().first().toString(), month.period().last().toString(), line));
        for (BigDecimal amount : amounts) {
            cells.add(amount.toPlainString());
        }
        return cells;
    }

    private static List<String> ahead(ClauseEffects.Month month) {
        List<String> cells = new ArrayList<>();
        cells.add(month.ahead().nextPoint().toPlainString());
        for (Estimate estimate : Estimate.values()) {
            cells.add(month.nextBank().getOrDefault(estimate, BigDecimal.ZERO).toPlainString());
        }
        Optional<Staircase.Step> step = month.ahead().nextStep();
        cells.addAll(place(step.map(Staircase.Step::at)));
        cells.add(step.map(each -> each.saving().toPlainString()).orElse(""));
        cells.addAll(place(month.ahead().flat()));
        return cells;
    }

    private static List<String> place(Optional<Staircase.Place> place) {
        return List.of(
                place.flatMap(Staircase.Place::powerFactor)
                        .map(pf -> pf.setScale(DECIMALS, RoundingMode.HALF_UP).toPlainString())
                        .orElse(""),
                place.flatMap(Staircase.Place::kvar)
                        .map(BigDecimal::toPlainString)
                        .orElse(""));
    }
}
