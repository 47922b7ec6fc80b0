// SPDX-License-Identifier: Apache-2.0
package tariff.report;

import java.util.List;

/** A part of the report under one heading. A new part is one new file, and one line in {@link #all}. */
interface Section {

    /** Names it within the page. */
    String id();

    String title();

    /** Writes what stands below the heading. */
    void write(Html page, Report report);

    /** All parts in the order they are read. */
    static List<Section> all() {
        return List.of(
                new ShortAnswer(),
                new TodaysBill(),
                new TheBank(),
                new SavedByTheBank(),
                new PaidBack(),
                new Screened(),
                new ReviewedClaims(),
                new TakenToBeSo(),
                new BeforeAnybodyActs(),
                new TheRate(),
                new WorkedOut());
    }
}
