// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.equalTo;
import static org.hamcrest.Matchers.matchesPattern;

import java.io.IOException;
import java.net.ServerSocket;
import java.net.Socket;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import tariff.service.shelf.Shelf;

/** RFC 9110 for status codes and headers, RFC 9457 for problems. */
class HttpMannersTest extends Served {
    private static final String RATE_CHECK = Examples.text("examples/requests/rate-check.json");

    @Test
    void anUnknownPathIsNotFound() {
        given().get("/nothing/here")
                .then()
                .statusCode(404)
                .body("title", equalTo("Not Found"))
                .body("instance", equalTo("/nothing/here"))
                .body("detail", equalTo("Nothing is served here. GET / lists what is."));
    }

    @Test
    void anotherMethodIsNotAllowedAndTheRightOneIsNamed() {
        String allow =
                given().delete("/statements").then().statusCode(405).extract().header("Allow");
        assertThat(allow).contains("POST").doesNotContain("DELETE");
        assertThat(json("{}").put("/rates/x").then().statusCode(405).extract().header("Allow"))
                .contains("GET");
    }

    @ParameterizedTest
    @ValueSource(strings = {"text/html", "application/xml", "application/json;q=0", "text/*, image/png"})
    void aClientThatDoesNotTakeJsonIsToldSo(String accept) {
        given().header("Accept", accept)
                .get("/rates")
                .then()
                .statusCode(406)
                .body("detail", equalTo("Only application/json is served here."));
    }

    @ParameterizedTest
    @ValueSource(strings = {"application/json", "*/*", "application/*;q=0.5", "text/html, APPLICATION/JSON ; q=0.1"})
    void aClientThatTakesJsonIsServed(String accept) {
        given().header("Accept", accept).get("/rates").then().statusCode(200);
    }

    @ParameterizedTest
    @ValueSource(strings = {"text/plain", "application/xml", "application/jsonx", "application/problem+json"})
    void anotherMediaTypeIsNotSupported(String type) {
        given().header("Content-Type", type)
                .body(RATE_CHECK.getBytes(StandardCharsets.UTF_8))
                .post("/rate-checks")
                .then()
                .statusCode(415)
                .body("detail", equalTo("The body must be application/json."));
    }

    @Test
    void aCharsetBesideTheMediaTypeDoesNotMatter() {
        given().header("Content-Type", "Application/JSON; charset=utf-8")
                .body(RATE_CHECK.getBytes(StandardCharsets.UTF_8))
                .post("/rate-checks")
                .then()
                .statusCode(200);
    }

    @ParameterizedTest
    @CsvSource({"1000000, 400", "1000001, 413"})
    void aBodyIsReadUpToAMillionBytes(int bytes, int status) {
        json(" ".repeat(bytes)).post("/statements").then().statusCode(status);
    }

    @Test
    void aBodyInPiecesIsNotReadBeyondTheLimitEither() throws IOException {
        String chunk = "100000\r\n" + " ".repeat(0x100000) + "\r\n0\r\n\r\n";
        assertThat(raw("POST /statements HTTP/1.1\r\nHost: x\r\nConnection: close\r\nContent-Type: application/json\r\n"
                        + "Transfer-Encoding: chunked\r\n\r\n" + chunk))
                .startsWith("HTTP/1.1 413")
                .contains("The body is larger than 1000000 bytes.");
    }

    @Test
    void aRequestKeepsItsOwnIdIfThatIsUsable() {
        given().header("X-Request-Id", "bill-17.a").get("/health").then().header("X-Request-Id", "bill-17.a");
        given().header("X-Request-Id", "a b<script>")
                .get("/health")
                .then()
                .header("X-Request-Id", matchesPattern("[0-9a-f-]{36}"));
    }

    @Test
    void theServiceListensWhereItIsTold() throws IOException {
        int free;
        try (ServerSocket socket = new ServerSocket(0)) {
            free = socket.getLocalPort();
        }
        Service told = Service.build(Shelf.empty(), 0).start(free);
        assertThat(told.port()).isEqualTo(free);
        told.stop();
    }

    @Test
    void noOtherSiteMayAskInABrowser() {
        assertThat(given().header("Origin", "http://other.invalid")
                        .get("/rates")
                        .header("Access-Control-Allow-Origin"))
                .isNull();
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "GET /%zz HTTP/1.1\r\nHost: x\r\n\r\n",
                "GARBAGE\r\n\r\n",
                "GET /rates/%2e%2e HTTP/1.1\r\nHost: x\r\nConnection: close\r\n\r\n"
            })
    void aMalformedRequestIsAProblemToo(String request) throws IOException {
        assertThat(raw(request)).matches("(?s)HTTP/1.1 40[04].*").contains("application/problem+json", "about:blank");
    }

    private static String raw(String request) throws IOException {
        try (Socket socket = new Socket("localhost", port())) {
            socket.setSoTimeout(10_000);
            socket.getOutputStream().write(request.getBytes(StandardCharsets.US_ASCII));
            socket.getOutputStream().flush();
            return new String(socket.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        }
    }
}
