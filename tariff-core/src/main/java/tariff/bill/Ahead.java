// SPDX-License-Identifier: Apache-2.0
package tariff.bill;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Optional;
import tariff.bill.Staircase.Place;
import tariff.bill.Staircase.Step;

/**
 * Looks for jumps and for the flat end of a month's bill by billing it again and again. Half a point of power factor is looked at in one go;
 * of two jumps within it the larger is found.
 *
 * <p>A step is a jump larger than all else that the point (0.01) around it takes off the bill, and larger than what rounding to the cent
 * moves. Rounding the billed kW of a large site is therefore no step, a band or a started point is one.
 */
final class Ahead {
    private static final BigDecimal STRIDE = new BigDecimal("0.005");
    private static final BigDecimal NARROW = new BigDecimal("0.0000001");
    private static final BigDecimal TWO = BigDecimal.valueOf(2);
    private static final BigDecimal CENT = new BigDecimal("0.01");
    private static final BigDecimal SMALLEST_SHARE = new BigDecimal("0.00001");
    private static final int FLAT_DECIMALS = 4;
    private static final int STEP_DECIMALS = 7;

    private final MonthCurve curve;
    private final BigDecimal room;
    private final BigDecimal smallestJump;

    Ahead(MonthCurve curve) {
        this.curve = curve;
        this.room = curve.room();
        this.smallestJump =
                curve.bill(BigDecimal.ZERO).abs().multiply(SMALLEST_SHARE).max(CENT.multiply(TWO));
    }

    /** The first jump of the bill. */
    Optional<Step> nextStep() {
        for (BigDecimal low = BigDecimal.ZERO; low.compareTo(room) < 0; low = low.add(STRIDE)) {
            Optional<Step> step = stepWithin(low, low.add(STRIDE).min(room));
            if (step.isPresent()) {
                return step;
            }
        }
        return Optional.empty();
    }

    /** The place from which on the bill stays within a cent of that at unity; its power factor is rounded up to four decimals. */
    Optional<Place> flat() {
        BigDecimal high = room;
        BigDecimal low = room.subtract(NARROW)
                .max(BigDecimal.ZERO)
                .divideToIntegralValue(STRIDE)
                .multiply(STRIDE);
        while (atItsEnd(low)) {
            if (low.signum() == 0) {
                return Optional.empty();
            }
            high = low;
            low = low.subtract(STRIDE).max(BigDecimal.ZERO);
        }
        while (high.subtract(low).compareTo(NARROW) > 0) {
            BigDecimal middle = low.add(high).divide(TWO);
            if (atItsEnd(middle)) {
                high = middle;
            } else {
                low = middle;
            }
        }
        return Optional.of(Place.at(curve, roundest(low, high, FLAT_DECIMALS)));
    }

    private boolean atItsEnd(BigDecimal by) {
        return change(by, room).abs().compareTo(CENT) <= 0;
    }

    private Optional<Step> stepWithin(BigDecimal from, BigDecimal to) {
        BigDecimal enough = change(from, to).abs().divide(TWO).max(smallestJump);
        BigDecimal low = from;
        BigDecimal high = to;
        while (high.subtract(low).compareTo(NARROW) > 0) {
            if (change(low, high).abs().compareTo(enough) < 0) {
                return Optional.empty();
            }
            BigDecimal middle = low.add(high).divide(TWO);
            if (change(low, middle).abs().compareTo(change(middle, high).abs()) > 0) {
                high = middle;
            } else {
                low = middle;
            }
        }
        BigDecimal jump = change(low, high);
        return isStep(jump, low, high) ? Optional.of(step(low, high, jump)) : Optional.empty();
    }

    private boolean isStep(BigDecimal jump, BigDecimal low, BigDecimal high) {
        BigDecimal around = change(
                low.subtract(STRIDE).max(BigDecimal.ZERO), high.add(STRIDE).min(room));
        return jump.abs().compareTo(smallestJump) > 0
                && around.subtract(jump).abs().compareTo(jump.abs()) < 0;
    }

    /** Named by the roundest power factor that lies in the narrow place of the jump. */
    private Step step(BigDecimal low, BigDecimal high, BigDecimal jump) {
        BigDecimal place = roundest(low, high, STEP_DECIMALS);
        boolean beyond = change(low, place).abs().compareTo(change(place, high).abs()) < 0;
        return new Step(Place.at(curve, place), beyond, jump);
    }

    /** What the bill loses from one place to a better one. */
    private BigDecimal change(BigDecimal low, BigDecimal high) {
        return curve.bill(low).subtract(curve.bill(high));
    }

    /** The improvement to the power factor with the fewest decimals within two places; the better of them if the month has none. */
    private BigDecimal roundest(BigDecimal low, BigDecimal high, int decimals) {
        Optional<BigDecimal> start = curve.powerFactor(BigDecimal.ZERO);
        if (start.isEmpty() || start.get().add(high).compareTo(BigDecimal.ONE) > 0) {
            return high;
        }
        for (int places = 2; places < decimals; places++) {
            BigDecimal round = start.get().add(low).setScale(places, RoundingMode.CEILING);
            if (round.compareTo(start.get().add(high)) <= 0) {
                return round.subtract(start.get());
            }
        }
        BigDecimal up = start.get().add(high).setScale(decimals, RoundingMode.CEILING);
        return up.subtract(start.get());
    }
}
