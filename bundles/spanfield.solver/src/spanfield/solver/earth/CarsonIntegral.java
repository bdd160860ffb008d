/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.earth;

import org.apache.commons.math3.complex.Complex;

/**
 * Earth term of the impedance between parallel lines, J = Int_0^inf exp(-H l) cos(x l) / (l + u) dl with u^2 = l^2 + kappa^2,
 * kappa^2 = j omega mu0 / rho (Carson, Bell System Technical Journal 5, 1926): the impedance is j omega mu0 / pi times J. Exact, by the
 * Struve and Neumann functions of complex argument. Immutable.
 */
public final class CarsonIntegral {

    private final Complex kappa;

    /** For an active earth, see {@link EarthReturn#active()}. */
    public CarsonIntegral(EarthReturn earth) {
        this.kappa = earth.complexDepth().reciprocal();
    }

    /**
     * The integral J (dimensionless).
     *
     * @param x         horizontal distance of the conductors in metres
     * @param heightSum sum of their heights in metres, positive
     */
    public Complex value(double x, double heightSum) {
        Complex plus = HalfSpaceFunctions.impedance(kappa.multiply(new Complex(heightSum, x)));
        Complex minus = HalfSpaceFunctions.impedance(kappa.multiply(new Complex(heightSum, -x)));
        return plus.add(minus).multiply(0.5);
    }
}
