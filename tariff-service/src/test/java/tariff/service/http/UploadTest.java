// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.equalTo;
import static org.hamcrest.Matchers.hasItems;
import static org.hamcrest.Matchers.hasSize;

import io.restassured.RestAssured;
import io.restassured.response.ValidatableResponse;
import java.io.IOException;
import java.net.Socket;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tariff.service.shelf.Shelf;

/** Interval data in the body, everything else in the query. */
class UploadTest extends Served {
    private static final String HOURLY = "ilha-verde-hourly";
    private static final String ZONE = "America/Sao_Paulo";

    /** A day of hours: the first twelve at 100 kWh and 75 kvarh, PF 0.80; the others at 100 kWh and 10 kvarh. */
    private static String day() {
        StringBuilder rows = new StringBuilder("start,kWh,lagging kvarh\n");
        for (int hour = 0; hour < 24; hour++) {
            rows.append("2026-03-02 ").append(hour < 10 ? "0" : "").append(hour).append(":00,100,");
            rows.append(hour < 12 ? "75\n" : "10\n");
        }
        return rows.toString();
    }

    private static ValidatableResponse upload(String path, String csv, Map<String, ?> query) {
        return given().header("Content-Type", "text/csv; charset=utf-8")
                .queryParams(query)
                .body(csv.getBytes(StandardCharsets.UTF_8))
                .post(path)
                .then();
    }

    /** Each of twelve hours is charged 100 × (0.92 ÷ 0.8 − 1) = 15 kWh: 180 × 0.2756 = 49.608; own arithmetic. */
    @Test
    void hoursAreBilledOneByOne() {
        upload("/interval-statements", day(), Map.of("rate", HOURLY, "zone", ZONE))
                .statusCode(200)
                .body("statements[0].from", equalTo("2026-03-02"))
                .body("statements[0].lines[2].amount", equalTo(49.61f))
                .body("statements[0].lines[2].derivation.how", equalTo("180 kWh × 0.2756"))
                .body("warnings", hasSize(0));
    }

    /** 50 kvar always on: 25 kvarh are left in twelve hours and 40 sent back in twelve; 12 × 40 = 480; own arithmetic. */
    @Test
    void aFixedBankIsWalkedThroughTheHours() {
        upload("/interval-assessments", day(), Map.of("rate", HOURLY, "zone", ZONE, "fixedKvar", "50"))
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
        upload("/interval-assessments", day(), Map.of("rate", HOURLY, "zone", ZONE, "stepsKvar", "30,40"))
                .statusCode(200)
                .body("inService.stepOperations", equalTo(List.of(2, 2)))
                .body("inService.operations", equalTo(4))
                .body("inService.hoursAtFullOutput", equalTo(12.0f))
                .body("inService.leadingKvarhCreated", equalTo(0.0f));
    }

    /** Off from 12:00 on nothing is sent back: 12 × 25 and 12 × 10 kvarh are left; own arithmetic. */
    @Test
    void aTimeSwitchKeepsTheBankOff() {
        upload(
                        "/interval-assessments",
                        day(),
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
                        day(),
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
                        day(),
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
        String csv = day().replace("2026-03-02 05:00,100,75", "2026-03-02 05:00,100,7x5");
        upload("/interval-statements", csv, Map.of("rate", HOURLY, "zone", ZONE))
                .statusCode(422)
                .body("detail", equalTo("The interval data cannot be used; see findings."))
                .body("findings[0].where", equalTo("row 7"))
                .body("findings[0].message", equalTo("\"7x5\" is not a figure of kvarh"));
    }

    @Test
    void aPeakNeedsMinutesThatDivideAnHour() {
        upload("/interval-statements", day(), Map.of("rate", HOURLY, "zone", ZONE, "demandMinutes", "45"))
                .statusCode(422)
                .body("findings[0].pointer", equalTo("/demandMinutes"));
    }

    @ParameterizedTest
    @CsvSource({"application/json", "text/plain", "multipart/form-data"})
    void anotherMediaTypeIsNotSupported(String type) {
        given().header("Content-Type", type)
                .body(day().getBytes(StandardCharsets.UTF_8))
                .post("/interval-statements?rate=" + HOURLY)
                .then()
                .statusCode(415)
                .body("detail", equalTo("The body must be text/csv."));
    }

    @Test
    void dataAreTakenUpToTheLimitWhetherTheirLengthIsSaidOrNot() throws IOException {
        byte[] csv = day().getBytes(StandardCharsets.UTF_8);
        for (int spare : new int[] {0, -1}) {
            Service small = Service.build(Shelf.read(Examples.path("examples/rates")), 0, csv.length + spare)
                    .start(0);
            int expected = spare == 0 ? 200 : 413;
            String path = "/interval-statements?rate=" + HOURLY + "&zone=" + ZONE;
            RestAssured.given()
                    .port(small.port())
                    .filter(CONTRACT)
                    .urlEncodingEnabled(false)
                    .header("Content-Type", "text/csv")
                    .body(csv)
                    .post(path)
                    .then()
                    .statusCode(expected);
            String pieces = Integer.toHexString(csv.length) + "\r\n" + day() + "\r\n0\r\n\r\n";
            assertThat(sent(
                            small.port(),
                            head(path) + "Connection: close\r\nTransfer-Encoding: chunked\r\n\r\n" + pieces))
                    .startsWith("HTTP/1.1 " + expected)
                    .contains(expected == 413 ? "larger than " + (csv.length - 1) + " bytes" : "Reactive excess");
            small.stop();
        }
    }

    @Test
    void whoComesWhileEveryPlaceIsTakenIsToldToTryAgain() throws Exception {
        String path = "/interval-statements?rate=" + HOURLY + "&zone=" + ZONE;
        List<Socket> stalled = new ArrayList<>();
        for (int i = 0; i < Uploads.AT_ONCE; i++) {
            Socket socket = new Socket("localhost", port());
            socket.getOutputStream()
                    .write((head(path) + "Content-Length: 100000\r\n\r\n").getBytes(StandardCharsets.US_ASCII));
            socket.getOutputStream().flush();
            stalled.add(socket);
        }
        int status = 200;
        for (int tries = 0; status == 200 && tries < 200; tries++) {
            status = upload("/interval-statements", day(), Map.of("rate", HOURLY, "zone", ZONE))
                    .extract()
                    .statusCode();
        }
        assertThat(status).isEqualTo(503);
        for (Socket each : stalled) {
            each.close();
        }
        for (int tries = 0; status == 503 && tries < 200; tries++) {
            Thread.sleep(20);
            status = upload("/interval-statements", day(), Map.of("rate", HOURLY, "zone", ZONE))
                    .extract()
                    .statusCode();
        }
        assertThat(status).isEqualTo(200);
    }

    private static String head(String path) {
        return "POST " + path + " HTTP/1.1\r\nHost: x\r\nContent-Type: text/csv\r\n";
    }

    private static String sent(int port, String request) throws IOException {
        try (Socket socket = new Socket("localhost", port)) {
            socket.setSoTimeout(10_000);
            socket.getOutputStream().write(request.getBytes(StandardCharsets.US_ASCII));
            socket.getOutputStream().flush();
            return new String(socket.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        }
    }
}
