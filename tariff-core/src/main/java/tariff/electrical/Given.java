// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/** Arguments, passed on when they are allowed and refused by name when they are not. NaN and infinity are never allowed. */
final class Given {
    private Given() {}

    static double positive(String name, double value, String unit) {
        return value(name, value, value > 0, "above 0 " + unit);
    }

    static double notNegative(String name, double value, String unit) {
        return value(name, value, value >= 0, "0 " + unit + " or more");
    }

    static double finite(String name, double value, String unit) {
        return value(name, value, true, "a number of " + unit);
    }

    static double powerFactor(String name, double value) {
        return value(name, value, value > 0 && value <= 1, "above 0, up to 1");
    }

    /** A reactor's share of the capacitor's reactance: 0 for none, below 1. */
    static double reactorP(double value) {
        return value("reactorP", value, value >= 0 && value < 1, "0 (no reactor) or more, below 1");
    }

    static int order(int value) {
        return order(value, value >= 2, "a whole number from 2");
    }

    static int order(int value, boolean allowed, String what) {
        if (!allowed) {
            throw new IllegalArgumentException("order was " + value + "; allowed: " + what);
        }
        return value;
    }

    static double value(String name, double value, boolean allowed, String what) {
        if (!allowed || !Double.isFinite(value)) {
            throw new IllegalArgumentException(name + " was " + value + "; allowed: " + what);
        }
        return value;
    }
}
