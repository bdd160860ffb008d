/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.cli;

import java.io.PrintStream;
import spanfield.solver.Progress;

/** Progress of a computation as one line on a terminal, shown only when the work takes long enough to wonder. */
public final class TerminalProgress implements Progress, AutoCloseable {

    private static final long FIRST_NANOS = 700_000_000L;
    private static final long STEP_NANOS = 100_000_000L;

    private final Terminal terminal;
    private final Cancellation cancellation;
    private long next;
    private int width;

    /** Shows progress on the standard error of a terminal and listens to a cancellation. */
    public TerminalProgress(Terminal terminal, Cancellation cancellation) {
        this.terminal = terminal;
        this.cancellation = cancellation;
        this.next = System.nanoTime() + FIRST_NANOS;
    }

    @Override
    public synchronized void report(double fraction) {
        long now = System.nanoTime();
        if (!terminal.interactive() || now - next < 0) {
            return;
        }
        next = now + STEP_NANOS;
        String text = "computing " + Math.round(100 * fraction) + " %";
        PrintStream err = terminal.err();
        err.print("\r" + text + " ".repeat(Math.max(0, width - text.length())));
        err.flush();
        width = text.length();
    }

    @Override
    public boolean cancelled() {
        return cancellation.cancelled();
    }

    /** Takes the line away. */
    @Override
    public synchronized void close() {
        if (width > 0) {
            terminal.err().print("\r" + " ".repeat(width) + "\r");
            terminal.err().flush();
        }
    }
}
