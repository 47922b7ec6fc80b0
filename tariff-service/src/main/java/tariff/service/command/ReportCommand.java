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
import tariff.proposal.Proposal;
import tariff.proposal.SavingsBySize;
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

    @Option(names = "--date", paramLabel = "YYYY-MM-DD", description = "the day the report bears; none unless said")
    private Optional<LocalDate> date;

    @Override
    public Integer call() {
        Proposal proposal = bank.proposal();
        Metered metered = meter.read(spec.commandLine().getErr());
        Report plain = report(metered, proposal);
        write(date.map(plain::dated).orElse(plain).html());
        return Exit.OK;
    }

    private static Report report(Metered metered, Proposal proposal) {
        Billing billing = metered.billing();
        Assessment assessment = metered.sums()
                .map(sums -> Assessment.of(billing, sums, proposal))
                .orElseGet(() -> Assessment.of(billing, metered.months(), proposal));
        SavingsBySize sizes = metered.sums()
                .map(sums -> SavingsBySize.of(billing, sums, SavingsBySize.USUAL_STEPS))
                .orElseGet(() -> SavingsBySize.of(billing, metered.months(), SavingsBySize.USUAL_STEPS));
        return Report.of(assessment.with(metered.assumptions())).withSizes(sizes);
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
