// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

/** Lines may be named only once they stand on the bill: further down is a mistake, except in an earlier month. */
final class LineNames {
    private LineNames() {}

    static void check(String name, Scope scope) {
        if (scope.lines().contains(name)) {
            return;
        }
        if (scope.names().lines().contains(name)) {
            scope.error(
                    "line-order",
                    "names the line \"" + name + "\", which is not above this one",
                    name,
                    Nearest.list(scope.lines()));
        } else {
            scope.unknown("line", name, scope.lines());
        }
    }
}
