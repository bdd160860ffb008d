/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver;

/** The caller's {@link Progress} asked for cancellation; no result exists. */
public final class SolverCancelledException extends RuntimeException {

    private static final long serialVersionUID = 1L;

    public SolverCancelledException() {
        super("The computation was cancelled.");
    }
}
