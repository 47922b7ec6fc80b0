// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import io.javalin.http.Context;
import java.util.Arrays;
import java.util.Locale;

/** Whether the client takes what is served: the Accept header, RFC 9110, 12.5.1. Without one it takes anything. */
final class Accepts {
    private Accepts() {}

    static void require(Context ctx, String type) {
        String accept = ctx.header("Accept");
        if (accept != null && !accept.isBlank() && !takes(accept, type)) {
            throw new Problem(406, "Only " + type + " is served here.");
        }
    }

    static boolean takes(String accept, String type) {
        String family = type.substring(0, type.indexOf('/')) + "/*";
        return Arrays.stream(accept.toLowerCase(Locale.ROOT).split(",", -1))
                .map(range -> range.replace(" ", "").split(";", -1))
                .filter(parts -> Arrays.stream(parts).noneMatch(part -> part.matches("q=0(\\.0*)?")))
                .map(parts -> parts[0])
                .anyMatch(range -> range.equals(type) || range.equals(family) || range.equals("*/*"));
    }
}
