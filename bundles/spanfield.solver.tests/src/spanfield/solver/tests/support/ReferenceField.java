/* Copyright (c) 2026 The Spanfield developers. SPDX-License-Identifier: EPL-2.0 */
package spanfield.solver.tests.support;

import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;
import spanfield.solver.PhysicalConstants;
import spanfield.solver.geometry.CatenarySpan;
import spanfield.solver.geometry.Position;
import spanfield.solver.geometry.Wire;
import spanfield.solver.geometry.WireEnd;

/**
 * Free-space field per ampere of a wire by brute force, as an independent second method: the catenary is written out from its textbook
 * form with cosh at every node, spans are halved until every panel is shorter than half its distance to the point, and each panel gets
 * 32 Gauss-Legendre nodes (error about (e + sqrt(e^2 - 1))^-64 with e &gt; 2: below double precision). Tails by brute force too: panels
 * that double in length out to 1e9 times the distance.
 */
public final class ReferenceField {

    private static final GaussIntegrator RULE = new GaussIntegratorFactory().legendre(32);
    private static final double SCALE = PhysicalConstants.MU0 / (4 * Math.PI);

    private ReferenceField() {
    }

    /** Field per ampere in tesla, components X, Y, Z. */
    public static double[] of(Wire wire, Position point) {
        double[] sum = new double[3];
        for (CatenarySpan span : wire.path().spans()) {
            panels(span, 0, span.horizontalLengthMetres(), point, sum);
        }
        if (wire.path().start() == WireEnd.CONTINUES) {
            CatenarySpan first = wire.path().spans().get(0);
            tail(first.start(), first.start(), first.end(), -1, point, sum);
        }
        if (wire.path().finish() == WireEnd.CONTINUES) {
            CatenarySpan last = wire.path().spans().get(wire.path().spans().size() - 1);
            tail(last.end(), last.start(), last.end(), 1, point, sum);
        }
        return new double[] {SCALE * sum[0], SCALE * sum[1], SCALE * sum[2]};
    }

    private static void panels(CatenarySpan span, double from, double to, Position p, double[] sum) {
        double[] a = curve(span, from);
        double[] b = curve(span, to);
        double[] m = curve(span, (from + to) / 2);
        double length = distance(a, b);
        double near = Math.min(distance(m, p), Math.min(distance(a, p), distance(b, p)));
        if (length > near / 2 && to - from > 1e-7) {
            panels(span, from, (from + to) / 2, p, sum);
            panels(span, (from + to) / 2, to, p, sum);
            return;
        }
        for (int i = 0; i < RULE.getNumberOfPoints(); i++) {
            double s = (from + to) / 2 + (to - from) / 2 * RULE.getPoint(i);
            double[] r = curve(span, s);
            add(r, r[3], r[4], r[5], RULE.getWeight(i) * (to - from) / 2, p, sum);
        }
    }

    /** Position and derivative by s of the swung catenary, from the textbook form and Rodrigues' rotation of the depth. */
    private static double[] curve(CatenarySpan span, double s) {
        Position a = span.start();
        Position b = span.end();
        double length = Math.hypot(b.x() - a.x(), b.y() - a.y());
        double h = b.z() - a.z();
        double c = span.constantMetres();
        double depth = 0;
        double slope = 0;
        if (!Double.isInfinite(c)) {
            double k = h / (2 * c * Math.sinh(length / (2 * c)));
            double v = length / 2 - c * Math.log(k + Math.sqrt(k * k + 1));
            depth = h * s / length - c * (Math.cosh((s - v) / c) - Math.cosh(v / c));
            slope = h / length - Math.sinh((s - v) / c);
        }
        double chord = Math.sqrt(length * length + h * h);
        double[] u = {(b.x() - a.x()) / chord, (b.y() - a.y()) / chord, h / chord};
        double angle = -span.swingRadians();
        double cos = Math.cos(angle);
        double sin = Math.sin(angle);
        // Rodrigues: e cos + (u x e) sin + u (u.e)(1 - cos), e = (0, 0, -1)
        double dot = -u[2];
        double[] e = {-u[1] * sin + u[0] * dot * (1 - cos), u[0] * sin + u[1] * dot * (1 - cos), -cos + u[2] * dot * (1 - cos)};
        double tx = (b.x() - a.x()) / length;
        double ty = (b.y() - a.y()) / length;
        double tz = h / length;
        return new double[] {a.x() + s * tx + depth * e[0], a.y() + s * ty + depth * e[1], a.z() + s * tz + depth * e[2],
            tx + slope * e[0], ty + slope * e[1], tz + slope * e[2]};
    }

    private static void tail(Position from, Position spanStart, Position spanEnd, double sign, Position p, double[] sum) {
        double length = Math.hypot(spanEnd.x() - spanStart.x(), spanEnd.y() - spanStart.y());
        double ux = sign * (spanEnd.x() - spanStart.x()) / length;
        double uy = sign * (spanEnd.y() - spanStart.y()) / length;
        double along = ux * (p.x() - from.x()) + uy * (p.y() - from.y());
        double reach = Math.max(1e-3, Math.hypot(Math.hypot(p.x() - from.x() - along * ux, p.y() - from.y() - along * uy), p.z() - from.z()));
        // finest around the foot of the point, doubling away from it in both directions
        double foot = Math.max(0, along);
        double step = reach / 2;
        double end = foot;
        while (end < 1e9 * (reach + foot)) {
            tailPanel(from, ux, uy, sign, end, end + step, p, sum);
            end += step;
            step *= 1.5;
        }
        step = reach / 2;
        end = foot;
        while (end > 0) {
            tailPanel(from, ux, uy, sign, Math.max(0, end - step), end, p, sum);
            end -= step;
            step *= 1.5;
        }
    }

    private static void tailPanel(Position from, double ux, double uy, double sign, double a, double b, Position p, double[] sum) {
        for (int i = 0; i < RULE.getNumberOfPoints(); i++) {
            double t = (a + b) / 2 + (b - a) / 2 * RULE.getPoint(i);
            double[] r = {from.x() + t * ux, from.y() + t * uy, from.z()};
            add(r, sign * ux, sign * uy, 0, RULE.getWeight(i) * (b - a) / 2, p, sum);
        }
    }

    private static void add(double[] r, double dx, double dy, double dz, double weight, Position p, double[] sum) {
        double x = p.x() - r[0];
        double y = p.y() - r[1];
        double z = p.z() - r[2];
        double cube = Math.pow(x * x + y * y + z * z, 1.5);
        sum[0] += weight * (dy * z - dz * y) / cube;
        sum[1] += weight * (dz * x - dx * z) / cube;
        sum[2] += weight * (dx * y - dy * x) / cube;
    }

    private static double distance(double[] a, double[] b) {
        return Math.sqrt((a[0] - b[0]) * (a[0] - b[0]) + (a[1] - b[1]) * (a[1] - b[1]) + (a[2] - b[2]) * (a[2] - b[2]));
    }

    private static double distance(double[] a, Position p) {
        return distance(a, new double[] {p.x(), p.y(), p.z()});
    }
}
