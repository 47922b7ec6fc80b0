// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

/** Text of a file as messages show it. */
final class Texts {
    private static final int SHOWN = 60;

    private Texts() {}

    /** In quotes, without control characters, cut after {@value #SHOWN} characters. */
    static String quoted(String text) {
        String clean = text.replaceAll("\\p{Cntrl}", " ");
        return "\"" + (clean.length() > SHOWN ? clean.substring(0, SHOWN) + "…" : clean) + "\"";
    }
}
