// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.Charset;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.Optional;
import tariff.notice.Finding;
import tariff.notice.Refusal;

/**
 * Bytes as text. A byte order mark decides (Unicode Standard, 23.8); without one it is UTF-8 if it is valid UTF-8, else
 * Windows-1252, which holds every printable character of Latin-1.
 */
record TextFile(String text, String encoding) {
    private static final Charset WINDOWS = Charset.forName("windows-1252");
    private static final int MOST_BYTES = 2_000_000;

    static TextFile of(byte[] bytes) {
        if (bytes.length > MOST_BYTES) {
            throw refuse(
                    "file-too-large",
                    "is larger than a bills file can be",
                    bytes.length + " bytes",
                    "at most " + MOST_BYTES + " bytes");
        }
        if (starts(bytes, 'P', 'K', 3, 4) || starts(bytes, 0xD0, 0xCF, 0x11, 0xE0)) {
            throw refuse(
                    "not-text",
                    "is a workbook, not a text file",
                    "a workbook",
                    "the sheet saved as CSV or tab-separated text");
        }
        TextFile file = decode(bytes);
        if (file.text.indexOf('\0') >= 0) {
            throw refuse(
                    "not-text",
                    "is not a text file",
                    "zero characters",
                    "the sheet saved as CSV or tab-separated text");
        }
        return file;
    }

    private static TextFile decode(byte[] bytes) {
        if (starts(bytes, 0xEF, 0xBB, 0xBF)) {
            return marked(bytes, 3, StandardCharsets.UTF_8, "UTF-8 with a byte order mark");
        }
        if (starts(bytes, 0xFF, 0xFE)) {
            return marked(bytes, 2, StandardCharsets.UTF_16LE, "UTF-16, little end first");
        }
        if (starts(bytes, 0xFE, 0xFF)) {
            return marked(bytes, 2, StandardCharsets.UTF_16BE, "UTF-16, big end first");
        }
        return strictly(bytes, StandardCharsets.UTF_8)
                .map(text -> new TextFile(text, "UTF-8"))
                .orElseGet(
                        () -> new TextFile(new String(bytes, WINDOWS), "Windows-1252, because it is not valid UTF-8"));
    }

    private static TextFile marked(byte[] bytes, int from, Charset charset, String name) {
        String text = strictly(Arrays.copyOfRange(bytes, from, bytes.length), charset)
                .orElseThrow(() -> refuse(
                        "not-text",
                        "begins like " + charset.name() + " but is not",
                        "bytes that are no text",
                        "the sheet saved again as UTF-8"));
        return new TextFile(text, name);
    }

    private static Optional<String> strictly(byte[] bytes, Charset charset) {
        try {
            return Optional.of(charset.newDecoder()
                    .onMalformedInput(CodingErrorAction.REPORT)
                    .onUnmappableCharacter(CodingErrorAction.REPORT)
                    .decode(ByteBuffer.wrap(bytes))
                    .toString());
        } catch (CharacterCodingException malformed) {
            return Optional.empty();
        }
    }

    private static boolean starts(byte[] bytes, int... mark) {
        for (int i = 0; i < mark.length; i++) {
            if (i >= bytes.length || (bytes[i] & 0xFF) != mark[i]) {
                return false;
            }
        }
        return true;
    }

    private static Refusal refuse(String code, String message, String found, String allowed) {
        return new Refusal(
                Finding.error(code, "", "the file " + message).found(found).allowed(allowed));
    }
}
