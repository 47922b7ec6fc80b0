// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;

/** JSON text of maps, lists, texts without quotes or backslashes, numbers, true, false and null. */
final class Json {
    private Json() {}

    static String text(Object value) {
        if (value instanceof Map<?, ?> map) {
            return map.entrySet().stream()
                    .map(entry -> '"' + String.valueOf(entry.getKey()) + "\":" + text(entry.getValue()))
                    .collect(Collectors.joining(",", "{", "}"));
        }
        if (value instanceof List<?> list) {
            return list.stream().map(Json::text).collect(Collectors.joining(",", "[", "]"));
        }
        return value instanceof String text ? '"' + text + '"' : String.valueOf(value);
    }
}
