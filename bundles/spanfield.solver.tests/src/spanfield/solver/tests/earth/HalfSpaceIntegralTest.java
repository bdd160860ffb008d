/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.tests.earth;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;
import spanfield.solver.PhysicalConstants;
import spanfield.solver.earth.CarsonIntegral;
import spanfield.solver.earth.EarthModel;
import spanfield.solver.earth.EarthReturn;
import spanfield.solver.earth.HalfSpaceIntegral;

/** The exact half-space against direct quadrature of its definition on the real axis, its limits, and its symmetry. */
class HalfSpaceIntegralTest {

    /**
     * Relative to mu0/(2 pi H): error of the direct quadrature, whose 40-node panels are shorter than half an oscillation and half a decay
     * length, and which is cut where exp(-l H) is below 1e-17.
     */
    private static final double QUADRATURE = 1e-10;

    private static final GaussIntegrator RULE = new GaussIntegratorFactory().legendre(40);

    private static EarthReturn earth(double resistivity, double frequency) {
        return new EarthReturn(EarthModel.EXACT_HALF_SPACE, resistivity, frequency, 0);
    }

    /** Int (l-u)/(l+u) e^(-l H) {cos, sin}(l x) dl for the field, or Int e^(-l H) cos(l x)/(l+u) dl for the impedance, by brute force. */
    private static Complex direct(EarthReturn earth, double x, double h, int kind) {
        Complex kappa2 = earth.complexDepth().pow(-2.0);
        double skin = 1 / earth.complexDepth().abs();
        double end = 40 / h;
        double width = Math.min(Math.min(1 / h, x == 0 ? 1 / h : 1 / Math.abs(x)), skin);
        int panels = (int) Math.ceil(end / width);
        Complex sum = Complex.ZERO;
        for (int i = 0; i < panels; i++) {
            for (int k = 0; k < RULE.getNumberOfPoints(); k++) {
                double l = (i + 0.5 + RULE.getPoint(k) / 2) * end / panels;
                Complex u = kappa2.add(l * l).sqrt();
                Complex f = kind == 2 ? u.add(l).reciprocal() : u.negate().add(l).divide(u.add(l));
                double wave = kind == 1 ? Math.sin(l * x) : Math.cos(l * x);
                sum = sum.add(f.multiply(wave * Math.exp(-l * h) * RULE.getWeight(k) * end / panels / 2));
            }
        }
        return sum;
    }

    @Test
    void exactField_equalsDirectQuadrature() {
        Random random = new Random(11);
        double[] out = new double[4];
        for (int i = 0; i < 60; i++) {
            EarthReturn earth = earth(Math.pow(10, random.nextDouble() * 5 - 1), random.nextBoolean() ? 50 : 16.7 + random.nextDouble() * 380);
            double h = 2 + random.nextDouble() * 60;
            double x = (random.nextBoolean() ? 1 : -1) * h * random.nextDouble() * 30;
            new HalfSpaceIntegral(earth).exact(x, h, out);
            double scale = PhysicalConstants.MU0 / (2 * Math.PI);
            Complex across = direct(earth, x, h, 0).multiply(scale);
            Complex up = direct(earth, x, h, 1).multiply(-scale);
            double tolerance = QUADRATURE * scale / h;
            assertEquals(across.getReal(), out[0], tolerance);
            assertEquals(across.getImaginary(), out[1], tolerance);
            assertEquals(up.getReal(), out[2], tolerance);
            assertEquals(up.getImaginary(), out[3], tolerance);
        }
    }

    @Test
    void carsonIntegral_equalsDirectQuadrature() {
        Random random = new Random(12);
        for (int i = 0; i < 40; i++) {
            EarthReturn earth = earth(Math.pow(10, random.nextDouble() * 5 - 1), 50);
            double h = 2 + random.nextDouble() * 60;
            double x = h * random.nextDouble() * 30;
            Complex expected = direct(earth, x, h, 2);
            assertEquals(0, new CarsonIntegral(earth).value(x, h).subtract(expected).abs(), QUADRATURE * Math.max(1, expected.abs()));
        }
    }

    /** Where the power series, the turned ray and the asymptotic series meet, they agree: a step would show as a jump of the field. */
    @Test
    void regions_meetWithoutSteps() {
        double[] before = new double[4];
        double[] after = new double[4];
        for (double h : new double[] {1, 30, 150}) {
            EarthReturn earth = earth(1, 50);
            HalfSpaceIntegral integral = new HalfSpaceIntegral(earth);
            for (double meeting : new double[] {7, 40}) {
                double x = Math.sqrt(Math.pow(meeting * earth.complexDepth().abs(), 2) - h * h);
                integral.exact(x * (1 - 1e-13), h, before);
                integral.exact(x * (1 + 1e-13), h, after);
                double size = Math.abs(before[0]) + Math.abs(before[2]);
                for (int k = 0; k < 4; k++) {
                    assertEquals(before[k], after[k], 10 * HalfSpaceIntegral.relativeError() * size);
                }
            }
        }
    }

    /** Perfectly conducting earth: a mirror image with opposite current. The rest is of relative size 2 |p| / H. */
    @Test
    void conductingLimit_isTheMirrorImage() {
        EarthReturn earth = new EarthReturn(EarthModel.EXACT_HALF_SPACE, 1e-3, 1e4, 0);
        double[] out = new double[4];
        double h = 30;
        double x = 12;
        new HalfSpaceIntegral(earth).exact(x, h, out);
        double f = PhysicalConstants.MU0 / (2 * Math.PI) / (h * h + x * x);
        double rest = 3 * earth.complexDepth().abs() / h;
        assertEquals(-f * h, out[0], f * h * rest);
        assertEquals(f * x, out[2], f * h * rest);
        assertEquals(0, Math.hypot(out[1], out[3]), f * h * rest);
    }

    /** Insulating earth: nothing is added. The rest is of size mu0/(2 pi) (2/3) |kappa|. */
    @Test
    void insulatingLimit_addsNothing() {
        EarthReturn earth = earth(1e7, 50);
        double[] out = new double[4];
        new HalfSpaceIntegral(earth).exact(12, 30, out);
        double rest = PhysicalConstants.MU0 / (2 * Math.PI) / earth.complexDepth().abs();
        for (double value : out) {
            assertTrue(Math.abs(value) <= rest, "the earth adds " + value);
        }
    }

    @Test
    void mirroredOffset_turnsTheVerticalComponent() {
        HalfSpaceIntegral integral = new HalfSpaceIntegral(earth(100, 60));
        double[] right = new double[4];
        double[] left = new double[4];
        for (double x : new double[] {3, 80, 2500, 40000}) {
            integral.exact(x, 21, right);
            integral.exact(-x, 21, left);
            assertEquals(right[0], left[0], 0);
            assertEquals(right[1], left[1], 0);
            assertEquals(-right[2], left[2], 0);
            assertEquals(-right[3], left[3], 0);
        }
    }

    /** Far away the complex image is right: both approach the same expansion, with the next term of relative size |p / zeta|^2. */
    @Test
    void farAway_imageAndExactAgree() {
        EarthReturn earth = earth(10, 50);
        HalfSpaceIntegral integral = new HalfSpaceIntegral(earth);
        double[] exact = new double[4];
        double[] image = new double[4];
        double p = earth.complexDepth().abs();
        for (double factor : new double[] {20, 60, 200}) {
            integral.exact(factor * p, 25, exact);
            integral.image(factor * p, 25, image);
            for (int k = 0; k < 4; k++) {
                assertEquals(exact[k], image[k], 10 / (factor * factor) * Math.hypot(exact[2], exact[3]));
            }
        }
    }
}
