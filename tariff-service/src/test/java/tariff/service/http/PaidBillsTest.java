// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import static org.hamcrest.Matchers.contains;
import static org.hamcrest.Matchers.equalTo;
import static org.hamcrest.Matchers.hasSize;

import org.junit.jupiter.api.Test;

class PaidBillsTest extends Served {

    /** Own arithmetic: 409 kW × 0.95 ÷ 0.81 is 480 kW, ÷ 0.815 is 477 kW; 3 kW × 11.40 = 34.20. */
    @Test
    void exampleBillsAreReconciledAndExplained() {
        json(Examples.text("examples/requests/reconciliation.json"))
                .post("/reconciliations")
                .then()
                .statusCode(200)
                .body("agreeing", equalTo(5))
                .body("months[1].lines[2].name", equalTo("Demand"))
                .body("months[1].lines[2].difference", equalTo(34.20f))
                .body("months[1].verdict", equalTo("differs"))
                .body("months[2].verdict", equalTo("within-rounding"))
                .body("explanations.code", contains("power-factor-rounding", "digits-swapped"))
                .body("explanations[0].then.agreeing", equalTo(11))
                .body("explanations[1].explains.month", contains("2025-09"))
                .body("explanations[1].explains[0].words", equalTo("lagging kvarh 98,630 for 96,830 (digits swapped)"))
                .body("unexplained", hasSize(0));
    }

    @Test
    void billsThatNothingExplainsAndThatLackALineAreAnsweredToo() {
        json("{\"rate\":" + Examples.text("examples/requests/rate-check.json")
                        + ",\"months\":[{\"month\":\"2026-01\",\"energyKwh\":1000,\"laggingKvarh\":700,"
                        + "\"charged\":{\"lines\":{\"Energy\":123.45,\"Meter rent\":3}}}]}")
                .post("/reconciliations")
                .then()
                .statusCode(200)
                .body("months[0].lines.verdict", contains("differs", "not-on-bill", "not-in-rate"))
                .body("unexplained.month", contains("2026-01"));
    }

    @Test
    void billsWithoutAmountsAreRefused() {
        json("{\"rate\":" + Examples.text("examples/requests/rate-check.json")
                        + ",\"months\":[{\"month\":\"2026-01\",\"energyKwh\":1000,\"laggingKvarh\":700}]}")
                .post("/reconciliations")
                .then()
                .statusCode(422)
                .body("findings.code", contains("nothing-charged"))
                .body("findings[0].where", equalTo("the bills"))
                .body("findings[0].message", equalTo("no month says what was charged"));
    }

    @Test
    void aMonthThatLacksWhatTheRateBillsIsRefusedByName() {
        json("{\"rate\":\"millbrook-kva-service\",\"months\":[{\"month\":\"2026-01\",\"energyKwh\":1000,"
                        + "\"charged\":{\"total\":100}}]}")
                .post("/reconciliations")
                .then()
                .statusCode(422)
                .body("findings[0].message", equalTo("the rate bills kVA; the bill does not give \"peakKva\""));
    }

    @Test
    void keysOfAnotherQuestionAreRefused() {
        json("{\"rate\":\"nowhere\",\"months\":[],\"bank\":{}}")
                .post("/reconciliations")
                .then()
                .statusCode(422)
                .body("findings.pointer", contains("/rate", "/months", "/bank"));
    }
}
