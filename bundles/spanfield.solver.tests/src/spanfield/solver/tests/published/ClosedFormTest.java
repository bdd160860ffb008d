/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.tests.published;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;
import spanfield.solver.Progress;
import spanfield.solver.earth.EarthReturn;
import spanfield.solver.field.Accuracy;
import spanfield.solver.field.FieldPhasors;
import spanfield.solver.field.MagneticFieldSolver;
import spanfield.solver.field.ObservationPoints;
import spanfield.solver.geometry.Position;
import spanfield.solver.tests.support.Lines;

/** Fields that texts give in closed form. */
class ClosedFormTest {

    /** Relative; the solver is asked for 1e-6 and must be better. */
    private static final double ASKED_ACCURACY = 1e-6;

    /** Relative, asked of the solver where the closed form is exact. */
    private static final double FINE = 1e-11;

    private static final double MICROTESLA = 1e-6;

    /** CF-01: Ampere's law, any physics text (from memory, certain): 1000 A at 10 m make 20 uT. */
    @Test
    void infiniteWire_followsAmperesLaw() {
        FieldPhasors field = MagneticFieldSolver.parallel().solve(List.of(Lines.straight("wire", 0, 12)), Lines.at(2, 0), EarthReturn.none(),
            new Accuracy(FINE), Progress.NONE).combine(new Complex[] {new Complex(1000)});
        assertEquals(20e-6, field.resultantTesla(0), 20e-6 * FINE);
    }

    /** CF-02: Biot-Savart of a finite wire, mu0 I/(4 pi d) (sin t1 + sin t2), any physics text (from memory); values to seven digits. */
    @Test
    void finiteWire_followsSineFormula() {
        double[] lengths = {20, 300};
        double[] expected = {14.142136, 19.955703};
        for (int i = 0; i < lengths.length; i++) {
            double half = lengths[i] / 2;
            FieldPhasors field = Lines.field(List.of(Lines.finite(new Position(0, -half, 12), new Position(0, half, 12))), Lines.at(2, 0),
                EarthReturn.none(), new Complex[] {new Complex(1000)});
            assertEquals(expected[i] * MICROTESLA, field.resultantTesla(0), expected[i] * MICROTESLA * ASKED_ACCURACY);
        }
    }

    /**
     * CF-03 and CF-03b: flat line, 1000 A, 10 m apart, 12 m high, points at 1 m: resultant from the closed form
     * (mu0 I / 2 pi) d sqrt(3 r^2 + d^2) / (r r1 r2), and semi-major axis by superposition (derived independently of this project's code).
     */
    @Test
    void flatLine_hasPublishedResultantAndMajorAxis() {
        FieldPhasors field = Lines.field(Lines.straight(new double[] {-10, 0, 10}, new double[] {12, 12, 12}), Lines.at(1, 0, 10, 25, 100),
            EarthReturn.none(), Lines.circuit(1000, "ABC"));
        double[] resultant = {17.702538, 14.800779, 5.188266, 0.34617};
        double[] major = {15.674668, 14.297755, 5.170894, 0.346163};
        // half of the last digit of the table
        final double tolerance = 1e-6 * MICROTESLA;
        for (int i = 0; i < resultant.length; i++) {
            assertEquals(resultant[i] * MICROTESLA, field.resultantTesla(i), tolerance);
            assertEquals(major[i] * MICROTESLA, field.majorAxisTesla(i), tolerance);
        }
    }

    /**
     * CF-04: Energiforsk, questions and answers no. 7: B = 0.35 I d / s^2 uT gives 0.13 uT (as printed) for 350 A, 5 m, 70 m. The exact
     * factor is 0.3464, so the printed two digits hold to 0.008 uT.
     */
    @Test
    void farFieldOfACircuit_matchesPublishedRule() {
        FieldPhasors field = Lines.field(Lines.straight(new double[] {-5, 0, 5}, new double[] {12, 12, 12}), Lines.at(12, 70),
            EarthReturn.none(), Lines.circuit(350, "ABC"));
        assertEquals(0.13 * MICROTESLA, field.resultantTesla(0), 0.008 * MICROTESLA);
    }

    /**
     * CF-06: UK network operators' information site, How fields fall with distance: inverse square for an untransposed double circuit
     * (ABC/ABC), inverse cube for a transposed one (ABC/CBA). Exponents between 400 m and 800 m to 0.001.
     */
    @Test
    void doubleCircuit_fallsAsSquareOrCube() {
        double[] x = {-5, -5, -5, 5, 5, 5};
        double[] z = {30, 24, 18, 30, 24, 18};
        ObservationPoints points = Lines.at(24, 400, 800);
        assertEquals(2, exponent(Lines.field(Lines.straight(x, z), points, EarthReturn.none(),
            Lines.concat(Lines.circuit(500, "ABC"), Lines.circuit(500, "ABC")))), 0.001);
        assertEquals(3, exponent(Lines.field(Lines.straight(x, z), points, EarthReturn.none(),
            Lines.concat(Lines.circuit(500, "ABC"), Lines.circuit(500, "CBA")))), 0.001);
    }

    private static double exponent(FieldPhasors field) {
        return Math.log(field.resultantTesla(0) / field.resultantTesla(1)) / Math.log(2);
    }
}
