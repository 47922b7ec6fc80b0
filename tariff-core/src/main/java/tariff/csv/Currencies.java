// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.util.Set;

/** Currencies as they stand in headings and beside amounts; signs such as € are known by their Unicode category. */
final class Currencies {
    /** In small letters; {@link Words} writes every sign as {@code eur}. */
    static final Set<String> WORDS = Set.of(
            "eur", "usd", "gbp", "chf", "inr", "brl", "pln", "zar", "aud", "cad", "mxn", "sek", "nok", "dkk", "czk",
            "huf", "clp", "cop", "ars", "nzd", "sgd", "myr", "thb", "php", "jpy", "cny", "rs", "euro", "euros");

    private Currencies() {}
}
