// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import java.util.function.DoubleUnaryOperator;

/**
 * What steps leave and send back on the whole, in kvarh, where a controller may only switch whole ones.
 *
 * <p>With L(x) the kvarh of the load above x kvar: between k and k + 1 equal steps of s kvar, the next one comes in somewhere from one to
 * two thirds of a step, for a controller that waits for two thirds either way leaves it open on which side it stands. With θ the load at
 * which it changes, it leaves ∫(q − ks) over ks &lt; q &lt; θ, which is L(ks) − L(θ) + (θ − ks) L′(θ), and sends back ∫((k + 1)s − q) over
 * θ &lt; q &lt; (k + 1)s, which is L((k + 1)s) − L(θ) − ((k + 1)s − θ) L′(θ); integrating by parts over θ takes the derivative out. Own
 * derivation.
 *
 * @param unsupplied what stays lagging of the load that the steps should have carried, and all that is above them
 * @param oversupplied what they give that the load does not take
 */
record Stepping(double unsupplied, double oversupplied) {
    private static final int MOST_LEVELS = 24;

    /**
     * @param left L, kvarh of the load above so many kvar
     * @param switchedKvar all steps together, above zero
     * @param stepKvar how far apart what the steps can give lies, above zero
     */
    static Stepping of(DoubleUnaryOperator left, double switchedKvar, double stepKvar) {
        long exact = Math.max(1, Math.round(switchedKvar / stepKvar));
        int levels = (int) Math.min(MOST_LEVELS, exact);
        double step = switchedKvar / levels;
        double unsupplied = 0;
        double oversupplied = 0;
        for (int k = 0; k < levels; k++) {
            double base = k * step;
            double top = base + step;
            double from = base + step / 3;
            double to = base + 2 * step / 3;
            double atFrom = left.applyAsDouble(from);
            double atTo = left.applyAsDouble(to);
            double twice = (atFrom + 4 * left.applyAsDouble((from + to) / 2) + atTo) / 3;
            double width = to - from;
            unsupplied += left.applyAsDouble(base) - twice + ((to - base) * atTo - (from - base) * atFrom) / width;
            oversupplied += left.applyAsDouble(top) - twice + ((top - from) * atFrom - (top - to) * atTo) / width;
        }
        double finer = (double) levels / exact;
        return new Stepping(
                left.applyAsDouble(switchedKvar) + finer * Math.max(0, unsupplied), finer * Math.max(0, oversupplied));
    }

    /**
     * What is sent back of the oversupply, where the controller aims at some lagging load that takes up the rest: for an excess that lies
     * evenly between nothing and two thirds of a step, and an aim of a kvar, the share (1 − a ÷ (2s ÷ 3))². Own derivation.
     */
    double sentBack(double aimKvar, double stepKvar) {
        double share = 1 - Math.min(1, aimKvar / (2 * stepKvar / 3));
        return oversupplied * share * share;
    }
}
