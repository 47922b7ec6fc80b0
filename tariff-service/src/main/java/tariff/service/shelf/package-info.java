// SPDX-License-Identifier: Apache-2.0
/**
 * Rates kept by id. In: reading them from a directory. Out: checking them, serving them. Start at {@link tariff.service.shelf.Shelf}.
 */
@NullMarked
package tariff.service.shelf;

import org.jspecify.annotations.NullMarked;
