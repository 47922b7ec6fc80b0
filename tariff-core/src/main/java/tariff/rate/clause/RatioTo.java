// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.util.List;
import java.util.Optional;
import tariff.meter.Triangle;

/**
 * k × (target ÷ PF − 1): {@code "ratioTo": 0.90, "below": 60, "above": 25}. With k = 100 a raised kW is kW × target ÷ PF. Above the target
 * the ratio is negative, so a positive k gives a credit there. {@code "onlyBelow"} leaves the value at zero from that power factor on,
 * for rates that divide by the power factor only once it is low.
 *
 * @param below k under the target, 100 unless written
 * @param above k over the target, 0 unless written
 */
record RatioTo(
        String powerFactor,
        BigDecimal ratioTo,
        BigDecimal below,
        BigDecimal above,
        Optional<BigDecimal> onlyBelow,
        Limits limits)
        implements Schedule {

    static RatioTo read(Written in, String powerFactor, Limits limits) {
        return new RatioTo(
                powerFactor,
                Schedule.edge(in, "ratioTo"),
                in.optionalNumber("below").orElse(BigDecimal.valueOf(100)),
                in.optionalNumber("above").orElse(BigDecimal.ZERO),
                in.has("onlyBelow") ? Optional.of(Schedule.edge(in, "onlyBelow")) : Optional.empty(),
                limits);
    }

    @Override
    public void checkKind(Scope scope) {}

    @Override
    public BigDecimal plain(BigDecimal pf) {
        int side = pf.compareTo(ratioTo);
        if (side == 0 || (onlyBelow.isPresent() && pf.compareTo(onlyBelow.get()) >= 0)) {
            return BigDecimal.ZERO;
        }
        BigDecimal k = side < 0 ? below : above;
        return k.signum() == 0
                ? BigDecimal.ZERO
                : k.multiply(ratioTo.subtract(pf)).divide(pf, Triangle.PRECISION);
    }

    @Override
    public Optional<BigDecimal> target() {
        return below.signum() > 0 ? Optional.of(onlyBelow.orElse(ratioTo).min(BigDecimal.ONE)) : Optional.empty();
    }

    @Override
    public List<BigDecimal> edges() {
        return java.util.stream.Stream.concat(java.util.stream.Stream.of(ratioTo), onlyBelow.stream())
                .sorted()
                .toList();
    }

    @Override
    public String words(String unit) {
        String ratio = " × (" + Decimals.plain(ratioTo) + " ÷ the " + powerFactor + " power factor − 1) " + unit;
        String where = onlyBelow
                .map(edge -> " (only below " + Decimals.plain(edge) + ")")
                .orElse("");
        String over = above.signum() == 0 ? "" : ", and " + Decimals.plain(above) + ratio + " over it";
        return Decimals.plain(below) + ratio + " under " + Decimals.plain(ratioTo) + where + over + limits.words(unit);
    }
}
