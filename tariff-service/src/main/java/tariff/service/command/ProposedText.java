// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import tariff.correction.CapacitorBank;
import tariff.correction.Controller;
import tariff.payback.Investment;
import tariff.proposal.Proposal;
import tariff.rate.WindowWords;

/** What is proposed, in a line. */
final class ProposedText {
    private ProposedText() {}

    static String of(Proposal proposal) {
        CapacitorBank bank = proposal.bank();
        List<String> kvar = new ArrayList<>();
        if (bank.fixedKvar().signum() > 0) {
            kvar.add(bank.fixedKvar().toPlainString() + (bank.off().isPresent() ? " kvar fixed" : " kvar always on"));
        }
        if (bank.isAutomatic()) {
            kvar.add("switched steps of "
                    + bank.stepsKvar().stream().map(BigDecimal::toPlainString).collect(Collectors.joining(", "))
                    + " kvar" + told(bank.controller()));
        }
        String off = bank.off().map(window -> ", off " + WindowWords.of(window)).orElse("");
        String cost = proposal.investment()
                .map(Investment::netCost)
                .map(net -> ", cost " + net.setScale(2, RoundingMode.HALF_UP).toPlainString())
                .orElse(", no price given");
        return String.join(" and ", kvar) + off + cost;
    }

    private static String told(Controller controller) {
        String delay = controller.delayMinutes() > 0 ? " after " + controller.delayMinutes() + " minutes" : "";
        return delay
                + controller
                        .operationsPerHour()
                        .map(most -> ", at most " + most + (most == 1 ? " operation" : " operations") + " an hour")
                        .orElse("");
    }
}
