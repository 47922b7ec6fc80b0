// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import de.siegmar.fastcsv.reader.CsvParseException;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.FieldMismatchStrategy;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.PushbackInputStream;
import java.io.PushbackReader;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Iterator;
import java.util.Optional;
import tariff.meter.IntervalSeries;
import tariff.notice.Refusal;

/**
 * Reads interval data as meters give them: separated text with a header, one row for each interval; or a feed in the XML of NAESB
 * REQ.21 (Energy Services Provider Interface). What the file does not show and the caller does not say is asked for in a finding, never
 * guessed; what is odd is named with its row, which in a feed is the line of the file.
 */
public final class IntervalFile {
    private static final int SAMPLE = 60;
    private static final int LOOK = 64;
    private static final String BYTE_ORDER_MARKS = "\u00EF\u00BB\u00BF\u00FE\u00FF";
    private static final long ROWS_BETWEEN_NEWS = 100_000;

    private IntervalFile() {}

    /**
     * Reads UTF-8, or UTF-16 with a byte order mark.
     *
     * @throws Refusal with everything that is wrong with the file
     * @throws IOException if it cannot be read at all
     */
    public static IntervalReading read(Path file, IntervalFileOptions options) throws IOException {
        try (InputStream bytes = Files.newInputStream(file)) {
            return read(bytes, options);
        }
    }

    /**
     * Reads bytes as they come, without holding them: UTF-8, or UTF-16 with a byte order mark; XML as it declares. The caller closes the
     * stream.
     *
     * @throws Refusal with everything that is wrong with the file
     * @throws IOException if it cannot be read at all
     */
    public static IntervalReading read(InputStream file, IntervalFileOptions options) throws IOException {
        PushbackInputStream bytes = new PushbackInputStream(file, LOOK);
        byte[] head = bytes.readNBytes(LOOK);
        bytes.unread(head);
        if (isMarkup(head)) {
            return feed(bytes, options);
        }
        boolean wide = startsWith(head, 0xFE, 0xFF) || startsWith(head, 0xFF, 0xFE);
        return read(new InputStreamReader(bytes, wide ? StandardCharsets.UTF_16 : StandardCharsets.UTF_8), options);
    }

    /** Whether the first sign after a byte order mark and blanks, in whatever encoding, is {@code <}. */
    private static boolean isMarkup(byte[] head) {
        for (byte sign : head) {
            int code = sign & 0xFF;
            if (code > ' ' && BYTE_ORDER_MARKS.indexOf(code) < 0) {
                return code == '<';
            }
        }
        return false;
    }

    private static boolean startsWith(byte[] head, int first, int second) {
        return head.length > 1 && (head[0] & 0xFF) == first && (head[1] & 0xFF) == second;
    }

    private static IntervalReading feed(InputStream file, IntervalFileOptions options) throws IOException {
        Notices notices = new Notices(options.listed());
        EspiFeed feed = EspiFeed.read(file, notices, options.progress());
        notices.refuseIfWrong();
        return reading(new EspiRows(feed, options, notices).understood(), options, notices);
    }

    /**
     * Reads text as it comes, without holding it.
     *
     * @throws Refusal with everything that is wrong with the file
     * @throws IOException if it cannot be read at all
     */
    public static IntervalReading read(Reader text, IntervalFileOptions options) throws IOException {
        Notices notices = new Notices(options.listed());
        Rows rows = new Rows(notices);
        PushbackReader ahead = new PushbackReader(text, Separators.LOOK);
        char separator = Separators.recognise(ahead);
        Layout layout = walk(ahead, separator, rows, options, notices);
        RawColumns raw = rows.columns();
        if (raw.count() == 0) {
            notices.error("no-rows", "", "no row could be read");
        }
        notices.refuseIfWrong();
        Timeline time = new Clockwork(raw, options, notices).timeline(layout.stampAt());
        return reading(new Understood(layout.figures(), raw, time), options, notices);
    }

    private static IntervalReading reading(Understood file, IntervalFileOptions options, Notices notices) {
        RawColumns raw = file.rows();
        Timeline time = file.time();
        Grid grid = new Grid(raw, time, notices);
        grid.place();
        Energies energies = new Registers(grid, file.figures(), options, notices, time.stepMinutes()).energies();
        IntervalSeries series = series(energies, time, grid, options, notices);
        if (raw.rounded() > 0) {
            notices.assume(
                    "rounded",
                    "",
                    raw.rounded() + " figures have more decimals than " + Rows.SCALE + " and were rounded half up",
                    "nothing need be done: a millionth of a kWh is far below what a meter resolves");
        }
        return new IntervalReading(series, notices.findings(), notices.assumptions());
    }

    private static IntervalSeries series(
            Energies energies, Timeline time, Grid grid, IntervalFileOptions options, Notices notices) {
        try {
            return new Gaps(energies, time, notices, grid.firstMinute()).series(options.gaps(), options.counter());
        } catch (IllegalArgumentException outOfRange) {
            notices.error("range", "", String.valueOf(outOfRange.getMessage()));
            throw new Refusal(notices.findings());
        }
    }

    private static Layout walk(Reader text, char separator, Rows rows, IntervalFileOptions options, Notices notices)
            throws IOException {
        Optional<Layout> layout = Optional.empty();
        long count = 0;
        try (CsvReader<Boolean> csv = CsvReader.builder()
                .fieldSeparator(separator)
                .extraFieldStrategy(FieldMismatchStrategy.IGNORE)
                .missingFieldStrategy(FieldMismatchStrategy.IGNORE)
                .build(rows, text)) {
            Iterator<Boolean> each = csv.iterator();
            while (each.hasNext()) {
                each.next();
                if (++count == SAMPLE) {
                    layout = Optional.of(start(rows, options, notices));
                }
                if (count % ROWS_BETWEEN_NEWS == 0) {
                    options.progress().accept(count);
                }
            }
        } catch (CsvParseException malformed) {
            notices.error("text", "after row " + count, "cannot be taken apart: " + malformed.getMessage());
            throw new Refusal(notices.findings());
        } catch (UncheckedIOException unreadable) {
            throw unreadable.getCause();
        }
        if (layout.isEmpty()) {
            layout = Optional.of(start(rows, options, notices));
        }
        options.progress().accept(count);
        return layout.get();
    }

    private static Layout start(Rows rows, IntervalFileOptions options, Notices notices) {
        Optional<Layout> layout = new LayoutFinder(rows.sample(), notices).find(options);
        notices.refuseIfWrong();
        Layout known = layout.orElseThrow();
        rows.start(known);
        return known;
    }
}
