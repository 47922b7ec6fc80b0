// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import static org.assertj.core.api.Assertions.assertThat;

import com.networknt.schema.InputFormat;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaLocation;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.dialect.Dialects;
import io.restassured.filter.Filter;
import io.restassured.filter.FilterContext;
import io.restassured.response.Response;
import io.restassured.specification.FilterableRequestSpecification;
import io.restassured.specification.FilterableResponseSpecification;
import java.net.URI;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import tariff.json.JsonTree;

/**
 * Holds every exchange against the contract: the status, media type and body of an answer must be documented for the operation, and
 * a request that is answered must be one that the contract allows.
 */
final class Contract implements Filter {
    private static final String BASE = "http://contract.invalid/";
    private static final String JSON = "application/json";

    private final Map<?, ?> paths;
    private final Map<?, ?> shared;
    private final SchemaRegistry registry;

    Contract() {
        String openapi = Examples.text("openapi/openapi.json");
        Map<?, ?> contract = map(JsonTree.read(openapi.getBytes(java.nio.charset.StandardCharsets.UTF_8)));
        paths = map(contract.get("paths"));
        shared = map(map(contract.get("components")).get("parameters"));
        registry = SchemaRegistry.withDialects(
                List.of(Dialects.getOpenApi31(), Dialects.getDraft202012()),
                builder -> builder.defaultDialectId(Dialects.getOpenApi31().getId())
                        .schemas(Map.of(
                                BASE + "openapi.json",
                                openapi,
                                BASE + "schemas/rate.json",
                                Examples.text("openapi/rate.schema.json"))));
    }

    /** {@code GET /rates/{id}} and so on. */
    List<String> operations() {
        List<String> all = new ArrayList<>();
        paths.forEach((path, item) -> map(item)
                .keySet()
                .forEach(method -> all.add(String.valueOf(method).toUpperCase(java.util.Locale.ROOT) + " " + path)));
        return all;
    }

    /** The parameters that an operation documents. */
    List<String> parameters(String path) {
        return parameters(map(map(paths.get(path)).get("post"))).stream()
                .map(each -> String.valueOf(each.get("name")))
                .toList();
    }

    /** With those that several operations share in full. */
    private List<Map<?, ?>> parameters(Map<?, ?> operation) {
        List<Map<?, ?>> all = new ArrayList<>();
        for (Object each : operation.get("parameters") instanceof List<?> list ? list : List.of()) {
            String reference = String.valueOf(map(each).get("$ref"));
            all.add(
                    map(each).containsKey("$ref")
                            ? map(shared.get(reference.substring(reference.lastIndexOf('/') + 1)))
                            : map(each));
        }
        return all;
    }

    @Override
    public Response filter(
            FilterableRequestSpecification request, FilterableResponseSpecification expected, FilterContext context) {
        Response response = context.next(request, expected);
        String method = request.getMethod().toLowerCase(java.util.Locale.ROOT);
        Optional<String> path = documented(URI.create(request.getURI()).getRawPath(), method);
        String type = Optional.ofNullable(response.getContentType()).orElse("").split(";")[0];
        if (path.isEmpty()) {
            assertThat(type).isEqualTo(Problems.TYPE);
            assertThat(errors("#/components/schemas/Problem", response.asString()))
                    .isEmpty();
            return response;
        }
        String operation = "#/paths/" + escaped(path.get()) + "/" + method;
        Map<?, ?> responses = map(map(map(paths.get(path.get())).get(method)).get("responses"));
        String status = String.valueOf(response.statusCode());
        assertThat(responses.keySet())
                .as("documented statuses of %s %s", method, path.get())
                .anyMatch(status::equals);
        assertThat(map(map(responses.get(status)).get("content")).keySet()).anyMatch(type::equals);
        assertThat(response.getHeader(RequestId.HEADER)).isNotBlank();
        if (type.endsWith("json")) {
            assertThat(errors(
                            operation + "/responses/" + status + "/content/" + escaped(type) + "/schema",
                            response.asString()))
                    .isEmpty();
        }
        if (response.statusCode() == 200) {
            assertThat(undocumented(map(map(paths.get(path.get())).get(method)), request.getQueryParams()))
                    .as("parameters of a request that was answered")
                    .isEmpty();
        }
        if (method.equals("post")
                && response.statusCode() == 200
                && Uploads.TYPES.stream().noneMatch(request.getContentType()::startsWith)) {
            assertThat(errors(operation + "/requestBody/content/" + escaped(JSON) + "/schema", bodyOf(request)))
                    .as("a request that was answered")
                    .isEmpty();
        }
        return response;
    }

    /** Parameters that the contract does not know, and those it requires that are missing. */
    private List<String> undocumented(Map<?, ?> operation, Map<String, String> given) {
        List<String> wrong = new ArrayList<>(given.keySet());
        for (Map<?, ?> each : parameters(operation)) {
            String name = String.valueOf(each.get("name"));
            boolean query = "query".equals(each.get("in"));
            if (query && !wrong.remove(name) && Boolean.TRUE.equals(each.get("required"))) {
                wrong.add(name + " is missing");
            }
        }
        return wrong;
    }

    static String bodyOf(FilterableRequestSpecification request) {
        Object body = request.getBody();
        return body instanceof byte[] bytes
                ? new String(bytes, java.nio.charset.StandardCharsets.UTF_8)
                : String.valueOf(body);
    }

    List<String> errors(String pointer, String document) {
        Schema schema = registry.getSchema(SchemaLocation.of(BASE + "openapi.json" + pointer));
        return schema.validate(document, InputFormat.JSON).stream()
                .map(Object::toString)
                .toList();
    }

    List<String> rateErrors(String document) {
        Schema schema = registry.getSchema(SchemaLocation.of(BASE + "schemas/rate.json"));
        return schema.validate(document, InputFormat.JSON).stream()
                .map(Object::toString)
                .toList();
    }

    private Optional<String> documented(String path, String method) {
        return paths.keySet().stream()
                .map(String::valueOf)
                .filter(template -> path.matches(template.replaceAll("\\{[^}]+}", "[^/]+")))
                .filter(template -> map(paths.get(template)).containsKey(method))
                .findFirst();
    }

    private static String escaped(String key) {
        return key.replace("~", "~0").replace("/", "~1").replace("{", "%7B").replace("}", "%7D");
    }

    private static Map<?, ?> map(Object value) {
        return (Map<?, ?>) value;
    }
}
