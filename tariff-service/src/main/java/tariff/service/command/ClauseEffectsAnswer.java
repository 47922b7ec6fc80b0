// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.List;
import java.util.Optional;
import tariff.bill.LineCost;
import tariff.bill.PowerFactorCost;
import tariff.bill.Staircase;
import tariff.correction.Estimate;
import tariff.json.ClauseEffectsJson;
import tariff.json.JsonObject;
import tariff.proposal.Assessment;
import tariff.proposal.ClauseEffects;

/** What each clause costs and what comes next, printed. */
record ClauseEffectsAnswer(ClauseEffects effects) implements Format.Printable {
    private static final int DECIMALS = 7;

    @Override
    public String text() {
        Assessment assessment = effects.assessment();
        StringBuilder out = new StringBuilder(Wrapped.text(Title.of(assessment.billing())));
        out.append("\nWhat each clause costs over all months because of reactive load\n")
                .append(lines(effects.biting()))
                .append(Wrapped.text("\"Penalty\" is paid for being short of the rate's own point without penalty: "
                        + assessment.today().point().words()
                        + ". Below zero it is a credit that would be given up there."));
        out.append('\n').append(months()).append(Wrapped.text(next()));
        for (ClauseEffects.Month month : effects.months()) {
            out.append('\n').append(month.period()).append('\n');
            out.append(lines(month.lines().stream().filter(LineCost::bites).toList()));
            month.ahead().nextStep().ifPresent(step -> out.append(Wrapped.text("  " + words(step))));
        }
        out.append("\nTaken to be so\n");
        Assumed.text(assessment.assumptions()).forEach(each -> out.append(Wrapped.text("- " + each)));
        out.append("\nBefore anybody acts on this\n");
        assessment.cautions().forEach(each -> out.append(Wrapped.text("- " + each.message())));
        return out.toString();
    }

    private static String lines(List<LineCost> lines) {
        if (lines.isEmpty()) {
            return "  No line moves with reactive load.\n";
        }
        Table table = new Table().row("  Line", "Billed", "Penalty", "To unity");
        lines.forEach(line -> table.row(
                "  " + line.line() + (line.shownOnly() ? " (shown only)" : ""),
                money(line.asItIs()),
                money(line.penalty()),
                money(line.toUnity())));
        return table.text();
    }

    private String months() {
        Table table =
                new Table().row("Month", "PF", "Penalty", "To unity", "Next 0.01", nextKvar(), "Ends at PF", "kvar");
        PowerFactorCost today = effects.assessment().today();
        for (int i = 0; i < today.months().size(); i++) {
            ClauseEffects.Month month = effects.months().get(i);
            Staircase ahead = month.ahead();
            table.row(
                    month.period().toString(),
                    powerFactor(ahead.powerFactor()),
                    money(today.months().get(i).penalty()),
                    money(today.months().get(i).toUnity()),
                    money(ahead.nextPoint()),
                    money(month.nextBank().getOrDefault(Estimate.CENTRAL, BigDecimal.ZERO)),
                    powerFactor(ahead.flat().flatMap(Staircase.Place::powerFactor)),
                    ahead.flat()
                            .flatMap(Staircase.Place::kvar)
                            .map(ClauseEffectsAnswer::whole)
                            .orElse("-"));
        }
        return table.row(
                        "All",
                        "",
                        money(today.penalty()),
                        money(today.toUnity()),
                        money(effects.nextPoint()),
                        money(effects.nextBank(Estimate.CENTRAL)))
                .text();
    }

    private String nextKvar() {
        return "Next " + plain(effects.bankKvar()) + " kvar";
    }

    private String next() {
        String low = money(effects.nextBank(Estimate.LOW));
        String high = money(effects.nextBank(Estimate.HIGH));
        String central = money(effects.nextBank(Estimate.CENTRAL));
        return "The next 0.01 of power factor in every month saves " + money(effects.nextPoint()) + ". The next "
                + plain(effects.bankKvar()) + " kvar, always on, save "
                + (low.equals(high) ? central : low + " to " + high + ", by estimate " + central)
                + " in a settled year."
                + effects.lastToFlatten()
                        .map(month -> " " + month.period() + " needs most kvar until nothing more is saved.")
                        .orElse(" Nothing more can be saved.");
    }

    private static String words(Staircase.Step step) {
        String place = step.at()
                .powerFactor()
                .map(pf -> "power factor " + plain(pf.setScale(DECIMALS, RoundingMode.HALF_UP)))
                .orElse("a power factor better by "
                        + plain(step.at().improvement().setScale(DECIMALS, RoundingMode.HALF_UP)));
        String kvar =
                step.at().kvar().map(more -> " (" + whole(more) + " kvar more)").orElse("");
        return "Next step: " + (step.beyond() ? "going beyond " : "reaching ") + place + kvar
                + (step.saving().signum() < 0 ? " puts " : " takes ")
                + money(step.saving().abs())
                + (step.saving().signum() < 0 ? " on the bill at once." : " off the bill at once.");
    }

    private static String powerFactor(Optional<BigDecimal> value) {
        return value.map(pf -> pf.setScale(4, RoundingMode.HALF_UP).toPlainString())
                .orElse("-");
    }

    /** Up, so that it is enough. */
    private static String whole(BigDecimal kvar) {
        return kvar.setScale(0, RoundingMode.UP).toPlainString();
    }

    private static String plain(BigDecimal number) {
        return number.stripTrailingZeros().toPlainString();
    }

    private static String money(BigDecimal value) {
        return value.setScale(2, RoundingMode.HALF_UP).toPlainString();
    }

    @Override
    public JsonObject json() {
        return ClauseEffectsJson.write(effects);
    }

    @Override
    public String csv() {
        return ClauseEffectsCsv.of(effects);
    }
}
