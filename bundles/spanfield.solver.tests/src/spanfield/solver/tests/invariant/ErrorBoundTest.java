/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.tests.invariant;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Random;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import spanfield.solver.Progress;
import spanfield.solver.SolverInputException;
import spanfield.solver.earth.EarthModel;
import spanfield.solver.earth.EarthReturn;
import spanfield.solver.field.Accuracy;
import spanfield.solver.field.FieldPhasors;
import spanfield.solver.field.MagneticFieldSolver;
import spanfield.solver.field.ObservationPoints;
import spanfield.solver.field.TransferCoefficients;
import spanfield.solver.geometry.CatenarySpan;
import spanfield.solver.geometry.Position;
import spanfield.solver.geometry.Wire;
import spanfield.solver.geometry.WirePath;
import spanfield.solver.tests.support.Lines;
import spanfield.solver.tests.support.RandomLines;
import spanfield.solver.tests.support.ReferenceField;
import spanfield.solver.tests.support.ReferenceImage;

/** The error bound that a result carries holds, and is not idle; points from 0.3 m off a conductor to 5 km away. */
class ErrorBoundTest {

    private static final int WIRES = 1500;

    @ParameterizedTest
    @ValueSource(doubles = {1e-3, 1e-6, 1e-9})
    void randomWires_errorStaysBelowBound(double asked) {
        Random random = new Random(20261201);
        int refusals = 0;
        for (int t = 0; t < WIRES; t++) {
            Wire wire = RandomLines.wire(random, "wire " + t);
            Position[] points = run(random, RandomLines.pointNear(random, wire), 1 + random.nextInt(t % 3 == 0 ? 90 : 20));
            FieldPhasors field;
            try {
                field = MagneticFieldSolver.sequential()
                    .solve(List.of(wire), ObservationPoints.of(points), EarthReturn.none(), new Accuracy(asked), Progress.NONE)
                    .combine(new Complex[] {Complex.ONE});
            } catch (SolverInputException refused) {
                // a random row of points may run through the wire
                assertEquals(SolverInputException.Reason.POINT_INSIDE_CONDUCTOR, refused.reason());
                refusals++;
                continue;
            }
            for (int i = 0; i < points.length; i += 4) {
                double error = distance(field, i, ReferenceField.of(wire, points[i]));
                assertTrue(error <= field.numericalErrorTesla(i), "wire " + t + ", point " + points[i] + ": error " + error + " T, bound "
                    + field.numericalErrorTesla(i) + " T");
            }
        }
        assertTrue(refusals < 10, "rows through a wire: " + refusals);
    }

    /** A row of neighbouring points from a first one in a random direction. */
    private static Position[] run(Random random, Position first, int count) {
        double dx = random.nextGaussian();
        double dy = random.nextGaussian();
        double dz = 0.1 * random.nextGaussian();
        Position[] points = new Position[count];
        for (int i = 0; i < count; i++) {
            points[i] = new Position(first.x() + i * dx, first.y() + i * dy, first.z() + i * dz);
        }
        return points;
    }

    private static double distance(FieldPhasors field, int point, double[] reference) {
        double sum = 0;
        for (int c = 0; c < 3; c++) {
            double difference = field.component(c, point).getReal() - reference[c];
            sum += difference * difference;
        }
        return Math.sqrt(sum);
    }

    /**
     * Points on the chord of a sagged span, between its attachments, where the distance to the chord is zero or below rounding: the panels'
     * cuts coincide there.
     */
    @ParameterizedTest
    @ValueSource(doubles = {0, 1e-17, 1e-12, 1e-6, -0.3})
    void pointsOnTheChord_haveTrueFiniteBounds(double aside) {
        Wire wire = sagged(0, 22);
        for (double y : new double[] {-450, -140, -75, -3, 0, 40, 149, 300}) {
            Position point = new Position(aside, y == -450 ? -449 : y, 22);
            FieldPhasors field = Lines.field(List.of(wire), ObservationPoints.of(point), EarthReturn.none(), new Complex[] {Complex.ONE});
            double error = distance(field, 0, ReferenceField.of(wire, point));
            assertTrue(error <= field.numericalErrorTesla(0), point + ": error " + error + " T, bound " + field.numericalErrorTesla(0) + " T");
            assertTrue(field.numericalErrorTesla(0) <= 1e-5 * field.resultantTesla(0), point + ": bound " + field.numericalErrorTesla(0) + " T");
        }
    }

    /** Complex images of sagged, swung, steep and turning wires, tails included, against brute force in complex arithmetic. */
    @ParameterizedTest
    @ValueSource(doubles = {0.01, 1, 100, 1e4})
    void images_errorStaysBelowBound(double resistivity) {
        Random random = new Random(77);
        for (int t = 0; t < 60; t++) {
            Wire wire = RandomLines.wire(random, "wire " + t);
            double plane = lowest(wire) - 6;
            Position anchor = RandomLines.pointNear(random, wire);
            Position point = new Position(anchor.x(), anchor.y(), plane + 1);
            EarthReturn earth = new EarthReturn(EarthModel.COMPLEX_IMAGES, resistivity, 50, plane);
            TransferCoefficients with = Lines.transfer(List.of(wire), ObservationPoints.of(point), earth);
            double[] free = ReferenceField.of(wire, point);
            Complex[] image = ReferenceImage.of(wire, point, earth);
            double square = 0;
            for (int c = 0; c < 3; c++) {
                double difference = with.coefficient(0, c, 0).subtract(image[c]).subtract(free[c]).abs();
                square += difference * difference;
            }
            // brute force itself: rounding of some hundred terms
            double own = 1e-13 * (Math.abs(free[0]) + Math.abs(free[1]) + Math.abs(free[2]));
            assertTrue(Math.sqrt(square) <= with.numericalError(0, 0) + own,
                "wire " + t + ": error " + Math.sqrt(square) + ", bound " + with.numericalError(0, 0));
        }
    }

    private static double lowest(Wire wire) {
        return wire.path().spans().stream().mapToDouble(span -> span.lowestPoint().z()).min().orElseThrow();
    }

    /** A sagged three-phase line: the resultant keeps the asked accuracy although balanced phases cancel, out to 5 km. */
    @Test
    void balancedLine_resultantKeepsAskedAccuracy() {
        List<Wire> wires = new ArrayList<>();
        for (double x : new double[] {-9, 0, 9}) {
            wires.add(sagged(x, 22));
        }
        Complex[] amperes = Lines.circuit(1000, "ABC");
        double[] offsets = {0, 5, 9, 15, 40, 100, 300, 1000, 2500, 5000};
        ObservationPoints points = Lines.at(1, offsets);
        FieldPhasors field = Lines.field(wires, points, EarthReturn.none(), amperes);
        for (int i = 0; i < offsets.length; i++) {
            Complex[] exact = {Complex.ZERO, Complex.ZERO, Complex.ZERO};
            for (int w = 0; w < 3; w++) {
                double[] reference = ReferenceField.of(wires.get(w), points.position(i));
                for (int c = 0; c < 3; c++) {
                    exact[c] = exact[c].add(amperes[w].multiply(reference[c]));
                }
            }
            double error = 0;
            for (int c = 0; c < 3; c++) {
                error = Math.hypot(error, exact[c].subtract(field.component(c, i)).abs());
            }
            assertTrue(error <= field.numericalErrorTesla(i), "at " + offsets[i] + " m");
            assertTrue(field.numericalErrorTesla(i) <= Accuracy.DEFAULT.relative() * field.resultantTesla(i),
                "bound at " + offsets[i] + " m: " + field.numericalErrorTesla(i) / field.resultantTesla(i));
        }
    }

    private static Wire sagged(double x, double z) {
        List<CatenarySpan> spans = new ArrayList<>();
        for (int i = -3; i <= 3; i++) {
            spans.add(CatenarySpan.ofConstant(new Position(x, 300 * i - 150, z), new Position(x, 300 * i + 150, z), 1500, 0));
        }
        return new Wire("x " + x, new WirePath(spans, spanfield.solver.geometry.WireEnd.CONTINUES, spanfield.solver.geometry.WireEnd.CONTINUES), 0.014);
    }

    /** The bound is of use: over random wires its median is within a factor of a thousand of the true error, where that is above rounding. */
    @Test
    void bound_isNotIdle() {
        Random random = new Random(7);
        List<Double> ratios = new ArrayList<>();
        for (int t = 0; t < 400; t++) {
            Wire wire = RandomLines.wire(random, "wire " + t);
            Position point = RandomLines.pointNear(random, wire);
            FieldPhasors field = MagneticFieldSolver.sequential()
                .solve(List.of(wire), ObservationPoints.of(point), EarthReturn.none(), new Accuracy(1e-4), Progress.NONE)
                .combine(new Complex[] {Complex.ONE});
            double error = distance(field, 0, ReferenceField.of(wire, point));
            if (error > 1e-11 * field.resultantTesla(0)) {
                ratios.add(field.numericalErrorTesla(0) / error);
            }
        }
        Collections.sort(ratios);
        assertTrue(ratios.size() > 100, "enough cases above rounding: " + ratios.size());
        assertTrue(ratios.get(ratios.size() / 2) < 1000, "median of bound over error: " + ratios.get(ratios.size() / 2));
    }
}
