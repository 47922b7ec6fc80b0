// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import java.util.Set;

/**
 * One channel of a meter, as its entry in the feed ties it to others.
 *
 * @param name its own link, by which a caller may choose it
 * @param related what its entry links to: its ReadingType, its IntervalBlocks
 * @param line of the file
 */
record EspiMeterReading(String name, Set<String> related, int line) {

    /** Whether blocks that name this parent are its own. */
    boolean owns(String parent) {
        return parent.equals(name) || related.contains(parent) || parent.startsWith(name + "/");
    }
}
