/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.cli;

import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;

/**
 * Stops the command cleanly when the process is told to end (interrupt key, termination): the computation is cancelled, files that are not
 * complete are removed, and the exit code is that of a cancelled computation.
 */
public final class Cancellation {

    /** Time in seconds that the command gets to end by itself: the solver looks for cancellation many times a second. */
    private static final long PATIENCE_SECONDS = 3;

    private final CountDownLatch finished = new CountDownLatch(1);
    private final Thread hook = new Thread(this::stop, "spanfield-stop");
    private volatile boolean cancelled;
    private volatile ExitCode code = ExitCode.COMPUTATION;
    private volatile Runnable cleaner = () -> { };

    /** Begins to listen to the end of the process. */
    void install() {
        Runtime.getRuntime().addShutdownHook(hook);
    }

    /** Asks the computation to stop. */
    public void cancel() {
        cancelled = true;
    }

    /** Whether the computation is to stop. */
    boolean cancelled() {
        return cancelled;
    }

    /** What is to be done if the process has to be stopped in the middle. */
    void beforeHalt(Runnable action) {
        cleaner = action;
    }

    /** Tells that the command has ended, and stops listening. */
    void finish(ExitCode result) {
        code = result;
        finished.countDown();
        try {
            Runtime.getRuntime().removeShutdownHook(hook);
        } catch (IllegalStateException stopping) {
            // the process is ending already: the hook takes the exit code
        }
    }

    /** Runs when the process ends before the command. */
    private void stop() {
        cancel();
        try {
            finished.await(PATIENCE_SECONDS, TimeUnit.SECONDS);
        } catch (InterruptedException stopped) {
            Thread.currentThread().interrupt();
        }
        cleaner.run();
        // A hook cannot change the exit code otherwise, which would be that of the signal.
        Runtime.getRuntime().halt(code.number());
    }
}
