// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.math.BigDecimal;
import java.util.Map;
import java.util.Optional;
import tariff.meter.Unit;

/** A unit as written, such as MWh: one of ours and how many of ours it is, exactly. */
record UnitWord(Unit unit, BigDecimal factor) {
    private static final Map<String, Unit> UNITS = Map.of(
            "wh", Unit.KWH,
            "varh", Unit.KVARH,
            "vah", Unit.KVAH,
            "w", Unit.KW,
            "var", Unit.KVAR,
            "va", Unit.KVA);
    private static final Map<Character, BigDecimal> PREFIXES = Map.of(
            'k', BigDecimal.ONE,
            'm', new BigDecimal("1000"),
            'g', new BigDecimal("1000000"));

    /** @param token in small letters, without spaces */
    static Optional<UnitWord> of(String token) {
        if (token.equals("rkvah")) { // as meters in India print reactive energy
            return Optional.of(new UnitWord(Unit.KVARH, BigDecimal.ONE));
        }
        if (token.length() < 2) {
            return Optional.empty();
        }
        Unit plain = UNITS.get(token);
        if (plain != null) {
            return plain.dimension() == Unit.Dimension.ENERGY
                    ? Optional.of(new UnitWord(plain, new BigDecimal("0.001")))
                    : Optional.empty();
        }
        BigDecimal factor = PREFIXES.get(token.charAt(0));
        Unit unit = UNITS.get(token.substring(1));
        return factor == null || unit == null ? Optional.empty() : Optional.of(new UnitWord(unit, factor));
    }
}
