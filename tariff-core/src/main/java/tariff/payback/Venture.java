// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

/**
 * A bank as its owner's money sees it: what it costs, what it saves, what the years ahead are expected to bring.
 */
public record Venture(Investment investment, Savings savings, Outlook outlook) {

    Venture with(Investment other) {
        return new Venture(other, savings, outlook);
    }

    Venture with(Savings other) {
        return new Venture(investment, other, outlook);
    }

    Venture with(Outlook other) {
        return new Venture(investment, savings, other);
    }
}
