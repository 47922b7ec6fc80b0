// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import java.util.ArrayList;
import java.util.List;
import tariff.correction.CapacitorBank;
import tariff.notice.Caution;

/** What a person must know wherever a bank is proposed. */
public final class BankCautions {
    private static final String PRACTICE = "common practice, no source";

    private BankCautions() {}

    public static List<Caution> of(CapacitorBank bank) {
        List<Caution> all = new ArrayList<>();
        all.add(new Caution(
                "screening-only",
                "This is a screening estimate from bills, not a design. A licensed engineer designs the installation.",
                PRACTICE));
        all.add(new Caution(
                "stored-energy",
                "Capacitors hold a lethal charge after they are switched off. Isolate, wait at least five minutes, test for absence of"
                        + " voltage, then short-circuit and earth each unit before anyone touches it.",
                "Oregon OAR 437-002-2322(1); IEC 60831-1 and NEC 460.6 on discharge, from memory"));
        all.add(new Caution(
                "qualified-persons",
                "Only qualified persons work on it, under local code, lock-out and permit.",
                "NFPA 70E or the local equivalent, from memory"));
        if (bank.reactorShare().signum() == 0) {
            all.add(new Caution(
                    "harmonics",
                    "A plain bank can resonate with the supply. Measure harmonics first where drives, rectifiers or other non-linear load"
                            + " are more than about 15 % of the load.",
                    "IEC 61642, from memory"));
        }
        if (bank.fixedKvar().signum() > 0) {
            all.add(new Caution(
                    "leading",
                    "What is always on may send kvarh back at night and at weekends; the utility may charge for them or forbid them, and"
                            + " the voltage rises.",
                    PRACTICE));
        }
        all.add(new Caution(
                "kwh",
                "No kWh savings are counted: a bank only lowers the losses between itself and the meter, usually well below 1 % of the kWh.",
                PRACTICE));
        all.add(new Caution(
                "utility-consent",
                "Ask the utility how it defines the billed power factor, whether it must be told, and whether ripple control is in use.",
                PRACTICE));
        return all;
    }
}
