// SPDX-License-Identifier: Apache-2.0
package tariff.report;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import tariff.correction.Estimate;
import tariff.electrical.Screening;
import tariff.meter.Period;
import tariff.payback.Venture;
import tariff.proposal.Assessment;
import tariff.proposal.BankSavings;
import tariff.proposal.ClaimReview;
import tariff.proposal.Reviewed;
import tariff.proposal.SavingsBySize;

/**
 * What is handed over: an assessment and what else is known of the proposal. The same report gives the same bytes.
 *
 * @param assessment the bank held against the bills
 * @param bySize what banks of other sizes would save, if that was worked out
 * @param screens what electrical screening found; empty where nothing is known of the site
 * @param claims an offer's claims with their verdicts; empty where there is no offer
 * @param dated the day it bears, if any
 */
public record Report(
        Assessment assessment,
        Optional<SavingsBySize> bySize,
        List<Screening> screens,
        List<Reviewed> claims,
        Optional<LocalDate> dated) {
    public Report {
        screens = List.copyOf(screens);
        claims = List.copyOf(claims);
    }

    /** A report of which no more is known than the assessment, with the screens of its bank's place if the proposal describes it. */
    public static Report of(Assessment assessment) {
        return new Report(assessment, Optional.empty(), assessment.proposal().screens(), List.of(), Optional.empty());
    }

    /** A report of an offer: its assessment, and its claims one by one. */
    public static Report of(ClaimReview review) {
        return of(review.assessment()).withClaims(review.claims());
    }

    public Report withSizes(SavingsBySize sizes) {
        return new Report(assessment, Optional.of(sizes), screens, claims, dated);
    }

    public Report withScreens(List<Screening> found) {
        return new Report(assessment, bySize, found, claims, dated);
    }

    public Report withClaims(List<Reviewed> reviewed) {
        return new Report(assessment, bySize, screens, reviewed, dated);
    }

    public Report dated(LocalDate day) {
        return new Report(assessment, bySize, screens, claims, Optional.of(day));
    }

    /** The report as one HTML file: no script, nothing fetched, nothing left outside. */
    public String html() {
        return Page.of(this);
    }

    String currency() {
        return assessment.billing().rate().currency();
    }

    /** The site as its owner calls it, else {@code The site}. */
    String site() {
        String name = assessment.billing().site().name();
        return name.isBlank() ? "The site" : name;
    }

    BankSavings savings(Estimate estimate) {
        return assessment.savings(estimate);
    }

    List<Period> periods() {
        return assessment.today().months().stream()
                .map(month -> month.asItIs().month().period())
                .toList();
    }

    /** The months covered: {@code 2025-01 to 2025-12}. */
    String span() {
        List<Period> all = periods();
        return all.get(0).through(all.get(all.size() - 1));
    }

    /** {@code year}, or how many months the bills cover. */
    String year() {
        int months = periods().size();
        return months == 12 ? "year" : months == 1 ? "month" : "span of " + months + " months";
    }

    /** The bank as money sees it; empty where there is no payback to speak of. */
    Optional<Venture> venture(Estimate estimate) {
        return assessment.venture(estimate);
    }
}
