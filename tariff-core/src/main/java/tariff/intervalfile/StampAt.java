// SPDX-License-Identifier: Apache-2.0
package tariff.intervalfile;

/** Which end of its interval a stamp marks. */
public enum StampAt {
    START,
    END
}
