// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;

/** What is allowed in a schedule but may not be meant: no value at all, a rise with the power factor, a cliff. */
final class ScheduleDoubts {
    private static final BigDecimal STEP = new BigDecimal("0.0001");
    private static final BigDecimal POINT = new BigDecimal("0.01");

    private ScheduleDoubts() {}

    static void check(Schedule schedule, Scope scope) {
        if (schedule.edges().isEmpty()
                || schedule.edges().stream()
                        .anyMatch(edge -> edge.signum() <= 0 || edge.compareTo(BigDecimal.ONE) > 0)) {
            return;
        }
        boolean nothing = true;
        boolean rises = false;
        for (BigDecimal pf = POINT; pf.compareTo(BigDecimal.ONE) <= 0; pf = pf.add(POINT)) {
            BigDecimal value = schedule.at(pf);
            BigDecimal next = schedule.at(pf.add(POINT).min(BigDecimal.ONE));
            nothing &= value.signum() == 0;
            if (!rises && next.compareTo(value) > 0) {
                rises = true;
                scope.warn(
                        "rises",
                        "goes up from " + Decimals.shown(value) + " to " + Decimals.shown(next)
                                + " as the power factor improves from " + Decimals.plain(pf) + " to "
                                + Decimals.plain(pf.add(POINT)) + "; a better power factor would cost more");
            }
        }
        if (nothing) {
            scope.warn("no-effect", "has no effect: it is 0 at every power factor");
        }
        jumps(schedule, scope);
    }

    /** A step at an edge that is larger than what a whole point is worth on either side of it. */
    private static void jumps(Schedule schedule, Scope scope) {
        BigDecimal largest = BigDecimal.ZERO;
        String words = "";
        int count = 0;
        for (BigDecimal edge : schedule.edges()) {
            BigDecimal below = edge.subtract(STEP);
            BigDecimal above = edge.add(STEP).min(BigDecimal.ONE);
            BigDecimal explained = change(schedule, below.subtract(POINT), below)
                    .max(change(schedule, above, above.add(POINT).min(BigDecimal.ONE)));
            for (BigDecimal from : new BigDecimal[] {below, edge}) {
                BigDecimal to = from.add(STEP).min(BigDecimal.ONE);
                BigDecimal jump = change(schedule, from, to);
                if (jump.compareTo(explained) > 0) {
                    count++;
                    if (jump.compareTo(largest) > 0) {
                        largest = jump;
                        words = "jumps from " + Decimals.shown(schedule.at(from)) + " to "
                                + Decimals.shown(schedule.at(to)) + " between power factor " + Decimals.shown(from)
                                + " and " + Decimals.shown(to);
                    }
                }
            }
        }
        if (count > 0) {
            scope.warn("jump", words + (count == 1 ? "" : ", the largest of " + count + " jumps"));
        }
    }

    private static BigDecimal change(Schedule schedule, BigDecimal from, BigDecimal to) {
        return schedule.at(to.max(STEP)).subtract(schedule.at(from.max(STEP))).abs();
    }
}
