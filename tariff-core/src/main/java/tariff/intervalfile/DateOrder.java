// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

/** How to read a date such as 3/4/2026. */
public enum DateOrder {
    DAY_FIRST,
    MONTH_FIRST
}
