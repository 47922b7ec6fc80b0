// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.util.List;
import java.util.Set;
import java.util.regex.Pattern;

/** Rows that add up or average others instead of being a month. */
final class TotalsWords {
    private static final Set<String> WORDS = Set.of(
            "total",
            "totals",
            "sum",
            "summe",
            "gesamt",
            "somme",
            "suma",
            "soma",
            "totale",
            "totali",
            "somma",
            "average",
            "avg",
            "mean",
            "mittel",
            "mittelwert",
            "durchschnitt",
            "moyenne",
            "promedio",
            "media",
            "year",
            "jahr",
            "annee",
            "ano",
            "anno",
            "annual",
            "max",
            "maximum",
            "min",
            "minimum",
            "highest",
            "lowest",
            "subtotal",
            "zwischensumme",
            "ytd",
            "q1",
            "q2",
            "q3",
            "q4",
            "h1",
            "h2",
            "maximo",
            "minimo",
            "massimo",
            "totaux",
            "totales",
            "totais");
    private static final Pattern BARE_YEAR = Pattern.compile("(19|20)\\d\\d");

    private TotalsWords() {}

    static boolean begin(String cell) {
        List<String> words = Words.of(cell);
        return !words.isEmpty() && WORDS.contains(words.get(0));
    }

    static boolean isBareYear(String cell) {
        return BARE_YEAR.matcher(cell.strip()).matches();
    }
}
