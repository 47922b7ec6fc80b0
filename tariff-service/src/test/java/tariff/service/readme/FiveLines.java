// SPDX-License-Identifier: Apache-2.0
package tariff.service.readme;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import tariff.bill.Billing;
import tariff.bill.Statement;
import tariff.correction.CapacitorBank;
import tariff.json.BillsJson;
import tariff.json.RateFile;
import tariff.meter.MeteredSite;
import tariff.proposal.Assessment;
import tariff.proposal.Proposal;

/** The lines that the README shows to a Java developer, compiled and run. */
final class FiveLines {
    private FiveLines() {}

    static Assessment run(Path root) throws IOException {
        // from here
        MeteredSite foundry = BillsJson.read(Files.readAllBytes(root.resolve("examples/foundry/bills.json")));
        Billing billing = new Billing(
                RateFile.read(root.resolve("examples/rates/harbourside-large-service.json")), foundry.site());
        List<Statement> statements = billing.statements(foundry.months());
        Proposal proposal = Proposal.of(CapacitorBank.automatic("50", "50", "100"));
        Assessment assessment = Assessment.of(billing, foundry.months(), proposal);
        // to here
        return statements.size() == 12 ? assessment : null;
    }
}
