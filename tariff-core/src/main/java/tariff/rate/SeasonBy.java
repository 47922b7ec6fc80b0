// SPDX-License-Identifier: Apache-2.0
package tariff.rate;

import java.util.LinkedHashMap;
import java.util.Map;

/** What decides the season of a billing period. */
public enum SeasonBy {
    /** Each season counts for its share of the period's days. */
    DAYS("days", "a period that lies in two is split by days"),
    FIRST_DAY("firstDay", "a period's first day decides"),
    LAST_DAY("lastDay", "a period's last day decides"),
    STATEMENT_DATE("statementDate", "the date of the statement decides");

    static final Map<String, SeasonBy> WORDS = new LinkedHashMap<>();

    static {
        for (SeasonBy by : values()) {
            WORDS.put(by.key, by);
        }
    }

    private final String key;
    private final String words;

    SeasonBy(String key, String words) {
        this.key = key;
        this.words = words;
    }

    String words() {
        return words;
    }
}
