// SPDX-License-Identifier: Apache-2.0
package tariff.json;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import tariff.meter.MeteredMonth;
import tariff.meter.MeteredSite;
import tariff.meter.Period;
import tariff.meter.Site;
import tariff.notice.Finding;
import tariff.notice.Refusal;
import tariff.rate.clause.Written;

/** A site and its bills as JSON: {@code { "site": { … }, "months": [ … ] }}. */
public final class BillsJson {
    /** Ten years of months. */
    static final int MOST_MONTHS = 120;

    private BillsJson() {}

    /**
     * The bills in a document.
     *
     * @throws Refusal with everything that is wrong with them
     */
    public static MeteredSite read(byte[] json) {
        return read(JsonTree.read(json));
    }

    /**
     * The bills in a document already taken apart.
     *
     * @throws Refusal with everything that is wrong with them
     */
    public static MeteredSite read(@Nullable Object tree) {
        List<Finding> findings = new ArrayList<>();
        Written written = new Written(tree, "", findings::add);
        Optional<MeteredSite> bills = read(written, findings);
        written.refuseOtherKeys();
        if (!findings.isEmpty()) {
            throw new Refusal(findings);
        }
        return bills.orElseThrow();
    }

    /**
     * Reads the two keys and leaves others to the caller.
     *
     * @param findings where {@code in} reports what is wrong
     * @return empty if anything was
     */
    public static Optional<MeteredSite> read(Written in, List<Finding> findings) {
        int before = findings.size();
        Site site = in.has("site") ? SiteJson.read(in.at("site")) : Site.unnamed();
        List<MeteredMonth> months = new ArrayList<>();
        List<Written> entries = in.list("months");
        if (entries.size() > MOST_MONTHS) {
            in.at("months").wrong("too-many-months", "holds " + entries.size() + " periods", "at most " + MOST_MONTHS);
            return Optional.empty();
        }
        Overlaps overlaps = new Overlaps();
        for (Written each : entries) {
            MonthJson.read(each).ifPresent(month -> {
                overlaps.check(each, month.period());
                months.add(month);
            });
        }
        return findings.size() == before ? Optional.of(new MeteredSite(site, months)) : Optional.empty();
    }

    /** The bills as a document that {@link #read(byte[])} reads back to the same bills. */
    public static byte[] write(MeteredSite bills) {
        return JsonText.write(new JsonObject()
                .with("site", SiteJson.write(bills.site()))
                .withAll("months", bills.months(), MonthJson::write)
                .entries());
    }

    /** Keeps two periods from claiming the same day, in any order. */
    private static final class Overlaps {
        private final Map<Period, String> seen = new LinkedHashMap<>();

        void check(Written in, Period period) {
            for (Map.Entry<Period, String> other : seen.entrySet()) {
                if (other.getKey().overlap(period) > 0) {
                    in.wrongAs(
                            "overlap",
                            "bills days that " + other.getValue() + " bills too",
                            period.toString(),
                            "days outside " + other.getKey());
                    return;
                }
            }
            seen.put(period, in.pointer());
        }
    }
}
