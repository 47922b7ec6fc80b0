// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.equalTo;
import static org.hamcrest.Matchers.greaterThan;
import static org.hamcrest.Matchers.hasItems;
import static org.hamcrest.Matchers.hasSize;
import static org.hamcrest.Matchers.not;
import static org.hamcrest.Matchers.startsWith;

import io.restassured.response.Response;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tariff.json.JsonTree;

/** Which bank is best, whether an offer holds, what could go wrong: over the wire. */
class ProposalsTest extends Served {

    /** Own arithmetic: 2,500 + 32 × kvar + 6 × 250 is the price of an automatic bank of six steps. */
    @Test
    void theBestBankHasThePriceOfTheList() {
        Response answer = json(Examples.text("examples/requests/sizing.json")).post("/sizings");
        assertThat(answer.statusCode()).isEqualTo(200);
        float kvar = answer.path("highestValue.kvar");
        answer.then()
                .body("highestValue.cost", equalTo(4000 + 32 * kvar))
                .body("highestValue.bank.stepsKvar", hasSize(6))
                .body("cautions.code", hasItems("screening-only", "stored-energy", "qualified-persons"))
                .body("smallestWithoutPenalty.reason", startsWith("the rate names no point at which penalties end"))
                .body("lines.line", equalTo(List.of("Demand")))
                .body("roomLimits", equalTo(false))
                .body("undecided.reading", equalTo("interval data of kWh and kvarh settle it"));
    }

    @Test
    void theBestSizeCanBeAssessedAsItStands() {
        Map<String, Object> sizing = request("sizing");
        Response best = json(Json.text(sizing)).post("/sizings");
        Map<String, Object> assessment = new TreeMap<>(sizing);
        assessment.keySet().retainAll(List.of("rate", "site", "months"));
        assessment.put("bank", best.path("highestValue.bank"));
        float saved = best.path("highestValue.gains.central.settledYear");
        json(Json.text(assessment))
                .post("/assessments")
                .then()
                .statusCode(200)
                .body("savings.central.settledYear", equalTo(saved));
    }

    /** All that a bank can be told comes back as a request takes it. */
    @Test
    void theBestSizeOfATimeSwitchedBankCanBeAssessedAsItStands() {
        Map<String, Object> sizing = request("sizing");
        Map<String, Object> choice = new TreeMap<>();
        choice.put("shapes", List.of("automatic"));
        choice.put("steps", 4);
        choice.put(
                "make",
                Map.of(
                        "switchingDelayMinutes",
                        10,
                        "operationsPerHour",
                        6,
                        "wattsPerKvar",
                        2,
                        "off",
                        Map.of("weekdays", "Mon-Fri", "from", "22:00", "to", "24:00", "months", List.of(11, 12))));
        sizing.put("choice", choice);
        Response best = json(Json.text(sizing)).post("/sizings");
        best.then()
                .statusCode(200)
                .body("highestValue.bank.switchingDelayMinutes", equalTo(10))
                .body("highestValue.bank.operationsPerHour", equalTo(6))
                .body(
                        "highestValue.bank.off",
                        equalTo(Map.of(
                                "weekdays",
                                "Mon, Tue, Wed, Thu, Fri",
                                "from",
                                "22:00",
                                "to",
                                "24:00",
                                "months",
                                List.of(11, 12))))
                .body("assumptions.code", hasItems("off-hours", "switching-not-seen"));
        Map<String, Object> assessment = new TreeMap<>(sizing);
        assessment.keySet().retainAll(List.of("rate", "site", "months"));
        assessment.put("bank", best.path("highestValue.bank"));
        float saved = best.path("highestValue.gains.central.settledYear");
        json(Json.text(assessment))
                .post("/assessments")
                .then()
                .statusCode(200)
                .body("savings.central.settledYear", equalTo(saved));
    }

    /** kvarh at 0.0060 never pay for a connection at 14,000; own arithmetic: no saving above 1,179.79 a year is to be had. */
    @Test
    void noBankIsSaidPlainly() {
        json(Examples.text("examples/requests/sizing-no-bank.json"))
                .post("/sizings")
                .then()
                .statusCode(200)
                .body("today.toUnity", equalTo(1179.79f))
                .body("highestValue.reason", startsWith("no bank: even the best size, "))
                .body("bestFor.low.reason", startsWith("no bank: "))
                .body("bestFor.high.reason", startsWith("no bank: "))
                .body("leastRegret.reason", startsWith("no bank at all is the calmest choice"))
                .body("worstRegret", equalTo(0.00f))
                .body("cautions", hasSize(greaterThan(0)));
    }

    @Test
    void anInflatedOfferIsTakenApartClaimByClaim() {
        json(Examples.text("examples/requests/review.json"))
                .post("/reviews")
                .then()
                .statusCode(200)
                .body(
                        "claims.verdict",
                        equalTo(List.of(
                                "beyond-rate",
                                "beyond-rate",
                                "holds-only-if",
                                "beyond-physics",
                                "beyond-physics",
                                "cannot-tell")))
                .body("claims[0].limit", equalTo(22608.60f))
                .body("claims[0].slips.code", equalTo(List.of("counted-twice")))
                .body("claims[3].slips.code", equalTo(List.of("kwh-from-nowhere")))
                .body("claims[4].slips.code", equalTo(List.of("kw-not-lowered")))
                .body("claims[5].claim", equalTo("needs no detuning reactor"))
                .body("assessment.cautions.code", hasItems("screening-only", "stored-energy"));
    }

    /** Own arithmetic: 420 kVA of drives on 1,000 kVA are 42 %; √(0.045² + 0.03² + 0.015²) = 5.6 %. */
    @Test
    void drivesForbidAPlainBank() {
        json(Examples.text("examples/requests/screening.json"))
                .post("/screenings")
                .then()
                .statusCode(200)
                .body("screens", hasSize(16))
                .body("screens.find { it.name == 'detuning' }.verdict", equalTo("stop"))
                .body(
                        "screens.find { it.name == 'detuning' }.found",
                        startsWith("non-linear load is 42.0 % of the transformer, voltage distortion 5.6 %"))
                .body("screens.find { it.name == 'parallel resonance' }.verdict", equalTo("stop"))
                .body("screens.find { it.name == 'life' }.verdict", equalTo("not-screened"))
                .body("screens.verdict", hasItems("fine", "look-closer", "stop", "not-screened"))
                .body("screens.settledBy", not(hasItems("")))
                .body("cautions.code", hasItems("screening-only", "stored-energy"));
    }

    @Test
    void anAssessmentShowsTheScreensIfItKnowsTheNetwork() {
        Map<String, Object> assessment = request("assessment");
        json(Json.text(assessment)).post("/assessments").then().body("screens", equalTo(null));
        assessment.put("network", Map.of("serviceVolts", 400, "motors", List.of(), "generators", false));
        json(Json.text(assessment))
                .post("/assessments")
                .then()
                .statusCode(200)
                .body("screens", hasSize(16))
                .body("screens.find { it.name == 'generators' }.verdict", equalTo("fine"));
    }

    /** Each step at 440 V gives (400 ÷ 440)² ÷ (1 − 0.07) = 0.8886 of its kvar at 400 V: 355.46 of 400, own arithmetic. */
    @Test
    void aFairOfferHolds() {
        Map<String, Object> review = request("review");
        review.keySet().retainAll(List.of("rate", "site", "months"));
        review.putAll(document("examples/offers/tollgate-fair.json"));
        json(Json.text(review))
                .post("/reviews")
                .then()
                .statusCode(200)
                .body("claims.verdict", equalTo(List.of("holds", "holds", "holds", "holds")))
                .body("claims[3].words", equalTo("holds: the bank gives 355.46 kvar at the service voltage"))
                .body("assessment.screens.verdict", not(hasItems("stop")));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "/sizings | {\"rate\":\"polder-grid-mv\"} | /outlook: \"discountRate\" is missing; allowed: 0 to 1, where 0.08 means 8 %: the best size is the one worth most today",
                "/sizings | {\"rate\":\"polder-grid-mv\"} | : \"prices\" is missing; allowed: an object with \"perKvar\": there are no prices but your own",
                "/sizings | {\"prices\":{\"perKvar\":-1,\"lifeYears\":99}} | /prices/perFixedKvar: is out of range; found -1; allowed: 0 to 1000000000",
                "/sizings | {\"prices\":{\"perKvar\":-1,\"lifeYears\":99}} | /prices/lifeYears: must be a whole number; found 99; allowed: a whole number from 1 to 60",
                "/sizings | {\"prices\":{\"fixedPart\":1}} | /prices: says no price per kvar; found neither \"perKvar\" nor both of the others; allowed: \"perKvar\", or \"perFixedKvar\" and \"perSwitchedKvar\"",
                "/sizings | {\"prices\":[]} | /prices: must be a list of prices; found a list; allowed: an object with \"perKvar\"",
                "/sizings | {\"choice\":{\"shapes\":[\"fixd\"]}} | /choice/shapes/0: is not known; did you mean \"fixed\"?; found \"fixd\"; allowed: automatic, fixed, mixed",
                "/sizings | {\"choice\":{\"incrementKvar\":1,\"mostKvar\":501}} | /choice: does not hold together; allowed: \"mostKvar\" at least as large as \"incrementKvar\", at most 500 times it",
                "/sizings | {\"choice\":{\"availableKvar\":[25],\"steps\":3}} | /choice/steps: does not go with this choice; found 3; allowed: \"availableKvar\" and \"mostUnits\" alone",
                "/sizings | {\"choice\":{\"availableKvar\":[0]}} | /choice/availableKvar/0: is out of range; found 0; allowed: 0.01 to 1000000 kvar",
                "/sizings | {\"choice\":{\"make\":{\"reactorShare\":0.5}}} | /choice/make/reactorShare: is out of range; found 0.5; allowed: 0 to 0.25",
                "/sizings | {\"basis\":\"middling\"} | /basis: is not known; found \"middling\"; allowed: central, high, low",
                "/reviews | {\"claims\":[]} | /claims: is empty; found a list; allowed: at least one entry",
                "/reviews | {\"claims\":[{\"paybackYear\":1}]} | /claims/0: makes no claim that is known; did you mean \"paybackYears\"?; found an object; allowed: kvar, kwLess, kwhShareLess, noReactor, paybackMonths, paybackYears, powerFactor, savingsByPart, savingsShare, yearlyKwhLess, yearlySavings",
                "/reviews | {\"claims\":[{\"powerFactor\":1.2}]} | /claims/0/powerFactor: is out of range; found 1.2; allowed: above 0, at most 1",
                "/reviews | {\"claims\":[{\"powerFactor\":1,\"kvar\":1}]} | /claims/0/kvar: is a second claim in one object; found 1; allowed: an object for each claim",
                "/reviews | {\"claims\":[{\"savingsByPart\":{}}]} | /claims/0/savingsByPart: is empty; found an object; allowed: at least one part with its money a year",
                "/reviews | {\"place\":\"in the yard\"} | /place: is not known; found \"in the yard\"; allowed: at the load, at the meter, behind own transformer",
                "/screenings | {} | : \"network\" is missing; allowed: an object with \"serviceVolts\" and what else is known",
                "/screenings | {} | : \"bank\" is missing; allowed: an object with \"fixedKvar\", \"stepsKvar\" or both",
                "/screenings | {\"network\":{}} | /network: \"serviceVolts\" is missing",
                "/screenings | {\"network\":7} | /network: must be an object; found 7; allowed: an object in braces with \"serviceVolts\"",
                "/screenings | {\"network\":{\"serviceVolts\":4,\"impedancePercent\":0}} | /network/serviceVolts: is out of range; found 4; allowed: 50 to 1000000 V",
                "/screenings | {\"network\":{\"serviceVolts\":4,\"impedancePercent\":0}} | /network/impedancePercent: is out of range; found 0; allowed: 0.1 to 100 %",
                "/screenings | {\"network\":{\"harmonicVoltages\":{\"1\":0.02}}} | /network/harmonicVoltages/1: is not the order of a harmonic; found 1; allowed: whole numbers from 2 to 50",
                "/screenings | {\"network\":{\"motors\":[{\"name\":\"Pump\",\"volts\":\"400\"}]}} | /network/motors/0/volts: must be a number; found \"400\"; allowed: a number such as 0.95, without quotes",
                "/screenings | {\"network\":{\"transformrKva\":1}} | /network/transformrKva: is not a key here; did you mean \"transformerKva\"?",
                "/screenings | {\"bank\":{\"fixedKvar\":50,\"ratedVolts\":440,\"serviceVolts\":415},\"network\":{\"serviceVolts\":400}} | /network/serviceVolts: is not what /bank/serviceVolts says; found 400; allowed: 415",
                "/screenings | {\"bank\":{\"stepsKvar\":[0.001]},\"network\":{\"serviceVolts\":400}} | /bank: has a step too small to be screened; allowed: 0.01 kvar or more",
                "/screenings | {\"bank\":{\"fixedKvar\":9,\"operationsPerHour\":4}} | /bank: does not hold together; allowed: \"switchingDelayMinutes\" and \"operationsPerHour\" only beside \"stepsKvar\"",
                "/screenings | {\"bank\":{\"stepsKvar\":[9],\"switchingDelayMinutes\":1.5}} | /bank/switchingDelayMinutes: must be a whole number; found 1.5; allowed: a whole number from 0 to 60",
                "/screenings | {\"bank\":{\"fixedKvar\":9,\"off\":\"at night\"}} | /bank/off: must be a window; found \"at night\"; allowed: an object with any of: weekdays, from, to, months",
                "/screenings | {\"bank\":{\"fixedKvar\":9,\"off\":{\"from\":\"22\"}}} | /bank/off/from: is not a time of day; found \"22\"; allowed: hours and minutes, 00:00 to 24:00",
                "/screenings | {\"bank\":{\"fixedKvar\":9,\"off\":{\"holidays\":\"sunday\"}}} | /bank/off/holidays: is not a key here; found holidays; allowed: weekdays, from, to, months",
                "/screenings | {\"bank\":{\"fixedKvar\":9,\"off\":{}}} | /bank/off: keeps the bank off all the time; found every day all day; allowed: a window that leaves the bank some hours",
                "/screenings | {\"bank\":{\"fixedKvar\":9,\"duty\":{\"conductorAmps\":0}}} | /bank/duty/conductorAmps: is out of range; found 0; allowed: 0.1 to 100000 A"
            })
    void everythingThatIsWrongIsSaidAtOnce(String path, String body, String finding) {
        Response response = json(body).post(path);
        assertThat(response.statusCode()).isEqualTo(422);
        assertThat(HostileBodiesTest.said(response).lines().toList())
                .as(body)
                .anyMatch(line -> line.startsWith(finding));
    }

    private static Map<String, Object> request(String name) {
        return document("examples/requests/" + name + ".json");
    }

    private static Map<String, Object> document(String path) {
        Map<String, Object> copy = new TreeMap<>();
        ((Map<?, ?>) JsonTree.read(Examples.text(path).getBytes(StandardCharsets.UTF_8)))
                .forEach((key, value) -> copy.put(String.valueOf(key), value));
        return copy;
    }
}
