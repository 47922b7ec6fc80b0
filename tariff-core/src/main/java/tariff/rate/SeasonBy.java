// SPDX-License-Identifier: Apache-2.0
package tariff.rate;

import java.util.LinkedHashMap;
import java.util.Map;

/** What decides the season of a billing period. */
public enum SeasonBy {
    /** Each season counts for its share of the period's days. */
    DAYS("days", "by its days"),
    FIRST_DAY("firstDay", "by its first day"),
    LAST_DAY("lastDay", "by its last day"),
    STATEMENT_DATE("statementDate", "by the date of the statement");

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
