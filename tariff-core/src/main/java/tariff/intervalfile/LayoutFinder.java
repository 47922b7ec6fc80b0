// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Pattern;

/** Recognises the layout from the first rows: data begin at the first row with a stamp, the header is the row before. */
final class LayoutFinder {
    private static final Pattern START = Pattern.compile("\\b(from|start|begin|beginning|starting|von)\\b");
    private static final Pattern END = Pattern.compile("\\b(to|end|ending|until|bis)\\b");

    private final List<String[]> sample;
    private final Notices notices;

    LayoutFinder(List<String[]> sample, Notices notices) {
        this.sample = sample;
        this.notices = notices;
    }

    /** Empty once findings say why. */
    Optional<Layout> find(IntervalFileOptions options) {
        int first = firstRow();
        if (first < 0) {
            notices.error(
                    "no-stamps", "", "no row begins with a date and time, such as 2026-03-01 00:15 or 1/3/2026 0:15");
            return Optional.empty();
        }
        if (first == 0) {
            notices.error(
                    "no-header", "row 1", "no header stands above the figures; one is needed to know kWh from kvarh");
            return Optional.empty();
        }
        List<String> headers =
                List.of(sample.get(first - 1)).stream().map(String::strip).toList();
        List<Integer> stamps = columns(first, stamp -> Stamp.hasDate(stamp));
        List<Integer> times = columns(first, stamp -> !Stamp.hasDate(stamp));
        int stamp = stamps.get(0);
        boolean split = !carriesTime(first, stamp) && !times.isEmpty();
        int time = split ? times.get(0) : -1;
        boolean pair = split ? times.size() > 1 : stamps.size() > 1 && carriesTime(first, stamps.get(1));
        Map<Role, Layout.Figures> figures = new Headers(options, notices).recognise(headers);
        String named = stamp < headers.size() ? headers.get(stamp) : "";
        String timeNamed = time >= 0 && time < headers.size() ? headers.get(time) : "";
        Optional<StampAt> at = pair ? Optional.of(StampAt.START) : stampAt(named + " " + timeNamed);
        return Optional.of(new Layout(first, stamp, time, figures, at, mark(first, figures)));
    }

    private int firstRow() {
        for (int row = 0; row < sample.size(); row++) {
            if (!columns(row, Stamp::hasDate).isEmpty()
                    && !columns(row, Stamp::hasTime).isEmpty()) {
                return row;
            }
            if (row + 1 < sample.size()
                    && !columns(row, Stamp::hasDate).isEmpty()
                    && !columns(row + 1, stamp -> Stamp.hasDate(stamp) && Stamp.hasTime(stamp))
                            .isEmpty()) {
                return row;
            }
        }
        return -1;
    }

    private interface Test {
        boolean holds(long stamp);
    }

    private List<Integer> columns(int row, Test test) {
        List<Integer> columns = new ArrayList<>();
        String[] fields = sample.get(row);
        for (int column = 0; column < fields.length; column++) {
            long stamp = Stamp.read(fields[column]);
            if (stamp != Stamp.UNREADABLE && test.holds(stamp)) {
                columns.add(column);
            }
        }
        return columns;
    }

    private boolean carriesTime(int first, int column) {
        for (int row = first; row < sample.size(); row++) {
            if (columns(row, stamp -> Stamp.hasDate(stamp) && Stamp.hasTime(stamp))
                    .contains(column)) {
                return true;
            }
        }
        return false;
    }

    private static Optional<StampAt> stampAt(String header) {
        String words = header.toLowerCase(Locale.ROOT).replace('_', ' ');
        boolean start = START.matcher(words).find();
        boolean end = END.matcher(words).find();
        return start == end ? Optional.empty() : Optional.of(start ? StampAt.START : StampAt.END);
    }

    /** The last mark of a figure that has two kinds, else the one kind seen, else not known. */
    private char mark(int first, Map<Role, Layout.Figures> figures) {
        char seen = 0;
        for (String[] fields : sample.subList(first, sample.size())) {
            for (Layout.Figures each : figures.values()) {
                String text = each.column() < fields.length ? fields[each.column()] : "";
                int comma = text.lastIndexOf(',');
                int point = text.lastIndexOf('.');
                if (comma >= 0 && point >= 0) {
                    return comma > point ? ',' : '.';
                }
                seen = comma >= 0 ? ',' : point >= 0 ? '.' : seen;
            }
        }
        return seen;
    }
}
