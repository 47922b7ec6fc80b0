// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import static org.hamcrest.Matchers.contains;
import static org.hamcrest.Matchers.endsWith;
import static org.hamcrest.Matchers.equalTo;
import static org.hamcrest.Matchers.hasItems;
import static org.hamcrest.Matchers.nullValue;
import static org.hamcrest.Matchers.startsWith;

import org.junit.jupiter.api.Test;

class ClausesTest extends Served {
    private static final String EXAMPLE = Examples.text("examples/requests/clause-effects.json");

    /** Own arithmetic: 61,990 kvarh × 1.1874 = 73,606.93; at 20 % of the kWh the power factor is 1 ÷ √1.04 = 0.9805807. */
    @Test
    void anExampleSaysWhichClauseBitesAndWhereTheBillJumps() {
        json(EXAMPLE)
                .post("/clause-effects")
                .then()
                .statusCode(200)
                .body("kvar", equalTo(25))
                .body("months[0].lines[2].name", equalTo("Inductive energy"))
                .body("months[0].lines[2].penalty", equalTo(73606.93f))
                .body("months[0].nextStep.powerFactor", equalTo(0.9805807f))
                .body("months[0].nextStep.beyond", equalTo(false))
                .body("months[1].nextStep", nullValue())
                .body("cautions.code", hasItems("screening-only", "stored-energy"))
                .body("charts.bill", startsWith("<svg"))
                .body("charts.savings", endsWith("</svg>\n"));
    }

    @Test
    void chartsAreLeftOutUnlessAskedForAndFiftyKvarAreUsual() {
        json("{\"rate\":" + Examples.text("examples/requests/rate-check.json")
                        + ",\"months\":[{\"month\":\"2026-01\",\"energyKwh\":1000,\"laggingKvarh\":700}]}")
                .post("/clause-effects")
                .then()
                .statusCode(200)
                .body("kvar", equalTo(50))
                .body("lines[1].penalty", equalTo(4.00f)) // (700 − 500) × 0.02, own arithmetic
                .body("charts", nullValue());
    }

    @Test
    void everythingThatIsWrongIsSaidAtOnce() {
        json("{\"rate\":\"nowhere\",\"months\":[],\"kvar\":0,\"charts\":\"yes\",\"bank\":{}}")
                .post("/clause-effects")
                .then()
                .statusCode(422)
                .body("findings.pointer", contains("/rate", "/months", "/charts", "/kvar", "/bank"))
                .body("findings[3].message", equalTo("is out of range"))
                .body("findings[3].allowed", equalTo("above 0, at most 1000000 kvar"));
    }
}
