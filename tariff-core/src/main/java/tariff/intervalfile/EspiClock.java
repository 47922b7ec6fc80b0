// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import java.time.Instant;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.util.Optional;
import tariff.notice.Finding;

/** The clock of a feed's bill: moments are in UTC, and what the feed says of its meter's clock may be all that is needed. */
record EspiClock(EspiFeed feed, Notices notices) {

    /**
     * The stated zone; without one the feed's offset, if its clock knows no summer time. Nothing is left once findings say why.
     *
     * @param first when the data begin
     */
    Optional<ZoneId> zone(Optional<ZoneId> stated, Instant first) {
        Optional<ZoneOffset> winter = feed.winterOffset().map(ZoneOffset::ofTotalSeconds);
        if (stated.isPresent()) {
            ZoneOffset standard = stated.get().getRules().getStandardOffset(first);
            if (winter.isPresent() && !winter.get().equals(standard)) {
                notices.warning(
                        "zone-differs",
                        "",
                        "the feed's clock is " + winter.get() + " in winter, that of " + stated.get() + " " + standard);
            }
            return stated;
        }
        if (winter.isPresent() && !feed.hasSummerTime()) {
            return Optional.of(winter.get());
        }
        notices.add(Finding.error("zone", "", "the time zone of the bill is not known")
                .found(winter.map(offset -> offset + " with summer time").orElse("nothing"))
                .allowed("name one, such as Europe/Berlin, or a fixed offset such as +01:00"));
        return Optional.empty();
    }
}
