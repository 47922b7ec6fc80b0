// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

/** Lines may be named only once they stand on the bill: further down is a mistake, except in an earlier month. */
final class LineNames {
    private LineNames() {}

    static void check(String name, Scope scope) {
        if (scope.lines().contains(name)) {
            return;
        }
        String allowed = scope.lines().isEmpty() ? "none, for no line is above" : Nearest.list(scope.lines());
        if (scope.names().lines().contains(name)) {
            scope.error("line-order", "names the line \"" + name + "\", which is not above this one", name, allowed);
        } else {
            scope.error(
                    "unknown-name",
                    "there is no line \"" + name + "\"" + Nearest.hint(name, scope.lines()),
                    name,
                    allowed);
        }
    }
}
