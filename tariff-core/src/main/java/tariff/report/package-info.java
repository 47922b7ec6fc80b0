// SPDX-License-Identifier: Apache-2.0
/**
 * The report to hand over: an assessment as one HTML file that needs nothing else, on screen, on a phone and on paper. In: words and layout
 * of answers that others have worked out. Out: arithmetic beyond picking a month, file names, HTTP. Start at {@link tariff.report.Report}.
 */
@NullMarked
package tariff.report;

import org.jspecify.annotations.NullMarked;
