/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.tests.line;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;
import spanfield.solver.PhysicalConstants;
import spanfield.solver.earth.EarthModel;
import spanfield.solver.earth.EarthReturn;
import spanfield.solver.line.ImpedanceFormula;
import spanfield.solver.line.LineConductor;
import spanfield.solver.line.PhaseCurrents;
import spanfield.solver.line.SeriesImpedance;
import spanfield.solver.line.ShieldWireCurrents;

/** Series impedances against published values, and shield-wire currents. */
class SeriesImpedanceTest {

    private static final double FOOT = 0.3048;
    private static final double MILE = 1609.344;
    private static final EarthReturn EARTH = new EarthReturn(EarthModel.EXACT_HALF_SPACE, 100, 60, 0);

    /** Half of the last printed digit, in ohm per mile. */
    private static final double PRINTED = 5e-5;

    /**
     * In ohm per mile, besides the printed digit: the sources round ln(return depth / 1 ft) to 7.93402, the formula gives 7.93348, and the
     * difference times 0.12134 ohm per mile is 6.6e-5.
     */
    private static final double ROUNDED_CONSTANT = 6.6e-5;

    private static LineConductor conductor(double xFeet, double zFeet, double gmrFeet, double ohmsPerMile) {
        return new LineConductor("conductor", xFeet * FOOT, zFeet * FOOT, gmrFeet * FOOT, ohmsPerMile / MILE);
    }

    private static void assertUpperTriangle(double[][] expected, Complex[][] z) {
        int k = 0;
        for (int i = 0; i < z.length; i++) {
            for (int j = i; j < z.length; j++) {
                assertEquals(expected[k][0], z[i][j].getReal() * MILE, PRINTED);
                assertEquals(expected[k][1], z[i][j].getImaginary() * MILE, PRINTED + ROUNDED_CONSTANT);
                k++;
            }
        }
    }

    /** CAR-601: IEEE 13 Node Test Feeder (IEEE PES Distribution System Analysis Subcommittee), configuration 601, phases B A C N. */
    @Test
    void feederConfiguration601_hasPublishedMatrix() {
        Complex[][] z = SeriesImpedance.matrix(List.of(conductor(2.5, 28, 0.0313, 0.1859), conductor(0, 28, 0.0313, 0.1859),
            conductor(7, 28, 0.0313, 0.1859), conductor(4, 24, 0.00814, 0.592)), EARTH, ImpedanceFormula.MODIFIED_CARSON);
        assertUpperTriangle(new double[][] {{0.3465, 1.0179}, {0.1560, 0.5017}, {0.1580, 0.4236}, {0.3375, 1.0478}, {0.1535, 0.3849},
            {0.3414, 1.0348}}, SeriesImpedance.kronReduce(z, 3));
    }

    /** CAR-603: the same feeder, configuration 603, rows B and C. */
    @Test
    void feederConfiguration603_hasPublishedMatrix() {
        Complex[][] z = SeriesImpedance.matrix(List.of(conductor(7, 28, 0.00446, 1.12), conductor(0, 28, 0.00446, 1.12),
            conductor(4, 24, 0.00446, 1.12)), EARTH, ImpedanceFormula.MODIFIED_CARSON);
        assertUpperTriangle(new double[][] {{1.3294, 1.3471}, {0.2066, 0.4591}, {1.3238, 1.3569}}, SeriesImpedance.kronReduce(z, 2));
    }

    /** CAR-K1, K2, K3: Kersting, Distribution System Modeling and Analysis, Example 4.1 (the sequence impedances from memory). */
    @Test
    void kerstingExample_hasPublishedMatrices() {
        Complex[][] z = SeriesImpedance.matrix(List.of(conductor(0, 29, 0.0244, 0.306), conductor(2.5, 29, 0.0244, 0.306),
            conductor(7, 29, 0.0244, 0.306), conductor(4, 25, 0.00814, 0.592)), EARTH, ImpedanceFormula.MODIFIED_CARSON);
        assertUpperTriangle(new double[][] {{0.4013, 1.4133}, {0.0953, 0.8515}, {0.0953, 0.7266}, {0.0953, 0.7524}, {0.4013, 1.4133},
            {0.0953, 0.7802}, {0.0953, 0.7865}, {0.4013, 1.4133}, {0.0953, 0.7674}, {0.6873, 1.5465}}, z);
        Complex[][] reduced = SeriesImpedance.kronReduce(z, 3);
        assertUpperTriangle(new double[][] {{0.4576, 1.0780}, {0.1560, 0.5017}, {0.1535, 0.3849}, {0.4666, 1.0482}, {0.1580, 0.4236},
            {0.4615, 1.0651}}, reduced);
        Complex self = reduced[0][0].add(reduced[1][1]).add(reduced[2][2]).divide(3);
        Complex mutual = reduced[0][1].add(reduced[0][2]).add(reduced[1][2]).divide(3);
        assertEquals(0.7735, self.add(mutual.multiply(2)).getReal() * MILE, PRINTED);
        assertEquals(1.9373, self.add(mutual.multiply(2)).getImaginary() * MILE, PRINTED + 3 * ROUNDED_CONSTANT);
        assertEquals(0.3061, self.subtract(mutual).getReal() * MILE, PRINTED);
        assertEquals(0.6270, self.subtract(mutual).getImaginary() * MILE, PRINTED);
    }

    /** CAR-C1 and C2: equivalent depth of the earth return, 850 m at 60 Hz and 931.3 m at 50 Hz with 100 ohm m (from memory, certain): 1e-3. */
    @Test
    void returnDepth_hasTextbookValues() {
        assertEquals(850, SeriesImpedance.returnDepthMetres(EARTH), 0.85);
        assertEquals(931.3, SeriesImpedance.returnDepthMetres(new EarthReturn(EarthModel.EXACT_HALF_SPACE, 100, 50, 0)), 0.93);
    }

    /**
     * CAR-C5: Deri et al. 1981, pp. 3691-3692: the complex depth errs by less than 3 % in the mutual impedance up to
     * d / (h_k + h_l) = 2, whatever the ratio of height to skin depth. The recomputed maximum is 2.96 %.
     */
    @Test
    void complexDepth_staysBelowPublishedErrorBound() {
        double greatest = 0;
        for (double alpha = 0.003; alpha < 100; alpha *= 1.05) {
            double delta = Math.sqrt(EARTH.resistivityOhmMetres() / (Math.PI * EARTH.frequencyHertz() * PhysicalConstants.MU0));
            double h = alpha * delta;
            if (h > 9000) {
                break;
            }
            LineConductor a = new LineConductor("a", 0, h, 0.01, 1e-6);
            LineConductor b = new LineConductor("b", 4 * h, h, 0.01, 1e-6);
            Complex carson = SeriesImpedance.matrix(List.of(a, b), EARTH, ImpedanceFormula.CARSON)[0][1];
            Complex deri = SeriesImpedance.matrix(List.of(a, b), EARTH, ImpedanceFormula.COMPLEX_DEPTH)[0][1];
            greatest = Math.max(greatest, deri.subtract(carson).abs() / carson.abs());
        }
        assertEquals(0.0296, greatest, 0.001);
    }

    /** Close conductors low over the earth: Carson's integral tends to its own first series terms; they leave out terms of relative size |kappa| H. */
    @Test
    void carson_tendsToItsFirstTerms() {
        List<LineConductor> low = List.of(new LineConductor("a", 0, 0.5, 0.01, 1e-4), new LineConductor("b", 1, 0.5, 0.01, 1e-4));
        Complex[][] exact = SeriesImpedance.matrix(low, EARTH, ImpedanceFormula.CARSON);
        Complex[][] series = SeriesImpedance.matrix(low, EARTH, ImpedanceFormula.MODIFIED_CARSON);
        double kappaH = 1 / EARTH.complexDepth().abs();
        for (int i = 0; i < 2; i++) {
            for (int j = 0; j < 2; j++) {
                assertTrue(exact[i][j].subtract(series[i][j]).abs() < 2 * kappaH * series[i][j].abs());
                assertTrue(exact[i][j].getReal() > 0, "an impedance that generates power");
            }
        }
        assertEquals(exact[0][1], exact[1][0]);
    }

    /** A shield wire at the place where everything is symmetric to balanced phases still carries the sum that induction asks: Z I = 0. */
    @Test
    void shieldCurrents_cancelTheVoltageAlongTheWire() {
        List<LineConductor> phases = List.of(new LineConductor("A", -8, 20, 0.01, 1e-4), new LineConductor("B", 0, 20, 0.01, 1e-4),
            new LineConductor("C", 8, 20, 0.01, 1e-4));
        List<LineConductor> shields = List.of(new LineConductor("s1", -5, 28, 0.005, 1e-3), new LineConductor("s2", 5, 28, 0.005, 4e-4));
        Complex[] amperes = PhaseCurrents.balanced(800, 0.3, new double[] {0, -2 * Math.PI / 3, 2 * Math.PI / 3});
        for (ImpedanceFormula formula : ImpedanceFormula.values()) {
            ShieldWireCurrents operator = ShieldWireCurrents.of(phases, shields, EARTH, formula);
            Complex[] induced = operator.apply(amperes);
            java.util.ArrayList<LineConductor> all = new java.util.ArrayList<>(shields);
            all.addAll(phases);
            Complex[][] z = SeriesImpedance.matrix(all, EARTH, formula);
            for (int s = 0; s < 2; s++) {
                Complex volts = z[s][0].multiply(induced[0]).add(z[s][1].multiply(induced[1]));
                double scale = 0;
                for (int p = 0; p < 3; p++) {
                    volts = volts.add(z[s][2 + p].multiply(amperes[p]));
                    scale += z[s][2 + p].multiply(amperes[p]).abs();
                }
                // rounding of a well-conditioned system of four
                assertEquals(0, volts.abs() / scale, 1e-12);
            }
            assertTrue(operator.residual() < 1e-12);
        }
    }

    /** Direct current induces nothing. */
    @Test
    void directCurrent_inducesNothing() {
        EarthReturn direct = new EarthReturn(EarthModel.EXACT_HALF_SPACE, 100, 0, 0);
        ShieldWireCurrents operator = ShieldWireCurrents.of(List.of(new LineConductor("p", 0, 20, 0.01, 1e-4)),
            List.of(new LineConductor("s", 0, 28, 0.005, 1e-3)), direct, ImpedanceFormula.CARSON);
        assertEquals(Complex.ZERO, operator.apply(new Complex[] {new Complex(1000)})[0]);
    }
}
