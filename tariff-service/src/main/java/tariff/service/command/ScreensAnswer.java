// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.util.List;
import java.util.Locale;
import tariff.electrical.Screening;
import tariff.json.JsonObject;
import tariff.json.ScreeningsJson;
import tariff.notice.Caution;
import tariff.proposal.BankCautions;
import tariff.proposal.Proposal;

/** The screens of a bank at its place, printed. */
record ScreensAnswer(Proposal proposal) implements Format.Printable {

    @Override
    public String text() {
        return "The bank at its place, screened: where to look, not a design\n\n" + text(proposal.screens()) + "\n"
                + cautions(BankCautions.of(proposal.bank()));
    }

    /** Each screen with what it found and what it rests on. */
    static String text(List<Screening> screens) {
        StringBuilder out = new StringBuilder();
        for (Screening screen : screens) {
            out.append(Wrapped.text(
                    "  " + verdict(screen).toUpperCase(Locale.ROOT) + "  " + screen.name() + ": " + screen.found()));
            out.append(Wrapped.text("      limit: " + screen.limit()));
            out.append(Wrapped.text("      source: " + screen.source()));
            out.append(Wrapped.text("      settled by: " + screen.settledBy()));
        }
        return out.toString();
    }

    static String cautions(List<Caution> cautions) {
        StringBuilder out = new StringBuilder("Before anybody acts on this\n");
        cautions.forEach(each -> out.append(Wrapped.text("- " + each.message())));
        return out.toString();
    }

    private static String verdict(Screening screen) {
        return screen.verdict().name().toLowerCase(Locale.ROOT).replace('_', ' ');
    }

    @Override
    public JsonObject json() {
        return ScreeningsJson.write(proposal.screens(), BankCautions.of(proposal.bank()));
    }

    @Override
    public String csv() {
        Csv csv = new Csv(List.of("screen", "verdict", "found", "value", "unit", "limit", "source", "settled by"));
        proposal.screens()
                .forEach(screen -> csv.row(List.of(
                        screen.name(),
                        verdict(screen),
                        screen.found(),
                        screen.value().isPresent()
                                ? String.valueOf(screen.value().getAsDouble())
                                : "",
                        screen.unit(),
                        screen.limit(),
                        screen.source(),
                        screen.settledBy())));
        return csv.text();
    }
}
