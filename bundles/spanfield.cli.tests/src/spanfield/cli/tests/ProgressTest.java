/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.cli.tests;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;
import spanfield.cli.Cancellation;
import spanfield.cli.Terminal;
import spanfield.cli.TerminalProgress;

/** Progress on a terminal. */
class ProgressTest {

    /** Milliseconds after which progress is shown at the latest: the documented 0.7 s and a margin for a busy machine. */
    private static final long WAIT_MILLIS = 900;

    private static String shown(boolean interactive, long waitMillis) throws InterruptedException {
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        Terminal terminal = new Terminal(new ByteArrayInputStream(new byte[0]), new ByteArrayOutputStream(),
            new PrintStream(err, true, StandardCharsets.UTF_8), StandardCharsets.UTF_8, interactive);
        try (TerminalProgress progress = new TerminalProgress(terminal, new Cancellation())) {
            progress.report(0.1);
            Thread.sleep(waitMillis);
            progress.report(0.42);
        }
        return err.toString(StandardCharsets.UTF_8);
    }

    @Test
    void longWork_isShownAndWipedAway() throws InterruptedException {
        String text = shown(true, WAIT_MILLIS);
        assertTrue(text.contains("computing 42 %"), text);
        assertTrue(text.endsWith("\r"), "the line is free again");
        assertEquals("", text.substring(text.lastIndexOf('%') + 1).strip());
    }

    @Test
    void shortWork_isNotShown() throws InterruptedException {
        assertEquals("", shown(true, 0));
    }

    @Test
    void withoutATerminal_nothingIsShown() throws InterruptedException {
        assertEquals("", shown(false, WAIT_MILLIS));
    }
}
