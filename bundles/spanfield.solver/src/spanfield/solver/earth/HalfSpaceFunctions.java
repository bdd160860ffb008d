/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.earth;

import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import org.apache.commons.math3.complex.Complex;

/**
 * The two functions of one complex argument w to which the field and the impedance of a straight line current over a conducting
 * half-space reduce, for arg w between -45 and 135 degrees:
 *
 * <ul>
 * <li>field: phi(w) = - Int_0^inf (sqrt(1 + t^2) - t)^2 exp(-w t) dt = -1/w - 4/w^3 - 2 d/dw[pi/(2w) (H1(w) - Y1(w))]</li>
 * <li>impedance: psi(w) = Int_0^inf (sqrt(1 + t^2) - t) exp(-w t) dt = pi/(2w) (H1(w) - Y1(w)) - 1/w^2</li>
 * </ul>
 *
 * <p>with the Struve function H1 and the Bessel function of the second kind Y1 (the closed form of Carson's integral, Carson, Bell
 * System Technical Journal 5, 1926; power series of H, J and Y from Abramowitz and Stegun 9.1.11 and 12.1.3, with
 * H2 and Y2 for the derivative). The singular terms of Y cancel against the others and are left out of the sums.
 *
 * <p>Three regions: power series up to |w| = {@value #SERIES_LIMIT}, quadrature along a turned ray up to {@value #ASYMPTOTIC_LIMIT},
 * the asymptotic series of Watson's lemma beyond. Relative error below {@value #RELATIVE_ERROR} in each, tested where they meet and
 * against direct quadrature of the definitions.
 */
final class HalfSpaceFunctions {

    /** Bound of the relative error of both functions: rounding of the series at its limit, the largest of the three regions. */
    static final double RELATIVE_ERROR = 1e-11;

    static final double SERIES_LIMIT = 7;
    static final double ASYMPTOTIC_LIMIT = 40;

    private static final double EULER_GAMMA = 0.57721566490153286061;
    /** Coefficients k! f_k of the asymptotic series of phi, of w^-(k+1), from (sqrt(1+t^2) - t)^2 = 1 - 2t + 2t^2 - t^3 + t^5/4 - ... */
    private static final double[] FIELD_ASYMPTOTIC = {-1, 2, -4, 6, 0, -30, 0, 630, 0, -28350, 0, 2182950};
    /** The same for psi, from sqrt(1+t^2) - t = 1 - t + t^2/2 - t^4/8 + t^6/16 - 5 t^8/128 + 7 t^10/256. */
    private static final double[] IMPEDANCE_ASYMPTOTIC = {1, -1, 1, 0, -3, 0, 45, 0, -1575, 0, 99225};
    private static final GaussIntegrator RULE = new GaussIntegratorFactory().legendre(20);
    /** Decay lengths of exp(-w t) after which the rest is below double precision. */
    private static final double DECAY_LENGTHS = 38;

    private HalfSpaceFunctions() {
    }

    /** phi(w), the function of the field. */
    static Complex field(Complex w) {
        double size = w.abs();
        if (size <= SERIES_LIMIT) {
            return fieldSeries(w);
        }
        return size < ASYMPTOTIC_LIMIT ? alongRay(w, true) : asymptotic(w, FIELD_ASYMPTOTIC);
    }

    /** psi(w), the function of the impedance. */
    static Complex impedance(Complex w) {
        double size = w.abs();
        if (size <= SERIES_LIMIT) {
            return impedanceSeries(w);
        }
        return size < ASYMPTOTIC_LIMIT ? alongRay(w, false) : asymptotic(w, IMPEDANCE_ASYMPTOTIC);
    }

    /** phi = -2/3 + pi H2/w - (w/2) ln(w/2) s + (w/4) sum [psi(k+1) + psi(k+3)] (-q)^k / (k! (k+2)!), q = w^2/4. */
    static Complex fieldSeries(Complex w) {
        Sums sums = new Sums(w, 2);
        Complex half = w.multiply(0.5);
        return sums.struve.subtract(2.0 / 3).subtract(half.multiply(half.log()).multiply(sums.bessel)).add(half.multiply(0.5).multiply(sums.neumann));
    }

    /** psi = pi H1/(2w) - (1/2) ln(w/2) s + (1/4) sum [psi(k+1) + psi(k+2)] (-q)^k / (k! (k+1)!). */
    static Complex impedanceSeries(Complex w) {
        Sums sums = new Sums(w, 1);
        Complex log = w.multiply(0.5).log();
        return sums.struve.subtract(log.multiply(0.5).multiply(sums.bessel)).add(sums.neumann.multiply(0.25));
    }

    /** Sums of the power series for order n = 1 or 2, in plain doubles: this is called for every wire at every point. */
    private static final class Sums {

        private static final double NEGLIGIBLE = 1e-18;

        /** pi H1/(2w) for order 1, pi H2/w for order 2. */
        private final Complex struve;
        /** Sum of (-q)^k / (k! (k+n)!). */
        private final Complex bessel;
        /** The same with the factor psi(k+1) + psi(k+n+1). */
        private final Complex neumann;

        Sums(Complex w, int order) {
            double qr = -(w.getReal() * w.getReal() - w.getImaginary() * w.getImaginary()) / 4;
            double qi = -w.getReal() * w.getImaginary() / 2;
            // first terms: w/3 and 8 (w^2/4)/15 for the Struve part, 1/n! for the Bessel part
            double sr = order == 1 ? w.getReal() / 3 : -8 * qr / 15;
            double si = order == 1 ? w.getImaginary() / 3 : -8 * qi / 15;
            double br = order == 1 ? 1 : 0.5;
            double bi = 0;
            double digammas = order == 1 ? 1 - 2 * EULER_GAMMA : 1.5 - 2 * EULER_GAMMA;
            double struveRe = 0;
            double struveIm = 0;
            double besselRe = 0;
            double besselIm = 0;
            double neumannRe = 0;
            double neumannIm = 0;
            for (int k = 0; Math.abs(sr) + Math.abs(si) + (Math.abs(br) + Math.abs(bi)) > NEGLIGIBLE; k++) {
                struveRe += sr;
                struveIm += si;
                besselRe += br;
                besselIm += bi;
                neumannRe += digammas * br;
                neumannIm += digammas * bi;
                double struveStep = (k + 1.5) * (k + 1.5 + order);
                double t = (sr * qr - si * qi) / struveStep;
                si = (sr * qi + si * qr) / struveStep;
                sr = t;
                double besselStep = (k + 1.0) * (k + 1.0 + order);
                t = (br * qr - bi * qi) / besselStep;
                bi = (br * qi + bi * qr) / besselStep;
                br = t;
                digammas += 1.0 / (k + 1) + 1.0 / (k + 1 + order);
            }
            struve = new Complex(struveRe, struveIm);
            bessel = new Complex(besselRe, besselIm);
            neumann = new Complex(neumannRe, neumannIm);
        }
    }

    /** Watson's lemma. The terms fall until k is about |w|; with these few terms the first one left out bounds the error. */
    static Complex asymptotic(Complex w, double[] coefficients) {
        Complex inverse = w.reciprocal();
        Complex sum = Complex.ZERO;
        for (int k = coefficients.length - 1; k >= 0; k--) {
            sum = sum.add(coefficients[k]).multiply(inverse);
        }
        return sum;
    }

    static Complex fieldAsymptotic(Complex w) {
        return asymptotic(w, FIELD_ASYMPTOTIC);
    }

    static Complex impedanceAsymptotic(Complex w) {
        return asymptotic(w, IMPEDANCE_ASYMPTOTIC);
    }

    /**
     * The defining integral along t = s exp(-j alpha). The ray is turned towards the direction of fastest decay, but stays 30 degrees
     * away from the branch point at t = -j.
     */
    static Complex alongRay(Complex w, boolean field) {
        double angle = w.getArgument();
        double alpha = angle > Math.PI / 4 ? (angle - Math.PI / 4) * 2 / 3 : 0;
        Complex turn = new Complex(Math.cos(alpha), -Math.sin(alpha));
        Complex decay = w.multiply(turn);
        double end = DECAY_LENGTHS / decay.getReal();
        double width = Math.min(3 / decay.getReal(), 0.5);
        int panels = (int) Math.ceil(end / width);
        Complex sum = Complex.ZERO;
        for (int panel = 0; panel < panels; panel++) {
            double middle = (panel + 0.5) * end / panels;
            for (int node = 0; node < RULE.getNumberOfPoints(); node++) {
                double s = middle + RULE.getPoint(node) * end / panels / 2;
                Complex t = turn.multiply(s);
                Complex inverse = t.multiply(t).add(1).sqrt().add(t).reciprocal();
                Complex value = field ? inverse.multiply(inverse).negate() : inverse;
                sum = sum.add(value.multiply(decay.multiply(-s).exp()).multiply(RULE.getWeight(node)));
            }
        }
        return sum.multiply(turn).multiply(end / panels / 2);
    }
}
