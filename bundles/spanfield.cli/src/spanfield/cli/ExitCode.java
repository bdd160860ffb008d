/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.cli;

/** What the command tells the shell. The numbers are part of the interface: scripts rely on them. */
public enum ExitCode {

    /** Everything that was asked for is done. */
    DONE(0, "done"),
    /** The study has errors: nothing was computed and nothing written. */
    STUDY_HAS_ERRORS(1, "the study has errors; nothing was computed or written"),
    /** The arguments are wrong. */
    BAD_ARGUMENTS(2, "the arguments are wrong"),
    /** A file cannot be read or written. */
    FILE(3, "a file cannot be read or written, or is not what it should be"),
    /** The computation failed or was cancelled. */
    COMPUTATION(4, "the computation failed or was cancelled"),
    /** A mistake in the program. */
    INTERNAL(5, "internal error; the message names the log");

    private final int number;
    private final String meaning;

    ExitCode(int number, String meaning) {
        this.number = number;
        this.meaning = meaning;
    }

    /** The exit code of the process. */
    public int number() {
        return number;
    }

    /** What it means, for the help. */
    public String meaning() {
        return meaning;
    }
}
