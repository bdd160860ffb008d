/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.cli;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.InputStream;
import java.io.OutputStream;
import java.io.PrintStream;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.util.Objects;

/**
 * Where the command reads and writes.
 *
 * @param in          standard input
 * @param out         standard output, raw bytes
 * @param err         standard error: messages and progress
 * @param charset     character set of text on standard output; files and CSV are always UTF-8
 * @param interactive whether standard error is a terminal, so that progress may be shown
 */
public record Terminal(InputStream in, OutputStream out, PrintStream err, Charset charset, boolean interactive) {

    /** Property that the launcher sets to true when standard error is a terminal: Java 17 cannot tell by itself. */
    public static final String INTERACTIVE_PROPERTY = "spanfield.terminal";

    public Terminal {
        Objects.requireNonNull(in);
        Objects.requireNonNull(out);
        Objects.requireNonNull(err);
        Objects.requireNonNull(charset);
    }

    /** The streams of the process, in the character set of the locale. */
    static Terminal ofProcess() {
        Charset locale = localeCharset();
        return new Terminal(System.in, new FileOutputStream(FileDescriptor.out),
            new PrintStream(new FileOutputStream(FileDescriptor.err), true, bytesCharset(locale)), locale, Boolean.getBoolean(INTERACTIVE_PROPERTY));
    }

    private static Charset localeCharset() {
        String name = System.getProperty("native.encoding", "US-ASCII");
        return Charset.isSupported(name) ? Charset.forName(name) : StandardCharsets.US_ASCII;
    }

    /** In an ASCII locale our own words are ASCII; names from the study go out as UTF-8 rather than as question marks. */
    static Charset bytesCharset(Charset locale) {
        return locale.equals(StandardCharsets.US_ASCII) ? StandardCharsets.UTF_8 : locale;
    }
}
