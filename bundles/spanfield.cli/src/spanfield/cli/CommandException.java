/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.cli;

import java.util.List;

/** The command cannot go on. The message is for the user: one clear line, what is wrong and what to do. */
final class CommandException extends RuntimeException {

    private static final long serialVersionUID = 1L;

    private final ExitCode code;
    private final transient List<String> lines;

    CommandException(ExitCode code, String message) {
        this(code, List.of(message));
    }

    /** For several problems of the same kind, such as bad rows of a file: a line for each. */
    CommandException(ExitCode code, List<String> lines) {
        super(lines.get(0));
        this.code = code;
        this.lines = List.copyOf(lines);
    }

    /** A wrong argument. */
    static CommandException argument(String message) {
        return new CommandException(ExitCode.BAD_ARGUMENTS, message);
    }

    /** A file that cannot be read or written. */
    static CommandException file(String message) {
        return new CommandException(ExitCode.FILE, message);
    }

    ExitCode code() {
        return code;
    }

    List<String> lines() {
        return lines;
    }
}
