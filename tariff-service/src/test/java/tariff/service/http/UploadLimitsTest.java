// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.equalTo;
import static tariff.service.http.UploadedDay.HOURLY;
import static tariff.service.http.UploadedDay.ZONE;

import io.restassured.RestAssured;
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

/** What may be uploaded: media types, how much, and how many at once. */
class UploadLimitsTest extends Served {
    @ParameterizedTest
    @CsvSource({"application/json", "text/plain", "multipart/form-data"})
    void anotherMediaTypeIsNotSupported(String type) {
        given().header("Content-Type", type)
                .body(UploadedDay.csv().getBytes(StandardCharsets.UTF_8))
                .post("/interval-statements?rate=" + HOURLY)
                .then()
                .statusCode(415)
                .body(
                        "detail",
                        equalTo("The body must be text/csv, or application/atom+xml for a feed of NAESB REQ.21."));
    }

    @ParameterizedTest
    @CsvSource({"/interval-statements, ''", "/interval-assessments, &fixedKvar=50", "/interval-clause-effects, &kvar=50"
    })
    void dataAreTakenUpToTheLimitWhetherTheirLengthIsSaidOrNot(String asked, String more) throws IOException {
        byte[] csv = UploadedDay.csv().getBytes(StandardCharsets.UTF_8);
        for (int spare : new int[] {0, -1}) {
            Service small = Service.build(Shelf.read(Examples.path("examples/rates")), 0, csv.length + spare)
                    .start(0);
            int expected = spare == 0 ? 200 : 413;
            String path = asked + "?rate=" + HOURLY + "&zone=" + ZONE + more;
            RestAssured.given()
                    .port(small.port())
                    .filter(CONTRACT)
                    .urlEncodingEnabled(false)
                    .header("Content-Type", "text/csv")
                    .body(csv)
                    .post(path)
                    .then()
                    .statusCode(expected);
            String pieces = Integer.toHexString(csv.length) + "\r\n" + UploadedDay.csv() + "\r\n0\r\n\r\n";
            assertThat(sent(
                            small.port(),
                            head(path) + "Connection: close\r\nTransfer-Encoding: chunked\r\n\r\n" + pieces))
                    .startsWith("HTTP/1.1 " + expected)
                    .contains(expected == 413 ? "larger than " + (csv.length - 1) + " bytes" : "Reactive excess");
            small.stop();
        }
    }

    /** The end of what may be sent is met by the XML parser, inside of which a stream that breaks off would look like broken XML. */
    @Test
    void aFeedThatGoesOnBeyondTheLimitIsTooLarge() throws IOException {
        Service small = Service.build(
                        Shelf.read(Examples.path("examples/rates")),
                        0,
                        UploadedDay.feed().length() / 2)
                .start(0);
        String pieces =
                Integer.toHexString(UploadedDay.feed().length()) + "\r\n" + UploadedDay.feed() + "\r\n0\r\n\r\n";
        String head = head("/interval-statements?rate=" + HOURLY + "&zone=" + ZONE)
                .replace("text/csv", "application/atom+xml");
        assertThat(sent(small.port(), head + "Connection: close\r\nTransfer-Encoding: chunked\r\n\r\n" + pieces))
                .startsWith("HTTP/1.1 413");
        small.stop();
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
            status = upload("/interval-statements", UploadedDay.csv(), Map.of("rate", HOURLY, "zone", ZONE))
                    .extract()
                    .statusCode();
        }
        assertThat(status).isEqualTo(503);
        for (Socket each : stalled) {
            each.close();
        }
        for (int tries = 0; status == 503 && tries < 200; tries++) {
            Thread.sleep(20);
            status = upload("/interval-statements", UploadedDay.csv(), Map.of("rate", HOURLY, "zone", ZONE))
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
