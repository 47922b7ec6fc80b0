// SPDX-License-Identifier: Apache-2.0
package tariff.json;

import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.StreamWriteFeature;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import com.fasterxml.jackson.databind.ObjectWriter;
import com.fasterxml.jackson.databind.json.JsonMapper;
import java.io.UncheckedIOException;
import java.util.Map;

/** Writes JSON that is the same bytes for the same answer: keys in order, two spaces, line feeds, decimals without exponents. */
final class JsonText {
    private static final DefaultIndenter LINES = new DefaultIndenter("  ", "\n");
    private static final ObjectWriter WRITER = JsonMapper.builder()
            .enable(StreamWriteFeature.WRITE_BIGDECIMAL_AS_PLAIN)
            .build()
            .writer(new DefaultPrettyPrinter().withObjectIndenter(LINES).withArrayIndenter(LINES))
            .without(JsonGenerator.Feature.AUTO_CLOSE_TARGET);

    private JsonText() {}

    static byte[] write(Map<String, Object> document) {
        try {
            return WRITER.writeValueAsBytes(document);
        } catch (JsonProcessingException e) {
            throw new UncheckedIOException(e);
        }
    }
}
