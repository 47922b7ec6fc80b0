// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.equalTo;

import org.junit.jupiter.api.Test;

class ReportsTest extends Served {
    private static final String BODY = Examples.text("examples/requests/assessment.json");

    private static String dated(String day) {
        return BODY.replaceFirst("\\{", "{ \"date\": \"" + day + "\",");
    }

    @Test
    void theReportComesAsAPageThatCanBeSavedAsItIs() {
        String page = json(dated("2026-03-31"))
                .post("/reports")
                .then()
                .statusCode(200)
                .extract()
                .response()
                .asString();
        assertThat(page)
                .startsWith("<!DOCTYPE html>\n<html lang=\"en\">")
                .contains("<h1>Power factor and bill: Tollgate Foundry</h1>")
                .contains("dated 2026-03-31.</p>")
                .contains("Capacitors hold a lethal charge after they are switched off.")
                .endsWith("</html>\n");
    }

    @Test
    void anOfferIsReviewedAndItsPlaceScreened() {
        String page = json(Examples.text("examples/requests/review.json"))
                .post("/reports")
                .then()
                .statusCode(200)
                .extract()
                .response()
                .asString();
        assertThat(page).contains("Each claim held against the rate").doesNotContain("No offer");
    }

    @Test
    void theSameQuestionGetsTheSameBytes() {
        byte[] first = json(BODY).post("/reports").asByteArray();
        assertThat(json(BODY).post("/reports").asByteArray()).isEqualTo(first);
    }

    @Test
    void aDayThatIsNoneIsNamedWithWhatElseIsWrong() {
        json(dated("31.3.2026").replace("\"bank\"", "\"bnak\""))
                .post("/reports")
                .then()
                .statusCode(422)
                .body("findings.find { it.pointer == '/date' }.message", equalTo("is not a day"))
                .body("findings.find { it.code == 'missing-key' }.message", equalTo("\"bank\" is missing"));
    }

    @Test
    void aClientThatTakesNoPageIsTold() {
        json(BODY)
                .header("Accept", "application/json")
                .post("/reports")
                .then()
                .statusCode(406)
                .body("detail", equalTo("Only text/html is served here."));
    }
}
