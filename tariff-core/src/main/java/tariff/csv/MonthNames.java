// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.util.Collections;
import java.util.HashMap;
import java.util.Map;

/** Months by name in English, German, French, Spanish, Portuguese and Italian, in small letters without accents. */
final class MonthNames {
    private static final String[] NAMES = {
        "jan|january|januar|janner|janv|janvier|ene|enero|janeiro|gen|gennaio",
        "feb|february|februar|feber|fev|fevr|fevrier|febrero|fevereiro|febbraio",
        "mar|march|mrz|marz|maerz|mars|marzo|marco",
        "apr|april|avr|avril|abr|abril|aprile",
        "may|mai|mayo|maio|mag|maggio",
        "jun|june|juni|juin|junio|junho|giu|giugno",
        "jul|july|juli|juil|juillet|julio|julho|lug|luglio",
        "aug|august|aout|ago|agosto",
        "sep|sept|september|septembre|septiembre|setiembre|set|setembro|sett|settembre",
        "oct|october|okt|oktober|octobre|octubre|out|outubro|ott|ottobre",
        "nov|november|novembre|noviembre|novembro",
        "dec|december|dez|dezember|decembre|dic|diciembre|dezembro|dicembre"
    };
    private static final Map<String, Integer> NUMBERS = byName();

    private MonthNames() {}

    /** The month's number, 1 to 12, by its name. */
    static Map<String, Integer> numbers() {
        return NUMBERS;
    }

    private static Map<String, Integer> byName() {
        Map<String, Integer> all = new HashMap<>();
        for (int month = 1; month <= NAMES.length; month++) {
            for (String name : NAMES[month - 1].split("\\|", -1)) {
                all.put(name, month);
            }
        }
        return Collections.unmodifiableMap(all);
    }
}
