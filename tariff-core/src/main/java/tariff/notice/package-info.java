// SPDX-License-Identifier: Apache-2.0
/**
 * What is said beside a figure: findings about an input, assumptions behind an answer, cautions for people. In: the three and
 * the refusal that carries findings. Out: anything that computes. Start at {@link tariff.notice.Finding}.
 */
@NullMarked
package tariff.notice;

import org.jspecify.annotations.NullMarked;
