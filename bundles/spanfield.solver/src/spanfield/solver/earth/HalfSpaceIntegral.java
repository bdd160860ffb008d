/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.earth;

import org.apache.commons.math3.complex.Complex;
import spanfield.solver.PhysicalConstants;
import spanfield.solver.SolverInputException;

/**
 * What a homogeneous conducting half-space adds to the magnetic field of an infinite, straight, horizontal line current above it.
 *
 * <p>Quasi-static, displacement currents neglected. The secondary vector potential (Carson 1926; Wait, Radio Science 1961) is
 * A(x, H) = mu0 I / (2 pi) Int_0^inf (l - u)/(l + u) exp(-l H) cos(l x) / l dl, u^2 = l^2 + kappa^2, kappa^2 = j omega mu0 / rho, with the
 * current along +Y, x the offset of the point from the wire and H the sum of the heights of wire and point above the plane.
 * B = curl A gives B_x = -dA/dz, B_z = dA/dx. With zeta = H +- j x both are combinations of kappa phi(kappa zeta).
 *
 * <p>The complex image of Deri et al. (1981) replaces (l - u)/(l + u) by -exp(-2 l p): good where kappa zeta is large (far, or well
 * conducting earth), 25 % low in the common-mode term close to the line.
 *
 * <p>Immutable and thread-safe. Wrong for layered earth, for wires that are not straight over some multiples of the complex depth, and
 * within the earth.
 */
public final class HalfSpaceIntegral {

    private final Complex kappa;
    private final Complex depth;

    /** For an active earth, see {@link EarthReturn#active()}. */
    public HalfSpaceIntegral(EarthReturn earth) {
        this.depth = earth.complexDepth();
        this.kappa = depth.reciprocal();
    }

    /**
     * Exact field that the earth adds, per ampere.
     *
     * @param x         offset of the point from the wire in metres, to the right of the current
     * @param heightSum height of the wire plus height of the point above the plane, in metres, positive
     * @param out       receives Re B_x, Im B_x, Re B_z, Im B_z in tesla per ampere: to the right and up
     */
    public void exact(double x, double heightSum, double[] out) {
        requirePositive(heightSum);
        Complex plus = HalfSpaceFunctions.field(kappa.multiply(new Complex(heightSum, x)));
        Complex minus = x == 0 ? plus : HalfSpaceFunctions.field(kappa.multiply(new Complex(heightSum, -x)));
        store(plus.multiply(kappa), minus.multiply(kappa), out);
    }

    /** Field of the complex image, per ampere; parameters as in {@link #exact}. Height sum may be down to -2 Re p. */
    public void image(double x, double heightSum, double[] out) {
        Complex twice = depth.multiply(2);
        store(new Complex(heightSum, x).add(twice).reciprocal().negate(), new Complex(heightSum, -x).add(twice).reciprocal().negate(), out);
    }

    /** Exact less image, per ampere; parameters as in {@link #exact}. */
    public void difference(double x, double heightSum, double[] out) {
        exact(x, heightSum, out);
        double[] image = new double[4];
        image(x, heightSum, image);
        for (int i = 0; i < 4; i++) {
            out[i] -= image[i];
        }
    }

    /** Bound of the relative error of {@link #exact}. */
    public static double relativeError() {
        return HalfSpaceFunctions.RELATIVE_ERROR;
    }

    /** Sum and difference of Phi(H + jx) and Phi(H - jx). */
    private static void store(Complex plus, Complex minus, double[] out) {
        double scale = PhysicalConstants.MU0 / (4 * Math.PI);
        out[0] = scale * (plus.getReal() + minus.getReal());
        out[1] = scale * (plus.getImaginary() + minus.getImaginary());
        out[2] = scale * (plus.getImaginary() - minus.getImaginary());
        out[3] = -scale * (plus.getReal() - minus.getReal());
    }

    private static void requirePositive(double heightSum) {
        SolverInputException.requireWithin("sum of the heights of wire and point above the earth plane in metres", heightSum, 1e-9, 1e6);
    }
}
