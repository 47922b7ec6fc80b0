// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import java.util.Optional;

/** Energies by place in time, {@link Grid#NONE} where there is none. */
@SuppressWarnings("ArrayRecordComponent")
record Energies(long[] active, long[] lagging, long[] leading, Optional<long[]> exported) {
    boolean isWhole(int slot) {
        return active[slot] != Grid.NONE
                && lagging[slot] != Grid.NONE
                && leading[slot] != Grid.NONE
                && (exported.isEmpty() || exported.get()[slot] != Grid.NONE);
    }
}
