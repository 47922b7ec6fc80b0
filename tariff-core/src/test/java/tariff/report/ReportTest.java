// SPDX-License-Identifier: Apache-2.0
package tariff.report;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.w3c.dom.Element;
import tariff.bill.Bills;
import tariff.correction.CapacitorBank;
import tariff.correction.Controller;
import tariff.electrical.Screening;
import tariff.meter.Window;
import tariff.notice.Assumption;
import tariff.notice.Caution;
import tariff.proposal.Assessment;
import tariff.proposal.Proposal;
import tariff.proposal.Reviewed;

/** What a report holds, where, and in what form. */
class ReportTest {
    private static final String NARROW = "\u202f";

    static Stream<Report> reports() {
        return Stream.of(Handed.plain(), Handed.full(), Handed.bare());
    }

    @ParameterizedTest
    @MethodSource("reports")
    void theParts(Report report) {
        Pages page = Pages.read(report.html());
        assertThat(page.texts("h2"))
                .containsExactly(
                        "What is asked, and the short answer",
                        "The bill today",
                        "The bank",
                        "What the bank would save",
                        "Payback",
                        "Electrical screening",
                        "What the offer claims",
                        "What was taken to be so",
                        "Cautions: read before anybody acts on this",
                        "How the rate reads",
                        "Appendix: every figure, worked out");
        assertThat(page.texts("h1")).hasSize(1);
        assertThat(page.all("h4")).isEmpty();
        assertThat(page.all("*").stream().map(Element::getTagName).filter(name -> name.matches("h[123]")))
                .startsWith("h1", "h2");
        assertThat(page.document().getDocumentElement().getAttribute("lang")).isEqualTo("en");
    }

    /**
     * 160,000 kWh × 0.10 + (300 − 0.5 × 400) kvar × 8 = 16,000 + 800 a month; 100 kvar take the 800 away, and 800 × 6 = 4,800 are
     * there at the end of month 6, but for 6 × 100 ÷ 12 of upkeep, which month 7 pays. Own arithmetic.
     */
    @Test
    void theShortAnswerIsThreeSentences() {
        Pages page = Pages.read(Handed.plain().html());
        List<String> answer = Pages.inside(page.at("answer"), "p").stream()
                .map(Pages::text)
                .map(words -> words.replace(NARROW, ",").replace('\u00a0', ' '))
                .toList();
        assertThat(answer)
                .startsWith(
                        "Would a capacitor bank of 100 kvar pay for Tollgate Foundry under the rate Worked example?",
                        "Of 201,600 EUR billed for 2025-01 to 2025-12, 9,600 EUR is paid for missing the rate's own point without penalty"
                                + " (the highest lagging kvar up to 50 % of the highest kW), and unity power factor would take off no more.",
                        "The bank is estimated to save 9,600 EUR in a settled year.",
                        "At a cost of 4,800 EUR, by the central estimate it has paid for itself at the end of month 7.");
    }

    /** 120,000 kvarh at -0.01 are a credit of 1,200.00; whatever takes kvarh away raises the bill. */
    @Test
    void aBankThatRaisesTheBillIsSaidToDoSo() {
        String rate = Bills.rate("{ 'name': 'Credit', 'quantity': { 'energy': 'lagging kvarh' }, 'price': -0.01 }");
        Report report =
                Report.of(Assessment.of(Handed.billing("Tollgate Foundry", rate), Handed.year(), Handed.proposal()));
        assertThat(report.html())
                .contains("<p>The bank is estimated to raise the bills of a settled year by ")
                .contains("it does not pay for itself within its life");
    }

    @Test
    void withoutAPriceItSaysWhyThereIsNoPayback() {
        String html = Handed.bare().html();
        assertThat(html)
                .contains("<p>When it pays back is not told: no price is given.</p>")
                .contains("<p>No payback: no price is given.</p>");
    }

    @Test
    void whatTheBankIsToldStandsBesideIt() {
        CapacitorBank bank = CapacitorBank.plain(new BigDecimal("50"), List.of(new BigDecimal("25")))
                .withController(new Controller(Optional.empty(), 5, Optional.of(12)))
                .offIn(Window.daily("22:00", "06:00"));
        Report report = Report.of(
                Assessment.of(Handed.billing("", Bills.rate(Handed.LINES)), Handed.year(), Proposal.of(bank)));
        assertThat(Pages.read(report.html()).rows("bank-table"))
                .contains(
                        List.of("Fixed", "50", "kvar"),
                        List.of("Switching delay", "5", "minutes"),
                        List.of("Steps switched in or out, at most", "12", "an hour"),
                        List.of("Kept off by a time switch", "every day 22:00 to 06:00", ""));
    }

    @ParameterizedTest
    @MethodSource("reports")
    void everyAssumptionIsToldWithItsPlaceAndItsRemedy(Report report) {
        List<List<String>> rows = Pages.read(report.html()).rows("assumptions-table");
        assertThat(report.assessment().assumptions())
                .isNotEmpty()
                .allSatisfy((Assumption each) -> assertThat(rows).anySatisfy(row -> {
                    assertThat(row.get(0)).isEqualTo(each.message());
                    assertThat(row.get(1).split(", ")).contains(each.where());
                    assertThat(row.get(2)).isEqualTo(each.remedy());
                }));
    }

    @ParameterizedTest
    @MethodSource("reports")
    void everyCautionIsToldAndWhatCanKillIsToldTwice(Report report) {
        Pages page = Pages.read(report.html());
        assertThat(Pages.inside(page.at("cautions"), "strong").stream().map(Pages::text))
                .containsExactlyElementsOf(report.assessment().cautions().stream()
                        .map(Caution::message)
                        .toList());
        assertThat(Pages.text(page.at("answer")))
                .contains("Capacitors hold a lethal charge after they are switched off.");
    }

    @ParameterizedTest
    @MethodSource("reports")
    void everyTableHasACaptionAndHeadsWithAScope(Report report) {
        Pages page = Pages.read(report.html());
        assertThat(page.all("table")).isNotEmpty().allSatisfy(table -> {
            assertThat(Pages.inside(table, "caption")).hasSize(1);
            assertThat(Pages.inside(table, "th"))
                    .allSatisfy(head -> assertThat(head.getAttribute("scope")).isIn("col", "row"));
            assertThat(Pages.inside(table, "tr"))
                    .allSatisfy(row -> assertThat(Pages.inside(row, "th")).isNotEmpty());
        });
    }

    @Test
    void cellsHoldNumbersThatSpreadsheetsRead() {
        Pages page = Pages.read(Handed.full().html());
        List<List<String>> months = page.rows("savings-months");
        assertThat(months).hasSize(13);
        assertThat(months.get(1))
                .containsExactly("2025-01", "800.00", "800.00", "800.00", "800.00", "800.00", "800.00");
        assertThat(page.rows("bill-months").get(13)).endsWith("201600.00", "9600.00", "9600.00");
        assertThat(page.rows("payback-cash").get(2)).containsExactly("1", "4700.00", "4700.00", "4700.00");
    }

    @Test
    void screensAndClaimsAreToldWhereTheyAreGiven() {
        Report report = Handed.full();
        Pages page = Pages.read(report.html());
        List<List<String>> screens = page.rows("screens-table");
        assertThat(report.screens())
                .allSatisfy((Screening each) -> assertThat(screens)
                        .anySatisfy(row -> assertThat(row)
                                .containsExactly(
                                        each.name(),
                                        Shown.word(each.verdict()),
                                        each.found(),
                                        each.limit(),
                                        each.source(),
                                        each.settledBy())));
        List<List<String>> claims = page.rows("claims-table");
        assertThat(report.claims())
                .hasSize(3)
                .allSatisfy((Reviewed each) -> assertThat(claims)
                        .anySatisfy(row -> assertThat(row)
                                .startsWith(each.claim().words())
                                .contains(each.verdict().words())));
    }

    @Test
    void whereTheyAreNotGivenThatIsSaid() {
        assertThat(Handed.plain().html())
                .contains("That says nothing, least of all that all is well.")
                .contains("<p>No claims of an offer were given to review.</p>");
    }

    @Test
    void theRateIsReadBackInItsOwnWords() {
        Report report = Handed.plain();
        List<String> listed = Pages.inside(Pages.read(report.html()).at("rate"), "li").stream()
                .map(Pages::text)
                .toList();
        assertThat(listed)
                .containsAll(report.assessment().billing().rate().words().lines());
    }

    /** 300 kvar less half of 400 kW leave 100 kvar, at 8 each. */
    @Test
    void theAppendixIsFollowedWithAPencil() {
        assertThat(Pages.inside(Pages.read(Handed.plain().html()).at("working"), "li").stream()
                        .map(each -> Pages.text(each).lines().findFirst().orElse("")))
                .contains(
                        "Reactive demand: 800.00",
                        "800 = 100 kvar × 8",
                        "200 kW = 0.5 × 400 kW",
                        "Total: 16800.00 EUR");
    }

    @Test
    void theChartsAreDrawnAndTold() {
        Pages page = Pages.read(Handed.full().html());
        assertThat(page.all("figure").stream().map(each -> each.getAttribute("id")))
                .containsExactly("bill-chart", "size-chart", "cash-chart", "tornado-chart");
        assertThat(page.all("svg"))
                .hasSize(4)
                .allSatisfy(svg -> assertThat(svg.getAttribute("role")).isEqualTo("img"));
    }

    @ParameterizedTest
    @MethodSource("reports")
    void idsAreOnceOnlyAndEveryLinkLeadsSomewhere(Report report) {
        Pages page = Pages.read(report.html());
        List<String> ids = page.all("*").stream()
                .map(each -> each.getAttribute("id"))
                .filter(id -> !id.isEmpty())
                .toList();
        Set<String> once = new HashSet<>(ids);
        assertThat(ids).hasSameSizeAs(once);
        assertThat(page.all("a"))
                .isNotEmpty()
                .allSatisfy(link ->
                        assertThat(once).contains(link.getAttribute("href").substring(1)));
        assertThat(page.all("*").stream()
                        .flatMap(each ->
                                Stream.of(each.getAttribute("aria-labelledby").split(" ", -1)))
                        .filter(id -> !id.isEmpty()))
                .allSatisfy(id -> assertThat(once).contains(id));
    }

    @Test
    void theSameReportGivesTheSameBytesAndBearsADayOnlyIfItIsGiven() {
        assertThat(Handed.full().html()).isEqualTo(Handed.full().html());
        assertThat(Handed.plain().html()).doesNotContain("dated");
        assertThat(Handed.plain().dated(LocalDate.of(2026, 3, 31)).html())
                .contains("amounts in EUR, dated 2026-03-31.</p>");
    }
}
