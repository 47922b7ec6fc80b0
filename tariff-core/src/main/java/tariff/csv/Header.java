// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * The line of a sheet that names its columns.
 *
 * @param line where it stands
 * @param unitsBelow whether the next line gives the units
 * @param headings one for each column
 */
record Header(Sheet sheet, int line, boolean unitsBelow, List<Heading> headings) {
    private static final int LINES_SEARCHED = 40;
    private static final int MOST_NAMES = 500;
    private static final int CORNERS_SEARCHED = 3;

    /** The line that names the most; the months may run down or across. Empty if no line names a date and a figure. */
    static Optional<Header> find(Sheet sheet, HeadingReader reader) {
        Optional<Header> best = Optional.empty();
        for (Sheet each : List.of(sheet, sheet.turned())) {
            int searched = each.columns() > MOST_NAMES ? 0 : Math.min(LINES_SEARCHED, each.lines());
            for (int line = 0; line < searched; line++) {
                Header header = read(each, line, reader);
                if (header.isEnough()
                        && header.score() > best.map(Header::score).orElse(0)) {
                    best = Optional.of(header);
                }
            }
        }
        return best;
    }

    /** How many columns are known. */
    int score() {
        return (int)
                headings.stream().filter(heading -> heading.meaning().isUsed()).count();
    }

    int firstBodyLine() {
        return line + (unitsBelow ? 2 : 1);
    }

    String place(int bodyLine, int column) {
        return sheet.place(bodyLine, column, headings.get(column).name());
    }

    String columnPlace(int column) {
        return sheet.columnPlace(column, headings.get(column).name());
    }

    private boolean isEnough() {
        return names(Meaning.Reading.class) && names(Meaning.Date.class);
    }

    private boolean names(Class<? extends Meaning> kind) {
        return headings.stream().anyMatch(heading -> kind.isInstance(heading.meaning()));
    }

    private static Header read(Sheet sheet, int line, HeadingReader reader) {
        boolean units = isUnits(sheet, line + 1);
        List<Heading> headings = new ArrayList<>();
        for (int column = 0; column < sheet.columns(); column++) {
            headings.add(reader.read(sheet.cell(line, column), units ? sheet.cell(line + 1, column) : ""));
        }
        Header header = new Header(sheet, line, units, headings);
        return header.names(Meaning.Reading.class) && !header.names(Meaning.Date.class)
                ? header.withUnnamedMonths()
                : header;
    }

    /** People leave the corner above their months empty. */
    private Header withUnnamedMonths() {
        for (int column = 0; column < Math.min(CORNERS_SEARCHED, headings.size()); column++) {
            if (!headings.get(column).meaning().isUsed() && holdsMonths(column)) {
                List<Heading> named = new ArrayList<>(headings);
                named.set(column, Heading.of(headings.get(column).name(), new Meaning.Date(Meaning.When.MONTH)));
                return new Header(sheet, line, unitsBelow, named);
            }
        }
        return this;
    }

    private boolean holdsMonths(int column) {
        int months = 0;
        int others = 0;
        for (int below = firstBodyLine(); below < Math.min(sheet.lines(), firstBodyLine() + LINES_SEARCHED); below++) {
            String cell = sheet.cell(below, column);
            if (PeriodText.looksLikeOne(cell)) {
                months++;
            } else if (!cell.isEmpty() && !TotalsWords.begin(cell)) {
                others++;
            }
        }
        return months > others;
    }

    private static boolean isUnits(Sheet sheet, int line) {
        if (line >= sheet.lines()) {
            return false;
        }
        boolean any = false;
        for (int column = 0; column < sheet.columns(); column++) {
            List<String> words = Words.of(sheet.cell(line, column));
            if (words.isEmpty()) {
                continue;
            }
            boolean unit = words.stream()
                    .allMatch(word ->
                            UnitWord.of(word).isPresent() || Currencies.WORDS.contains(word) || word.equals("%"));
            if (!unit) {
                return false;
            }
            any = true;
        }
        return any;
    }
}
