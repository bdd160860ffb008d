/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.tests.invariant;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.concurrent.atomic.AtomicInteger;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;
import spanfield.solver.Progress;
import spanfield.solver.SolverCancelledException;
import spanfield.solver.SolverInputException;
import spanfield.solver.SolverInputException.Reason;
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
import spanfield.solver.geometry.WireEnd;
import spanfield.solver.geometry.WirePath;
import spanfield.solver.line.ParallelWiresField;
import spanfield.solver.tests.support.Lines;
import spanfield.solver.tests.support.RandomLines;

/** Symmetries, laws and limits that hold for any line. */
class FieldInvariantTest {

    /** Relative to the resultant; both sides are computed to the asked 1e-6. */
    private static final double ASKED = 1e-6;

    private static final EarthReturn EXACT = new EarthReturn(EarthModel.EXACT_HALF_SPACE, 100, 50, 0);
    private static final EarthReturn IMAGES = new EarthReturn(EarthModel.COMPLEX_IMAGES, 100, 50, 0);

    private static Wire sagged(double x, double z, double swing) {
        List<CatenarySpan> spans = new ArrayList<>();
        for (int i = -3; i <= 3; i++) {
            spans.add(CatenarySpan.ofConstant(new Position(x, 300 * i - 150, z), new Position(x, 300 * i + 150, z), 1500, swing));
        }
        return new Wire("x " + x, new WirePath(spans, WireEnd.CONTINUES, WireEnd.CONTINUES), 0.014);
    }

    private static List<Wire> flat(double swing) {
        return List.of(sagged(-9, 22, swing), sagged(0, 22, swing), sagged(9, 22, swing));
    }

    @Test
    void mirroredLine_hasMirroredField() {
        Complex[] abc = Lines.circuit(700, "ABC");
        Complex[] cba = Lines.circuit(700, "CBA");
        FieldPhasors right = Lines.field(flat(0.4), ObservationPoints.lateral(-60, 60, 25, 10, 1), EXACT, abc);
        FieldPhasors left = Lines.field(flat(-0.4), ObservationPoints.lateral(60, -60, 25, 10, 1), EXACT, cba);
        for (int i = 0; i < 25; i++) {
            assertEquals(right.resultantTesla(i), left.resultantTesla(i), ASKED * right.resultantTesla(i));
            assertEquals(right.majorAxisTesla(i), left.majorAxisTesla(i), ASKED * right.majorAxisTesla(i));
        }
    }

    @Test
    void commonPhaseRotationAndReversal_changeNothing() {
        TransferCoefficients transfer = Lines.transfer(flat(0), ObservationPoints.lateral(-60, 60, 25, 0, 1), EXACT);
        Complex[] abc = Lines.circuit(700, "ABC");
        Complex turn = new Complex(Math.cos(1.1), Math.sin(1.1));
        Complex[] turned = new Complex[3];
        Complex[] reversed = new Complex[3];
        for (int i = 0; i < 3; i++) {
            turned[i] = abc[i].multiply(turn);
            reversed[i] = abc[i].negate();
        }
        FieldPhasors field = transfer.combine(abc);
        // rounding only: the coefficients are the same
        final double rounding = 1e-12;
        for (int i = 0; i < 25; i++) {
            assertEquals(field.resultantTesla(i), transfer.combine(turned).resultantTesla(i), rounding * field.resultantTesla(i));
            assertEquals(field.majorAxisTesla(i), transfer.combine(turned).majorAxisTesla(i), rounding * field.resultantTesla(i));
            assertEquals(field.resultantTesla(i), transfer.combine(reversed).resultantTesla(i), rounding * field.resultantTesla(i));
        }
    }

    @Test
    void superposition_holds() {
        TransferCoefficients transfer = Lines.transfer(flat(0), ObservationPoints.lateral(-60, 60, 9, 0, 1), IMAGES);
        Complex[] a = Lines.circuit(700, "ABC");
        Complex[] b = {new Complex(3, 4), new Complex(-20, 1), Complex.ZERO};
        Complex[] sum = {a[0].add(b[0]), a[1].add(b[1]), a[2].add(b[2])};
        for (int i = 0; i < 9; i++) {
            for (int c = 0; c < 3; c++) {
                Complex expected = transfer.combine(a).component(c, i).add(transfer.combine(b).component(c, i));
                assertEquals(0, expected.subtract(transfer.combine(sum).component(c, i)).abs(), 1e-18);
            }
        }
    }

    /** Gauss's and Ampere's laws away from the wires: divergence and curl vanish, by central differences over a thousandth of the distance. */
    @Test
    void field_hasNoDivergenceAndNoCurl() {
        Random random = new Random(3);
        // relative to the greatest derivative: the square of the step, 1e-6, times a factor for higher derivatives
        final double differences = 1e-4;
        for (int t = 0; t < 100; t++) {
            Wire base = RandomLines.wire(random, "wire");
            Wire wire = new Wire("wire", new WirePath(base.path().spans(), WireEnd.CONTINUES, WireEnd.CONTINUES), 0.01);
            Position p = RandomLines.pointNear(random, wire);
            double step = 1e-3 * distance(wire, p);
            Position[] star = new Position[6];
            for (int axis = 0; axis < 3; axis++) {
                for (int sign = 0; sign < 2; sign++) {
                    double d = sign == 0 ? step : -step;
                    star[2 * axis + sign] = new Position(p.x() + (axis == 0 ? d : 0), p.y() + (axis == 1 ? d : 0), p.z() + (axis == 2 ? d : 0));
                }
            }
            FieldPhasors field = MagneticFieldSolver.sequential().solve(List.of(wire), ObservationPoints.of(star), EarthReturn.none(),
                new Accuracy(1e-12), Progress.NONE).combine(new Complex[] {Complex.ONE});
            double[][] gradient = new double[3][3];
            double greatest = 0;
            for (int axis = 0; axis < 3; axis++) {
                for (int c = 0; c < 3; c++) {
                    gradient[axis][c] = (field.component(c, 2 * axis).getReal() - field.component(c, 2 * axis + 1).getReal()) / (2 * step);
                    greatest = Math.max(greatest, Math.abs(gradient[axis][c]));
                }
            }
            assertEquals(0, gradient[0][0] + gradient[1][1] + gradient[2][2], differences * greatest);
            assertEquals(0, gradient[1][2] - gradient[2][1], differences * greatest);
            assertEquals(0, gradient[2][0] - gradient[0][2], differences * greatest);
            assertEquals(0, gradient[0][1] - gradient[1][0], differences * greatest);
        }
    }

    /** Distance of a point to the spans of a wire in metres, from samples. */
    private static double distance(Wire wire, Position p) {
        double least = Double.POSITIVE_INFINITY;
        for (CatenarySpan span : wire.path().spans()) {
            for (int i = 0; i <= 4000; i++) {
                least = Math.min(least, span.at(span.horizontalLengthMetres() * i / 4000).distanceTo(p));
            }
        }
        return least;
    }

    @Test
    void turnedAndShiftedLine_hasTurnedField() {
        Random random = new Random(9);
        for (int t = 0; t < 50; t++) {
            Wire wire = RandomLines.wire(random, "wire");
            Position p = RandomLines.pointNear(random, wire);
            double angle = random.nextDouble() * 6;
            List<CatenarySpan> spans = wire.path().spans().stream().map(s -> CatenarySpan.ofConstant(turn(s.start(), angle), turn(s.end(), angle),
                s.constantMetres(), s.swingRadians())).toList();
            // consecutive spans must share their end exactly
            List<CatenarySpan> joined = new ArrayList<>();
            Position at = spans.get(0).start();
            for (CatenarySpan s : spans) {
                joined.add(CatenarySpan.ofConstant(at, s.end(), s.constantMetres(), s.swingRadians()));
                at = s.end();
            }
            Wire turned = new Wire("turned", new WirePath(joined, wire.path().start(), wire.path().finish()), wire.radiusMetres());
            double here = Lines.field(List.of(wire), ObservationPoints.of(p), EarthReturn.none(), new Complex[] {Complex.ONE}).resultantTesla(0);
            double there = Lines.field(List.of(turned), ObservationPoints.of(turn(p, angle)), EarthReturn.none(), new Complex[] {Complex.ONE}).resultantTesla(0);
            assertEquals(here, there, ASKED * here);
        }
    }

    private static Position turn(Position p, double angle) {
        return new Position(p.x() * Math.cos(angle) - p.y() * Math.sin(angle) + 30, p.x() * Math.sin(angle) + p.y() * Math.cos(angle) - 70, p.z() + 4);
    }

    /** Straight level wires: the solver's earth models equal the two-dimensional closed forms, a second method. */
    @Test
    void straightLevelLine_equalsTwoDimensionalEarthModels() {
        double[] x = {-9, 0, 9};
        double[] z = {14, 14, 14};
        double[] offsets = {-300, -40, 0, 12, 90, 700, 3000};
        Complex[] amperes = {new Complex(500), new Complex(-200, -400), new Complex(-260, 380)};
        for (EarthReturn earth : List.of(EXACT, IMAGES, EarthReturn.none())) {
            FieldPhasors field = Lines.field(Lines.straight(x, z), Lines.at(1, offsets), earth, amperes);
            for (int i = 0; i < offsets.length; i++) {
                Complex[] expected = ParallelWiresField.at(offsets[i], 1, List.of(-9.0, 0.0, 9.0), List.of(14.0, 14.0, 14.0), amperes, earth);
                double size = Math.hypot(expected[0].abs(), expected[1].abs());
                assertEquals(0, expected[0].subtract(field.component(0, i)).abs(), ASKED * size);
                assertEquals(0, field.component(1, i).abs(), ASKED * size);
                assertEquals(0, expected[1].subtract(field.component(2, i)).abs(), ASKED * size);
            }
        }
    }

    /** Images of sagged, turning wires: dense points (interpolated) equal single points (evaluated directly). */
    @Test
    void interpolatedImages_equalDirectOnes() {
        Random random = new Random(21);
        for (int t = 0; t < 10; t++) {
            List<Wire> wires = List.of(RandomLines.wire(random, "a"), RandomLines.wire(random, "b"));
            EarthReturn earth = new EarthReturn(EarthModel.COMPLEX_IMAGES, Math.pow(10, random.nextDouble() * 4), 50, -250);
            ObservationPoints dense = ObservationPoints.lateral(-200, 200, 401, 3, -200);
            TransferCoefficients many = Lines.transfer(wires, dense, earth);
            for (int i = 0; i < 401; i += 37) {
                TransferCoefficients one = Lines.transfer(wires, ObservationPoints.of(dense.position(i)), earth);
                for (int w = 0; w < 2; w++) {
                    double bound = many.numericalError(w, i) + one.numericalError(w, 0);
                    for (int c = 0; c < 3; c++) {
                        double difference = many.coefficient(w, c, i).subtract(one.coefficient(w, c, 0)).abs();
                        assertTrue(difference <= bound + 1e-21, "difference " + difference + ", bound " + bound);
                    }
                }
            }
        }
    }

    /** A wire cut in two that ends where the other begins is the same wire, under every earth model. */
    @Test
    void wiresJoinedEndToEnd_areOneWire() {
        CatenarySpan first = CatenarySpan.ofConstant(new Position(4, -200, 20), new Position(4, 0, 20), 1200, 0);
        CatenarySpan second = CatenarySpan.ofConstant(new Position(4, 0, 20), new Position(4, 250, 20), 1200, 0);
        List<Wire> joined = List.of(new Wire("a", new WirePath(List.of(first), WireEnd.CONTINUES, WireEnd.ENDS), 0.01),
            new Wire("b", new WirePath(List.of(second), WireEnd.ENDS, WireEnd.CONTINUES), 0.01));
        Wire whole = new Wire("whole", new WirePath(List.of(first, second), WireEnd.CONTINUES, WireEnd.CONTINUES), 0.01);
        ObservationPoints points = ObservationPoints.lateral(-300, 300, 61, 40, 1);
        // the two halves have other mean heights than the whole, by a metre in some hundred of complex depth
        final double meanHeights = 2e-5;
        for (EarthReturn earth : List.of(EXACT, IMAGES, EarthReturn.none())) {
            FieldPhasors two = Lines.field(joined, points, earth, new Complex[] {new Complex(100), new Complex(100)});
            FieldPhasors one = Lines.field(List.of(whole), points, earth, new Complex[] {new Complex(100)});
            for (int i = 0; i < points.size(); i++) {
                assertEquals(one.resultantTesla(i), two.resultantTesla(i), meanHeights * one.resultantTesla(i));
                assertEquals(one.modelErrorTesla(i), two.modelErrorTesla(i), 1e-3 * one.resultantTesla(i));
            }
        }
    }

    /** The exact half-space on dense profiles and slanting rows (interpolated) equals that at single points (evaluated directly). */
    @Test
    void interpolatedHalfSpace_equalsDirectOne() {
        List<Wire> wires = flat(0.2);
        for (double resistivity : new double[] {1, 100, 1e4}) {
            EarthReturn earth = new EarthReturn(EarthModel.EXACT_HALF_SPACE, resistivity, 60, 0);
            for (double slope : new double[] {0, 0.4}) {
                Position[] row = new Position[401];
                for (int i = 0; i < row.length; i++) {
                    row[i] = new Position(-100 + 0.5 * i, slope * (i - 200), 1 + 0.01 * slope * i);
                }
                TransferCoefficients many = Lines.transfer(wires, ObservationPoints.of(row), earth);
                for (int i = 0; i < row.length; i += 25) {
                    TransferCoefficients one = Lines.transfer(wires, ObservationPoints.of(row[i]), earth);
                    for (int w = 0; w < wires.size(); w++) {
                        double bound = many.numericalError(w, i) + one.numericalError(w, 0);
                        double square = 0;
                        for (int c = 0; c < 3; c++) {
                            double difference = many.coefficient(w, c, i).subtract(one.coefficient(w, c, 0)).abs();
                            square += difference * difference;
                        }
                        assertTrue(Math.sqrt(square) <= bound, row[i] + ": difference " + Math.sqrt(square) + ", bound " + bound);
                    }
                }
            }
        }
    }

    /** Insulating earth adds nothing; perfectly conducting earth leaves no vertical field at its surface. */
    @Test
    void resistivityLimits_areMirrorAndNothing() {
        Complex[] amperes = {new Complex(100), new Complex(50), new Complex(-30)};
        ObservationPoints points = Lines.at(1, -20, 0, 35);
        FieldPhasors free = Lines.field(flat(0), points, EarthReturn.none(), amperes);
        FieldPhasors insulating = Lines.field(flat(0), points, new EarthReturn(EarthModel.EXACT_HALF_SPACE, 1e7, 50, 0), amperes);
        for (int i = 0; i < 3; i++) {
            // the return is about 150 km deep: 15 m / 150 km
            assertEquals(free.resultantTesla(i), insulating.resultantTesla(i), 1e-3 * free.resultantTesla(i));
        }
        // perfectly conducting: no vertical field at the surface
        FieldPhasors conducting = Lines.field(flat(0), Lines.at(0, -20, 0, 35), new EarthReturn(EarthModel.EXACT_HALF_SPACE, 1e-3, 1e4, 0), amperes);
        for (int i = 0; i < 3; i++) {
            assertTrue(conducting.component(2, i).abs() < 0.03 * conducting.resultantTesla(i));
        }
    }

    @Test
    void directCurrent_hasNoEarthImage() {
        EarthReturn direct = new EarthReturn(EarthModel.EXACT_HALF_SPACE, 100, 0, 0);
        Complex[] amperes = {new Complex(100), new Complex(-100), Complex.ZERO};
        FieldPhasors a = Lines.field(flat(0), Lines.at(1, 3), direct, amperes);
        FieldPhasors b = Lines.field(flat(0), Lines.at(1, 3), EarthReturn.none(), amperes);
        assertEquals(b.resultantTesla(0), a.resultantTesla(0), 0);
        assertEquals(0, a.modelErrorTesla(0), 0);
    }

    @Test
    void parallelAndSequential_agreeBitByBit() {
        ObservationPoints points = ObservationPoints.lateral(-200, 200, 401, 20, 1);
        TransferCoefficients a = MagneticFieldSolver.parallel().solve(flat(0.1), points, EXACT, Accuracy.DEFAULT, Progress.NONE);
        TransferCoefficients b = MagneticFieldSolver.sequential().solve(flat(0.1), points, EXACT, Accuracy.DEFAULT, Progress.NONE);
        for (int w = 0; w < 3; w++) {
            for (int part = 0; part < 2; part++) {
                for (int c = 0; c < 3; c++) {
                    assertArrayEquals(a.coefficients(w)[part][c], b.coefficients(w)[part][c], 0);
                }
            }
        }
    }

    @Test
    void cancelledSolve_stops() {
        AtomicInteger reports = new AtomicInteger();
        Progress progress = new Progress() {
            @Override
            public void report(double fraction) {
                reports.incrementAndGet();
            }

            @Override
            public boolean cancelled() {
                return reports.get() >= 2;
            }
        };
        ObservationPoints points = ObservationPoints.lateral(-2000, 2000, 40001, 20, 1);
        assertThrows(SolverCancelledException.class,
            () -> MagneticFieldSolver.parallel().solve(flat(0), points, EXACT, Accuracy.DEFAULT, progress));
        assertTrue(reports.get() < 20, "blocks after cancellation: " + reports.get());
    }

    @Test
    void pointInsideConductor_isRefusedWithItsPlace() {
        Wire wire = sagged(0, 22, 0);
        Position on = wire.path().spans().get(3).at(110);
        for (double shift : new double[] {0, 0.005, 0.0139}) {
            Position inside = new Position(on.x() + shift, on.y(), on.z());
            SolverInputException refused = assertThrows(SolverInputException.class,
                () -> Lines.transfer(List.of(wire), ObservationPoints.of(inside), EarthReturn.none()));
            assertEquals(Reason.POINT_INSIDE_CONDUCTOR, refused.reason());
            assertTrue(refused.getMessage().contains("wire 'x 0.0'"), refused.getMessage());
        }
        Lines.transfer(List.of(wire), ObservationPoints.of(new Position(on.x() + 0.0142, on.y(), on.z())), EarthReturn.none());
        Position onTail = new Position(0, 5000, 22);
        assertThrows(SolverInputException.class, () -> Lines.transfer(List.of(wire), ObservationPoints.of(onTail), EarthReturn.none()));
    }

    @Test
    void deadEnd_isWarnedOf() {
        TransferCoefficients transfer = Lines.transfer(List.of(Lines.finite(new Position(0, 0, 9), new Position(0, 50, 9))), Lines.at(1, 5),
            EarthReturn.none());
        assertEquals(1, transfer.warnings().size());
    }

    @Test
    void bundleMergedFromSubconductors_equalsTheirSum() {
        List<Wire> wires = Lines.straight(new double[] {-0.2, 0.2, 8}, new double[] {15, 15, 15});
        TransferCoefficients each = Lines.transfer(wires, Lines.at(1, 3, 30), EXACT);
        TransferCoefficients merged = each.merge(new int[] {0, 0, 1}, new double[] {0.5, 0.5, 1}, 2);
        FieldPhasors a = each.combine(new Complex[] {new Complex(50), new Complex(50), new Complex(-80)});
        FieldPhasors b = merged.combine(new Complex[] {new Complex(100), new Complex(-80)});
        for (int i = 0; i < 2; i++) {
            assertEquals(a.resultantTesla(i), b.resultantTesla(i), 1e-12 * a.resultantTesla(i));
            assertEquals(a.modelErrorTesla(i), b.modelErrorTesla(i), 1e-12 * a.resultantTesla(i));
        }
    }

    @Test
    void measures_ofLinearAndCircularFields() {
        TransferCoefficients transfer = Lines.transfer(Lines.straight(new double[] {0, 10}, new double[] {11, 1}), Lines.at(1, 0), EarthReturn.none());
        // below the first wire the field is horizontal, beside the second vertical, both 10 m away: equal currents in quadrature make a circle
        FieldPhasors circular = transfer.combine(new Complex[] {new Complex(100), new Complex(0, 100)});
        assertEquals(1, circular.axialRatio(0), 1e-6);
        assertEquals(Math.sqrt(2), circular.resultantTesla(0) / circular.majorAxisTesla(0), 1e-6);
        FieldPhasors linear = transfer.combine(new Complex[] {new Complex(100), new Complex(100)});
        assertEquals(0, linear.axialRatio(0), 1e-12);
        assertArrayEquals(new double[] {-Math.sqrt(0.5), 0, Math.sqrt(0.5)}, linear.majorAxisDirection(0), 1e-6);
        FieldPhasors none = transfer.combine(new Complex[] {Complex.ZERO, Complex.ZERO});
        assertEquals(0, none.resultantTesla(0), 0);
        assertEquals(0, none.axialRatio(0), 0);
    }
}
