// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import io.restassured.RestAssured;
import io.restassured.response.ValidatableResponse;
import io.restassured.specification.RequestSpecification;
import java.nio.charset.StandardCharsets;
import java.util.Map;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import tariff.service.shelf.Shelf;

/** A running service with the example rates, every exchange held against the contract. */
abstract class Served {
    static final Contract CONTRACT = new Contract();
    private static Service service;

    @BeforeAll
    static void start() {
        service = Service.build(Shelf.read(Examples.path("examples/rates")), 0).start(0);
    }

    @AfterAll
    static void stop() {
        service.stop();
    }

    static int port() {
        return service.port();
    }

    static RequestSpecification given() {
        return RestAssured.given()
                .port(service.port())
                .urlEncodingEnabled(false)
                .filter(CONTRACT);
    }

    static RequestSpecification json(String body) {
        return given().header("Content-Type", "application/json").body(body.getBytes(StandardCharsets.UTF_8));
    }

    static ValidatableResponse upload(String path, String csv, Map<String, ?> query) {
        return given().header("Content-Type", "text/csv; charset=utf-8")
                .queryParams(query)
                .body(csv.getBytes(StandardCharsets.UTF_8))
                .post(path)
                .then();
    }
}
