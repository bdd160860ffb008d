/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.cli;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import spanfield.report.TextStyle;

/** Where the results of a verb go: standard output or a file, and files of plots. Everything is checked first and written last. */
final class Results {

    private final Terminal terminal;
    private final Cancellation cancellation;
    private final boolean csv;
    private final boolean toFile;
    private final OutputFiles files;

    /**
     * Checks where results shall go.
     *
     * @param csv    whether the main result is CSV
     * @param output file of the main result; standard output without one
     * @param inputs files that are read and must not be overwritten
     */
    Results(Terminal terminal, Cancellation cancellation, boolean csv, Optional<Path> output, List<Path> inputs) {
        this.terminal = terminal;
        this.cancellation = cancellation;
        this.csv = csv;
        this.toFile = output.isPresent();
        this.files = new OutputFiles(inputs);
        output.ifPresent(path -> files.announce("output", path));
    }

    /** Announces one more file, to be added after the main result. */
    void announce(String option, Path file) {
        files.announce(option, file);
    }

    /** Signs that the main result can carry. */
    TextStyle style() {
        return csv || toFile ? TextStyle.UNICODE : TextStyle.of(terminal.charset());
    }

    /** Writes the main result and the announced files, in this order. */
    void write(Consumer<Appendable> main, List<byte[]> others) {
        List<Content> contents = new ArrayList<>();
        if (toFile) {
            contents.add(Content.of(main, StandardCharsets.UTF_8));
        }
        others.forEach(bytes -> contents.add(Content.of(bytes)));
        if (!contents.isEmpty()) {
            cancellation.beforeHalt(files::discard);
            files.write(contents);
        }
        if (!toFile) {
            print(terminal.out(), Content.of(main, csv ? StandardCharsets.UTF_8 : Terminal.bytesCharset(terminal.charset())));
        }
    }

    /** Writes to standard output; a reader that has gone away, such as head, is no failure worth a word. */
    static void print(OutputStream out, Content content) {
        try {
            content.to(out);
            out.flush();
        } catch (IOException failure) {
            if (!String.valueOf(failure.getMessage()).contains("Broken pipe")) {
                throw CommandException.file("standard output cannot be written: " + failure.getMessage());
            }
        }
    }
}
