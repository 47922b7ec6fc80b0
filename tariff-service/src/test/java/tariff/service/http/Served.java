// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import io.restassured.RestAssured;
import io.restassured.specification.RequestSpecification;
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
        return given().header("Content-Type", "application/json")
                .body(body.getBytes(java.nio.charset.StandardCharsets.UTF_8));
    }
}
