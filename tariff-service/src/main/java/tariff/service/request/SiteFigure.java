// SPDX-License-Identifier: Apache-2.0
package tariff.service.request;

import java.util.function.BiConsumer;
import tariff.electrical.SiteData;
import tariff.rate.clause.Written;

/** A figure of a site that may be known, with its key; ranges are those of {@link SiteData}, with bounds beyond any real site. */
enum SiteFigure {
    TRANSFORMER("transformerKva", Range.from("1", "1000000", "kVA"), (to, value) -> to.transformerKva(value)),
    IMPEDANCE("impedancePercent", Range.from("0.1", "100", "%"), (to, value) -> to.impedancePercent(value)),
    LOAD_LOSS("loadLossKw", Range.from("0", "10000", "kW"), (to, value) -> to.loadLossKw(value)),
    SHORT_CIRCUIT("shortCircuitKva", Range.from("10", "100000000", "kVA"), (to, value) -> to.networkKva(value)),
    LIGHT_LOAD_VOLTS("lightLoadVolts", Range.from("50", "1000000", "V"), (to, value) -> to.lightLoadVolts(value)),
    FREQUENCY("frequencyHz", Range.from("10", "400", "Hz"), (to, value) -> to.frequencyHz(value)),
    PEAK("peakKw", Range.from("0.1", "1000000", "kW"), (to, value) -> to.peakKw(value)),
    DISPLACEMENT("displacementPowerFactor", Range.from("0.05", "1", ""), (to, value) -> to.displacementPf(value)),
    TARGET("targetPowerFactor", Range.from("0.5", "1", ""), (to, value) -> to.targetPf(value)),
    NET_KVARH(
            "netKvarhPerMonth",
            Range.from("-1000000000", "1000000000", "kvarh"),
            (to, value) -> to.netKvarhPerMonth(value)),
    LIGHTEST("lightestKvar", Range.from("0", "1000000", "kvar"), (to, value) -> to.lightestKvar(value)),
    NON_LINEAR("nonLinearKva", Range.from("0", "1000000", "kVA"), (to, value) -> to.nonLinearKva(value)),
    AMBIENT("ambientCelsius", Range.from("-60", "80", "°C"), (to, value) -> to.ambientCelsius(value));

    private final String key;
    private final Range range;
    private final BiConsumer<SiteData.Builder, Double> put;

    SiteFigure(String key, Range range, BiConsumer<SiteData.Builder, Double> put) {
        this.key = key;
        this.range = range;
        this.put = put;
    }

    void read(Written in, SiteData.Builder site) {
        range.optional(in, key).ifPresent(number -> put.accept(site, number.doubleValue()));
    }
}
