// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import tariff.bill.Billing;
import tariff.correction.CapacitorBank;
import tariff.correction.Estimate;
import tariff.json.JsonObject;
import tariff.json.SizingJson;
import tariff.payback.Answer;
import tariff.proposal.SizedBank;
import tariff.proposal.Sizing;

/**
 * A sizing, printed.
 *
 * @param basis the estimate that answers rest on unless they name another
 */
record SizingAnswer(Billing billing, Estimate basis, Sizing sizing) implements Format.Printable {

    @Override
    public String text() {
        StringBuilder out = new StringBuilder(Wrapped.text(title()));
        out.append(Wrapped.text("Low power factor costs " + money(sizing.today().toUnity())
                + " a year short of unity, " + money(sizing.today().penalty())
                + " short of the rate's own point without penalty: "
                + sizing.today().point().words() + "."));
        out.append('\n').append(answers());
        reasons(out);
        if (sizing.roomLimits()) {
            out.append(Wrapped.text("  The best size is the largest looked at; a larger one might be better."));
        }
        sizing.undecided()
                .ifPresent(
                        each -> out.append(Wrapped.text("  Undecided: " + each.words() + "; " + each.reading() + ".")));
        out.append("\nWhere each line of the bill stops paying\n");
        sizing.lines().forEach(line -> out.append(Wrapped.text("- " + line.words())));
        if (sizing.lines().isEmpty()) {
            out.append("- no line moves with reactive load\n");
        }
        out.append("\nTaken to be so\n");
        Assumed.text(sizing.assumptions()).forEach(each -> out.append(Wrapped.text("- " + each)));
        return out.append('\n')
                .append(ScreensAnswer.cautions(sizing.cautions()))
                .toString();
    }

    private String title() {
        String site = billing.site().name();
        return (site.isEmpty() ? "" : site + " under ") + billing.rate().name() + ", amounts in "
                + billing.rate().currency();
    }

    /** An answer under its name, with the estimate that it rests on. */
    private record Named(String name, Estimate estimate, Answer<SizedBank> answer) {}

    /** In the order of what to follow. */
    private List<Named> named() {
        List<Named> all = new ArrayList<>(List.of(
                new Named("Worth most", basis, sizing.highestValue()),
                new Named("Paid back soonest", basis, sizing.shortestPayback()),
                new Named("Smallest without penalty", basis, sizing.smallestWithoutPenalty())));
        for (Estimate estimate : Estimate.values()) {
            all.add(new Named("Worth most, " + word(estimate), estimate, sizing.bestFor(estimate)));
        }
        all.add(new Named("Least regret", basis, sizing.leastRegret()));
        return all;
    }

    private String answers() {
        Table table = new Table().row("", "kvar", "cost", "saved, low", "central", "high", "worth today", "years");
        for (Named each : named()) {
            table.row(each.answer().<String[]>fold(sized -> row(each, sized), reason ->
                    new String[] {"  " + each.name(), "none"}));
        }
        return table.text();
    }

    private static String[] row(Named named, SizedBank sized) {
        SizedBank.Gain gain = sized.gain(named.estimate());
        List<String> cells = new ArrayList<>(List.of(
                "  " + named.name(),
                plain(sized.kvar()),
                money(sized.investment().netCost())));
        for (Estimate estimate : Estimate.values()) {
            cells.add(money(sized.gain(estimate).settledYear()));
        }
        cells.add(money(gain.netPresentValue()));
        cells.add(gain.paybackYears().<String>fold(SizingAnswer::money, reason -> "n/a"));
        return cells.toArray(String[]::new);
    }

    private void reasons(StringBuilder out) {
        out.append(Wrapped.text(
                "  Saved is a settled year's saving; worth today (net present value) and years to pay back are by the "
                        + word(basis) + " estimate, unless the row names another."));
        for (Named each : named()) {
            out.append(Wrapped.text("  " + each.name() + ": "
                    + each.answer().<String>fold(sized -> divided(sized.bank()), reason -> reason) + "."));
        }
        out.append(Wrapped.text("  At worst the choice of least regret turns out " + money(sizing.worstRegret())
                + " short of the best."));
    }

    private static String divided(CapacitorBank bank) {
        List<String> parts = new ArrayList<>();
        if (bank.fixedKvar().signum() > 0) {
            parts.add(plain(bank.fixedKvar()) + (bank.off().isPresent() ? " kvar fixed" : " kvar always on"));
        }
        Map<BigDecimal, Integer> steps = new TreeMap<>();
        bank.stepsKvar().forEach(step -> steps.merge(step, 1, Integer::sum));
        steps.forEach((kvar, count) -> parts.add(count + " × " + plain(kvar) + " kvar switched"));
        return String.join(", ", parts);
    }

    private static String plain(BigDecimal kvar) {
        return kvar.stripTrailingZeros().toPlainString();
    }

    private static String word(Estimate estimate) {
        return estimate.name().toLowerCase(Locale.ROOT);
    }

    private static String money(BigDecimal value) {
        return value.setScale(2, RoundingMode.HALF_UP).toPlainString();
    }

    @Override
    public JsonObject json() {
        return SizingJson.write(billing, sizing);
    }

    /** The curve: a row for each size. */
    @Override
    public String csv() {
        List<String> header = new ArrayList<>(List.of("kvar", "cost"));
        for (Estimate estimate : Estimate.values()) {
            header.addAll(List.of(
                    "saved first year " + word(estimate),
                    "saved settled year " + word(estimate),
                    "net present value " + word(estimate)));
        }
        Csv csv = new Csv(header);
        for (SizedBank sized : sizing.curve()) {
            List<String> cells = new ArrayList<>(
                    List.of(plain(sized.kvar()), money(sized.investment().netCost())));
            for (Estimate estimate : Estimate.values()) {
                SizedBank.Gain gain = sized.gain(estimate);
                cells.addAll(
                        List.of(money(gain.firstYear()), money(gain.settledYear()), money(gain.netPresentValue())));
            }
            csv.row(cells);
        }
        return csv.text();
    }
}
