// SPDX-License-Identifier: Apache-2.0
/**
 * The program. In: the entry point of the command line. Out: everything that it starts. Start at {@link tariff.service.Main}.
 */
@NullMarked
package tariff.service;

import org.jspecify.annotations.NullMarked;
