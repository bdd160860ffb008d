/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.benchmarks;

import java.util.List;
import org.apache.commons.math3.analysis.integration.IterativeLegendreGaussIntegrator;
import org.apache.commons.math3.complex.Complex;
import spanfield.solver.earth.EarthReturn;
import spanfield.solver.field.ObservationPoints;
import spanfield.solver.geometry.CatenarySpan;
import spanfield.solver.geometry.Position;
import spanfield.solver.geometry.Wire;

/**
 * What one would write with a mathematics library: adaptive Gauss-Legendre quadrature of Commons Math for each component, span and point,
 * to 1e-6. Spans only; tails, which are closed forms anyway, are left out in its favour.
 */
final class AdaptiveReference {

    private AdaptiveReference() {
    }

    static double sum(List<Wire> wires, ObservationPoints points, EarthReturn earth) {
        IterativeLegendreGaussIntegrator integrator = new IterativeLegendreGaussIntegrator(8, 1e-6, 1e-12, 1, 64);
        double sum = 0;
        for (int i = 0; i < points.size(); i++) {
            Position p = points.position(i);
            for (Wire wire : wires) {
                for (CatenarySpan span : wire.path().spans()) {
                    for (int c = 0; c < 3; c++) {
                        int component = c;
                        if (c == 1 && p.x() == span.start().x()) {
                            continue;
                        }
                        sum += integrator.integrate(100000, s -> freeSpace(span, s, p, component), 0, span.horizontalLengthMetres());
                        if (earth.active()) {
                            sum += integrator.integrate(100000, s -> image(span, s, p, component, earth).getReal(), 0, span.horizontalLengthMetres());
                            sum += integrator.integrate(100000, s -> image(span, s, p, component, earth).getImaginary(), 0, span.horizontalLengthMetres());
                        }
                    }
                }
            }
        }
        return sum;
    }

    private static double freeSpace(CatenarySpan span, double s, Position p, int component) {
        Position r = span.at(s);
        double[] t = span.chordDirection();
        double dz = t[2] - span.depthSlope(s);
        double x = p.x() - r.x();
        double y = p.y() - r.y();
        double z = p.z() - r.z();
        double square = x * x + y * y + z * z;
        double cube = square * Math.sqrt(square);
        return switch (component) {
            case 0 -> (t[1] * z - dz * y) / cube;
            case 1 -> (dz * x - t[0] * z) / cube;
            default -> (t[0] * y - t[1] * x) / cube;
        };
    }

    private static Complex image(CatenarySpan span, double s, Position p, int component, EarthReturn earth) {
        Position r = span.at(s);
        double[] t = span.chordDirection();
        double dz = -(t[2] - span.depthSlope(s));
        double x = p.x() - r.x();
        double y = p.y() - r.y();
        Complex z = earth.complexDepth().multiply(2).add(p.z() + r.z());
        Complex square = z.multiply(z).add(x * x + y * y);
        Complex cube = square.multiply(square.sqrt());
        return switch (component) {
            case 0 -> z.multiply(t[1]).subtract(dz * y).divide(cube);
            case 1 -> z.multiply(-t[0]).add(dz * x).divide(cube);
            default -> cube.reciprocal().multiply(t[0] * y - t[1] * x);
        };
    }
}
