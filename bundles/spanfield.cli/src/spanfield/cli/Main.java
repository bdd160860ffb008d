/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import spanfield.report.CheckReport;
import spanfield.solver.SolverCancelledException;
import spanfield.solver.SolverInputException;
import spanfield.study.InvalidStudyException;
import spanfield.study.SoftwareVersion;
import spanfield.study.StudyInputException;

/**
 * The headless command. Runs inside Equinox ({@link CommandLineApplication}) and as a plain main class.
 *
 * <p>Results go to standard output or to files, messages to standard error, each with the name of the command in front. There are no stack
 * traces on the screen.
 */
public final class Main {

    private static final String HINT = "see: spanfield help";

    private Main() {
    }

    /** Runs the command and ends the process with its exit code. */
    public static void main(String[] arguments) {
        System.exit(run(arguments));
    }

    /** Runs the command with the streams of the process; the process goes on. Ends cleanly when the process is interrupted. */
    static int run(String[] arguments) {
        Cancellation cancellation = new Cancellation();
        cancellation.install();
        ExitCode code = ExitCode.INTERNAL;
        try {
            code = run(Arrays.asList(arguments), Terminal.ofProcess(), cancellation);
        } finally {
            cancellation.finish(code);
        }
        return code.number();
    }

    /**
     * Runs the command with given streams. Never throws; the exit code says how it went.
     *
     * @param arguments verb, operands and options
     */
    public static ExitCode run(List<String> arguments, Terminal terminal, Cancellation cancellation) {
        try {
            return dispatch(arguments, terminal, cancellation);
        } catch (CommandException problem) {
            complain(terminal, problem.lines());
            return problem.code();
        } catch (InvalidStudyException invalid) {
            terminal.err().print(CheckReport.text("spanfield: the study has errors; nothing was computed or written", invalid.findings()));
            return ExitCode.STUDY_HAS_ERRORS;
        } catch (SolverCancelledException cancelled) {
            complain(terminal, List.of("cancelled; nothing was written"));
            return ExitCode.COMPUTATION;
        } catch (SolverInputException | StudyInputException refused) {
            complain(terminal, List.of("the computation failed: " + refused.getMessage()));
            return ExitCode.COMPUTATION;
        } catch (OutOfMemoryError memory) {
            complain(terminal, List.of("the memory does not suffice; give more, for example SPANFIELD_JAVA_OPTS=-Xmx4g"));
            return ExitCode.COMPUTATION;
        } catch (RuntimeException | Error mistake) {
            complain(terminal, List.of("internal error (" + mistake.getClass().getSimpleName() + "); please report it with the log "
                + log(mistake, arguments)));
            return ExitCode.INTERNAL;
        }
    }

    private static ExitCode dispatch(List<String> arguments, Terminal terminal, Cancellation cancellation) {
        if (arguments.isEmpty()) {
            throw CommandException.argument("a verb is missing: " + String.join(", ", Verb.words()) + " or help; " + HINT);
        }
        String word = arguments.get(0);
        List<String> rest = arguments.subList(1, arguments.size());
        switch (word) {
            case "help", "--help", "-h":
                return help(rest, terminal);
            case "--version", "version":
                print(terminal, "Spanfield " + SoftwareVersion.VERSION + " (Java " + System.getProperty("java.version") + ", "
                    + System.getProperty("os.name") + ")\n");
                return ExitCode.DONE;
            default:
                Verb verb = verb(word);
                Args args = Args.parse(verb, rest);
                if (args.help()) {
                    print(terminal, Help.of(verb));
                    return ExitCode.DONE;
                }
                return new Commands(terminal, cancellation).run(verb, args);
        }
    }

    private static ExitCode help(List<String> rest, Terminal terminal) {
        print(terminal, rest.isEmpty() ? Help.general() : Help.of(verb(rest.get(0))));
        return ExitCode.DONE;
    }

    private static Verb verb(String word) {
        List<String> known = new ArrayList<>(Verb.words());
        known.add("help");
        return Verb.ofWord(word).orElseThrow(() -> CommandException.argument("unknown verb '" + word + "'; the verbs are "
            + String.join(", ", known) + Suggestions.hint(word, known)));
    }

    private static void print(Terminal terminal, String text) {
        Results.print(terminal.out(), Content.of(text.getBytes(Terminal.bytesCharset(terminal.charset()))));
    }

    /** Messages for the user, each on a line of its own. */
    static void complain(Terminal terminal, List<String> lines) {
        lines.forEach(line -> terminal.err().println("spanfield: " + line.replaceAll("\\s*[\\r\\n]+\\s*", " ")));
        terminal.err().flush();
    }

    /** Writes what happened to a file and tells where. */
    private static String log(Throwable mistake, List<String> arguments) {
        try {
            Path file = Files.createTempFile("spanfield-error-", ".log");
            try (PrintWriter out = new PrintWriter(Files.newBufferedWriter(file, StandardCharsets.UTF_8))) {
                out.println("Spanfield " + SoftwareVersion.VERSION + ", Java " + System.getProperty("java.version") + ", "
                    + System.getProperty("os.name") + " " + System.getProperty("os.version"));
                out.println("arguments: " + arguments);
                mistake.printStackTrace(out);
            }
            return file.toString();
        } catch (IOException | RuntimeException unwritten) {
            return "(which could not be written)";
        }
    }
}
