// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.math.BigDecimal;
import java.util.List;
import tariff.correction.CapacitorBank;
import tariff.proposal.Reviewed.Working;

/**
 * The bank gives so many kvar where it stands.
 *
 * @param kvar at the service voltage, 0 or more
 */
public record KvarClaim(BigDecimal kvar) implements Claim {

    @Override
    public String words() {
        return "gives " + Words.kvar(kvar);
    }

    @Override
    public Reviewed review(Evidence evidence) {
        CapacitorBank bank = evidence.bank();
        BigDecimal effective = bank.effectiveKvar();
        List<Working> working = List.of(
                new Working("rated", Words.kvar(bank.ratedKvar())),
                new Working("at the service voltage", Words.kvar(effective)));
        boolean enough = kvar.compareTo(effective) <= 0;
        if (bank.ratedVolts().isPresent() != bank.serviceVolts().isPresent()) {
            return new Reviewed(
                    this,
                    new Verdict.CannotTell(
                            bank.ratedVolts().isPresent()
                                    ? "the voltage at the place"
                                    : "the voltage that the kvar are rated at"),
                    working,
                    List.of());
        }
        if (!enough) {
            return new Reviewed(
                    this,
                    new Verdict.BeyondPhysics(
                            effective,
                            "exceeds what physics can give: " + Words.kvar(bank.ratedKvar()) + " rated are "
                                    + Words.kvar(effective) + " at the service voltage"),
                    working,
                    kvar.compareTo(bank.ratedKvar()) <= 0 ? List.of(Slip.RATED_NOT_EFFECTIVE) : List.of());
        }
        return new Reviewed(
                this,
                bank.ratedVolts().isPresent()
                        ? new Verdict.Holds(
                                "holds: the bank gives " + Words.kvar(effective) + " at the service voltage")
                        : new Verdict.HoldsOnlyIf("holds only if the kvar are rated at the service voltage"),
                working,
                List.of());
    }
}
