// SPDX-License-Identifier: Apache-2.0
package tariff.report;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import tariff.correction.CapacitorBank;
import tariff.correction.Controller;
import tariff.payback.Investment;
import tariff.payback.Outlook;
import tariff.payback.Replacement;
import tariff.rate.WindowWords;

/** The bank that is proposed, what it costs, and what is expected of the years ahead. */
final class TheBank implements Section {
    @Override
    public String id() {
        return "bank";
    }

    @Override
    public String title() {
        return "The bank";
    }

    @Override
    public void write(Html page, Report report) {
        Table table = new Table("bank-table", "What is proposed", List.of("Item", "Value", "Unit"));
        capacitors(table, report.assessment().proposal().bank());
        Optional<Investment> investment = report.assessment().proposal().investment();
        investment.ifPresent(money -> cost(table, money, report.currency()));
        outlook(table, report.assessment().proposal().outlook());
        table.write(page);
        if (investment.isEmpty()) {
            page.paragraph("No price is given, so nothing is said of payback.");
        }
    }

    private static void capacitors(Table table, CapacitorBank bank) {
        table.row("Rated, all steps in", Shown.plain(bank.ratedKvar()), "kvar");
        table.row("Given at the service voltage", Shown.plain(round(bank.effectiveKvar())), "kvar");
        table.row(bank.off().isPresent() ? "Fixed" : "Always on", Shown.plain(bank.fixedKvar()), "kvar");
        for (int i = 0; i < bank.stepsKvar().size(); i++) {
            table.row("Switched step " + (i + 1), Shown.plain(bank.stepsKvar().get(i)), "kvar");
        }
        if (bank.isAutomatic()) {
            table.row(
                    "Power factor that the steps aim at",
                    bank.controller().targetPowerFactor().map(Shown::plain).orElse("1"),
                    "");
            controller(table, bank.controller());
        }
        bank.off().ifPresent(off -> table.row("Kept off by a time switch", WindowWords.of(off), ""));
        bank.ratedVolts().ifPresent(volts -> table.row("Rated voltage", Shown.plain(volts), "V"));
        bank.serviceVolts().ifPresent(volts -> table.row("Service voltage", Shown.plain(volts), "V"));
        table.row("Detuning reactor, share of the capacitor's reactance", Shown.percent(bank.reactorShare()), "%");
        table.row("Own losses", Shown.plain(bank.wattsPerKvar()), "W/kvar");
    }

    private static void controller(Table table, Controller controller) {
        if (controller.delayMinutes() > 0) {
            table.row("Switching delay", Integer.toString(controller.delayMinutes()), "minutes");
        }
        controller
                .operationsPerHour()
                .ifPresent(most -> table.row("Steps switched in or out, at most", most.toString(), "an hour"));
    }

    private static void cost(Table table, Investment investment, String currency) {
        table.row("Purchase", Shown.money(investment.purchase()), currency);
        table.row("Installation", Shown.money(investment.installation()), currency);
        table.row("Paid by others (incentives)", Shown.money(investment.incentives()), currency);
        table.row("Cost net of incentives", Shown.money(investment.netCost()), currency);
        table.row("Upkeep of the first year", Shown.money(investment.yearlyUpkeep()), currency);
        table.row("Life", Integer.toString(investment.lifeYears()), "years");
        for (Replacement replacement : investment.replacements()) {
            table.row(
                    "Replacement at the end of year " + replacement.year(), Shown.money(replacement.cost()), currency);
        }
        table.row("Value at the end of the life", Shown.money(investment.residual()), currency);
    }

    private static void outlook(Table table, Outlook outlook) {
        table.row(
                "Discount rate",
                outlook.discountRate().map(Shown::percent).orElse("not given"),
                outlook.discountRate().isPresent() ? "% a year" : "");
        table.row(
                "Rise of the prices that savings are made of", Shown.percent(outlook.savingsEscalation()), "% a year");
        table.row("Rise of the upkeep", Shown.percent(outlook.upkeepEscalation()), "% a year");
        table.row("Savings lost as the bank ages", Shown.percent(outlook.savingsDegradation()), "% a year");
        outlook.taxation().ifPresent(tax -> {
            table.row("Tax on the gain", Shown.percent(tax.rate()), "%");
            table.row("Written off over", Integer.toString(tax.depreciationYears()), "years");
        });
    }

    private static BigDecimal round(BigDecimal kvar) {
        return kvar.setScale(3, java.math.RoundingMode.HALF_UP);
    }
}
