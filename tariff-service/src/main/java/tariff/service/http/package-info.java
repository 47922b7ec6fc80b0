// SPDX-License-Identifier: Apache-2.0
/**
 * The library over HTTP: handlers read, ask, write. In: routes, one file for each answer, one place for problems. Out: how anything is
 * worked out, and JSON itself. Start at {@link tariff.service.http.Routes}.
 */
@NullMarked
package tariff.service.http;

import org.jspecify.annotations.NullMarked;
