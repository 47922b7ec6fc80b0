// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import io.javalin.http.Handler;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;

/** A document that comes with the program, served as it is. */
final class Document {
    private Document() {}

    static Handler of(String type, String resource) {
        byte[] content = read(resource);
        return ctx -> {
            Accepts.require(ctx, type);
            ctx.result(content).contentType(type);
        };
    }

    private static byte[] read(String resource) {
        try (InputStream in = Document.class.getResourceAsStream(resource)) {
            if (in == null) {
                throw new IllegalStateException("the program comes without " + resource);
            }
            return in.readAllBytes();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
