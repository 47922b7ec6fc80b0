// SPDX-License-Identifier: Apache-2.0
package tariff.service.request;

import java.math.BigDecimal;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeMap;
import tariff.electrical.Motor;
import tariff.electrical.SiteData;
import tariff.rate.clause.Written;

/**
 * What is known of the network at the bank's place.
 *
 * @param serviceVolts the voltage between lines [V]
 * @param site what screens are asked about
 * @param nonLinearShare part of the load that is drives, rectifiers and the like, 0 to 1
 * @param currentThd harmonic over fundamental current without the bank
 */
public record NetworkTerms(
        BigDecimal serviceVolts, SiteData site, Optional<BigDecimal> nonLinearShare, Optional<BigDecimal> currentThd) {
    private static final Range VOLTS = Range.from("50", "1000000", "V");
    private static final Range SHARE = Range.from("0", "1", "");
    private static final Range DISTORTION = Range.from("0", "5", "where 0.3 means 30 %");
    private static final Range HARMONIC = Range.from("0", "0.99", "where 0.03 means 3 %");
    private static final Range AMPS = Range.above("0", "100000", "A");
    private static final Range KVAR = Range.from("0", "100000", "kvar");
    private static final int MOST_ORDER = 50;
    private static final int MOST_MOTORS = 100;

    static NetworkTerms read(Written in) {
        SiteData.Builder site = SiteData.unknown();
        BigDecimal volts = VOLTS.required(in, "serviceVolts");
        site.serviceVolts(volts.doubleValue());
        for (SiteFigure figure : SiteFigure.values()) {
            figure.read(in, site);
        }
        Optional<BigDecimal> share = SHARE.optional(in, "nonLinearShare");
        Optional<BigDecimal> thd = DISTORTION.optional(in, "currentThd");
        thd.ifPresent(value -> site.currentThd(value.doubleValue()));
        site.harmonicVoltages(harmonics(in));
        motors(in, site);
        if (in.has("generators")) {
            site.generators(in.flag("generators"));
        }
        if (in.isObject()) {
            in.refuseOtherKeys();
        }
        return new NetworkTerms(volts, site.build(), share, thd);
    }

    private static Map<Integer, Double> harmonics(Written in) {
        Map<Integer, Double> shares = new TreeMap<>();
        in.named("harmonicVoltages", HARMONIC::of).forEach((name, share) -> {
            if (name.matches("[1-9]\\d?") && !name.equals("1") && Integer.parseInt(name) <= MOST_ORDER) {
                shares.put(Integer.parseInt(name), share.doubleValue());
            } else {
                in.at("harmonicVoltages")
                        .at(name)
                        .wrongAs("order", "is not the order of a harmonic", name, "whole numbers from 2 to 50");
            }
        });
        return shares;
    }

    /** No motor at all is said by an empty list. */
    private static void motors(Written in, SiteData.Builder site) {
        if (in.has("motors")) {
            Written motors = in.at("motors");
            int count = motors.entries().size();
            if (count > MOST_MOTORS) {
                motors.wrongAs("too-many", "has too many entries", String.valueOf(count), "at most " + MOST_MOTORS);
            }
            site.motors(motors.entries().stream().map(NetworkTerms::motor).toList());
        }
    }

    private static Motor motor(Written in) {
        Motor motor = new Motor(
                in.text("name"),
                VOLTS.required(in, "volts").doubleValue(),
                AMPS.optional(in, "noLoadAmps")
                        .map(amps -> OptionalDouble.of(amps.doubleValue()))
                        .orElse(OptionalDouble.empty()),
                KVAR.optional(in, "kvarAtTerminals").orElse(BigDecimal.ZERO).doubleValue());
        in.refuseOtherKeys();
        return motor;
    }
}
