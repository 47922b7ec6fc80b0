// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.io.IOException;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import tariff.bill.Billing;
import tariff.notice.Finding;
import tariff.notice.Refusal;
import tariff.proposal.Assessment;
import tariff.proposal.ClaimReview;
import tariff.proposal.Offer;
import tariff.proposal.Proposal;
import tariff.report.Report;

/** Writes the report to hand over. */
@Command(
        name = "report",
        description = {
            "Writes an assessment as one HTML file to hand over: no script, nothing fetched, ready for print.",
            "A screening estimate, not a design."
        },
        mixinStandardHelpOptions = true)
@SuppressWarnings("NullAway.Init") // picocli fills them in
final class ReportCommand implements Callable<Integer> {
    @Spec
    private CommandSpec spec;

    @Mixin
    private MeterFile meter;

    @Mixin
    private BankOptions bank;

    @Option(
            names = {"-o", "--output"},
            paramLabel = "FILE",
            description = "where to write it; the standard output unless said")
    private Optional<Path> output;

    @Option(
            names = "--offer",
            paramLabel = "FILE",
            description = "an offer, in place of the bank; its claims are reviewed")
    private Optional<Path> offer;

    @Option(names = "--date", paramLabel = "YYYY-MM-DD", description = "the day the report bears; none unless said")
    private Optional<LocalDate> date;

    @Override
    public Integer call() {
        Optional<Offer> made = offer.map(Files::offer);
        Proposal proposal = made.map(Offer::proposal).orElseGet(bank::proposal);
        Metered metered = meter.read(spec.commandLine().getErr());
        Report report = Report.of(assessment(metered, proposal)).withSizes(metered.savingsBySize());
        Report reviewed = made.map(
                        each -> report.withClaims(review(metered, each).claims()))
                .orElse(report);
        write(date.map(reviewed::dated).orElse(reviewed).html());
        return Exit.OK;
    }

    private static Assessment assessment(Metered metered, Proposal proposal) {
        Billing billing = metered.billing();
        return metered.sums()
                .map(sums -> Assessment.of(billing, sums, proposal))
                .orElseGet(() -> Assessment.of(billing, metered.months(), proposal))
                .with(metered.assumptions());
    }

    private static ClaimReview review(Metered metered, Offer made) {
        Billing billing = metered.billing();
        return metered.sums()
                .map(sums -> ClaimReview.of(billing, sums, made))
                .orElseGet(() -> ClaimReview.of(billing, metered.months(), made));
    }

    private void write(String html) {
        if (output.isEmpty()) {
            spec.commandLine().getOut().print(html);
            spec.commandLine().getOut().flush();
            return;
        }
        try {
            java.nio.file.Files.writeString(output.get(), html);
        } catch (IOException e) {
            throw new Refusal(Finding.error("unwritable", output.get().toString(), "cannot be written"));
        }
    }
}
