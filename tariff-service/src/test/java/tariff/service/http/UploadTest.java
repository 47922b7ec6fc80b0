// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import static org.hamcrest.Matchers.containsInAnyOrder;
import static org.hamcrest.Matchers.equalTo;
import static org.hamcrest.Matchers.hasItem;
import static org.hamcrest.Matchers.hasItems;
import static org.hamcrest.Matchers.hasSize;
import static org.hamcrest.Matchers.not;
import static org.hamcrest.Matchers.nullValue;
import static org.hamcrest.Matchers.startsWith;
import static tariff.service.http.UploadedDay.HOURLY;
import static tariff.service.http.UploadedDay.ZONE;

import java.nio.charset.StandardCharsets;
import java.time.LocalDateTime;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Interval data in the body, everything else in the query. */
class UploadTest extends Served {
    /** A day of quarter-hours of 10 kWh but for 40 and 50 from 00:15, which alone have kvarh: 30 each. */
    private static String quarterHours() {
        StringBuilder rows = new StringBuilder("start,kWh,lagging kvarh\n");
        for (int i = 0; i < 96; i++) {
            rows.append(LocalDateTime.of(2026, 3, 2, 0, 0).plusMinutes(15L * i))
                    .append(i == 1 ? ",40,30\n" : i == 2 ? ",50,30\n" : ",10,0\n");
        }
        return rows.toString();
    }

    /** Each of twelve hours is charged 100 × (0.92 ÷ 0.8 − 1) = 15 kWh: 180 × 0.2756 = 49.608; own arithmetic. */
    @Test
    void hoursAreBilledOneByOne() {
        upload("/interval-statements", UploadedDay.csv(), Map.of("rate", HOURLY, "zone", ZONE))
                .statusCode(200)
                .body("statements[0].from", equalTo("2026-03-02"))
                .body("statements[0].lines[2].amount", equalTo(49.61f))
                .body("statements[0].lines[2].derivation.how", equalTo("180 kWh × 0.2756"))
                .body("warnings", hasSize(0));
    }

    /** The same day as a feed of NAESB REQ.21, in Wh and VArh. */
    @ParameterizedTest
    @ValueSource(strings = {"application/atom+xml", "application/xml"})
    void aFeedOfTheStandardIsBilledLikeTheTable(String type) {
        given().header("Content-Type", type)
                .queryParams(Map.of("rate", HOURLY, "zone", ZONE))
                .body(UploadedDay.feed().getBytes(StandardCharsets.UTF_8))
                .post("/interval-statements")
                .then()
                .statusCode(200)
                .body("statements[0].lines[2].amount", equalTo(49.61f))
                .body("warnings", hasSize(0));
    }

    /** 50 kvar always on: 25 kvarh are left in twelve hours and 40 sent back in twelve; 12 × 40 = 480; own arithmetic. */
    @Test
    void aFixedBankIsWalkedThroughTheHours() {
        upload("/interval-assessments", UploadedDay.csv(), Map.of("rate", HOURLY, "zone", ZONE, "fixedKvar", "50"))
                .statusCode(200)
                .body("inService.leadingKvarhCreated", equalTo(480.0f))
                .body("inService.months[0].before.laggingKvarh", equalTo(1020.0f))
                .body("inService.months[0].after.laggingKvarh", equalTo(300.0f))
                .body("savings.low.settledYear", equalTo(49.61f))
                .body("whyNoPayback", equalTo("no price is given"));
    }

    /** Steps of 30 and 40: both in while 75 are wanted, both out at 10, where 30 would send 20 back; own arithmetic. */
    @Test
    void stepsAreCountedAsTheySwitch() {
        upload("/interval-assessments", UploadedDay.csv(), Map.of("rate", HOURLY, "zone", ZONE, "stepsKvar", "30,40"))
                .statusCode(200)
                .body("inService.stepOperations", equalTo(List.of(2, 2)))
                .body("inService.operations", equalTo(4))
                .body("inService.hoursAtFullOutput", equalTo(12.0f))
                .body("inService.leadingKvarhCreated", equalTo(0.0f));
    }

    /**
     * Own arithmetic: half-hours one after another have 50 and 60 kWh, so 120 kW ×
     * 21.35 = 2,562.00; the half-hour from 00:15 has 90 kWh, so 180 kW × 21.35 = 3,843.00.
     */
    @ParameterizedTest
    @CsvSource({"false, 2562.00", "true, 3843.00"})
    void aPeakMayMoveOnByEachInterval(boolean sliding, float amount) {
        upload(
                        "/interval-statements",
                        quarterHours(),
                        Map.of("rate", HOURLY, "zone", ZONE, "demandMinutes", "30", "slidingDemand", sliding))
                .statusCode(200)
                .body("statements[0].lines[1].name", equalTo("Demand"))
                .body("statements[0].lines[1].amount", equalTo(amount));
    }

    /** Own arithmetic: 120 kvar are wanted in two quarter-hours; both steps are in for half an hour and leave 20 kvar, 10 kvarh. */
    @Test
    void switchedStepsAreWalkedWithASlidingDemandToo() {
        upload(
                        "/interval-assessments",
                        quarterHours(),
                        Map.of(
                                "rate",
                                HOURLY,
                                "zone",
                                ZONE,
                                "demandMinutes",
                                "30",
                                "slidingDemand",
                                "true",
                                "stepsKvar",
                                "50,50"))
                .statusCode(200)
                .body("inService.stepOperations", equalTo(List.of(2, 2)))
                .body("inService.hoursAtFullOutput", equalTo(0.5f))
                .body("inService.months[0].after.laggingKvarh", equalTo(10.0f));
    }

    /** Own arithmetic: 24 hours of 100 kWh × 0.4120 = 988.80 on the day before the meter is read and on that day. */
    @Test
    void periodsBeginOnTheDayTheMeterIsRead() {
        String second =
                UploadedDay.csv().substring(UploadedDay.csv().indexOf('\n') + 1).replace("03-02", "03-14");
        upload(
                        "/interval-statements",
                        UploadedDay.csv().replace("03-02", "03-13") + second,
                        Map.of("rate", HOURLY, "zone", ZONE, "readOn", "14"))
                .statusCode(200)
                .body("statements.from", equalTo(List.of("2026-03-13", "2026-03-14")))
                .body("statements.to", equalTo(List.of("2026-03-13", "2026-03-14")))
                .body("statements.lines.collect { it[0].amount }", equalTo(List.of(988.80f, 988.80f)))
                .body("assumptions.where", hasItem("2026-03-13 to 2026-03-14"));
    }

    /**
     * Own arithmetic: 49.61 as above. 25 kvar leave 50 kvarh in twelve hours, PF 100 ÷ √(100² + 50²) = 0.894427: 12 × 100 × (0.92 ÷ 0.894427
     * − 1) = 34.3095 kWh × 0.2756 = 9.46, so 40.15 are saved.
     */
    @Test
    void theClausesOfUploadedHoursAreTold() {
        upload("/interval-clause-effects", UploadedDay.csv(), Map.of("rate", HOURLY, "zone", ZONE, "kvar", "25"))
                .statusCode(200)
                .body("kvar", equalTo(25))
                .body("lines[2].name", equalTo("Reactive excess"))
                .body("lines[2].penalty", equalTo(49.61f))
                .body("nextBank.low", equalTo(40.15f))
                .body("nextBank.high", equalTo(40.15f))
                .body("charts", nullValue())
                .body("warnings", hasSize(0));
    }

    @Test
    void chartsOfClausesAreDrawnWhereTheyAreAskedFor() {
        upload("/interval-clause-effects", UploadedDay.csv(), Map.of("rate", HOURLY, "zone", ZONE, "charts", "true"))
                .statusCode(200)
                .body("kvar", equalTo(50))
                .body("charts.bill", startsWith("<svg"))
                .body("charts.savings", startsWith("<svg"));
    }

    @Test
    void whatCannotBeAskedOfClausesIsSaidAtOnce() {
        upload(
                        "/interval-clause-effects",
                        UploadedDay.csv(),
                        Map.of("rate", HOURLY, "kvar", "0", "charts", "yes", "readOn", "29", "fixedKvar", "50"))
                .statusCode(422)
                .body("findings.pointer", containsInAnyOrder("/readOn", "/charts", "/kvar", "/fixedKvar"))
                .body("findings.find { it.pointer == '/readOn' }.allowed", equalTo("a whole number from 1 to 28"));
    }

    /** Registers at 1,000 kWh and 500 kvarh that add 100 and 75 an hour, and a second meter's column beside them; own arithmetic. */
    @Test
    void countersAndColumnsThatHeadersDoNotTellAreReadAsSaid() {
        StringBuilder rows = new StringBuilder("end,kWh meter 1,kWh meter 2,kvarh\n");
        for (int hour = 0; hour < 24; hour++) {
            rows.append("2026-03-02 ").append(hour < 10 ? "0" : "").append(hour).append(":00,");
            rows.append(1000 + 100 * hour).append(",7,").append(500 + 75 * hour).append('\n');
        }
        Map<String, String> said =
                Map.of("rate", HOURLY, "zone", ZONE, "counter", "true", "activeColumn", "kWh%20meter%201");
        upload("/interval-statements", rows.toString(), said)
                .statusCode(200)
                .body("statements[0].lines[2].derivation.how", equalTo("345 kWh × 0.2756"))
                .body("assumptions.code", hasItem("part-period"));
    }

    @Test
    void aSlidingDemandNeedsItsMinutes() {
        upload("/interval-statements", UploadedDay.csv(), Map.of("rate", HOURLY, "zone", ZONE, "slidingDemand", "true"))
                .statusCode(422)
                .body("findings[0].message", equalTo("does not hold together"))
                .body("findings[0].allowed", equalTo("a sliding demand with the minutes that it is averaged over"));
    }

    @ParameterizedTest
    @ValueSource(strings = {"/interval-statements", "/interval-assessments", "/interval-clause-effects"})
    void everyDocumentedParameterIsKnown(String path) {
        Map<String, String> all = new TreeMap<>();
        CONTRACT.parameters(path).forEach(name -> all.put(name, "%3F"));
        upload(path, UploadedDay.csv(), all)
                .statusCode(422)
                .body("findings.message", not(hasItem(startsWith("is not a key"))));
    }

    /** Off from 12:00 on nothing is sent back: 12 × 25 and 12 × 10 kvarh are left; own arithmetic. */
    @Test
    void aTimeSwitchKeepsTheBankOff() {
        upload(
                        "/interval-assessments",
                        UploadedDay.csv(),
                        Map.of("rate", HOURLY, "zone", ZONE, "fixedKvar", "50", "off", "12:00-24:00"))
                .statusCode(200)
                .body("inService.leadingKvarhCreated", equalTo(0.0f))
                .body("inService.months[0].after.laggingKvarh", equalTo(420.0f));
    }

    /** Of the two steps of 35 one goes in at 00:00, the other at 01:00, one out at 12:00, the other at 13:00; own arithmetic. */
    @Test
    void aControllerKeepsToItsLimit() {
        upload(
                        "/interval-assessments",
                        UploadedDay.csv(),
                        Map.of(
                                "rate",
                                HOURLY,
                                "zone",
                                ZONE,
                                "stepsKvar",
                                "35,35",
                                "operationsPerHour",
                                "1",
                                "switchingDelayMinutes",
                                "10"))
                .statusCode(200)
                .body("inService.operations", equalTo(4))
                .body("inService.hoursAtFullOutput", equalTo(11.0f))
                .body("inService.leadingKvarhCreated", equalTo(25.0f));
    }

    @Test
    void everythingWrongWithTheQueryIsSaidAtOnce() {
        upload(
                        "/interval-assessments",
                        UploadedDay.csv(),
                        Map.of(
                                "rate",
                                "ilha-verde-hourli",
                                "zone",
                                "Atlantis",
                                "fixedKvar",
                                "much",
                                "gap",
                                "refuse",
                                "off",
                                "nights"))
                .statusCode(422)
                .body("findings.pointer", hasItems("/rate", "/zone", "/fixedKvar", "/gap", "/off"))
                .body("findings.find { it.pointer == '/zone' }.message", equalTo("is not a time zone"))
                .body(
                        "findings.find { it.pointer == '/rate' }.message",
                        equalTo("is not the id of a rate; did you mean \"ilha-verde-hourly\"?"));
    }

    @Test
    void whatIsWrongWithTheDataIsSaidWithItsRow() {
        String csv = UploadedDay.csv().replace("2026-03-02 05:00,100,75", "2026-03-02 05:00,100,7x5");
        upload("/interval-statements", csv, Map.of("rate", HOURLY, "zone", ZONE))
                .statusCode(422)
                .body("detail", equalTo("The interval data cannot be used; see findings."))
                .body("findings[0].where", equalTo("row 7"))
                .body("findings[0].message", equalTo("\"7x5\" is not a figure of lagging kvarh"));
    }

    @Test
    void aPeakNeedsMinutesThatDivideAnHour() {
        upload("/interval-statements", UploadedDay.csv(), Map.of("rate", HOURLY, "zone", ZONE, "demandMinutes", "45"))
                .statusCode(422)
                .body("findings[0].pointer", equalTo("/demandMinutes"));
    }
}
