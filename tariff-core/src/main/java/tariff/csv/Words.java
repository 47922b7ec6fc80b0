// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.text.Normalizer;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.regex.Pattern;

/** Text made comparable: small letters without accents, units in one piece, words apart. */
final class Words {
    private static final Pattern MARKS = Pattern.compile("\\p{M}+");
    private static final Pattern SPLIT_UNIT =
            Pattern.compile("\\b(r?[kmg]?)(var|va|w)[ ·.*-]*(?:h|hr|hrs|hours?|stunden)\\b");
    private static final Pattern CURRENCY_SIGN = Pattern.compile("(?:\\br|\\bus|\\ba)?\\p{Sc}");
    private static final Pattern APART = Pattern.compile("[^\\p{L}\\p{N}%]+");

    private Words() {}

    /** {@code Énergie (kW h)} becomes {@code energie (kwh)}. */
    static String plain(String text) {
        String spaced = text.replace('_', ' ')
                .replace("%", " % ")
                .replace("φ", " phi")
                .replace("ϕ", " phi")
                .replace("ß", "ss");
        String bare = MARKS.matcher(Normalizer.normalize(spaced, Normalizer.Form.NFKD))
                .replaceAll("");
        String small = bare.toLowerCase(Locale.ROOT);
        return SPLIT_UNIT
                .matcher(CURRENCY_SIGN.matcher(small).replaceAll(" eur "))
                .replaceAll("$1$2h");
    }

    /** {@code Énergie (kW h)} becomes {@code energie}, {@code kwh}; every currency sign becomes {@code eur}. */
    static List<String> of(String text) {
        return Arrays.stream(APART.split(plain(text)))
                .filter(word -> !word.isEmpty())
                .toList();
    }
}
