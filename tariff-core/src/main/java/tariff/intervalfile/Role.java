// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

/** What a column of figures holds. */
public enum Role {
    /** Energy taken, or its average power; negative is export if no column of its own has that. */
    ACTIVE("active", "kWh"),
    LAGGING("lagging", "lagging kvarh"),
    LEADING("leading", "leading kvarh"),
    /** Lagging positive, leading negative. */
    REACTIVE("reactive", "kvarh"),
    EXPORTED("exported", "exported kWh");

    private final String word;
    private final String words;

    Role(String word, String words) {
        this.word = word;
        this.words = words;
    }

    /** The word that a user picks it by. */
    public String word() {
        return word;
    }

    /** As messages say it. */
    public String words() {
        return words;
    }
}
