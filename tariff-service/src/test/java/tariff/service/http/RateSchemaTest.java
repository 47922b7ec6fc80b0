// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import tariff.json.JsonTree;
import tariff.rate.Rate;
import tariff.rate.clause.QuantityKinds;

/** The schema of a rate says the same as the program that reads one. */
class RateSchemaTest {
    private static final Contract CONTRACT = new Contract();
    private static final String KIND = "quantity-";

    @Test
    void theSchemaHasTheKindsOfQuantityThatTheProgramReads() {
        assertThat(definitions().keySet().stream()
                        .filter(name -> name.startsWith(KIND))
                        .map(name -> name.substring(KIND.length())))
                .containsExactlyInAnyOrderElementsOf(QuantityKinds.keys());
    }

    @Test
    void everyKindIsAmongTheQuantities() {
        List<?> any = (List<?>) ((Map<?, ?>) definitions().get("quantity")).get("anyOf");
        assertThat(any.stream()
                        .map(each -> ((Map<?, ?>) each).get("$ref"))
                        .filter(each -> each != null)
                        .map(String::valueOf))
                .containsExactlyInAnyOrderElementsOf(QuantityKinds.keys().stream()
                        .map(key -> "#/$defs/" + KIND + key)
                        .toList());
    }

    @ParameterizedTest
    @MethodSource("tariff.service.http.Examples#rates")
    void everyExampleRateMeetsTheSchema(Path file) {
        assertThat(CONTRACT.rateErrors(Examples.read(file))).isEmpty();
    }

    /** Every example in the schema stands in a whole rate, meets the schema and is read without a finding about its shape. */
    @ParameterizedTest
    @MethodSource("quantityExamples")
    void everyExampleQuantityIsReadByTheProgram(String example) {
        String rate = "{\"name\":\"A\",\"currency\":\"EUR\",\"powerFactors\":{\"billing\":{\"from\":\"energies\"}},"
                + "\"windows\":{\"day\":{},\"winter days\":{}},\"quantities\":{\"billed demand\":{\"peak\":\"kW\"}},"
                + "\"lines\":[{\"name\":\"Energy\",\"quantity\":{\"energy\":\"kWh\"},\"price\":1},"
                + "{\"name\":\"Demand\",\"quantity\":{\"peak\":\"kW\"},\"price\":1},"
                + "{\"name\":\"It\",\"quantity\":" + example + ",\"price\":1}]}";
        assertThat(CONTRACT.rateErrors(rate)).isEmpty();
        assertThat(Rate.check(JsonTree.read(rate.getBytes(StandardCharsets.UTF_8)))
                        .rate())
                .isPresent();
    }

    static Stream<String> quantityExamples() {
        return definitions().entrySet().stream()
                .filter(entry -> entry.getKey().startsWith(KIND))
                .flatMap(entry -> ((List<?>) ((Map<?, ?>) entry.getValue()).get("examples")).stream())
                .map(Json::text);
    }

    /** Lines of a rate that are wrong in shape: the schema refuses what the program refuses. */
    @ParameterizedTest
    @ValueSource(
            strings = {
                "{'name':'A','quantity':{'enegy':'kWh'},'price':1}",
                "{'name':'A','quantity':{'energy':'kwh'},'price':1}",
                "{'name':'A','quantity':{'energy':'kWh','peak':'kW'},'price':1}",
                "{'name':'A','quantity':{'energy':'kWh'}}",
                "{'name':'A','quantity':{'energy':'kWh'},'price':'1'}",
                "{'name':'A','quantity':{'energy':'kWh'},'price':1,'blocks':[{'price':1}]}",
                "{'name':'A','quantity':{'energy':'kWh'},'price':1,'colour':'red'}",
                "{'name':'','quantity':{'energy':'kWh'},'price':1}",
                "{'quantity':{'energy':'kWh'},'price':1}",
                "{'name':'A','quantity':{'energy':'kWh'},'blocks':[]}",
                "{'name':'A','quantity':{'rounded':{'energy':'kWh'},'to':0},'price':1}",
                "{'name':'A','quantity':{'earlier':'highest','of':{'peak':'kW'},'months':61},'price':1}",
                "{'name':'A','quantity':{'earlier':'highest','of':{'peak':'kW'}},'price':1}",
                "{'name':'A','quantity':{'energy':'kWh'},'price':{'bySchedule':{'powerFactor':'b'}}}",
                "{'name':'A','quantity':{'energy':'kWh'},'price':{'bySchedule':{'powerFactor':'b','slopes':[{'perPoint':1}]}}}",
                "{'name':'A','percentOf':'everything','percent':1}",
                "{'name':'A','percentOf':'all above'}",
                "{'name':'A','atLeast':{'constant':1},'atMost':{'constant':2},'of':'all above'}",
                "{'name':'A','quantity':{'energy':'kWh'},'price':1,'when':{'weather':'rain'}}",
                "{'name':'A','quantity':{'energy':'kWh'},'price':1,'shownOnly':'yes'}"
            })
    void aLineThatIsWrongInShapeIsRefusedByBoth(String line) {
        String rate = ("{'name':'A','currency':'EUR','powerFactors':{'b':{'from':'energies'}},'lines':["
                        + "{'name':'E','quantity':{'energy':'kWh'},'price':1}," + line + "]}")
                .replace('\'', '"');
        assertThat(CONTRACT.rateErrors(rate)).isNotEmpty();
        assertThat(Rate.check(JsonTree.read(rate.getBytes(StandardCharsets.UTF_8)))
                        .rate())
                .isEmpty();
    }

    @SuppressWarnings("unchecked")
    private static Map<String, Object> definitions() {
        Object schema = JsonTree.read(Examples.text("openapi/rate.schema.json").getBytes(StandardCharsets.UTF_8));
        return (Map<String, Object>) ((Map<?, ?>) schema).get("$defs");
    }
}
