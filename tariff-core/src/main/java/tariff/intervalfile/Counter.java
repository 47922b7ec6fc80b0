// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

/** Turns the readings of a register that counts up into what each interval added. */
final class Counter {
    private final Grid grid;
    private final Notices notices;
    private final GapRule gaps;

    Counter(Grid grid, Notices notices, GapRule gaps) {
        this.grid = grid;
        this.notices = notices;
        this.gaps = gaps;
    }

    /** The first reading is only where counting begins: its interval is left without a figure. */
    void differences(long[] values, Role role) {
        int before = -1;
        long reading = 0;
        for (int slot = 0; slot < values.length; slot++) {
            long now = values[slot];
            if (now == Grid.NONE) {
                continue;
            }
            values[slot] = Grid.NONE;
            if (before >= 0 && now < reading) {
                notices.error(
                        "counter-falls",
                        grid.whereSlot(slot),
                        role.words() + " counts less than before; a meter was changed or ran over");
            } else if (before >= 0 && (slot == before + 1 || gaps == GapRule.INTERPOLATE)) {
                spread(values, before, slot, now - reading);
            }
            before = slot;
            reading = now;
        }
    }

    /** Evenly, to the last unit: the rise between two readings is known even where its hours are not. */
    private static void spread(long[] values, int before, int slot, long rise) {
        int parts = slot - before;
        for (int k = 1; k <= parts; k++) {
            values[before + k] = rise / parts + (k <= rise % parts ? 1 : 0);
        }
    }
}
