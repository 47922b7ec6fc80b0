// SPDX-License-Identifier: Apache-2.0
package tariff.service.http;

import java.time.ZonedDateTime;

/** A day of interval data as it is uploaded. */
final class UploadedDay {
    static final String HOURLY = "ilha-verde-hourly";
    static final String ZONE = "America/Sao_Paulo";

    private UploadedDay() {}

    /** A day of hours: the first twelve at 100 kWh and 75 kvarh, PF 0.80; the others at 100 kWh and 10 kvarh. */
    static String csv() {
        StringBuilder rows = new StringBuilder("start,kWh,lagging kvarh\n");
        for (int hour = 0; hour < 24; hour++) {
            rows.append("2026-03-02 ").append(hour < 10 ? "0" : "").append(hour).append(":00,100,");
            rows.append(hour < 12 ? "75\n" : "10\n");
        }
        return rows.toString();
    }

    /** The same as a feed of NAESB REQ.21, in Wh and VArh. */
    static String feed() {
        long midnight = ZonedDateTime.parse("2026-03-02T00:00-03:00").toEpochSecond();
        StringBuilder feed = new StringBuilder("<feed xmlns=\"http://www.w3.org/2005/Atom\">");
        feed.append(channel("1", 72, 1)).append(channel("2", 73, 2));
        for (int hour = 0; hour < 24; hour++) {
            feed.append(block("1", midnight + 3600L * hour, 100_000));
            feed.append(block("2", midnight + 3600L * hour, hour < 12 ? 75_000 : 10_000));
        }
        return feed.append("</feed>").toString();
    }

    private static String channel(String number, int unit, int flow) {
        return "<entry><link rel='self' href='MeterReading/%1$s'/><link rel='related' href='ReadingType/%1$s'/><content><MeterReading/></content></entry>"
                        .formatted(number)
                + "<entry><link rel='self' href='ReadingType/%s'/><content><ReadingType><flowDirection>%d</flowDirection><uom>%d</uom></ReadingType></content></entry>"
                        .formatted(number, flow, unit);
    }

    private static String block(String number, long start, long value) {
        return ("<entry><link rel='up' href='MeterReading/%s'/><content><IntervalBlock><IntervalReading><timePeriod>"
                        + "<duration>3600</duration><start>%d</start></timePeriod><value>%d</value></IntervalReading></IntervalBlock></content></entry>")
                .formatted(number, start, value);
    }
}
