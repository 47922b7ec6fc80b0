// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import java.nio.ByteBuffer;
import org.eclipse.jetty.http.HttpHeader;
import org.eclipse.jetty.server.Request;
import org.eclipse.jetty.server.Response;
import org.eclipse.jetty.server.handler.ErrorHandler;
import org.eclipse.jetty.util.Callback;

/** Problem responses for requests so malformed that they never reach a route. */
final class ProblemPages extends ErrorHandler {

    @Override
    public boolean handle(Request request, Response response, Callback callback) {
        Problem problem = new Problem(response.getStatus(), "The request cannot be understood.");
        response.getHeaders().put(HttpHeader.CONTENT_TYPE, Problems.TYPE);
        response.write(
                true,
                ByteBuffer.wrap(Problems.json(
                                problem,
                                request.getHttpURI().getPath() == null
                                        ? ""
                                        : request.getHttpURI().getPath())
                        .bytes()),
                callback);
        return true;
    }
}
