// SPDX-License-Identifier: Apache-2.0
package tariff.json;

import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.StreamReadConstraints;
import com.fasterxml.jackson.core.StreamReadFeature;
import com.fasterxml.jackson.core.exc.StreamConstraintsException;
import com.fasterxml.jackson.core.json.JsonReadFeature;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.ObjectReader;
import com.fasterxml.jackson.databind.json.JsonMapper;
import java.io.IOException;
import org.jspecify.annotations.Nullable;
import tariff.notice.Finding;
import tariff.notice.Refusal;

/**
 * A JSON document as maps, lists, texts, decimals, true and false. Decimals keep the digits they were written with; a key that stands
 * twice, a document deeper than 60 levels or of more than 50,000 parts, or a number of more than 100 characters is refused.
 */
public final class JsonTree {
    private static final int MAX_DEPTH = 60;
    private static final int MAX_NUMBER_LENGTH = 100;
    private static final int MAX_PARTS = 50_000;

    private static final ObjectReader READER = JsonMapper.builder(com.fasterxml.jackson.core.JsonFactory.builder()
                    .streamReadConstraints(StreamReadConstraints.builder()
                            .maxNestingDepth(MAX_DEPTH)
                            .maxNumberLength(MAX_NUMBER_LENGTH)
                            .maxTokenCount(MAX_PARTS)
                            .build())
                    .enable(StreamReadFeature.STRICT_DUPLICATE_DETECTION)
                    .build())
            .enable(DeserializationFeature.USE_BIG_DECIMAL_FOR_FLOATS)
            .enable(DeserializationFeature.FAIL_ON_TRAILING_TOKENS)
            .disable(JsonReadFeature.ALLOW_NON_NUMERIC_NUMBERS.mappedFeature())
            .build()
            .readerFor(Object.class)
            .withoutFeatures(JsonParser.Feature.ALLOW_COMMENTS);

    private JsonTree() {}

    /**
     * Reads a document in UTF-8.
     *
     * @throws Refusal if it is not JSON, with line and column
     */
    public static @Nullable Object read(byte[] json) {
        try {
            return decimals(READER.readValue(json));
        } catch (StreamConstraintsException e) {
            throw new Refusal(Finding.error("too-large", "", "is larger than a document can be")
                    .allowed(MAX_DEPTH + " levels, " + MAX_PARTS + " parts, numbers of " + MAX_NUMBER_LENGTH
                            + " characters"));
        } catch (JsonProcessingException e) {
            String where = e.getLocation() == null
                    ? ""
                    : "line " + e.getLocation().getLineNr() + ", column "
                            + e.getLocation().getColumnNr();
            throw new Refusal(Finding.error("not-json", where, "is not valid JSON: " + e.getOriginalMessage()));
        } catch (IOException e) {
            throw new Refusal(Finding.error("not-json", "", "cannot be read: " + e.getMessage()));
        }
    }

    /** Whole numbers arrive as int, long or BigInteger; a rate knows decimals only. */
    private static @Nullable Object decimals(@Nullable Object value) {
        if (value instanceof java.util.Map<?, ?> map) {
            java.util.Map<String, @Nullable Object> all = new java.util.LinkedHashMap<>();
            map.forEach((key, inner) -> all.put(String.valueOf(key), decimals(inner)));
            return all;
        }
        if (value instanceof java.util.List<?> list) {
            java.util.List<@Nullable Object> all = new java.util.ArrayList<>();
            list.forEach(inner -> all.add(decimals(inner)));
            return all;
        }
        if (value instanceof java.math.BigInteger whole) {
            return new java.math.BigDecimal(whole);
        }
        return value instanceof Integer || value instanceof Long
                ? java.math.BigDecimal.valueOf(((Number) value).longValue())
                : value;
    }
}
