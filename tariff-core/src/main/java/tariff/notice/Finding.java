// SPDX-License-Identifier: Apache-2.0
package tariff.notice;

import java.util.Optional;

/**
 * Something wrong or doubtful in an input, said so that a billing clerk knows what to do.
 *
 * @param severity whether the input can still be used
 * @param code a stable word for programs, such as {@code unknown-key}
 * @param where a JSON Pointer (RFC 6901), or the row and column of a table
 * @param message the sentence, without the place
 * @param found what stood there, if anything did
 * @param allowed what may stand there, if that can be said
 */
public record Finding(
        Severity severity,
        String code,
        String where,
        String message,
        Optional<String> found,
        Optional<String> allowed) {

    /** An error makes the input unusable; a warning does not. */
    public enum Severity {
        ERROR,
        WARNING
    }

    public static Finding error(String code, String where, String message) {
        return new Finding(Severity.ERROR, code, where, message, Optional.empty(), Optional.empty());
    }

    public static Finding warning(String code, String where, String message) {
        return new Finding(Severity.WARNING, code, where, message, Optional.empty(), Optional.empty());
    }

    public Finding found(String text) {
        return new Finding(severity, code, where, message, Optional.of(text), allowed);
    }

    public Finding allowed(String text) {
        return new Finding(severity, code, where, message, found, Optional.of(text));
    }

    /** The same finding about an input that stands inside another, at this pointer. */
    public Finding inside(String pointer) {
        return new Finding(severity, code, pointer + where, message, found, allowed);
    }

    public boolean isError() {
        return severity == Severity.ERROR;
    }

    /** {@code /lines/3/price: is missing}, with what was found and what is allowed. */
    @Override
    public String toString() {
        return (where.isEmpty() ? "" : where + ": ")
                + message
                + found.map(text -> "; found " + text).orElse("")
                + allowed.map(text -> "; allowed: " + text).orElse("");
    }
}
