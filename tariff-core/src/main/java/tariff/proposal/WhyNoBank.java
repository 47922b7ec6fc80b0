// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.util.Locale;
import tariff.bill.PowerFactorCost;
import tariff.correction.Estimate;
import tariff.payback.BreakEvenPrice;
import tariff.payback.Savings;
import tariff.payback.Venture;

/** Why no bank is the best answer. */
record WhyNoBank(PowerFactorCost today, SizingTerms terms, SizedBank bestBank, Estimate estimate) {

    String words() {
        if (today.toUnity().signum() <= 0) {
            return today.point().named() || today.point().billsApparent()
                    ? "no bank: the bills hold no cost of low power factor"
                    : "no bank: the rate bills nothing reactive";
        }
        SizedBank.Gain gain = bestBank.gain(estimate);
        if (gain.settledYear().signum() <= 0) {
            return "no bank: low power factor costs " + Words.money(today.toUnity())
                    + " a year, but no size up to " + Words.kvar(terms.choice().mostKvar())
                    + " saves anything by the " + estimate.name().toLowerCase(Locale.ROOT) + " estimate";
        }
        return "no bank: even the best size, " + Words.kvar(bestBank.kvar()) + " at "
                + Words.money(bestBank.investment().netCost()) + ", saves only "
                + Words.money(gain.settledYear()) + " a year and loses "
                + Words.money(gain.netPresentValue().negate()) + " over its life" + breakEven(gain);
    }

    private String breakEven(SizedBank.Gain gain) {
        Venture venture = new Venture(
                bestBank.investment(),
                new Savings(Worth.inOneMonth(gain.firstYear()), Worth.inOneMonth(gain.settledYear())),
                terms.outlook());
        return BreakEvenPrice.perKvar(venture, bestBank.kvar())
                .fold(price -> "; it would pay below " + Words.money(price) + " per kvar", why -> "");
    }
}
