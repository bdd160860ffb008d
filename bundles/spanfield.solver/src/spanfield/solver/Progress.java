/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver;

/** Listener of a long computation and the way to cancel it. Called from worker threads; implementations must be thread-safe. */
public interface Progress {

    /** Listens to nothing and never cancels. */
    Progress NONE = new Progress() {
        @Override
        public void report(double fraction) {
            // nobody listens
        }

        @Override
        public boolean cancelled() {
            return false;
        }
    };

    /**
     * Tells how much of the work is done.
     *
     * @param fraction 0 to 1, never falling
     */
    void report(double fraction);

    /** Whether the work is to stop; polled often. */
    boolean cancelled();

    /** Throws {@link SolverCancelledException} when cancellation was asked for. */
    default void check() {
        if (cancelled()) {
            throw new SolverCancelledException();
        }
    }
}
