/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.cli;

import java.io.BufferedWriter;
import java.io.IOException;
import java.io.OutputStream;
import java.io.OutputStreamWriter;
import java.io.UncheckedIOException;
import java.io.Writer;
import java.nio.charset.Charset;
import java.util.function.Consumer;

/** Something that can be written to a stream, as often as wanted, without being held in memory as a whole. */
interface Content {

    /** Writes everything; does not close the stream. */
    void to(OutputStream out) throws IOException;

    /** Bytes that are there already. */
    static Content of(byte[] bytes) {
        return out -> out.write(bytes);
    }

    /**
     * Text that a report writes.
     *
     * @param charset character set of the stream
     */
    static Content of(Consumer<Appendable> report, Charset charset) {
        return out -> {
            Writer writer = new BufferedWriter(new OutputStreamWriter(out, charset));
            try {
                report.accept(writer);
            } catch (UncheckedIOException failure) {
                throw failure.getCause();
            }
            writer.flush();
        };
    }
}
