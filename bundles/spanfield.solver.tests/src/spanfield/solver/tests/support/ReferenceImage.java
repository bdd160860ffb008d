/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.tests.support;

import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import org.apache.commons.math3.complex.Complex;
import spanfield.solver.PhysicalConstants;
import spanfield.solver.earth.EarthReturn;
import spanfield.solver.geometry.CatenarySpan;
import spanfield.solver.geometry.Position;
import spanfield.solver.geometry.Wire;
import spanfield.solver.geometry.WireEnd;

/**
 * Field per ampere of a wire's complex image by brute force, as an independent second method: Biot-Savart law in complex arithmetic of
 * Commons Math over the path of the image, (X, Y, 2 Zg - Z - 2p) with the current reversed (Deri et al. 1981), in panels shorter than
 * half the distance |Re| of the image, 32 Gauss-Legendre nodes each. Tails by panels that double out to 1e9 times the distance. The slope
 * of the path is a central difference, so that it does not share the solver's formula.
 */
public final class ReferenceImage {

    private static final GaussIntegrator RULE = new GaussIntegratorFactory().legendre(32);

    private final Position point;
    private final Complex twiceDepth;
    private final double planeTwice;
    private final Complex[] sum = {Complex.ZERO, Complex.ZERO, Complex.ZERO};

    private ReferenceImage(Position point, EarthReturn earth) {
        this.point = point;
        this.twiceDepth = earth.complexDepth().multiply(2);
        this.planeTwice = 2 * earth.planeElevationMetres();
    }

    /** Field per ampere in tesla, components X, Y, Z. */
    public static Complex[] of(Wire wire, Position point, EarthReturn earth) {
        ReferenceImage image = new ReferenceImage(point, earth);
        for (CatenarySpan span : wire.path().spans()) {
            image.span(span);
        }
        if (wire.path().start() == WireEnd.CONTINUES) {
            image.tail(wire.path().spans().get(0), true);
        }
        if (wire.path().finish() == WireEnd.CONTINUES) {
            image.tail(wire.path().spans().get(wire.path().spans().size() - 1), false);
        }
        Complex[] field = new Complex[3];
        for (int c = 0; c < 3; c++) {
            field[c] = image.sum[c].multiply(PhysicalConstants.MU0 / (4 * Math.PI));
        }
        return field;
    }

    private double distance(double lowest) {
        return point.z() + lowest - planeTwice + twiceDepth.getReal();
    }

    private void span(CatenarySpan span) {
        double length = span.horizontalLengthMetres();
        int panels = (int) Math.ceil(4 * span.lengthMetres() / distance(span.lowestPoint().z()));
        double width = length / panels;
        for (int i = 0; i < panels; i++) {
            for (int k = 0; k < RULE.getNumberOfPoints(); k++) {
                double s = (i + 0.5 + RULE.getPoint(k) / 2) * width;
                double weight = RULE.getWeight(k) * width / 2;
                double step = 1e-3 * width;
                // five-point difference: the error is step^4 / 30 times the fifth derivative, below 1e-14 for catenaries
                double[] slope = new double[3];
                double[] factors = {1, -8, 8, -1};
                double[] places = {-2, -1, 1, 2};
                for (int j = 0; j < 4; j++) {
                    Position at = span.at(s + places[j] * step);
                    slope[0] += factors[j] * (at.x() - span.start().x()) / (12 * step);
                    slope[1] += factors[j] * (at.y() - span.start().y()) / (12 * step);
                    slope[2] += factors[j] * (at.z() - span.start().z()) / (12 * step);
                }
                add(span.at(s), slope, weight);
            }
        }
    }

    private void tail(CatenarySpan span, boolean start) {
        Position from = start ? span.start() : span.end();
        double length = span.horizontalLengthMetres();
        double ux = (span.end().x() - span.start().x()) / length;
        double uy = (span.end().y() - span.start().y()) / length;
        double sign = start ? -1 : 1;
        double foot = Math.max(0, sign * (ux * (point.x() - from.x()) + uy * (point.y() - from.y())));
        double reach = distance(from.z());
        for (int side = -1; side <= 1; side += 2) {
            double begin = foot;
            double step = reach / 2;
            while (side > 0 ? begin < 1e9 * (reach + foot) : begin > 0) {
                double end = Math.max(0, begin + side * step);
                for (int k = 0; k < RULE.getNumberOfPoints(); k++) {
                    double t = sign * ((begin + end) / 2 + (end - begin) / 2 * RULE.getPoint(k));
                    double weight = RULE.getWeight(k) * Math.abs(end - begin) / 2;
                    addAt(point.x() - from.x() - t * ux, point.y() - from.y() - t * uy, from.z(), new double[] {ux, uy, 0}, weight);
                }
                begin = end;
                step *= 1.5;
            }
        }
    }

    private void add(Position r, double[] slope, double weight) {
        addAt(point.x() - r.x(), point.y() - r.y(), r.z(), slope, weight);
    }

    private void addAt(double x, double y, double wireZ, double[] slope, double weight) {
        Complex z = twiceDepth.add(point.z() + wireZ - planeTwice);
        Complex cube = z.multiply(z).add(x * x + y * y).sqrt().pow(3);
        Complex factor = cube.reciprocal().multiply(-weight);
        double dz = -slope[2];
        sum[0] = sum[0].add(z.multiply(slope[1]).subtract(dz * y).multiply(factor));
        sum[1] = sum[1].add(z.multiply(-slope[0]).add(dz * x).multiply(factor));
        sum[2] = sum[2].add(factor.multiply(slope[0] * y - slope[1] * x));
    }
}
