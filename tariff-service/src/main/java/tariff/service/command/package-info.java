// SPDX-License-Identifier: Apache-2.0
/**
 * The command line: one file for each command, texts in 100 columns. In: options, files, what is printed. Out: how anything is worked
 * out. Start at {@link tariff.service.command.Tariff}.
 */
@NullMarked
package tariff.service.command;

import org.jspecify.annotations.NullMarked;
