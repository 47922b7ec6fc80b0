// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import java.io.IOException;
import java.io.PushbackReader;

/** Recognises what stands between columns, from the beginning of the text. */
final class Separators {
    static final int LOOK = 16_384;
    private static final String CANDIDATES = ";\t|,";

    private Separators() {}

    /** Takes a byte order mark away, looks ahead, and leaves the reader where the text begins. */
    static char recognise(PushbackReader reader) throws IOException {
        char[] head = new char[LOOK];
        int length = 0;
        int read = 0;
        while (length < LOOK && (read = reader.read(head, length, LOOK - length)) > 0) {
            length += read;
        }
        int from = length > 0 && head[0] == '\uFEFF' ? 1 : 0;
        reader.unread(head, from, length - from);
        char best = ',';
        int most = 0;
        for (int i = 0; i < CANDIDATES.length(); i++) {
            char candidate = CANDIDATES.charAt(i);
            int agreeing = agreeing(head, length, candidate);
            if (agreeing > most) {
                most = agreeing;
                best = candidate;
            }
        }
        return best;
    }

    /** The lines that have the candidate as often as the line before them, outside quotes, at least once. */
    private static int agreeing(char[] text, int length, char candidate) {
        int agreeing = 0;
        int before = 0;
        int here = 0;
        boolean quoted = false;
        for (int i = 0; i < length; i++) {
            char c = text[i];
            if (c == '"') {
                quoted = !quoted;
            } else if (c == '\n' || (c == '\r' && (i + 1 == length || text[i + 1] != '\n'))) {
                agreeing += here > 0 && here == before ? 1 : 0;
                before = here;
                here = 0;
                quoted = false;
            } else if (c == candidate && !quoted) {
                here++;
            }
        }
        return agreeing;
    }
}
