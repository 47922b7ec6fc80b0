// SPDX-License-Identifier: Apache-2.0
package tariff.report;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import java.util.stream.Stream;
import tariff.correction.Estimate;
import tariff.payback.Answer;
import tariff.payback.Appraisal;
import tariff.payback.Recovery;
import tariff.proposal.ProposalCharts;

/** When the bank has paid for itself, and what it is worth. */
final class PaidBack implements Section {
    private static final int YEAR = 12;

    @Override
    public String id() {
        return "payback";
    }

    @Override
    public String title() {
        return "Payback";
    }

    @Override
    public void write(Html page, Report report) {
        if (report.assessment().appraisals().isEmpty()) {
            page.paragraph(
                    "No payback: " + report.assessment().whyNoPayback().orElse("no savings to hold it against") + ".");
            return;
        }
        measures(report).write(page);
        page.list("ul", reasons(report));
        ProposalCharts.cash(report.assessment())
                .ifPresent(chart -> Drawing.write(
                        page,
                        "cash-chart",
                        "Running sum of cost and savings; where a curve crosses nothing for good, the bank has paid for itself.",
                        chart.svg()));
        cash(report).write(page);
        report.venture(Estimate.CENTRAL).ifPresent(venture -> WhatItHangsOn.write(page, report, venture));
    }

    private static Table measures(Report report) {
        return new Table(
                        "payback-measures",
                        "Measures of the investment; money in " + report.currency(),
                        Shown.heads("Measure"))
                .row(row(report, "Cost ÷ settled year net of upkeep, years", 2, Appraisal::simplePaybackYears))
                .row(row(report, "Paid back at the end of month", 0, each -> months(Answer.known(each.payback()))))
                .row(row(report, "The same, discounted, month", 0, each -> months(each.discountedPayback())))
                .row(row(report, "Net present value", 2, Appraisal::netPresentValue))
                .row(row(report, "Internal rate of return, %", 2, each -> percent(each.internalReturn())))
                .row(row(report, "Modified internal rate of return, %", 2, each -> percent(each.modifiedReturn())))
                .row(row(report, "Savings ÷ investment, at today's worth", 2, Appraisal::savingsToInvestment));
    }

    private static Answer<BigDecimal> months(Answer<Recovery> recovery) {
        return recovery.flatMap(Recovery::lasting).map(BigDecimal::valueOf);
    }

    private static Answer<BigDecimal> percent(Answer<BigDecimal> share) {
        return share.map(value -> value.movePointRight(2));
    }

    private static List<String> row(
            Report report, String name, int decimals, Function<Appraisal, Answer<BigDecimal>> measure) {
        return Shown.row(name, each -> {
            Appraisal appraisal = report.assessment().appraisals().get(each);
            return appraisal == null
                    ? "n/a"
                    : measure.apply(appraisal).<String>fold(value -> Shown.decimals(value, decimals), reason -> "n/a");
        });
    }

    /** Why a measure has no value, each reason once with the estimates it holds for. */
    private static List<String> reasons(Report report) {
        return report.assessment().appraisals().entrySet().stream()
                .flatMap(each -> Stream.<Answer<?>>of(
                                each.getValue().simplePaybackYears(),
                                each.getValue().payback().lasting(),
                                each.getValue().discountedPayback().flatMap(Recovery::lasting),
                                each.getValue().netPresentValue(),
                                each.getValue().internalReturn(),
                                each.getValue().modifiedReturn(),
                                each.getValue().savingsToInvestment())
                        .flatMap(answer -> answer.<Stream<String>>fold(value -> Stream.empty(), Stream::of))
                        .map(reason -> "n/a, " + Shown.word(each.getKey()) + ": " + reason + "."))
                .distinct()
                .toList();
    }

    private static Table cash(Report report) {
        Table table = new Table(
                "payback-cash", "Running sum at the end of each year, in " + report.currency(), Shown.heads("Year"));
        List<List<BigDecimal>> sums = new ArrayList<>();
        for (Estimate estimate : Estimate.values()) {
            Appraisal appraisal = report.assessment().appraisals().get(estimate);
            sums.add(appraisal == null ? List.of() : appraisal.flow().cumulative());
        }
        for (int month = 0; month < sums.get(0).size(); month += YEAR) {
            List<String> cells = new ArrayList<>(List.of(Integer.toString(month / YEAR)));
            for (List<BigDecimal> each : sums) {
                cells.add(Shown.money(each.get(month)));
            }
            table.row(cells);
        }
        return table;
    }
}
