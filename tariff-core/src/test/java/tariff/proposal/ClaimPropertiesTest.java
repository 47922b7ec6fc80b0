// SPDX-License-Identifier: Apache-2.0
package tariff.proposal;

import static org.assertj.core.api.Assertions.assertThat;
import static tariff.meter.Register.LEADING_KVARH;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import tariff.bill.Billing;
import tariff.correction.CapacitorBank;
import tariff.correction.Estimate;
import tariff.json.RateFile;
import tariff.meter.MeteredMonth;
import tariff.meter.Site;
import tariff.payback.Appraisal;
import tariff.payback.Investment;

class ClaimPropertiesTest {

    static IntStream seeds() {
        return IntStream.rangeClosed(1, 120);
    }

    private static Billing billing(Random random) {
        return new Billing(RateFile.parse(RandomYears.rate(random)), Site.unnamed());
    }

    private static CapacitorBank bank(Random random) {
        return RandomYears.shape(random).of(BigDecimal.valueOf(10 + random.nextInt(200)));
    }

    private static Proposal proposal(CapacitorBank bank, BigDecimal price) {
        Investment investment = Investment.plain(price, price.multiply(new BigDecimal("0.02")), 10);
        return new Proposal(bank, Optional.of(investment), RandomYears.outlook());
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void whatWeWouldSayOurselvesHolds(int seed) {
        Random random = new Random(seed);
        Billing billing = billing(random);
        List<MeteredMonth> year = RandomYears.year(random);
        Proposal proposal = proposal(bank(random), new BigDecimal("5000"));
        Assessment ours = Assessment.of(billing, year, proposal);
        List<Claim> claims = new ArrayList<>();
        for (Estimate estimate : List.of(Estimate.LOW, Estimate.CENTRAL)) {
            BankSavings savings = ours.savings(estimate);
            claims.add(SavingsClaim.settled(savings.settledYearTotal()));
            claims.add(SavingsClaim.yearly(savings.firstYearTotal().min(savings.settledYearTotal())));
            Appraisal appraisal = ours.appraisals().get(estimate);
            appraisal.simplePaybackYears().optional().ifPresent(years -> claims.add(new PaybackClaim(years)));
            appraisal.payback().lasting().optional().ifPresent(months -> claims.add(PaybackClaim.months(months)));
        }
        claims.add(KwhClaim.share(BigDecimal.ZERO));
        claims.add(new KwClaim(BigDecimal.ZERO));
        Offer offer = Offer.of(proposal, claims.toArray(Claim[]::new));
        assertThat(ClaimReview.of(billing, year, offer).claims().subList(0, claims.size()))
                .allSatisfy(reviewed ->
                        assertThat(reviewed.verdict()).as(reviewed.words()).isInstanceOf(Verdict.Holds.class));
    }

    /** A bank takes away what lags, so it can at most undo the way to unity; what it adds on the leading side only costs. */
    @ParameterizedTest
    @MethodSource("seeds")
    void noBankSavesMoreThanUnityIsWorth(int seed) {
        Random random = new Random(seed);
        Billing billing = billing(random);
        List<MeteredMonth> year = RandomYears.year(random).stream()
                .map(month -> month.with(LEADING_KVARH, 0))
                .toList();
        Assessment assessment = Assessment.of(billing, year, Proposal.of(bank(random)));
        for (Estimate estimate : Estimate.values()) {
            assertThat(assessment.savings(estimate).settledYearTotal())
                    .isLessThanOrEqualTo(assessment.today().toUnity());
        }
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void aDearerBankNeverPaysBackSooner(int seed) {
        Random random = new Random(seed);
        Billing billing = billing(random);
        List<MeteredMonth> year = RandomYears.year(random);
        CapacitorBank bank = bank(random);
        BigDecimal before = BigDecimal.ZERO;
        for (String price : List.of("1000", "3000", "9000")) {
            Appraisal appraisal = Assessment.of(billing, year, proposal(bank, new BigDecimal(price)))
                    .appraisals()
                    .get(Estimate.CENTRAL);
            BigDecimal years = appraisal.simplePaybackYears().optional().orElse(BigDecimal.valueOf(Integer.MAX_VALUE));
            assertThat(years).isGreaterThanOrEqualTo(before);
            before = years;
        }
    }
}
