/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.field;

import spanfield.solver.SolverInputException;

/**
 * Relative numerical accuracy asked of the resultant field.
 *
 * @param relative dimensionless, {@value #FINEST} to {@value #COARSEST}
 */
public record Accuracy(double relative) {

    /** Finest accuracy that double precision supports after the cancellation of balanced phases. */
    public static final double FINEST = 1e-12;

    /** Coarsest accuracy that is worth a computation. */
    public static final double COARSEST = 1e-2;

    /** The usual accuracy, 1e-6. */
    public static final Accuracy DEFAULT = new Accuracy(1e-6);

    public Accuracy {
        SolverInputException.requireWithin("relative accuracy", relative, FINEST, COARSEST);
    }
}
