// SPDX-License-Identifier: Apache-2.0
package tariff.report;

import java.math.BigDecimal;
import java.util.Optional;
import tariff.bill.PowerFactorCost;
import tariff.correction.Estimate;
import tariff.notice.Caution;
import tariff.payback.Appraisal;
import tariff.payback.Investment;

/** What is asked, and the answer in three sentences: what it costs, what the bank saves, when it pays. */
final class ShortAnswer implements Section {
    @Override
    public String id() {
        return "answer";
    }

    @Override
    public String title() {
        return "What is asked, and the short answer";
    }

    @Override
    public void write(Html page, Report report) {
        page.paragraph(asked(report));
        page.open("div", "class", "answer");
        page.paragraph(cost(report));
        page.paragraph(saved(report));
        page.paragraph(paid(report));
        page.close();
        page.open("div", "class", "caution");
        report.assessment().cautions().stream()
                .filter(each ->
                        each.code().equals("screening-only") || each.code().equals("stored-energy"))
                .map(Caution::message)
                .forEach(page::paragraph);
        page.open("p").text("a", "All cautions", "href", "#cautions").close().close();
    }

    private static String asked(Report report) {
        return "Would a capacitor bank of "
                + Shown.plain(report.assessment().proposal().bank().ratedKvar()) + " kvar pay for "
                + (report.site().equals("The site") ? "the site" : report.site()) + " under the rate "
                + report.assessment().billing().rate().name() + "?";
    }

    private static String cost(Report report) {
        PowerFactorCost today = report.assessment().today();
        String of = "Of " + money(report, today.billed()) + " billed for " + report.span() + ", ";
        String unity = money(report, today.toUnity());
        if (!today.point().named()) {
            return of + unity + " would not be asked at unity power factor; the rate names no point short of it.";
        }
        String penalty = today.penalty().signum() < 0
                ? "nothing is paid for missing the rate's own point without penalty"
                : money(report, today.penalty()) + " is paid for missing the rate's own point without penalty";
        String more = today.penalty().compareTo(today.toUnity()) == 0
                ? "unity power factor would take off no more."
                : unity + " would not be asked at unity power factor.";
        return of + penalty + " (" + today.point().words() + "), and " + more;
    }

    private static String saved(Report report) {
        BigDecimal low = report.savings(Estimate.LOW).settledYearTotal();
        BigDecimal central = report.savings(Estimate.CENTRAL).settledYearTotal();
        BigDecimal high = report.savings(Estimate.HIGH).settledYearTotal();
        BigDecimal first = report.savings(Estimate.CENTRAL).firstYearTotal();
        String bounds = low.compareTo(high) == 0
                ? ""
                : ", " + money(report, low) + " at least and " + money(report, high) + " at most";
        String start = first.compareTo(central) == 0 ? "" : ", and " + money(report, first) + " in the first";
        if (central.signum() < 0) {
            return "The bank is estimated to raise the bills of a settled " + report.year() + " by "
                    + money(report, central.negate()) + ".";
        }
        return "The bank is estimated to save " + money(report, central) + " in a settled " + report.year() + bounds
                + start + ".";
    }

    private static String paid(Report report) {
        Optional<String> why = report.assessment().whyNoPayback();
        if (why.isPresent()) {
            return "When it pays back is not told: " + why.get() + ".";
        }
        String cost = report.assessment()
                .proposal()
                .investment()
                .map(Investment::netCost)
                .map(net -> "At a cost of " + money(report, net) + ", ")
                .orElse("");
        return cost + "by the central estimate it " + central(report) + others(report) + ".";
    }

    private static String central(Report report) {
        return payback(report, Estimate.CENTRAL)
                .map(month -> "has paid for itself at the end of month " + month)
                .orElse("does not pay for itself within its life");
    }

    private static String others(Report report) {
        String low = months(report, Estimate.LOW);
        String high = months(report, Estimate.HIGH);
        return low.equals(high) ? "" : " (low estimate: " + low + ", high estimate: " + high + ")";
    }

    private static String months(Report report, Estimate estimate) {
        return payback(report, estimate).map(month -> "month " + month).orElse("never within its life");
    }

    private static Optional<Integer> payback(Report report, Estimate estimate) {
        return Optional.ofNullable(report.assessment().appraisals().get(estimate))
                .map(Appraisal::payback)
                .flatMap(payback -> payback.lasting().optional());
    }

    private static String money(Report report, BigDecimal amount) {
        return Shown.money(amount, report.currency());
    }
}
