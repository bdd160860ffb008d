/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.line;

import org.apache.commons.math3.complex.Complex;
import spanfield.solver.SolverInputException;

/** Current phasors of the phases of a circuit from the ways in which a load is stated. RMS amperes; angles in radians. */
public final class PhaseCurrents {

    private static final Complex A = new Complex(-0.5, Math.sqrt(3) / 2);

    private PhaseCurrents() {
    }

    /**
     * Equal currents with the angles of the phases.
     *
     * @param amperes      magnitude of each phase current, not negative
     * @param angle        angle of the load, added to that of every phase
     * @param phaseAngles  angle of each phase: 0, -120, +120 degrees for A, B, C
     */
    public static Complex[] balanced(double amperes, double angle, double[] phaseAngles) {
        SolverInputException.requireWithin("current in amperes", amperes, 0, 1e7);
        Complex[] currents = new Complex[phaseAngles.length];
        for (int i = 0; i < currents.length; i++) {
            currents[i] = polar(amperes, angle + phaseAngles[i]);
        }
        return currents;
    }

    /**
     * Currents of a load P + jQ. Three phases: I = conj((P + jQ) / (sqrt3 V)) with V line to line. Otherwise every one of the n phases carries
     * the share 1/n of the power at the voltage V to earth: I = conj((P + jQ) / (n V)). The voltage of phase A has the angle 0.
     *
     * @param watts active power of the circuit, positive in the direction of the line
     * @param vars  reactive power, positive when the current lags
     * @param volts operating voltage, positive
     */
    public static Complex[] ofPower(double watts, double vars, double volts, double[] phaseAngles) {
        SolverInputException.requireWithin("voltage in volts", volts, 1, 1e7);
        double divisor = phaseAngles.length == 3 ? Math.sqrt(3) * volts : phaseAngles.length * volts;
        Complex current = new Complex(watts / divisor, -vars / divisor);
        Complex[] currents = new Complex[phaseAngles.length];
        for (int i = 0; i < currents.length; i++) {
            currents[i] = current.multiply(polar(1, phaseAngles[i]));
        }
        return currents;
    }

    /**
     * Phase currents A, B, C from symmetrical components of phase A (Fortescue 1918): with a = exp(j 120 degrees),
     * I_A = I0 + I1 + I2, I_B = I0 + a^2 I1 + a I2, I_C = I0 + a I1 + a^2 I2.
     */
    public static Complex[] ofSequences(Complex zero, Complex positive, Complex negative) {
        Complex a2 = A.conjugate();
        return new Complex[] {zero.add(positive).add(negative), zero.add(a2.multiply(positive)).add(A.multiply(negative)),
            zero.add(A.multiply(positive)).add(a2.multiply(negative))};
    }

    /** Symmetrical components zero, positive, negative of phase currents A, B, C. */
    public static Complex[] sequencesOf(Complex a, Complex b, Complex c) {
        Complex a2 = A.conjugate();
        return new Complex[] {a.add(b).add(c).divide(3), a.add(A.multiply(b)).add(a2.multiply(c)).divide(3),
            a.add(a2.multiply(b)).add(A.multiply(c)).divide(3)};
    }

    /** Currents with the direction of flow turned round. */
    public static Complex[] reversed(Complex[] currents) {
        Complex[] turned = new Complex[currents.length];
        for (int i = 0; i < turned.length; i++) {
            turned[i] = currents[i].negate();
        }
        return turned;
    }

    /** Phasor of a magnitude and an angle in radians. */
    public static Complex polar(double magnitude, double angle) {
        return new Complex(magnitude * Math.cos(angle), magnitude * Math.sin(angle));
    }
}
