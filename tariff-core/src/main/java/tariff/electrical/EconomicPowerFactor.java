// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

/**
 * The power factor at which one more kvar costs what it saves, where kVA alone are billed. Of no use for a rate with a threshold:
 * there the optimum is the threshold. Prices are plain numbers in any one currency. Source: Mehta &amp; Mehta, Principles of
 * Power System, ch. 6, sections on the most economical power factor.
 */
public final class EconomicPowerFactor {
    private EconomicPowerFactor() {}

    /**
     * {@code cos φ2} with {@code sin φ2 = y / x}, whatever the load and its present power factor.
     *
     * @param perKvaYear x, charge for a kVA and year, above 0
     * @param perKvarYear y, yearly cost of a kvar, 0 or more; at x and above, correction never pays
     * @return in (0, 1]
     * @throws IllegalArgumentException if x is not positive, or y not in [0, x)
     */
    public static double of(double perKvaYear, double perKvarYear) {
        Given.positive("perKvaYear", perKvaYear, "per kVA and year");
        Given.value(
                "perKvarYear",
                perKvarYear,
                perKvarYear >= 0 && perKvarYear < perKvaYear,
                "0 or more, below perKvaYear");
        double sine = perKvarYear / perKvaYear;
        return Math.sqrt((1 - sine) * (1 + sine));
    }

    /**
     * The price of a kvar at which correcting costs as much as building kVA instead,
     * {@code x (1/cos φ1 − 1/cos φ2) / (tan φ1 − tan φ2)}.
     *
     * @param perKva x, cost of a kVA of plant, 0 or more
     * @throws IllegalArgumentException if the target is not above the present power factor
     */
    public static double breakEvenPerKvar(double perKva, double presentPf, double targetPf) {
        Given.notNegative("perKva", perKva, "per kVA");
        Given.powerFactor("presentPf", presentPf);
        Given.value("targetPf", targetPf, targetPf > presentPf && targetPf <= 1, "above presentPf, up to 1");
        return perKva
                * (1 / presentPf - 1 / targetPf)
                / (PowerTriangle.tanPhi(presentPf) - PowerTriangle.tanPhi(targetPf));
    }
}
