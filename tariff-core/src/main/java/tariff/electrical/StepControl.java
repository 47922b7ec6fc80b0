// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/** How a controller and its steps meet the reactive load. */
public final class StepControl {
    /** Share of a step within which a controller leaves things alone. Common practice 0.6 to 0.7; must be above 0.5 or it hunts. */
    public static final double DEAD_BAND = 2.0 / 3;

    private StepControl() {}

    /**
     * The reactive power left over by a bank large enough, {@code 2/3 s} [kvar] either way.
     *
     * @param smallestStepKvar s [kvar], 0 or more
     * @throws IllegalArgumentException if it is negative
     */
    public static double residualKvar(double smallestStepKvar) {
        return DEAD_BAND * Given.notNegative("smallestStepKvar", smallestStepKvar, "kvar");
    }

    /**
     * C/k to set on a controller [A], {@code share × I_step / k}. Source: manual of a controller for share 1; 0.65 is from memory.
     *
     * @param share 1 for the step current itself, 0.65 where the controller does not apply its own dead band
     * @param stepAmps current of the smallest step [A], 0 or more
     * @param transformerRatio k, primary over secondary of the current transformer, above 0
     */
    public static double ck(double share, double stepAmps, double transformerRatio) {
        Given.value("share", share, share > 0 && share <= 1, "above 0, up to 1");
        return share
                * Given.notNegative("stepAmps", stepAmps, "A")
                / Given.positive("transformerRatio", transformerRatio, "(a ratio)");
    }
}
