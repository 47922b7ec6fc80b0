// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import tariff.notice.Finding;

/** Recognises columns of figures by the unit and the words of their headers. */
final class Headers {
    private static final Pattern UNIT = Pattern.compile("(?<![a-z])([km]?)(varh|var|wh|w)(?![a-z])");
    private static final Pattern LEADING = Pattern.compile("lead|capac|kapaz");
    private static final Pattern LAGGING = Pattern.compile("lag|induc|indukt");
    private static final Pattern EXPORTED = Pattern.compile("export|fed.?in|feed.?in|sent|generat");

    private final Notices notices;
    private final IntervalFileOptions options;
    private final Map<Role, Layout.Figures> found = new EnumMap<>(Role.class);

    Headers(IntervalFileOptions options, Notices notices) {
        this.options = options;
        this.notices = notices;
    }

    Map<Role, Layout.Figures> recognise(List<String> headers) {
        options.columns().forEach((role, name) -> stated(role, name, headers));
        for (int column = 0; column < headers.size(); column++) {
            String header = headers.get(column);
            if (!options.columns().containsValue(header)) {
                byWords(column, header);
            }
        }
        complete(headers);
        return found;
    }

    private void complete(List<String> headers) {
        if (!found.containsKey(Role.ACTIVE)) {
            missing("a column of kWh or kW", Role.ACTIVE, headers);
        }
        if (!found.containsKey(Role.REACTIVE) && !found.containsKey(Role.LAGGING)) {
            missing("a column of lagging kvarh or kvar", Role.LAGGING, headers);
        }
        if (found.containsKey(Role.REACTIVE) && (found.containsKey(Role.LAGGING) || found.containsKey(Role.LEADING))) {
            notices.error(
                    "column-twice",
                    "headers",
                    "\"" + header(Role.REACTIVE)
                            + "\" stands beside a lagging or a leading column; name the columns to use");
        }
    }

    private void missing(String what, Role role, List<String> headers) {
        notices.add(Finding.error("column-missing", "headers", what + " is missing; name the column of " + role.words())
                .found(Texts.quoted(String.join(", ", headers))));
    }

    private String header(Role role) {
        return Optional.ofNullable(found.get(role)).map(Layout.Figures::header).orElse("");
    }

    private void stated(Role role, String name, List<String> headers) {
        int column = headers.indexOf(name);
        if (column < 0) {
            notices.error(
                    "column-missing", "headers", "there is no column " + Texts.quoted(name) + " for " + role.words());
            return;
        }
        Matcher unit = unit(name);
        boolean known = unit.find();
        found.put(role, figures(column, name, known ? unit.group(1) : "k", known ? unit.group(2) : "wh"));
    }

    private void byWords(int column, String header) {
        String lower = header.toLowerCase(Locale.ROOT);
        Matcher unit = unit(header);
        if (!unit.find()) {
            return;
        }
        boolean reactive = unit.group(2).startsWith("var");
        Role role;
        if (reactive) {
            role = LEADING.matcher(lower).find()
                    ? Role.LEADING
                    : LAGGING.matcher(lower).find() ? Role.LAGGING : Role.REACTIVE;
        } else {
            role = EXPORTED.matcher(lower).find() ? Role.EXPORTED : Role.ACTIVE;
        }
        if (options.columns().containsKey(role)) {
            return;
        }
        Layout.Figures next = figures(column, header, unit.group(1), unit.group(2));
        Layout.Figures other = found.putIfAbsent(role, next);
        if (other != null) {
            notices.error(
                    "column-twice",
                    "headers",
                    Texts.quoted(other.header()) + " and " + Texts.quoted(header) + " could both be " + role.words()
                            + "; name the column to use");
        }
    }

    private static Matcher unit(String header) {
        return UNIT.matcher(header.toLowerCase(Locale.ROOT));
    }

    private static Layout.Figures figures(int column, String header, String prefix, String unit) {
        int exponent = prefix.equals("k") ? 0 : prefix.equals("m") ? 3 : -3;
        return new Layout.Figures(column, header, exponent, !unit.endsWith("h"));
    }
}
