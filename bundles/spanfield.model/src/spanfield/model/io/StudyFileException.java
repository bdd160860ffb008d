/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.model.io;

/** A study file cannot be read or written. The message is one sentence or two for the user: what, where, and what to do. */
public final class StudyFileException extends Exception {

    private static final long serialVersionUID = 1L;

    public StudyFileException(String message) {
        super(message);
    }

    public StudyFileException(String message, Throwable cause) {
        super(message, cause);
    }
}
