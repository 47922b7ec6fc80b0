// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import io.javalin.http.Handler;
import io.javalin.http.HandlerType;

/** One line of the route table. */
public record Route(HandlerType method, String path, Handler handler) {}
