// SPDX-License-Identifier: Apache-2.0
package tariff.service.request;

import java.math.BigDecimal;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import tariff.proposal.Claim;
import tariff.proposal.KvarClaim;
import tariff.proposal.KwClaim;
import tariff.proposal.KwhClaim;
import tariff.proposal.PaybackClaim;
import tariff.proposal.PlainBankClaim;
import tariff.proposal.PowerFactorClaim;
import tariff.proposal.SavingsByPart;
import tariff.proposal.SavingsClaim;
import tariff.rate.clause.Nearest;
import tariff.rate.clause.Written;

/** What an offer may claim, by the key that says it. */
enum ClaimKind {
    SAVINGS("yearlySavings", in -> savings(in, Ranges.MONEY.of(in.at("yearlySavings")), false)),
    SHARE("savingsShare", in -> savings(in, Ranges.SHARE.of(in.at("savingsShare")), true)),
    PARTS("savingsByPart", ClaimKind::parts),
    YEARS("paybackYears", in -> new PaybackClaim(Ranges.YEARS.of(in.at("paybackYears")))),
    MONTHS("paybackMonths", in -> PaybackClaim.months(in.at("paybackMonths").wholeNumber(1, 1200))),
    POWER_FACTOR("powerFactor", in -> new PowerFactorClaim(Ranges.POWER_FACTOR.of(in.at("powerFactor")))),
    KVAR("kvar", in -> new KvarClaim(Ranges.MONEY.of(in.at("kvar")))),
    KW("kwLess", in -> new KwClaim(Ranges.MONEY.of(in.at("kwLess")))),
    KWH("yearlyKwhLess", in -> KwhClaim.yearly(Ranges.MONEY.of(in.at("yearlyKwhLess")))),
    KWH_SHARE("kwhShareLess", in -> KwhClaim.share(Ranges.SHARE.of(in.at("kwhShareLess")))),
    NO_REACTOR("noReactor", ClaimKind::noReactor);

    private final String key;
    private final Function<Written, Claim> read;

    /** What the figures of claims may be; not one of them need be true. */
    private static final class Ranges {
        static final Range MONEY = Range.from("0", "1000000000000", "");
        static final Range SHARE = Range.from("0", "1", "where 0.1 means 10 %");
        static final Range YEARS = Range.above("0", "100", "years");
        static final Range POWER_FACTOR = Range.above("0", "1", "");
    }

    ClaimKind(String key, Function<Written, Claim> read) {
        this.key = key;
        this.read = read;
    }

    /** The claim that an object makes; empty if it makes none, which is reported. */
    static Optional<Claim> read(Written in) {
        Optional<ClaimKind> kind =
                Stream.of(values()).filter(each -> in.has(each.key)).findFirst();
        if (kind.isEmpty()) {
            Map<String, ClaimKind> keys = Stream.of(values())
                    .collect(Collectors.toMap(each -> each.key, each -> each, (a, b) -> a, java.util.TreeMap::new));
            String hint = in.keys().stream()
                    .limit(1)
                    .map(written -> Nearest.hint(written, keys.keySet()))
                    .collect(Collectors.joining());
            in.wrong("claim", "makes no claim that is known" + hint, Nearest.list(keys.keySet()));
            return Optional.empty();
        }
        Claim claim = kind.get().read.apply(in);
        for (ClaimKind other : values()) {
            if (other != kind.get() && in.has(other.key)) {
                in.at(other.key).wrong("two-claims", "is a second claim in one object", "an object for each claim");
            }
        }
        in.refuseOtherKeys();
        return Optional.of(claim);
    }

    private static Claim savings(Written in, BigDecimal amount, boolean ofBill) {
        return new SavingsClaim(amount, ofBill, !in.flag("onceSettled"));
    }

    private static Claim parts(Written in) {
        Map<String, BigDecimal> parts = in.named("savingsByPart", Ranges.MONEY::of);
        if (parts.isEmpty()) {
            in.at("savingsByPart").wrong("empty", "is empty", "at least one part with its money a year");
        }
        return new SavingsByPart(parts);
    }

    private static Claim noReactor(Written in) {
        if (!in.flag("noReactor")) {
            in.at("noReactor").wrong("claim", "claims nothing", "true");
        }
        return new PlainBankClaim();
    }
}
