/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.result;

/**
 * Something the reader of a result must know.
 *
 * @param severity how much it matters
 * @param text     whole sentences
 */
public record Notice(Severity severity, String text) {

    /** How much a notice matters. */
    public enum Severity {
        /** The result may be wrong or unusable in the respect that is named. */
        WARNING,
        /** Worth knowing. */
        INFORMATION
    }

    /** A warning. */
    public static Notice warning(String text) {
        return new Notice(Severity.WARNING, text);
    }

    /** A piece of information. */
    public static Notice information(String text) {
        return new Notice(Severity.INFORMATION, text);
    }
}
