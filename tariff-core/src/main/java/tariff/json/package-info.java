// SPDX-License-Identifier: Apache-2.0
/**
 * The only place that knows Jackson: rates, bills and answers as JSON. In: reading and writing. Out: anything that computes. Start at
 * {@link tariff.json.RateFile}.
 */
@NullMarked
package tariff.json;

import org.jspecify.annotations.NullMarked;
