// SPDX-License-Identifier: Apache-2.0
package tariff.meter;

/** A unit that a bill counts in. Two units of one {@link Dimension} may be compared; only equal units may be added. */
public enum Unit {
    KWH("kWh", Dimension.ENERGY),
    KVARH("kvarh", Dimension.ENERGY),
    KVAH("kVAh", Dimension.ENERGY),
    KW("kW", Dimension.DEMAND),
    KVAR("kvar", Dimension.DEMAND),
    KVA("kVA", Dimension.DEMAND),
    DAYS("days", Dimension.TIME),
    MONEY("money", Dimension.MONEY),
    NUMBER("", Dimension.NUMBER);

    /** What a unit measures; kWh, kvarh and kVAh are all energy over a month, kW, kvar and kVA all demand. */
    public enum Dimension {
        ENERGY,
        DEMAND,
        TIME,
        MONEY,
        NUMBER
    }

    private final String symbol;
    private final Dimension dimension;

    Unit(String symbol, Dimension dimension) {
        this.symbol = symbol;
        this.dimension = dimension;
    }

    /** As the trade writes it: {@code kvarh}; empty for a plain number. */
    public String symbol() {
        return symbol;
    }

    public Dimension dimension() {
        return dimension;
    }

    /** Whether a figure in this unit may be held against one in the other: a kvarh against a share of kWh, never against kW. */
    public boolean comparesWith(Unit other) {
        return dimension == other.dimension;
    }
}
