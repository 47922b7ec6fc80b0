// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import de.siegmar.fastcsv.reader.AbstractBaseCsvCallbackHandler;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/**
 * Takes the fields of a file as they go by: the first rows as text, to recognise the layout from, and the others straight into
 * columns of whole numbers. No text is kept.
 */
final class Rows extends AbstractBaseCsvCallbackHandler<Boolean> {
    /** Decimals that are kept of a kWh or kvarh. */
    static final int SCALE = 6;

    /** Room for a leap year of quarter-hours from the start; more is made as rows come. */
    private static final int ROOM = 366 * 96;

    private static final int IGNORED = -1;
    private static final int STAMP = -2;
    private static final int TIME = -3;

    private final Notices notices;
    private final List<String[]> sample = new ArrayList<>();
    private final List<Integer> sampleLines = new ArrayList<>();
    private final List<String> fields = new ArrayList<>();
    private int[] roles = {};
    private int[] scales = {};
    private @Nullable Layout layout;
    private Decimals decimals = new Decimals('.');

    private int line;
    private boolean blank;
    private boolean unusable;
    private long date;
    private long time;
    private int count;
    private long[] stamps = new long[ROOM];
    private int[] lines = new int[ROOM];
    private List<Role> kept = List.of();
    private long[][] columns = {};

    Rows(Notices notices) {
        this.notices = notices;
    }

    List<String[]> sample() {
        return sample;
    }

    /** From here on fields are figures; the rows of the sample first. */
    void start(Layout known) {
        layout = known;
        decimals = new Decimals(known.mark());
        int width = known.figures().values().stream()
                .mapToInt(Layout.Figures::column)
                .max()
                .orElse(0);
        roles = new int[Math.max(width, Math.max(known.stamp(), known.time())) + 1];
        Arrays.fill(roles, IGNORED);
        kept = List.copyOf(known.figures().keySet());
        scales = new int[kept.size()];
        columns = new long[kept.size()][stamps.length];
        known.figures().forEach((role, each) -> {
            roles[each.column()] = kept.indexOf(role);
            scales[kept.indexOf(role)] = SCALE + each.exponent();
        });
        roles[known.stamp()] = STAMP;
        if (known.time() >= 0) {
            roles[known.time()] = TIME;
        }
        for (int row = known.firstRow(); row < sample.size(); row++) {
            begin(sampleLines.get(row));
            String[] texts = sample.get(row);
            for (int column = 0; column < texts.length; column++) {
                char[] text = texts[column].toCharArray();
                take(column, text, 0, text.length);
            }
            end();
        }
    }

    @Override
    protected void handleBegin(long startingLineNumber) {
        begin((int) startingLineNumber);
    }

    @Override
    protected void handleField(int index, char[] buffer, int offset, int length, boolean quoted) {
        if (layout == null) {
            fields.add(new String(buffer, offset, length));
        } else {
            take(index, buffer, offset, length);
        }
    }

    @Override
    protected Boolean buildRecord() {
        if (layout != null) {
            end();
        } else {
            sample.add(fields.toArray(new String[0]));
            sampleLines.add(line);
            fields.clear();
        }
        return Boolean.TRUE;
    }

    private void begin(int startingLine) {
        line = startingLine;
        blank = true;
        unusable = false;
        date = Stamp.UNREADABLE;
        time = Stamp.UNREADABLE;
        if (count == stamps.length) {
            grow(count + (count >> 1));
        }
        for (long[] each : columns) {
            each[count] = Decimals.EMPTY;
        }
    }

    private void grow(int room) {
        stamps = Arrays.copyOf(stamps, room);
        lines = Arrays.copyOf(lines, room);
        for (int each = 0; each < columns.length; each++) {
            columns[each] = Arrays.copyOf(columns[each], room);
        }
    }

    private void take(int column, char[] text, int offset, int length) {
        blank &= length == 0;
        int role = column < roles.length ? roles[column] : IGNORED;
        if (role >= 0) {
            long value = decimals.read(text, offset, length, scales[role]);
            columns[role][count] =
                    value == Decimals.UNREADABLE ? noFigure(role, new String(text, offset, length)) : value;
        } else if (role != IGNORED && length > 0) {
            takeStamp(role, text, offset, length);
        }
    }

    private long noFigure(int role, String text) {
        notices.error(
                "figure",
                "row " + line,
                Texts.quoted(text) + " is not a figure of " + kept.get(role).words());
        return Decimals.EMPTY;
    }

    private void takeStamp(int role, char[] text, int offset, int length) {
        long stamp = Stamp.read(text, offset, length);
        if (stamp == Stamp.UNREADABLE || Stamp.hasDate(stamp) != (role == STAMP)) {
            String found = Texts.quoted(new String(text, offset, length));
            notices.error("stamp", "row " + line, found + " is not a date and time on a whole minute");
            unusable = true;
        } else if (role == STAMP) {
            date = stamp;
        } else {
            time = stamp;
        }
    }

    private void end() {
        if (blank || unusable) {
            return;
        }
        boolean split = layout != null && layout.time() >= 0;
        if (date == Stamp.UNREADABLE || (split && time == Stamp.UNREADABLE)) {
            notices.error("stamp", "row " + line, "has no date and time");
            return;
        }
        stamps[count] = split ? Stamp.join(date, time) : date;
        lines[count++] = line;
    }

    /** What was read. */
    RawColumns columns() {
        Map<Role, long[]> figures = new EnumMap<>(Role.class);
        for (int each = 0; each < columns.length; each++) {
            figures.put(kept.get(each), columns[each]);
        }
        return new RawColumns(count, stamps, lines, figures, decimals.rounded());
    }
}
