// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import static org.assertj.core.api.Assertions.assertThat;

import io.restassured.response.Response;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tariff.json.JsonTree;

/** Valid requests with something in them changed at random: always an answer or a problem, never a failure of the service. */
class MutatedRequestsTest extends Served {
    private static final int TIMES_EACH = 25;

    private static final Object[] STRANGE = {
        null,
        true,
        "",
        "x",
        "2026-02-30",
        List.of(),
        Map.of(),
        new java.math.BigDecimal("-1"),
        new java.math.BigDecimal("0"),
        new java.math.BigDecimal("1e29"),
        new java.math.BigDecimal("1e-29"),
        new java.math.BigDecimal("0.5"),
        new java.math.BigDecimal("1e400"),
        new java.math.BigDecimal("13"),
        "billed demand",
        "corrected demand",
        "all above",
        Map.of("peak", "kVA"),
        Map.of("energy", "leading kvarh"),
        Map.of("constant", new java.math.BigDecimal("0"))
    };

    @ParameterizedTest
    @CsvSource({
        "statement, /statements, 100",
        "assessment, /assessments, 100",
        "reconciliation, /reconciliations, 40",
        "clause-effects, /clause-effects, 10",
        "rate-check, /rate-checks, 100",
        "sizing, /sizings, 20",
        "sizing-no-bank, /sizings, 10",
        "review, /reviews, 40",
        "screening, /screenings, 100"
    })
    void aChangedRequestNeverFailsTheService(String example, String path, int times) {
        Object valid = inline(JsonTree.read(
                Examples.text("examples/requests/" + example + ".json").getBytes(StandardCharsets.UTF_8)));
        Random random = new Random(20261201);
        for (int i = 0; i < times; i++) {
            Object changed = valid;
            for (int change = random.nextInt(3); change >= 0; change--) {
                changed = mutate(changed, random);
            }
            String body = Json.text(changed);
            Response response = json(body).post(path);
            assertThat(response.statusCode()).as(body).isIn(200, 422);
        }
    }

    /** Every kind of clause that the example rates use, with the bills that go with them. */
    @Test
    void aChangedRateOfTheShelfNeverFailsTheService() {
        Random random = new Random(42);
        for (Path file : Examples.rates()) {
            Path bills = Examples.path("examples/bills").resolve(file.getFileName());
            if (Files.exists(bills)) {
                Map<String, Object> valid = copy(document(bills));
                valid.put("rate", document(file));
                for (int i = 0; i < TIMES_EACH; i++) {
                    Map<String, Object> changed = new LinkedHashMap<>(valid);
                    changed.put("rate", mutate(mutate(valid.get("rate"), random), random));
                    String body = Json.text(changed);
                    assertThat(json(body).post("/statements").statusCode())
                            .as(body)
                            .isIn(200, 422);
                }
            }
        }
    }

    private static Object document(Path file) {
        return JsonTree.read(Examples.read(file).getBytes(StandardCharsets.UTF_8));
    }

    @ParameterizedTest
    @CsvSource({"statement, /statements, 100", "rate-check, /rate-checks, 100"})
    void aDamagedTextNeverFailsTheService(String example, String path, int times) {
        byte[] valid = Examples.text("examples/requests/" + example + ".json").getBytes(StandardCharsets.UTF_8);
        Random random = new Random(7);
        for (int i = 0; i < times; i++) {
            byte[] damaged = valid.clone();
            for (int change = random.nextInt(4); change >= 0; change--) {
                damaged[random.nextInt(damaged.length)] = (byte) random.nextInt(256);
            }
            int status = given().header("Content-Type", "application/json")
                    .body(damaged)
                    .post(path)
                    .statusCode();
            assertThat(status).isIn(200, 400, 422);
        }
    }

    /** The rate itself in place of its id, so that it is changed too. */
    private static Object inline(Object document) {
        Map<String, Object> copy = copy(document);
        if (copy.get("rate") instanceof String id) {
            copy.put(
                    "rate",
                    JsonTree.read(
                            Examples.text("examples/rates/" + id + ".json").getBytes(StandardCharsets.UTF_8)));
        }
        return copy;
    }

    private static Map<String, Object> copy(Object object) {
        Map<String, Object> copy = new LinkedHashMap<>();
        ((Map<?, ?>) object).forEach((key, value) -> copy.put(String.valueOf(key), value));
        return copy;
    }

    private static Object mutate(Object value, Random random) {
        if (value instanceof Map<?, ?> map && !map.isEmpty() && random.nextInt(12) > 0) {
            Map<String, Object> copy = copy(map);
            String key = List.copyOf(copy.keySet()).get(random.nextInt(copy.size()));
            switch (random.nextInt(14)) {
                case 0 -> copy.remove(key);
                case 1 -> copy.put(key + "x", copy.remove(key));
                default -> copy.put(key, mutate(copy.get(key), random));
            }
            return copy;
        }
        if (value instanceof List<?> list && !list.isEmpty() && random.nextInt(12) > 0) {
            List<Object> copy = new ArrayList<>(list);
            int index = random.nextInt(copy.size());
            switch (random.nextInt(14)) {
                case 0 -> copy.remove(index);
                case 1 -> copy.add(copy.get(index));
                default -> copy.set(index, mutate(copy.get(index), random));
            }
            return copy;
        }
        return STRANGE[random.nextInt(STRANGE.length)];
    }
}
