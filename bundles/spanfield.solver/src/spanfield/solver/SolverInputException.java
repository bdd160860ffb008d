/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver;

/** Input that the solver refuses because no meaningful result exists for it. The message names the value, the limit and the place. */
public final class SolverInputException extends RuntimeException {

    private static final long serialVersionUID = 1L;

    /** Why an input was refused. */
    public enum Reason {
        /** A value is NaN, infinite or outside the range in which the physics holds. */
        VALUE_OUT_OF_RANGE,
        /** Two points of a geometry coincide, so that a length is zero. */
        ZERO_LENGTH,
        /** Spans of a wire do not join. */
        NOT_CONTIGUOUS,
        /** A field point lies on or inside a conductor. */
        POINT_INSIDE_CONDUCTOR,
        /** The complex image is not defined for this point and wire. */
        IMAGE_UNDEFINED,
        /** Arrays or lists have sizes that do not fit. */
        SIZE_MISMATCH,
        /** A linear system has no unique solution. */
        SINGULAR_SYSTEM
    }

    private final Reason reason;

    public SolverInputException(Reason reason, String message) {
        super(message);
        this.reason = reason;
    }

    /** Why the input was refused. */
    public Reason reason() {
        return reason;
    }

    /**
     * Returns {@code value} when it lies within the closed range, and refuses it otherwise (NaN included).
     *
     * @param what name and unit of the value, for the message
     */
    public static double requireWithin(String what, double value, double least, double greatest) {
        if (!(value >= least && value <= greatest)) {
            throw new SolverInputException(Reason.VALUE_OUT_OF_RANGE,
                what + " is " + value + "; it must lie between " + least + " and " + greatest);
        }
        return value;
    }
}
