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
import tariff.notice.Finding;
import tariff.notice.Refusal;
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
        Optional<Proposal> proposed = made.isPresent() ? Optional.empty() : Optional.of(bank.proposal());
        Metered metered = meter.read(spec.commandLine().getErr());
        Report report = made.map(each -> Report.of(metered.review(each)))
                .or(() -> proposed.map(each -> Report.of(metered.assessment(each))))
                .orElseThrow()
                .withSizes(metered.savingsBySize());
        write(date.map(report::dated).orElse(report).html());
        return Exit.OK;
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
