// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.equalTo;
import static org.hamcrest.Matchers.greaterThan;
import static org.hamcrest.Matchers.hasItems;
import static org.hamcrest.Matchers.hasSize;
import static org.hamcrest.Matchers.startsWith;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import tariff.service.shelf.Shelf;

class ContractTest extends Served {

    @Test
    void everythingServedIsDocumentedAndEverythingDocumentedIsServed() {
        assertThat(CONTRACT.operations())
                .containsExactlyInAnyOrderElementsOf(Routes.of(Shelf.empty(), Service.MOST_UPLOAD_BYTES).stream()
                        .map(route -> route.method().name() + " " + route.path())
                        .toList());
    }

    @ParameterizedTest
    @ValueSource(strings = {"/", "/openapi.json", "/schemas/rate.json", "/health", "/rates"})
    void whatIsServedMeetsTheContract(String path) {
        given().get(path).then().statusCode(200);
    }

    @ParameterizedTest
    @MethodSource("tariff.service.http.Examples#rates")
    void everyRateOnTheShelfReadsItselfBack(java.nio.file.Path file) {
        String id = file.getFileName().toString().replace(".json", "");
        given().get("/rates/" + id).then().statusCode(200).body("words.lines", hasSize(greaterThan(0)));
    }

    @Test
    void aRateThatIsNotKeptIsNotFound() {
        given().get("/rates/nowhere")
                .then()
                .statusCode(404)
                .body("detail", equalTo("There is no rate with this id; GET /rates lists them."));
    }

    @Test
    void anExampleRateIsChecked() {
        json(Examples.text("examples/requests/rate-check.json"))
                .post("/rate-checks")
                .then()
                .statusCode(200)
                .body("usable", equalTo(true))
                .body(
                        "words.lines[1]",
                        equalTo("Reactive energy: lagging kvarh above 50 % of the kWh, at 0.02 per kvarh."));
    }

    @Test
    void aWrongRateIsAnAnswer() {
        json("{\"name\":\"A\",\"currency\":\"EUR\",\"lines\":[{\"name\":\"E\",\"quantity\":{\"enegy\":\"kWh\"},\"price\":1}]}")
                .post("/rate-checks")
                .then()
                .statusCode(200)
                .body("usable", equalTo(false))
                .body("findings[0].pointer", equalTo("/lines/0/quantity"))
                .body("findings[0].message", startsWith("says no kind of quantity; did you mean \"energy\"?"));
    }

    /** Own arithmetic: 31 days × 2.35 = 72.85, 28 days × 2.35 = 65.80. */
    @Test
    void exampleMonthsAreBilled() {
        json(Examples.text("examples/requests/statement.json"))
                .post("/statements")
                .then()
                .statusCode(200)
                .body("statements.month", equalTo(java.util.List.of("2025-01", "2025-02")))
                .body("statements[0].lines[0].amount", equalTo(72.85f))
                .body("statements[1].lines[0].amount", equalTo(65.80f))
                .body("statements[0].lines[0].derivation.how", equalTo("31 days × 2.35"));
    }

    @Test
    void theSameQuestionGetsTheSameBytes() {
        String body = Examples.text("examples/requests/assessment.json");
        byte[] first = json(body).post("/assessments").asByteArray();
        assertThat(json(body).post("/assessments").asByteArray()).isEqualTo(first);
    }

    @Test
    void anExampleBankIsAssessedWithItsCautions() {
        json(Examples.text("examples/requests/assessment.json"))
                .post("/assessments")
                .then()
                .statusCode(200)
                .body("cautions.code", hasItems("screening-only", "stored-energy", "qualified-persons"))
                .body("payback.central.simplePaybackYears.value", greaterThan(0f));
    }

    @Test
    void aRateMayStandInTheRequest() {
        String rate = Examples.text("examples/requests/rate-check.json");
        json("{\"rate\":" + rate + ",\"months\":[{\"month\":\"2026-01\",\"energyKwh\":1000,\"laggingKvarh\":700}]}")
                .post("/statements")
                .then()
                .statusCode(200)
                .body("total", equalTo(104.00f)); // 1,000 × 0.10 + (700 − 500) × 0.02, own arithmetic
    }

    @Test
    void aMonthThatLacksWhatTheRateBillsIsRefusedByName() {
        json("{\"rate\":\"millbrook-kva-service\",\"months\":[{\"month\":\"2026-01\",\"energyKwh\":1000}]}")
                .post("/statements")
                .then()
                .statusCode(422)
                .body("findings[0].where", equalTo("2026-01"))
                .body("findings[0].message", equalTo("the rate bills kVA; the bill does not give \"peakKva\""));
    }
}
