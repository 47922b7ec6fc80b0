// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import static org.assertj.core.api.Assertions.assertThat;

import io.restassured.response.Response;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** Bodies that nobody should send, and what is said to each. */
class HostileBodiesTest extends Served {
    private static final String MONTH = "{\"month\":\"2026-01\",\"energyKwh\":1000,\"peakKva\":10}";

    static Stream<Arguments> bodies() {
        return Stream.of(
                row("", 400, "line 1, column 0: is not valid JSON: No content to map due to end-of-input"),
                row("null", 422, ": must be an object; found null; allowed: an object in braces"),
                row("[]", 422, ": must be an object; found a list; allowed: an object in braces"),
                row("7", 422, ": must be an object; found 7; allowed: an object in braces"),
                row("\"x\"", 422, ": must be an object; found \"x\"; allowed: an object in braces"),
                row("{} {}", 400, null),
                row("{\"rate\":", 400, null),
                row("{'rate':1}", 400, null),
                row("{\"rate\":NaN}", 400, null),
                row("{\"a\":1,\"a\":2}", 400, null),
                row(
                        "[".repeat(61) + "]".repeat(61),
                        400,
                        ": is larger than a document can be; allowed: 60 levels, 50000 parts, numbers of 100 characters"),
                row("[" + "1,".repeat(50_000) + "1]", 400, null),
                row("{\"rate\":" + "9".repeat(101) + "}", 400, null),
                row(
                        "{}",
                        422,
                        ": \"rate\" is missing; allowed: the id of a rate in quotes, or a rate\n: \"months\" is missing"),
                row(
                        "{\"rate\":null,\"months\":[" + MONTH + "]}",
                        422,
                        "/rate: must be a rate; found null; allowed: an object with \"name\", \"currency\" and \"lines\""),
                row(
                        "{\"rate\":\"millbrok-kva-service\",\"months\":[" + MONTH + "]}",
                        422,
                        "/rate: is not the id of a rate; did you mean \"millbrook-kva-service\"?"),
                row(kva("[]"), 422, "/months: is empty; found a list; allowed: at least one entry"),
                row(kva("{}"), 422, "/months: must be a list; found an object; allowed: a list in square brackets"),
                row(
                        kva("[null]"),
                        422,
                        "/months/0: must be a billing period; found null; allowed: an object with \"month\", or with"
                                + " \"from\" and \"to\""),
                row(
                        kva("[{\"month\":\"2026-13\",\"energyKwh\":1,\"peakKva\":1}]"),
                        422,
                        "/months/0/month: is not a month; found \"2026-13\"; allowed: a month such as 2026-01, from 1900"
                                + " to 2199"),
                row(
                        kva("[{\"from\":\"2026-01-01\",\"to\":\"+999999999-12-31\",\"energyKwh\":1,\"peakKva\":1}]"),
                        422,
                        "/months/0/to: is not a day; found \"+999999999-12-31\"; allowed: a day such as 2026-01-31, from"
                                + " 1900 to 2199"),
                row(
                        kva("[{\"month\":\"2026-01\",\"energyKwh\":1e999999999,\"peakKva\":1}]"),
                        422,
                        "/months/0/energyKwh: is out of range; found 1E+999999999; allowed: up to 40 digits, below 1e30"),
                row(
                        kva("[{\"month\":\"2026-01\",\"energyKwh\":1e-999999999,\"peakKva\":1}]"),
                        422,
                        "/months/0/energyKwh: is out of range; found 1E-999999999; allowed: up to 40 digits, below 1e30"),
                row(
                        kva("[{\"month\":\"2026-01\",\"energyKwh\":-1,\"peakKva\":1}]"),
                        422,
                        "/months/0/energyKwh: cannot be a reading of kWh; found -1; allowed: 0 or more"),
                row(
                        kva("[{\"month\":\"2026-01\",\"energyKwh\":\"1\",\"peakKva\":true}]"),
                        422,
                        "/months/0/energyKwh: must be a number; found \"1\"; allowed: a number such as 0.95, without"
                                + " quotes\n/months/0/peakKva: must be a number; found true; allowed: a number such as"
                                + " 0.95, without quotes"),
                row(
                        kva("[" + MONTH + "," + MONTH + "]"),
                        422,
                        "/months/1: bills days that /months/0 bills too; found 2026-01; allowed: days outside 2026-01"),
                row(
                        kva("[{\"month\":\"2026-01\",\"enrgyKwh\":1,\"peakKva\":1}]"),
                        422,
                        "/months/0/enrgyKwh: is not a key here; did you mean \"energyKwh\"?"),
                row(
                        kva("[" + (MONTH + ",").repeat(120) + MONTH + "]"),
                        422,
                        "/months: holds 121 periods; found a list; allowed: at most 120"));
    }

    @ParameterizedTest
    @MethodSource("bodies")
    void aHostileBodyIsAnsweredWithWhatIsWrongWithIt(String body, int status, String findings) {
        Response response = json(body).post("/statements");
        assertThat(response.statusCode()).isEqualTo(status);
        if (findings != null) {
            assertThat(said(response)).startsWith(findings);
        }
    }

    @Test
    void bytesThatAreNoTextAreNoJson() {
        byte[] body = {'{', '"', (byte) 0xC3, '(', '"', ':', '1', '}'};
        given().header("Content-Type", "application/json")
                .body(body)
                .post("/statements")
                .then()
                .statusCode(400);
    }

    /** Each name leads to the next twice: 2 to the power of 40 clauses, were they written out. */
    @Test
    void aRateThatGrowsWithoutEndIsRefused() {
        StringBuilder quantities = new StringBuilder();
        for (int i = 0; i < 40; i++) {
            quantities.append("\"q" + i + "\":{\"sum\":[\"q" + (i + 1) + "\",\"q" + (i + 1) + "\"]},");
        }
        String rate = "{\"name\":\"A\",\"currency\":\"EUR\",\"quantities\":{" + quantities
                + "\"q40\":{\"peak\":\"kVA\"}},\"lines\":[{\"name\":\"E\",\"quantity\":\"q0\",\"price\":1}]}";
        Response response =
                json("{\"rate\":" + rate + ",\"months\":[" + MONTH + "]}").post("/statements");
        assertThat(said(response))
                .isEqualTo(
                        "/rate: is too large to be worked out once names and past months are written out; allowed: at most"
                                + " 200000 clauses, names 400 deep");
    }

    @Test
    void onlyTheFirstHundredFindingsAreGivenAndTheRestCounted() {
        String body = kva("[" + "{\"month\":\"x\"},".repeat(119) + "{\"month\":\"x\"}]");
        json(body)
                .post("/statements")
                .then()
                .statusCode(422)
                .body("findings.size()", org.hamcrest.Matchers.equalTo(100))
                .body("findingsLeftOut", org.hamcrest.Matchers.equalTo(20));
    }

    private static Arguments row(String body, int status, String findings) {
        return Arguments.of(body, status, findings);
    }

    private static String kva(String months) {
        return "{\"rate\":\"millbrook-kva-service\",\"months\":" + months + "}";
    }

    /** The findings as sentences, one a line. */
    static String said(Response response) {
        StringBuilder all = new StringBuilder();
        for (java.util.Map<String, String> finding :
                response.jsonPath().<java.util.Map<String, String>>getList("findings")) {
            all.append(all.length() == 0 ? "" : "\n")
                    .append(finding.getOrDefault("pointer", finding.get("where")))
                    .append(": ");
            all.append(finding.get("message"));
            all.append(finding.containsKey("found") ? "; found " + finding.get("found") : "");
            all.append(finding.containsKey("allowed") ? "; allowed: " + finding.get("allowed") : "");
        }
        return all.toString();
    }
}
