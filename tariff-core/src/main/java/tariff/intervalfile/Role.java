// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

/** What a column of figures holds. */
public enum Role {
    /** Energy taken, or its average power; negative is export if no column of its own has that. */
    ACTIVE("kWh"),
    LAGGING("lagging kvarh"),
    LEADING("leading kvarh"),
    /** Lagging positive, leading negative. */
    REACTIVE("kvarh"),
    EXPORTED("exported kWh");

    private final String words;

    Role(String words) {
        this.words = words;
    }

    /** As messages say it. */
    public String words() {
        return words;
    }
}
