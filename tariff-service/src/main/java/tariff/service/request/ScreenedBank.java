// SPDX-License-Identifier: Apache-2.0
package tariff.service.request;

import java.math.BigDecimal;
import java.util.List;
import java.util.function.Consumer;
import java.util.stream.Stream;
import tariff.electrical.BankAtSite;
import tariff.electrical.BankData;
import tariff.electrical.BankData.Switching;
import tariff.notice.Finding;

/** A bank as screens take it: what is always on is one more step, and kvar without a rated voltage are kvar at the service voltage. */
record ScreenedBank(BankTerms bank, NetworkTerms network) {
    private static final int MOST_STEPS = 24;
    private static final BigDecimal LEAST_STEP = new BigDecimal("0.01");

    /** Whether the two go together; what does not is reported. */
    boolean check(Consumer<Finding> findings) {
        int before = steps().size();
        boolean right = before <= MOST_STEPS;
        if (!right) {
            findings.accept(Finding.error("too-many", "/bank/stepsKvar", "has more steps than can be screened")
                    .found(String.valueOf(before))
                    .allowed("at most " + MOST_STEPS + ", what is always on counting as one"));
        }
        if (steps().stream().anyMatch(step -> step.compareTo(LEAST_STEP) < 0)) {
            right = false;
            findings.accept(Finding.error("range", "/bank", "has a step too small to be screened")
                    .allowed(LEAST_STEP + " kvar or more"));
        }
        if (bank.serviceVolts()
                .filter(volts -> volts.compareTo(network.serviceVolts()) != 0)
                .isPresent()) {
            right = false;
            findings.accept(Finding.error("disagree", "/network/serviceVolts", "is not what /bank/serviceVolts says")
                    .found(network.serviceVolts().toPlainString())
                    .allowed(bank.serviceVolts().orElseThrow().toPlainString()));
        }
        return right;
    }

    BankAtSite atSite() {
        BankTerms.Duty duty = bank.duty().orElse(BankTerms.Duty.UNKNOWN);
        BankData data = new BankData(
                steps().stream().map(BigDecimal::doubleValue).toList(),
                bank.ratedVolts().orElse(network.serviceVolts()).doubleValue(),
                bank.reactorShare().doubleValue(),
                bank.stepsKvar().isEmpty() ? Switching.FIXED : Switching.AUTOMATIC,
                bank.wattsPerKvar().doubleValue(),
                duty.operationsPerDay().stream()
                        .mapToDouble(BigDecimal::doubleValue)
                        .findFirst(),
                duty.conductorAmps().stream()
                        .mapToDouble(BigDecimal::doubleValue)
                        .findFirst(),
                duty.temperatureClass());
        return new BankAtSite(network.site(), data);
    }

    private List<BigDecimal> steps() {
        Stream<BigDecimal> fixed =
                bank.fixedKvar().signum() > 0 ? Stream.of(bank.fixedKvar()) : Stream.<BigDecimal>empty();
        return Stream.concat(fixed, bank.stepsKvar().stream()).toList();
    }
}
