// SPDX-License-Identifier: Apache-2.0
/**
 * What somebody asks, read and checked with all findings at once. In: rate and bills, the bank, its money terms. Out: HTTP, options of the
 * command line, answers. Start at {@link tariff.service.request.Request}.
 */
@NullMarked
package tariff.service.request;

import org.jspecify.annotations.NullMarked;
