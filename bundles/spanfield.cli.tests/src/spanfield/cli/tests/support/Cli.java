/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.cli.tests.support;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.InputStream;
import java.io.OutputStream;
import java.io.PrintStream;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import spanfield.cli.Cancellation;
import spanfield.cli.ExitCode;
import spanfield.cli.Main;
import spanfield.cli.Terminal;

/** Runs the command within the test, with streams of its own. */
public final class Cli {

    private Cli() {
    }

    /**
     * What came of a run.
     *
     * @param code exit code
     * @param out  standard output
     * @param err  standard error
     */
    public record Outcome(ExitCode code, String out, String err) {

        /** The outcome, if it is a success without a word on standard error. */
        public Outcome done() {
            if (code != ExitCode.DONE || !err.isEmpty()) {
                throw new AssertionError("exit code " + code + "\n" + err + "\n" + out);
            }
            return this;
        }
    }

    /** Runs the command; the locale is UTF-8. */
    public static Outcome run(Object... arguments) {
        return run(StandardCharsets.UTF_8, new ByteArrayInputStream(new byte[0]), new Cancellation(), arguments);
    }

    /** Runs the command with something on standard input. */
    public static Outcome runWithInput(String input, Object... arguments) {
        return run(StandardCharsets.UTF_8, new ByteArrayInputStream(input.getBytes(StandardCharsets.UTF_8)), new Cancellation(), arguments);
    }

    /** Runs the command in another locale, or with special streams. */
    public static Outcome run(Charset charset, InputStream in, Cancellation cancellation, Object... arguments) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        ExitCode code = run(charset, in, out, err, cancellation, arguments);
        return new Outcome(code, out.toString(StandardCharsets.UTF_8), err.toString(StandardCharsets.UTF_8));
    }

    /** Runs the command on given streams. */
    public static ExitCode run(Charset charset, InputStream in, OutputStream out, OutputStream err, Cancellation cancellation, Object... arguments) {
        List<String> words = Stream.of(arguments).map(Object::toString).toList();
        return Main.run(words, new Terminal(in, out, new PrintStream(err, true, StandardCharsets.UTF_8), charset, false), cancellation);
    }

    /** Records of CSV without quotes or line breaks in fields, as maps from heading to field. */
    public static List<Map<String, String>> csv(String text) {
        List<String> lines = text.lines().toList();
        String[] header = lines.get(0).split(",", -1);
        return lines.subList(1, lines.size()).stream().map(line -> {
            String[] fields = line.split(",", -1);
            if (fields.length != header.length) {
                throw new AssertionError(fields.length + " fields under " + header.length + " headings: " + line);
            }
            Map<String, String> row = new java.util.LinkedHashMap<>();
            for (int i = 0; i < header.length; i++) {
                row.put(header[i], fields[i]);
            }
            return row;
        }).toList();
    }
}
