// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;
import static tariff.intervalfile.InventedFeed.estimated;
import static tariff.intervalfile.InventedFeed.reading;
import static tariff.intervalfile.InventedFeed.refusal;
import static tariff.intervalfile.InventedFeed.withReactive;

import java.io.IOException;
import java.io.InputStream;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import tariff.notice.Refusal;

/** Feeds that are no XML, would make a parser fetch or expand, or broke on their way. */
class DamagedFeedTest {
    private static final IntervalFileOptions UTC = IntervalFileOptions.in("UTC");

    @ParameterizedTest
    @ValueSource(
            strings = {
                "<!DOCTYPE feed [<!ENTITY a \"aaaaaaaaaa\"><!ENTITY b \"&a;&a;&a;&a;&a;&a;&a;&a;&a;&a;\">]><feed>&b;</feed>",
                "<!DOCTYPE feed [<!ENTITY a SYSTEM \"file:///etc/hostname\">]><feed><entry><title>&a;</title></entry></feed>",
                "<!DOCTYPE feed SYSTEM \"http://127.0.0.1:9/x.dtd\"><feed/>",
                "<feed><entry></feed>",
                "<feed>",
                "<",
                "<feed>&undeclared;</feed>",
                "<?xml version=\"1.0\" encoding=\"no-such\"?><feed/>",
            })
    void documentTypesEntitiesAndBrokenXmlAreRefusedInOneSentence(String text) {
        assertThat(refusal(text, UTC)).containsExactly("row 1: is not XML as a feed of meter data has it");
    }

    @Test
    void textWithoutEndAndDeepNestingAreNotHeld() {
        String nested = "<a>".repeat(100_000) + "</a>".repeat(100_000);
        assertThat(refusal("<feed>" + nested + "</feed>", UTC))
                .as("newer parsers refuse the depth, older ones pass it over")
                .allMatch(each -> each.contains("is missing from the feed")
                        || each.contains("is not XML as a feed of meter data has it"));
        String longText = "<feed><entry><content><ReadingType><uom>" + "7".repeat(5_000_000);
        assertThat(refusal(longText, UTC))
                .singleElement()
                .asString()
                .contains("is not XML as a feed of meter data has it");
    }

    /** Pieces lost, doubled, swapped for other pieces or figures: read or refused, never anything else. */
    @Test
    void whateverHappensToAFeedItIsReadOrRefused() throws IOException {
        String whole = withReactive(new InventedFeed()
                        .clock(3_600, 3_600)
                        .block("1", 0, 3_600, List.of(reading(0, 900, 5), reading(900, 900, 6), estimated(1_800, 8))))
                .text();
        String[] pieces = whole.split("(?=<)|(?<=>)");
        Random random = new Random(1);
        String[] strange = {
            "", "-1", "99999999999999999999", "1e9", "<", ">", "&amp;", "<value>", "0", "\u0000", "2147483648"
        };
        int read = 0;
        for (int i = 0; i < 4_000; i++) {
            String[] changed = pieces.clone();
            for (int change = random.nextInt(3); change >= 0; change--) {
                int at = random.nextInt(changed.length);
                changed[at] = random.nextBoolean()
                        ? strange[random.nextInt(strange.length)]
                        : pieces[random.nextInt(pieces.length)];
            }
            try {
                read += InventedFeed.read(String.join("", changed), UTC.gaps(GapRule.LEAVE_OUT))
                                        .series()
                                        .size()
                                > 0
                        ? 1
                        : 0;
            } catch (Refusal refused) {
                assertThat(refused.findings()).isNotEmpty();
            }
        }
        assertThat(read).as("some are still feeds").isGreaterThan(100);
    }

    @Test
    void aBrokenConnectionIsNotTakenForABrokenFeed() {
        InputStream broken = new InputStream() {
            private int at;

            @Override
            public int read() throws IOException {
                String text = "<feed><entry>";
                if (at == text.length()) {
                    throw new IOException("broken off");
                }
                return text.charAt(at++);
            }
        };
        assertThat(catchThrowableOfType(IOException.class, () -> IntervalFile.read(broken, UTC)))
                .hasMessage("broken off");
    }
}
