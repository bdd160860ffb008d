/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.tests.line;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;
import spanfield.solver.line.PhaseCurrents;
import spanfield.solver.tests.support.Lines;

/** Current phasors from loads; the conventions are those of any text on three-phase circuits. */
class PhaseCurrentsTest {

    /** Rounding of a few operations, relative. */
    private static final double ROUNDING = 1e-12;

    private static void assertClose(Complex expected, Complex actual) {
        assertEquals(0, expected.subtract(actual).abs(), ROUNDING * Math.max(1, expected.abs()));
    }

    @Test
    void powerAtUnityFactor_givesCurrentInPhase() {
        Complex[] currents = PhaseCurrents.ofPower(Math.sqrt(3) * 220e3 * 500, 0, 220e3, Lines.ABC);
        assertClose(new Complex(500), currents[0]);
        assertClose(PhaseCurrents.polar(500, -2 * Math.PI / 3), currents[1]);
        assertClose(PhaseCurrents.polar(500, 2 * Math.PI / 3), currents[2]);
    }

    @Test
    void inductiveLoad_givesLaggingCurrent() {
        Complex current = PhaseCurrents.ofPower(3e8, 1e8, 400e3, Lines.ABC)[0];
        assertEquals(-Math.atan2(1, 3), current.getArgument(), ROUNDING);
        assertEquals(Math.hypot(3e8, 1e8) / (Math.sqrt(3) * 400e3), current.abs(), 1e-9);
    }

    @Test
    void sequenceComponents_areInverseToPhaseCurrents() {
        Complex zero = new Complex(14, -3);
        Complex positive = new Complex(1200, -200);
        Complex negative = new Complex(-20, 11);
        Complex[] abc = PhaseCurrents.ofSequences(zero, positive, negative);
        Complex[] back = PhaseCurrents.sequencesOf(abc[0], abc[1], abc[2]);
        assertClose(zero, back[0]);
        assertClose(positive, back[1]);
        assertClose(negative, back[2]);
        assertClose(zero.multiply(3), abc[0].add(abc[1]).add(abc[2]));
    }

    @Test
    void positiveSequence_isTheBalancedLoad() {
        Complex[] sequence = PhaseCurrents.ofSequences(Complex.ZERO, PhaseCurrents.polar(700, 0.2), Complex.ZERO);
        Complex[] balanced = PhaseCurrents.balanced(700, 0.2, Lines.ABC);
        for (int i = 0; i < 3; i++) {
            assertClose(balanced[i], sequence[i]);
        }
    }
}
