// SPDX-License-Identifier: Apache-2.0
package tariff.service.command;

/** What the exit codes mean. */
public final class Exit {
    /** Answered. */
    public static final int OK = 0;
    /** A file cannot be read or written, or is not what it should be at all. */
    public static final int UNUSABLE_FILE = 1;
    /** There are findings, one a line on the standard error. */
    public static final int FINDINGS = 2;
    /** The command line itself is wrong. */
    public static final int USAGE = 64;

    private Exit() {}
}
