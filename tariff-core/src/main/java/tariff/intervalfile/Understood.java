// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

import java.util.Map;

/** A file whose columns and stamps are understood, before its rows are put in their places in time. */
record Understood(Map<Role, Layout.Figures> figures, RawColumns rows, Timeline time) {}
