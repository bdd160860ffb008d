/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.study.result;

/**
 * A value compared with a limit.
 *
 * @param limit            the limit
 * @param where            which value was compared
 * @param offsetMetres     offset of the value in metres
 * @param valueTesla       value of the limit's measure in tesla RMS
 * @param uncertaintyTesla numerical bound plus model error of the value in tesla
 */
public record LimitComparison(LimitInfo limit, Where where, double offsetMetres, double valueTesla, double uncertaintyTesla) {

    /** Which value of a station was compared. */
    public enum Where {
        /** The value at the left edge of the right-of-way. */
        LEFT_EDGE,
        /** The value at the right edge of the right-of-way. */
        RIGHT_EDGE,
        /** The greatest value between the edges, edges included. */
        GREATEST_WITHIN,
        /** The greatest value of the whole profile, the right-of-way included. */
        GREATEST_OF_PROFILE
    }

    /** Outcome of the comparison. */
    public enum Verdict {
        /** The value is at or below the level, its uncertainty included. */
        BELOW,
        /** The value is above the level, its uncertainty deducted. */
        ABOVE,
        /** The uncertainty of the value does not let it be told. */
        UNDECIDED
    }

    /** Level less value in tesla: positive below the limit. */
    public double marginTesla() {
        return limit.levelTesla() - valueTesla;
    }

    /** Value over level: below 1 below the limit. */
    public double fractionOfLevel() {
        return valueTesla / limit.levelTesla();
    }

    /** The outcome, with the uncertainty taken into account. */
    public Verdict verdict() {
        if (valueTesla + uncertaintyTesla <= limit.levelTesla()) {
            return Verdict.BELOW;
        }
        return valueTesla - uncertaintyTesla > limit.levelTesla() ? Verdict.ABOVE : Verdict.UNDECIDED;
    }
}
