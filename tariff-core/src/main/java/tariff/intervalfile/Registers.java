// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import java.util.Arrays;
import java.util.Map;
import java.util.Optional;
import tariff.notice.Finding;

/**
 * From figures as a meter writes them to energies of intervals, all of them at least 0: averages become energies, counters
 * differences, a signed column two.
 */
final class Registers {
    private static final int LEAST_FOR_COUNTER = 96;

    private final Grid grid;
    private final Map<Role, Layout.Figures> columns;
    private final IntervalFileOptions options;
    private final Notices notices;
    private final int step;
    private final Map<Role, long[]> figures;

    Registers(Grid grid, Map<Role, Layout.Figures> columns, IntervalFileOptions options, Notices notices, int step) {
        this.grid = grid;
        this.columns = columns;
        this.options = options;
        this.notices = notices;
        this.step = step;
        this.figures = grid.figures();
    }

    /** @throws tariff.notice.Refusal if a sign or a counter cannot be understood */
    Energies energies() {
        columns.forEach((role, each) -> {
            long[] values = values(role);
            if (each.isPower()) {
                toEnergy(values);
            } else if (options.counter()) {
                new Counter(grid, notices, options.gaps()).differences(values, role);
            } else if (countsUp(values)) {
                notices.add(Finding.error(
                                "counts-up", Texts.quoted(each.header()), "never falls from the first row to the last")
                        .allowed("say that it is a counter if it is; energies per interval otherwise"));
            }
        });
        long[] active = values(Role.ACTIVE);
        Optional<long[]> exported = exported(active);
        long[] lagging;
        long[] leading;
        if (!figures.containsKey(Role.LEADING)) {
            lagging = values(figures.containsKey(Role.REACTIVE) ? Role.REACTIVE : Role.LAGGING);
            leading = split(lagging);
            reactiveInOneColumn(leading);
        } else {
            lagging = values(Role.LAGGING);
            leading = values(Role.LEADING);
            mirror(leading);
            refuseNegative(lagging, Role.LAGGING);
            refuseNegative(leading, Role.LEADING);
        }
        notices.refuseIfWrong();
        return new Energies(active, lagging, leading, exported);
    }

    private long[] values(Role role) {
        return figures.getOrDefault(role, new long[0]);
    }

    private Optional<long[]> exported(long[] active) {
        if (figures.containsKey(Role.EXPORTED)) {
            refuseNegative(active, Role.ACTIVE);
            refuseNegative(values(Role.EXPORTED), Role.EXPORTED);
            return Optional.of(values(Role.EXPORTED));
        }
        int negative = firstNegative(active);
        if (negative < 0) {
            return Optional.empty();
        }
        notices.assume(
                "negative-is-export",
                grid.whereSlot(negative),
                "kWh below zero, here and in " + (count(active) - 1) + " other rows, are read as exported",
                "give exported kWh in a column of its own");
        return Optional.of(split(active));
    }

    private void reactiveInOneColumn(long[] leading) {
        boolean any = Arrays.stream(leading).anyMatch(value -> value > 0);
        notices.assume(
                any ? "negative-is-leading" : "no-leading-register",
                "headers",
                any
                        ? "kvarh above zero are read as lagging, below zero as leading"
                        : "the file has no leading kvarh; they are taken as zero",
                "give lagging and leading kvarh in two columns");
    }

    /** A leading register that a meter writes with a minus throughout. */
    private void mirror(long[] leading) {
        if (firstNegative(leading) >= 0 && Arrays.stream(leading).noneMatch(value -> value > 0)) {
            for (int i = 0; i < leading.length; i++) {
                leading[i] = leading[i] == Grid.NONE ? Grid.NONE : -leading[i];
            }
            notices.assume(
                    "leading-written-negative",
                    "headers",
                    "leading kvarh are written with a minus throughout and read without it",
                    "write leading kvarh without a sign");
        }
    }

    private void refuseNegative(long[] values, Role role) {
        for (int i = 0; i < values.length; i++) {
            if (values[i] != Grid.NONE && values[i] < 0) {
                notices.error(
                        "negative",
                        grid.whereSlot(i),
                        role.words() + " is below zero beside a column for the other direction");
            }
        }
    }

    private static int firstNegative(long[] values) {
        for (int i = 0; i < values.length; i++) {
            if (values[i] != Grid.NONE && values[i] < 0) {
                return i;
            }
        }
        return -1;
    }

    private static long count(long[] values) {
        return Arrays.stream(values)
                .filter(value -> value != Grid.NONE && value < 0)
                .count();
    }

    /** Leaves what is above zero and returns what was below, without its sign. */
    private static long[] split(long[] values) {
        long[] below = new long[values.length];
        for (int i = 0; i < values.length; i++) {
            if (values[i] == Grid.NONE) {
                below[i] = Grid.NONE;
            } else if (values[i] < 0) {
                below[i] = -values[i];
                values[i] = 0;
            }
        }
        return below;
    }

    /** Half up, away from zero, to the scale. */
    private void toEnergy(long[] values) {
        int perHour = 60 / step;
        for (int i = 0; i < values.length; i++) {
            if (values[i] != Grid.NONE) {
                long size = (2 * Math.abs(values[i]) + perHour) / (2L * perHour);
                values[i] = values[i] < 0 ? -size : size;
            }
        }
    }

    private static boolean countsUp(long[] values) {
        long last = Grid.NONE;
        int present = 0;
        int rising = 0;
        for (long value : values) {
            if (value == Grid.NONE) {
                continue;
            }
            if (last != Grid.NONE && value < last) {
                return false;
            }
            rising += last != Grid.NONE && value > last ? 1 : 0;
            last = value;
            present++;
        }
        return present >= LEAST_FOR_COUNTER && rising * 2 > present;
    }
}
