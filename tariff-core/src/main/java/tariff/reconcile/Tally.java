// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

/**
 * How many months agree.
 *
 * @param agreeing to the cent or within rounding
 * @param toTheCent of those, to the cent
 * @param months of how many
 */
public record Tally(int agreeing, int toTheCent, int months) {

    /** {@code 9 of 12 months agree, 8 of them to the cent}. */
    public String words() {
        String count = agreeing + " of " + months + (months == 1 ? " month" : " months") + " agree";
        if (agreeing == 0) {
            return count;
        }
        if (agreeing == toTheCent) {
            return count + " to the cent";
        }
        return count + (toTheCent == 0 ? " within rounding" : ", " + toTheCent + " of them to the cent");
    }
}
